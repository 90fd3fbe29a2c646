import type { Cell, CellErrorCode } from '../../taskpane/port';
import { unescapeText } from './escapeXml';

const ERRORS: readonly string[] = [
  '#VALUE!',
  '#N/A',
  '#REF!',
  '#NAME?',
  '#NUM!',
  '#DIV/0!',
  '#NULL!',
  '#SPILL!',
  '#CALC!',
];

/**
 * The value that a `c` element stores.
 *
 * @param type - its `t`
 * @param stored - text of `v`, or of the inline text
 * @param strings - the table of shared texts
 */
export function cellFromFile(type: string, stored: string, strings: readonly string[]): Cell {
  switch (type) {
    case 's':
      return strings[Number(stored)] ?? '';
    case 'str':
    case 'inlineStr':
      return unescapeText(stored);
    case 'b':
      return stored === '1' || stored === 'true';
    case 'd':
      return stored;
    case 'e':
      return { error: errorCode(stored) };
    default: {
      if (stored.trim() === '') return null;
      const number = Number(stored);
      return Number.isFinite(number) ? number : { error: '#NUM!' };
    }
  }
}

function errorCode(stored: string): CellErrorCode {
  if (stored === '#GETTING_DATA') return '#BUSY!';
  return ERRORS.includes(stored) ? (stored as CellErrorCode) : '#VALUE!';
}
