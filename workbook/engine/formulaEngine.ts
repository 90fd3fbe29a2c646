import {
  CellValueType,
  type ICellData,
  ICommandService,
  IUniverInstanceService,
  type IWorkbookData,
  LocaleType,
  LogLevel,
  type Nullable,
  Univer,
  UniverInstanceType,
} from '@univerjs/core';
import {
  FormulaExecutedStateType,
  IDefinedNamesService,
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
import { sheetId, type EngineBook, type EngineCells, type EngineSheet, type EngineValue } from './engineBook';

/** The grid library's formula engine without any grid; everything of the library stays behind this. */
export interface FormulaEngine {
  /** Calculates every formula of the book; one calculation at a time. */
  calculate(book: EngineBook): Promise<readonly EngineCells[]>;
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

/** The library keeps parsed formulas by book for the whole process, so no two books may be called the same. */
let booksSoFar = 0;

/** Starts the engine with the cell functions of a bundle. */
export function startFormulaEngine(
  list: FunctionList,
  mappings: ReadonlyMap<string, CellFunction>,
  listeners: CallListeners,
): FormulaEngine {
  const univer = new Univer({ locale: LocaleType.EN_US, locales: {}, logLevel: LogLevel.SILENT });
  univer.registerPlugin(UniverFormulaEnginePlugin, { function: functionClasses(list, mappings, listeners) });
  const injector = univer.__getInjector();
  mendEngine(injector);
  const commands = injector.get(ICommandService);
  let queue: Promise<unknown> = Promise.resolve();

  const run = async (book: EngineBook): Promise<EngineCells[]> => {
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
      let values: ISetFormulaCalculationResultMutation['unitData'][string];
      let arrays: ISetArrayFormulaDataMutationParams | undefined;
      await new Promise<void>((resolve) => {
        const listener = commands.onCommandExecuted((command) => {
          if (command.id === SetArrayFormulaDataMutation.id) {
            arrays = command.params as ISetArrayFormulaDataMutationParams;
          } else if (command.id === SetFormulaCalculationResultMutation.id) {
            values = (command.params as ISetFormulaCalculationResultMutation).unitData[unitId];
          } else if (command.id === SetFormulaCalculationNotificationMutation.id) {
            const { functionsExecutedState } = command.params as ISetFormulaCalculationNotificationMutation;
            if (functionsExecutedState === undefined || functionsExecutedState === FormulaExecutedStateType.INITIAL)
              return;
            listener.dispose();
            resolve();
          }
        });
        void commands.executeCommand(SetFormulaCalculationStartMutation.id, { ...CALCULATE_ALL }, { onlyLocal: true });
      });
      return book.sheets.map((_sheet, i) => {
        const id = sheetId(i);
        return engineCells(
          values?.[id],
          arrays?.arrayFormulaCellData[unitId]?.[id],
          arrays?.arrayFormulaRange[unitId]?.[id],
        );
      });
    } finally {
      names.removeUnitDefinedName(unitId);
      instances.disposeUnit(unitId);
    }
  };

  return {
    calculate: (book) => {
      const next = queue.then(() => run(book));
      queue = next.catch(() => undefined);
      return next;
    },
    isWellFormed: (formula) => {
      const tree = injector.get(LexerTreeBuilder).treeBuilder(formula);
      return tree !== undefined && typeof tree !== 'string';
    },
    functionNames: () =>
      [...injector.get(IFunctionService).getExecutors().keys()].map((name) => String(name).toUpperCase()),
  };
}

function snapshot(id: string, book: EngineBook): Partial<IWorkbookData> {
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

type Matrix<T> = Readonly<Record<number, Readonly<Record<number, T>>>> | null | undefined;

function engineCells(
  values: Matrix<Nullable<ICellData>>,
  spilled: Matrix<Nullable<ICellData>>,
  ranges: Matrix<{ startRow: number; endRow: number; startColumn: number; endColumn: number }>,
): EngineCells {
  const at = (row: number, column: number) => spilled?.[row]?.[column] ?? values?.[row]?.[column];
  return {
    value: (row, column) => valueOf(at(row, column)),
    extent: (row, column) => {
      const range = ranges?.[row]?.[column];
      if (range === undefined) return { rows: 1, columns: 1 };
      return { rows: range.endRow - range.startRow + 1, columns: range.endColumn - range.startColumn + 1 };
    },
  };
}

const ERROR = /^#(?:[A-Z]+\/?[A-Z0]*[!?]?|GETTING_DATA)$/;

function valueOf(cell: Nullable<ICellData>): EngineValue {
  const value = cell?.v;
  if (value === undefined || value === null) return null;
  if (cell?.t === CellValueType.BOOLEAN) return value === 1 || value === true;
  if (typeof value === 'string') return ERROR.test(value) ? { code: value } : value;
  return value;
}
