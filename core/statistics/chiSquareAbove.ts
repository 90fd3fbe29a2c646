import cdf from '@stdlib/stats-base-dists-chisquare-cdf';

/**
 * Probability of a chi-square variable at or above `chiSquare`, to an absolute 1e-15 or so.
 *
 * @param chiSquare at least 0
 * @param degreesOfFreedom above 0
 * @returns a probability in [0, 1]
 * @source NIST/SEMATECH e-Handbook of Statistical Methods, 1.3.6.6.6
 * @example
 * import { chiSquareAbove } from 'latentry';
 * chiSquareAbove(18.307, 10) // => 0.05
 */
export function chiSquareAbove(chiSquare: number, degreesOfFreedom: number): number {
  return 1 - cdf(chiSquare, degreesOfFreedom);
}
