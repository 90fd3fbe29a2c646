import { BaseFunction, type BaseValueObject, ErrorType, ErrorValueObject } from '@univerjs/engine-formula';
import { makeCall, prepareCall } from './callFunction';
import type { Report } from './callPlace';
import type { CellFunction } from './customFunctions';
import { cellName, type FunctionEntry, type FunctionList } from './functionList';
import type { LateAnswers } from './lateAnswers';
import { faultObject, valueObject, type CallFault } from './results';

/** A class of the grid library's functions. */
export type FunctionClass = new (name: string) => BaseFunction;

/** What a host does with calls beside showing their values. */
export interface CallListeners {
  /** Told the words behind error cells after every call. */
  readonly report: Report;
  /** Keeps answers that come as promises. */
  readonly late: LateAnswers;
}

const WAITING = 'the answer is not there yet; the cell is calculated again when it is';

/**
 * Makes the grid library's function classes of the list of functions, each with its name in a cell.
 * Nothing that a function throws or rejects with gets out: it becomes an error cell, its words go to `report`.
 * @param list The parsed `functions.json`.
 * @param mappings What the functions bundle associated, by id.
 */
export function functionClasses(
  list: FunctionList,
  mappings: ReadonlyMap<string, CellFunction>,
  listeners: CallListeners,
): [FunctionClass, string][] {
  return list.functions.map((entry) => [functionClass(entry, mappings, listeners), cellName(entry)]);
}

function functionClass(
  entry: FunctionEntry,
  mappings: ReadonlyMap<string, CellFunction>,
  { report, late }: CallListeners,
): FunctionClass {
  return class extends BaseFunction {
    // The number of arguments is checked with the call, where a refusal can carry words.
    override minParams = -1;
    override maxParams = -1;
    override needsSheetsInfo = true;

    // Texts such as "1/2" or "12%" stay texts.
    override isArgumentsIgnoreNumberPattern(): boolean {
      return true;
    }

    override calculate(...variants: BaseValueObject[]): BaseValueObject {
      const place = { unitId: this.unitId ?? '', sheetId: this.subUnitId ?? '', row: this.row, column: this.column };
      const faults: CallFault[] = [];
      let value: BaseValueObject;
      try {
        const call = prepareCall(entry, variants, place, this.getSheetsInfo().sheetNameMap);
        const key = () => JSON.stringify([entry.id, place.sheetId, place.row, place.column, call.args]);
        const settled = late.take(key);
        if (settled === 'waiting') {
          value = waiting(faults);
        } else if (settled !== undefined) {
          if ('thrown' in settled) throw settled.thrown;
          value = valueObject(settled.value, faults);
        } else {
          const answer = makeCall(entry, mappings, call);
          if (isThenable(answer)) {
            late.wait(key(), answer, place);
            value = waiting(faults);
          } else {
            value = valueObject(answer, faults);
          }
        }
      } catch (thrown) {
        value = faultObject(thrown, faults);
      }
      report(place, faults);
      return value;
    }
  };
}

function waiting(faults: CallFault[]): BaseValueObject {
  faults.push({ row: 0, column: 0, code: ErrorType.NA, message: WAITING });
  return ErrorValueObject.create(ErrorType.NA);
}

function isThenable(value: unknown): value is PromiseLike<unknown> {
  return typeof value === 'object' && value !== null && 'then' in value && typeof value.then === 'function';
}
