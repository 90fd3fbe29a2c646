import { sublimationAt } from './iceEquilibriumLines';
import { COLDEST_LIQUID_K, COLDEST_VAPOUR_K, NEAREST_TO_CRITICAL_K, TRIPLE_K } from './ranges';
import { CRITICAL_TEMPERATURE_K } from './fluidCoefficients';
import { liquidVapourPressure, saturationAt } from './saturationLine';

/** Newton's method for ln p as a function of 1/T, in which both lines are nearly straight. */
function invert(
  pressurePa: number,
  line: (temperatureK: number) => { readonly pressure: number; readonly slope: number },
  low: number,
  high: number,
): number {
  const target = Math.log(pressurePa);
  let temperature = clamp(1 / (1 / 373.124 - (target - Math.log(101325)) / 5100), low, high);
  let lastStep = Infinity;
  for (let i = 0; i < 40; i++) {
    const { pressure, slope } = line(temperature);
    const next = clamp(
      1 / (1 / temperature - ((target - Math.log(pressure)) * pressure) / (slope * temperature * temperature)),
      low,
      high,
    );
    const step = Math.abs(next - temperature);
    temperature = next;
    if (step <= 1e-15 * temperature || (i > 3 && step < 1e-9 && step >= lastStep)) break;
    lastStep = step;
  }
  return temperature;
}

function clamp(value: number, low: number, high: number): number {
  return Math.min(Math.max(value, low), high);
}

/** Temperature of the liquid-vapour line at a pressure, K: the inverse of `liquidVapourPressure`. */
export function liquidVapourTemperature(pressurePa: number): number {
  const atBridge = liquidVapourPressure(NEAREST_TO_CRITICAL_K);
  if (pressurePa <= atBridge) return invert(pressurePa, saturationAt, COLDEST_LIQUID_K, NEAREST_TO_CRITICAL_K);
  let low = NEAREST_TO_CRITICAL_K;
  let high = CRITICAL_TEMPERATURE_K;
  for (let i = 0; i < 40; i++) {
    const middle = 0.5 * (low + high);
    if (liquidVapourPressure(middle) < pressurePa) low = middle;
    else high = middle;
  }
  return high;
}

/** Temperature of the ice-vapour line at a pressure, K: the inverse of `sublimationPressure`. */
export function sublimationTemperature(pressurePa: number): number {
  return invert(pressurePa, sublimationAt, COLDEST_VAPOUR_K, TRIPLE_K);
}
