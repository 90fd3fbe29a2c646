import type { Shape } from './shape';

/**
 * Heat of vaporization L(T) = A exp(−α Tr) (1 − Tr)^β with Tr = T/Tc, zero from the critical temperature on.
 *
 * @param heat A
 * @param alpha α
 * @param beta β
 * @param criticalK Tc
 * @source V. Majer and V. Svoboda, Enthalpies of Vaporization of Organic Compounds, IUPAC Chemical Data Series 32 (1985)
 */
export function majerSvobodaShape(heat: number, alpha: number, beta: number, criticalK: number): Shape {
  const at = (t: number): number => {
    const r = t / criticalK;
    return r >= 1 ? 0 : heat * Math.exp(-alpha * r) * (1 - r) ** beta;
  };
  return { at, slope: (t) => -at(t) * (alpha / criticalK + beta / (criticalK - t)) };
}
