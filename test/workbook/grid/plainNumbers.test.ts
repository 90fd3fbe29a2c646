import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { plainNumbers } from '../../../workbook/grid/plainNumbers';

describe('plainNumbers', () => {
  it.each([
    ['60.0', '60'],
    ['.5', '0.5'],
    ['1.5E-3', '0.0015'],
    ['-2.50', '-2.5'],
    ['"60.0"', '"60.0"'],
    ['{1.50,"1.50";2.0,-.5}', '{1.5,"1.50";2,-0.5}'],
    ['{"a{1.0}",1.0}', '{"a{1.0}",1}'],
    ['TRUE', 'TRUE'],
    ['#N/A', '#N/A'],
    ['1e999', '1e999'],
    ['0x10', '0x10'],
  ])('%s is %s', (token, plain) => {
    expect(plainNumbers(token)).toBe(plain);
  });

  it('never changes the value of a number', () => {
    fc.assert(
      fc.property(fc.double({ noNaN: true, noDefaultInfinity: true }), (value) => {
        for (const text of [String(value), value.toExponential(), value.toPrecision(21)]) {
          expect(Number(plainNumbers(text))).toBe(Number(text));
        }
      }),
      { seed: 20 },
    );
  });
});
