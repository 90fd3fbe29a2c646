import { closingIndex, type FormulaToken, isCall } from './formulaTokens';

const PREFIX = '_xlpm.';

/**
 * Gives the names that LET and LAMBDA introduce the prefix under which the file format stores them.
 *
 * @param tokens - a formula as typed
 * @returns its tokens, names of parameters prefixed wherever they stand within their call
 */
export function markParameters(tokens: readonly FormulaToken[]): FormulaToken[] {
  const marked = [...tokens];
  tokens.forEach((token, i) => {
    const name = token.text.toUpperCase();
    if (!isCall(tokens, i) || (name !== 'LET' && name !== 'LAMBDA')) return;
    const close = closingIndex(tokens, i + 1);
    const starts = argumentStarts(tokens, i + 1, close);
    const last = starts.length - 1;
    const names = new Set<string>();
    starts.forEach((start, position) => {
      if (position === last || (name === 'LET' && position % 2 === 1)) return;
      const first = tokens.slice(start, close).find((each) => each.kind !== 'space');
      const bare = first?.kind === 'bracket' ? first.text.slice(1, -1) : first?.kind === 'word' ? first.text : '';
      if (bare !== '') names.add(bare.toLowerCase());
    });
    for (let at = i + 2; at < close; at++) {
      const each = marked[at];
      const bare = each?.kind === 'bracket' ? each.text.slice(1, -1) : (each?.text ?? '');
      if (each === undefined || !names.has(bare.toLowerCase()) || tokens[at + 1]?.text === '!') continue;
      if (each.kind === 'word') marked[at] = { kind: 'word', text: PREFIX + each.text };
      else if (each.kind === 'bracket') marked[at] = { kind: 'bracket', text: `[${PREFIX}${bare}]` };
    }
  });
  return marked;
}

function argumentStarts(tokens: readonly FormulaToken[], open: number, close: number): number[] {
  const starts = [open + 1];
  for (let at = open + 1; at < close; at++) {
    const text = tokens[at]?.kind === 'mark' ? tokens[at]?.text : '';
    if (text === '(' || text === '{') at = closingIndex(tokens, at);
    else if (text === ',') starts.push(at + 1);
  }
  return starts;
}
