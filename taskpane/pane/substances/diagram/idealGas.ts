import type { Curve } from '../../../../core/substance';

/** How a vapour is called where it is followed as an ideal gas. */
export const IDEAL_GAS = 'ideal gas';

/** Whether a curve is that of the ideal gas at a temperature. */
export function isIdeal(curve: Curve, temperatureK: number): boolean {
  return curve.marksAt?.(temperatureK).some(({ code }) => code === 'ideal-gas') ?? false;
}
