import { plainName } from '../../../../core/catalogue/plainName';
import type { CatalogueEntry } from '../../../../core/substance';

/** One line of the list: the entry, and the word of it that was hit where that is not its name. */
export interface Hit {
  readonly entry: CatalogueEntry;
  readonly by?: string;
}

/**
 * How well a word answers the text: whole 0, from its beginning 2, from the beginning of a later part 4, somewhere
 * inside 6. The odd ranks between are those of words that are not the name.
 */
function rankOf(text: string, word: string): number {
  const plain = plainName(word);
  if (plain === text) return 0;
  if (plain.startsWith(text)) return 2;
  const parts = word.split(/[\s\-_,()]+/).slice(1);
  if (parts.some((part) => part.toLowerCase().startsWith(text))) return 4;
  return plain.includes(text) ? 6 : Infinity;
}

interface Ranked {
  readonly hit: Hit;
  readonly rank: number;
}

function best(text: string, entry: CatalogueEntry): Ranked {
  let rank = rankOf(text, entry.name);
  let hit: Hit = { entry };
  const others: (readonly [string, string])[] = [
    [entry.formula, `formula ${entry.formula}`],
    [entry.cas, `CAS ${entry.cas}`],
    ...entry.synonyms.map((word) => [word, word] as const),
  ];
  for (const [word, by] of others) {
    const other = word === '' ? Infinity : rankOf(text, word) + 1;
    if (other >= rank) continue;
    rank = other;
    hit = { entry, by };
  }
  return { hit, rank };
}

/**
 * Entries whose name, formula, CAS number or a synonym holds the text, the nearest answers first, names before
 * other words that answer as well; every entry for a blank text. Nothing is built: only the words of the entries are read.
 */
export function searchEntries(entries: readonly CatalogueEntry[], typed: string): Hit[] {
  const text = plainName(typed.trim());
  if (text === '') return entries.map((entry) => ({ entry }));
  return entries
    .map((entry) => best(text, entry))
    .filter(({ rank }) => rank < Infinity)
    .sort((a, b) => a.rank - b.rank)
    .map(({ hit }) => hit);
}
