import {
  ArrayValueObject,
  BaseFunction,
  type BaseValueObject,
  ErrorType,
  NumberValueObject,
} from '@univerjs/engine-formula';
import type { Nullable } from '@univerjs/core';
import type { FunctionClass } from '../grid/adapter';
import type { EngineMatrix, EngineValue } from './engineBook';

/** Name of the function that takes down results; no formula of a person calls it. */
export const COLLECTOR = 'LATENTRY_COLLECT';

/**
 * A function that notes the whole result of the formula in it, by the row of its cell, and shows 0: so ten thousand
 * formulas fit into one column, and none spills into another.
 */
export function collectorClass(collected: Map<number, EngineMatrix>): FunctionClass {
  return class extends BaseFunction {
    override minParams = -1;
    override maxParams = -1;

    override isArgumentsIgnoreNumberPattern(): boolean {
      return true;
    }

    override calculate(...variants: BaseValueObject[]): BaseValueObject {
      const [variant] = variants;
      collected.set(this.row, variants.length === 1 ? matrix(variant) : [[{ code: ErrorType.VALUE }]]);
      return NumberValueObject.create(0);
    }
  };
}

function matrix(variant: Nullable<BaseValueObject>): EngineValue[][] {
  if (!(variant instanceof ArrayValueObject)) return [[value(variant)]];
  const columns = variant.getColumnCount();
  return variant.getArrayValue().map((row) => Array.from({ length: columns }, (_cell, c) => value(row[c])));
}

/** An empty cell counts as 0 where a formula points at it. */
function value(object: Nullable<BaseValueObject>): EngineValue {
  if (!object || object.isNull()) return 0;
  if (object.isError()) return { code: String(object.getValue()) };
  return object.isLambda() ? { code: ErrorType.CALC } : object.getValue();
}
