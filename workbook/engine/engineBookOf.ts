import { parseArea, parseReference } from '../../taskpane/hosts/address';
import type { Cell } from '../../taskpane/port';
import type { Book, BookName, BookSheet } from '../book';
import { spilledCells } from '../spilledCells';
import type { EngineBook, EngineCell, EngineName, EngineSheet, EngineValue } from './engineBook';

/** Room below and beside the used cells for what spills. */
const SPARE_ROWS = 100_000;
const SPARE_COLUMNS = 256;

/** A book as the formula engine takes it: cells that hold only kept values of a spill are left empty. */
export function engineBookOf(book: Book): EngineBook {
  return {
    sheets: book.sheets.map(engineSheet),
    names: book.names.map((name) => engineName(name, book)),
  };
}

function engineSheet(sheet: BookSheet): EngineSheet {
  const held = spilledCells(sheet);
  const cells: EngineCell[] = [];
  let rows = 0;
  let columns = 0;
  for (const [address, { value, formula }] of Object.entries(sheet.cells)) {
    const area = parseArea(address);
    if (area === null || held.has(address) || (value === null && formula === undefined)) continue;
    const { top: row, left: column } = area;
    cells.push({ row, column, value: engineValue(value), ...(formula === undefined ? {} : { formula }) });
    rows = Math.max(rows, row + 1);
    columns = Math.max(columns, column + 1);
  }
  return { name: sheet.name, rows: rows + SPARE_ROWS, columns: columns + SPARE_COLUMNS, cells };
}

function engineName({ name, formula, sheet }: BookName, book: Book): EngineName {
  const text = parseReference(formula) === null ? `=${formula.replace(/^=/, '')}` : formula.replace(/^=/, '');
  const index = sheet === undefined ? -1 : book.sheets.findIndex((each) => each.name === sheet);
  return { name, formula: text, ...(index < 0 ? {} : { sheet: index }) };
}

function engineValue(value: Cell): EngineValue {
  return typeof value === 'object' && value !== null ? { code: value.error } : value;
}
