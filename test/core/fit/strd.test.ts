import { describe, expect, it } from 'vitest';
import { fitDeltaCp } from '../../../core/fit/fitDeltaCp';
import { digits, reference, within } from './reference';

interface Strd {
  norris: {
    x: number[];
    y: number[];
    certified: Record<string, number>;
    exactOnDoubles: { intercept: number; slope: number; residualSumOfSquares: number };
  };
  pontius: { x: number[]; y: number[]; certified: { b2: number; uB2: number; degreesOfFreedom: number } };
}

const strd = reference('fitting-strd.json') as Strd;

describe('NIST StRD Norris', () => {
  const { x, y, certified, exactOnDoubles } = strd.norris;
  const fit = fitDeltaCp(x, y);

  // 15 digits are certified (a slope just above 1: half a unit of the last is 14.3 digits); the decimal data are held in
  // binary, which leaves 13.98 and 13.70 digits of intercept and scatter in exact arithmetic.
  it.each([
    ['slope', fit.slope, 14.3],
    ['intercept', fit.intercept, 13.9],
    ['uSlope', fit.uSlope, 13.9],
    ['uIntercept', fit.uIntercept, 13.9],
    ['residualSd', fit.residualSd, 13.9],
    ['rSquared', fit.rSquared, 15],
  ])('%s to the certified digits', (name, value, atLeast) => {
    expect(digits(value ?? NaN, certified[name] ?? NaN)).toBeGreaterThanOrEqual(atLeast);
  });

  it('is the exact answer for the data as binary numbers, to a unit of the last place', () => {
    within(fit.slope, exactOnDoubles.slope, Number.EPSILON);
    within(fit.intercept, exactOnDoubles.intercept, Number.EPSILON / 4);
    within(fit.solution.residualSquares, exactOnDoubles.residualSumOfSquares, 32 * Number.EPSILON);
  });

  it('F of the regression is the square of t', () => {
    const t = fit.slope / (fit.uSlope ?? NaN);
    expect(digits(t * t, certified.fStatistic ?? NaN)).toBeGreaterThanOrEqual(13);
    expect(fit.degreesOfFreedom).toBe(certified.degreesOfFreedom);
    // t of 2331 on 34 degrees of freedom: below the smallest probability that R prints (2e-16).
    expect(fit.pSlope).toBeLessThan(1e-80);
  });
});

describe('NIST StRD Pontius: the bend of a load cell', () => {
  const { x, y, certified } = strd.pontius;
  const curvature = fitDeltaCp(x, y).curvature();

  it('is the certified quadratic coefficient with its standard deviation', () => {
    // Condition of the bend: b₂x² is 1 % of y, so two digits of the 15 go.
    expect(digits(curvature?.coefficient ?? NaN, certified.b2)).toBeGreaterThanOrEqual(12);
    expect(digits(curvature?.uncertainty ?? NaN, certified.uB2)).toBeGreaterThanOrEqual(12);
    expect(curvature?.degreesOfFreedom).toBe(certified.degreesOfFreedom);
    // t = 65 on 37 degrees of freedom.
    expect(curvature?.probability).toBeLessThan(1e-30);
  });
});
