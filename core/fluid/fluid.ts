import type { Datum, LatentKind } from '../answer';
import type { Change, Ladder, Substance } from '../substance';
import { betweenPhases } from './betweenPhases';
import { coexistence, noSuchChange } from './coexistence';
import { fluidDisagreement } from './fluidDisagreement';
import { fluidLadder } from './fluidLadder';
import type { FluidNumbers } from './fluidNumbers';
import { fluidParts, type FluidParts } from './fluidParts';
import { enthalpies, heatCapacities } from './heatCapacities';
import { saturationPressure, saturationTemperature } from './saturation';

const DEFAULT_KINDS: Readonly<Record<string, LatentKind>> = {
  fusion: 'isobaric',
  vaporization: 'coexistence',
  sublimation: 'coexistence',
};

const UNITS: Readonly<Record<string, string>> = {
  'molar mass': 'kg/mol',
  'critical pressure': 'Pa',
  'triple pressure': 'Pa',
  'acentric factor': '1',
};

/**
 * A process fluid from its stored numbers: one enthalpy for all phases, so that latent heats are differences and cycles
 * close.
 *
 * @param numbers as the catalogue's generator writes them
 */
export function fluid(numbers: FluidNumbers): Substance {
  const parts = fluidParts(numbers);
  const { name, formula, cas, synonyms, molarMass, notes } = numbers;
  const changes = ['fusion', 'vaporization', 'sublimation'].filter((change) => has(parts, change));
  let lastLadder: Ladder | undefined;
  return {
    name,
    formula,
    cas,
    synonyms,
    group: 'fluid',
    notes,
    molarMass,
    constants: constantsOf(numbers),
    changes,
    enthalpyReference: numbers.enthalpyReference,
    transitionTemperature: (change) => (change === 'fusion' ? numbers.meltingK : undefined),
    defaultKind(change: Change): LatentKind {
      const kind = DEFAULT_KINDS[change];
      if (kind === undefined || !has(parts, change)) throw noSuchChange(parts, change);
      return kind;
    },
    latent: (change, kind, pressurePa) =>
      kind === 'coexistence'
        ? coexistence(parts, change, 'latent')
        : betweenPhases(parts, change, kind, 'latent', pressurePa),
    latentSlope: (change, kind, pressurePa) =>
      kind === 'coexistence'
        ? coexistence(parts, change, 'slope')
        : betweenPhases(parts, change, kind, 'slope', pressurePa),
    coexistenceTerm: (change) => coexistence(parts, change, 'term'),
    heatCapacity: (phase, at) => heatCapacities(parts, phase, at),
    saturationPressure: (surface) => saturationPressure(parts, surface),
    saturationTemperature: (surface) => saturationTemperature(parts, surface),
    enthalpy: (phase, pressurePa) => enthalpies(parts, phase, pressurePa),
    ladder(pressurePa) {
      if (lastLadder?.pressurePa !== pressurePa) lastLadder = fluidLadder(parts, pressurePa);
      return lastLadder;
    },
    disagreement: (change, fromK, toK) => fluidDisagreement(parts, change, fromK, toK),
  };
}

function has({ numbers, sublimation }: FluidParts, change: Change): boolean {
  if (change === 'fusion') return numbers.fusion !== undefined;
  return change === 'vaporization' || (change === 'sublimation' && sublimation !== undefined);
}

function constantsOf({ constants }: FluidNumbers): Datum[] {
  return Object.entries(constants).map(([item, cited]) => ({ item, unit: UNITS[item] ?? 'K', ...cited }));
}
