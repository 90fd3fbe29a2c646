import { dewOrFrostTemperature } from './boundaries';
import { fluidStateAt, type FluidPhase } from './fluidDensity';
import { emptyFluidState } from './fluidState';
import { sublimationAt } from './iceEquilibriumLines';
import { liquidVapourTemperature } from './lineTemperature';
import { COLDEST_VAPOUR_K, NEAREST_TO_CRITICAL_K, TRIPLE_K } from './ranges';
import { remember } from '../remember';
import { saturationAt } from './saturationLine';

const state = emptyFluidState();

/**
 * A metastable branch is followed until its heat capacity is one and a half times that of the saturated phase at the
 * same temperature. It grows without bound at the spinodal of the equation, and long before that it is a feature of the
 * equation, not of water (our own rule; at 101.325 kPa it ends supersaturated vapour near 345 K).
 */
const HIGHEST_GROWTH = 1.5;

function sound(temperatureK: number, pressurePa: number, phase: FluidPhase): boolean {
  if (!fluidStateAt(temperatureK, pressurePa, phase, state)) return false;
  const saturated =
    temperatureK < TRIPLE_K ? sublimationAt(temperatureK).vapour : saturationAt(temperatureK)[SATURATED[phase]];
  return state.cp <= HIGHEST_GROWTH * saturated.cp;
}
const SATURATED = { liquid: 'liquid', gas: 'vapour' } as const;

/** Walks off the stable side in growing steps, so that no state beyond the edge is mistaken for one before it. */
function edge(pressurePa: number, phase: FluidPhase, stable: number, end: number): number {
  let good = stable;
  let step = Math.sign(end - stable) * 1e-3;
  for (;;) {
    const next = Math.abs(end - good) <= Math.abs(step) ? end : good + step;
    if (!sound(next, pressurePa, phase)) return between(pressurePa, phase, good, next);
    if (next === end) return end;
    good = next;
    step = Math.sign(step) * Math.min(2 * Math.abs(step), 5);
  }
}

function between(pressurePa: number, phase: FluidPhase, inside: number, outside: number): number {
  let good = inside;
  let bad = outside;
  while (Math.abs(good - bad) > 1e-6) {
    const middle = 0.5 * (good + bad);
    if (sound(middle, pressurePa, phase)) good = middle;
    else bad = middle;
  }
  return good;
}

/** Highest temperature of superheated liquid at a pressure below the critical one, K. */
export const liquidLimit = remember((pressurePa) => {
  const boils = Math.max(liquidVapourTemperature(pressurePa), TRIPLE_K);
  return boils >= NEAREST_TO_CRITICAL_K ? boils : edge(pressurePa, 'liquid', boils, NEAREST_TO_CRITICAL_K);
});

/** Lowest temperature of supersaturated vapour at a pressure below the critical one, K. */
export const vapourLimit = remember((pressurePa) => {
  const condenses = Math.min(dewOrFrostTemperature(pressurePa), NEAREST_TO_CRITICAL_K);
  return condenses <= COLDEST_VAPOUR_K ? condenses : edge(pressurePa, 'gas', condenses, COLDEST_VAPOUR_K);
});
