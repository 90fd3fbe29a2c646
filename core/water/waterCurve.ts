import type { LatentKind, Mark } from '../answer';
import type { Curve } from '../substance';
import { MOLAR_MASS } from './ranges';

/** What a curve of water is made of: a function per kilogram, and what travels with it. */
export interface CurveParts {
  readonly from: number;
  readonly to: number;
  readonly subject: string;
  readonly unit: 'J/mol' | 'J/(mol K)';
  readonly kind?: LatentKind;
  readonly method: string;
  readonly sources: readonly string[];
  /** Value per kilogram; NaN where there is none. */
  readonly perKilogram: (temperatureK: number) => number;
  readonly marksAt?: (temperatureK: number) => readonly Mark[];
}

/** A curve in molar units over temperature. */
export function waterCurve({ perKilogram, ...parts }: CurveParts): Curve {
  return { axis: 'temperature', ...parts, at: (temperatureK) => MOLAR_MASS * perKilogram(temperatureK) };
}
