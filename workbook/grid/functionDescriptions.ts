import { BooleanNumber } from '@univerjs/core';
import { FunctionType, type IFunctionInfo } from '@univerjs/engine-formula';
import { cellName, type FunctionList } from './functionList';

/** What the grid shows while a formula is typed: the functions with their arguments, from `functions.json`. */
export function functionDescriptions(list: FunctionList): IFunctionInfo[] {
  return list.functions.map((entry) => ({
    functionName: cellName(entry),
    functionType: FunctionType.User,
    description: entry.description ?? '',
    abstract: entry.description ?? '',
    functionParameter: entry.parameters.map((parameter) => ({
      name: parameter.name,
      detail: parameter.description ?? '',
      example: '',
      require: parameter.optional === true || parameter.repeating === true ? BooleanNumber.FALSE : BooleanNumber.TRUE,
      repeat: parameter.repeating === true ? BooleanNumber.TRUE : BooleanNumber.FALSE,
    })),
  }));
}
