import type { Nasa9Species } from '../nasa9/nasa9Types';
import type { LatentTerms } from './latentLine';
import type { LiquidTerms } from './liquidLine';
import type { WagnerTerms } from './wagner';

/** A cited number of a fluid. */
export interface Cited {
  readonly value: number;
  readonly uncertainty?: number;
  readonly source: string;
  readonly confirmed: boolean;
}

/** Relative standard uncertainties at reduced temperatures, straight between them. */
export interface Spread {
  readonly nodes: readonly number[];
  readonly pressure: readonly number[];
  readonly latent: readonly number[];
  readonly heatCapacity: readonly number[];
}

/** The solid just below the melting point, where something is known of it. */
export interface SolidNumbers {
  /** Down to where the heat capacity is taken as known, K. */
  readonly fromK: number;
  /** Crystal of the nine-coefficient data, or a straight line. */
  readonly heatCapacity: Nasa9Species | StraightHeatCapacity;
  readonly source: string;
  /** Whether a second source stands behind the heat capacity. */
  readonly confirmed: boolean;
  /** Whether a cited point of the sublimation line agrees with what follows from the heat capacity. */
  readonly lineConfirmed: boolean;
  /** m³/mol; 0 where it is left out against the vapour's. */
  readonly molarVolume: number;
}

/** value + slope·(T − atK), J/(mol K) */
export interface StraightHeatCapacity {
  readonly value: number;
  readonly slope: number;
  readonly atK: number;
}

/** Difference of separately fitted latent heat and heat capacities: a cubic in the reduced temperature, J/mol. */
export interface DisagreementNumbers {
  readonly fromK: number;
  readonly toK: number;
  readonly cubic: readonly number[];
  /** Standard uncertainty of a difference over the whole range, J/mol. */
  readonly uncertainty: number;
}

/** Everything that is stored about one fluid. */
export interface FluidNumbers {
  readonly name: string;
  readonly formula: string;
  readonly cas: string;
  readonly synonyms: readonly string[];
  /** kg/mol */
  readonly molarMass: number;
  readonly criticalK: number;
  readonly criticalPa: number;
  readonly acentric: number;
  /** Polar and hydrogen-bond terms of the vapour; with a dimer the shifts of its heat (kJ/mol) and of ln K. */
  readonly polar: number;
  readonly bonding: number;
  readonly meltingK: number;
  /** Printed temperature at which the solid turns into vapour at one atmosphere, where it does not melt there. */
  readonly sublimesAtK?: number;
  /** Colder end of the saturation line, and the end up to which the vapour on it is described. */
  readonly lineFromK: number;
  readonly vapourToK: number;
  readonly ideal?: Nasa9Species;
  readonly dimer?: Nasa9Species;
  /** With a dimer: relative standard uncertainty of the printed heat of vaporization to single molecules at 298.15 K. */
  readonly singleMoleculesSpread?: number;
  readonly pressure: WagnerTerms;
  readonly latent: LatentTerms;
  readonly liquid: LiquidTerms;
  readonly spread: Spread;
  readonly constants: Readonly<Record<string, Cited>>;
  readonly fusion?: Cited;
  readonly solid?: SolidNumbers;
  readonly disagreement?: DisagreementNumbers;
  readonly sources: Readonly<Record<'latent' | 'pressure' | 'heatCapacity' | 'gas', readonly string[]>>;
  /** Properties that rest on unconfirmed values. */
  readonly unconfirmed: ReadonlySet<string>;
  readonly notes: readonly string[];
  readonly enthalpyReference: string;
}
