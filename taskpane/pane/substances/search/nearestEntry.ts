import { meantBy } from '../../../../core/catalogue/meantBy';
import type { CatalogueEntry } from '../../../../core/substance';

/** The entry that a misspelt word most likely means, as a cell would say. */
export function nearestEntry(entries: readonly CatalogueEntry[], typed: string): CatalogueEntry | undefined {
  return meantBy(entries, typed)?.entry;
}
