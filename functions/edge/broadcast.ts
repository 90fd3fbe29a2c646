import { Problem } from '../../core/problem';
import { shapeOf, type Block } from './block';

export interface Shape {
  readonly rows: number;
  readonly columns: number;
}

/** The platform's web client caps one answer at about 5 MB. */
const MOST_CELLS = 200_000;

/**
 * The common shape of arguments: scalars against ranges; ranges of one shape; or a row against a column, which
 * gives the grid. Anything else is refused with both shapes.
 */
export function commonShape(blocks: readonly (Block | undefined)[]): Shape {
  let rows = 1;
  let columns = 1;
  let first: Block | undefined;
  for (const block of blocks) {
    if (block === undefined || (block.rows === 1 && block.columns === 1)) continue;
    if (first === undefined) {
      first = block;
    } else if (block.rows !== first.rows || block.columns !== first.columns) {
      refuseUnlessRowAgainstColumn(block, first, rows, columns);
    }
    rows = Math.max(rows, block.rows);
    columns = Math.max(columns, block.columns);
  }
  if (rows * columns > MOST_CELLS) {
    throw new Problem({
      code: 'argument',
      argument: first?.name ?? 'range',
      allowed: `at most ${MOST_CELLS} cells in one answer`,
      received: `${rows * columns} cells`,
    });
  }
  return { rows, columns };
}

function refuseUnlessRowAgainstColumn(block: Block, first: Block, rows: number, columns: number): void {
  const asColumn = block.columns === 1 && (rows === 1 || rows === block.rows);
  const asRow = block.rows === 1 && (columns === 1 || columns === block.columns);
  const firstIsLine = first.rows === 1 || first.columns === 1;
  if (firstIsLine && (asColumn || asRow)) return;
  throw new Problem({
    code: 'argument',
    argument: block.name,
    allowed: `one cell, a range of ${shapeOf(first)} as ${first.name}, or a row against a column`,
    received: `a range of ${shapeOf(block)}`,
  });
}
