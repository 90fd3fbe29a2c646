import type { Injector } from '@univerjs/core';
import { ErrorType, ErrorValueObject, Interpreter, ValueNodeFactory } from '@univerjs/engine-formula';
import { plainNumbers } from './plainNumbers';

/**
 * Mends two things of the grid library's formula engine; call once, when its plugins are registered.
 *
 * 1. An exception inside one formula would leave every later cell uncalculated: now its cell shows `#CALC!`.
 * 2. A number written as 60.0, .5 or 1.50 would reach functions as text: now it is a number.
 */
export function mendEngine(injector: Injector): void {
  const interpreter = injector.get(Interpreter);
  const execute = interpreter.execute.bind(interpreter);
  const executeAsync = interpreter.executeAsync.bind(interpreter);
  interpreter.execute = (node) => {
    try {
      return execute(node);
    } catch {
      return ErrorValueObject.create(ErrorType.CALC);
    }
  };
  interpreter.executeAsync = (node) => executeAsync(node).catch(() => ErrorValueObject.create(ErrorType.CALC));

  const values = injector.get(ValueNodeFactory);
  const create = values.create.bind(values);
  values.create = (token) => create(plainNumbers(token));
}
