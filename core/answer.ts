/** The three kinds of latent heat and slope; only like may be combined with like. */
export type LatentKind = 'coexistence' | 'isobaric' | 'standard';

/** A fact about one answer that its reader should know. */
export interface Mark {
  readonly code: 'metastable' | 'extended' | 'near-transition' | 'near-critical' | 'ideal-gas' | 'unconfirmed';
  readonly text: string;
}

/** A published number with everything needed to defend it. */
export interface Datum {
  /** Full words: `molar mass`, `triple temperature`. */
  readonly item: string;
  readonly value: number;
  /** SI unit of `value`. */
  readonly unit: string;
  /** Standard uncertainty in the same unit, where the source states one. */
  readonly uncertainty?: number;
  readonly source: string;
  /** False while only one source, or memory, stands behind the number. */
  readonly confirmed: boolean;
}

/** What the core gives back: a number and everything that travels with it. */
export interface Answer {
  readonly value: number;
  readonly unit: string;
  readonly uncertainty?: number | undefined;
  readonly kind?: LatentKind | undefined;
  readonly method: string;
  readonly sources: readonly string[];
  readonly range: { readonly axis: 'temperature' | 'pressure'; readonly from: number; readonly to: number };
  readonly marks: readonly Mark[];
}
