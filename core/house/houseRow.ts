import { plainName } from '../catalogue/plainName';
import { readHeader } from '../units/readHeader';
import type { Unit } from '../units/unit';
import { unitOf } from '../units/unitOf';

/** The columns of the Substances sheet, in their usual order. */
export const HOUSE_COLUMNS = [
  ...([
    'substance',
    'property',
    'form',
    'coefficients',
    'unit',
    'valid from',
    'valid to',
    'source',
    'revision',
  ] as const),
] as const;
export type HouseColumn = (typeof HOUSE_COLUMNS)[number];

/** The header row as the workbook writes it; bare temperatures of a range are in the unit that it names. */
export const HOUSE_HEADS: readonly string[] = [
  ...[
    'Substance',
    'Property',
    'Form',
    'Coefficients',
    'Unit',
    'Valid from, degC',
    'Valid to, degC',
    'Source',
    'Revision',
  ],
];

const OTHER_HEADS: Readonly<Record<string, HouseColumn>> = {
  material: 'substance',
  coefficient: 'coefficients',
  value: 'coefficients',
  values: 'coefficients',
  units: 'unit',
  from: 'valid from',
  to: 'valid to',
};

/** One row that is not blank. */
export interface HouseRow {
  /** Number of the row on the sheet. */
  readonly number: number;
  /** The cell of a column as the host gives it; a blank is "". */
  readonly cells: Readonly<Record<HouseColumn, unknown>>;
  /** Columns of the block from 0, to point at a cell. */
  readonly at: Readonly<Record<HouseColumn, number>>;
  /** Unit of bare temperatures in "valid from" and "valid to". */
  readonly fromUnit: Unit;
  readonly toUnit: Unit;
}

/** A cell as text; numbers in JavaScript's own spelling. */
export function cellText(cell: unknown): string {
  if (typeof cell === 'string') return cell.trim();
  if (typeof cell === 'number' || typeof cell === 'boolean') return String(cell);
  const error = (cell as { error?: unknown } | null)?.error;
  return typeof error === 'string' ? error : '';
}

function columnOf(head: string): HouseColumn | undefined {
  const plain = plainName(readHeader(head).name);
  return HOUSE_COLUMNS.find((column) => plainName(column) === plain) ?? OTHER_HEADS[plain];
}

/** Which column each cell of a header row heads; `undefined` for a row that is no header. */
export function headerOrder(cells: readonly unknown[]): readonly (HouseColumn | undefined)[] | undefined {
  const heads = cells.map((cell) => columnOf(cellText(cell)));
  return heads.includes('substance') && heads.includes('property') ? heads : undefined;
}

/**
 * Takes a block apart into rows. Its first row that is not blank may be the header: then columns may stand in any order,
 * others beside them don't count, and the heads of "valid from" and "valid to" may name their unit.
 *
 * @param values the block as the host gives it
 * @param firstRow number of its first row on the sheet
 */
export function houseRows(values: readonly (readonly unknown[])[], firstRow: number): HouseRow[] {
  const degC = unitOf('degC', 'temperature');
  let order: readonly (HouseColumn | undefined)[] = HOUSE_COLUMNS;
  let fromUnit = degC;
  let toUnit = degC;
  let first = true;
  const rows: HouseRow[] = [];
  values.forEach((cells, index) => {
    const texts = cells.map(cellText);
    if (texts.every((text) => text === '')) return;
    if (first) {
      first = false;
      const heads = headerOrder(cells);
      if (heads !== undefined) {
        order = heads;
        fromUnit = headUnit(texts[heads.indexOf('valid from')]) ?? degC;
        toUnit = headUnit(texts[heads.indexOf('valid to')]) ?? fromUnit;
        return;
      }
    }
    const row = rowOf(cells, texts, order);
    if (row !== undefined) rows.push({ number: firstRow + index, ...row, fromUnit, toUnit });
  });
  return rows;
}

function headUnit(head: string | undefined): Unit | undefined {
  const unit = head === undefined ? undefined : readHeader(head).unit;
  return unit?.kind === 'temperature' ? unit : undefined;
}

function rowOf(
  cells: readonly unknown[],
  texts: readonly string[],
  order: readonly (HouseColumn | undefined)[],
): Pick<HouseRow, 'cells' | 'at'> | undefined {
  const found = {} as Record<HouseColumn, unknown>;
  const at = {} as Record<HouseColumn, number>;
  let blank = true;
  for (const column of HOUSE_COLUMNS) {
    const index = order.indexOf(column);
    at[column] = index;
    const cell = cells[index];
    // A cell error stands as its text, which no column takes.
    found[column] = texts[index] === '' || index < 0 ? '' : typeof cell === 'object' ? texts[index] : cell;
    if (found[column] !== '') blank = false;
  }
  return blank ? undefined : { cells: found, at };
}
