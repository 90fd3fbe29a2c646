import cdf from '@stdlib/stats-base-dists-t-cdf';

/**
 * Probability that a Student t variable lies at or below `t`.
 *
 * @param t any finite number
 * @param degreesOfFreedom above 0
 * @returns a probability in [0, 1]
 * @source NIST/SEMATECH e-Handbook of Statistical Methods, 1.3.6.6.4; evaluated by the incomplete beta function
 * @example
 * import { studentTBelow } from 'latentry';
 * studentTBelow(2.262157, 9) // => 0.975
 */
export function studentTBelow(t: number, degreesOfFreedom: number): number {
  return cdf(t, degreesOfFreedom);
}
