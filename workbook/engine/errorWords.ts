import { nearest } from '../../core/nearest';
import type { CellErrorCode } from '../../taskpane/port';
import { scanFormula } from './scanFormula';

const WORDS: Readonly<Record<CellErrorCode, string>> = {
  '#VALUE!': 'an argument is of the wrong type',
  '#N/A': 'no value is available',
  '#REF!': 'a reference to cells that are not there',
  '#NAME?': 'a name that is not defined',
  '#NUM!': 'a number outside what the function can answer',
  '#DIV/0!': 'division by zero',
  '#NULL!': 'ranges without a cell in common',
  '#SPILL!': 'the cells that the result needs are not empty',
  '#CALC!': 'the calculation could not be completed',
  '#BUSY!': 'the answer is not there yet',
};

/** Codes of the formula engine that a workbook file does not know. */
const FOREIGN: Readonly<Record<string, readonly [CellErrorCode, string]>> = {
  '#CYCLE!': ['#REF!', 'the formula depends on its own cell'],
  '#ERROR!': ['#VALUE!', WORDS['#VALUE!']],
  '#GETTING_DATA': ['#BUSY!', WORDS['#BUSY!']],
};

/**
 * The error of a cell as a workbook file knows it, with words.
 * @param code What the engine says.
 * @param message The words of the function that gave the error, where it gave any.
 * @param formula The formula of the cell.
 * @param functionNames Every function there is, in capital letters.
 */
export function errorWords(
  code: string,
  message: string | undefined,
  formula: string,
  functionNames: () => readonly string[],
): { error: CellErrorCode; message: string } {
  const [error, words] =
    FOREIGN[code] ?? (code in WORDS ? [code as CellErrorCode, WORDS[code as CellErrorCode]] : ['#VALUE!', code]);
  if (message !== undefined) return { error, message };
  if (error !== '#NAME?') return { error, message: words };
  const names = functionNames();
  const unknown = scanFormula(formula).functions.find((name) => !names.includes(name.toUpperCase()));
  if (unknown === undefined) return { error, message: words };
  const near = nearest(unknown.toUpperCase(), names);
  return { error, message: `no function ${unknown}${near === undefined ? '' : `; nearest: ${near}`}` };
}
