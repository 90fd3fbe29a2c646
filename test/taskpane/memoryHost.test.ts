import { expect, it } from 'vitest';
import { parseReference } from '../../taskpane/hosts/address';
import { doubling } from './doubling';
import { describeHostContract } from './hostContract';
import { memoryHost } from './memoryHost';

describeHostContract('the workbook in memory', () => {
  const host = memoryHost({ evaluate: doubling });
  return Promise.resolve({
    host,
    select: (ref) => {
      host.select(ref);
    },
    type: (ref, cells) => {
      host.type(ref, cells);
    },
    typeElsewhere: (ref, cells) => {
      host.type(ref, cells, true);
    },
    protect: (sheet) => {
      host.book.addSheet(sheet).protected = true;
    },
    breakName: (name) => {
      host.book.setName(name, '=#REF!');
    },
    activate: (sheet) => {
      host.book.emit('activated', { ref: { sheet, address: 'A1' }, remote: false, own: false });
    },
    noteAt: ({ sheet, address }) => host.book.sheet(sheet)?.notes.get(address) ?? null,
  });
});

it('takes a step back whole, sheets and names too', async () => {
  const host = memoryHost();
  await host.apply([{ kind: 'sheet', name: 'Fit' }], 'make a sheet');
  await host.apply(
    [
      { kind: 'cells', ref: { sheet: 'Fit', address: 'A1' }, values: [[1]] },
      { kind: 'name', name: 'Fit_1', ref: { sheet: 'Fit', address: 'A1' } },
    ],
    'insert',
  );
  expect(host.undo()).toBe('insert');
  expect(host.book.value({ sheet: 'Fit', address: 'A1' })).toBeNull();
  expect((await host.names('Fit')).size).toBe(0);
  expect(host.undo()).toBe('make a sheet');
  expect(host.book.sheet('Fit')).toBeUndefined();
  expect(host.undo()).toBeNull();
});

it('spills a formula, and says #SPILL! where a cell stands in its way', () => {
  const host = memoryHost({ evaluate: () => [[1], [2], [3]] });
  host.book.addSheet('S');
  host.type({ sheet: 'S', address: 'A1' }, [['=F()']]);
  expect(host.book.values({ sheet: 'S', address: 'A1:A3' })).toEqual([[1], [2], [3]]);
  host.type({ sheet: 'S', address: 'A3' }, [['taken']]);
  expect(host.book.values({ sheet: 'S', address: 'A1:A3' })).toEqual([[{ error: '#SPILL!' }], [null], ['taken']]);
});

it('reads references as names hold them', () => {
  expect(parseReference("='It''s here'!$B$2:$D$9")).toEqual({ sheet: "It's here", address: 'B2:D9' });
});
