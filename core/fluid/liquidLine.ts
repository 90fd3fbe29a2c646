/** Highest power of s = (T/Tc − 0.6)/0.4 in the enthalpy of the saturated liquid. */
export const LIQUID_DEGREE = 8;

/** Coefficients of τ^(1/3) and τ^(2/3), τ = 1 − T/Tc, then of the powers 0 to `LIQUID_DEGREE` of s. */
export type LiquidTerms = readonly number[];

const MIDDLE = 0.6;
const HALF = 0.4;

/** The variable of the powers: −1 to 1 between 0.2 Tc and Tc. */
export function liquidVariable(t: number): number {
  return (t - MIDDLE) / HALF;
}

/** Enthalpy of the saturated liquid, divided by R·Tc. */
export function reducedLiquid(c: LiquidTerms, t: number): number {
  const third = Math.cbrt(1 - t);
  const s = (t - MIDDLE) / HALF;
  let sum = 0;
  for (let i = LIQUID_DEGREE + 2; i > 1; i--) sum = sum * s + (c[i] as number);
  return sum + third * ((c[0] as number) + third * (c[1] as number));
}

/** Its derivative with the reduced temperature, along the saturation line. */
export function reducedLiquidSlope(c: LiquidTerms, t: number): number {
  const third = Math.cbrt(1 - t);
  const s = (t - MIDDLE) / HALF;
  let sum = 0;
  for (let i = LIQUID_DEGREE; i > 0; i--) sum = sum * s + i * (c[i + 2] as number);
  return sum / HALF - ((c[0] as number) / third + 2 * (c[1] as number)) / (3 * third);
}
