import type { Change, LambdaPoint, SubstanceGroup } from '../../substance';

/** Another published value of a latent heat, kJ/mol per formula unit, and who publishes it. */
export type PublishedHeat = readonly [kilojoules: number, source: string];

/** What the vapour is made of. */
export interface VapourRecord {
  /** Species and how many formula units a molecule holds; the first is the gas of the standard kind. */
  readonly species: readonly (readonly [name: string, units: number])[];
  /** Highest pressure at which an ideal gas of these species is defensible, Pa. */
  readonly highestPa: number;
  /** Why only the standard kind can be given: what the real vapour holds besides, and the catalogue lacks. */
  readonly lacking?: string;
  /** Boiling temperature at one atmosphere printed elsewhere, K, and where. */
  readonly boils?: readonly [kelvin: number, source: string];
}

/** Where the data of the condensed phases stop being of use, and why. */
export interface EndRecord {
  readonly kelvin: number;
  /** What happens there, as in "it decomposes". */
  readonly why: string;
}

/** One substance of the condensed data set, as the catalogue holds it. */
export interface CondensedRecord {
  readonly name: string;
  readonly formula: string;
  readonly cas: string;
  readonly synonyms: readonly string[];
  readonly group: SubstanceGroup;
  /** Crystal forms from cold to hot: name (empty for the only one) and species. */
  readonly solids: readonly (readonly [form: string, species: string])[];
  readonly liquid?: string;
  readonly vapour?: VapourRecord;
  readonly end?: EndRecord;
  /** Below this pressure it goes from solid to vapour without melting, Pa. */
  readonly meltsAbovePa?: number;
  readonly lambdaPoints?: readonly LambdaPoint[];
  /** Melting temperature printed elsewhere, K, and where. */
  readonly melts?: readonly [kelvin: number, source: string];
  readonly published?: Readonly<Record<Change, readonly PublishedHeat[]>>;
  readonly constants?: readonly (readonly [item: string, value: number, unit: string, source: string])[];
  readonly notes?: readonly string[];
}
