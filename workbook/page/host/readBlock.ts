import type { Block, Cell } from '../../../taskpane/port';
import { cellValue } from '../grid/cellValue';
import { type GridCells, gridCells } from '../grid/gridCells';
import type { Grid } from '../grid/openGrid';
import type { Place } from './place';

/** Values and formulas of a place; error cells carry the words that the grid itself doesn't keep. */
export function readBlock(grid: Grid, { sheet, area, ref }: Place): Block {
  const cells = gridCells(grid.injector, sheet.getSheet());
  const values: Cell[][] = [];
  const formulas: string[][] = [];
  for (let row = area.top; row < area.top + area.rows; row++) {
    const rowValues: Cell[] = [];
    const rowFormulas: string[] = [];
    for (let column = area.left; column < area.left + area.columns; column++) {
      rowFormulas.push(cells.formula(row, column));
      rowValues.push(valueAt(grid, sheet.getSheetId(), cells, row, column));
    }
    values.push(rowValues);
    formulas.push(rowFormulas);
  }
  return { ref, values, formulas };
}

function valueAt(grid: Grid, sheetId: string, cells: GridCells, row: number, column: number): Cell {
  const data = cells.at(row, column);
  if (!data) return null;
  const value = cellValue(data);
  if (value === null || typeof value !== 'object') {
    const filled = value === null && data.v === '' && cells.anchor(row, column) !== undefined;
    return filled ? '' : value;
  }
  const anchor = cells.anchor(row, column) ?? { row, column };
  const offset = { row: row - anchor.row, column: column - anchor.column };
  const message = grid.messages.at(sheetId, anchor.row, anchor.column, value.error, offset);
  return message === undefined ? value : { ...value, message };
}
