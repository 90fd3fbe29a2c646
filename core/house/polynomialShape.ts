import type { AreaShape } from './shape';

/**
 * c0 + c1 x + c2 x² + … with x = T − origin, its derivative and its integral.
 *
 * @param coefficients c0, c1, …; one alone is a constant
 * @param originK 0 for a polynomial in kelvin, 273.15 for one in degrees Celsius
 */
export function polynomialShape(coefficients: readonly number[], originK: number): AreaShape {
  const plain = Float64Array.from(coefficients);
  const derived = Float64Array.from(coefficients.slice(1), (c, i) => c * (i + 1));
  const summed = Float64Array.from([0, ...coefficients.map((c, i) => c / (i + 1))]);
  return {
    at: (t) => horner(plain, t - originK),
    slope: (t) => horner(derived, t - originK),
    area: (from, to) => horner(summed, to - originK) - horner(summed, from - originK),
  };
}

function horner(coefficients: Float64Array, x: number): number {
  let value = 0;
  for (let i = coefficients.length - 1; i >= 0; i--) value = value * x + (coefficients[i] as number);
  return value;
}
