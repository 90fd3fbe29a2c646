import { nearest } from '../nearest';
import type { CatalogueEntry } from '../substance';
import { plainName } from './plainName';

/** Substances are often a few letters apart: helium is not kalium, nor propylene a xylene. */
const SLIP_PART = 1 / 4;

/** Between two letters a slip is as likely as another element. */
const SHORTEST = 3;

/** An entry, and the one of its names that was met. */
export interface Meant {
  readonly entry: CatalogueEntry;
  readonly word: string;
}

/**
 * The entry that a misspelt word most likely means, by any of its names.
 *
 * @param entries in the order in which they are asked
 * @param text what was written
 */
export function meantBy(entries: readonly CatalogueEntry[], text: string): Meant | undefined {
  const plain = plainName(text);
  if (plain.length < SHORTEST) return undefined;
  const words = new Map<string, Meant>();
  const add = (entry: CatalogueEntry, word: string): void => {
    const key = plainName(word);
    if (key !== '' && !words.has(key)) words.set(key, { entry, word });
  };
  for (const entry of entries) add(entry, entry.name);
  for (const entry of entries) for (const word of [entry.formula, entry.cas, ...entry.synonyms]) add(entry, word);
  const close = nearest(plain, [...words.keys()], SLIP_PART);
  return close === undefined ? undefined : words.get(close);
}
