import { findAtom, type Atom } from './atoms';

/** One factor of a unit product, as `K` to the power −1. */
export interface Term {
  readonly atom: Atom;
  readonly power: number;
}

/** A product of named units, or why a text is none. */
export type ReadProduct =
  | { readonly terms: readonly Term[]; readonly likely?: undefined }
  | { readonly terms?: undefined; readonly likely: readonly string[] }
  | { readonly terms?: undefined; readonly likely?: undefined; readonly nearest: string | undefined };

/** Spellings in several words or with a subscript, brought to the one word that the table knows. */
const WORDS: readonly (readonly [RegExp, string | ((...match: string[]) => string)])[] = [
  [/\*\*/g, '^'],
  [/\bper\b/gi, '/'],
  [/([A-Za-z)])\.(?=[A-Za-z(])/g, '$1*'],
  [/\b(k?)cal[ _]?[({]{0,2}(IT|th)\b[)}]{0,2}/gi, (_, k = '', kind = '') => `${k.toLowerCase()}cal_${subscript(kind)}`],
  [/\b(k|MM)?btu[ _]?[({]{0,2}(IT|th)\b[)}]{0,2}/gi, (_, p = '', kind = '') => `${prefix(p)}Btu_${subscript(kind)}`],
  [/\b(mm|in) ?(Hg|H2O)\b/gi, (_, size = '', of = '') => size.toLowerCase() + (/hg/i.test(of) ? 'Hg' : 'H2O')],
  [/\bdeg(?:rees?)?[ .]?([CFRK])(?![A-Za-z])/gi, (_, scale = '') => `deg${scale.toUpperCase()}`],
  [/\b([kMG]?W)[ *]?h(?![A-Za-z^])/g, '$1h'],
  [/\b(lb|k?g)-mole?\b/gi, '$1mol'],
  [/\b(short|long) tons?\b/gi, (_, size = '') => `ton_${size.toLowerCase()}`],
  [/\bmetric tons?\b/gi, 't'],
  [/\btons? of refrigeration\b/gi, 'ton_refrigeration'],
  [/\b(US|UK) gal(?:lons?)?\b/gi, (_, where = '') => `gal_${where.toUpperCase()}`],
  [/\bcc\b/g, 'cm^3'],
  // A hyphen between units, as in J/mol-K, is a product; lb-mol has been joined above.
  [/([A-Za-z)])-(?=[A-Za-z(])/g, '$1*'],
];

const subscript = (kind: string): string => (/it/i.test(kind) ? 'IT' : 'th');
const prefix = (text: string): string => (text.toLowerCase() === 'mm' ? 'MM' : text.toLowerCase());

const TOKEN = /\s*(?:([A-Za-z]+H2O|[A-Za-z_%]+|1(?![\d.]))(?:\^?([+-]?\d)(?!\d)|\^\(([+-]?\d)\))?|([*/()]))/y;

/**
 * Reads a product of units in plain characters: `kJ/(kg K)`, `J mol^-1 K^-1`, `Btu_IT/lb`.
 *
 * @param plain a text as `plainText` leaves it
 * @param wideSlash everything after a slash stands below it, as `J/mol K` is commonly meant
 */
export function readProduct(plain: string, wideSlash: boolean): ReadProduct {
  const text = WORDS.reduce((joined, [pattern, word]) => joined.replace(pattern, word as string), plain);
  const terms: Term[] = [];
  const groups: number[] = [];
  let group = 1;
  let next = 1;
  let wantsUnit = true;
  TOKEN.lastIndex = 0;
  while (TOKEN.lastIndex < text.length) {
    const start = TOKEN.lastIndex;
    const token = TOKEN.exec(text);
    if (token === null) return { nearest: undefined };
    const [, word, attached, inBrackets, sign] = token;
    if (word !== undefined) {
      const found = findAtom(word);
      if (found.likely !== undefined)
        return { likely: found.likely.map((likely) => replaceWord(text, start, word, likely)) };
      if (found.atom === undefined) {
        return { nearest: found.nearest === undefined ? undefined : replaceWord(text, start, word, found.nearest) };
      }
      terms.push({ atom: found.atom, power: Number(attached ?? inBrackets ?? 1) * group * next });
      if (!wideSlash) next = 1;
      wantsUnit = false;
    } else if (sign === '(') {
      groups.push(group);
      group *= next;
      next = 1;
    } else if (sign === ')') {
      const outer = groups.pop();
      if (outer === undefined || wantsUnit) return { nearest: undefined };
      group = outer;
    } else {
      if (wantsUnit) return { nearest: undefined };
      wantsUnit = true;
      if (sign === '/') next = -1;
    }
  }
  return wantsUnit || groups.length > 0 ? { nearest: undefined } : { terms };
}

function replaceWord(text: string, start: number, word: string, by: string): string {
  const at = text.indexOf(word, start);
  return text.slice(0, at) + by + text.slice(at + word.length);
}
