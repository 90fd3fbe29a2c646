import { DEFAULT_SETTINGS } from '../../functions/settings/defaultSettings';
import type { Settings } from '../../functions/settings/settingsType';
import type { Book } from '../book';
import { checksSheet } from './checksSheet';
import { coverSheet } from './coverSheet';
import { deltaCpSheet } from './deltaCpSheet';
import { latentHeatSheet } from './latentHeatSheet';
import { listsSheet } from './listsSheet';
import { standardStyles } from './styles';
import { substancesName, substancesSheet } from './substancesSheet';
import { unitsName, unitsSheet } from './unitsSheet';

export interface StandardBookOptions {
  /** What the Units sheet starts with; the documented defaults where left out. */
  readonly settings?: Settings;
  /** Written beside the first revision, as text; left out, the reader fills it in. */
  readonly revisionDate?: string;
}

/**
 * The standard workbook as plain data: formulas stand in it, their values come from whoever calculates it.
 *
 * @param options - settings and date, both optional
 * @returns Cover, Units, Latent heat, ΔCp fit, Substances, Checks, and the hidden lists of choices
 * @example
 * standardBook().sheets.map((sheet) => sheet.name)
 * // => ['Cover', 'Units', 'Latent heat', 'ΔCp fit', 'Substances', 'Checks', 'Lists']
 */
export function standardBook(options: StandardBookOptions = {}): Book {
  const settings = options.settings ?? DEFAULT_SETTINGS;
  return {
    sheets: [
      coverSheet(options.revisionDate ?? ''),
      unitsSheet(settings),
      latentHeatSheet(settings),
      deltaCpSheet(),
      substancesSheet(settings),
      checksSheet(),
      listsSheet(),
    ],
    names: [unitsName, substancesName],
    styles: standardStyles,
    properties: {},
  };
}
