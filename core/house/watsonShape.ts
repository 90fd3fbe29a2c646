import type { Shape } from './shape';

/** Exponent that Watson's relation is commonly used with: Thek and Stiel's 0.38. */
export const WATSON_EXPONENT = 0.38;

/**
 * Heat of vaporization from one point: L(T) = L₁ [(Tc − T)/(Tc − T₁)]ⁿ, zero from the critical temperature on.
 *
 * @param heat L₁
 * @param atK T₁
 * @param criticalK Tc, above T₁
 * @param exponent n
 * @source K. M. Watson, Ind. Eng. Chem. 35 (1943) 398; n = 0.38
 */
export function watsonShape(heat: number, atK: number, criticalK: number, exponent = WATSON_EXPONENT): Shape {
  const at = (t: number): number => (t >= criticalK ? 0 : heat * ((criticalK - t) / (criticalK - atK)) ** exponent);
  return { at, slope: (t) => (-exponent * at(t)) / (criticalK - t) };
}
