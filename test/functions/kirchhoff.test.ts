import { beforeAll, describe, expect, it } from 'vitest';
import { deltaCp } from '../../functions/deltaCp';
import { kirchhoff } from '../../functions/kirchhoff';
import { latent } from '../../functions/latent';
import { settingsStore } from '../../functions/settings/store';
import { call, cellOf, faultOf } from './host';

beforeAll(() => void settingsStore.publish({ state: 'absent' }));

const near = (value: unknown, expected: number, within: number): void => {
  expect(Math.abs((value as number) - expected), `${String(value)} against ${expected}`).toBeLessThanOrEqual(within);
};

describe('KIRCHHOFF', () => {
  it('carries a latent heat with a constant ΔCp', () => {
    near(cellOf(call(kirchhoff, [2256.4, 100, 25, -2.5])), 2256.4 + 2.5 * 75, 1e-12 * 2444); // rounding
  });

  it('spills over a column, a row and the grid, blanks staying blank', () => {
    const column = call(kirchhoff, [2256.4, 100, [[100], [null], [25]], -2.5]) as unknown[][];
    expect(column.map((row) => row[0])).toEqual([2256.4, '', expect.any(Number)]);
    const grid = call(kirchhoff, [[[2256.4, 2260]], 100, [[50], [25]], -2.5]) as unknown[][];
    expect(grid.map((row) => row.length)).toEqual([2, 2]);
  });

  it('takes a row of coefficients with their form named, T in kelvin', () => {
    // ∫ (a + bT) dT from 373.15 to 298.15 K by hand
    const [a, b] = [-2.9, 0.0012];
    const expected = 2256.4 + a * (298.15 - 373.15) + (b / 2) * (298.15 ** 2 - 373.15 ** 2);
    near(cellOf(call(kirchhoff, [2256.4, 100, 25, [[a, b]]], ['form=a+bT'])), expected, 1e-12 * 2444);
    expect(faultOf(() => call(kirchhoff, [2256.4, 100, 25, [[a, b]]], ['form=shomate'])).message).toMatch(
      /5 coefficients for the form shomate; received 2/,
    );
    expect(faultOf(() => call(kirchhoff, [2256.4, 100, 25, [[a, b]]], ['form=shomat'])).message).toMatch(
      /nearest: shomate/,
    );
  });

  it('propagates uncertainties by the GUM, correlation included', () => {
    const [u, v, r, step] = [0.5, 0.02, -0.4, -75];
    const expected = Math.sqrt(u * u + step * step * v * v + 2 * step * r * u * v); // JCGM 100:2008, equation (13)
    const pair = call(kirchhoff, [2256.4, 100, 25, -2.5, u, v, r]) as number[][];
    near(pair[0]?.[1], expected, 1e-12 * expected);
    const row = call(kirchhoff, [2256.4, 100, [[50, 25]], -2.5, u, v]) as number[][];
    expect(row.map((line) => line.length)).toEqual([2, 2]);
    expect(faultOf(() => call(kirchhoff, [2256.4, 100, 25, -2.5, u, v, 1.2])).message).toMatch(
      /\[-1, 1\]; received 1.2/,
    );
  });

  it('keeps per mass and molar apart until a substance says its molar mass', () => {
    expect(faultOf(() => call(kirchhoff, ['40.66 kJ/mol', 100, 25, -2.5])).message).toMatch(
      /per mass against a latent heat per mole/,
    );
    const molar = cellOf(call(kirchhoff, ['40.66 kJ/mol', 100, 25, -2.5], ['substance=water']));
    near(molar, 40.66 + 2.5 * 75 * 0.018015268, 1e-12 * 44);
    near(cellOf(call(kirchhoff, ['40.66 kJ/mol', 100, 25, '-45 J/(mol K)'])), 40.66 + 0.045 * 75, 1e-12 * 44);
  });

  it('lands on LATENT when kind and slope belong together, and misses by what the issue is when they do not', () => {
    const at = (t: number): number => cellOf(call(latent, ['water', 'vaporization', t])) as number;
    const slope = (t: number, settings: string[] = []): number =>
      cellOf(call(deltaCp, ['water', 'vaporization', t], settings)) as number;
    const alike = cellOf(call(kirchhoff, [at(100), 100, 25, (slope(100) + slope(25)) / 2])) as number;
    near(alike, at(25), 2.7); // a mean of two slopes against a curve: R6-95 itself gives 2444.31642 against 2441.676175
    // Real heat capacities on a coexistence latent heat: IAPWS R6-95 gives 2421.60654, 0.8 % low.
    const mixed = cellOf(call(kirchhoff, [at(100), 100, 25, (-2.13563236 - 2.26977622) / 2])) as number;
    near(mixed, 2421.60654, 5e-6);
  });
});
