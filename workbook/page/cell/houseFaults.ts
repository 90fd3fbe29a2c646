import type { HouseFault } from '../../../core/house/house';
import { HOUSE_COLUMNS, headerOrder } from '../../../core/house/houseRow';
import { houseStore } from '../../../functions/house/store';
import { SUBSTANCES_NAME } from '../../../taskpane/boot/readSnapshot';
import { parseArea } from '../../../taskpane/hosts/address';
import { cellValue } from '../grid/cellValue';
import type { Grid } from '../grid/openGrid';
import { workbookNames } from '../host/workbookNames';

/** What is wrong with a row of the team's own substances, and in which column of the sheet. */
export interface RowFault {
  readonly fault: HouseFault;
  readonly column: number;
}

/** The faults of the rows of one sheet, by row counted from 0; empty for every sheet but that of the substances. */
export function houseFaults(grid: Grid, sheetId: string): ReadonlyMap<number, readonly RowFault[]> {
  const found = new Map<number, RowFault[]>();
  const state = houseStore.current();
  if (state.state !== 'ready' || state.house.faults.length === 0) return found;
  const named = [...workbookNames(grid, SUBSTANCES_NAME)].find(
    ([name]) => name.toLowerCase() === SUBSTANCES_NAME.toLowerCase(),
  )?.[1];
  if (named === undefined || named === 'broken') return found;
  const sheet = grid.sheet(named.sheet);
  const area = parseArea(named.address);
  if (sheet === undefined || area === null || sheet.getSheetId() !== sheetId) return found;
  const cells = sheet.getSheet().getCellMatrix();
  const heads = Array.from({ length: area.columns }, (_, i) => cellValue(cells.getValue(area.top, area.left + i)));
  const order = headerOrder(heads) ?? HOUSE_COLUMNS;
  for (const fault of state.house.faults) {
    const column = area.left + Math.max(0, order.indexOf(fault.column));
    found.set(fault.row - 1, [...(found.get(fault.row - 1) ?? []), { fault, column }]);
  }
  return found;
}
