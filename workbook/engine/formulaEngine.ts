import {
  ICommandService,
  IUniverInstanceService,
  LocaleType,
  LogLevel,
  Univer,
  UniverInstanceType,
} from '@univerjs/core';
import {
  ErrorType,
  FormulaExecutedStateType,
  ICalculateFormulaService,
  IDefinedNamesService,
  type IFormulaDependencyTreeJson,
  IFormulaRuntimeService,
  IFunctionService,
  LexerTreeBuilder,
  SetArrayFormulaDataMutation,
  type ISetArrayFormulaDataMutationParams,
  type ISetFormulaCalculationNotificationMutation,
  type ISetFormulaCalculationResultMutation,
  SetFormulaCalculationNotificationMutation,
  SetFormulaCalculationResultMutation,
  SetFormulaCalculationStartMutation,
  UniverFormulaEnginePlugin,
} from '@univerjs/engine-formula';
import { functionClasses, type CallListeners } from '../grid/adapter';
import type { CellFunction } from '../grid/customFunctions';
import type { FunctionList } from '../grid/functionList';
import { mendEngine } from '../grid/mendEngine';
import { COLLECTOR, collectorClass } from './collector';
import { cyclicCells } from './cyclicCells';
import { sheetId, type EngineBook, type EngineCells, type EngineMatrix } from './engineBook';
import { engineCells } from './engineCells';
import { snapshot } from './snapshot';

/** The grid library's formula engine without any grid; everything of the library stays behind this. */
export interface FormulaEngine {
  /** Calculates every formula of the book; one calculation at a time. */
  calculate(book: EngineBook): Promise<readonly EngineCells[]>;
  /** Gives the whole result of each formula; they may point into the book. Formulas stand in one column, by their order. */
  evaluate(book: EngineBook, formulas: readonly string[]): Promise<readonly EngineMatrix[]>;
  /** False where brackets, quotes or operators of a formula do not agree. */
  isWellFormed(formula: string): boolean;
  /** Every function that a formula may call, in capital letters. */
  functionNames(): string[];
}

/** Nothing is called dirty one by one: everything is calculated. */
const CALCULATE_ALL = {
  forceCalculation: true,
  dirtyRanges: [],
  dirtyNameMap: {},
  dirtyDefinedNameMap: {},
  dirtySuperTableMap: {},
  dirtyUnitFeatureMap: {},
  dirtyUnitOtherFormulaMap: {},
  clearDependencyTreeCache: {},
  options: undefined,
};

/** No sheet of a file can be called so: a colon is not allowed there. */
const OWN_SHEET = 'formulas:';

/** The library keeps parsed formulas by book for the whole process, so no two books may be called the same. */
let booksSoFar = 0;

/** Starts the engine with the cell functions of a bundle. */
export function startFormulaEngine(
  list: FunctionList,
  mappings: ReadonlyMap<string, CellFunction>,
  listeners: CallListeners,
): FormulaEngine {
  const univer = new Univer({ locale: LocaleType.EN_US, locales: {}, logLevel: LogLevel.SILENT });
  const collected = new Map<number, EngineMatrix>();
  univer.registerPlugin(UniverFormulaEnginePlugin, {
    function: [...functionClasses(list, mappings, listeners), [collectorClass(collected), COLLECTOR]],
  });
  const injector = univer.__getInjector();
  mendEngine(injector);
  const commands = injector.get(ICommandService);
  let queue: Promise<unknown> = Promise.resolve();
  let cycles = 0;
  // The library notices cycles, but forgets them before it tells the results.
  const runtime = injector.get(IFormulaRuntimeService);
  const enableCycleDependency = runtime.enableCycleDependency.bind(runtime);
  runtime.enableCycleDependency = () => {
    cycles += 1;
    enableCycleDependency();
  };

  /** Gives the command's own parameters once `id` was executed, before anything else happens. */
  const whenExecuted = <T>(id: string, until: (params: T) => boolean): Promise<T> =>
    new Promise((resolve) => {
      const listener = commands.onCommandExecuted((command) => {
        if (command.id !== id || !until(command.params as T)) return;
        listener.dispose();
        resolve(command.params as T);
      });
    });

  const calculateUnit = async (unitId: string, sheets: number): Promise<EngineCells[] | null> => {
    let values: ISetFormulaCalculationResultMutation['unitData'][string];
    let arrays: ISetArrayFormulaDataMutationParams | undefined;
    const cyclesBefore = cycles;
    const listener = commands.onCommandExecuted((command) => {
      if (command.id === SetArrayFormulaDataMutation.id) {
        arrays = command.params as ISetArrayFormulaDataMutationParams;
      } else if (command.id === SetFormulaCalculationResultMutation.id) {
        values = (command.params as ISetFormulaCalculationResultMutation).unitData[unitId];
      }
    });
    const ended = whenExecuted<ISetFormulaCalculationNotificationMutation>(
      SetFormulaCalculationNotificationMutation.id,
      ({ functionsExecutedState: state }) => state !== undefined && state !== FormulaExecutedStateType.INITIAL,
    );
    void commands.executeCommand(SetFormulaCalculationStartMutation.id, { ...CALCULATE_ALL }, { onlyLocal: true });
    await ended;
    listener.dispose();
    if (cycles !== cyclesBefore) return null;
    return Array.from({ length: sheets }, (_sheet, i) => {
      const id = sheetId(i);
      return engineCells(
        values?.[id],
        arrays?.arrayFormulaCellData[unitId]?.[id],
        arrays?.arrayFormulaRange[unitId]?.[id],
      );
    });
  };

  /** Works on a book while the library holds it. */
  const withUnit = async <T>(book: EngineBook, work: (unitId: string) => Promise<T>): Promise<T> => {
    // The library remembers formulas by their text, with the names of an earlier book put in: forget them.
    new LexerTreeBuilder().dispose();
    const unitId = `book${(booksSoFar += 1)}`;
    univer.createUnit(UniverInstanceType.UNIVER_SHEET, snapshot(unitId, book));
    // Names are looked up in the current book only.
    const instances = injector.get(IUniverInstanceService);
    instances.setCurrentUnitForType(unitId);
    const names = injector.get(IDefinedNamesService);
    book.names.forEach(({ name, formula, sheet }, i) => {
      const local = sheet === undefined ? {} : { localSheetId: sheetId(sheet) };
      names.registerDefinedName(unitId, { id: `name${i}`, name, formulaOrRefString: formula, ...local });
    });
    try {
      return await work(unitId);
    } finally {
      names.removeUnitDefinedName(unitId);
      instances.disposeUnit(unitId);
    }
  };

  const run = async (book: EngineBook): Promise<readonly EngineCells[]> => {
    const cyclic: IFormulaDependencyTreeJson[] = [];
    const cells = await withUnit(book, async (unitId) => {
      const calculated = await calculateUnit(unitId, book.sheets.length);
      if (calculated === null)
        cyclic.push(...cyclicCells(await injector.get(ICalculateFormulaService).getAllDependencyJson()));
      return calculated;
    });
    if (cells !== null) return cells;
    // Round a cycle the library gives numbers that depend on the order of calculation: errors instead.
    const broken = withoutCycles(book, cyclic);
    return (await withUnit(broken, (unitId) => calculateUnit(unitId, book.sheets.length))) ?? [];
  };

  const evaluate = async (book: EngineBook, formulas: readonly string[]): Promise<readonly EngineMatrix[]> => {
    collected.clear();
    const cells = formulas.map((formula, row) => ({
      row,
      column: 0,
      value: null,
      formula: `=${COLLECTOR}(${formula.slice(1)})`,
    }));
    const own = { name: OWN_SHEET, rows: formulas.length, columns: 1, cells };
    const calculated = await run({ ...book, sheets: [...book.sheets, own] });
    // Where the formula never came to a result, its cell says why.
    return formulas.map((_formula, row) => collected.get(row) ?? [[calculated.at(-1)?.value(row, 0) ?? null]]);
  };

  const inTurn = <T>(work: () => Promise<T>): Promise<T> => {
    const next = queue.then(work);
    queue = next.catch(() => undefined);
    return next;
  };

  return {
    calculate: (book) => inTurn(() => run(book)),
    evaluate: (book, formulas) => inTurn(() => evaluate(book, formulas)),
    isWellFormed: (formula) => {
      const tree = injector.get(LexerTreeBuilder).treeBuilder(formula);
      return tree !== undefined && typeof tree !== 'string';
    },
    functionNames: () =>
      [...injector.get(IFunctionService).getExecutors().keys()]
        .map((name) => String(name).toUpperCase())
        .filter((name) => name !== COLLECTOR),
  };
}

/** The book with each formula of a cycle replaced by the error that it shows. */
function withoutCycles(book: EngineBook, cycles: readonly IFormulaDependencyTreeJson[]): EngineBook {
  const places = new Set(cycles.map(({ subUnitId, row, column }) => `${subUnitId},${row},${column}`));
  const sheets = book.sheets.map((sheet, i) => ({
    ...sheet,
    cells: sheet.cells.map((cell) =>
      places.has(`${sheetId(i)},${cell.row},${cell.column}`) ? { ...cell, formula: `=${ErrorType.CYCLE}` } : cell,
    ),
  }));
  return { ...book, sheets };
}
