import { formatArea } from '../../../taskpane/hosts/address';
import { cellName, type FunctionList, NAMESPACE } from '../../grid/functionList';
import { cellValue } from '../grid/cellValue';
import { gridCells } from '../grid/gridCells';
import type { Grid } from '../grid/openGrid';
import { ERROR_WORDS } from './errorWords';
import { houseFaults } from './houseFaults';

/** What there is to say about one cell beside its content. */
export interface CellInfo {
  readonly tone: 'error' | 'note' | 'plain';
  readonly text: string;
  /** Stands over the words where they are shown at the cell. */
  readonly title?: string;
}

const HINT = `Type = and ${NAMESPACE}. to see the functions.`;
const CAUTION = 'Answers serve engineering calculation only: someone qualified checks them before they are used.';

/** The words for a cell: its error, what is wrong with its row of substances, its note, what its function answers, or where its value comes from. */
export function cellInfo(grid: Grid, list: FunctionList, sheetId: string, row: number, column: number): CellInfo {
  const sheet = grid.workbook().getSheetBySheetId(sheetId);
  if (sheet === null) return { tone: 'plain', text: '' };
  const cells = gridCells(grid.injector, sheet.getSheet());
  const data = cells.at(row, column);
  const value = cellValue(data);
  const here = formatArea({ top: row, left: column, rows: 1, columns: 1 });
  const anchor = cells.anchor(row, column) ?? { row, column };
  if (typeof value === 'object' && value !== null) {
    const offset = { row: row - anchor.row, column: column - anchor.column };
    const words = grid.messages.at(sheetId, anchor.row, anchor.column, value.error, offset);
    return { tone: 'error', text: `${here} shows ${value.error}: ${words ?? ERROR_WORDS[value.error]}` };
  }
  const faults = houseFaults(grid, sheetId).get(row);
  if (faults !== undefined) {
    const error = faults.some(({ fault }) => fault.severity === 'error');
    const text = faults.map(({ fault }) => fault.message).join('. ');
    return { tone: error ? 'error' : 'note', text, title: error ? 'This row can’t be used' : 'Look at this row again' };
  }
  const note: unknown = data?.custom?.['note'];
  if (typeof note === 'string') return { tone: 'note', text: `${here}, note: ${note}` };
  const formula = cells.formula(row, column);
  if (formula !== '') {
    const holds = typeof value === 'number' ? `${here} holds ${value}. ` : '';
    return { tone: 'plain', text: holds + functionWords(formula, list) };
  }
  if (anchor.row !== row || anchor.column !== column) {
    const from = formatArea({ top: anchor.row, left: anchor.column, rows: 1, columns: 1 });
    const holds = typeof value === 'number' ? ` with ${value}` : '';
    return { tone: 'plain', text: `${here} is filled${holds} by the formula in ${from}.` };
  }
  return {
    tone: 'plain',
    text: value === null ? HINT : typeof value === 'number' ? `${here} holds ${value}.` : CAUTION,
  };
}

/** Name and description of the first function of ours in a formula. */
function functionWords(formula: string, list: FunctionList): string {
  const called = new RegExp(`${NAMESPACE}\\.([A-Z]+)\\(`, 'i').exec(formula)?.[1]?.toUpperCase();
  const entry = list.functions.find(({ id }) => id === called);
  return entry === undefined ? '' : `${cellName(entry)}: ${entry.description ?? ''}`;
}
