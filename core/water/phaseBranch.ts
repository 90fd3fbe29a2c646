import type { Mark } from '../answer';
import { Problem } from '../problem';
import type { Phase } from '../substance';
import { boilingTemperature, dewOrFrostTemperature, meltingTemperature } from './boundaries';
import { CRITICAL_TEMPERATURE_K } from './fluidCoefficients';
import { fluidStateAt, type FluidPhase } from './fluidDensity';
import { emptyFluidState } from './fluidState';
import { HIGHEST_ICE_IH_PRESSURE_PA } from './iceLines';
import { emptyIceState, iceState } from './iceState';
import { idealGasEnthalpy, idealGasHeatCapacity } from './idealGas';
import { liquidLimit, vapourLimit } from './metastableLimits';
import {
  COLDEST_LIQUID_K,
  COLDEST_VAPOUR_K,
  HIGHEST_PRESSURE_PA,
  HOTTEST_FLUID_K,
  LOWEST_PRESSURE_PA,
  TRIPLE_K,
  TRIPLE_PRESSURE_PA,
} from './ranges';
import { CRITICAL_PRESSURE_PA } from './saturationAuxiliary';
import { remember } from '../remember';
import { R10_06, R6_95 } from './sources';
import { sublimationTemperature } from './lineTemperature';

/** One phase at one pressure: where its equation holds, where it is the stable phase, and its two curves per kilogram. */
export interface PhaseBranch {
  readonly fromK: number;
  readonly toK: number;
  readonly method: string;
  readonly sources: readonly string[];
  /** J/kg; NaN where the equation has no such state. */
  enthalpy(temperatureK: number): number;
  /** J/(kg K) */
  heatCapacity(temperatureK: number): number;
  marks(temperatureK: number): readonly Mark[];
}

const NO_MARKS: readonly Mark[] = [];
const mark = (text: string): readonly Mark[] => [{ code: 'metastable', text }];
const SUPERCOOLED = mark('supercooled liquid: ice is the stable phase here');
const SUPERHEATED_LIQUID = mark('superheated liquid: vapour is the stable phase here');
const LIQUID_BELOW_TRIPLE = mark('liquid below the triple-point pressure: ice or vapour is the stable phase here');
const SUPERHEATED_ICE = mark('ice above its transition temperature: another phase is stable here');
const SUPERSATURATED = mark('supersaturated vapour: liquid or ice is the stable phase here');
const IDEAL: readonly Mark[] = [{ code: 'ideal-gas', text: 'ideal-gas water vapour' }];

/** How far ice is followed above its melting temperature under pressure, K. */
const ICE_OVERHEAT_K = 1;

const fluid = emptyFluidState();
const ice = emptyIceState();

function requirePressure(pressurePa: number, to: number, subject: string): void {
  if (pressurePa >= LOWEST_PRESSURE_PA && pressurePa <= to) return;
  throw new Problem({
    code: 'range',
    argument: 'pressure',
    quantity: 'pressure',
    received: pressurePa,
    from: LOWEST_PRESSURE_PA,
    to,
    subject,
  });
}

function fluidBranch(pressurePa: number, phase: FluidPhase) {
  return {
    method: 'Helmholtz equation of state',
    sources: [R6_95],
    enthalpy: (t: number) =>
      reachable(t, phase) && fluidStateAt(t, pressurePa, phase, fluid) ? fluid.enthalpy : Number.NaN,
    heatCapacity: (t: number) =>
      reachable(t, phase) && fluidStateAt(t, pressurePa, phase, fluid) ? fluid.cp : Number.NaN,
  };
}

/** Outside these the equation is not extended, whatever the policy. */
function reachable(temperatureK: number, phase: FluidPhase): boolean {
  return temperatureK >= (phase === 'gas' ? COLDEST_VAPOUR_K : COLDEST_LIQUID_K);
}

function makeSolid(pressurePa: number): PhaseBranch {
  requirePressure(pressurePa, HIGHEST_ICE_IH_PRESSURE_PA, 'ice Ih, the only ice with an equation here');
  const transition =
    pressurePa < TRIPLE_PRESSURE_PA ? sublimationTemperature(pressurePa) : meltingTemperature(pressurePa);
  const toK = pressurePa < TRIPLE_PRESSURE_PA ? TRIPLE_K : Math.min(TRIPLE_K, transition + ICE_OVERHEAT_K);
  const inside = (t: number) => t >= 0 && t <= toK;
  return {
    fromK: 0,
    toK,
    method: 'Gibbs equation of state',
    sources: [R10_06],
    enthalpy: (t) => (inside(t) ? iceState(t, pressurePa, ice).enthalpy : Number.NaN),
    heatCapacity: (t) => (inside(t) ? iceState(t, pressurePa, ice).cp : Number.NaN),
    marks: (t) => (t > transition ? SUPERHEATED_ICE : NO_MARKS),
  };
}

function makeLiquid(pressurePa: number): PhaseBranch {
  requirePressure(pressurePa, HIGHEST_PRESSURE_PA, 'liquid water');
  const melting = pressurePa < TRIPLE_PRESSURE_PA ? Infinity : meltingTemperature(pressurePa);
  const boiling = pressurePa < CRITICAL_PRESSURE_PA ? boilingTemperature(pressurePa) : Infinity;
  return {
    ...fluidBranch(pressurePa, 'liquid'),
    fromK: pressurePa <= HIGHEST_ICE_IH_PRESSURE_PA ? COLDEST_LIQUID_K : melting,
    toK: pressurePa < CRITICAL_PRESSURE_PA ? liquidLimit(pressurePa) : CRITICAL_TEMPERATURE_K,
    marks: (t) =>
      melting === Infinity
        ? LIQUID_BELOW_TRIPLE
        : t < melting
          ? SUPERCOOLED
          : t > boiling
            ? SUPERHEATED_LIQUID
            : NO_MARKS,
  };
}

function makeGas(pressurePa: number): PhaseBranch {
  requirePressure(pressurePa, HIGHEST_PRESSURE_PA, 'water vapour');
  const stableFrom = pressurePa < CRITICAL_PRESSURE_PA ? dewOrFrostTemperature(pressurePa) : CRITICAL_TEMPERATURE_K;
  return {
    ...fluidBranch(pressurePa, 'gas'),
    fromK: pressurePa < CRITICAL_PRESSURE_PA ? vapourLimit(pressurePa) : CRITICAL_TEMPERATURE_K,
    toK: HOTTEST_FLUID_K,
    marks: (t) => (t < stableFrom ? SUPERSATURATED : NO_MARKS),
  };
}

const solid = remember(makeSolid);
const liquid = remember(makeLiquid);
const gas = remember(makeGas);

/** The branch of a phase at a pressure. Above the critical pressure liquid ends and gas begins at Tc. */
export function phaseBranch(phase: Phase, pressurePa: number): PhaseBranch {
  return phase === 'solid' ? solid(pressurePa) : phase === 'liquid' ? liquid(pressurePa) : gas(pressurePa);
}

/** Vapour as an ideal gas, 130 K to 1273 K, at any pressure. */
export const idealGasBranch: PhaseBranch = {
  fromK: COLDEST_VAPOUR_K,
  toK: HOTTEST_FLUID_K,
  method: 'ideal-gas part of the Helmholtz equation of state',
  sources: [R6_95],
  enthalpy: (t) => (t >= COLDEST_VAPOUR_K ? idealGasEnthalpy(t) : Number.NaN),
  heatCapacity: (t) => (t >= COLDEST_VAPOUR_K ? idealGasHeatCapacity(t) : Number.NaN),
  marks: () => IDEAL,
};
