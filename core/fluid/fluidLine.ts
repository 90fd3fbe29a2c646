import { MOLAR_GAS_CONSTANT } from './constants';
import type { FluidNumbers } from './fluidNumbers';
import { reducedLatent, reducedLatentSlope } from './latentLine';
import { reducedLiquid, reducedLiquidSlope } from './liquidLine';
import { lnPressureCurvature, lnPressureSlope, lnReducedPressure } from './wagner';

/** The saturation line of a fluid in SI units; temperatures below the critical one. */
export interface FluidLine {
  /** Pa */
  readonly pressure: (temperatureK: number) => number;
  /** d ln p/dT, 1/K */
  readonly lnSlope: (temperatureK: number) => number;
  /** d² ln p/dT², 1/K² */
  readonly lnCurvature: (temperatureK: number) => number;
  /** K */
  readonly temperature: (pressurePa: number) => number;
  /** Heat of vaporization, J/mol, and its slope along the line. */
  readonly latent: (temperatureK: number) => number;
  readonly latentSlope: (temperatureK: number) => number;
  /** Enthalpy of the saturated liquid, J/mol, and its slope along the line. */
  readonly liquid: (temperatureK: number) => number;
  readonly liquidSlope: (temperatureK: number) => number;
}

const MOST_STEPS = 60;

export function fluidLine(numbers: FluidNumbers): FluidLine {
  const { criticalK, criticalPa, pressure, latent, liquid } = numbers;
  const rc = MOLAR_GAS_CONSTANT * criticalK;
  const coldLn = lnReducedPressure(pressure, numbers.lineFromK / criticalK);
  const coldInverse = criticalK / numbers.lineFromK;

  /** Newton's method for ln p against 1/T, which is nearly a straight line. */
  function temperature(pressurePa: number): number {
    const ln = Math.log(pressurePa / criticalPa);
    if (ln === 0) return criticalK;
    let u = 1 + ((coldInverse - 1) * ln) / coldLn;
    for (let i = 0; i < MOST_STEPS; i++) {
      const t = 1 / u;
      const step = (lnReducedPressure(pressure, t) - ln) / (lnPressureSlope(pressure, t) * t * t);
      u = Math.max(u + step, 1 + 1e-15);
      if (Math.abs(step) < 1e-15 * u) break;
    }
    return criticalK / u;
  }

  return {
    pressure: (k) => criticalPa * Math.exp(lnReducedPressure(pressure, k / criticalK)),
    lnSlope: (k) => lnPressureSlope(pressure, k / criticalK) / criticalK,
    lnCurvature: (k) => lnPressureCurvature(pressure, k / criticalK) / (criticalK * criticalK),
    temperature,
    latent: (k) => rc * reducedLatent(latent, k / criticalK),
    latentSlope: (k) => MOLAR_GAS_CONSTANT * reducedLatentSlope(latent, k / criticalK),
    liquid: (k) => rc * reducedLiquid(liquid, k / criticalK),
    liquidSlope: (k) => MOLAR_GAS_CONSTANT * reducedLiquidSlope(liquid, k / criticalK),
  };
}
