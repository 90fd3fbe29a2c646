import type { Mark } from '../answer';
import { Problem } from '../problem';
import type { Phase } from '../substance';
import { NO_MARKS, solidMarks } from './fluidMarks';
import { lacking, requireGas, type FluidParts } from './fluidParts';

/** One phase at one pressure: where it is described, and its two curves. */
export interface FluidBranch {
  /** Ends with the metastable parts, searched for when first read. */
  readonly fromK: number;
  readonly toK: number;
  /** Inside these no search is needed. */
  readonly stableFromK: number;
  readonly stableToK: number;
  readonly method: string;
  /** J/mol; NaN where there is no such state. */
  readonly enthalpy: (temperatureK: number) => number;
  /** J/(mol K) */
  readonly heatCapacity: (temperatureK: number) => number;
  readonly marks: (temperatureK: number) => readonly Mark[];
}

const metastable = (text: string): readonly Mark[] => [{ code: 'metastable', text }];
const SUPERCOOLED = metastable('supercooled liquid: the solid is the stable phase here');
const SUPERHEATED = metastable('superheated liquid: vapour is the stable phase here');
const SUPERSATURATED = metastable('supersaturated vapour: liquid is the stable phase here');
const SUBCOOLED = metastable('supersaturated vapour: the solid is the stable phase here');
const IDEAL: readonly Mark[] = [{ code: 'ideal-gas', text: 'ideal gas' }];

/** A metastable branch is followed until its heat capacity has grown by half since the saturated phase. */
const HIGHEST_GROWTH = 1.5;

/** And until it falls below this part of the ideal gas's. */
const LEAST_OF_IDEAL = 0.95;

/** Liquid is described to this part of the critical temperature where it does not boil before. */
const HOTTEST_LIQUID = 0.95;

/** Vapour and ideal gas end here at the latest, K. */
const HOTTEST_GAS_K = 1500;

/** Lowest pressure of the liquid and of paths, Pa. */
export const LOWEST_PRESSURE_PA = 1e-10;

export function requirePressure(pressurePa: number, to: number, subject: string): void {
  if (pressurePa >= LOWEST_PRESSURE_PA && pressurePa <= to) return;
  if (!Number.isFinite(pressurePa)) {
    throw new Problem({
      code: 'argument',
      argument: 'pressure',
      allowed: 'a finite number',
      received: String(pressurePa),
    });
  }
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

/** The branch of a phase at a pressure. */
export function fluidBranch(parts: FluidParts, phase: Phase, pressurePa: number): FluidBranch {
  return phase === 'solid'
    ? solidBranch(parts)
    : phase === 'liquid'
      ? liquidBranch(parts, pressurePa)
      : gasBranch(parts, pressurePa);
}

function solidBranch({ solid, numbers }: FluidParts): FluidBranch {
  if (solid === undefined) throw lacking(`heat capacity of solid ${numbers.name}`);
  const marks = solidMarks(numbers);
  return {
    fromK: solid.fromK,
    toK: numbers.meltingK,
    stableFromK: solid.fromK,
    stableToK: numbers.meltingK,
    method: 'enthalpy of fusion and heat capacity of the solid',
    enthalpy: solid.enthalpy,
    heatCapacity: solid.heatCapacity,
    marks: () => marks,
  };
}

function liquidBranch({ liquid, line, numbers, highestLiquidPa }: FluidParts, pressurePa: number): FluidBranch {
  const { name, lineFromK, meltingK, criticalK, vapourToK } = numbers;
  requirePressure(pressurePa, highestLiquidPa, `liquid ${name}`);
  const boils = pressurePa < line.pressure(vapourToK) ? line.temperature(pressurePa) : Infinity;
  const end = HOTTEST_LIQUID * criticalK;
  const sound = (k: number): boolean =>
    liquid.heatCapacity(k, pressurePa) <= HIGHEST_GROWTH * liquid.saturatedHeatCapacity(k);
  const stableToK = boils === Infinity ? end : Math.max(boils, lineFromK);
  let toK: number | undefined = boils === Infinity ? end : undefined;
  return {
    fromK: lineFromK,
    get toK() {
      return (toK ??= edge(sound, stableToK, Math.max(boils, end)));
    },
    stableFromK: lineFromK,
    stableToK,
    method: 'enthalpy of the saturated liquid and its change with pressure',
    enthalpy: (k) => (k < criticalK ? liquid.enthalpy(k, pressurePa) : NaN),
    heatCapacity: (k) => (k < criticalK ? liquid.heatCapacity(k, pressurePa) : NaN),
    marks: (k) => (k < meltingK ? SUPERCOOLED : k > boils ? SUPERHEATED : NO_MARKS),
  };
}

function gasBranch(parts: FluidParts, pressurePa: number): FluidBranch {
  const { numbers, highestVapourPa } = parts;
  const gas = requireGas(parts);
  requirePressure(pressurePa, highestVapourPa, `${numbers.name} vapour`);
  const coldest = coldestVapour(parts);
  const stableFrom = Math.max(condensesAt(parts, pressurePa), coldest);
  const metastableMarks = stableFrom < numbers.meltingK && parts.sublimation !== undefined ? SUBCOOLED : SUPERSATURATED;
  let most: number | undefined;
  let fromK: number | undefined;
  const toK = Math.min(gas.ideal.toK, HOTTEST_GAS_K);
  const sound = (k: number): boolean => {
    const cp = gas.heatCapacity(k, pressurePa);
    most ??= HIGHEST_GROWTH * gas.heatCapacity(stableFrom, pressurePa);
    return cp <= most && cp >= LEAST_OF_IDEAL * gas.idealHeatCapacity(k);
  };
  return {
    get fromK() {
      return (fromK ??= edge(sound, stableFrom, coldest));
    },
    toK,
    stableFromK: stableFrom,
    stableToK: toK,
    method: 'ideal gas and departure of the real vapour from it',
    enthalpy: (k) => gas.enthalpy(k, pressurePa),
    heatCapacity: (k) => gas.heatCapacity(k, pressurePa),
    marks: (k) => (k < stableFrom ? metastableMarks : NO_MARKS),
  };
}

/** Vapour as an ideal gas. */
export function idealBranch(parts: FluidParts): FluidBranch {
  const gas = requireGas(parts);
  const fromK = coldestVapour(parts);
  const toK = Math.min(gas.ideal.toK, HOTTEST_GAS_K);
  return {
    fromK,
    toK,
    stableFromK: fromK,
    stableToK: toK,
    method: 'ideal gas',
    enthalpy: gas.idealEnthalpy,
    heatCapacity: gas.idealHeatCapacity,
    marks: () => IDEAL,
  };
}

/** Vapour begins where its line with liquid or solid does. */
function coldestVapour({ numbers, sublimation }: FluidParts): number {
  return Math.min(numbers.lineFromK, sublimation?.fromK ?? Infinity);
}

/** Where vapour of a pressure condenses, or frost forms. */
function condensesAt({ line, numbers, sublimation }: FluidParts, pressurePa: number): number {
  if (sublimation === undefined || pressurePa >= line.pressure(numbers.meltingK)) {
    return line.temperature(Math.max(pressurePa, line.pressure(numbers.lineFromK)));
  }
  return sublimation.temperature(Math.max(pressurePa, sublimation.pressure(sublimation.fromK)));
}

/** Walks from a stable temperature towards an end in growing steps, and returns the last sound one. */
function edge(sound: (k: number) => boolean, stable: number, end: number): number {
  let good = stable;
  let step = Math.sign(end - stable) * 1e-3;
  while (good !== end) {
    const next = Math.abs(end - good) <= Math.abs(step) ? end : good + step;
    if (!sound(next)) return between(sound, good, next);
    good = next;
    step = Math.sign(step) * Math.min(2 * Math.abs(step), 8);
  }
  return end;
}

function between(sound: (k: number) => boolean, inside: number, outside: number): number {
  let good = inside;
  let bad = outside;
  while (Math.abs(good - bad) > 1e-3) {
    const middle = 0.5 * (good + bad);
    if (sound(middle)) good = middle;
    else bad = middle;
  }
  return good;
}
