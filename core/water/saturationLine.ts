import { CRITICAL_TEMPERATURE_K } from './fluidCoefficients';
import { NEAREST_TO_CRITICAL_K } from './ranges';
import { CRITICAL_PRESSURE_PA } from './saturationAuxiliary';
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

const BRIDGE_K = CRITICAL_TEMPERATURE_K - NEAREST_TO_CRITICAL_K;

/** Last solved point of the line, and the exponent with which the latent heat goes on to zero at Tc. */
interface Bridge {
  readonly pressure: number;
  readonly pressureSlope: number;
  readonly latent: number;
  readonly exponent: number;
}
let bridge: Bridge | undefined;

function lastMillikelvin(): Bridge {
  if (bridge === undefined) {
    const state = saturationAt(NEAREST_TO_CRITICAL_K);
    const latent = state.vapour.enthalpy - state.liquid.enthalpy;
    bridge = {
      pressure: state.pressure,
      pressureSlope: state.slope,
      latent,
      exponent: (-vaporizationSlope(NEAREST_TO_CRITICAL_K) * BRIDGE_K) / latent,
    };
  }
  return bridge;
}

/** Pressure of the liquid-vapour line, Pa, 235 K to 647.096 K; metastable below 273.16 K. */
export function liquidVapourPressure(temperatureK: number): number {
  if (temperatureK <= NEAREST_TO_CRITICAL_K) return saturationAt(temperatureK).pressure;
  const { pressure, pressureSlope } = lastMillikelvin();
  const way = (temperatureK - NEAREST_TO_CRITICAL_K) / BRIDGE_K;
  const rise = pressureSlope * BRIDGE_K;
  return pressure + way * (rise + way * (CRITICAL_PRESSURE_PA - pressure - rise));
}

/** Heat of vaporization along the liquid-vapour line, J/kg, 235 K to 647.096 K where it is zero. */
export function vaporizationHeat(temperatureK: number): number {
  if (temperatureK <= NEAREST_TO_CRITICAL_K) {
    const { liquid, vapour } = saturationAt(temperatureK);
    return vapour.enthalpy - liquid.enthalpy;
  }
  const { latent, exponent } = lastMillikelvin();
  return latent * ((CRITICAL_TEMPERATURE_K - temperatureK) / BRIDGE_K) ** exponent;
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
