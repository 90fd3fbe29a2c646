import { plainKey, SETTINGS } from '../../functions/settings/schema';
import { settingCell } from '../../functions/settings/settingCell';
import { formatArea, parseArea } from '../hosts/address';
import type { Block, Ref } from '../port';

/** Sheet that the block is made on when a workbook has none. */
export const UNITS_SHEET = 'Units';

/** What a row of the block says, as it is written. */
export interface UnitsRow {
  /** Row within the block, from 0. */
  readonly row: number;
  /** Key of the setting, or undefined where the label is none or is there a second time. */
  readonly key: string | undefined;
  readonly label: string;
  readonly value: string;
}

const keys = new Map(SETTINGS.flatMap(({ key, label }) => [key, label].map((text) => [plainKey(text), key] as const)));

/** The rows of the Units block that are not blank. */
export function unitsRows(block: Block): UnitsRow[] {
  const seen = new Set<string>();
  const rows: UnitsRow[] = [];
  for (const [row, cells] of block.values.entries()) {
    const label = settingCell(cells[0]);
    const value = settingCell(cells[1]);
    if (label === '' && value === '') continue;
    const found = keys.get(plainKey(label));
    const key = found === undefined || seen.has(found) ? undefined : found;
    if (key !== undefined) seen.add(key);
    rows.push({ row, key, label, value });
  }
  return rows;
}

/** Reference to `rows` × `columns` cells that begin `down` rows and `right` columns from the first cell of `ref`. */
export function within(ref: Ref, down: number, right: number, rows = 1, columns = 1): Ref {
  const area = parseArea(ref.address);
  if (area === null) return ref;
  return { sheet: ref.sheet, address: formatArea({ top: area.top + down, left: area.left + right, rows, columns }) };
}
