import { DEFAULT_SETTINGS, settingsRows } from '../../../functions/settings/settings';
import type { Change } from '../../../taskpane/port';
import { memoryHost, type MemoryHost } from '../memoryHost';
import type { Evaluate } from '../memoryWorkbook';

/** Every value a cell of ours can have in these tests: how often it was evaluated. */
const counting = (): Evaluate => {
  let n = 0;
  return () => (n += 1);
};

export function unitsChanges(): Change[] {
  const rows = settingsRows(DEFAULT_SETTINGS);
  const ref = { sheet: 'Units', address: `A2:B${String(rows.length + 1)}` };
  return [
    { kind: 'sheet', name: 'Units' },
    { kind: 'cells', ref, values: rows },
    { kind: 'name', name: 'Latentry_units', ref },
  ];
}

/** A workbook with a sheet of formulas: A1 and A2 rest on the store, B1 passes the block, C1 is none of ours. */
export async function workbookWithFormulas(units = true): Promise<MemoryHost> {
  const host = memoryHost({ evaluate: counting() });
  if (units) await host.apply(unitsChanges(), 'units');
  host.book.addSheet('Data');
  host.type({ sheet: 'Data', address: 'A1:C2' }, [
    ['=LATENTRY.LATENT("water","fusion")', '=LATENTRY.LATENT("water","fusion",,Latentry_units)', '=SUM(1)'],
    ['=1+LATENTRY.EDITION()', null, null],
  ]);
  return host;
}

/** The cell right of a label on the Units sheet. */
export function unitCell(label: string): string {
  const row = settingsRows(DEFAULT_SETTINGS).findIndex(([name]) => name === label);
  if (row < 0) throw new Error(`no row "${label}"`);
  return `B${String(row + 2)}`;
}
