import cdf from '@stdlib/stats-base-dists-f-cdf';

/**
 * Probability of a Fisher F variable at or above `f`.
 *
 * P(F > f; d₁, d₂) = P(F < 1/f; d₂, d₁), so that small probabilities keep their digits.
 *
 * @param f at least 0; an infinite one gives 0
 * @param numerator degrees of freedom of the numerator, above 0
 * @param denominator degrees of freedom of the denominator, above 0
 * @returns a probability in [0, 1]
 * @source NIST/SEMATECH e-Handbook of Statistical Methods, 1.3.6.6.5
 * @example
 * import { fisherFAbove } from 'latentry';
 * fisherFAbove(17.715112438, 1, 9) // => 0.002276398
 */
export function fisherFAbove(f: number, numerator: number, denominator: number): number {
  if (f <= 0) return 1;
  return Number.isFinite(f) ? cdf(1 / f, denominator, numerator) : 0;
}
