import { plainName } from '../../../../core/catalogue/plainName';
import { nearest } from '../../../../core/nearest';
import type { CatalogueEntry } from '../../../../core/substance';

/** The entry that a misspelt word most likely means, by its name or a synonym. */
export function nearestEntry(entries: readonly CatalogueEntry[], typed: string): CatalogueEntry | undefined {
  const owners = new Map<string, CatalogueEntry>();
  for (const entry of entries) {
    for (const word of [entry.name, entry.formula, entry.cas, ...entry.synonyms]) {
      const plain = plainName(word);
      if (plain !== '' && !owners.has(plain)) owners.set(plain, entry);
    }
  }
  const word = nearest(plainName(typed), [...owners.keys()]);
  return word === undefined ? undefined : owners.get(word);
}
