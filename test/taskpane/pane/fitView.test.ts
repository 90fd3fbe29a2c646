import { describe, expect, it } from 'vitest';
import { Problem } from '../../../core/problem';
import { DEFAULT_SETTINGS, parseSettingsText } from '../../../functions/settings/settings';
import { choiceFor, FIRST_CHOICE, withChange, type FitChoice } from '../../../taskpane/pane/fit/fitChoice';
import { fitView, referenceOf } from '../../../taskpane/pane/fit/fitView';
import { curvatureWords, probability } from '../../../taskpane/pane/fit/fitWords';
import { kindRows } from '../../../taskpane/pane/fit/kindRows';
import { pictureOf, thinnedRows } from '../../../taskpane/pane/fit/pictureOf';
import { findColumns } from '../../../taskpane/plan/findColumns';
import type { Cell } from '../../../taskpane/port';
import { unitOf } from '../../../core/units/unitOf';

/** FAO Irrigation and Drainage Paper 56 (1998), equation 3-1: λ = 2.501 − 0.002361 T, MJ/kg and °C. */
const FAO = [0, 10, 20, 30, 40].map((t) => [t, 2501 - 2.361 * t]);

const found = (rows: Cell[][], titles?: string[]) => {
  const values = titles === undefined ? rows : [titles, ...rows];
  const formulas = values.map((row) => row.map(() => ''));
  return findColumns([{ ref: { sheet: 'Data', address: `A1:B${values.length}` }, values, formulas }]);
};

const view = (
  rows: Cell[][],
  titles: string[] | undefined,
  choice: Partial<FitChoice>,
  settings = DEFAULT_SETTINGS,
) => {
  const data = found(rows, titles);
  return fitView(data.columns, { ...choiceFor(data, FIRST_CHOICE), ...choice }, settings);
};

describe('fitView', () => {
  it('answers in the units of the workbook, at 298.15 K when no reference is typed', () => {
    const settings = parseSettingsText('temperature=K; heat=MJ/kg; heat_capacity=J/(g K)', DEFAULT_SETTINGS);
    const { fit, units } = view(FAO, ['T / °C', 'λ / kJ/kg'], {}, settings);
    // The data lie on the line but for rounding: a few units of the last digit of 2501.
    expect(Math.abs(units.slopeFactor * fit.slope + 2.361)).toBeLessThanOrEqual(1e-12);
    expect(fit.reference).toBe(298.15);
    expect(Math.abs(fit.latent - (2.501 - 0.002361 * 25))).toBeLessThanOrEqual(1e-14);
  });

  it('takes a chosen unit only where the header has none', () => {
    const plain = view(FAO, undefined, { latentUnit: 'J/g', temperatureUnit: 'K' });
    expect([plain.units.heat.symbol, plain.units.temperature.symbol]).toEqual(['J/g', 'K']);
    const headed = view(FAO, ['T / °C', 'λ / kJ/kg'], { latentUnit: 'MJ/kg' });
    expect(headed.units.heat.symbol).toBe('kJ/kg');
  });

  it('keeps the basis of the data without a substance, and goes to the workbook’s with one', () => {
    const rows = FAO.map(([t, l]) => [t ?? null, (l ?? 0) * 0.018015268]);
    const titles = ['T / °C', 'ΔH / kJ/mol'];
    expect(view(rows, titles, {}).units.heatCapacity.symbol).toBe('J/(mol K)');
    const { fit, units } = view(rows, titles, { substance: 'water' });
    expect(units.heat.symbol).toBe('kJ/kg');
    expect(Math.abs(units.slopeFactor * fit.slope + 2.361)).toBeLessThanOrEqual(1e-12);
  });

  it.each([
    [
      'no numbers',
      [
        ['a', 'b'],
        ['c', 'd'],
      ] as Cell[][],
      undefined,
      {},
      'temperatures: allowed a column with numbers; received none found',
    ],
    ['a unit that cannot be read', FAO, ['T / °C', 'ΔH / cal/mol'], {}, 'unit in a header: allowed'],
    ['a header above one column only', FAO, ['T / °C', ''], {}, 'headers: allowed one above each column, or none'],
    ['a reference that is none', FAO, undefined, { reference: 'soon' }, 'reference temperature: allowed'],
    ['an ambiguous reference', FAO, undefined, { reference: '77 F' }, 'reference temperature: allowed'],
    ['one point', FAO.slice(0, 1), ['T / °C', 'λ / kJ/kg'], {}, 'at least 2 rows'],
  ])('refuses %s in words', (_, rows, titles, choice, words) => {
    expect(() => view(rows, titles, choice)).toThrow(Problem);
    expect(() => view(rows, titles, choice)).toThrow(words);
  });
});

describe('referenceOf', () => {
  it.each([
    ['', 'degF', 77],
    ['30', 'degC', 30],
    ['1e2', 'K', 100],
    ['300 K', 'degC', 26.85],
    ['77 degF', 'degC', 25],
  ])('reads %j in %s', (text, unit, expected) => {
    // One rounding of a sum near 300.
    expect(Math.abs(referenceOf(text, unitOf(unit, 'temperature'), DEFAULT_SETTINGS) - expected)).toBeLessThanOrEqual(
      1.2e-13,
    );
  });

  it('follows the decimal separator of the workbook', () => {
    const settings = parseSettingsText('decimal=,', DEFAULT_SETTINGS);
    // One rounding of a sum near 300.
    expect(Math.abs(referenceOf('30,5', unitOf('degC', 'temperature'), settings) - 30.5)).toBeLessThanOrEqual(1.2e-13);
  });
});

describe('kindRows', () => {
  it('gives the three kinds of water at 25 °C, and the term between them', () => {
    // Slopes in J/(mol K) at 298.15 K of IAPWS R6-95(2018): coexistence −42.70, isobaric −40.89, standard −41.74.
    const settings = parseSettingsText('heat_capacity=J/(mol K); heat=kJ/mol', DEFAULT_SETTINGS);
    const choice: FitChoice = { ...FIRST_CHOICE, substance: 'water' };
    const rows: Cell[][] = [24, 25, 26].map((t) => [t, 44 - 0.0427 * (t - 25)]);
    const shown = view(rows, ['T / °C', 'ΔH / kJ/mol'], { substance: 'water' }, settings);
    const kinds = kindRows(shown, choice);
    const expected = { coexistence: -42.7, isobaric: -40.89, standard: -41.74 };
    for (const row of kinds?.rows ?? []) {
      // Half a unit of the last digit given.
      expect(Math.abs(Number(row.catalogue) - expected[row.kind])).toBeLessThanOrEqual(0.0051);
      expect(Math.abs(Number(row.fitted) - (-42.7 + expected[row.kind] - expected.coexistence))).toBeLessThanOrEqual(
        0.0101,
      );
    }
    expect(kinds?.rows.map(({ own }) => own)).toEqual([true, false, false]);
    expect(Math.abs(Number(kinds?.term) - (expected.coexistence - expected.isobaric))).toBeLessThanOrEqual(0.0101);
  });

  it('says why where the catalogue has nothing, and is silent without a substance', () => {
    const rows: Cell[][] = [
      [800, 10],
      [900, 11],
      [1000, 12],
    ];
    const choice: FitChoice = { ...FIRST_CHOICE, substance: 'water' };
    const shown = view(rows, ['T / K', 'ΔH / kJ/kg'], { substance: 'water' });
    for (const row of kindRows(shown, choice)?.rows ?? []) {
      expect(row.catalogue).toMatch(/outside \[/);
      expect(row.fitted).toBeUndefined();
    }
    expect(kindRows(shown, FIRST_CHOICE)).toBeUndefined();
  });
});

describe('the picture', () => {
  it('draws every point and a band around the line', () => {
    const rows: Cell[][] = [
      [0, 10],
      [1, 12.5],
      [2, 13],
      [3, 16],
    ];
    const picture = pictureOf(view(rows, ['T / °C', 'ΔH / kJ/kg'], {}));
    expect(picture.points.map(({ x, y }) => [x, y])).toEqual(rows);
    expect(picture.thinned).toBeUndefined();
    for (const { y, low, high } of picture.band) expect(low < y && y < high).toBe(true);
    expect([picture.xLabel, picture.yLabel]).toEqual(['T / °C', 'ΔH / kJ/kg']);
  });

  it('keeps the extremes of each run when it thins', () => {
    const residuals = Float64Array.from({ length: 100_000 }, (_, i) => Math.sin(i * 12.9898));
    residuals[77_777] = 50;
    residuals[12_345] = -50;
    const kept = thinnedRows(residuals);
    expect(kept.length).toBeLessThanOrEqual(1500);
    expect(kept).toContain(77_777);
    expect(kept).toContain(12_345);
    expect(kept).toEqual([...kept].sort((a, b) => a - b));
  });
});

describe('the words', () => {
  it('never makes a zero of a small probability', () => {
    expect([probability(1e-9), probability(0.041234), probability(0.9999)]).toEqual([
      'below 0.001',
      '0.041',
      'above 0.999',
    ]);
  });

  it('says whether a constant slope is supported, by the usual 5 %', () => {
    const bend = { coefficient: 1, uncertainty: 1, degreesOfFreedom: 5 };
    expect(curvatureWords({ ...bend, probability: 0.41 })).toBe(
      'No bend beyond the scatter (p = 0.41): a constant slope is supported.',
    );
    expect(curvatureWords({ ...bend, probability: 0.0001 })).toMatch(
      /^The data bend away from a straight line \(p below 0.001\)/,
    );
    expect(curvatureWords(undefined)).toMatch(/^Not tested/);
  });

  it('gives a change of water the kind its latent heats usually are', () => {
    expect(withChange({ ...FIRST_CHOICE, substance: 'water' }, 'fusion')).toMatchObject({
      change: 'fusion',
      kind: 'isobaric',
    });
    expect(withChange({ ...FIRST_CHOICE, substance: 'water' }, 'melting of wax').change).toBe('fusion');
  });
});
