import type { Settings } from '../../functions/settings/settingsType';
import type { Cell } from '../../taskpane/port';
import type { Book } from '../book';
import { createCellMessages } from '../grid/cellMessages';
import { createLateAnswers } from '../grid/lateAnswers';
import { bookSettings } from './bookSettings';
import { calculatedBook, type Anchor, type CellReader } from './calculatedBook';
import { sheetId, type EngineBook, type EngineCells, type EngineSheet } from './engineBook';
import { engineBookOf } from './engineBookOf';
import { errorWords } from './errorWords';
import { malformed, refusalOf } from './refusalOf';
import { followedBook, withKeptFormulas } from './followedBook';
import { startFormulaEngine } from './formulaEngine';
import { loadBundle } from './loadBundle';

/** What one formula gave: the extent of its spill as rows and columns; a single value is 1 × 1. */
export interface Evaluated {
  /** As it was given. */
  readonly formula: string;
  readonly values: readonly (readonly Cell[])[];
}

export interface EvaluateOptions {
  /** Cells and names that the formulas may refer to. */
  readonly book?: Book;
  /** Unit settings on top of the book's own: `temperature=K; heat=kJ/mol`. */
  readonly unitsText?: string;
}

/** Formulas and whole workbooks, calculated without Excel and without a grid. */
export interface Engine {
  readonly edition: string;
  /**
   * Unit settings from text, on top of the defaults.
   * @throws Problem of the bundle where it can't be read.
   */
  readSettings(unitsText: string): Settings;
  /** The book with every formula calculated; errors carry words. */
  calculate(book: Book, options?: { readonly unitsText?: string }): Promise<Book>;
  /** Evaluates formulas, each by itself; the leading `=` may be left out. */
  evaluate(formulas: readonly string[], options?: EvaluateOptions): Promise<readonly Evaluated[]>;
}

/** A chain of functions that answer late is calculated again once a link. */
const MOST_ROUNDS = 64;

/** Settings that are calculated from settings are followed so far. */
const MOST_SETTINGS_ROUNDS = 3;

/** A formula given by itself stands on a sheet of its own, with room for whatever it spills. */
const WHOLE_SHEET = { rows: 1_048_576, columns: 16_384 };

/** No sheet of a file can be called so: a colon is not allowed there. */
const OWN_SHEET = 'formula:';

/**
 * Opens the headless engine on a functions bundle.
 * @param options.bundlePath Path of `functions.js`; `functions.json` is read from beside it.
 * @throws Error where there is no such bundle.
 */
export async function openEngine(options: { readonly bundlePath: string }): Promise<Engine> {
  const { list, mappings, latentry } = await loadBundle(options.bundlePath);
  const late = createLateAnswers();
  let messages = createCellMessages();
  const formulas = startFormulaEngine(list, mappings, {
    report: (place, faults) => messages.report(place, faults),
    late,
  });
  let queue: Promise<unknown> = Promise.resolve();

  /** One at a time: settings and messages belong to the calculation that runs. */
  const inTurn = <T>(work: () => Promise<T>): Promise<T> => {
    const next = queue.then(work);
    queue = next.catch(() => undefined);
    return next;
  };

  const run = async (book: EngineBook): Promise<readonly EngineCells[]> => {
    for (let round = 1; ; round++) {
      messages = createCellMessages();
      const cells = await formulas.calculate(book);
      if (!(await late.whenSettled()) || round === MOST_ROUNDS) return cells;
    }
  };

  const readCell: CellReader = (cells, anchor, row, column) => {
    const value = cells.value(anchor.row + row, anchor.column + column);
    if (typeof value !== 'object' || value === null) return value;
    if (!formulas.isWellFormed(anchor.formula)) return malformed(anchor.formula);
    const said = messages.at(sheetId(anchor.sheet), anchor.row, anchor.column, value.code, { row, column });
    return errorWords(value.code, said, anchor.formula, () => formulas.functionNames());
  };

  const calculate = async (book: Book, unitsText: string | undefined): Promise<Book> => {
    const followed = followedBook(book);
    const cells = engineBookOf(followed);
    let known = book;
    for (let round = 1; ; round++) {
      const changed = latentry.settings.publish(bookSettings(known, unitsText, latentry));
      if (round > 1 && !changed) return known;
      known = withKeptFormulas(calculatedBook(followed, await run(cells), readCell), book);
      // Unit settings may themselves be calculated: then again, with what they came to.
      if (round === MOST_SETTINGS_ROUNDS) return known;
    }
  };

  const evaluate = async (
    texts: readonly string[],
    { book, unitsText }: EvaluateOptions,
  ): Promise<readonly Evaluated[]> => {
    const known = book === undefined ? undefined : await calculate(book, unitsText);
    if (known === undefined) latentry.settings.publish(bookSettings(undefined, unitsText, latentry));
    const base = known === undefined ? { sheets: [], names: [] } : engineBookOf(followedBook(known));
    const anchors = texts.map((text, i): Anchor => ({
      sheet: base.sheets.length + i,
      row: 0,
      column: 0,
      formula: asFormula(text),
    }));
    const refusals = anchors.map(({ formula }) =>
      refusalOf(formula, (text) => formulas.isWellFormed(text), known !== undefined),
    );
    const sheets = anchors.map(({ formula }, i): EngineSheet => {
      const cell = { row: 0, column: 0, value: null, formula };
      return { name: `${OWN_SHEET} ${i + 1}`, ...WHOLE_SHEET, cells: refusals[i] === undefined ? [cell] : [] };
    });
    const calculated = await run({ sheets: [...base.sheets, ...sheets], names: base.names });
    return anchors.map((anchor, i): Evaluated => {
      const cells = calculated[anchor.sheet];
      const refusal = refusals[i];
      const formula = texts[i] ?? '';
      if (refusal !== undefined || cells === undefined) return { formula, values: [[refusal ?? null]] };
      const { rows, columns } = cells.extent(0, 0);
      return { formula, values: matrix(rows, columns, (r, c) => readCell(cells, anchor, r, c)) };
    });
  };

  return {
    edition: latentry.edition,
    readSettings: (text) => latentry.parseSettingsText(text, latentry.defaultSettings),
    calculate: (book, { unitsText } = {}) => inTurn(() => calculate(book, unitsText)),
    evaluate: (texts, given = {}) => inTurn(() => evaluate(texts, given)),
  };
}

function asFormula(text: string): string {
  const trimmed = text.trim();
  return trimmed.startsWith('=') ? trimmed : `=${trimmed}`;
}

function matrix<T>(rows: number, columns: number, at: (row: number, column: number) => T): T[][] {
  return Array.from({ length: rows }, (_row, r) => Array.from({ length: columns }, (_column, c) => at(r, c)));
}
