import { CellValueType, type ICellData, type Nullable } from '@univerjs/core';
import type { EngineCells, EngineValue } from './engineBook';

type Matrix<T> = Readonly<Record<number, Readonly<Record<number, T>>>> | null | undefined;

/**
 * One sheet of the grid library's results.
 * @param values Cells with a formula.
 * @param spilled Cells that a formula spilled into, its own among them.
 * @param ranges How far each formula spilled, by its own cell.
 */
export function engineCells(
  values: Matrix<Nullable<ICellData>>,
  spilled: Matrix<Nullable<ICellData>>,
  ranges: Matrix<{ startRow: number; endRow: number; startColumn: number; endColumn: number }>,
): EngineCells {
  const at = (row: number, column: number) => spilled?.[row]?.[column] ?? values?.[row]?.[column];
  return {
    value: (row, column) => valueOf(at(row, column)),
    extent: (row, column) => {
      const range = ranges?.[row]?.[column];
      if (range === undefined) return { rows: 1, columns: 1 };
      return { rows: range.endRow - range.startRow + 1, columns: range.endColumn - range.startColumn + 1 };
    },
  };
}

const ERROR = /^#(?:[A-Z]+\/?[A-Z0]*[!?]?|GETTING_DATA)$/;

function valueOf(cell: Nullable<ICellData>): EngineValue {
  const value = cell?.v;
  if (value === undefined || value === null) return null;
  if (cell?.t === CellValueType.BOOLEAN) return value === 1 || value === true;
  if (typeof value === 'string') return ERROR.test(value) ? { code: value } : value;
  return value;
}
