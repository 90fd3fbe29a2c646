import { STANDARD_ATMOSPHERE_PA } from '../atmosphere';
import type { Answer } from '../answer';
import type { OutOfRange } from '../evaluate';
import { GAS_CONSTANT } from '../kirchhoff/kirchhoff';
import { Problem, shortNumber } from '../problem';
import { estimated } from './estimated';

/** What the estimates at the normal boiling point are made from. */
export interface BoilingPoint {
  /** Normal boiling temperature, K. */
  readonly boilingK: number;
  /** Critical temperature, K. */
  readonly criticalK: number;
  /** Critical pressure, Pa, above one atmosphere. */
  readonly criticalPressurePa: number;
}

/** One equation of this family, with the gas constant taken out. */
export interface BoilingMethod {
  readonly name: string;
  /** Latent heat over R·Tb from the reduced boiling temperature and the critical pressure in bar. */
  readonly ratio: (reducedK: number, criticalBar: number) => number;
  /** Root mean square deviation from printed latent heats, as a share. */
  readonly relativeError: number;
  readonly source: string;
}

const PASCAL_PER_BAR = 1e5;

/** Reduced boiling temperatures that the equations are used at; the benchmark's fluids lie in [0.56, 0.73]. Common practice, no source. */
const LEAST_REDUCED = 0.5;
const LARGEST_REDUCED = 0.8;

/** Latent heat of vaporization at the normal boiling point by one of these equations. */
export function atBoilingPoint(
  { name, ratio, relativeError, source }: BoilingMethod,
  { boilingK, criticalK, criticalPressurePa }: BoilingPoint,
  policy: OutOfRange,
): Answer {
  above('boiling temperature', boilingK, 0, 'K');
  above('critical temperature', criticalK, 0, 'K');
  above('critical pressure', criticalPressurePa, STANDARD_ATMOSPHERE_PA, 'Pa');
  const value = GAS_CONSTANT * boilingK * ratio(boilingK / criticalK, criticalPressurePa / PASCAL_PER_BAR);
  return estimated(
    {
      subject: `${name}'s estimate: 0.5 to 0.8 of the critical temperature`,
      unit: 'J/mol',
      kind: 'coexistence',
      method: `${name}, at the normal boiling point; typical error ${shortNumber(100 * relativeError)} % (k = 1) for non-associating fluids, to 10 % for alcohols, useless for vapours that pair (carboxylic acids)`,
      sources: [source],
    },
    {
      argument: 'boiling temperature',
      temperatureK: boilingK,
      fromK: LEAST_REDUCED * criticalK,
      toK: LARGEST_REDUCED * criticalK,
    },
    value,
    relativeError * value,
    policy,
  );
}

/** Refuses a number that is not above a limit. */
export function above(argument: string, value: number, limit: number, unit: string): void {
  if (value > limit && value < Infinity) return;
  const allowed = `a number above ${limit === 0 ? '0' : `${shortNumber(limit)} ${unit}`}`;
  throw new Problem({ code: 'argument', argument, allowed, received: `${shortNumber(value)} ${unit}`.trim() });
}
