import type { HouseState } from '../../functions/house/store';
import type { LatentryBundle } from '../../functions/index';
import type { StoreState } from '../../functions/settings/store';
import type { Book } from '../book';
import { namedBlock } from './namedBlock';

/** The block of the team's own substances in a workbook. */
const SUBSTANCES_NAME = 'latentry_substances';

/**
 * The team's own substances of a book as the functions are told them.
 * @param book Any book, or none.
 * @param settings Its unit settings, for the decimal separator of texts.
 */
export function bookSubstances(book: Book | undefined, settings: StoreState, latentry: LatentryBundle): HouseState {
  const block = book === undefined ? undefined : namedBlock(book, SUBSTANCES_NAME);
  if (block === undefined) return { state: 'absent' };
  if (block.area === undefined) return { state: 'broken', text: block.text };
  const { decimal } = settings.state === 'ready' ? settings.settings : latentry.defaultSettings;
  return latentry.readHouseBlock({ values: block.values, firstRow: block.area.top + 1, decimal });
}
