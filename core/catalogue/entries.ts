import type { CatalogueEntry } from '../substance';
import { water } from '../water/water';
import { condensedEntries } from './condensed/entries';
import { fluidEntries } from './fluids/entries';
import { storageEntries } from './storage/entries';

const waterEntry: CatalogueEntry = { ...named(water), make: () => water };

function named({ name, formula, cas, synonyms, group }: typeof water): Omit<CatalogueEntry, 'make'> {
  return { name, formula, cas, synonyms, group };
}

/** Every built-in substance: water first, then in alphabetical order of the name. */
export const entries: readonly CatalogueEntry[] = [
  waterEntry,
  ...[...fluidEntries, ...condensedEntries, ...storageEntries].sort((a, b) => (a.name < b.name ? -1 : 1)),
];
