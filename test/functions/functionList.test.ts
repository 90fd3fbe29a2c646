import { describe, expect, it } from 'vitest';
// @ts-expect-error -- a build script without types
import { finishFunctionList } from '../../functions/build/functionListPlugin.mjs';

interface Finished {
  readonly finished: {
    readonly functions: readonly { readonly id: string; readonly parameters: readonly Record<string, unknown>[] }[];
    readonly enums?: unknown[];
  };
  readonly errors: readonly string[];
}
const finish = finishFunctionList as (list: unknown, released: readonly string[], lists: unknown) => Finished;

const matrix = { dimensionality: 'matrix', type: 'any' };
const entry = (id: string, result: unknown = matrix): unknown => ({
  id,
  name: id,
  parameters: [{ name: 'substance', type: 'any', dimensionality: 'matrix' }],
  result,
});

describe('the list of functions', () => {
  it('is sorted by id, lets error cells through and has autocomplete lists', () => {
    const { finished, errors } = finish({ functions: [entry('B'), entry('A')] }, ['A', 'B'], {
      substance: { id: 'SUBSTANCE', type: 'string', values: [] },
    });
    expect(errors).toEqual([]);
    expect(finished.functions.map((f) => f.id)).toEqual(['A', 'B']);
    expect(finished.functions[0]?.parameters[0]).toMatchObject({
      customEnumId: 'SUBSTANCE',
      type: 'string',
      dimensionality: 'matrix',
    });
    expect(finished).toMatchObject({ allowErrorForDataTypeAny: true, allowCustomDataForDataTypeAny: true });
    expect(finished.enums).toHaveLength(1);
  });

  it('refuses an id that vanished, one that was never listed, a second dot and a result that is no matrix', () => {
    expect(finish({ functions: [entry('A')] }, ['A', 'GONE'], {}).errors.join()).toMatch(
      /GONE was released and is gone/,
    );
    expect(finish({ functions: [entry('NEW')] }, [], {}).errors.join()).toMatch(/NEW is not in .*releasedIds/);
    expect(finish({ functions: [entry('A.B')] }, ['A.B'], {}).errors.join()).toMatch(/without a dot/);
    expect(finish({ functions: [entry('A', { type: 'any' })] }, ['A'], {}).errors.join()).toMatch(/not a matrix/);
  });
});
