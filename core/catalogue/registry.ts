import { Problem } from '../problem';
import type { CatalogueEntry, Substance } from '../substance';
import { meantBy, type Meant } from './meantBy';
import { plainName } from './plainName';
import { refused } from './refused';

/** Substances by every name they have. */
export interface Registry {
  readonly entries: readonly CatalogueEntry[];
  /** Finds an entry by name, formula, CAS number or synonym; `undefined` where there is none. */
  entry(text: string): CatalogueEntry | undefined;
  /**
   * Finds a substance and makes it.
   * @throws Problem `argument`: for an unknown name with the nearest known one, for a formula of several with their names
   */
  find(text: string): Substance;
}

/**
 * A registry of entries. Where two entries share a name, formula or synonym: a word that is one entry's own name means
 * that entry, any other shared word is refused with the names to choose from. Entries of `first` are asked before the
 * others, so that a team's own substance can stand in for a built-in one.
 *
 * @param entries in the order in which they are listed
 * @param first entries that win over the others by all their names
 */
export function makeRegistry(entries: readonly CatalogueEntry[], first: readonly CatalogueEntry[] = []): Registry {
  const ahead = index(first);
  const behind = index(entries);
  const all = [...first, ...entries];
  const found = (text: string): readonly CatalogueEntry[] => {
    const plain = plainName(text);
    return ahead.get(plain) ?? behind.get(plain) ?? [];
  };
  return {
    entries: all,
    entry: (text) => {
      const candidates = found(text);
      return candidates.length === 1 ? candidates[0] : undefined;
    },
    find: (text) => {
      const candidates = found(text);
      const only = candidates[0];
      if (only === undefined) throw unknown(text, all);
      if (candidates.length === 1) return only.make();
      throw new Problem({
        code: 'argument',
        argument: 'substance',
        allowed: `one name, as ${candidates.map(({ name }) => name).join(' or ')}`,
        received: `"${text}", which they share`,
      });
    },
  };
}

function index(entries: readonly CatalogueEntry[]): Map<string, CatalogueEntry[]> {
  const byWord = new Map<string, CatalogueEntry[]>();
  for (const entry of entries) byWord.set(plainName(entry.name), [entry]);
  const names = new Set(byWord.keys());
  for (const entry of entries) {
    for (const word of [entry.formula, entry.cas, ...entry.synonyms]) {
      const plain = plainName(word);
      if (plain === '' || names.has(plain)) continue;
      const known = byWord.get(plain);
      if (known === undefined) byWord.set(plain, [entry]);
      else if (!known.includes(entry)) known.push(entry);
    }
  }
  return byWord;
}

/** How many names a message lists before it says how many more there are. */
const LISTED = 6;

function unknown(text: string, entries: readonly CatalogueEntry[]): Problem {
  const names = entries.map(({ name }) => name);
  const more = names.length > LISTED ? ` and ${names.length - LISTED} more (the pane lists them)` : '';
  const meant = nameWithWord(meantBy(entries, text));
  return refused(
    'substance',
    text,
    [`${names.slice(0, LISTED).join(', ')}${more}`],
    meant === undefined ? [] : [meant],
    meant,
  );
}

/** A name, with the synonym that was met in front of it: `kalium (potassium)`. */
function nameWithWord(meant: Meant | undefined): string | undefined {
  if (meant === undefined) return undefined;
  const { entry, word } = meant;
  return plainName(entry.name) === plainName(word) ? entry.name : `${word} (${entry.name})`;
}
