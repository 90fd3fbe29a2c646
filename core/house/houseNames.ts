import { plainName } from '../catalogue/plainName';
import type { CatalogueEntry } from '../substance';
import type { GatheredRows, PropertyRow } from './gatherRows';
import type { HouseFault } from './house';
import { cellText, type HouseColumn } from './houseRow';

/** A substance of the house with the words that lead to it. */
export interface NamedRows {
  readonly gathered: GatheredRows;
  /** Words that are this substance's alone. */
  readonly words: Pick<CatalogueEntry, 'name' | 'formula' | 'cas' | 'synonyms'>;
  /** What its rows say, clashes or not. */
  readonly said: Pick<CatalogueEntry, 'formula' | 'cas' | 'synonyms'>;
  readonly replaces: boolean;
  /** False where its own name belongs to a built-in substance. */
  readonly reachable: boolean;
}

/**
 * Decides which words lead to which substance of the house. A word of a built-in substance stays with it unless a row
 * says `replaces built-in: yes`; of two substances of the house the one that is called so, else the upper one, has it.
 * Every clash is a fault that names the row.
 */
export function houseNames(
  gathered: readonly GatheredRows[],
  builtIn: readonly CatalogueEntry[],
  faults: HouseFault[],
): NamedRows[] {
  const taken = new Map<string, string>();
  for (const { name, formula, cas, synonyms } of builtIn) {
    for (const word of [name, formula, cas, ...synonyms]) {
      const plain = plainName(word);
      if (plain !== '' && !taken.has(plain)) taken.set(plain, `the built-in substance ${name}`);
    }
  }
  const own = new Map(gathered.map(({ name }) => [plainName(name), `the substance ${name}`]));
  return gathered.map((one): NamedRows => {
    const { name, first, rows } = one;
    const fault = (row: number, column: HouseColumn, severity: HouseFault['severity'], words: string): void => {
      const message = `Substances row ${row} (${name}), ${column}: ${words}`;
      faults.push({ row, column, substance: name, severity, message });
    };
    const replaces = readReplaces(rows, fault);
    const holder = taken.get(plainName(name));
    if (replaces && holder === undefined) {
      const row = rows.find(({ property }) => property.is === 'replaces built-in')?.row.number ?? first;
      fault(row, 'coefficients', 'warning', `there is no built-in substance called ${name} to replace`);
    }
    const reachable = replaces || holder === undefined;
    if (!reachable) {
      fault(
        first,
        'substance',
        'error',
        `the name is that of ${holder}; choose another, or add a row "replaces built-in" with yes`,
      );
    }
    const wordsOf = (is: 'formula' | 'CAS' | 'synonym'): { all: string[]; free: string[] } => {
      const all: string[] = [];
      const free: string[] = [];
      for (const { row, property } of rows) {
        if (property.is !== is) continue;
        for (const word of cellText(row.cells.coefficients).split(';')) {
          const text = word.trim();
          const plain = plainName(text);
          if (plain === '') {
            fault(row.number, 'coefficients', 'error', `a text is allowed; received a blank`);
            continue;
          }
          all.push(text);
          const other = own.get(plain) ?? (replaces ? undefined : taken.get(plain));
          if (other !== undefined && plain !== plainName(name)) {
            fault(row.number, 'coefficients', 'warning', `"${text}" leads to ${other}, not here`);
          } else {
            free.push(text);
            own.set(plain, `the substance ${name}`);
          }
        }
      }
      return { all, free };
    };
    const [formula, cas, synonyms] = [wordsOf('formula'), wordsOf('CAS'), wordsOf('synonym')];
    const inherited = replaces ? otherWords(name, builtIn) : [];
    return {
      gathered: one,
      words: {
        name,
        formula: formula.free[0] ?? '',
        cas: cas.free[0] ?? '',
        synonyms: [...synonyms.free, ...inherited],
      },
      said: { formula: formula.all[0] ?? '', cas: cas.all[0] ?? '', synonyms: synonyms.all },
      replaces,
      reachable,
    };
  });
}

/** What else leads to a built-in substance and to no other: its formula, number and synonyms go with its name. */
function otherWords(name: string, builtIn: readonly CatalogueEntry[]): string[] {
  const plain = plainName(name);
  const words = ({ formula, cas, synonyms }: CatalogueEntry): string[] => [formula, cas, ...synonyms];
  const replaced = builtIn.find((entry) => plainName(entry.name) === plain);
  if (replaced === undefined) return [];
  const others = new Set(builtIn.flatMap((e) => (e === replaced ? [] : [e.name, ...words(e)].map(plainName))));
  return words(replaced).filter((word) => plainName(word) !== '' && !others.has(plainName(word)));
}

function readReplaces(
  rows: readonly PropertyRow[],
  fault: (row: number, column: HouseColumn, severity: HouseFault['severity'], words: string) => void,
): boolean {
  let replaces = false;
  for (const { row, property } of rows) {
    if (property.is !== 'replaces built-in') continue;
    const said = cellText(row.cells.coefficients).toLowerCase();
    if (said === 'yes' || said === 'true') replaces = true;
    else if (said !== 'no' && said !== 'false') {
      fault(
        row.number,
        'coefficients',
        'error',
        `allowed yes or no; received ${said === '' ? 'a blank' : `"${said}"`}`,
      );
    }
  }
  return replaces;
}
