import type { Cell, CellErrorCode } from '../../port';

const ERRORS: ReadonlySet<string> = new Set<CellErrorCode>([
  '#VALUE!',
  '#N/A',
  '#REF!',
  '#NAME?',
  '#NUM!',
  '#DIV/0!',
  '#NULL!',
  '#SPILL!',
  '#CALC!',
  '#BUSY!',
]);

function isErrorCode(text: string): text is CellErrorCode {
  return ERRORS.has(text);
}

/** A value of `Range.values` with its `Range.valueTypes` as a cell of the port. */
export function cellFromExcel(value: unknown, type: string): Cell {
  if (type === 'Empty') return null;
  if (type === 'Error') {
    const text = String(value);
    return isErrorCode(text) ? { error: text } : { error: '#VALUE!', message: text };
  }
  if (typeof value === 'number' || typeof value === 'boolean' || typeof value === 'string') return value;
  return value === null || value === undefined ? null : JSON.stringify(value);
}

/** An entry of `Range.formulas`, which repeats the value where a cell has no formula. */
export function formulaFromExcel(formula: unknown, value: unknown): string {
  return typeof formula === 'string' && formula.startsWith('=') && formula !== value ? formula : '';
}

/** What to write so that a cell holds exactly `cell`: without the apostrophe Excel would read text as if typed. */
export function cellToExcel(cell: Cell): string | number | boolean {
  if (cell === null || cell === '') return '';
  if (typeof cell === 'string') return `'${cell}`;
  return typeof cell === 'object' ? cell.error : cell;
}
