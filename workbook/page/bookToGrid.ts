import { BooleanNumber, type ICellData, type IWorkbookData, type IWorksheetData, LocaleType } from '@univerjs/core';
import { parseArea } from '../../taskpane/hosts/address';
import { NAMESPACE } from '../grid/functionList';
import type { Book, BookCell, BookSheet } from '../book';
import { columnLetters } from './grid/columnLetters';
import { spilledCells } from '../spilledCells';
import { gridCell } from './grid/cellValue';
import { gridNames } from './grid/gridNames';
import { gridStyle } from './grid/gridStyle';
import { listRule } from './grid/listRule';
import { pixelsOfCharacters, pixelsOfPoints } from './grid/measures';
import { rangeOf } from './grid/rangeOf';

/** Room to go on below and beside what is used. */
const SPARE_ROWS = 200;
const SPARE_COLUMNS = 12;
const LEAST_ROWS = 400;
const LEAST_COLUMNS = 26;

/**
 * A book as the grid's snapshot. Cells of ours and cells that spill come without a kept value, so that the grid
 * calculates them; other formulas keep theirs until something that they depend on changes.
 *
 * @param book - any book
 * @param unitId - the grid's key for the open workbook
 * @param sheetIds - the grid's keys for its sheets, in their order
 */
export function bookToGrid(book: Book, unitId: string, sheetIds: readonly string[]): IWorkbookData {
  const styles = new Map<string, IWorkbookData['styles'][string]>();
  for (const [key, style] of Object.entries(book.styles)) styles.set(key, gridStyle(style));
  const styleKey = (cell: BookCell): string | undefined => {
    if (cell.format === undefined) return cell.style;
    const key = `${cell.style ?? ''}\n${cell.format}`;
    if (!styles.has(key)) {
      const base = cell.style === undefined ? {} : (book.styles[cell.style] ?? {});
      styles.set(key, gridStyle({ ...base, format: cell.format }));
    }
    return key;
  };
  const sheets: Record<string, Partial<IWorksheetData>> = {};
  const lists: Record<string, unknown[]> = {};
  book.sheets.forEach((sheet, i) => {
    const id = sheetIds[i] ?? sheet.name;
    sheets[id] = worksheet(sheet, id, styleKey);
    const rules = sheet.lists.map((list, n) => listRule(list, `list-${i}-${n}`));
    lists[id] = rules.filter((rule) => rule !== null);
  });
  return {
    id: unitId,
    name: 'workbook',
    appVersion: '',
    locale: LocaleType.EN_US,
    styles: Object.fromEntries(styles),
    sheetOrder: [...sheetIds],
    sheets,
    resources: [
      { name: 'SHEET_DEFINED_NAME_PLUGIN', data: JSON.stringify(gridNames(book, sheetIds)) },
      { name: 'SHEET_DATA_VALIDATION_PLUGIN', data: JSON.stringify(lists) },
    ],
  };
}

function worksheet(sheet: BookSheet, id: string, styleKey: (cell: BookCell) => string | undefined) {
  const cellData: Record<number, Record<number, ICellData>> = {};
  const spilled = spilledCells(sheet);
  let lastRow = 0;
  let lastColumn = 0;
  for (const [address, cell] of Object.entries(sheet.cells)) {
    const area = parseArea(address);
    if (area === null) continue;
    lastRow = Math.max(lastRow, area.top);
    lastColumn = Math.max(lastColumn, area.left);
    const style = styleKey(cell);
    const content = spilled.has(address) ? {} : withoutNulls(contentOf(cell));
    (cellData[area.top] ??= {})[area.left] = style === undefined ? content : { ...content, s: style };
  }
  const { rows, columns } = sheet.freeze;
  return {
    id,
    name: sheet.name,
    cellData,
    rowCount: Math.max(LEAST_ROWS, lastRow + SPARE_ROWS),
    columnCount: Math.max(LEAST_COLUMNS, lastColumn + SPARE_COLUMNS),
    columnData: columnData(sheet, Math.max(LEAST_COLUMNS, lastColumn + SPARE_COLUMNS)),
    rowData: Object.fromEntries(
      Object.entries(sheet.rowHeights).map(([row, points]) => [
        Number(row) - 1,
        { h: pixelsOfPoints(points), ia: BooleanNumber.FALSE },
      ]),
    ),
    mergeData: sheet.merges.flatMap((merge) => rangeOf(merge) ?? []),
    freeze: {
      xSplit: columns,
      ySplit: rows,
      startRow: rows > 0 ? rows : -1,
      startColumn: columns > 0 ? columns : -1,
    },
    showGridlines: sheet.gridLines ? BooleanNumber.TRUE : BooleanNumber.FALSE,
    hidden: sheet.hidden ? BooleanNumber.TRUE : BooleanNumber.FALSE,
  };
}

function contentOf(cell: BookCell): ICellData {
  if (cell.formula === undefined) return gridCell(cell.value);
  const fresh = cell.spill !== undefined || cell.array !== undefined || cell.formula.includes(`${NAMESPACE}.`);
  return fresh ? { f: cell.formula } : { ...gridCell(cell.value), f: cell.formula };
}

function withoutNulls(cell: ICellData): ICellData {
  return Object.fromEntries(Object.entries(cell).filter(([, value]) => value !== null));
}

function columnData(sheet: BookSheet, count: number): Record<number, { w: number }> {
  const data: Record<number, { w: number }> = {};
  for (let column = 0; column < count; column++) {
    const characters = sheet.columnWidths[columnLetters(column)];
    if (characters !== undefined) data[column] = { w: pixelsOfCharacters(characters) };
  }
  return data;
}
