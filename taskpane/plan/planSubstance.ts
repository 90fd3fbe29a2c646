import { cellText, headerOrder, HOUSE_COLUMNS, HOUSE_HEADS, type HouseColumn } from '../../core/house/houseRow';
import { SUBSTANCES_NAME } from '../boot/readSnapshot';
import type { Block, Cell, Change } from '../port';
import { within } from './unitsBlock';

/** Sheet that the block is made on when a workbook has none. */
export const SUBSTANCES_SHEET = 'Substances';

/** One row of the Substances sheet, a cell a column; what is left out stays blank. */
export type SubstanceRow = Readonly<Partial<Record<HouseColumn, Cell>>>;

/** The header stands here on a new sheet, and the block has so many rows below it. */
const HEAD_ROW = 4;
const ROOM = 50;

/**
 * Plans the adding of rows to the team's own substances.
 *
 * Rows go below the last one that is not blank, in the order that the header row gives; where the block has no room left
 * it grows downwards. Without a block, the sheet, its header and its name are made.
 *
 * @param block the block named `Latentry_substances`, or undefined
 * @param added rows, one property each
 * @param sheet where the block is made
 * @example planSubstanceRow(undefined, [{ substance: 'brine' }]).length // => 6
 */
export function planSubstanceRow(
  block: Block | undefined,
  added: readonly SubstanceRow[],
  sheet: string = SUBSTANCES_SHEET,
): Change[] {
  if (added.length === 0) return [];
  if (block === undefined) return planSheet(added, sheet);
  const filled = block.values.map((cells, row) =>
    cells.some((cell, column) => cellText(cell) !== '' || (block.formulas[row]?.[column] ?? '') !== ''),
  );
  const first = filled.indexOf(true);
  const order = first < 0 ? undefined : headerOrder(block.values[first] ?? []);
  const width = block.values[0]?.length ?? 0;
  const next = filled.lastIndexOf(true) + 1;
  const lines = added.map((row) => lineOf(row, order ?? HOUSE_COLUMNS, width));
  const changes: Change[] = [
    { kind: 'cells', ref: within(block.ref, next, 0, lines.length, width), values: lines, format: 'input' },
  ];
  const height = next + lines.length;
  if (height > block.values.length) {
    changes.push({ kind: 'name', name: SUBSTANCES_NAME, ref: within(block.ref, 0, 0, height, width) });
  }
  return changes;
}

function lineOf(row: SubstanceRow, order: readonly (HouseColumn | undefined)[], width: number): Cell[] {
  return Array.from({ length: width }, (_, i) => {
    const column = order[i];
    return column === undefined ? null : (row[column] ?? null);
  });
}

function planSheet(added: readonly SubstanceRow[], sheet: string): Change[] {
  const width = HOUSE_COLUMNS.length;
  const lines = added.map((row) => lineOf(row, HOUSE_COLUMNS, width));
  const room = Math.max(ROOM, lines.length);
  const blank = Array.from({ length: room - lines.length }, () => new Array<Cell>(width).fill(null));
  const last = HEAD_ROW + room;
  const at = (address: string) => ({ sheet, address });
  const words =
    'One property a row. Equations take temperatures in K, tables and ranges in degC, unless a cell says another unit.';
  return [
    { kind: 'sheet', name: sheet },
    { kind: 'cells', ref: at('A1'), values: [['Substances of this workbook']], format: 'heading' },
    { kind: 'cells', ref: at('A2'), values: [[words]], format: 'note' },
    { kind: 'cells', ref: at(`A${HEAD_ROW}:I${HEAD_ROW}`), values: [[...HOUSE_HEADS]], format: 'heading' },
    { kind: 'cells', ref: at(`A${HEAD_ROW + 1}:I${last}`), values: [...lines, ...blank], format: 'input' },
    { kind: 'name', name: SUBSTANCES_NAME, ref: at(`A${HEAD_ROW}:I${last}`) },
  ];
}
