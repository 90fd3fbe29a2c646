import { ICommandService, type Injector } from '@univerjs/core';
import {
  ErrorType,
  ErrorValueObject,
  IFunctionService,
  Interpreter,
  LexerTreeBuilder,
  RemoveDefinedNameMutation,
  SetDefinedNameMutation,
  ValueNodeFactory,
} from '@univerjs/engine-formula';
import { SetWorksheetNameMutation } from '@univerjs/sheets';
import { plainNumbers } from './plainNumbers';

/** Changes after which a name that stands in a formula leads elsewhere, while the formula's text stays the same. */
const NAMES_LEAD_ELSEWHERE = new Set<string>([
  SetDefinedNameMutation.id,
  RemoveDefinedNameMutation.id,
  SetWorksheetNameMutation.id,
]);

/**
 * Mends three things of the grid library's formula engine; call once, when its plugins are registered.
 *
 * 1. An exception inside one formula would leave every later cell uncalculated: now its cell shows `#CALC!`.
 * 2. A number written as 60.0, .5 or 1.50 would reach functions as text: now it is a number.
 * 3. Parsed formulas are kept by their text, the cells of their names with them: they would go on pointing where a
 *    block stood before its sheet was renamed or a row was inserted above it.
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

  const functions = injector.get(IFunctionService);
  injector.get(ICommandService).onCommandExecuted(({ id }) => {
    if (!NAMES_LEAD_ELSEWHERE.has(id)) return;
    // What parsing remembers is common to all parsers, and goes with any of them.
    new LexerTreeBuilder().dispose();
    // Every key holds the empty text; long formulas are kept by a number that says nothing of their workbook.
    functions.deleteFormulaAstCacheKey('');
  });
}
