import { bridgeLatent, bridgePressure, criticalBridge, type CriticalBridge } from './criticalBridge';
import { NEAREST_TO_CRITICAL_K } from './ranges';
import { emptySaturationState, solveSaturation, type SaturationState } from './saturationState';

const scratch = emptySaturationState();
let solvedAt = Number.NaN;

/** Equilibrium of liquid and vapour; the last temperature is remembered, since a value and its slope are often asked together. */
export function saturationAt(temperatureK: number): SaturationState {
  if (temperatureK !== solvedAt) {
    solveSaturation(temperatureK, scratch);
    solvedAt = temperatureK;
  }
  return scratch;
}

let bridge: CriticalBridge | undefined;

function lastStretch(): CriticalBridge {
  if (bridge === undefined) {
    const { liquid, vapour, pressure, slope } = saturationAt(NEAREST_TO_CRITICAL_K);
    const latent = vapour.enthalpy - liquid.enthalpy;
    bridge = criticalBridge(pressure, slope, latent, vaporizationSlope(NEAREST_TO_CRITICAL_K));
  }
  return bridge;
}

/** Pressure of the liquid-vapour line, Pa, 235 K to 647.096 K; metastable below 273.16 K. */
export function liquidVapourPressure(temperatureK: number): number {
  return temperatureK <= NEAREST_TO_CRITICAL_K
    ? saturationAt(temperatureK).pressure
    : bridgePressure(lastStretch(), temperatureK);
}

/** Heat of vaporization along the liquid-vapour line, J/kg, 235 K to 647.096 K where it is zero. */
export function vaporizationHeat(temperatureK: number): number {
  if (temperatureK > NEAREST_TO_CRITICAL_K) return bridgeLatent(lastStretch(), temperatureK);
  const { liquid, vapour } = saturationAt(temperatureK);
  return vapour.enthalpy - liquid.enthalpy;
}

/** dh/dT along the line is cp + [v - T (dv/dT)p] dp/dT in each phase; this is the difference of the second part, J/(kg K). */
export function vaporizationTerm(temperatureK: number): number {
  const { liquid, vapour, slope } = saturationAt(temperatureK);
  return (
    (vapour.volume - liquid.volume - temperatureK * (vapour.volumeByTemperature - liquid.volumeByTemperature)) * slope
  );
}

/** Slope of the heat of vaporization along the line, J/(kg K), to `NEAREST_TO_CRITICAL_K`. */
export function vaporizationSlope(temperatureK: number): number {
  const { liquid, vapour } = saturationAt(temperatureK);
  return vapour.cp - liquid.cp + vaporizationTerm(temperatureK);
}
