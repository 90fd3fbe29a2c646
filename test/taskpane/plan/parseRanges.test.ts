import { describe, expect, it } from 'vitest';
import { Problem } from '../../../core/problem';
import { parseRanges } from '../../../taskpane/plan/parseRanges';

describe('parseRanges', () => {
  it('reads one range with its sheet', () => {
    expect(parseRanges('Data!$A$1:$B$20')).toEqual([{ sheet: 'Data', address: 'A1:B20' }]);
  });

  it('gives a range without a sheet to the sheet before it', () => {
    expect(parseRanges('Data!A1:A3; C1:C3', 'Other')).toEqual([
      { sheet: 'Data', address: 'A1:A3' },
      { sheet: 'Data', address: 'C1:C3' },
    ]);
    expect(parseRanges('a1:b2', 'Other')).toEqual([{ sheet: 'Other', address: 'A1:B2' }]);
  });

  it('leaves separators inside a quoted sheet name alone', () => {
    expect(parseRanges("'Run 1; kelp, dry'!A1:A3,'It''s'!B1")).toEqual([
      { sheet: 'Run 1; kelp, dry', address: 'A1:A3' },
      { sheet: "It's", address: 'B1' },
    ]);
  });

  it.each([
    ['', undefined, 'received nothing'],
    ['   ;  ', 'Data', 'received "   ;  "'],
    ['A1:B2', undefined, 'received "A1:B2"'],
    ['Data!A:B', undefined, 'received "Data!A:B"'],
    ['Data!A1:B2; word', undefined, 'received "word"'],
  ])('refuses %j with what is allowed', (text, sheet, words) => {
    expect(() => parseRanges(text, sheet)).toThrow(Problem);
    expect(() => parseRanges(text, sheet)).toThrow(words);
    expect(() => parseRanges(text, sheet)).toThrow('range: allowed a sheet and cells as Data!A1:B20');
  });
});
