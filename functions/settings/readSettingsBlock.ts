import { Problem } from '../../core/problem';
import { parseSettingsBlock, rowName } from './parseSettingsBlock';
import { SETTINGS, plainKey } from './schema';
import { settingCell } from './settingCell';
import type { Settings } from './settingsType';

/** The cell of a Units block that can't be read, counted from 0, what stands in it, and what is allowed instead. */
export interface SettingsFault {
  readonly row: number;
  readonly column: 0 | 1;
  readonly text: string;
  readonly message: string;
}

/** The settings of a Units block and the labels it has no row for, or the cell that is damaged. */
export type ReadSettings =
  | { readonly settings: Settings; readonly missing: readonly string[]; readonly fault?: undefined }
  | { readonly settings?: undefined; readonly missing?: undefined; readonly fault: SettingsFault };

/**
 * Reads the workbook's Units block for the settings store: like `parseSettingsBlock`, but a damaged cell is an answer,
 * with its place, rather than an exception.
 *
 * @param values rows of the block as the host gives them
 * @param base settings that hold where the block has no row
 */
export function readSettingsBlock(values: readonly (readonly unknown[])[], base: Settings): ReadSettings {
  const labels = values.map((row) => plainKey(settingCell(row[0])));
  try {
    const settings = parseSettingsBlock(values, base);
    const missing = SETTINGS.filter(
      (row) => !labels.includes(plainKey(row.label)) && !labels.includes(plainKey(row.key)),
    );
    return { settings, missing: missing.map((row) => row.label) };
  } catch (thrown) {
    if (!(thrown instanceof Problem) || thrown.data.code !== 'argument') throw thrown;
    const { argument, allowed, nearest } = thrown.data;
    const row = values.findIndex((cells, index) => rowName(index, settingCell(cells[0])) === argument);
    const own = labels[row] ?? '';
    const known = SETTINGS.some((setting) => own === plainKey(setting.label) || own === plainKey(setting.key));
    const column = known && labels.indexOf(own) === row ? 1 : 0;
    const message = nearest === undefined ? allowed : `${allowed}; nearest: ${nearest}`;
    return { fault: { row, column, text: settingCell(values[row]?.[column]), message } };
  }
}
