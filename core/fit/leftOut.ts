/** A row of the data that a fit does not use, and why. */
export interface LeftOut {
  /** Counted from 1 in the rows as they were given. */
  readonly row: number;
  readonly reason: string;
}
