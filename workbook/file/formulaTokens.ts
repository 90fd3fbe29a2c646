export interface FormulaToken {
  readonly kind: 'space' | 'text' | 'sheet' | 'bracket' | 'error' | 'number' | 'word' | 'mark';
  readonly text: string;
}

const KINDS: readonly (readonly [FormulaToken['kind'], RegExp])[] = [
  ['space', /\s+/y],
  ['text', /"(?:[^"]|"")*(?:"|$)/y],
  ['sheet', /'(?:[^']|'')*(?:'|$)/y],
  [
    'error',
    /#(?:NULL!|DIV\/0!|VALUE!|REF!|NAME\?|NUM!|N\/A|GETTING_DATA|SPILL!|CALC!|FIELD!|BLOCKED!|CONNECT!|BUSY!|UNKNOWN!)/iy,
  ],
  ['number', /(?:\d+(?:\.\d*)?|\.\d+)(?:[eE][+-]?\d+)?/y],
  ['word', /[\p{L}_\\$][\p{L}\p{M}\p{N}_.\\$?]*/uy],
  ['mark', /<>|<=|>=|[^]/uy],
];

/**
 * Cuts a formula into tokens that, joined, give the formula again. Text literals, quoted sheet names and bracketed
 * references each stay one token, so that nothing inside them is taken for a function or a cell.
 *
 * @param formula - with or without its `=`
 * @returns the tokens
 * @example
 * formulaTokens('SUM("a(",B2)').map((t) => t.kind)
 * // => ['word', 'mark', 'text', 'mark', 'word', 'mark']
 */
export function formulaTokens(formula: string): FormulaToken[] {
  const tokens: FormulaToken[] = [];
  let at = 0;
  while (at < formula.length) {
    const token = formula[at] === '[' ? { kind: 'bracket' as const, text: bracket(formula, at) } : next(formula, at);
    tokens.push(token);
    at += token.text.length;
  }
  return tokens;
}

function next(formula: string, at: number): FormulaToken {
  for (const [kind, pattern] of KINDS) {
    pattern.lastIndex = at;
    const found = pattern.exec(formula)?.[0];
    if (found !== undefined && found !== '') return { kind, text: found };
  }
  return { kind: 'mark', text: formula.slice(at, at + 1) };
}

/** `[…]` with what nests inside; an apostrophe takes the meaning from the bracket after it. */
function bracket(formula: string, start: number): string {
  let depth = 0;
  for (let at = start; at < formula.length; at++) {
    const c = formula[at];
    if (c === "'") at++;
    else if (c === '[') depth++;
    else if (c === ']' && --depth === 0) return formula.slice(start, at + 1);
  }
  return formula.slice(start);
}

/** Whether the token at `index` is the name of a function that is called there. */
export function isCall(tokens: readonly FormulaToken[], index: number): boolean {
  return tokens[index]?.kind === 'word' && tokens[index + 1]?.text === '(';
}

/** The index of the bracket that closes the one at `open`, or of the last token. */
export function closingIndex(tokens: readonly FormulaToken[], open: number): number {
  let depth = 0;
  for (let i = open; i < tokens.length; i++) {
    const text = tokens[i]?.kind === 'mark' ? tokens[i]?.text : '';
    if (text === '(' || text === '{') depth++;
    else if ((text === ')' || text === '}') && --depth === 0) return i;
  }
  return tokens.length - 1;
}
