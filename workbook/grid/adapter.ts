import { type ArrayValueObject, AsyncObject, BaseFunction, type BaseValueObject } from '@univerjs/engine-formula';
import { rangeAddress, cellAddress } from './a1';
import { excelArguments } from './arguments';
import type { CellFunction } from './customFunctions';
import { cellName, type FunctionEntry, type FunctionList } from './functionList';
import { faultObject, valueObject, type CallFault } from './results';

/** The cell whose formula called a function; row and column count from zero. */
export interface CallPlace {
  readonly unitId: string;
  readonly sheetId: string;
  readonly row: number;
  readonly column: number;
}

/** Told after every call, also with no faults at all, so that old messages of the cell can go. */
export type Report = (place: CallPlace, faults: readonly CallFault[]) => void;

/** A class of the grid library's functions. */
export type FunctionClass = new (name: string) => BaseFunction;

/** A promise that has not settled by then is given up. */
const LONGEST_ANSWER_MS = 60_000;

/**
 * Makes the grid library's function classes of the list of functions, each with its name in a cell.
 * Nothing that a function throws or rejects with gets out: it becomes an error cell, its words go to `report`.
 * @param list The parsed `functions.json`.
 * @param mappings What the functions bundle associated, by id.
 * @param report Told the messages of error cells after every call.
 */
export function functionClasses(
  list: FunctionList,
  mappings: ReadonlyMap<string, CellFunction>,
  report: Report,
): [FunctionClass, string][] {
  return list.functions.map((entry) => [functionClass(entry, mappings, report), cellName(entry)]);
}

function functionClass(
  entry: FunctionEntry,
  mappings: ReadonlyMap<string, CellFunction>,
  report: Report,
): FunctionClass {
  return class extends BaseFunction {
    // The number of arguments is checked below, where a refusal can carry words.
    override minParams = -1;
    override maxParams = -1;
    override needsSheetsInfo = true;

    override isAsync(): boolean {
      return true;
    }

    override isArgumentsIgnoreNumberPattern(): boolean {
      return true;
    }

    override calculate(...variants: BaseValueObject[]): ReturnType<BaseFunction['calculate']> {
      const place = { unitId: this.unitId ?? '', sheetId: this.subUnitId ?? '', row: this.row, column: this.column };
      const faults: CallFault[] = [];
      try {
        const answer = callFunction(entry, mappings, variants, place, this.getSheetsInfo().sheetNameMap);
        if (isThenable(answer)) return new AsyncObject(settled(answer, place, report));
        const value = valueObject(answer, faults);
        report(place, faults);
        return value;
      } catch (thrown) {
        const value = faultObject(thrown, faults);
        report(place, faults);
        return value;
      }
    }
  };
}

function callFunction(
  entry: FunctionEntry,
  mappings: ReadonlyMap<string, CellFunction>,
  variants: readonly BaseValueObject[],
  place: CallPlace,
  sheetNames: Readonly<Record<string, string>>,
): unknown {
  const implementation = mappings.get(entry.id);
  if (implementation === undefined)
    throw new Refusal('#NAME?', `${cellName(entry)} is listed but not in the functions bundle`);
  checkCount(entry, variants.length);
  const invocation: Record<string, unknown> = { functionName: entry.id };
  if (entry.options?.requiresAddress === true) {
    const sheetName = sheetNames[place.sheetId];
    if (sheetName !== undefined) invocation['address'] = cellAddress(sheetName, place.row, place.column);
  }
  if (entry.options?.requiresParameterAddresses === true) {
    invocation['parameterAddresses'] = variants.map((variant) => addressOf(variant, sheetNames));
  }
  return implementation(...excelArguments(entry, variants), invocation);
}

/** An error with words of the adapter's own. */
class Refusal extends Error {
  constructor(
    readonly code: string,
    message: string,
  ) {
    super(message);
  }
}

function checkCount(entry: FunctionEntry, received: number): void {
  const { parameters } = entry;
  const least = parameters.filter((parameter) => parameter.optional !== true && parameter.repeating !== true).length;
  const most = parameters.at(-1)?.repeating === true ? Infinity : parameters.length;
  if (received >= least && received <= most) return;
  const names = parameters
    .map((parameter) => (parameter.optional === true ? `[${parameter.name}]` : parameter.name))
    .join(', ');
  throw new Refusal('#VALUE!', `number of arguments: allowed ${cellName(entry)}(${names}); received ${received}`);
}

/** Where a range argument lies, `Sheet!A1:B2`; null for what is no reference. */
function addressOf(variant: BaseValueObject, sheetNames: Readonly<Record<string, string>>): string | null {
  if (!variant.isArray()) return null;
  const array = variant as ArrayValueObject;
  const sheetName = sheetNames[array.getSheetId()];
  if (sheetName === undefined || array.getCurrentRow() < 0) return null;
  return rangeAddress(
    sheetName,
    array.getCurrentRow(),
    array.getCurrentColumn(),
    array.getRowCount(),
    array.getColumnCount(),
  );
}

function isThenable(value: unknown): value is PromiseLike<unknown> {
  return typeof value === 'object' && value !== null && 'then' in value && typeof value.then === 'function';
}

/** Never rejects: a rejected promise would end the library's calculation, and Node with it. */
async function settled(answer: PromiseLike<unknown>, place: CallPlace, report: Report): Promise<BaseValueObject> {
  const faults: CallFault[] = [];
  let timer: ReturnType<typeof setTimeout> | undefined;
  const deadline = new Promise<never>((_resolve, reject) => {
    const late = new Refusal('#N/A', `no answer within ${LONGEST_ANSWER_MS / 1000} s`);
    timer = setTimeout(() => reject(late), LONGEST_ANSWER_MS);
  });
  let value: BaseValueObject;
  try {
    value = valueObject(await Promise.race([answer, deadline]), faults);
  } catch (thrown) {
    value = faultObject(thrown, faults);
  } finally {
    clearTimeout(timer);
  }
  report(place, faults);
  return value;
}
