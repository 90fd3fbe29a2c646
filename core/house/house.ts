import type { CatalogueEntry } from '../substance';
import type { HouseColumn } from './houseRow';

/** Something about a row that its reader should know. */
export interface HouseFault {
  /** Number of the row on the sheet. */
  readonly row: number;
  readonly column: HouseColumn;
  /** Name of the substance as written; "" where the row has none. */
  readonly substance: string;
  /** An error takes the row, or a name, out of use; a warning does not. */
  readonly severity: 'error' | 'warning';
  readonly message: string;
}

/** The team's own substances, as their rows give them. */
export interface House {
  /** Those that stand beside the built-in ones. */
  readonly entries: readonly CatalogueEntry[];
  /** Those that win over built-in ones by all their names, because a row says so. */
  readonly replacing: readonly CatalogueEntry[];
  readonly faults: readonly HouseFault[];
}

export const EMPTY_HOUSE: House = { entries: [], replacing: [], faults: [] };
