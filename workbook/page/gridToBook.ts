import { BooleanNumber, type ICellData, type Injector, type ISheetDataValidationRule } from '@univerjs/core';
import type { FWorkbook, FWorksheet } from '@univerjs/sheets/facade';
import { formatArea } from '../../taskpane/hosts/address';
import type { Book, BookCell, BookList, BookSheet } from '../book';
import { emptySheet } from '../emptySheet';
import { columnLetters } from './grid/columnLetters';
import { cellValue } from './grid/cellValue';
import { gridCells } from './grid/gridCells';
import { bookName, type GridName } from './grid/gridNames';
import { bookLists } from './grid/listRule';
import { charactersOfPixels, pixelsOfCharacters, pixelsOfPoints, pointsOfPixels } from './grid/measures';
import { addressOf } from './grid/rangeOf';
import { type StyleKeys, styleKeys } from './grid/styleKeys';

/** The sheet of the opened book that a sheet of the grid came from, by the grid's key. */
export type Origins = ReadonlyMap<string, BookSheet>;

/**
 * What is open in the grid, as a book.
 *
 * @param injector - of the grid
 * @param workbook - what is open
 * @param opened - the book that was opened there: what the grid can't hold is taken from it
 * @param origins - where its sheets are now
 * @param properties - the small texts to keep in the file
 */
export function gridToBook(
  injector: Injector,
  workbook: FWorkbook,
  opened: Book,
  origins: Origins,
  properties: Readonly<Record<string, string>>,
): Book {
  const snapshot = workbook.save();
  const keys = styleKeys(opened);
  const resource = (name: string): unknown => {
    const data = snapshot.resources?.find((each) => each.name === name)?.data;
    return data === undefined || data === '' ? {} : JSON.parse(data);
  };
  const rules = resource('SHEET_DATA_VALIDATION_PLUGIN') as Record<string, ISheetDataValidationRule[]>;
  const names = resource('SHEET_DEFINED_NAME_PLUGIN') as Record<string, GridName>;
  const sheetName = (id: string) => workbook.getSheetBySheetId(id)?.getSheetName();
  return {
    sheets: workbook.getSheets().map((sheet) => {
      const origin = origins.get(sheet.getSheetId());
      return bookSheet(injector, workbook, sheet, origin, keys, rules[sheet.getSheetId()] ?? []);
    }),
    names: Object.values(names).map((entry) => bookName(entry, sheetName)),
    styles: keys.styles(),
    properties,
  };
}

function bookSheet(
  injector: Injector,
  workbook: FWorkbook,
  sheet: FWorksheet,
  origin: BookSheet | undefined,
  keys: StyleKeys,
  rules: readonly ISheetDataValidationRule[],
): BookSheet {
  const worksheet = sheet.getSheet();
  const config = worksheet.getConfig();
  const styles = workbook.getWorkbook().getStyles();
  const contents = gridCells(injector, worksheet);
  const cells: Record<string, BookCell> = {};
  const put = (row: number, column: number, data: ICellData) => {
    const address = formatArea({ top: row, left: column, rows: 1, columns: 1 });
    if (address in cells) return;
    const formula = contents.formula(row, column);
    const value = cellValue(formula === '' ? data : { ...data, f: formula });
    const look = keys.of(styles.getStyleByCell(data));
    if (value === null && formula === '' && look.style === undefined && look.format === undefined) return;
    const spill = contents.spill(row, column);
    const before = origin?.cells[address];
    const fixed = before?.array !== undefined && before.formula === formula;
    cells[address] = {
      value,
      ...(formula === '' ? {} : { formula }),
      ...(fixed ? { array: before.array } : spill === undefined ? {} : { spill: addressOf(spill) }),
      ...look,
    };
  };
  contents.each((row, column) => {
    const data = contents.at(row, column);
    if (data) put(row, column, data);
    const spill = contents.spill(row, column);
    if (spill === undefined || contents.formula(row, column) === '') return;
    for (let r = spill.startRow; r <= spill.endRow; r++) {
      for (let c = spill.startColumn; c <= spill.endColumn; c++) {
        const filled = contents.at(r, c);
        if (filled) put(r, c, filled);
      }
    }
  });
  const { xSplit, ySplit } = config.freeze;
  return {
    ...(origin ?? emptySheet(sheet.getSheetName())),
    name: sheet.getSheetName(),
    cells,
    columnWidths: widths(config.columnData, origin),
    rowHeights: heights(config.rowData, origin),
    merges: config.mergeData.map(addressOf),
    lists: lists(rules, origin),
    freeze: { rows: ySplit, columns: xSplit },
    gridLines: config.showGridlines !== BooleanNumber.FALSE,
    hidden: config.hidden === BooleanNumber.TRUE,
  };
}

type Sizes<T> = Readonly<Record<number, T>>;

/** Widths in the book's measure; one that was not changed keeps its exact number. */
function widths(columns: Sizes<{ w?: number }>, origin: BookSheet | undefined): Record<string, number> {
  const found: Record<string, number> = {};
  for (const [column, { w }] of Object.entries(columns)) {
    if (w === undefined) continue;
    const letters = columnLetters(Number(column));
    const before = origin?.columnWidths[letters];
    found[letters] = before !== undefined && pixelsOfCharacters(before) === w ? before : charactersOfPixels(w);
  }
  return found;
}

/** Heights that a person set; those that follow the content are left out. */
function heights(
  rows: Sizes<{ h?: number; ia?: BooleanNumber }>,
  origin: BookSheet | undefined,
): Record<string, number> {
  const found: Record<string, number> = {};
  for (const [row, { h, ia }] of Object.entries(rows)) {
    if (h === undefined || ia === BooleanNumber.TRUE) continue;
    const key = String(Number(row) + 1);
    const before = origin?.rowHeights[key];
    if (before === undefined && ia === undefined) continue;
    found[key] = before !== undefined && pixelsOfPoints(before) === h ? before : pointsOfPixels(h);
  }
  return found;
}

/** Choices of the grid; what it doesn't keep of them is taken from the book that was opened. */
function lists(rules: readonly ISheetDataValidationRule[], origin: BookSheet | undefined): BookList[] {
  const choice = ({ source, values }: BookList) => source ?? values.join('\n');
  const before = new Map(origin?.lists.map((list) => [choice(list), list]));
  return rules
    .flatMap((rule) => bookLists(rule, addressOf) ?? [])
    .map((list) => {
      const { values = list.values, open } = before.get(choice(list)) ?? {};
      return { ...list, values, ...(open === undefined ? {} : { open }) };
    });
}
