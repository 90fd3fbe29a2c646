import type { Answer, Datum, LatentKind, Mark } from './answer';

export type Phase = 'solid' | 'liquid' | 'gas';

/** `vaporization`, `fusion`, `sublimation`, or the name of a solid-solid change such as `alpha-gamma`. */
export type Change = string;

/**
 * A property along one axis, with everything that travels with its numbers.
 * `at` is the bare number in SI for the hot path: it assumes that the axis value lies in
 * [from, to] or that the caller has decided to extend; use `evaluate` for a checked record.
 */
export interface Curve {
  readonly axis: 'temperature' | 'pressure';
  /** Range on the axis, SI, both ends included. */
  readonly from: number;
  readonly to: number;
  /** What the curve describes, as in "vaporization of water". */
  readonly subject: string;
  /** SI unit of the value: `J/mol`, `J/(mol K)`, `Pa`, `K`; per kilogram where a material has no molar mass. */
  readonly unit: 'J/mol' | 'J/(mol K)' | 'Pa' | 'K' | 'J/kg' | 'J/(kg K)';
  readonly kind?: LatentKind;
  readonly method: string;
  readonly sources: readonly string[];
  at(x: number): number;
  /** Standard uncertainty in the unit of the value, where the source states one. */
  uncertaintyAt?(x: number): number | undefined;
  /** Marks that belong to this place: metastable, extrapolated, near the critical point. */
  marksAt?(x: number): readonly Mark[];
}

/** One rung of a heating path at a pressure: a phase over a temperature interval, or at one temperature where no more is known. */
export interface Rung {
  readonly phase: Phase | 'supercritical';
  /** Name of the crystal form where a substance has several: `alpha`. */
  readonly form?: string;
  readonly fromK: number;
  readonly toK: number;
  /** Enthalpy along the rung, J/mol, on the substance's one reference. */
  enthalpy(temperatureK: number): number;
}

/** A transition between two neighbouring rungs, at one temperature. */
export interface Gap {
  readonly change: Change;
  readonly temperatureK: number;
  /** Enthalpy just below and just above the transition, J/mol. */
  readonly below: number;
  readonly above: number;
}

/** Everything a heating path at one pressure meets, from cold to hot: rungs.length = gaps.length + 1. */
export interface Ladder {
  readonly pressurePa: number;
  readonly rungs: readonly Rung[];
  readonly gaps: readonly Gap[];
  readonly sources: readonly string[];
  /** What a path below the first rung, or above the last, would need and the catalogue lacks: "heat capacity of solid ethanol". */
  readonly missingBelow?: string;
  readonly missingAbove?: string;
}

/** A second-order point: the heat capacity peaks, and there is no latent heat. */
export interface LambdaPoint {
  /** `curie point`, `lambda point of alpha`. */
  readonly name: string;
  readonly temperatureK: number;
}

export type Surface = 'stable' | 'ice' | 'liquid';

/** How a substance is called, and how it is made once someone asks for it. */
export interface CatalogueEntry {
  readonly name: string;
  readonly formula: string;
  /** CAS registry number; empty where the substance has none (a food, a plant's own concentrate). */
  readonly cas: string;
  readonly synonyms: readonly string[];
  readonly group: SubstanceGroup;
  /** The same object at each call. */
  make(): Substance;
}

export type SubstanceGroup = 'fluid' | 'element' | 'salt' | 'oxide' | 'storage material' | 'house';

/** What every substance answers. Curves throw a `Problem` when the substance has no such data. */
export interface Substance {
  readonly name: string;
  readonly formula: string;
  readonly cas: string;
  readonly synonyms: readonly string[];
  readonly group: SubstanceGroup;
  /** What its reader should know at once: which data lead, what is unconfirmed, what the vapour does. */
  readonly notes: readonly string[];
  /** Crystal forms from cold to hot, where there are several. */
  readonly forms?: readonly string[];
  readonly lambdaPoints?: readonly LambdaPoint[];
  /** kg/mol; NaN where none is known (a plant's own concentrate): then every "mol" of this substance is a kilogram. */
  readonly molarMass: number;
  /** Named constants: full words, as `CONSTANT` takes them. */
  readonly constants: readonly Datum[];
  /** The changes `latent` knows, in order of temperature: `alpha-gamma`, `fusion`, `vaporization`, `sublimation`. */
  readonly changes: readonly Change[];
  /** Temperature a change takes place at when none is given (fusion, solid-solid: at one atmosphere), K. */
  transitionTemperature(change: Change): number | undefined;
  /** Kind used when none is asked for. */
  defaultKind(change: Change): LatentKind;
  /** Latent heat, J/mol against K. `pressurePa` is the pressure of the isobaric kind (one atmosphere when absent). */
  latent(change: Change, kind: LatentKind, pressurePa?: number): Curve;
  /** Temperature slope of the latent heat of the same kind, J/(mol K) against K; never a bare Δcp for the coexistence kind. */
  latentSlope(change: Change, kind: LatentKind, pressurePa?: number): Curve;
  /** The part of the coexistence slope that is not a heat-capacity difference: [Δv − T(∂Δv/∂T)p]·dp/dT, J/(mol K). */
  coexistenceTerm(change: Change): Curve;
  /** cp of the real phase at a pressure, or along its saturation line, or of the ideal gas; J/(mol K) against K. */
  heatCapacity(phase: Phase, at: number | 'saturated' | 'standard', form?: string): Curve;
  saturationPressure(surface: Surface): Curve;
  saturationTemperature(surface: Surface): Curve;
  /** Enthalpy of a phase at a pressure, J/mol against K, metastable continuations included where the equation allows. */
  enthalpy(phase: Phase, pressurePa: number, form?: string): Curve;
  /** Enthalpy reference in words, as in "saturated liquid at the triple point: u = 0". */
  readonly enthalpyReference: string;
  ladder(pressurePa: number): Ladder;
  /**
   * How far independent data for a latent heat and for the heat capacities of its phases disagree between two
   * temperatures, J/mol: [L(to) − L(from)] − ∫Δcp dT, both of the default kind.
   */
  disagreement(change: Change, fromK: number, toK: number): Answer;
}

export type { Answer };
