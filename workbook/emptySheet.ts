import type { BookSheet } from './book';

/**
 * A sheet with nothing on it.
 *
 * @param name - its name
 * @returns the sheet, visible, with grid lines, portrait
 * @example
 * emptySheet('Duties').cells // => {}
 */
export function emptySheet(name: string): BookSheet {
  return {
    name,
    cells: {},
    columnWidths: {},
    rowHeights: {},
    merges: [],
    lists: [],
    freeze: { rows: 0, columns: 0 },
    gridLines: true,
    hidden: false,
    print: { landscape: false, fitWidth: false },
  };
}
