/**
 * Sum of numbers that keeps the low parts which plain addition drops.
 *
 * @param values finite numbers
 * @returns the sum as if added in twice the working precision and rounded once
 * @source A. Neumaier, Z. angew. Math. Mech. 54 (1974) 39, algorithm IV
 * @example
 * import { compensatedSum } from 'latentry';
 * compensatedSum([1e16, 1, -1e16]) // => 1
 */
export function compensatedSum(values: ArrayLike<number>): number {
  let sum = 0;
  let lost = 0;
  for (let i = 0; i < values.length; i++) {
    const value = values[i] as number;
    const next = sum + value;
    lost += Math.abs(sum) >= Math.abs(value) ? sum - next + value : value - next + sum;
    sum = next;
  }
  return sum + lost;
}
