import { studentTBelow } from './studentTBelow';

/**
 * The value that a Student t variable stays below with a given probability: the inverse of `studentTBelow`.
 *
 * Found on the lower tail by false position (Illinois rule) between brackets a factor of two apart. Inverting the
 * distribution function costs a few dozen microseconds a call and spares the browser a second special function.
 *
 * @param probability inside (0, 1)
 * @param degreesOfFreedom above 0
 * @returns t to within a few units of the last place
 * @source M. Dowell, P. Jarratt, BIT 11 (1971) 168 for the root finder
 * @example
 * import { studentTQuantile } from 'latentry';
 * studentTQuantile(0.975, 9) // => 2.262157
 */
export function studentTQuantile(probability: number, degreesOfFreedom: number): number {
  if (probability === 0.5) return 0;
  if (probability > 0.5) return -lowerTail(1 - probability, degreesOfFreedom);
  return lowerTail(probability, degreesOfFreedom);
}

function lowerTail(probability: number, degreesOfFreedom: number): number {
  const excess = (t: number): number => studentTBelow(t, degreesOfFreedom) - probability;
  let near = 0;
  let far = -1;
  while (excess(far) > 0) {
    near = far;
    far *= 2;
  }
  return falsePosition(excess, far, near);
}

/** `low` and `high` bracket the root of a rising function. */
function falsePosition(f: (t: number) => number, low: number, high: number): number {
  let fLow = f(low);
  let fHigh = f(high);
  let last = 0;
  for (let step = 0; step < 200; step++) {
    const t = (low * fHigh - high * fLow) / (fHigh - fLow);
    if (!(t > low && t < high)) break;
    const ft = f(t);
    if (ft === 0) return t;
    if (ft < 0) {
      if (last < 0) fHigh /= 2;
      [low, fLow] = [t, ft];
    } else {
      if (last > 0) fLow /= 2;
      [high, fHigh] = [t, ft];
    }
    last = Math.sign(ft);
    if (high - low <= 2 * Number.EPSILON * Math.abs(low)) break;
  }
  return Math.abs(f(low)) < Math.abs(f(high)) ? low : high;
}
