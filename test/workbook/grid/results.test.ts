import { ArrayValueObject } from '@univerjs/engine-formula';
import { describe, expect, it } from 'vitest';
import { FunctionError } from '../../../workbook/grid/customFunctions';
import { faultObject, valueObject, type CallFault } from '../../../workbook/grid/results';

function given(result: unknown): { value: unknown; faults: CallFault[] } {
  const faults: CallFault[] = [];
  const object = valueObject(result, faults);
  const value =
    object instanceof ArrayValueObject
      ? object.getArrayValue().map((row) => row.map((cell) => cell?.getValue()))
      : object.getValue();
  return { value, faults };
}

describe('valueObject', () => {
  it('gives one cell for 1 × 1 and bare results', () => {
    expect(given(2357.65).value).toBe(2357.65);
    expect(given([[2357.65]]).value).toBe(2357.65);
    expect(given('12').value).toBe('12');
    expect(given([['']]).value).toBe('');
    expect(given(null).value).toBe('');
    expect(given([]).value).toBe('');
    expect(given(false).value).toBe(false);
  });

  it('lets nothing that is not finite out, and says where', () => {
    const message = 'the function gave no finite number';
    expect(
      given([
        [1, NaN],
        [Infinity, -Infinity],
      ]),
    ).toEqual({
      value: [
        [1, '#VALUE!'],
        ['#VALUE!', '#VALUE!'],
      ],
      faults: [
        { row: 0, column: 1, code: '#VALUE!', message },
        { row: 1, column: 0, code: '#VALUE!', message },
        { row: 1, column: 1, code: '#VALUE!', message },
      ],
    });
  });

  it('takes errors inside a spill with their words, and fills short rows with blanks', () => {
    expect(given([[1, new FunctionError('#N/A', 'outside')], [2]])).toEqual({
      value: [
        [1, '#N/A'],
        [2, ''],
      ],
      faults: [{ row: 0, column: 1, code: '#N/A', message: 'outside' }],
    });
  });

  it('refuses what is no cell value', () => {
    expect(given([[{ some: 'object' }, 1]]).value).toEqual([['#VALUE!', 1]]);
    expect(given(() => 1).value).toBe('#VALUE!');
    expect(given(new FunctionError('#ODD!' as '#N/A', 'odd')).value).toBe('#VALUE!');
  });
});

describe('faultObject', () => {
  it('keeps code and words of a function error', () => {
    const faults: CallFault[] = [];
    expect(faultObject(new FunctionError('#N/A', 'no data'), faults).getValue()).toBe('#N/A');
    expect(faults).toEqual([{ row: 0, column: 0, code: '#N/A', message: 'no data' }]);
  });

  it.each([new TypeError('x is not a function'), 'thrown text', undefined])('calls %s a defect', (thrown) => {
    const faults: CallFault[] = [];
    expect(faultObject(thrown, faults).getValue()).toBe('#VALUE!');
    expect(faults[0]?.message).toMatch(/^internal error: ./);
  });
});
