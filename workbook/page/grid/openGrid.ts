import type { Injector } from '@univerjs/core';
import type { FUniver } from '@univerjs/core/facade';
import { SetTriggerFormulaCalculationStartMutation } from '@univerjs/engine-formula';
import type { FWorkbook, FWorksheet } from '@univerjs/sheets/facade';
import type { Book } from '../../book';
import type { CellFunction } from '../../grid/customFunctions';
import { type CellMessages, createCellMessages } from '../../grid/cellMessages';
import type { FunctionList } from '../../grid/functionList';
import { createLateAnswers } from '../../grid/lateAnswers';
import { bookToGrid } from '../bookToGrid';
import { gridToBook, type Origins } from '../gridToBook';
import { rangeOfArea } from './rangeOf';
import { startUniver } from './startUniver';

/** A rectangle of one sheet, by the grid's key of the sheet. */
export interface GridPlace {
  readonly sheetId: string;
  readonly top: number;
  readonly left: number;
  readonly rows: number;
  readonly columns: number;
}

/** The grid with one workbook open in it. */
export interface Grid {
  readonly api: FUniver;
  readonly injector: Injector;
  readonly messages: CellMessages;
  /** A small text kept in the file. */
  text(key: string): string | undefined;
  /** Keeps a small text in the file; undefined takes it away. */
  setText(key: string, text: string | undefined): void;
  /** Calls back after a small text was set. */
  onText(listener: () => void): void;
  /** Shows another book; what was open before goes. */
  open(book: Book): void;
  /** Calls back before another book is opened. */
  beforeOpen(listener: () => void): void;
  /** Calls back after a book was opened. */
  onOpened(listener: () => void): void;
  /** What is open, as a book; it shares nothing with the grid. */
  book(): Book;
  /** Says that what is open was saved as this book, so that the next saving starts from there. */
  savedAs(book: Book): void;
  workbook(): FWorkbook;
  /** A sheet by its name, whatever the case. */
  sheet(name: string): FWorksheet | undefined;
  /** Has these cells calculated again, with what depends on them. */
  markDirty(places: readonly GridPlace[]): void;
}

/** Starts the grid in an element and opens a book in it. */
export function openGrid(
  container: HTMLElement,
  list: FunctionList,
  mappings: ReadonlyMap<string, CellFunction>,
  first: Book,
): Grid {
  const messages = createCellMessages();
  const late = createLateAnswers(({ sheetId, row, column }) =>
    markDirty([{ sheetId, top: row, left: column, rows: 1, columns: 1 }]),
  );
  const { api, injector } = startUniver(container, list, mappings, { report: messages.report, late });
  const properties = new Map<string, string>();
  let opened = first;
  let origins: Origins = new Map();
  let workbook: FWorkbook | undefined;
  let books = 0;
  const textListeners: (() => void)[] = [];
  const leaving: (() => void)[] = [];
  const openedListeners: (() => void)[] = [];

  const open = (book: Book): void => {
    for (const listener of leaving) listener();
    if (workbook !== undefined) {
      api.getFormula().stopCalculation();
      api.disposeUnit(workbook.getId());
    }
    books += 1;
    const ids = book.sheets.map((_sheet, i) => `book${books}-sheet${i}`);
    opened = book;
    origins = new Map(book.sheets.map((sheet, i) => [ids[i] ?? '', sheet]));
    properties.clear();
    for (const [key, value] of Object.entries(book.properties)) properties.set(key, value);
    workbook = api.createWorkbook(bookToGrid(book, `book${books}`, ids));
    for (const listener of openedListeners) listener();
  };

  const current = (): FWorkbook => {
    if (workbook === undefined) throw new Error('no workbook is open');
    return workbook;
  };

  const markDirty = (places: readonly GridPlace[]): void => {
    if (workbook === undefined) return;
    const unitId = workbook.getId();
    const dirtyRanges = places.map((place) => ({ unitId, sheetId: place.sheetId, range: rangeOfArea(place) }));
    const nothing = {
      dirtyNameMap: {},
      dirtyDefinedNameMap: {},
      dirtySuperTableMap: {},
      dirtyUnitFeatureMap: {},
      dirtyUnitOtherFormulaMap: {},
      clearDependencyTreeCache: {},
    };
    const params = { ...nothing, dirtyRanges, forceCalculation: false };
    api.syncExecuteCommand(SetTriggerFormulaCalculationStartMutation.id, params, { onlyLocal: true });
  };

  api.getFormula().calculationStart(() => messages.begin());
  open(first);
  return {
    api,
    injector,
    messages,
    text: (key) => properties.get(key),
    setText: (key, text) => {
      if (text === undefined) properties.delete(key);
      else properties.set(key, text);
      for (const listener of textListeners) listener();
    },
    onText: (listener) => textListeners.push(listener),
    open,
    beforeOpen: (listener) => leaving.push(listener),
    onOpened: (listener) => openedListeners.push(listener),
    book: () => gridToBook(injector, current(), opened, origins, Object.fromEntries(properties)),
    savedAs: (book) => {
      const byName = new Map(book.sheets.map((sheet) => [sheet.name, sheet]));
      const pairs = current()
        .getSheets()
        .map((sheet) => [sheet.getSheetId(), byName.get(sheet.getSheetName())] as const);
      opened = book;
      origins = new Map(pairs.flatMap(([id, sheet]) => (sheet === undefined ? [] : [[id, sheet] as const])));
    },
    workbook: current,
    sheet: (name) =>
      current()
        .getSheets()
        .find((sheet) => sheet.getSheetName().toLowerCase() === name.toLowerCase()),
    markDirty,
  };
}
