import { IDefinedNamesService } from '@univerjs/engine-formula';
import { parseReference } from '../../../taskpane/hosts/address';
import type { Ref } from '../../../taskpane/port';
import { bookName, type GridName } from '../grid/gridNames';
import type { Grid } from '../grid/openGrid';

/** Names of workbook scope that start with `prefix`, whatever the case. */
export function workbookNames(grid: Grid, prefix: string): Map<string, Ref | 'broken'> {
  const found = new Map<string, Ref | 'broken'>();
  const entries = grid.injector.get(IDefinedNamesService).getDefinedNameMap(grid.workbook().getId()) ?? {};
  for (const entry of Object.values(entries) as GridName[]) {
    const { name, formula, sheet: scope } = bookName(entry, (id) => id);
    if (scope !== undefined || !name.toLowerCase().startsWith(prefix.toLowerCase())) continue;
    const ref = parseReference(formula);
    const sheet = ref === null ? undefined : grid.sheet(ref.sheet);
    const there = ref === null || sheet === undefined ? 'broken' : { ...ref, sheet: sheet.getSheetName() };
    found.set(name, there);
  }
  return found;
}
