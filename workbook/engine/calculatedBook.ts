import { formatArea, parseArea } from '../../taskpane/hosts/address';
import type { Cell } from '../../taskpane/port';
import type { Book, BookCell, BookSheet } from '../book';
import { spilledCells } from '../spilledCells';
import type { EngineCells, EngineValue } from './engineBook';

/** Turns what the engine says of one cell into the cell's value; `row` and `column` are the offset within the spill. */
export type CellReader = (value: EngineValue, anchor: Anchor, row: number, column: number) => Cell;

/** A cell with a formula, counted from zero. */
export interface Anchor {
  readonly sheet: number;
  readonly row: number;
  readonly column: number;
  readonly formula: string;
}

/** The book with the values of a calculation: every formula's own, and those that it spills. */
export function calculatedBook(book: Book, calculated: readonly EngineCells[], read: CellReader): Book {
  const sheets = book.sheets.map((sheet, i) => {
    const cells = calculated[i];
    return cells === undefined ? sheet : calculatedSheet(sheet, i, cells, read);
  });
  return { ...book, sheets };
}

function calculatedSheet(sheet: BookSheet, index: number, calculated: EngineCells, read: CellReader): BookSheet {
  const cells: Record<string, BookCell> = {};
  const held = spilledCells(sheet);
  for (const [address, cell] of Object.entries(sheet.cells)) {
    cells[address] = held.has(address) && cell.formula === undefined ? { ...cell, value: null } : cell;
  }
  for (const [address, cell] of Object.entries(sheet.cells)) {
    const area = parseArea(address);
    if (cell.formula === undefined || area === null) continue;
    const anchor = { sheet: index, row: area.top, column: area.left, formula: cell.formula };
    const extent = calculated.extent(area.top, area.left);
    const fixed = parseArea(cell.array ?? '');
    const rows = fixed?.rows ?? extent.rows;
    const columns = fixed?.columns ?? extent.columns;
    for (let r = 0; r < rows; r++) {
      for (let c = 0; c < columns; c++) {
        const at = formatArea({ top: area.top + r, left: area.left + c, rows: 1, columns: 1 });
        // A fixed array repeats a single value, row or column, and shows #N/A beyond the result.
        const row = fixed !== null && extent.rows === 1 ? 0 : r;
        const column = fixed !== null && extent.columns === 1 ? 0 : c;
        const beyond = row >= extent.rows || column >= extent.columns;
        const value: Cell = beyond
          ? { error: '#N/A' }
          : read(calculated.value(area.top + row, area.left + column), anchor, row, column);
        cells[at] = r === 0 && c === 0 ? withValue(cell, value, area, extent) : { ...cells[at], value };
      }
    }
  }
  return { ...sheet, cells };
}

function withValue(
  cell: BookCell,
  value: Cell,
  { top, left }: { readonly top: number; readonly left: number },
  { rows, columns }: { readonly rows: number; readonly columns: number },
): BookCell {
  const changed: { -readonly [K in keyof BookCell]: BookCell[K] } = { ...cell, value };
  delete changed.spill;
  if (cell.array === undefined && (rows > 1 || columns > 1)) changed.spill = formatArea({ top, left, rows, columns });
  return changed;
}
