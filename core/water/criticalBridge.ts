import { CRITICAL_TEMPERATURE_K } from './fluidCoefficients';
import { NEAREST_TO_CRITICAL_K } from './ranges';
import { CRITICAL_PRESSURE_PA } from './saturationAuxiliary';

const WIDTH_K = CRITICAL_TEMPERATURE_K - NEAREST_TO_CRITICAL_K;

/**
 * The saturation line on its last 1/1024 K, where double precision no longer tells the two densities apart: the
 * latent heat falls to zero as a power of Tc - T, the pressure reaches pc on a parabola, both without a kink.
 */
export interface CriticalBridge {
  readonly pressure: number;
  readonly rise: number;
  readonly latent: number;
  readonly exponent: number;
}

/** Continues values and slopes of the line at its last solved point; latent heat in any unit. */
export function criticalBridge(
  pressurePa: number,
  pressureSlope: number,
  latent: number,
  latentSlope: number,
): CriticalBridge {
  return {
    pressure: pressurePa,
    rise: pressureSlope * WIDTH_K,
    latent,
    exponent: (-latentSlope * WIDTH_K) / latent,
  };
}

export function bridgePressure({ pressure, rise }: CriticalBridge, temperatureK: number): number {
  const way = (temperatureK - NEAREST_TO_CRITICAL_K) / WIDTH_K;
  return pressure + way * (rise + way * (CRITICAL_PRESSURE_PA - pressure - rise));
}

export function bridgeLatent({ latent, exponent }: CriticalBridge, temperatureK: number): number {
  return latent * ((CRITICAL_TEMPERATURE_K - temperatureK) / WIDTH_K) ** exponent;
}
