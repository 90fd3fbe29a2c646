/** Powers of τ in ln p. */
export const PRESSURE_POWERS = [1, 1.5, 2.5, 5, 8] as const;

/**
 * ln(p/pc) of the saturation line and its derivatives with the reduced temperature, in Wagner's form.
 *
 * ln(p/pc) = (w1·τ + w2·τ^1.5 + w3·τ^2.5 + w4·τ^5 + w5·τ^8)/Tr, τ = 1 − Tr
 *
 * @source W. Wagner, Cryogenics 13 (1973) 470; exponents to 5: Ambrose & Walton, Pure Appl. Chem. 61 (1989) 1395
 */
export type WagnerTerms = readonly [number, number, number, number, number];

export function lnReducedPressure(w: WagnerTerms, t: number): number {
  const x = 1 - t;
  const root = Math.sqrt(x);
  return (x * (w[0] + root * (w[1] + x * w[2]) + x * x * x * x * (w[3] + x * x * x * w[4]))) / t;
}

/** d ln p/d Tr */
export function lnPressureSlope(w: WagnerTerms, t: number): number {
  const x = 1 - t;
  const root = Math.sqrt(x);
  const x4 = x * x * x * x;
  const sum = x * (w[0] + root * (w[1] + x * w[2]) + x4 * (w[3] + x * x * x * w[4]));
  const derived = -(w[0] + root * (1.5 * w[1] + 2.5 * x * w[2]) + x4 * (5 * w[3] + 8 * x * x * x * w[4]));
  return (derived - sum / t) / t;
}

/** d² ln p/d Tr² */
export function lnPressureCurvature(w: WagnerTerms, t: number): number {
  const x = 1 - t;
  const root = Math.sqrt(x);
  const x4 = x * x * x * x;
  const sum = x * (w[0] + root * (w[1] + x * w[2]) + x4 * (w[3] + x * x * x * w[4]));
  const first = -(w[0] + root * (1.5 * w[1] + 2.5 * x * w[2]) + x4 * (5 * w[3] + 8 * x * x * x * w[4]));
  const second = (0.75 * w[1]) / root + 3.75 * root * w[2] + x * x * x * (20 * w[3] + 56 * x * x * x * w[4]);
  return (second - (2 * (first - sum / t)) / t) / t;
}
