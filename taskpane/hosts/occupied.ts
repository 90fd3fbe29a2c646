import type { Block, Cell, Change, HostError } from '../port';
import { formatArea, formatReference, parseArea } from './address';

function same(a: Cell, b: Cell): boolean {
  if (a === null || b === null || typeof a !== 'object' || typeof b !== 'object') return a === b;
  return a.error === b.error;
}

/**
 * The first cell that a change would write over, or that stands where its formula will spill.
 * A cell that already holds what would be written is free; a change of format alone occupies nothing.
 */
export function occupied(change: Extract<Change, { kind: 'cells' }>, present: Block): HostError | null {
  if (change.values === undefined && change.formulas === undefined) return null;
  const area = parseArea(present.ref.address);
  if (area === null) return null;
  for (const [r, row] of present.values.entries()) {
    for (const [c, value] of row.entries()) {
      const formula = present.formulas[r]?.[c] ?? '';
      if (value === null && formula === '') continue;
      const newFormula = change.formulas?.[r]?.[c] ?? '';
      if (newFormula !== '' ? newFormula === formula : formula === '' && same(change.values?.[r]?.[c] ?? null, value)) {
        continue;
      }
      const at = {
        sheet: present.ref.sheet,
        address: formatArea({ top: area.top + r, left: area.left + c, rows: 1, columns: 1 }),
      };
      return { reason: 'occupied', ref: at, text: `${formatReference(at)} is not empty` };
    }
  }
  return null;
}
