import type { CatalogueEntry, Substance } from '../substance';
import type { Decimal } from '../units/parseNumber';
import { EMPTY_HOUSE, type House, type HouseFault } from './house';
import { houseRows } from './houseRow';
import { houseNames, type NamedRows } from './houseNames';
import { gatherRows } from './gatherRows';
import { readMaterial } from './readMaterial';
import { makeMaterial } from './makeMaterial';
import type { MaterialData } from './materialData';

export interface HouseOptions {
  readonly decimal: Decimal;
  /** Number of the block's first row on its sheet; refusals name rows by it. */
  readonly firstRow: number;
  /** Built-in substances, whose names stay theirs unless a row says otherwise. */
  readonly builtIn: readonly CatalogueEntry[];
}

/**
 * Reads the rows of the Substances sheet: substance, property, form, coefficients, unit, valid from, valid to, source,
 * revision; one property a row, a header row may come first.
 *
 * A row that can't be read is a fault that names it; the property it was for answers with that problem, and everything
 * else goes on working. Bare temperatures in "valid from", "valid to" and tables are in °C unless the header says
 * otherwise; those of equations (polynomial, Watson, Majer–Svoboda) are in K unless the form says `in degC`. These units
 * don't follow the workbook's settings, which would change what the rows mean.
 *
 * @param values rows of the block as the host gives them
 * @param options decimal separator of numbers in texts, place of the block, built-in substances
 * @returns entries by name and every fault
 * @example
 * const row = ['brine', 'liquid heat capacity', '', 3.1, 'kJ/(kg K)', -10, 60, 'our own', '1'];
 * readHouse([row], { decimal: '.', firstRow: 5, builtIn: [] }).entries[0]?.name // => 'brine'
 */
export function readHouse(values: readonly (readonly unknown[])[], options: HouseOptions): House {
  const rows = houseRows(values, options.firstRow);
  if (rows.length === 0) return EMPTY_HOUSE;
  const faults: HouseFault[] = [];
  const gathered = gatherRows(rows, faults);
  const named = houseNames(gathered, options.builtIn, faults);
  const entries: CatalogueEntry[] = [];
  const replacing: CatalogueEntry[] = [];
  for (const names of named) {
    const material = readMaterial(names, options.decimal, faults);
    if (!names.reachable) continue;
    (names.replaces ? replacing : entries).push(entryOf(names, material));
  }
  faults.sort((a, b) => a.row - b.row);
  return { entries, replacing, faults };
}

function entryOf({ words }: NamedRows, material: MaterialData): CatalogueEntry {
  const { name, formula, cas, synonyms } = words;
  let made: Substance | undefined;
  return { name, formula, cas, synonyms, group: 'house', make: () => (made ??= makeMaterial(material)) };
}
