import quantile from '@stdlib/stats-base-dists-t-quantile';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { chiSquareAbove } from '../../../core/statistics/chiSquareAbove';
import { compensatedSum } from '../../../core/statistics/compensatedSum';
import { fisherFAbove } from '../../../core/statistics/fisherFAbove';
import { studentTBelow } from '../../../core/statistics/studentTBelow';
import { studentTBothTails } from '../../../core/statistics/studentTBothTails';
import { studentTQuantile } from '../../../core/statistics/studentTQuantile';

function within(value: number, expected: number, tolerance: number): void {
  expect(Math.abs(value - expected), `${value} against ${expected}, allowed ${tolerance}`).toBeLessThanOrEqual(
    tolerance,
  );
}

describe('Student t', () => {
  // JCGM 100:2008 (GUM), Table G.2: t for 95 % and 99 %, two decimals printed; figures from memory.
  it.each([
    [1, 0.95, 12.71],
    [2, 0.95, 4.3],
    [3, 0.95, 3.18],
    [9, 0.95, 2.26],
    [20, 0.95, 2.09],
    [100, 0.95, 1.984],
    [1, 0.99, 63.66],
    [9, 0.99, 3.25],
  ])('GUM Table G.2: %d degrees of freedom at %d', (degreesOfFreedom, coverage, printed) => {
    within(studentTQuantile(0.5 + coverage / 2, degreesOfFreedom), printed, printed === 1.984 ? 0.0005 : 0.005);
  });

  it('quantile agrees with the closed form for one degree of freedom, t = tan(π(p − ½))', () => {
    for (const p of [1e-6, 0.01, 0.3, 0.6, 0.999]) {
      const expected = Math.tan(Math.PI * (p - 0.5));
      // tan near π/2 amplifies the rounding of p − ½ by 1/p.
      within(studentTQuantile(p, 1), expected, 8 * Number.EPSILON * Math.abs(expected) * (1 + 1 / Math.min(p, 1 - p)));
    }
  });

  it('quantile agrees with an independent inversion of the incomplete beta function', () => {
    fc.assert(
      fc.property(fc.double({ min: 0.001, max: 0.999, noNaN: true }), fc.integer({ min: 1, max: 2000 }), (p, v) => {
        const expected = quantile(p, v);
        // Both invert a distribution function known to about 1e-14.
        within(studentTQuantile(p, v), expected, 1e-12 * Math.max(1, Math.abs(expected)));
      }),
      { seed: 20260101, numRuns: 300 },
    );
  });

  it('quantile inverts the probability', () => {
    for (const v of [1, 2.5, 9, 40, 1e6]) {
      for (const p of [0.005, 0.2, 0.5, 0.7, 0.975]) within(studentTBelow(studentTQuantile(p, v), v), p, 1e-14);
    }
  });

  // R lm, summary: t and p of four slopes, 12 digits printed (test/reference/fitting-enthalpy-temperature.json).
  it.each([
    [-188.872943009, 9, 1.66301023798e-17],
    [-313.714338835, 5, 6.24575200782e-12],
    [-39.2608567945, 6, 1.82438277323e-8],
    [-4.20893245828, 9, 0.00227639830541],
    [-1.37234478476, 4, 0.241879713694],
  ])('both tails: R, t = %d on %d', (t, v, p) => {
    // t is rounded at its 12th digit and p goes with t to the power −v.
    within(studentTBothTails(t, v), p, (v + 2) * 5e-12 * p);
  });
});

describe('Fisher F and chi-square', () => {
  it('F with one numerator degree of freedom is t squared', () => {
    for (const t of [0.3, 2, 9, 188.9]) {
      const p = studentTBothTails(t, 9);
      within(fisherFAbove(t * t, 1, 9), p, 1e-12 * p);
    }
  });

  // NIST/SEMATECH e-Handbook, 1.3.6.7.3 and 1.3.6.7.4: critical values at 5 %, three decimals printed; figures from memory.
  it('e-Handbook tables at 5 %', () => {
    within(fisherFAbove(4.965, 1, 10), 0.05, 2e-5);
    within(fisherFAbove(3.326, 5, 10), 0.05, 2e-5);
    within(chiSquareAbove(3.841, 1), 0.05, 2e-5);
    within(chiSquareAbove(18.307, 10), 0.05, 2e-5);
  });

  it('limits', () => {
    expect(fisherFAbove(0, 1, 9)).toBe(1);
    expect(fisherFAbove(Infinity, 1, 9)).toBe(0);
    expect(studentTBothTails(-Infinity, 9)).toBe(0);
  });
});

describe('compensated sum', () => {
  it('keeps what plain addition drops', () => {
    expect(compensatedSum([1, 1e100, 1, -1e100])).toBe(2);
    expect(compensatedSum(new Array<number>(1000).fill(0.1))).toBe(100);
  });
});
