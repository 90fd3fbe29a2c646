import { formulaTokens, type FormulaToken } from './formulaTokens';
import { SHEET_COLUMNS, SHEET_ROWS, formatArea, parseArea } from '../../taskpane/hosts/address';

/**
 * Moves the relative references of a formula, as a shared formula means them for each of its cells.
 *
 * @param stored - text of the shared formula at its first cell
 * @param rows - how far down its cell lies
 * @param columns - how far right its cell lies
 * @returns the formula for that cell; references wrap around the sheet's edge as the format lets them
 * @example
 * shiftFormula('A1*$B$1+LOG10(C$2)', 2, 1) // => 'B3*$B$1+LOG10(D$2)'
 */
export function shiftFormula(stored: string, rows: number, columns: number): string {
  const tokens = formulaTokens(stored);
  const shifted = tokens.map((token, i) => {
    if (tokens[i + 1]?.text === '(' || tokens[i + 1]?.text === '!') return token.text;
    if (token.kind === 'word') {
      const cell = /^(\$?)([A-Za-z]{1,3})(\$?)(\d{1,7})$/.exec(token.text);
      if (cell !== null) return shiftCell(token.text, cell, rows, columns);
      if (/^\$?[A-Za-z]{1,3}$/.test(token.text) && inRange(tokens, i)) return shiftColumn(token.text, columns);
      if (/^\$\d+$/.test(token.text)) return token.text;
    }
    if (token.kind === 'number' && /^\d+$/.test(token.text) && inRange(tokens, i))
      return String(wrapRow(Number(token.text) - 1 + rows) + 1);
    return token.text;
  });
  return shifted.join('');
}

const wrapRow = (row: number) => ((row % SHEET_ROWS) + SHEET_ROWS) % SHEET_ROWS;
const wrapColumn = (column: number) => ((column % SHEET_COLUMNS) + SHEET_COLUMNS) % SHEET_COLUMNS;

function shiftCell(text: string, parts: RegExpExecArray, rows: number, columns: number): string {
  const area = parseArea(text);
  if (area === null) return text;
  const columnFixed = parts[1] === '$';
  const rowFixed = parts[3] === '$';
  const moved = formatArea({
    top: rowFixed ? area.top : wrapRow(area.top + rows),
    left: columnFixed ? area.left : wrapColumn(area.left + columns),
    rows: 1,
    columns: 1,
  });
  const split = /^([A-Z]+)(\d+)$/.exec(moved);
  return `${parts[1] ?? ''}${split?.[1] ?? ''}${parts[3] ?? ''}${split?.[2] ?? ''}`;
}

function shiftColumn(text: string, columns: number): string {
  const area = text.startsWith('$') ? null : parseArea(`${text}1`);
  if (area === null) return text;
  return formatArea({ ...area, left: wrapColumn(area.left + columns) }).replace(/\d+$/, '');
}

/** Part of `A:C` or `1:3`: a colon on one side and the like of it beyond. */
function inRange(tokens: readonly FormulaToken[], i: number): boolean {
  const like = (token: FormulaToken | undefined) =>
    token !== undefined && /^\$?(?:[A-Za-z]{1,3}|\d+)$/.test(token.text);
  return (tokens[i + 1]?.text === ':' && like(tokens[i + 2])) || (tokens[i - 1]?.text === ':' && like(tokens[i - 2]));
}
