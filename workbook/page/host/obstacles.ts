import { checkShapes } from '../../../taskpane/hosts/checkShapes';
import { formatReference, parseArea } from '../../../taskpane/hosts/address';
import type { Change, HostError } from '../../../taskpane/port';
import type { Grid } from '../grid/openGrid';

/** The most cells that one step writes. */
const MOST_CELLS = 500_000;

/** What makes a list of changes impossible, whatever the cells hold now. */
export function obstacles(grid: Grid, changes: readonly Change[]): HostError[] {
  const names = grid
    .workbook()
    .getSheets()
    .map((sheet) => sheet.getSheetName());
  const errors = checkShapes(changes, names, MOST_CELLS);
  for (const change of changes) {
    if (change.kind !== 'cells' && change.kind !== 'note') continue;
    const sheet = grid.sheet(change.ref.sheet);
    const area = parseArea(change.ref.address);
    if (sheet === undefined || area === null) continue;
    const permission = sheet.getWorksheetPermission();
    const corners = [
      [area.top, area.left],
      [area.top + area.rows - 1, area.left + area.columns - 1],
    ] as const;
    if (permission.canEdit() && corners.every(([row, column]) => permission.canEditCell(row, column))) continue;
    errors.push({ reason: 'protected', ref: change.ref, text: `${formatReference(change.ref)} is protected` });
  }
  return errors;
}
