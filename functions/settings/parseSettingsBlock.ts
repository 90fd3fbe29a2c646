import { Problem } from '../../core/problem';
import { settingCell } from './settingCell';
import { withEntries, type Entry } from './settingsDraft';
import type { Settings } from './settingsType';

/**
 * Reads a block of two columns, label and value, onto other settings. Rows that are blank don't count.
 *
 * @param values rows of the block as the host gives them
 * @param base settings that hold where the block has no row
 * @param allowedOptions option keys that are known here beside the unit settings
 * @throws Problem `argument`, naming the row, for a label that is unknown or there twice, and for a value that is
 * missing or can't be read
 * @example
 * parseSettingsBlock([['Temperature', 'K']], DEFAULT_SETTINGS).units.temperature.symbol // => 'K'
 */
export function parseSettingsBlock(
  values: readonly (readonly unknown[])[],
  base: Settings,
  allowedOptions: readonly string[] = [],
): Settings {
  const entries: Entry[] = [];
  values.forEach((row, index) => {
    const where = rowName(index, settingCell(row[0]));
    if (row.length !== 2) throw refused(where, 'two columns, label and value', `${row.length} columns`);
    const key = label(row);
    const value = settingCell(row[1]);
    // A host may hand over a blank cell as 0.
    const blank = value === '' || row[1] === 0;
    if (key === '' && blank) return;
    if (key === '') throw refused(where, `a label beside "${value}"`, 'a blank');
    entries.push({ key, value: blank ? '' : value, where });
  });
  return entries.length === 0 ? base : withEntries(base, entries, allowedOptions);
}

/** How a refusal names a row of the block, counted from 1. */
export function rowName(index: number, key: string): string {
  return key === '' || key === '0' ? `Units row ${index + 1}` : `Units row ${index + 1} (${key})`;
}

function label(row: readonly unknown[]): string {
  return row[0] === 0 ? '' : settingCell(row[0]);
}

function refused(argument: string, allowed: string, received: string): Problem {
  return new Problem({ code: 'argument', argument, allowed, received });
}
