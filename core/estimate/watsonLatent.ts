import type { Answer } from '../answer';
import type { OutOfRange } from '../evaluate';
import { above } from './boilingPoint';
import { estimated, type Method } from './estimated';

/** One latent heat and where it is carried to. */
export interface WatsonInput {
  /** Latent heat of vaporization at `atK`, in any unit of heat per amount; the answer has the same. */
  readonly latent: number;
  readonly atK: number;
  readonly toK: number;
  /** Critical temperature, K. */
  readonly criticalK: number;
  /** 0.38 when absent. */
  readonly exponent?: number;
}

/**
 * Standard deviation of the exponent: 0.066 about 0.39 between the boiling and the triple points of 33 non-associating
 * fluids; up to 0.95 Tc it lies in [0.37, 0.42] for four fluids with measured latent heats, and at 0.36 for water.
 */
const SCATTER_COLDER = 0.06;
const SCATTER_HOTTER = 0.03;

const LEAST_REDUCED = 0.3;
const LARGEST_REDUCED = 0.95;

/**
 * Latent heat of vaporization carried to another temperature after Watson.
 *
 * ΔHvap(T₂) = ΔHvap(T₁) ((1 − T₂/Tc) / (1 − T₁/Tc))^0.38.
 *
 * @param input latent heat at `atK`, its temperature, the one wanted and the critical temperature (K); both temperatures within
 * [0.3, 0.95] Tc
 * @param policy whether a temperature outside is refused or extended
 * @param unit unit of the latent heat, for the record
 * @returns latent heat at `toK`; typical error |ln((1 − T₂/Tc)/(1 − T₁/Tc))| times 6 % towards colder, 3 % towards hotter (k = 1);
 * the error of the given latent heat comes on top
 * @throws Problem `argument` for numbers that are not positive, `range` for a temperature outside
 * @source K. M. Watson, Ind. Eng. Chem. 35 (1943) 398; exponent of Thek & Stiel, AIChE J. 12 (1966) 599
 * @example
 * watsonLatent({ latent: 2257, atK: 373.15, toK: 573.15, criticalK: 647.1 }).value // => 1372
 */
export function watsonLatent(
  { latent, atK, toK, criticalK, exponent = 0.38 }: WatsonInput,
  policy: OutOfRange = 'refuse',
  unit = 'J/mol',
): Answer {
  above('latent heat', latent, 0, unit);
  above('at temperature', atK, 0, 'K');
  above('to temperature', toK, 0, 'K');
  above('critical temperature', criticalK, 0, 'K');
  above('exponent', exponent, 0, '');
  const stretch = Math.log((1 - toK / criticalK) / (1 - atK / criticalK));
  const value = latent * Math.exp(exponent * stretch);
  const uncertainty = value * stretch * (toK < atK ? SCATTER_COLDER : SCATTER_HOTTER);
  const record = (argument: string, temperatureK: number): Answer =>
    estimated(
      methodOf(unit),
      { argument, temperatureK, fromK: LEAST_REDUCED * criticalK, toK: LARGEST_REDUCED * criticalK },
      value,
      uncertainty,
      policy,
    );
  const start = record('at temperature', atK);
  const end = record('to temperature', toK);
  return end.marks.length === 0 ? { ...end, marks: start.marks } : end;
}

function methodOf(unit: string): Method {
  return {
    subject: "Watson's equation: 0.3 to 0.95 of the critical temperature",
    unit,
    kind: 'coexistence',
    method:
      'Watson, from one latent heat; typical error (k = 1): the exponent to 0.06 towards colder, 0.03 towards hotter, without the error of the given latent heat; not for vapours that pair (carboxylic acids)',
    sources: ['K. M. Watson, Ind. Eng. Chem. 35 (1943) 398', 'R. E. Thek & L. I. Stiel, AIChE J. 12 (1966) 599'],
  };
}
