import type { Nullable } from '@univerjs/core';
import { ArrayValueObject, type BaseValueObject } from '@univerjs/engine-formula';
import type { FunctionEntry } from './functionList';

/**
 * The arguments as Excel would hand them over: matrix parameters get two-dimensional arrays (a single value as
 * `[[v]]`), empty cells are null, error cells `{ code }`, an omitted argument is undefined, and a last repeating
 * parameter gathers the rest.
 */
export function excelArguments(entry: FunctionEntry, variants: readonly BaseValueObject[]): unknown[] {
  const { parameters } = entry;
  const last = parameters.at(-1);
  const fixed = last?.repeating === true ? parameters.length - 1 : parameters.length;
  const given: unknown[] = [];
  for (let i = 0; i < fixed; i++) {
    const variant = variants[i];
    const left = variant === undefined || isOmitted(variant);
    given.push(left ? undefined : argument(variant, parameters[i]?.dimensionality === 'matrix'));
  }
  if (last?.repeating === true) {
    const matrix = last.dimensionality === 'matrix';
    const rest = variants.slice(fixed).filter((variant) => !isOmitted(variant));
    given.push(rest.map((variant) => argument(variant, matrix)));
  }
  return given;
}

/** Nothing between two commas; a reference to an empty cell arrives as an array and is no omission. */
function isOmitted(variant: BaseValueObject): boolean {
  return !variant.isArray() && variant.isNull();
}

function argument(variant: BaseValueObject, matrix: boolean): unknown {
  if (!(variant instanceof ArrayValueObject)) return matrix ? [[element(variant)]] : element(variant);
  if (!matrix) return element(variant.get(0, 0));
  const columns = variant.getColumnCount();
  return variant.getArrayValue().map((row) => {
    const cells = new Array<unknown>(columns);
    for (let c = 0; c < columns; c++) cells[c] = element(row[c]);
    return cells;
  });
}

function element(value: Nullable<BaseValueObject>): unknown {
  if (!value || value.isNull()) return null;
  if (value.isError()) return { code: value.getValue() };
  return value.isLambda() ? { code: '#VALUE!' } : value.getValue();
}
