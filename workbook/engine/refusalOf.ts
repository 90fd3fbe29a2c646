import type { Cell } from '../../taskpane/port';
import { scanFormula } from './scanFormula';

type Refused = Exclude<Cell, number | string | boolean | null>;

/** A formula whose brackets, quotes or operators do not agree. */
export function malformed(formula: string): Refused {
  return { error: '#VALUE!', message: `brackets, quotes, commas or operators do not agree in ${formula}` };
}

/**
 * Why a formula given by itself is refused before it is calculated; undefined for most.
 * @param isWellFormed The formula engine's own opinion.
 * @param hasCells Whether there is a workbook whose cells it may refer to.
 */
export function refusalOf(
  formula: string,
  isWellFormed: (formula: string) => boolean,
  hasCells: boolean,
): Refused | undefined {
  if (!isWellFormed(formula)) return malformed(formula);
  const { spills, unqualified, intersects } = scanFormula(formula);
  const spill = spills[0];
  if (spill !== undefined)
    return { error: '#REF!', message: `${spill} is not followed here; write the range itself, as E1:E9` };
  if (intersects) return { error: '#VALUE!', message: `@ is not followed here; received ${formula}` };
  const cell = unqualified[0];
  if (cell === undefined) return undefined;
  return {
    error: '#REF!',
    message: hasCells
      ? `${cell} is on no sheet; write the sheet before it, as Data!${cell}`
      : `${cell} is a cell, and there is no workbook here; write the values themselves`,
  };
}
