import { studentTBelow } from './studentTBelow';

/**
 * Probability of a Student t variable at least as far from zero as `t`, on either side.
 *
 * p = 2 F(−|t|), taken from the lower tail so that small probabilities keep their digits.
 *
 * @param t any number; an infinite one gives 0
 * @param degreesOfFreedom above 0
 * @returns a probability in [0, 1]
 * @source NIST/SEMATECH e-Handbook of Statistical Methods, 1.3.6.6.4
 * @example
 * import { studentTBothTails } from 'latentry';
 * studentTBothTails(-4.20893245828, 9) // => 0.002276398
 */
export function studentTBothTails(t: number, degreesOfFreedom: number): number {
  return Number.isFinite(t) ? 2 * studentTBelow(-Math.abs(t), degreesOfFreedom) : 0;
}
