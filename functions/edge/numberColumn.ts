import { readHeader, type Header } from '../../core/units/readHeader';
import { Problem } from '../../core/problem';
import { isScalar, shapeOf, type Block } from './block';
import { CellFault, peel } from './cell';

/** A range of data: one row or one column, perhaps with its header in the first cell. */
export interface NumberColumn {
  readonly header: Header | undefined;
  /** One element a row: a number, null for a blank, or a text that a reader may refuse by its row. */
  readonly cells: ArrayLike<unknown>;
  /** Row of the first cell within the range: 2 below a header. */
  readonly firstRow: number;
}

/** Takes a block as data in one dimension; the first cell may be a header. */
export function numberColumn(block: Block): NumberColumn {
  if (block.rows > 1 && block.columns > 1) {
    throw new Problem({
      code: 'argument',
      argument: block.name,
      allowed: 'one column or one row',
      received: `a range of ${shapeOf(block)}`,
    });
  }
  const count = block.rows * block.columns;
  const upright = block.columns === 1;
  const raw = (i: number): unknown => (upright ? block.cells[i]?.[0] : block.cells[0]?.[i]);
  const first = peel(raw(0));
  const headed = typeof first === 'string' && !isScalar(block);
  const header = headed ? readHeader(first) : undefined;
  const skip = headed ? 1 : 0;
  const numbers = upright ? columnOf(block.cells, skip) : rowOf(block.cells[0] ?? [], skip);
  return { header, cells: numbers ?? peeled(raw, skip, count), firstRow: 1 + skip };
}

/** The numbers of a column from a row on; `undefined` where anything else stands in it. */
function columnOf(cells: readonly (readonly unknown[])[], skip: number): Float64Array | undefined {
  const numbers = new Float64Array(cells.length - skip);
  for (let i = 0; i < numbers.length; i++) {
    const value = (cells[i + skip] as readonly unknown[])[0];
    if (typeof value !== 'number' || value - value !== 0) return undefined;
    numbers[i] = value;
  }
  return numbers;
}

function rowOf(cells: readonly unknown[], skip: number): Float64Array | undefined {
  const numbers = new Float64Array(cells.length - skip);
  for (let i = 0; i < numbers.length; i++) {
    const value = cells[i + skip];
    if (typeof value !== 'number' || value - value !== 0) return undefined;
    numbers[i] = value;
  }
  return numbers;
}

function peeled(raw: (i: number) => unknown, from: number, to: number): unknown[] {
  const cells: unknown[] = [];
  for (let i = from; i < to; i++) {
    const cell = peel(raw(i));
    if (cell instanceof CellFault) throw cell;
    cells.push(cell);
  }
  return cells;
}

/** True where every element is a number already. */
export function isDense(cells: ArrayLike<unknown>): cells is Float64Array {
  return cells instanceof Float64Array;
}
