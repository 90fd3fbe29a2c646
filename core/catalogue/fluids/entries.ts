import type { CatalogueEntry } from '../../substance';

/** Process fluids. */
export const fluidEntries: readonly CatalogueEntry[] = [];
