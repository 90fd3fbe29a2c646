import { Problem, shortNumber } from '../problem';
import type { Gap, Ladder, Rung } from '../substance';
import { boilingTemperature, meltingTemperature } from './boundaries';
import { fluidStateAt, type FluidPhase } from './fluidDensity';
import { emptyFluidState } from './fluidState';
import { HIGHEST_ICE_IH_PRESSURE_PA } from './iceLines';
import { emptyIceState, iceState } from './iceState';
import { sublimationPressure } from './iceEquilibriumLines';
import { sublimationTemperature } from './lineTemperature';
import {
  COLDEST_VAPOUR_K,
  HIGHEST_PRESSURE_PA,
  HOTTEST_FLUID_K,
  MOLAR_MASS,
  NEAREST_TO_CRITICAL_K,
  TRIPLE_PRESSURE_PA,
} from './ranges';
import { remember } from '../remember';
import { liquidVapourPressure } from './saturationLine';
import { R10_06, R14_08, R6_95 } from './sources';

const fluid = emptyFluidState();
const ice = emptyIceState();

function solidRung(pressurePa: number, toK: number): Rung {
  return {
    phase: 'solid',
    fromK: 0,
    toK,
    enthalpy: (t) => MOLAR_MASS * iceState(t, pressurePa, ice).enthalpy,
  };
}

function fluidRung(pressurePa: number, phase: FluidPhase | 'supercritical', fromK: number, toK: number): Rung {
  const branch: FluidPhase = phase === 'gas' ? 'gas' : 'liquid';
  return {
    phase,
    fromK,
    toK,
    enthalpy: (t) => {
      if (fluidStateAt(t, pressurePa, branch, fluid)) return MOLAR_MASS * fluid.enthalpy;
      if (phase === 'supercritical' && fluidStateAt(t, pressurePa, 'gas', fluid)) return MOLAR_MASS * fluid.enthalpy;
      throw new Problem({
        code: 'range',
        argument: 'temperature',
        quantity: 'temperature',
        received: t,
        from: fromK,
        to: toK,
        subject: `${phase} water at ${shortNumber(pressurePa)} Pa`,
      });
    },
  };
}

function gapBetween(change: string, temperatureK: number, below: Rung, above: Rung): Gap {
  return { change, temperatureK, below: below.enthalpy(temperatureK), above: above.enthalpy(temperatureK) };
}

/** Above the reach of ice Ih the other ices have no equation here: the path starts at the melting curve and says so below it. */
function withoutSolid(rung: Rung): Rung {
  return {
    ...rung,
    enthalpy: (t) => {
      if (t >= rung.fromK) return rung.enthalpy(t);
      throw new Problem({
        code: 'missing',
        subject: 'ice above 208.566 MPa',
        reason: 'ice III, V and VI have no equation of state here; paths start at the melting curve',
      });
    },
  };
}

function make(pressurePa: number): Ladder {
  const sources = [R6_95, R10_06];
  if (pressurePa < TRIPLE_PRESSURE_PA) {
    const frost = sublimationTemperature(pressurePa);
    const solid = solidRung(pressurePa, frost);
    const gas = fluidRung(pressurePa, 'gas', frost, HOTTEST_FLUID_K);
    return { pressurePa, rungs: [solid, gas], gaps: [gapBetween('sublimation', frost, solid, gas)], sources };
  }
  const melting = meltingTemperature(pressurePa);
  if (pressurePa > HIGHEST_ICE_IH_PRESSURE_PA) {
    const only = withoutSolid(fluidRung(pressurePa, 'supercritical', melting, HOTTEST_FLUID_K));
    return { pressurePa, rungs: [only], gaps: [], sources: [R6_95, R14_08] };
  }
  const solid = solidRung(pressurePa, melting);
  if (pressurePa >= liquidVapourPressure(NEAREST_TO_CRITICAL_K)) {
    const above = fluidRung(pressurePa, 'supercritical', melting, HOTTEST_FLUID_K);
    return { pressurePa, rungs: [solid, above], gaps: [gapBetween('fusion', melting, solid, above)], sources };
  }
  const boiling = boilingTemperature(pressurePa);
  const liquid = fluidRung(pressurePa, 'liquid', melting, boiling);
  const gas = fluidRung(pressurePa, 'gas', boiling, HOTTEST_FLUID_K);
  return {
    pressurePa,
    rungs: [solid, liquid, gas],
    gaps: [gapBetween('fusion', melting, solid, liquid), gapBetween('vaporization', boiling, liquid, gas)],
    sources,
  };
}

const remembered = remember(make);

/**
 * Phases and transitions of water at one pressure, from 0 K (ice Ih) to 1273 K.
 *
 * Below the triple-point pressure ice sublimes; above the critical pressure (from 0.3 kPa below it, where the two fluid
 * phases can no longer be told apart) one rung leads from the melting curve to
 * 1273 K, liquid-like at its cold end; above 208.566 MPa there is no solid rung.
 *
 * @param pressurePa 1.2e-8 Pa (ice-vapour line at 130 K) to 1000 MPa
 * @throws Problem of code `range` outside
 * @source IAPWS R6-95(2018), R10-06(2009); melting of ice III, V, VI: R14-08(2011)
 */
export function waterLadder(pressurePa: number): Ladder {
  const lowest = sublimationPressure(COLDEST_VAPOUR_K);
  if (pressurePa >= lowest && pressurePa <= HIGHEST_PRESSURE_PA) return remembered(pressurePa);
  throw new Problem({
    code: 'range',
    argument: 'pressure',
    quantity: 'pressure',
    received: pressurePa,
    from: lowest,
    to: HIGHEST_PRESSURE_PA,
    subject: 'heating paths of water',
  });
}
