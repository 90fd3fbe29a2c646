import { Problem } from '../problem';
import { parseNumber, type Decimal } from '../units/parseNumber';
import { plainText } from '../units/plainText';

/** A number of a cell, and the unit that was written behind it; "" where there was none. */
export interface CellNumber {
  readonly value: number;
  readonly unit: string;
}

/** What may be written between the numbers of one cell. */
const EXPECTED = 'numbers parted by semicolons or blanks, as 2.35; 0.0041';

/**
 * The numbers of a cell: a number, or a text as `2.35; 0.0041` or `43.3 351.4 514`. A number may carry a unit:
 * `846; 78.3 degC; 514 K`.
 *
 * @throws Problem `argument` for a text that is no such list
 */
export function cellNumbers(cell: unknown, decimal: Decimal): CellNumber[] {
  if (typeof cell === 'number') return [{ value: cell, unit: '' }];
  if (typeof cell === 'boolean') throw refused(String(cell), EXPECTED);
  const text = typeof cell === 'string' ? cell.trim() : '';
  if (text === '') throw refused('nothing', EXPECTED);
  const parted = /[;\n]/.test(text) ? text.split(/[;\n]/) : joinedUnits(text.split(/\s+/));
  return parted.filter((part) => part.trim() !== '').map((part) => oneNumber(part, decimal));
}

/** Words without a digit at their start belong to the number before them: `78.3 degC` is one part. */
function joinedUnits(words: readonly string[]): string[] {
  const parts: string[] = [];
  for (const word of words) {
    const before = parts.at(-1);
    if (before !== undefined && !/^[-+−.,]?\d/.test(word)) parts[parts.length - 1] = `${before} ${word}`;
    else parts.push(word);
  }
  return parts;
}

function oneNumber(part: string, decimal: Decimal): CellNumber {
  const read = parseNumber(plainText(part), decimal);
  if (read?.value === undefined) {
    throw refused(`"${part.trim()}"`, read === undefined ? EXPECTED : read.likely.join(' or '));
  }
  return { value: read.value, unit: read.rest };
}

/**
 * The pairs of a table: `20:2.1; 40:2.15`.
 *
 * @throws Problem `argument` for a text that is none
 */
export function cellPairs(cell: unknown, decimal: Decimal): [x: number, y: number][] {
  const expected = 'pairs of temperature and value, as 20:2.1; 40:2.15';
  const text = typeof cell === 'string' ? cell.trim() : '';
  const parts = text.split(/[;\s]+/).filter((part) => part !== '');
  if (parts.length === 0) throw refused(cell === '' ? 'nothing' : `"${String(cell)}"`, expected);
  return parts.map((part) => {
    const [x = '', y = '', more] = part.split(':');
    if (more !== undefined || x === '' || y === '') throw refused(`"${part}"`, expected);
    const pair = [oneNumber(x, decimal), oneNumber(y, decimal)] as const;
    if (pair.some(({ unit }) => unit !== '')) throw refused(`"${part}"`, expected);
    return [pair[0].value, pair[1].value];
  });
}

function refused(received: string, allowed: string): Problem {
  return new Problem({ code: 'argument', argument: 'coefficients', allowed, received });
}
