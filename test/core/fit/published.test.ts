import { describe, expect, it } from 'vitest';
import { fitDeltaCp } from '../../../core/fit/fitDeltaCp';
import { latentFromFit } from '../../../core/fit/latentFromFit';
import { reference, within } from './reference';

interface LineSet {
  id: string;
  units: { x: string; y: string };
  x: number[];
  y: number[];
  expected: Record<string, number> & { slopeInterval: [number, number] };
  bend: { coefficient: number; uncertainty: number };
}
interface Gum {
  temperature: number[];
  correction: number[];
  printed: Record<string, number>;
  printedAtMean: Record<string, number>;
  exact: Record<string, number>;
}
interface Anscombe {
  sets: { set: number; x: number[]; y: number[]; expected: Record<string, number> }[];
  bend: { set: number; coefficient: number; uncertainty: number }[];
}
interface Mercury {
  temperature: number[];
  pressure: number[];
  expected: Record<string, number>;
}

/** Relative tolerance of a value printed with 12 digits. */
const TWELVE = 5e-12;

describe('latent heat against temperature, R lm', () => {
  const { sets } = reference('fitting-enthalpy-temperature.json') as { sets: LineSet[] };

  it.each(sets)('$id', ({ x, y, expected, bend }) => {
    const fit = fitDeltaCp(x, y, { reference: expected.at });
    const pairs: [string, number | undefined, number | undefined][] = [
      ['slope', fit.slope, expected.slope],
      ['uSlope', fit.uSlope, expected.uSlope],
      ['lower', fit.slopeInterval?.lower, expected.slopeInterval[0]],
      ['upper', fit.slopeInterval?.upper, expected.slopeInterval[1]],
      ['intercept', fit.intercept, expected.intercept],
      ['uIntercept', fit.uIntercept, expected.uIntercept],
      ['residualSd', fit.residualSd, expected.residualSd],
      ['rSquared', fit.rSquared, expected.rSquared],
      ['latent', fit.latent, expected.latentAt],
      ['uLatent', fit.uLatent, expected.uLatentAt],
    ];
    for (const [name, value, printed = NaN] of pairs) within(value, printed, TWELVE * Math.abs(printed), name);
    // p goes with t to the power −df, so its rounding is df times that of t.
    const p = expected.pSlope ?? NaN;
    within(fit.pSlope, p, (fit.degreesOfFreedom + 2) * TWELVE * p, 'p');
    expect(fit.degreesOfFreedom).toBe(expected.degreesOfFreedom);
    const atZero = fitDeltaCp(x, y, { reference: 0 });
    const covariance = expected.interceptCovariance ?? NaN;
    within(atZero.covariance, covariance, TWELVE * Math.abs(covariance), 'covariance');
    const curvature = fit.curvature();
    // The bend is what is left of y after the line: residuals carry eps·|y| / bend of its digits.
    within(curvature?.coefficient, bend.coefficient, 1e-9 * Math.abs(bend.coefficient), 'bend');
    within(curvature?.uncertainty, bend.uncertainty, 1e-9 * bend.uncertainty, 'u(bend)');
  });

  it('says plainly which sets bend', () => {
    const bent = sets
      .filter(({ x, y }) => (fitDeltaCp(x, y).curvature()?.probability ?? 1) < 0.05)
      .map((set) => set.id);
    expect(bent).toEqual(['water-vaporization-0-100C', 'ethanol-vaporization', 'trichloroethene-vaporization']);
  });
});

describe('JCGM 100:2008 (GUM), H.3: calibration of a thermometer', () => {
  const { temperature, correction, printed, printedAtMean, exact } = reference('gum-thermometer.json') as Gum;
  const half = { y1: 0.00005, uY1: 0.00005, y2: 0.000005, uY2: 0.000005, correlation: 0.005, residualSd: 0.00005 };

  it('every printed digit at t₀ = 20 °C', () => {
    const fit = fitDeltaCp(temperature, correction, { reference: printed.reference });
    within(fit.latent, printed.y1 ?? NaN, half.y1, 'y1');
    within(fit.uLatent, printed.uY1 ?? NaN, half.uY1, 's(y1)');
    within(fit.slope, printed.y2 ?? NaN, half.y2, 'y2');
    within(fit.uSlope, printed.uY2 ?? NaN, half.uY2, 's(y2)');
    within(
      (fit.covariance ?? NaN) / ((fit.uLatent ?? NaN) * (fit.uSlope ?? NaN)),
      printed.correlation ?? NaN,
      half.correlation,
      'r',
    );
    within(fit.residualSd, printed.residualSd ?? NaN, half.residualSd, 's');
    expect(fit.degreesOfFreedom).toBe(printed.degreesOfFreedom);
    const at30 = latentFromFit(fit, 30);
    within(at30.value, printed.at30 ?? NaN, 0.00005, 'b(30 °C)');
    within(at30.uLine, printed.uAt30 ?? NaN, 0.00005, 'u(b(30 °C))');
    const twelve: [number | undefined, number | undefined][] = [
      [fit.latent, exact.y1],
      [fit.uLatent, exact.uY1],
      [fit.slope, exact.y2],
      [fit.uSlope, exact.uY2],
      [fit.covariance, exact.covariance],
      [fit.residualSd, exact.residualSd],
      [at30.value, exact.at30],
      [at30.uLine, exact.uAt30],
    ];
    for (const [value, expected = NaN] of twelve) within(value, expected, TWELVE * Math.abs(expected));
  });

  it('every printed digit at the mean reading, where the covariance is zero', () => {
    const fit = fitDeltaCp(temperature, correction);
    within(fit.reference, printedAtMean.reference ?? NaN, 0.00005);
    within(fit.latent, printedAtMean.y1 ?? NaN, 0.00005);
    within(fit.uLatent, printedAtMean.uY1 ?? NaN, 0.00005);
    expect(fit.covariance).toBe(0);
    const at30 = latentFromFit(fit, 30);
    within(at30.value, exact.at30 ?? NaN, TWELVE);
    within(at30.uLine, exact.uAt30 ?? NaN, TWELVE * 0.0042);
  });
});

describe("Anscombe's quartet", () => {
  const { sets, bend } = reference('fitting-anscombe.json') as Anscombe;

  it.each(sets)('set $set: the same line', ({ x, y, expected }) => {
    const fit = fitDeltaCp(x, y);
    for (const name of ['slope', 'intercept', 'uSlope', 'uIntercept', 'residualSd', 'rSquared'] as const) {
      const printed = expected[name] ?? NaN;
      within(fit[name], printed, TWELVE * Math.abs(printed), name);
    }
  });

  it('the test of curvature tells the bent set from the scattered ones', () => {
    for (const { set, coefficient, uncertainty } of bend) {
      const { x = [], y = [] } = sets[set - 1] ?? {};
      const curvature = fitDeltaCp(x, y).curvature();
      within(curvature?.coefficient, coefficient, TWELVE * Math.abs(coefficient));
      // Set 2 is an exact parabola but for its printed decimals, so its scatter is what rounding of y leaves of 1e-3.
      within(curvature?.uncertainty, uncertainty, 1e-10 * uncertainty);
      expect((curvature?.probability ?? NaN) < 0.05).toBe(set === 2);
    }
  });

  it('set 4: two temperatures show no curvature, and one row holds the line by itself', () => {
    const { x = [], y = [] } = sets[3] ?? {};
    const fit = fitDeltaCp(x, y);
    expect(fit.curvature()).toBeUndefined();
    const rows = fit.diagnostics();
    within(rows.leverages[7], 1, Number.EPSILON);
    expect(rows.studentized?.[7]).toBe(0);
  });

  it('set 3: the outlying row stands out', () => {
    const { x = [], y = [] } = sets[2] ?? {};
    const rows = fitDeltaCp(x, y).diagnostics();
    const largest = (rows.studentized ?? new Float64Array()).reduce((a, b) => Math.max(a, Math.abs(b)), 0);
    // Anscombe 1973 names the row x = 13; with n − 2 = 9 degrees of freedom the value cannot pass √9 = 3.
    expect(rows.studentized?.[2]).toBe(largest);
    expect(largest).toBeGreaterThan(2.99);
    expect(largest).toBeLessThanOrEqual(3);
  });
});

describe('vapour pressure of mercury, ln p against 1/T, R lm', () => {
  it('coefficients and covariance', () => {
    const { temperature, pressure, expected } = reference('fitting-mercury.json') as Mercury;
    const rows = temperature
      .map((t, i) => [1 / (t + 273.15), Math.log(pressure[i] ?? NaN)] as const)
      .filter((_, i) => i > 4);
    const fit = fitDeltaCp(
      rows.map((r) => r[0]),
      rows.map((r) => r[1]),
      { reference: 0 },
    );
    const pairs: [number | undefined, number | undefined][] = [
      [fit.intercept, expected.intercept],
      [fit.uIntercept, expected.uIntercept],
      [fit.slope, expected.slope],
      [fit.uSlope, expected.uSlope],
      [fit.covariance, expected.interceptCovariance],
      [fit.residualSd, expected.residualSd],
      [fit.rSquared, expected.rSquared],
    ];
    // R's QR on 15 digits: its own rounding is about 1e-12 relative in the standard errors.
    for (const [value, printed = NaN] of pairs) within(value, printed, 1e-11 * Math.abs(printed));
    expect(fit.degreesOfFreedom).toBe(expected.degreesOfFreedom);
  });
});
