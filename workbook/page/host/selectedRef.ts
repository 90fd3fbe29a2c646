import { RANGE_TYPE } from '@univerjs/core';
import { formatArea } from '../../../taskpane/hosts/address';
import type { Ref } from '../../../taskpane/port';
import { gridCells } from '../grid/gridCells';
import type { Grid } from '../grid/openGrid';
import { areaOfRange } from '../grid/rangeOf';

/** What a person selected; whole rows and columns end where the used cells end. */
export function selectedRef(grid: Grid): Ref | null {
  const sheet = grid.workbook().getActiveSheet();
  const range = sheet.getActiveRange()?.getRange();
  if (range === undefined) return null;
  const { rangeType = RANGE_TYPE.NORMAL } = range;
  if (rangeType === RANGE_TYPE.NORMAL) return { sheet: sheet.getSheetName(), address: formatArea(areaOfRange(range)) };
  const last = gridCells(grid.injector, sheet.getSheet()).last();
  const row = Math.max(0, last.row);
  const column = Math.max(0, last.column);
  const whole = {
    startRow: rangeType === RANGE_TYPE.ROW ? range.startRow : 0,
    endRow: rangeType === RANGE_TYPE.ROW ? range.endRow : row,
    startColumn: rangeType === RANGE_TYPE.COLUMN ? range.startColumn : 0,
    endColumn: rangeType === RANGE_TYPE.COLUMN ? range.endColumn : column,
  };
  return { sheet: sheet.getSheetName(), address: formatArea(areaOfRange(whole)) };
}
