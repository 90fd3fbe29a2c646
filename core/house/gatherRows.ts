import { plainName } from '../catalogue/plainName';
import { nearest } from '../nearest';
import { plainWords } from '../problem';
import type { HouseFault } from './house';
import { HOUSE_PROPERTIES, propertyWords, readProperty, type HouseProperty } from './houseProperty';
import { cellText, type HouseColumn, type HouseRow } from './houseRow';

/** A row that says what it is about. */
export interface PropertyRow {
  readonly row: HouseRow;
  readonly property: HouseProperty;
  /** As messages name it. */
  readonly about: string;
}

/** The rows of one substance, in their order on the sheet. */
export interface GatheredRows {
  readonly name: string;
  /** Number of its first row. */
  readonly first: number;
  readonly rows: readonly PropertyRow[];
  /** Numbers of rows whose property can't be read. */
  readonly unread: readonly number[];
}

/** Sorts rows by substance; rows without a name, a property or anything to say become faults. */
export function gatherRows(rows: readonly HouseRow[], faults: HouseFault[]): GatheredRows[] {
  const found = new Map<string, { name: string; first: number; rows: PropertyRow[]; unread: number[] }>();
  for (const row of rows) {
    const name = cellText(row.cells.substance);
    const text = cellText(row.cells.property);
    const fault = (column: HouseColumn, allowed: string, received: string, near?: string): void => {
      const where = name === '' ? `row ${row.number}` : `row ${row.number} (${name})`;
      const hint = near === undefined ? {} : { nearest: near };
      const message = plainWords({
        code: 'argument',
        argument: `Substances ${where}, ${column}`,
        allowed,
        received,
        ...hint,
      });
      faults.push({ row: row.number, column, substance: name, severity: 'error', message });
    };
    if (plainName(name) === '') {
      fault('substance', 'the name of a substance in every row', name === '' ? 'a blank' : `"${name}"`);
      continue;
    }
    let one = found.get(plainName(name));
    if (one === undefined) found.set(plainName(name), (one = { name, first: row.number, rows: [], unread: [] }));
    const property = readProperty(text);
    if (property === undefined) {
      one.unread.push(row.number);
      fault(
        'property',
        HOUSE_PROPERTIES.join(', '),
        text === '' ? 'a blank' : `"${text}"`,
        nearest(text, HOUSE_PROPERTIES),
      );
      continue;
    }
    one.rows.push({ row, property, about: `${name}, ${propertyWords(property)}` });
  }
  return [...found.values()];
}
