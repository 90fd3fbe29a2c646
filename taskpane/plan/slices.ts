import { formatArea, parseArea } from '../hosts/address';
import type { Ref } from '../port';

/**
 * Cuts a range into pieces of whole rows that hold at most `mostCells` cells each, top to bottom.
 * @example slices({ sheet: "Data", address: "A1:B5" }, 4) // => addresses A1:B2, A3:B4, A5:B5
 */
export function slices(ref: Ref, mostCells: number): Ref[] {
  const area = parseArea(ref.address);
  if (area === null) return [ref];
  const rowsEach = Math.max(1, Math.floor(mostCells / area.columns));
  const pieces: Ref[] = [];
  for (let start = 0; start < area.rows; start += rowsEach) {
    const rows = Math.min(rowsEach, area.rows - start);
    pieces.push({ sheet: ref.sheet, address: formatArea({ ...area, top: area.top + start, rows }) });
  }
  return pieces;
}
