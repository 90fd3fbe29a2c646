import type { CallFault } from './results';

/** The cell whose formula called a function; row and column count from zero. */
export interface CallPlace {
  readonly unitId: string;
  readonly sheetId: string;
  readonly row: number;
  readonly column: number;
}

/** Told after every call, also with no faults at all, so that old messages of the cell can go. */
export type Report = (place: CallPlace, faults: readonly CallFault[]) => void;
