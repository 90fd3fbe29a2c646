import { ArrayValueObject, type BaseValueObject } from '@univerjs/engine-formula';
import { formatArea, formatReference } from '../../taskpane/hosts/address';
import { excelArguments } from './arguments';
import type { CallPlace } from './callPlace';
import type { CellFunction } from './customFunctions';
import { cellName, type FunctionEntry } from './functionList';
import { Refusal } from './refusal';

/** One call of a cell function, ready to be made. */
export interface PreparedCall {
  readonly args: readonly unknown[];
  readonly invocation: Readonly<Record<string, unknown>>;
}

/**
 * Makes arguments and invocation as Excel would hand them over; throws a refusal with words where their number is wrong.
 */
export function prepareCall(
  entry: FunctionEntry,
  variants: readonly BaseValueObject[],
  place: CallPlace,
  sheetNames: Readonly<Record<string, string>>,
): PreparedCall {
  checkCount(entry, variants.length);
  const invocation: Record<string, unknown> = { functionName: entry.id };
  if (entry.options?.requiresAddress === true) {
    const sheetName = sheetNames[place.sheetId];
    if (sheetName !== undefined) invocation['address'] = address(sheetName, place.row, place.column, 1, 1);
  }
  if (entry.options?.requiresParameterAddresses === true) {
    invocation['parameterAddresses'] = variants.map((variant) => addressOf(variant, sheetNames));
  }
  return { args: excelArguments(entry, variants), invocation };
}

/** Calls the associated function. */
export function makeCall(
  entry: FunctionEntry,
  mappings: ReadonlyMap<string, CellFunction>,
  call: PreparedCall,
): unknown {
  const implementation = mappings.get(entry.id);
  if (implementation === undefined) {
    throw new Refusal('#NAME?', `${cellName(entry)} is listed but not in the functions bundle`);
  }
  return implementation(...call.args, call.invocation);
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
  if (!(variant instanceof ArrayValueObject)) return null;
  const sheetName = sheetNames[variant.getSheetId()];
  const [row, column] = [variant.getCurrentRow(), variant.getCurrentColumn()];
  if (sheetName === undefined || row < 0) return null;
  return address(sheetName, row, column, variant.getRowCount(), variant.getColumnCount());
}

function address(sheet: string, top: number, left: number, rows: number, columns: number): string {
  return formatReference({ sheet, address: formatArea({ top, left, rows, columns }) });
}
