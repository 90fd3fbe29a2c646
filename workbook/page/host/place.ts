import type { FWorksheet } from '@univerjs/sheets/facade';
import { type Area, formatArea, parseArea } from '../../../taskpane/hosts/address';
import { HostFailure } from '../../../taskpane/hosts/hostFailure';
import type { Ref } from '../../../taskpane/port';
import type { Grid } from '../grid/openGrid';

/** A reference that was found in the open workbook; `ref` as the workbook spells it. */
export interface Place {
  readonly sheet: FWorksheet;
  readonly area: Area;
  readonly ref: Ref;
}

/**
 * Finds a reference in the open workbook.
 * @throws HostFailure for a sheet that is not there and an address that is none
 */
export function placeOf(grid: Grid, ref: Ref): Place {
  const sheet = grid.sheet(ref.sheet);
  if (sheet === undefined) {
    throw new HostFailure([{ reason: 'no such sheet', ref, text: `no sheet named "${ref.sheet}"` }]);
  }
  const area = parseArea(ref.address);
  if (area === null) {
    const text = `address: allowed A1 style; received "${ref.address}"`;
    throw new HostFailure([{ reason: 'bad reference', ref, text }]);
  }
  return { sheet, area, ref: { sheet: sheet.getSheetName(), address: formatArea(area) } };
}
