/** c0 to c4 for the powers of the reduced temperature, then the terms of τ^(1/3) and τ^(2/3). */
export type LiquidTerms = readonly [number, number, number, number, number, number, number];

/** Enthalpy of the saturated liquid, divided by R·Tc. */
export function reducedLiquid(c: LiquidTerms, t: number): number {
  const third = Math.cbrt(1 - t);
  return c[0] + t * (c[1] + t * (c[2] + t * (c[3] + t * c[4]))) + third * (c[5] + third * c[6]);
}

/** Its derivative with the reduced temperature, along the saturation line. */
export function reducedLiquidSlope(c: LiquidTerms, t: number): number {
  const third = Math.cbrt(1 - t);
  return c[1] + t * (2 * c[2] + t * (3 * c[3] + t * 4 * c[4])) - (c[5] / third + 2 * c[6]) / (3 * third);
}
