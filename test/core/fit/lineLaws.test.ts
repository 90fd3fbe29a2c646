import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { convertLine } from '../../../core/fit/convertLine';
import { fitDeltaCp } from '../../../core/fit/fitDeltaCp';
import { latentFromFit } from '../../../core/fit/latentFromFit';
import { within } from './reference';

const SEED = { seed: 20260102, numRuns: 200 };

/** Data as an analyst has them: temperatures in steps of a quarter degree, latent heats with scatter. */
const data = fc
  .array(fc.tuple(fc.integer({ min: -160, max: 800 }), fc.integer({ min: -3000, max: 3000 })), {
    minLength: 5,
    maxLength: 30,
  })
  .map((rows) => ({ x: rows.map((r) => r[0] / 4), y: rows.map((r) => 2500 - 0.6 * r[0] + r[1] / 1000) }))
  .filter(({ x, y }) => new Set(x).size > 2 && (fitDeltaCp(x, y).residualSd ?? 0) > 0.01);

describe('laws of the straight line', () => {
  it('the order of the rows does not matter', () => {
    fc.assert(
      fc.property(data, ({ x, y }) => {
        const fit = fitDeltaCp(x, y);
        const turned = fitDeltaCp([...x].reverse(), [...y].reverse());
        // Sums in another order: a few roundings of the largest term.
        within(turned.slope, fit.slope, 1e-14 * Math.abs(fit.slope) + 1e-16);
        within(turned.intercept, fit.intercept, 1e-13 * Math.abs(fit.intercept));
        within(turned.uSlope, fit.uSlope ?? NaN, 1e-11 * (fit.uSlope ?? NaN) + 1e-16);
      }),
      SEED,
    );
  });

  it('a shift of the temperature scale shifts the intercept and nothing else', () => {
    fc.assert(
      fc.property(data, ({ x, y }) => {
        const celsius = fitDeltaCp(x, y, { reference: 25 });
        const kelvin = fitDeltaCp(
          x.map((t) => t + 273.15),
          y,
          { reference: 298.15 },
        );
        // t + 273.15 rounds each temperature by up to half a unit of its last place, 2.8e-14 K.
        const spanK = celsius.highest - celsius.lowest;
        within(kelvin.slope, celsius.slope, 1e-12 * Math.max(1, 1 / spanK));
        within(kelvin.latent, celsius.latent, 1e-11 * Math.max(1, 1 / spanK));
        within(kelvin.residualSd, celsius.residualSd ?? NaN, 1e-11);
        within(kelvin.rSquared, celsius.rSquared ?? NaN, 1e-12);
      }),
      SEED,
    );
  });

  it('converting the coefficients is converting the data', () => {
    fc.assert(
      fc.property(data, ({ x, y }) => {
        const molar = 0.018015268;
        const converted = convertLine(fitDeltaCp(x, y, { reference: 25 }), { factor: 1.8, offset: 32 }, molar);
        const direct = fitDeltaCp(
          x.map((t) => 1.8 * t + 32),
          y.map((h) => molar * h),
          { reference: 77 },
        );
        const stretch = Math.max(1, 1 / (direct.highest - direct.lowest));
        for (const name of [
          'slope',
          'latent',
          'intercept',
          'covariance',
          'uSlope',
          'uLatent',
          'uIntercept',
          'residualSd',
          'rSquared',
          'reference',
          'lowest',
          'highest',
        ] as const) {
          // Rounding of the converted data: eps·|y|, and eps·|x| times the slope, over the span.
          within(
            converted[name],
            direct[name] ?? NaN,
            1e-10 * stretch * Math.max(1, Math.abs(direct[name] ?? NaN)),
            name,
          );
        }
        within(converted.slopeInterval?.lower, direct.slopeInterval?.lower ?? NaN, 1e-10 * stretch);
        const [bend, directBend] = [converted.curvature(), direct.curvature()];
        if (bend !== undefined && directBend !== undefined) {
          within(bend.coefficient, directBend.coefficient, 1e-8 * directBend.uncertainty + 1e-12);
          within(bend.probability, directBend.probability, 1e-8);
        }
      }),
      SEED,
    );
  });

  it('the covariance moves with the reference, and a prediction does not (GUM H.3)', () => {
    fc.assert(
      fc.property(data, fc.double({ min: -100, max: 400, noNaN: true }), ({ x, y }, reference) => {
        const here = fitDeltaCp(x, y);
        const there = fitDeltaCp(x, y, { reference });
        const [a, b] = [latentFromFit(here, 60), latentFromFit(there, 60)];
        within(b.value, a.value, 1e-11 * Math.abs(a.value) * Math.max(1, Math.abs(here.slope)));
        // u at a far reference is larger than at 60 °C: its rounding comes along.
        within(b.uLine, a.uLine ?? NaN, 1e-12 * ((there.uLatent ?? NaN) + (a.uLine ?? NaN)));
        within(there.uLatent, latentFromFit(here, reference).uLine ?? NaN, 1e-12 * (there.uLatent ?? NaN));
      }),
      SEED,
    );
  });

  it('an added exact duplicate of all rows leaves the line and shrinks its uncertainty by the degrees of freedom', () => {
    fc.assert(
      fc.property(data, ({ x, y }) => {
        const once = fitDeltaCp(x, y);
        const twice = fitDeltaCp([...x, ...x], [...y, ...y]);
        within(twice.slope, once.slope, 1e-14 * Math.abs(once.slope) + 1e-16);
        const n = x.length;
        const expected = (once.uSlope ?? NaN) * Math.sqrt((n - 2) / (2 * n - 2));
        within(twice.uSlope, expected, 1e-11 * expected + 1e-16);
      }),
      SEED,
    );
  });

  it('residuals sum to zero, leverages to two', () => {
    fc.assert(
      fc.property(data, ({ x, y }) => {
        const rows = fitDeltaCp(x, y).diagnostics();
        const sum = (values: Float64Array): number => values.reduce((a, b) => a + b, 0);
        // n roundings of y.
        within(sum(rows.residuals), 0, x.length * 3000 * Number.EPSILON);
        within(sum(rows.leverages), 2, x.length * 4 * Number.EPSILON);
      }),
      SEED,
    );
  });
});

describe('digits where raw sums lose them', () => {
  it('temperatures 373.15 + 0.001 i: the slope keeps eleven digits', () => {
    const x = Array.from({ length: 1000 }, (_, i) => 373.15 + 0.001 * i);
    const y = x.map((t) => 3167 - 2.434 * t);
    const fit = fitDeltaCp(x, y);
    // The data themselves are rounded: eps·|y|/2 a row against a spread of √Σd² = 9.1 K·√(n/1000).
    within(fit.slope, -2.434, (Number.EPSILON * 2260 * 0.5 * 3) / Math.sqrt(fit.solution.spread));
    const sum = (f: (i: number) => number): number => x.reduce((total, _, i) => total + f(i), 0);
    const n = x.length;
    const [sx, sy] = [sum((i) => x[i] ?? NaN), sum((i) => y[i] ?? NaN)];
    const raw =
      (n * sum((i) => (x[i] ?? NaN) * (y[i] ?? NaN)) - sx * sy) / (n * sum((i) => (x[i] ?? NaN) ** 2) - sx * sx);
    expect(Math.abs(raw + 2.434)).toBeGreaterThan(1000 * Math.abs(fit.slope + 2.434));
  });

  it('a million rows keep the digits of ten', () => {
    const n = 1_000_000;
    const x = Float64Array.from({ length: n }, (_, i) => 300 + (i % 1000) / 1024);
    // A scatter that repeats with the temperatures sums to zero against them: the line is exact.
    const y = Float64Array.from(x, (t, i) => 1024 - 2.5 * t + (Math.floor(i / 1000) % 2 === 0 ? 0.25 : -0.25));
    const fit = fitDeltaCp(x, y);
    within(fit.slope, -2.5, 4 * Number.EPSILON);
    within(fit.intercept, 1024, 1024 * Number.EPSILON);
    within(fit.residualSd, 0.25 * Math.sqrt(n / (n - 2)), 1e-14);
  });
});
