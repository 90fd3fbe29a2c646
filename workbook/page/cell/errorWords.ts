import type { CellErrorCode } from '../../../taskpane/port';

/** What an error code means, for errors that no function of ours explained. */
export const ERROR_WORDS: Readonly<Record<CellErrorCode, string>> = {
  '#VALUE!': 'an argument or operand is of the wrong kind',
  '#N/A': 'no value is available',
  '#REF!': 'a cell that the formula points at is no longer there',
  '#NAME?': 'a function or name in the formula is not known',
  '#NUM!': 'a number is outside what the function can take',
  '#DIV/0!': 'division by zero, or by an empty cell',
  '#NULL!': 'two ranges have no cell in common',
  '#SPILL!': 'the cells that the result needs are not empty',
  '#CALC!': 'the formula can not be calculated',
  '#BUSY!': 'the answer is still on its way',
};
