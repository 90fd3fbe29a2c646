import { formatArea, parseArea } from '../taskpane/hosts/address';
import type { BookSheet } from './book';

/**
 * The addresses that hold only kept values of a spill or of a fixed array: whoever calculates the sheet leaves them
 * empty and lets the anchor's formula fill them.
 *
 * @param sheet - any sheet
 * @returns addresses such as `B6`, the anchors not among them
 * @example
 * spilledCells(sheetWithSpillInB5toB7) // => Set { 'B6', 'B7' }
 */
export function spilledCells(sheet: BookSheet): ReadonlySet<string> {
  const held = new Set<string>();
  for (const [anchor, cell] of Object.entries(sheet.cells)) {
    const area = parseArea(cell.spill ?? cell.array ?? '');
    if (area === null) continue;
    for (let row = 0; row < area.rows; row++) {
      for (let column = 0; column < area.columns; column++) {
        const address = formatArea({ top: area.top + row, left: area.left + column, rows: 1, columns: 1 });
        if (address !== anchor) held.add(address);
      }
    }
  }
  return held;
}
