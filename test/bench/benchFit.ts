import { SimpleLinearRegression } from 'ml-regression-simple-linear';
import { linearRegression } from 'simple-statistics';
import { fitDeltaCp } from '../../core/fit/fitDeltaCp';
import strd from '../reference/fitting-strd.json';
import { loadFunctions } from './loadFunctions';
import { race, report } from './measure';

const ROWS = 1_000_000;

/** The least that a centred line costs: one pass for the means, one for the sums about them. */
function bareLine(x: Float64Array, y: Float64Array): number {
  let sx = 0;
  let sy = 0;
  for (let i = 0; i < x.length; i++) {
    sx += x[i] as number;
    sy += y[i] as number;
  }
  const mx = sx / x.length;
  const my = sy / x.length;
  let sxx = 0;
  let sxy = 0;
  for (let i = 0; i < x.length; i++) {
    const d = (x[i] as number) - mx;
    sxx += d * d;
    sxy += d * ((y[i] as number) - my);
  }
  return sxy / sxx;
}

/** Two columns of two-dimensional cells into plain arrays: what any cell function pays before it starts. */
function unwrap(a: readonly number[][], b: readonly number[][]): number {
  const x = new Float64Array(a.length);
  const y = new Float64Array(b.length);
  for (let i = 0; i < a.length; i++) {
    x[i] = (a[i] as number[])[0] as number;
    y[i] = (b[i] as number[])[0] as number;
  }
  return (x[0] as number) + (y[y.length - 1] as number);
}

/** Line fits of a million points, and how many certified digits each reaches. */
export function benchFit(): void {
  const x = Float64Array.from({ length: ROWS }, (_, i) => 273.15 + 1e-4 * i);
  const y = x.map((t, i) => 2500 - 2.4 * (t - 273.15) + 0.3 * Math.sin(i));
  const plainX = Array.from(x);
  const plainY = Array.from(y);
  const pairs = plainX.map((t, i) => [t, plainY[i] as number]);
  report(
    'Line fit of 1,000,000 points (aim: within 2.5× the bare loop)',
    race(
      [
        { name: 'bare centred two-pass loop', operations: 1, run: () => bareLine(x, y) },
        { name: 'fitDeltaCp', operations: 1, run: () => fitDeltaCp(x, y).slope },
        { name: 'simple-statistics linearRegression', operations: 1, run: () => linearRegression(pairs).m },
        {
          name: 'ml-regression-simple-linear',
          operations: 1,
          run: () => new SimpleLinearRegression(plainX, plainY).slope,
        },
      ],
      9,
    ),
  );
  const { FITDELTACP } = loadFunctions();
  if (FITDELTACP === undefined) throw new Error('FITDELTACP is not in the bundle');
  const columnX = plainX.map((t) => [t]);
  const columnY = plainY.map((h) => [h]);
  report(
    'The same through the cell function (aim: within 3× the unwrapping)',
    race(
      [
        { name: 'unwrapping two columns of cells', operations: 1, run: () => unwrap(columnX, columnY) },
        {
          name: 'FITDELTACP, its whole table',
          operations: 1,
          run: () => FITDELTACP(columnX, columnY, undefined, undefined, [[['temperature=K']]], {}),
        },
      ],
      7,
    ),
  );
  reportDigits();
}

/** The least-squares slope of data as they are held, in whole numbers: what the last digit should be. */
function exactSlope(x: readonly number[], y: readonly number[]): number {
  const whole = (value: number): bigint => BigInt(value * 2 ** 70);
  const n = BigInt(x.length);
  const [xs, ys] = [x.map(whole), y.map(whole)];
  const sum = (values: readonly bigint[]): bigint => values.reduce((total, value) => total + value, 0n);
  const times = (a: readonly bigint[], b: readonly bigint[]): bigint =>
    sum(a.map((value, i) => value * (b[i] as bigint)));
  const above = n * times(xs, ys) - sum(xs) * sum(ys);
  const below = n * times(xs, xs) - sum(xs) * sum(xs);
  return Number((above * 2n ** 80n) / below) / 2 ** 80;
}

/** Digits of the slope on NIST StRD Norris, and on temperatures that lie close together. */
function reportDigits(): void {
  const steep = Array.from({ length: 11 }, (_, i) => 373.15 + 0.001 * i);
  const heats = steep.map((_, i) => 2256 - 0.0025 * i + (i % 3) * 1e-4);
  const sets = [
    { name: 'NIST StRD Norris, certified', x: strd.norris.x, y: strd.norris.y, slope: strd.norris.certified.slope },
    {
      name: 'NIST StRD Norris, exact on the doubles',
      x: strd.norris.x,
      y: strd.norris.y,
      slope: exactSlope(strd.norris.x, strd.norris.y),
    },
    { name: '373.15 K + 0.001 i, exact on the doubles', x: steep, y: heats, slope: exactSlope(steep, heats) },
  ];
  process.stdout.write('\nDigits of the slope, -log10 of the relative error (16 where every bit agrees)\n');
  for (const { name, x, y, slope } of sets) {
    const digits = (value: number): string => (-Math.log10(Math.max(Math.abs(value / slope - 1), 1e-16))).toFixed(1);
    const pairs = x.map((t, i) => [t, y[i] as number]);
    const shown = [
      ['fitDeltaCp', digits(fitDeltaCp(x, y).slope)],
      ['simple-statistics', digits(linearRegression(pairs).m)],
      ['ml-regression-simple-linear', digits(new SimpleLinearRegression(x, y).slope)],
    ];
    process.stdout.write(`  ${name.padEnd(42)} ${shown.map(([who, d]) => `${who ?? ''} ${d ?? ''}`).join(', ')}\n`);
  }
}
