import { SETTINGS } from '../../functions/settings/schema';
import { settingsRows } from '../../functions/settings/settingsRows';
import type { Settings } from '../../functions/settings/settingsType';

/** The block on the Units sheet, by its name in the workbook. */
export const UNITS_NAME = 'Latentry_units';

/**
 * A heading that always shows the unit in force, and what it shows before the first calculation.
 *
 * @param words - as `Latent heat`
 * @param key - of the setting, as `heat`
 * @param settings - those on the Units sheet
 * @example
 * unitHead('Latent heat', 'heat', settings).formula // => '="Latent heat, "&INDEX(Latentry_units,4,2)'
 */
export function unitHead(words: string, key: string, settings: Settings): { formula: string; shown: string } {
  const unit = unitInForce(key, settings);
  return { formula: `="${words}, "&${unit.formula.slice(1)}`, shown: `${words}, ${unit.shown}` };
}

/**
 * The unit in force alone, for the cell beside an answer.
 *
 * @param key - of the setting, as `heat`
 * @param settings - those on the Units sheet
 * @example
 * unitInForce('heat', settings).formula // => '=INDEX(Latentry_units,4,2)'
 */
export function unitInForce(key: string, settings: Settings): { formula: string; shown: string } {
  const row = SETTINGS.findIndex((setting) => setting.key === key);
  return { formula: `=INDEX(${UNITS_NAME},${row + 1},2)`, shown: settingsRows(settings)[row]?.[1] ?? '' };
}
