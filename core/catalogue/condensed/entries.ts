import { condensedSubstance } from '../../nasa9/substance/condensedSubstance';
import type { CondensedRecord } from '../../nasa9/substance/record';
import type { CatalogueEntry, Substance } from '../../substance';
import { elements } from './elements';
import { halides } from './halides';
import { oxides } from './oxides';
import { salts } from './salts';

/** Metals, salts and oxides, with all their crystal forms, melting and, where the gas is known, boiling. */
export const condensedEntries: readonly CatalogueEntry[] = [...elements, ...halides, ...salts, ...oxides].map(entryOf);

function entryOf(record: CondensedRecord): CatalogueEntry {
  const { name, formula, cas, synonyms, group } = record;
  let made: Substance | undefined;
  return { name, formula, cas, synonyms, group, make: () => (made ??= condensedSubstance(record)) };
}
