import { describe, expect, it } from 'vitest';
import { hasError, jsonLine, readableBlock } from '../../../workbook/cli/printResult';

const table = {
  formula: '=F()',
  values: [
    ['Step', 'heat'],
    ['liquid', 104.5],
    ['vapor', { error: '#N/A' as const, message: 'outside the range' }],
  ],
};

describe('readableBlock', () => {
  it('prints one value bare, and to twelve significant digits', () => {
    expect(readableBlock({ formula: '=F()', values: [[1 / 3]] }, false)).toBe('0.333333333333\n');
    expect(readableBlock({ formula: '=F()', values: [['text']] }, false)).toBe('text\n');
    expect(readableBlock({ formula: '=F()', values: [[true]] }, false)).toBe('TRUE\n');
  });

  it('prints a table in columns, numbers to the right, words of errors below', () => {
    expect(readableBlock(table, false)).toBe('Step    heat\nliquid  104.5\nvapor   #N/A\n#N/A  outside the range\n');
  });

  it('prints the formula above where there are several', () => {
    const error = { error: '#N/A' as const, message: 'no data' };
    expect(readableBlock({ formula: '=F()', values: [[error]] }, true)).toBe('=F()\n  #N/A  no data\n');
  });
});

describe('jsonLine', () => {
  it('keeps every digit of a number', () => {
    const line = jsonLine({ formula: '=F()', values: [[2357.6545202949833]] });
    expect(line).toBe('{"formula":"=F()","value":2357.6545202949833}\n');
  });

  it('keeps quotes and line breaks in one line', () => {
    const line = jsonLine({ formula: '=F("a")', values: [['a "b"\nc']] });
    expect(line.indexOf('\n')).toBe(line.length - 1);
    expect(JSON.parse(line)).toEqual({ formula: '=F("a")', value: 'a "b"\nc' });
  });
});

it('hasError finds an error in any cell', () => {
  expect(hasError(table)).toBe(true);
  expect(
    hasError({
      formula: '=F()',
      values: [
        [1, 'text'],
        [null, true],
      ],
    }),
  ).toBe(false);
});
