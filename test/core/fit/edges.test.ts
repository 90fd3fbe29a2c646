import { describe, expect, it } from 'vitest';
import { convertLine } from '../../../core/fit/convertLine';
import { fitDeltaCp } from '../../../core/fit/fitDeltaCp';
import { fitTable } from '../../../core/fit/fitTable';
import { latentFromFit } from '../../../core/fit/latentFromFit';
import { readFitTable } from '../../../core/fit/readFitTable';
import { readRows } from '../../../core/fit/readRows';
import { Problem } from '../../../core/problem';
import { within } from './reference';

const x = [0, 10, 20, 30, 40];
const y = [2500.8, 2477.3, 2453.76, 2429.82, 2405.12];
const units = {
  temperatureUnit: 'degC',
  heatUnit: 'kJ/kg',
  heatCapacityUnit: 'kJ/(kg K)',
  kind: 'coexistence',
} as const;

function message(work: () => unknown): string {
  try {
    work();
  } catch (error) {
    if (error instanceof Problem) return error.message;
    throw error;
  }
  return 'no error';
}

describe('rows of a sheet', () => {
  it('blank rows are left out with their row and reason, zeros are numbers', () => {
    const rows = readRows([0, null, 20, '', 40, undefined], [2500.8, 2477.3, null, '  ', 2405.12, null], 2);
    expect([...rows.temperatures]).toEqual([0, 40]);
    expect([...rows.latents]).toEqual([2500.8, 2405.12]);
    expect(rows.leftOut).toEqual([
      { row: 3, reason: 'no temperature' },
      { row: 4, reason: 'no latent heat' },
      { row: 5, reason: 'blank' },
      { row: 7, reason: 'blank' },
    ]);
    expect([rows.rowOf(0), rows.rowOf(1)]).toEqual([2, 6]);
  });

  it.each([
    [
      [10, 'n/a'],
      [1, 2],
      'temperatures: allowed finite numbers; rows with a blank are left out; received "n/a" in row 2',
    ],
    [
      [10, null],
      [1, '12,5'],
      'latents: allowed finite numbers; rows with a blank are left out; received "12,5" in row 2',
    ],
    [
      [true, 10],
      [1, 2],
      'temperatures: allowed finite numbers; rows with a blank are left out; received true in row 1',
    ],
    [
      [10, Infinity],
      [1, 2],
      'temperatures: allowed finite numbers; rows with a blank are left out; received Infinity in row 2',
    ],
    [
      [10, 20],
      [1, { error: '#N/A' }],
      'latents: allowed finite numbers; rows with a blank are left out; received no number in row 2',
    ],
    [[10, 20], [1], 'latents: allowed as many rows as temperatures (2); received 1 rows'],
  ])('%j, %j is refused by name', (temperatures, latents, words) => {
    expect(message(() => readRows(temperatures, latents))).toBe(words);
  });
});

describe('what a fit refuses', () => {
  it.each([
    [
      'no row',
      [],
      [],
      'temperatures: allowed at least 2 rows with a temperature and a latent heat; received 0 after leaving out 0',
    ],
    [
      'one row',
      [1],
      [2],
      'temperatures: allowed at least 2 rows with a temperature and a latent heat; received 1 after leaving out 0',
    ],
    ['unequal lengths', [1, 2], [2], 'latents: allowed as many rows as temperatures (2); received 1 rows'],
    [
      'equal temperatures',
      [5, 5, 5],
      [1, 2, 3],
      'temperatures: allowed at least 2 different temperatures; received 5 in all 3 rows',
    ],
    [
      'a temperature that is not a number',
      [1, NaN, 3],
      [1, 2, 3],
      'temperatures: allowed finite numbers; received no finite number in row 2',
    ],
    [
      'an infinite temperature in every row',
      [Infinity, Infinity],
      [1, 2],
      'temperatures: allowed finite numbers; received no finite number in row 1',
    ],
    [
      'an infinite latent heat',
      [1, 2, 3],
      [1, 2, -Infinity],
      'latents: allowed finite numbers; received no finite number in row 3',
    ],
    [
      'squares that overflow',
      [1e200, -1e200],
      [1, 2],
      'temperatures: allowed numbers whose squares can be held; received numbers too large or too close together',
    ],
    [
      'squares that vanish',
      [1e-200, 2e-200],
      [1, 2],
      'temperatures: allowed numbers whose squares can be held; received numbers too large or too close together',
    ],
  ])('%s', (_, temperatures, latents, words) => {
    expect(message(() => fitDeltaCp(temperatures, latents))).toBe(words);
  });

  it.each([0, 1, -0.5, 95, NaN])('coverage %d', (coverage) => {
    expect(message(() => fitDeltaCp(x, y, { coverage }))).toBe(
      `coverage: allowed a probability inside (0, 1); received ${coverage}`,
    );
  });

  it('a reference or a temperature that is not finite, a factor of zero', () => {
    const fit = fitDeltaCp(x, y);
    expect(message(() => fitDeltaCp(x, y, { reference: NaN }))).toContain('reference');
    expect(message(() => latentFromFit(fit, Infinity))).toContain('temperature');
    expect(message(() => convertLine(fit, { factor: 0, offset: 0 }, 1))).toContain('temperature factor');
    expect(message(() => convertLine(fit, { factor: 1, offset: 0 }, 0))).toContain('latent factor');
  });
});

describe('few rows', () => {
  it('two rows: the exact line, no uncertainty', () => {
    const fit = fitDeltaCp([300, 350], [42, 38], { reference: 325 });
    expect([fit.slope, fit.latent, fit.degreesOfFreedom, fit.rSquared]).toEqual([-0.08, 40, 0, 1]);
    for (const name of [
      'uSlope',
      'uLatent',
      'uIntercept',
      'covariance',
      'residualSd',
      'pSlope',
      'coverageFactor',
      'slopeInterval',
    ] as const) {
      expect(fit[name], name).toBeUndefined();
    }
    expect(fit.curvature()).toBeUndefined();
    expect(fit.diagnostics().studentized).toBeUndefined();
    const prediction = latentFromFit(fit, 400);
    expect([prediction.uLine, prediction.lineInterval, prediction.beyondData]).toEqual([undefined, undefined, 50]);
  });

  it('three rows have one degree of freedom, and no test of curvature', () => {
    const fit = fitDeltaCp([0, 1, 2], [0, 1, 4]);
    expect(fit.degreesOfFreedom).toBe(1);
    // s² = Σr²/1 with residuals 1/3, −2/3, 1/3.
    within(fit.residualSd, Math.sqrt(2 / 3), 2 * Number.EPSILON);
    expect(fit.curvature()).toBeUndefined();
  });

  it('equal latent heats: slope zero, nothing to explain', () => {
    const fit = fitDeltaCp([1, 2, 3, 4], [7, 7, 7, 7]);
    expect([fit.slope, fit.uSlope, fit.rSquared, fit.pSlope]).toEqual([0, 0, undefined, undefined]);
    expect(fit.curvature()?.probability).toBe(1);
  });

  it('data on a line without scatter: p is 0, not an error', () => {
    const fit = fitDeltaCp([1, 2, 3, 4], [2, 4, 6, 8]);
    expect([fit.slope, fit.uSlope, fit.pSlope]).toEqual([2, 0, 0]);
    expect(latentFromFit(fit, 10).uLine).toBe(0);
  });
});

describe('table of a fit', () => {
  it('gives back what a prediction needs', () => {
    const fit = fitDeltaCp(x, y, { reference: 25, leftOut: [{ row: 3, reason: 'blank' }] });
    const read = readFitTable(fitTable(fit, units));
    for (const temperature of [-10, 25, 60])
      expect(latentFromFit(read, temperature)).toEqual(latentFromFit(fit, temperature));
    expect(read).toMatchObject({
      ...units,
      method: 'line',
      coverage: 0.95,
      degreesOfFreedom: 3,
      lowest: 0,
      highest: 40,
    });
  });

  it('its rows and columns are as released', () => {
    const table = fitTable(fitDeltaCp(x, y, { leftOut: [{ row: 3, reason: 'blank' }] }), units);
    expect(table.map((row) => row[0])).toEqual([
      'fit',
      'method',
      'substance',
      'kind of latent heat and slope',
      'slope of latent heat',
      'latent heat at reference',
      'reference temperature',
      'covariance of the two',
      'latent heat at zero of the scale',
      'scatter about the fit',
      'degrees of freedom',
      'coverage of intervals',
      'coverage factor',
      'R squared',
      'p of the slope',
      'curvature',
      'p of the curvature',
      'rows used',
      'rows left out',
      'lowest temperature',
      'highest temperature',
    ]);
    expect(table.every((row) => row.length === 7)).toBe(true);
    expect(table[0]).toEqual(['fit', 'value', 'standard uncertainty', 'lower', 'upper', 'unit', 'note']);
    expect(table[18]).toEqual(['rows left out', 1, '', '', '', '', 'blank: row 3']);
  });

  it('holds no number that is not finite, even for two rows', () => {
    for (const cell of fitTable(fitDeltaCp([1, 2], [3, 3]), units).flat()) {
      expect(typeof cell === 'string' || Number.isFinite(cell)).toBe(true);
    }
    expect(readFitTable(fitTable(fitDeltaCp([1, 2], [3, 4]), units)).uSlope).toBeUndefined();
  });

  it('finds its rows whatever stands around them, and names what is missing', () => {
    const table = fitTable(fitDeltaCp(x, y), units);
    const moved = [['My fit of today'], [''], ...table.reverse(), [42]];
    expect(readFitTable(moved).slope).toBe(fitDeltaCp(x, y).slope);
    expect(message(() => readFitTable(moved.slice(0, 10)))).toMatch(
      /^fit: allowed the table of a fit, all its rows; received no row "/,
    );
    const broken = table.map((row) => (row[0] === 'slope of latent heat' ? [row[0], 'steep'] : row));
    expect(message(() => readFitTable(broken))).toBe(
      'fit: allowed a number in row "slope of latent heat"; received "steep"',
    );
  });
});
