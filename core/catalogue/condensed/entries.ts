import type { CatalogueEntry } from '../../substance';

/** Metals, salts and oxides. */
export const condensedEntries: readonly CatalogueEntry[] = [];
