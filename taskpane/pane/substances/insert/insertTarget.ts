import { Problem } from '../../../../core/problem';
import { formatReference, parseArea, parseReference } from '../../../hosts/address';
import { within } from '../../../plan/unitsBlock';
import type { Ref } from '../../../port';

/** The first cell of a selection. @throws Problem where nothing is selected */
export function insertTarget(selected: Ref | null): Ref {
  if (selected !== null && parseArea(selected.address) !== null) return within(selected, 0, 0);
  throw new Problem({
    code: 'argument',
    argument: 'selected cell',
    allowed: 'the cell that the formula goes to, chosen in the workbook',
    received: 'nothing is selected',
  });
}

/**
 * A cell as a formula in `target` refers to it.
 * @param text `A2`, `$A$2` or `Data!A2`
 * @throws Problem for anything but one cell, and for the target itself
 */
export function cellArgument(text: string, target: Ref): string {
  const typed = text.trim();
  const area = parseArea(typed);
  const ref = area === null ? parseReference(typed) : { sheet: target.sheet, address: typed };
  const read = ref === null ? null : parseArea(ref.address);
  if (ref === null || read === null || read.rows * read.columns > 1) {
    throw refused('one cell, as A2 or Data!A2', `"${text}"`);
  }
  const cell = within(ref, 0, 0);
  const sameSheet = ref.sheet.toLowerCase() === target.sheet.toLowerCase();
  if (sameSheet && cell.address === target.address) throw refused('another cell than the formula’s own', `"${text}"`);
  if (area !== null) return typed.toUpperCase();
  return sameSheet ? cell.address : formatReference(cell);
}

function refused(allowed: string, received: string): Problem {
  return new Problem({ code: 'argument', argument: 'temperature in formulas', allowed, received });
}
