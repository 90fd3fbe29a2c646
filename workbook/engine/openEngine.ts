import type { Settings } from '../../functions/settings/settingsType';
import type { Cell } from '../../taskpane/port';
import type { Book } from '../book';
import { createCellMessages } from '../grid/cellMessages';
import { createLateAnswers } from '../grid/lateAnswers';
import { bookSettings } from './bookSettings';
import { bookSubstances } from './bookSubstances';
import { calculatedBook, type Anchor } from './calculatedBook';
import { sheetId, type EngineBook, type EngineValue } from './engineBook';
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

const NO_BOOK: EngineBook = { sheets: [], names: [] };

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

  /** Calculates until no answer comes late any more. */
  const untilSettled = async <T>(work: () => Promise<T>): Promise<T> => {
    for (let round = 1; ; round++) {
      messages = createCellMessages();
      const result = await work();
      if (!(await late.whenSettled()) || round === MOST_ROUNDS) return result;
    }
  };

  const readValue = (value: EngineValue, anchor: Anchor, row: number, column: number): Cell => {
    if (typeof value !== 'object' || value === null) return value;
    if (!formulas.isWellFormed(anchor.formula)) return malformed(anchor.formula);
    const said = messages.at(sheetId(anchor.sheet), anchor.row, anchor.column, value.code, { row, column });
    return errorWords(value.code, said, anchor.formula, () => formulas.functionNames());
  };

  /** Tells the functions what the book says; whether any of it is new to them. */
  const publish = (book: Book | undefined, unitsText: string | undefined): boolean => {
    const settings = bookSettings(book, unitsText, latentry);
    const substances = latentry.house.publish(bookSubstances(book, settings, latentry));
    return latentry.settings.publish(settings) || substances;
  };

  const calculate = async (book: Book, unitsText: string | undefined): Promise<Book> => {
    const followed = followedBook(book);
    const cells = engineBookOf(followed);
    let known = book;
    for (let round = 1; ; round++) {
      const changed = publish(known, unitsText);
      if (round > 1 && !changed) return known;
      const calculated = await untilSettled(() => formulas.calculate(cells));
      known = withKeptFormulas(calculatedBook(followed, calculated, readValue), book);
      // Settings and substances may themselves be calculated: then again, with what they came to.
      if (round === MOST_SETTINGS_ROUNDS) return known;
    }
  };

  const evaluate = async (texts: readonly string[], { book, unitsText }: EvaluateOptions): Promise<Evaluated[]> => {
    const known = book === undefined ? undefined : await calculate(book, unitsText);
    if (known === undefined) publish(undefined, unitsText);
    const base = known === undefined ? NO_BOOK : engineBookOf(followedBook(known));
    const asked = texts.map(asFormula);
    const refusals = asked.map((formula) =>
      refusalOf(formula, (text) => formulas.isWellFormed(text), known !== undefined),
    );
    const calculable = asked.map((formula, i) => (refusals[i] === undefined ? formula : '=0'));
    const matrices = await untilSettled(() => formulas.evaluate(base, calculable));
    return texts.map((formula, row): Evaluated => {
      const refusal = refusals[row];
      if (refusal !== undefined) return { formula, values: [[refusal]] };
      const anchor = { sheet: base.sheets.length, row, column: 0, formula: asked[row] ?? '' };
      const values = (matrices[row] ?? []).map((cells, r) => cells.map((cell, c) => readValue(cell, anchor, r, c)));
      return { formula, values };
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
