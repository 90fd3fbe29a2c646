/** One temperature interval of a nine-coefficient polynomial. */
export interface Nasa9Interval {
  readonly fromK: number;
  readonly toK: number;
  /** a1 to a7, for the powers −2 to 4 of the temperature. */
  readonly a: readonly number[];
  /** Integration constant of the enthalpy, K. */
  readonly b1: number;
  /** Integration constant of the entropy. */
  readonly b2: number;
}

/** One vibration of characteristic temperature θ that carries a heat capacity below the polynomials. */
export interface LowTail {
  /** Heat capacity that is left as T → 0, divided by R: 0 for a crystal, 5/2 for an atom. */
  readonly floor: number;
  /** Height of the vibration's part, divided by R; 0 where the heat capacity is kept constant. */
  readonly height: number;
  readonly thetaK: number;
}

/** A gas, a liquid or a crystal form of the NASA nine-coefficient data set. */
export interface Nasa9Species {
  /** As the data set spells it: `AL2O3(L)`, `C3H8O,2propanol`. */
  readonly name: string;
  readonly phase: 'gas' | 'liquid' | 'crystal';
  /** kg/mol */
  readonly molarMass: number;
  /** The data set's own note of where the species comes from. */
  readonly comment: string;
  /** From cold to hot; each begins where the one before ends. */
  readonly intervals: readonly Nasa9Interval[];
  /** Lower limit of the fit (report of 2002). */
  readonly fromK: number;
  readonly toK: number;
  /** Lower limit that the release of 2021 prints; above `fromK` where that release reset 200 K to 300 K. */
  readonly releaseFromK: number;
  /** How the heat capacity goes on below `fromK`. */
  readonly low: LowTail;
}
