import { slices } from '../plan/slices';
import type { Block, Cell, Ref, WorkbookHost } from '../port';

/** Cells read in one crossing: small enough that a host answers in well under a second. */
const CELLS_EACH = 40_000;

/** How far a reading is, and how it is stopped. */
export interface Reading {
  readonly signal: AbortSignal;
  progress(share: number): void;
}

/**
 * Reads ranges, large ones piece by piece, so that the pane stays awake and the person can stop it.
 * @throws DOMException named AbortError when stopped.
 */
export async function readCells(host: WorkbookHost, refs: readonly Ref[], reading: Reading): Promise<Block[]> {
  const pieces = refs.map((ref) => slices(ref, CELLS_EACH));
  const total = pieces.reduce((sum, list) => sum + list.length, 0);
  if (total === refs.length) return host.read(refs);
  const blocks: Block[] = [];
  let done = 0;
  for (const [i, list] of pieces.entries()) {
    const values: (readonly Cell[])[] = [];
    const formulas: (readonly string[])[] = [];
    for (const piece of list) {
      reading.signal.throwIfAborted();
      const [block] = await host.read([piece]);
      for (const row of block?.values ?? []) values.push(row);
      for (const row of block?.formulas ?? []) formulas.push(row);
      done += 1;
      reading.progress(done / total);
      await nextTurn();
    }
    blocks.push({ ref: refs[i] as Ref, values, formulas });
  }
  reading.signal.throwIfAborted();
  return blocks;
}

function nextTurn(): Promise<void> {
  return new Promise((resolve) => {
    setTimeout(resolve, 0);
  });
}
