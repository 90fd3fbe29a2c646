import { closingIndex, formulaTokens, type FormulaToken, isCall } from './formulaTokens';
import { FUTURE_PREFIX, RANGE_GIVING } from './futureFunctions';
import { markParameters } from './markParameters';

const OWN = 'LATENTRY.';
const OWN_IN_FILE = '_xldudf_LATENTRY_';

/**
 * Writes a formula as the file format stores it: our functions as `_xldudf_LATENTRY_NAME`, younger standard functions
 * with `_xlfn.`, names of LET and LAMBDA with `_xlpm.`, `E1#` and `@A1` as the calls that stand for them.
 *
 * @param formula - as typed, with its `=`
 * @returns the stored text, without `=`
 * @example
 * toFileFormula('=LATENTRY.LATENT("water","vaporization",60)') // => '_xldudf_LATENTRY_LATENT("water","vaporization",60)'
 */
export function toFileFormula(formula: string): string {
  const tokens = markParameters(formulaTokens(formula.replace(/^=/, '')));
  return storeOperators(
    tokens.map((token, i) => {
      if (!isCall(tokens, i)) return token;
      const name = token.text.toUpperCase();
      if (name.startsWith(OWN)) return { ...token, text: OWN_IN_FILE + name.slice(OWN.length) };
      const prefix = FUTURE_PREFIX.get(name);
      return prefix === undefined ? token : { ...token, text: prefix + name };
    }),
  )
    .map((token) => token.text)
    .join('');
}

/**
 * Reads a stored formula back as a person types it; the opposite of `toFileFormula`.
 *
 * @param stored - text of an `f` element
 * @returns the formula with its `=`
 * @example
 * fromFileFormula('_xlfn.ANCHORARRAY(B2)+_xldudf_LATENTRY_LATENT("water","fusion")')
 * // => '=B2#+LATENTRY.LATENT("water","fusion")'
 */
export function fromFileFormula(stored: string): string {
  const tokens = formulaTokens(stored.replace(/^=/, ''));
  const plain = tokens.map((token, i): FormulaToken => {
    if (token.kind !== 'word') return token;
    if (/^_xlpm\./i.test(token.text)) return { ...token, text: token.text.slice(6) };
    if (!isCall(tokens, i)) return token;
    const name = token.text.replace(/^_xlfn\./i, '').replace(/^_xlws\./i, '');
    const own = name.toUpperCase().startsWith(OWN_IN_FILE.toUpperCase());
    return { ...token, text: own ? OWN + name.slice(OWN_IN_FILE.length) : name };
  });
  return `=${readOperators(plain, tokens)
    .map((token) => token.text)
    .join('')}`;
}

/** Whether Excel itself would store the formula as one that may spill. */
export function maySpill(formula: string): boolean {
  const tokens = formulaTokens(formula);
  return tokens.some((token, i) => {
    if (token.text === '#' || !isCall(tokens, i)) return token.text === '#';
    const name = token.text.toUpperCase();
    return name.startsWith(OWN) || RANGE_GIVING.has(name);
  });
}

/** Whether the formula calls one of our functions. */
export function callsOurs(formula: string): boolean {
  const tokens = formulaTokens(formula);
  return tokens.some((token, i) => token.text.toUpperCase().startsWith(OWN) && isCall(tokens, i));
}

const word = (text: string): FormulaToken => ({ kind: 'word', text });
const mark = (text: string): FormulaToken => ({ kind: 'mark', text });

/** `ANCHORARRAY(ref)` becomes `ref#`, `SINGLE(primary)` becomes `@primary`; anything less plain stays as it is. */
function readOperators(tokens: FormulaToken[], stored: readonly FormulaToken[]): FormulaToken[] {
  for (let i = tokens.length - 1; i >= 0; i--) {
    const name = tokens[i]?.text;
    if ((name !== 'ANCHORARRAY' && name !== 'SINGLE') || !isCall(tokens, i) || stored[i]?.text === name) continue;
    const close = closingIndex(tokens, i + 1);
    const inner = tokens.slice(i + 2, close);
    if (inner.length === 0 || primaryEnd(inner, 0) !== inner.length) continue;
    if (name === 'ANCHORARRAY' && isCall(inner, 0)) continue;
    const plain = name === 'SINGLE' ? [mark('@'), ...inner] : [...inner, mark('#')];
    tokens.splice(i, close - i + 1, ...plain);
    stored = [...stored.slice(0, i), ...plain, ...stored.slice(close + 1)];
  }
  return tokens;
}

function storeOperators(tokens: FormulaToken[]): FormulaToken[] {
  for (let i = tokens.length - 1; i >= 0; i--) {
    const token = tokens[i];
    if (token?.kind !== 'mark') continue;
    if (token.text === '#') {
      const start = referenceStart(tokens, i);
      if (start === i) continue;
      tokens.splice(start, i - start + 1, word('_xlfn.ANCHORARRAY'), mark('('), ...tokens.slice(start, i), mark(')'));
      i = start;
    } else if (token.text === '@') {
      const end = primaryEnd(tokens, i + 1);
      if (end === i + 1) continue;
      tokens.splice(i, end - i, word('_xlfn.SINGLE'), mark('('), ...tokens.slice(i + 1, end), mark(')'));
    }
  }
  return tokens;
}

/** The index after the reference, name, call or bracketed expression that starts at `start`. */
function primaryEnd(tokens: readonly FormulaToken[], start: number): number {
  let at = start;
  for (;;) {
    if (isCall(tokens, at)) at = closingIndex(tokens, at + 1) + 1;
    else if (tokens[at]?.text === '(' && at === start) at = closingIndex(tokens, at) + 1;
    else {
      const from = at;
      while (['word', 'sheet', 'bracket', 'number'].includes(tokens[at]?.kind ?? '') || tokens[at]?.text === '!') at++;
      if (at === from) return start;
    }
    if (tokens[at]?.text === '#') at++;
    if (tokens[at]?.text !== ':') return at;
    at++;
  }
}

/** The index where the single reference that ends before `end` starts. */
function referenceStart(tokens: readonly FormulaToken[], end: number): number {
  let at = end;
  while (at > 0 && (['word', 'sheet', 'bracket'].includes(tokens[at - 1]?.kind ?? '') || tokens[at - 1]?.text === '!'))
    at--;
  return at;
}
