import type { LowTail } from './nasa9Types';

/** Einstein's heat-capacity function x²·eˣ/(eˣ − 1)², which falls from 1 at x = 0 to 0. */
export function einstein(x: number): number {
  if (x > 700) return 0;
  const half = x / 2;
  const ratio = half / Math.sinh(half);
  return ratio * ratio;
}

/** d ln E / d ln T of Einstein's function at x = θ/T: x·coth(x/2) − 2. */
function steepness(x: number): number {
  return x / Math.tanh(x / 2) - 2;
}

/**
 * The vibration that goes on where the polynomials end, with their heat capacity and its slope at that end; a constant
 * heat capacity where there is nothing above the floor or it does not rise.
 *
 * cp/R = floor + height·E(θ/T), E(x) = x²·eˣ/(eˣ − 1)²
 *
 * @param fromK where the polynomials end
 * @param cp their heat capacity there, divided by R
 * @param slope its derivative there, divided by R, 1/K
 * @param floor heat capacity divided by R that is left as T → 0; NaN for a liquid, which keeps its heat capacity
 */
export function lowTail(fromK: number, cp: number, slope: number, floor: number): LowTail {
  const excess = cp - floor;
  const wanted = (slope * fromK) / excess;
  if (!(excess > 1e-6) || !(wanted > 1e-6)) return { floor: cp, height: 0, thetaK: fromK };
  let low = 0;
  let high = wanted + 4;
  for (let i = 0; i < 60; i++) {
    const middle = (low + high) / 2;
    if (steepness(middle) < wanted) low = middle;
    else high = middle;
  }
  return { floor, height: excess / einstein(high), thetaK: high * fromK };
}
