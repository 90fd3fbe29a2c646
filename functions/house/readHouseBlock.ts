import { entries } from '../../core/catalogue/entries';
import { readHouse } from '../../core/house/readHouse';
import type { Decimal } from '../../core/units/parseNumber';
import type { HouseState } from './store';

/** Where a block stands and how numbers in its texts are written. */
export interface HouseBlock {
  /** Rows of the block as the host gives them. */
  readonly values: readonly (readonly unknown[])[];
  /** Number of its first row on the sheet. */
  readonly firstRow: number;
  readonly decimal: Decimal;
}

/** The state of the store for a block of substances. */
export function readHouseBlock({ values, firstRow, decimal }: HouseBlock): HouseState & { readonly state: 'ready' } {
  const house = readHouse(values, { decimal, firstRow, builtIn: entries });
  return { state: 'ready', house, stamp: JSON.stringify([firstRow, decimal, values]) };
}
