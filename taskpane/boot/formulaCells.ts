import { formatArea, parseArea } from '../hosts/address';
import type { Block, Ref } from '../port';

/** A call of one of our functions, also as files spell it while the add-in is not loaded. */
export const OUR_FORMULA = /(?:\bLATENTRY\.|_xldudf_LATENTRY_)/i;

const CALLS = /(?:\bLATENTRY\.|_xldudf_LATENTRY_)[A-Z]/gi;
const UNITS_BLOCK = /\bLatentry_units\b/gi;
const TEXTS = /"(?:[^"]|"")*"/g;

/** True for a formula of which at least one call of ours does not pass the Units block, and so rests on the store. */
export function readsStore(formula: string): boolean {
  const code = formula.replace(TEXTS, '""');
  return (code.match(CALLS)?.length ?? 0) > (code.match(UNITS_BLOCK)?.length ?? 0);
}

/** The cells of a block whose formula `wanted` picks, cells below each other joined to one reference. */
export function formulaCells({ ref, formulas }: Block, wanted: (formula: string) => boolean): Ref[] {
  const area = parseArea(ref.address);
  if (area === null) return [];
  const found: Ref[] = [];
  for (let c = 0; c < area.columns; c += 1) {
    let from = -1;
    for (let r = 0; r <= area.rows; r += 1) {
      const text = formulas[r]?.[c] ?? '';
      const hit = text !== '' && wanted(text);
      if (hit && from < 0) from = r;
      if (hit || from < 0) continue;
      const address = formatArea({ top: area.top + from, left: area.left + c, rows: r - from, columns: 1 });
      found.push({ sheet: ref.sheet, address });
      from = -1;
    }
  }
  return found;
}
