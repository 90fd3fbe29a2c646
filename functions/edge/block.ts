import { Problem } from '../../core/problem';
import { peel, type Cell } from './cell';

/** One argument as it arrives: a two-dimensional array, with the cell address where the host tells it. */
export interface Block {
  readonly name: string;
  readonly cells: readonly (readonly unknown[])[];
  readonly rows: number;
  readonly columns: number;
  readonly address: string | undefined;
}

/** Makes a block of a raw argument; `undefined` where the argument was left out. */
export function blockOf(name: string, raw: unknown, address: string | undefined): Block | undefined {
  if (raw === null || raw === undefined) return undefined;
  const cells = Array.isArray(raw)
    ? raw.length > 0 && !Array.isArray(raw[0])
      ? [raw]
      : (raw as unknown[][])
    : [[raw]];
  const rows = cells.length;
  const columns = rows === 0 ? 0 : (cells[0] as unknown[]).length;
  if (rows === 0 || columns === 0) return undefined;
  return { name, cells: cells as unknown[][], rows, columns, address };
}

export function isScalar(block: Block): boolean {
  return block.rows === 1 && block.columns === 1;
}

/** The single cell of a block, peeled; a larger block is refused. */
export function scalarOf(block: Block): Cell {
  if (!isScalar(block)) {
    throw new Problem({
      code: 'argument',
      argument: block.name,
      allowed: 'one cell',
      received: `a range of ${shapeOf(block)}`,
    });
  }
  return peel(block.cells[0]?.[0]);
}

export function shapeOf(block: { readonly rows: number; readonly columns: number }): string {
  return `${block.rows} × ${block.columns}`;
}

/** A block that a function cannot do without. */
export function requiredBlock(name: string, block: Block | undefined): Block {
  if (block !== undefined) return block;
  throw new Problem({ code: 'argument', argument: name, allowed: 'a range: it is required', received: 'nothing' });
}
