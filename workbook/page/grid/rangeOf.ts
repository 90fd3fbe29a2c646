import type { IRange } from '@univerjs/core';
import { type Area, formatArea, parseArea } from '../../../taskpane/hosts/address';

export function rangeOfArea({ top, left, rows, columns }: Area): IRange {
  return { startRow: top, startColumn: left, endRow: top + rows - 1, endColumn: left + columns - 1 };
}

export function areaOfRange({ startRow, startColumn, endRow, endColumn }: IRange): Area {
  return { top: startRow, left: startColumn, rows: endRow - startRow + 1, columns: endColumn - startColumn + 1 };
}

/** The grid's range for `B2` or `B2:D9`; null for what is no address. */
export function rangeOf(address: string): IRange | null {
  const area = parseArea(address);
  return area === null ? null : rangeOfArea(area);
}

/** `B2:D9` for a range of the grid. */
export function addressOf(range: IRange): string {
  return formatArea(areaOfRange(range));
}
