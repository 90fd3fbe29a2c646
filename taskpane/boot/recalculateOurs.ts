import type { Ref, WorkbookHost } from '../port';
import { formulaCells, OUR_FORMULA, readsStore } from './formulaCells';

/**
 * Finds our formulas and has just these calculated anew: those that rest on the settings store, or all of them.
 * Gives the cells; does nothing once `signal` is aborted.
 */
export async function recalculateOurs(host: WorkbookHost, which: 'store' | 'all', signal: AbortSignal): Promise<Ref[]> {
  const cells: Ref[] = [];
  const wanted = which === 'all' ? (formula: string) => OUR_FORMULA.test(formula) : readsStore;
  for await (const block of host.scan(OUR_FORMULA, signal)) cells.push(...formulaCells(block, wanted));
  if (signal.aborted) return [];
  if (cells.length > 0) await host.recalculate(cells);
  return cells;
}
