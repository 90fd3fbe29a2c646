import { nearest } from '../nearest';
import { GROUP_DIMENSIONS, type Dimensions } from './dimensions';
import { FACTORS } from './factors.generated';
import { ONE, ZERO, rationalOf, type Rational } from './rational';
import { ALIASES, UNCLEAR } from './spellings';

/** A unit with a name of its own. */
export interface Atom {
  readonly symbol: string;
  readonly factor: Rational;
  readonly offset: Rational;
  readonly dimensions: Dimensions;
}

/** What a word of a unit text may turn out to be. */
export type FoundAtom =
  | { readonly atom: Atom; readonly likely?: undefined }
  /** Known words that could each be meant. */
  | { readonly atom?: undefined; readonly likely: readonly string[] }
  /** No unit; perhaps a slip of the pen. */
  | { readonly atom?: undefined; readonly likely?: undefined; readonly nearest: string | undefined };

const atoms = new Map<string, Atom>();
const loose = new Map<string, string[]>();

function enter(spelling: string, atom: Atom): void {
  atoms.set(spelling, atom);
  const key = spelling.toLowerCase();
  const symbols = loose.get(key);
  if (symbols === undefined) loose.set(key, [atom.symbol]);
  else if (!symbols.includes(atom.symbol)) symbols.push(atom.symbol);
}

for (const [group, units] of Object.entries(FACTORS)) {
  const dimensions = GROUP_DIMENSIONS[group as keyof typeof FACTORS];
  for (const [symbol, text] of Object.entries(units) as [string, string][]) {
    const [factor = '1', offset = '0'] = text.split('+');
    enter(symbol, { symbol, factor: rationalOf(factor), offset: rationalOf(offset), dimensions });
  }
}
enter('%', { symbol: '%', factor: { n: 1n, d: 100n }, offset: ZERO, dimensions: [0, 0, 0, 0, 0] });
enter('1', { symbol: '1', factor: ONE, offset: ZERO, dimensions: [0, 0, 0, 0, 0] });
for (const [symbol, spellings] of Object.entries(ALIASES)) {
  const atom = atoms.get(symbol);
  if (atom !== undefined) for (const spelling of spellings.split(' ')) enter(spelling, atom);
}

const unclearWords = new Map(Object.entries(UNCLEAR));

/** Finds a named unit: as written, else without regard to case where that is unambiguous. */
export function findAtom(word: string): FoundAtom {
  const exact = atoms.get(word);
  if (exact !== undefined) return { atom: exact };
  const unclear = unclearWords.get(word) ?? unclearWords.get(word.toLowerCase());
  if (unclear !== undefined) return { likely: unclear.split(' ') };
  const symbols = loose.get(word.toLowerCase());
  if (symbols === undefined) return { nearest: nearest(word, [...atoms.keys()]) };
  const [only] = symbols;
  const atom = symbols.length === 1 && only !== undefined ? atoms.get(only) : undefined;
  return atom === undefined ? { likely: symbols } : { atom };
}
