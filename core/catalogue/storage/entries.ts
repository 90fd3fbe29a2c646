import type { CatalogueEntry } from '../../substance';

/** Heat-storage materials. */
export const storageEntries: readonly CatalogueEntry[] = [];
