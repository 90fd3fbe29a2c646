import { shortNumber } from '../problem';
import type { Curve, Phase } from '../substance';
import { STANDARD_PRESSURE_PA } from './constants';
import { branchCurve } from './branchCurve';
import { fluidBranch, idealBranch, type FluidBranch } from './fluidBranch';
import { fluidCurve } from './fluidCurve';
import { lineMarks, NO_MARKS, solidMarks, unconfirmedMark } from './fluidMarks';
import { lacking, requireGas, type FluidParts } from './fluidParts';
import { spreadAt } from './spreadAt';

/** Relative standard uncertainty of an ideal-gas heat capacity. */
const IDEAL_SPREAD = 0.005;

/** Relative standard uncertainty of the departure of a real vapour's heat capacity. */
const DEPARTURE_SPREAD = 0.15;

/** Relative standard uncertainty of a solid's heat capacity that is known at one temperature or two. */
const SOLID_SPREAD = 0.05;

/** Heat capacity of a phase at a pressure or on its saturation line, or in its standard state (gas: ideal). */
export function heatCapacities(parts: FluidParts, phase: Phase, at: number | 'saturated' | 'standard'): Curve {
  const { name } = parts.numbers;
  if (at === 'saturated') return saturated(parts, phase);
  if (at === 'standard') {
    const branch = phase === 'gas' ? idealBranch(parts) : fluidBranch(parts, phase, STANDARD_PRESSURE_PA);
    const curve = along(parts, phase, branch, `heat capacity of ${phase} ${name} in its standard state`);
    return { ...curve, kind: 'standard' };
  }
  const branch = fluidBranch(parts, phase, at);
  return along(parts, phase, branch, `heat capacity of ${phase} ${name} at ${shortNumber(at)} Pa`);
}

function saturated(parts: FluidParts, phase: Phase): Curve {
  const { numbers, line, liquid, solid, sublimation } = parts;
  const { name, lineFromK, criticalK, vapourToK, meltingK } = numbers;
  const subject = `heat capacity of saturated ${phase} ${name}`;
  const shared = {
    subject,
    unit: 'J/(mol K)',
    method: 'isobaric heat capacity on the saturation line',
    sources: sourcesOf(parts, phase),
  } as const;
  if (phase === 'liquid') {
    return fluidCurve({
      ...shared,
      from: lineFromK,
      to: 0.99 * criticalK,
      value: liquid.saturatedHeatCapacity,
      uncertaintyAt: (k) => liquidSpread(parts, k) * liquid.saturatedHeatCapacity(k),
      marksAt: lineMarks(numbers, 'liquid heat capacity'),
    });
  }
  if (phase === 'gas') {
    const gas = requireGas(parts);
    const value = (k: number): number => gas.heatCapacity(k, line.pressure(k));
    return fluidCurve({
      ...shared,
      from: lineFromK,
      to: vapourToK,
      value,
      uncertaintyAt: (k) => gasSpread(gas.idealHeatCapacity(k), value(k)),
      marksAt: lineMarks(numbers, 'vapour'),
    });
  }
  if (solid === undefined || sublimation === undefined) throw lacking(`heat capacity of solid ${name}`);
  return fluidCurve({
    ...shared,
    from: solid.fromK,
    to: meltingK,
    value: solid.heatCapacity,
    uncertaintyAt: (k) => SOLID_SPREAD * solid.heatCapacity(k),
    marksAt: () => solidMarks(numbers),
  });
}

/** The curve of a branch's heat capacity, with the uncertainty of its phase. */
function along(parts: FluidParts, phase: Phase, branch: FluidBranch, subject: string): Curve {
  const { numbers, gas } = parts;
  const uncertainty = {
    solid: (k: number) => SOLID_SPREAD * branch.heatCapacity(k),
    liquid: (k: number) => liquidSpread(parts, k) * branch.heatCapacity(k),
    gas: (k: number) => gasSpread(gas?.idealHeatCapacity(k) ?? 0, branch.heatCapacity(k)),
  }[phase];
  const doubtful = phase === 'liquid' && numbers.unconfirmed.has('liquid heat capacity');
  const extra = doubtful ? unconfirmedMark('liquid heat capacity') : NO_MARKS;
  return branchCurve(branch, {
    subject,
    unit: 'J/(mol K)',
    method: branch.method,
    sources: sourcesOf(parts, phase),
    value: branch.heatCapacity,
    uncertaintyAt: uncertainty,
    marksAt: (k) => (extra.length === 0 ? branch.marks(k) : [...branch.marks(k), ...extra]),
  });
}

function liquidSpread({ numbers }: FluidParts, k: number): number {
  return spreadAt(numbers.spread.nodes, numbers.spread.heatCapacity, k / numbers.criticalK);
}

function gasSpread(ideal: number, real: number): number {
  return Math.hypot(IDEAL_SPREAD * ideal, DEPARTURE_SPREAD * (real - ideal));
}

function sourcesOf({ numbers }: FluidParts, phase: Phase): readonly string[] {
  if (phase === 'solid') return numbers.solid === undefined ? [] : [numbers.solid.source];
  return phase === 'liquid' ? numbers.sources.heatCapacity : numbers.sources.gas;
}

const listed = new WeakMap<FluidParts, Map<Phase, readonly string[]>>();

/** The same list at each call: rows with a pressure each ask for it again. */
function enthalpySources(parts: FluidParts, phase: Phase): readonly string[] {
  const own = listed.get(parts) ?? new Map<Phase, readonly string[]>();
  listed.set(parts, own);
  const known = own.get(phase) ?? [...new Set([...sourcesOf(parts, phase), ...parts.numbers.sources.latent])];
  own.set(phase, known);
  return known;
}

/** Enthalpy of a phase at a pressure, metastable continuations included; vapour below where it is followed is ideal. */
export function enthalpies(parts: FluidParts, phase: Phase, pressurePa: number): Curve {
  const branch = fluidBranch(parts, phase, pressurePa);
  const subject = `enthalpy of ${phase} ${parts.numbers.name} at ${shortNumber(pressurePa)} Pa`;
  const shared = {
    subject,
    unit: 'J/mol',
    method: branch.method,
    sources: enthalpySources(parts, phase),
  } as const;
  if (phase !== 'gas') return branchCurve(branch, { ...shared, value: branch.enthalpy, marksAt: branch.marks });
  const ideal = idealBranch(parts);
  const isIdeal = (k: number): boolean => k < branch.stableFromK && k < branch.fromK;
  return fluidCurve({
    ...shared,
    from: ideal.fromK,
    to: branch.toK,
    value: (k) => (isIdeal(k) ? ideal.enthalpy(k) : branch.enthalpy(k)),
    marksAt: (k) => (isIdeal(k) ? ideal.marks(k) : branch.marks(k)),
  });
}
