import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { fitDeltaCp } from '../../../core/fit/fitDeltaCp';
import { latentFromFit } from '../../../core/fit/latentFromFit';
import { FORM_NAMES, readForm } from '../../../core/kirchhoff/form';
import { kirchhoff } from '../../../core/kirchhoff/kirchhoff';
import { powerIntegral } from '../../../core/kirchhoff/powerIntegral';
import { Problem } from '../../../core/problem';
import { reference, within } from '../fit/reference';

interface Examples {
  examples: {
    id: string;
    latent: number;
    atK: number;
    toK: number;
    deltaCp: number;
    printed?: number;
    relativeTolerance?: number;
    recomputed?: number;
  }[];
  water: Record<string, number | string>[];
}
interface Gum {
  printed: Record<string, number>;
  exact: Record<string, number>;
  temperature: number[];
  correction: number[];
}

const SEED = { seed: 20260103, numRuns: 300 };
const kelvin = fc.double({ min: 50, max: 2000, noNaN: true });
const small = fc.integer({ min: -1000, max: 1000 }).map((n) => n / 1000);

function message(work: () => unknown): string {
  try {
    work();
  } catch (error) {
    if (error instanceof Problem) return error.message;
    throw error;
  }
  return 'no error';
}

describe('published temperature corrections', () => {
  const { examples, water } = reference('kirchhoff-examples.json') as Examples;

  it.each(examples)('$id', ({ latent, atK, toK, deltaCp, printed, relativeTolerance = 0, recomputed }) => {
    const { value } = kirchhoff({ latent, atK, toK, deltaCp });
    // The printed answer was rounded on the way (0.03 %); the recomputed one has 7 digits.
    if (printed !== undefined) within(value, printed, relativeTolerance * Math.abs(printed));
    if (recomputed !== undefined) within(value, recomputed, 5e-6);
  });

  it.each(water)('water $id °C: only the slope of the same kind carries the latent heat right (IAPWS R6-95)', (row) => {
    const [from, to, latentFrom, latentTo] = [row.fromC, row.toC, row.latentFrom, row.latentTo].map(Number) as [
      number,
      number,
      number,
      number,
    ];
    const carry = (deltaCp: number): number =>
      kirchhoff({ latent: latentFrom, atK: from + 273.15, toK: to + 273.15, deltaCp }).value;
    const deltaCpFrom = Number(row.deltaCpFrom);
    // Slopes are printed to 1e-8 kJ/(kg K) and the products to 1e-5 kJ/kg.
    within(carry(deltaCpFrom), Number(row.byDeltaCpAtFrom), 6e-6);
    within(carry((deltaCpFrom + Number(row.deltaCpTo)) / 2), Number(row.byMeanDeltaCp), 6e-6);
    const sameKind = carry((Number(row.slopeFrom) + Number(row.slopeTo)) / 2);
    within(sameKind, Number(row.byMeanSlope), 6e-6);
    const miss = Math.abs(sameKind - latentTo);
    expect(Math.abs(carry(deltaCpFrom) - latentTo)).toBeGreaterThan(5 * miss);
    // A mean of two end slopes on a curve: 0.12 %.
    expect(miss / latentTo).toBeLessThan(0.0013);
  });
});

describe('GUM H.3: carrying from one reference to another', () => {
  const { temperature, correction, printed, exact } = reference('gum-thermometer.json') as Gum;

  it('y(30 °C) = y1 + y2·10 with u² = u1² + 100 u2² + 2·10·cov, from any reference', () => {
    for (const at of [20, 24.0085, 0, 30]) {
      const fit = fitDeltaCp(temperature, correction, { reference: at });
      const { value, uncertainty } = kirchhoff({
        latent: fit.latent,
        atK: at + 273.15,
        toK: 303.15,
        deltaCp: fit.slope,
        uLatent: fit.uLatent,
        uDeltaCp: fit.uSlope,
        correlation: (fit.covariance ?? NaN) / ((fit.uLatent ?? NaN) * (fit.uSlope ?? NaN)),
      });
      // 30 + 273.15 − (at + 273.15) rounds at 6e-14 K.
      within(value, exact.at30 ?? NaN, 1e-12);
      within(uncertainty, exact.uAt30 ?? NaN, 1e-12);
      within(value, latentFromFit(fit, 30).value, 1e-13);
      within(uncertainty, latentFromFit(fit, 30).uLine ?? NaN, 1e-13);
      within(value, printed.at30 ?? NaN, 0.00005);
      within(uncertainty, printed.uAt30 ?? NaN, 0.00005);
    }
  });

  it('from the numbers as printed in the GUM', () => {
    const { value, uncertainty } = kirchhoff({
      latent: printed.y1 ?? NaN,
      atK: 293.15,
      toK: 303.15,
      deltaCp: printed.y2 ?? NaN,
      uLatent: printed.uY1,
      uDeltaCp: printed.uY2,
      correlation: printed.correlation,
    });
    within(value, -0.1494, 0.00005 + 0.00005);
    // Equation H.15 with the rounded inputs of the page gives 0.0042 against 0.0041 printed.
    within(uncertainty, 0.0041, 0.00015);
  });
});

describe('forms of ΔCp', () => {
  it.each([
    ['constant', 'constant'],
    ['A', 'constant'],
    ['a + b T', 'a+bT'],
    ['a+b·T+c·T²', 'a+bT+cT^2'],
    ['A + B*T + C*T**2 + D*T**3', 'a+bT+cT^2+dT^3'],
    ['a + bT + cT⁻²', 'a+bT+c/T^2'],
    ['a+bT+cT^−2', 'a+bT+c/T^2'],
    ['Maier–Kelley', 'a+bT+c/T^2'],
    ['a+bT+cT^2+d/T^2', 'a+bT+cT^2+d/T^2'],
    ['a + b/T', 'a+b/T'],
    ['Shomate', 'shomate'],
    ['NASA-7', 'nasa7'],
    ['nasa 9', 'nasa9'],
  ])('%s', (text, name) => {
    expect(readForm(text).name).toBe(name);
  });

  it.each([
    ['shomat', 'nearest: shomate'],
    ['nasa8', 'nearest: nasa7'],
    ['a+aT', 'received "a+aT"'],
    ['a+bT+cT', 'received "a+bT+cT"'],
    ['', 'received ""'],
    ['a-bT', 'received "a-bT"'],
    ['constructor', 'received "constructor"'],
  ])('%s is refused', (text, words) => {
    expect(message(() => readForm(text))).toContain(words);
  });

  it('every name offered is understood', () => {
    for (const name of FORM_NAMES) expect(readForm(name).terms.length).toBeGreaterThan(0);
  });

  // NIST Chemistry WebBook, Shomate coefficients of steam 500-1700 K (from memory): cp(500 K) = 35.22 J/(mol K), printed 2 decimals.
  it('Shomate: steam from the coefficients of the NIST Chemistry WebBook', () => {
    const coefficients = [30.092, 6.832514, 6.793435, -2.53448, 0.082139];
    const at500 = kirchhoff({ latent: 0, atK: 500, toK: 500, deltaCp: coefficients, form: 'shomate' });
    within(at500.meanDeltaCp, 35.22, 0.005);
    // H(1000 K) − H(298.15 K) is printed as 26.00, H(500 K) − H(298.15 K) as 6.92 kJ/mol.
    const { value } = kirchhoff({ latent: 0, atK: 500, toK: 1000, deltaCp: coefficients, form: 'shomate' });
    within(value, 26000 - 6920, 10);
  });

  // B. J. McBride et al., NASA TM-4513 (1993): argon and every monatomic gas, cp/R = 2.5.
  it('NASA forms multiply by the gas constant: a monatomic gas', () => {
    const exact = 2.5 * 8.31446261815324 * 700;
    const seven = kirchhoff({ latent: 0, atK: 300, toK: 1000, deltaCp: [2.5, 0, 0, 0, 0], form: 'nasa7' });
    const nine = kirchhoff({ latent: 0, atK: 300, toK: 1000, deltaCp: [0, 0, 2.5, 0, 0, 0, 0], form: 'nasa9' });
    within(seven.value, exact, 2 * Number.EPSILON * exact);
    within(nine.value, exact, 2 * Number.EPSILON * exact);
    const inCalories = kirchhoff({
      latent: 0,
      atK: 300,
      toK: 1000,
      deltaCp: [2.5, 0, 0, 0, 0],
      form: 'nasa7',
      gasConstant: 8.31446261815324 / 4.184,
    });
    within(inCalories.value, exact / 4.184, 4 * Number.EPSILON * exact);
  });
});

describe('laws', () => {
  const forms = FORM_NAMES.map(readForm);
  const cases = fc.record({
    form: fc.constantFrom(...forms),
    coefficients: fc.array(small, { minLength: 7, maxLength: 7 }),
    latent: fc.double({ min: -1e5, max: 1e5, noNaN: true }),
    one: kelvin,
    two: kelvin,
    three: kelvin,
  });

  /** Coefficients of a size that makes each term of order 10 at 500 K. */
  const scaled = (form: (typeof forms)[number], coefficients: readonly number[]): number[] =>
    form.terms.map((term, i) => ((coefficients[i] ?? 0) * 10) / (term.scale * 500 ** term.power));

  it('the path does not matter, and there and back is nothing', () => {
    fc.assert(
      fc.property(cases, ({ form, coefficients, latent, one, two, three }) => {
        const deltaCp = scaled(form, coefficients);
        const carry = (from: number, h: number, to: number) =>
          kirchhoff({ latent: h, atK: from, toK: to, deltaCp, form: form.name });
        const direct = carry(one, latent, three).value;
        const detour = carry(two, carry(one, latent, two).value, three).value;
        const size = form.terms.reduce((sum, term, i) => {
          const weight = Math.abs(deltaCp[i] ?? 0) * term.scale * (form.timesGasConstant ? 8.4 : 1);
          return (
            sum +
            weight * (Math.abs(powerIntegral(term.power, one, two)) + Math.abs(powerIntegral(term.power, two, three)))
          );
        }, Math.abs(latent));
        // A few roundings of the largest terms.
        within(detour, direct, 1e-14 * size);
        within(carry(three, direct, one).value, latent, 1e-14 * size);
      }),
      SEED,
    );
  });

  it('the sensitivities are the derivatives, and d(ΔH)/dT is ΔCp', () => {
    fc.assert(
      fc.property(cases, ({ form, coefficients, one, two }) => {
        const deltaCp = scaled(form, coefficients);
        const at = (c: readonly number[], to = two): number =>
          kirchhoff({ latent: 0, atK: one, toK: to, deltaCp: c, form: form.name }).value;
        const { sensitivities } = kirchhoff({ latent: 0, atK: one, toK: two, deltaCp, form: form.name });
        form.terms.forEach((_, i) => {
          const unit = form.terms.map((__, j) => (i === j ? 1 : 0));
          // The integral is linear in the coefficients, so its value at a unit vector is the derivative.
          within(at(unit), sensitivities[i] ?? NaN, 1e-15 * Math.abs(sensitivities[i] ?? NaN));
        });
        const step = 1e-3 * two;
        const numeric = (at(deltaCp, two + step) - at(deltaCp, two - step)) / (2 * step);
        const here = kirchhoff({ latent: 0, atK: two, toK: two, deltaCp, form: form.name }).meanDeltaCp;
        const largest = form.terms.reduce(
          (sum, term, i) =>
            sum +
            Math.abs(deltaCp[i] ?? 0) *
              term.scale *
              (form.timesGasConstant ? 8.4 : 1) *
              (two ** term.power + Math.max(one, two) ** term.power),
          0,
        );
        // Central difference: third derivative times step²/6 (≤ 20·1e-6/6 relative), and rounding of the integral over the step.
        within(numeric, here, largest * (4e-6 + 1e-11 * (1 + (Math.abs(two - one) / two) * (1 + one / two))));
      }),
      SEED,
    );
  });

  it('close temperatures lose no digits', () => {
    const from = 300;
    const to = 300.0001;
    const step = to - from;
    // Taylor series of the antiderivative to third order: the rest is below step³·1e-4.
    for (const power of [-3, -2, -1, 0, 1, 2, 4]) {
      const middle = from + step / 2;
      const series = step * middle ** power * (1 + (power * (power - 1) * (step / middle) ** 2) / 24);
      within(powerIntegral(power, from, to), series, 8 * Number.EPSILON * series);
    }
  });

  it('a covariance block gives what propagation by its square root gives', () => {
    fc.assert(
      fc.property(fc.array(small, { minLength: 9, maxLength: 9 }), kelvin, kelvin, (numbers, one, two) => {
        const root = [0, 1, 2].map((i) => [0, 1, 2].map((j) => (numbers[3 * i + j] ?? 0) / 500 ** (j === 2 ? 0 : j)));
        const block = [0, 1, 2].map((i) =>
          [0, 1, 2].map((j) => root.reduce((sum, row) => sum + (row[i] ?? 0) * (row[j] ?? 0), 0)),
        );
        const { uncertainty, sensitivities } = kirchhoff({
          latent: 1,
          atK: one,
          toK: two,
          deltaCp: [1, 0, 0],
          form: 'a+bT+c/T^2',
          uLatent: 3,
          covariance: block,
        });
        const parts = root.map((row) => row.reduce((sum, value, j) => sum + value * (sensitivities[j] ?? 0), 0));
        const expected = Math.hypot(3, ...parts);
        const size = root.flat().reduce((sum, value, k) => sum + Math.abs(value * (sensitivities[k % 3] ?? 0)), 3);
        within(uncertainty, expected, (1e-14 * size * size) / expected);
      }),
      SEED,
    );
  });

  it('fully correlated uncertainties add or cancel', () => {
    const input = { latent: 40, atK: 300, toK: 310, deltaCp: -0.04, uLatent: 0.2, uDeltaCp: 0.02 };
    within(kirchhoff({ ...input, correlation: 1 }).uncertainty, 0.4, 1e-15);
    within(kirchhoff({ ...input, correlation: -1 }).uncertainty, 0, 1e-8);
    within(kirchhoff(input).uncertainty, Math.SQRT2 * 0.2, 1e-15);
    within(kirchhoff({ ...input, uDeltaCp: undefined, correlation: undefined }).uncertainty, 0.2, 1e-15);
    expect(kirchhoff({ latent: 40, atK: 300, toK: 310, deltaCp: -0.04 }).uncertainty).toBeUndefined();
    const covered = kirchhoff({ ...input, uDeltaCp: undefined, covariance: [[0.0004]], latentCovariance: [0.004] });
    within(covered.uncertainty, 0.4, 1e-15);
  });
});

describe('what it refuses', () => {
  const input = { latent: 40, atK: 300, toK: 310, deltaCp: -0.04 };
  it.each([
    [{ atK: 0 }, 'at: allowed a temperature above 0 K; received 0'],
    [{ toK: -5 }, 'to: allowed a temperature above 0 K; received -5'],
    [{ latent: NaN }, 'latent: allowed a finite latent heat; received NaN'],
    [{ deltaCp: Infinity }, 'deltacp: allowed finite numbers; received Infinity'],
    [{ deltaCp: [1, 2] }, 'deltacp: allowed 1 coefficient for the form constant; received 2'],
    [{ form: 'shomate' }, 'deltacp: allowed 5 coefficients for the form shomate; received 1'],
    [{ uLatent: -1 }, 'u_latent: allowed a standard uncertainty of at least 0; received -1'],
    [{ uLatent: 1, uDeltaCp: 1, correlation: 1.01 }, 'correlation: allowed a number in [-1, 1]; received 1.01'],
    [
      { correlation: 0.5 },
      'correlation: allowed together with uncertainties of latent heat and heat-capacity difference; received no uncertainties',
    ],
    [{ uDeltaCp: 1, covariance: [[1]] }, 'u_deltacp: allowed one uncertainty, or a covariance block; received both'],
    [
      { deltaCp: [1, 2], form: 'a+bT', uDeltaCp: 1 },
      'u_deltacp: allowed a covariance block of 2 rows and 2 columns; received one number',
    ],
    [{ deltaCp: [1, 2], form: 'a+bT', covariance: [[1]] }, 'received 1 rows and 1 columns'],
    [
      {
        deltaCp: [1, 2],
        form: 'a+bT',
        covariance: [
          [1, 0.5],
          [0.4, 1],
        ],
      },
      'received 0.4 and 0.5 across the diagonal in rows 2 and 1',
    ],
    [
      {
        deltaCp: [1, 2],
        form: 'a+bT',
        covariance: [
          [1, 2],
          [2, 1],
        ],
      },
      'received a correlation outside [-1, 1] between 1 and 2',
    ],
    [
      {
        deltaCp: [1, 2],
        form: 'a+bT',
        covariance: [
          [-1, 0],
          [0, 1],
        ],
      },
      'received variance -1 in row 1',
    ],
    [
      {
        deltaCp: [1, 2, 3],
        form: 'a+bT+cT^2',
        covariance: [
          [1, 0.9, -0.9],
          [0.9, 1, 0.9],
          [-0.9, 0.9, 1],
        ],
      },
      'received correlations that contradict each other',
    ],
    [{ uLatent: 1, covariance: [[1]], latentCovariance: [1.5] }, 'covariance with the latent heat: allowed'],
  ])('%j', (change, words) => {
    expect(message(() => kirchhoff({ ...input, ...change }))).toContain(words);
  });
});
