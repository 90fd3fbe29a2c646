import type { Datum, LatentKind, Mark } from '../answer';
import type { Problem } from '../problem';
import type { Change, SubstanceGroup } from '../substance';
import type { PressureShape } from './pressureShape';
import type { AreaShape, Shape } from './shape';

/** What travels with a property of a material: where it holds, what it rests on, how sure it is. */
export interface Evidence {
  readonly fromK: number;
  readonly toK: number;
  readonly method: string;
  readonly sources: readonly string[];
  readonly marks: readonly Mark[];
  /** Standard uncertainty as a share of the value, where it is known. */
  readonly relativeUncertainty?: number;
}

/** J/(mol K) against K; per kilogram where the material has no molar mass. */
export interface HeatCapacityData extends Evidence {
  readonly shape: AreaShape;
  /** Standard uncertainty where it is no fixed share of the value. */
  readonly uncertaintyAt?: (temperatureK: number) => number;
}

/** J/mol against K; per kilogram where the material has no molar mass. */
export interface HeatData extends Evidence {
  readonly shape: Shape;
  /** A value at the transition temperature only: `fromK` and `toK` don't count. */
  readonly single: boolean;
}

export interface PressureData extends Evidence {
  readonly shape: PressureShape;
}

/** A transition temperature and its pressure. */
export interface TransitionData {
  readonly temperatureK: number;
  readonly pressurePa: number;
}

/** The data, or why they can't be read. */
export type Given<T> = T | Problem;

/** All that is known of a material, from the rows of a sheet or from the catalogue. */
export interface MaterialData {
  readonly name: string;
  readonly formula: string;
  readonly cas: string;
  readonly synonyms: readonly string[];
  readonly group: SubstanceGroup;
  /** kg/mol; NaN where none is known: then "mol" stands for a kilogram throughout. */
  readonly molarMass: number;
  readonly notes: readonly string[];
  readonly constants: readonly Datum[];
  /** Solid-solid changes from cold to hot. */
  readonly solidChanges: readonly Change[];
  /** Keyed by `heatKey`. */
  readonly heats: ReadonlyMap<string, Given<HeatData>>;
  /** By change: fusion, vaporization, `alpha-beta`. */
  readonly transitions: ReadonlyMap<Change, Given<TransitionData>>;
  /** By `solid`, `liquid`, `gas`, or the name of a solid form. */
  readonly heatCapacities: ReadonlyMap<string, Given<HeatCapacityData>>;
  /** By the condensed phase below the vapour. */
  readonly pressures: ReadonlyMap<'solid' | 'liquid', Given<PressureData>>;
  /** What a message about a missing piece says, given the piece: "liquid heat capacity". */
  lack(piece: string): string;
}

export function heatKey(change: Change, kind: LatentKind): string {
  return `${change} ${kind}`;
}

/** The kind of a latent heat when none is said: on the two-phase line to the vapour, else at one atmosphere. */
export function usualKind(change: Change): LatentKind {
  return change === 'vaporization' || change === 'sublimation' ? 'coexistence' : 'isobaric';
}
