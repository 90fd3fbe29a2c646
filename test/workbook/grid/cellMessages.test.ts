import { describe, expect, it } from 'vitest';
import { createCellMessages } from '../../../workbook/grid/cellMessages';

const place = { unitId: 'book', sheetId: 's', row: 4, column: 1 };
const fault = (message: string, row = 0, code = '#N/A') => ({ row, column: 0, code, message });

describe('createCellMessages', () => {
  it('keeps the words of a cell, of its spill, and of an inner call', () => {
    const messages = createCellMessages();
    messages.report(place, [fault('first'), fault('third', 2)]);
    messages.report(place, [fault('outer', 0, '#VALUE!'), fault('outer', 1, '#VALUE!')]);
    expect(messages.at('s', 4, 1, '#N/A')).toBe('first');
    expect(messages.at('s', 4, 1, '#N/A', { row: 2, column: 0 })).toBe('third');
    expect(messages.at('s', 4, 1, '#VALUE!')).toBe('outer');
    expect(messages.at('s', 4, 1, '#DIV/0!')).toBeUndefined();
    expect(messages.at('s', 5, 1, '#N/A')).toBeUndefined();
    expect(messages.at('other', 4, 1, '#N/A')).toBeUndefined();
  });

  it('forgets with the next calculation of the cell only', () => {
    const messages = createCellMessages();
    messages.report(place, [fault('old')]);
    messages.begin();
    expect(messages.at('s', 4, 1, '#N/A')).toBe('old');
    messages.report({ ...place, row: 9 }, []);
    expect(messages.at('s', 4, 1, '#N/A')).toBe('old');
    messages.report(place, []);
    expect(messages.at('s', 4, 1, '#N/A')).toBeUndefined();
    messages.report(place, [fault('new')]);
    expect(messages.at('s', 4, 1, '#N/A')).toBe('new');
  });
});
