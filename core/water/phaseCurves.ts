import { Problem, shortNumber } from '../problem';
import type { Curve, Phase } from '../substance';
import { NEAR_CRITICAL } from './coexistenceCurves';
import { sublimationAt } from './iceEquilibriumLines';
import { dewOrFrostTemperature } from './boundaries';
import { idealGasBranch, phaseBranch, type PhaseBranch } from './phaseBranch';
import {
  COLDEST_LIQUID_K,
  COLDEST_VAPOUR_K,
  HOTTEST_FLUID_K,
  NEAREST_TO_CRITICAL_K,
  NEAR_CRITICAL_K,
  NORMAL_PRESSURE_PA,
  STANDARD_PRESSURE_PA,
  TRIPLE_K,
} from './ranges';
import { sampled } from './sampledBranch';
import { saturationAt } from './saturationLine';
import { CRITICAL_PRESSURE_PA } from './saturationAuxiliary';
import { R10_06, R6_95 } from './sources';
import { waterCurve } from './waterCurve';

const NAMES: Readonly<Record<Phase, string>> = { solid: 'ice Ih', liquid: 'liquid water', gas: 'water vapour' };

function along(
  phase: Phase,
  range: readonly [number, number],
  sources: readonly string[],
  perKilogram: (temperatureK: number) => number,
): Curve {
  const [from, to] = range;
  return waterCurve({
    from,
    to,
    subject: `heat capacity of saturated ${NAMES[phase]}`,
    unit: 'J/(mol K)',
    method: 'isobaric heat capacity at the two-phase line',
    sources,
    perKilogram: (t) => (t >= from && t <= to ? perKilogram(t) : Number.NaN),
    marksAt: (t) =>
      t > NEAR_CRITICAL_K
        ? NEAR_CRITICAL
        : phase === 'liquid' && t < TRIPLE_K
          ? [{ code: 'metastable', text: 'supercooled liquid: ice is the stable phase here' }]
          : [],
  });
}

/** Saturated vapour is in equilibrium with the stable condensed phase: with ice below the triple point. */
const saturated: Readonly<Record<Phase, Curve>> = {
  solid: along('solid', [COLDEST_VAPOUR_K, TRIPLE_K], [R10_06, R6_95], (t) => sublimationAt(t).ice.cp),
  liquid: along('liquid', [COLDEST_LIQUID_K, NEAREST_TO_CRITICAL_K], [R6_95], (t) => saturationAt(t).liquid.cp),
  gas: along('gas', [COLDEST_VAPOUR_K, NEAREST_TO_CRITICAL_K], [R6_95, R10_06], (t) =>
    t < TRIPLE_K ? sublimationAt(t).vapour.cp : saturationAt(t).vapour.cp,
  ),
};

function branchCurve(branch: PhaseBranch, subject: string, answered: 'enthalpy' | 'heatCapacity'): Curve {
  return waterCurve({
    from: branch.fromK,
    to: branch.toK,
    subject,
    unit: answered === 'enthalpy' ? 'J/mol' : 'J/(mol K)',
    method: branch.method,
    sources: branch.sources,
    perKilogram: (t) => branch[answered](t),
    marksAt: (t) => branch.marks(t),
  });
}

/** Heat capacity of a real phase at a pressure or on its two-phase line, or in its standard state (gas: ideal). */
export function heatCapacityCurve(phase: Phase, at: number | 'saturated' | 'standard'): Curve {
  if (at === 'saturated') return saturated[phase];
  if (at === 'standard') {
    const branch = phase === 'gas' ? idealGasBranch : phaseBranch(phase, STANDARD_PRESSURE_PA);
    const curve = branchCurve(branch, `heat capacity of ${NAMES[phase]} in its standard state`, 'heatCapacity');
    return { ...curve, kind: 'standard' };
  }
  requireNumber(at);
  return at === NORMAL_PRESSURE_PA ? atOneAtmosphere(phase) : atPressure(phase, at);
}

function atPressure(phase: Phase, pressurePa: number): Curve {
  return branchCurve(
    phaseBranch(phase, pressurePa),
    `heat capacity of ${NAMES[phase]} at ${shortNumber(pressurePa)} Pa`,
    'heatCapacity',
  );
}

/** Outside these the heat capacity of supercooled or superheated liquid bends too sharply for pieces of even width. */
const SMOOTH: Readonly<Record<'liquid' | 'gas', readonly [number, number]>> = {
  liquid: [245, 580],
  gas: [COLDEST_VAPOUR_K, HOTTEST_FLUID_K],
};

const normal = new Map<Phase, Curve>();

function keptAsSeries(curve: Curve, [from, to]: readonly [number, number]): (temperatureK: number) => number {
  return sampled((t) => curve.at(t), Math.max(curve.from, from), Math.min(curve.to, to));
}

/** One atmosphere is what most cells ask for: its curves are kept as series through their own values. */
function atOneAtmosphere(phase: Phase): Curve {
  let curve = normal.get(phase);
  if (curve === undefined) {
    const exact = atPressure(phase, NORMAL_PRESSURE_PA);
    curve = phase === 'solid' ? exact : { ...exact, at: keptAsSeries(exact, SMOOTH[phase]) };
    normal.set(phase, curve);
  }
  return curve;
}

function requireNumber(pressurePa: number): void {
  if (Number.isFinite(pressurePa)) return;
  throw new Problem({
    code: 'argument',
    argument: 'pressure',
    allowed: 'a finite number',
    received: String(pressurePa),
  });
}

/**
 * Enthalpy of a phase at a pressure. Vapour below its condensation temperature is the ideal-gas vapour and marked so:
 * the metastable branch of the equation ends at a spinodal that is not water's.
 */
export function enthalpyCurve(phase: Phase, pressurePa: number): Curve {
  requireNumber(pressurePa);
  const branch = phaseBranch(phase, pressurePa);
  const curve = branchCurve(branch, `enthalpy of ${NAMES[phase]} at ${shortNumber(pressurePa)} Pa`, 'enthalpy');
  if (phase !== 'gas' || pressurePa >= CRITICAL_PRESSURE_PA) return curve;
  const condensesAt = dewOrFrostTemperature(pressurePa);
  const ideal = branchCurve(idealGasBranch, curve.subject, 'enthalpy');
  return {
    ...curve,
    from: COLDEST_VAPOUR_K,
    at: (t) => (t < condensesAt ? ideal.at(t) : curve.at(t)),
    marksAt: (t) => (t < condensesAt ? idealGasBranch.marks(t) : []),
  };
}
