import { CellValueType, type ICellData, type IWorkbookData, LocaleType } from '@univerjs/core';
import { sheetId, type EngineBook, type EngineSheet, type EngineValue } from './engineBook';

/** A book as the grid library stores it: values and formulas only. */
export function snapshot(id: string, book: EngineBook): Partial<IWorkbookData> {
  return {
    id,
    name: id,
    appVersion: '',
    locale: LocaleType.EN_US,
    styles: {},
    sheetOrder: book.sheets.map((_sheet, i) => sheetId(i)),
    sheets: Object.fromEntries(book.sheets.map((sheet, i) => [sheetId(i), worksheet(sheetId(i), sheet)])),
  };
}

function worksheet(id: string, sheet: EngineSheet) {
  const cellData: Record<number, Record<number, ICellData>> = {};
  for (const { row, column, value, formula } of sheet.cells) {
    (cellData[row] ??= {})[column] = formula === undefined ? cellOf(value) : { f: formula };
  }
  return { id, name: sheet.name, cellData, rowCount: sheet.rows, columnCount: sheet.columns };
}

function cellOf(value: EngineValue): ICellData {
  switch (typeof value) {
    case 'number':
      return { v: value, t: CellValueType.NUMBER };
    case 'boolean':
      return { v: value ? 1 : 0, t: CellValueType.BOOLEAN };
    case 'string':
      return { v: value, t: CellValueType.STRING };
    default:
      return value === null ? {} : { v: value.code, t: CellValueType.STRING };
  }
}
