import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { evaluate } from '../../../core/evaluate';
import { heat } from '../../../core/path/heat';
import { heatSteps } from '../../../core/path/heatSteps';
import type { State } from '../../../core/path/state';
import type { Curve, Substance } from '../../../core/substance';
import { FIRST_ROW, houseOf, problemOf, row, substanceOf, WASH, type Row } from './rows';

const SEED = { seed: 20260102, numRuns: 200 };
const ATMOSPHERE_PA = 101325;
const at = (temperatureK: number): State => ({ form: 'temperature', temperatureK });

/** Central difference; tolerances at the calls name its error. */
function slopeOf(curve: Curve, t: number, h = 1e-3): number {
  return (curve.at(t + h) - curve.at(t - h)) / (2 * h);
}

const wash = substanceOf(WASH);

describe('a material from the solid to the vapour', () => {
  it('has everything its rows give', () => {
    expect(wash.changes).toEqual(['fusion', 'vaporization']);
    expect(wash.defaultKind('fusion')).toBe('isobaric');
    expect(wash.defaultKind('vaporization')).toBe('coexistence');
    expect(wash.transitionTemperature('fusion')).toBe(159);
    expect(wash.transitionTemperature('vaporization')).toBeUndefined();
    expect(wash.molarMass).toBeCloseTo(0.046, 15);
    expect(wash.constants.map(({ item }) => item)).toEqual(['molar mass', 'melting temperature']);
    expect(wash.enthalpyReference).toBe('solid at 159 K: h = 0');
    expect(
      wash.ladder(ATMOSPHERE_PA).rungs.map(({ phase, fromK, toK }) => [phase, Math.round(fromK), Math.round(toK)]),
    ).toEqual([
      ['solid', 90, 159],
      ['liquid', 159, 351],
      ['gas', 351, 500],
    ]);
  });

  it('names the row of every number', () => {
    expect(evaluate(wash.latent('fusion', 'isobaric'), 159)).toMatchObject({
      value: 5000,
      kind: 'isobaric',
      sources: [
        'Substances row 7: plant laboratory, revision B',
        'Substances row 8: plant laboratory, revision B',
        'Substances row 9: plant laboratory, revision B',
      ],
    });
  });

  it('closes every cycle at a pressure, and adds up leg by leg', () => {
    const temperature = fc.double({ min: 91, max: 499, noNaN: true });
    fc.assert(
      fc.property(
        temperature,
        temperature,
        temperature,
        fc.double({ min: 2e3, max: 1.9e5, noNaN: true }),
        (a, b, c, p) => {
          const round = heat(wash, at(a), at(b), p) + heat(wash, at(b), at(c), p) + heat(wash, at(c), at(a), p);
          // Sums and differences of enthalpies up to 1e5 J/mol.
          expect(Math.abs(round)).toBeLessThanOrEqual(1e-9);
          const path = heatSteps(wash, at(a), at(b), p);
          expect(Math.abs(path.steps.reduce((sum, step) => sum + step.heat, 0) - path.heat)).toBeLessThanOrEqual(1e-9);
        },
      ),
      SEED,
    );
  });

  it('takes up the latent heat given across a transition, at every pressure', () => {
    for (const p of [5e3, 5e4, ATMOSPHERE_PA, 1.9e5]) {
      const boilingK = wash.saturationTemperature('stable').at(p);
      const across = heat(wash, { form: 'saturated', phase: 'liquid' }, { form: 'saturated', phase: 'gas' }, p);
      const latent = wash.latent('vaporization', 'coexistence').at(boilingK);
      expect(Math.abs(across - latent)).toBeLessThanOrEqual(1e-10 * latent);
      expect(Math.abs(wash.latent('vaporization', 'isobaric', p).at(boilingK) - latent)).toBeLessThanOrEqual(
        1e-10 * latent,
      );
    }
    const melted = heat(wash, { form: 'melting', phase: 'solid' }, { form: 'melting', phase: 'liquid' }, ATMOSPHERE_PA);
    expect(melted).toBeCloseTo(5000, 9);
  });

  it.each([
    ['fusion', 'isobaric', [159.5, 200], undefined],
    ['vaporization', 'coexistence', [260, 300, 351, 450], undefined],
    ['vaporization', 'isobaric', [250, 320, 380], 5e4],
  ] as const)('the slope of %s, %s, is the derivative of its heat', (change, kind, places, p) => {
    const latent = wash.latent(change, kind, p);
    const slope = wash.latentSlope(change, kind, p);
    expect(slope.kind).toBe(latent.kind);
    for (const t of places) {
      if (t - 1e-3 < latent.from || t + 1e-3 > latent.to) continue;
      // h = 1e-3 K: third derivatives are below 1e-3 J/(mol K³), rounding 1e-11·4e4/1e-3.
      expect(Math.abs(slopeOf(latent, t) - slope.at(t))).toBeLessThanOrEqual(1e-3);
    }
  });

  it('has the difference of its heat capacities as the isobaric slope, and the term between as the rest', () => {
    const t = 330;
    const liquid = wash.heatCapacity('liquid', ATMOSPHERE_PA).at(t);
    const gas = wash.heatCapacity('gas', 'standard').at(t);
    expect(wash.latentSlope('vaporization', 'isobaric').at(t)).toBeCloseTo(gas - liquid, 9);
    const line = wash.latentSlope('vaporization', 'coexistence').at(t);
    expect(wash.coexistenceTerm('vaporization').at(t)).toBeCloseTo(line - (gas - liquid), 9);
  });

  it('follows a phase beyond where it is stable, and says so', () => {
    const p = ATMOSPHERE_PA;
    const liquid = wash.enthalpy('liquid', p);
    expect(liquid.marksAt?.(380)).toMatchObject([{ code: 'metastable' }]);
    expect(liquid.marksAt?.(300)).toEqual([]);
    for (const t of [170, 300, 380]) {
      expect(Math.abs(slopeOf(liquid, t) - wash.heatCapacity('liquid', p).at(t))).toBeLessThanOrEqual(1e-4);
    }
    const steps = heatSteps(wash, { form: 'temperature', temperatureK: 380, phase: 'liquid' }, at(420), p).steps;
    expect(steps.length).toBeGreaterThan(0);
  });

  it('marks what comes from the ideal gas', () => {
    expect(wash.heatCapacity('gas', ATMOSPHERE_PA).marksAt?.(400)).toMatchObject([{ code: 'ideal-gas' }]);
    expect(wash.heatCapacity('gas', 'standard').marksAt?.(400)).toEqual([]);
  });

  it('does not turn one kind into another', () => {
    expect(problemOf(() => wash.latent('vaporization', 'standard')).message).toBe(
      'heat of vaporization, standard, of wash: add a row "heat of vaporization, standard" for wash to the Substances sheet',
    );
    expect(problemOf(() => wash.latent('sublimation', 'coexistence')).data.code).toBe('missing');
    expect(problemOf(() => wash.disagreement('vaporization', 300, 350)).data.code).toBe('missing');
  });

  it('refuses a pressure at which no liquid is known to last, and ends paths where it does not know where it boils', () => {
    expect(problemOf(() => wash.ladder(100)).data).toMatchObject({ code: 'range', argument: 'pressure' });
    const high = wash.ladder(1e6);
    expect(high.rungs.at(-1)).toMatchObject({ phase: 'liquid', toK: 370 });
    expect(high.missingAbove).toMatch(/^vapour pressure above \d+ Pa of wash$/);
  });
});

describe('parts of a material', () => {
  const without = (...properties: string[]): Substance =>
    substanceOf(WASH.filter(([, property]) => !properties.includes(String(property))));

  it('a phase without heat capacity is one temperature on the path', () => {
    const { rungs, missingBelow } = without('solid heat capacity').ladder(ATMOSPHERE_PA);
    expect(rungs[0]).toMatchObject({ phase: 'solid', fromK: 159, toK: 159 });
    expect(missingBelow).toBe('solid heat capacity of wash');
  });

  it('fusion without both heat capacities is known at its temperature, and has no slope', () => {
    const fusion = without('solid heat capacity').latent('fusion', 'isobaric');
    expect([fusion.from, fusion.to, fusion.at(159)]).toEqual([159, 159, 5000]);
    expect(problemOf(() => without('solid heat capacity').latentSlope('fusion', 'isobaric')).message).toBe(
      'solid heat capacity of wash: add a row "solid heat capacity" for wash to the Substances sheet',
    );
  });

  it('without liquid heat capacity the liquid is known where it melts or where it boils', () => {
    const lone = without('liquid heat capacity');
    const ladder = lone.ladder(ATMOSPHERE_PA);
    expect(ladder.gaps).toHaveLength(1);
    // The vapour is the same at every pressure: zero lies on it.
    const boiling = without('liquid heat capacity', 'heat of fusion', 'melting temperature', 'solid heat capacity');
    expect(boiling.enthalpyReference).toBe('gas at 298.15 K: h = 0');
    const across = heat(boiling, { form: 'saturated', phase: 'liquid' }, at(400), ATMOSPHERE_PA);
    const boilingK = boiling.saturationTemperature('stable').at(ATMOSPHERE_PA);
    const vapour = boiling.enthalpy('gas', ATMOSPHERE_PA);
    const latent = boiling.latent('vaporization', 'coexistence').at(boilingK);
    expect(across).toBeCloseTo(latent + vapour.at(400) - vapour.at(boilingK), 6);
  });

  it('without a vapour pressure it boils at the pressure of its boiling row only', () => {
    const rows = [
      ...WASH.filter(([, property]) => property !== 'vapour pressure'),
      row('boiling temperature', '', 78.3, 'degC'),
    ];
    const still = substanceOf(rows);
    expect(still.ladder(ATMOSPHERE_PA).gaps.at(-1)).toMatchObject({ change: 'vaporization', temperatureK: 351.45 });
    const lower = still.ladder(5e4);
    expect(lower.gaps.map(({ change }) => change)).toEqual(['fusion']);
    expect(lower.rungs.at(-1)?.toK).toBe(351.45);
    expect(lower.missingAbove).toBe('vapour pressure at 50000 Pa of wash');
    expect(problemOf(() => still.saturationPressure('stable')).message).toContain('add a row "vapour pressure"');
    expect(problemOf(() => still.latent('vaporization', 'isobaric', 5e4)).message).toContain(
      'vapour pressure at 50000 Pa',
    );
  });

  it('a boiling row may name its pressure', () => {
    const rows = [
      row('boiling temperature at 10 kPa', '', 29, 'degC'),
      row('heat of vaporization', '', 900, 'kJ/kg'),
      row('liquid heat capacity', '', 2.5, 'kJ/(kg K)', 0, 60),
    ];
    const still = substanceOf(rows);
    expect(still.transitionTemperature('vaporization')).toBe(302.15);
    expect(still.latent('vaporization', 'coexistence').at(302.15)).toBe(9e5);
    const vacuum = heat(still, at(283.15), { form: 'saturated', phase: 'gas' }, 1e4);
    // No molar mass: everything is per kilogram. 19 K of liquid, then the heat of vaporization.
    expect(vacuum).toBeCloseTo(19 * 2500 + 9e5, 6);
    expect(still.constants[0]).toMatchObject({ item: 'boiling temperature at 10 kPa', value: 302.15 });
    expect(problemOf(() => heat(still, at(283.15), { form: 'saturated', phase: 'gas' }, 1e5)).data.code).toBe(
      'missing',
    );
  });

  it('one heat of vaporization holds where it boils at one atmosphere, by its vapour pressure or its own row', () => {
    const few = WASH.filter(([, property]) => property !== 'heat of vaporization');
    const one = row('heat of vaporization', '', 846, 'kJ/kg');
    for (const rows of [
      [...few, one],
      [...few, one, row('boiling temperature', '', 78.3, 'degC')],
    ]) {
      const still = substanceOf(rows);
      const across = heat(
        still,
        { form: 'saturated', phase: 'liquid' },
        { form: 'saturated', phase: 'gas' },
        ATMOSPHERE_PA,
      );
      expect(across).toBeCloseTo(846 * 46, 6);
      const boilingK = still.transitionTemperature('vaporization') ?? NaN;
      expect(still.latent('vaporization', 'coexistence').at(boilingK)).toBeCloseTo(846 * 46, 6);
      expect(still.ladder(5e4).gaps.map(({ change }) => change)).toEqual(['fusion']);
    }
  });

  it('a boiling temperature that the vapour pressure contradicts is warned of', () => {
    const { faults } = houseOf([...WASH, row('boiling temperature', '', 82, 'degC')]);
    expect(faults).toMatchObject([{ row: FIRST_ROW + WASH.length, severity: 'warning', column: 'coefficients' }]);
    expect(faults[0]?.message).toMatch(/says 351\.\d+ K at this pressure/);
  });

  it('a constant heat of vaporization with a range has no slope of its own but zero', () => {
    const still = substanceOf([row('heat of vaporization', '', 900, 'kJ/kg', 0, 60)]);
    expect(still.latentSlope('vaporization', 'coexistence').at(300)).toBe(0);
    expect(
      problemOf(() =>
        substanceOf([
          row('heat of vaporization', '', 900, 'kJ/kg'),
          row('boiling temperature', '', 60, 'degC'),
        ]).latentSlope('vaporization', 'coexistence'),
      ).message,
    ).toMatch(/^temperature slope of the heat of vaporization/);
  });

  it('a heat given as standard stays standard', () => {
    const still = substanceOf([row('heat of vaporization (standard)', 'polynomial', '1100; -1', 'kJ/kg', 0, 60)]);
    expect(still.defaultKind('vaporization')).toBe('standard');
    expect(still.latent('vaporization', 'standard').at(300)).toBeCloseTo(8e5, 6);
    expect(still.latentSlope('vaporization', 'standard').at(300)).toBeCloseTo(-1000, 9);
    expect(problemOf(() => still.latent('vaporization', 'coexistence')).data.code).toBe('missing');
  });

  it('a heat of fusion over a range and heat capacities may disagree, which is a number', () => {
    const rows = [
      ...WASH.filter(([, property]) => property !== 'heat of fusion'),
      row('heat of fusion', 'polynomial', '0; 30', 'J/(mol)', '159 K', '159 K'),
    ];
    expect(problemOf(() => substanceOf(rows).disagreement('fusion', 100, 158)).data.code).toBe('range');
    const salt = substanceOf([
      row('melting temperature', '', 60, 'degC'),
      row('heat of fusion', 'polynomial in degC', '200; 0.5', 'kJ/kg', 20, 80),
      row('solid heat capacity', '', 1.5, 'kJ/(kg K)', 0, 100),
      row('liquid heat capacity', '', 2.2, 'kJ/(kg K)', 0, 100),
    ]);
    // The heat rises by 0.5 kJ/(kg K), the heat capacities differ by 0.7: over 20 K they part by −4 kJ/kg.
    expect(salt.disagreement('fusion', 313.15, 333.15).value).toBeCloseTo(-4000, 6);
  });
});

describe('solid-solid changes', () => {
  const forms: readonly Row[] = [
    row('molar mass', '', 100, 'g/mol'),
    row('alpha-beta temperature', '', 400, 'K'),
    row('heat of alpha-beta', '', 2, 'kJ/mol'),
    row('beta-gamma temperature', '', 500, 'K'),
    row('heat of beta-gamma', '', 3, 'kJ/mol'),
    row('solid alpha heat capacity', '', 80, 'J/(mol K)', '250 K', '420 K'),
    row('solid beta heat capacity', '', 90, 'J/(mol K)', '380 K', '520 K'),
    row('solid gamma heat capacity', '', 95, 'J/(mol K)', '480 K', '610 K'),
    row('melting temperature', '', 600, 'K'),
    row('heat of fusion', '', 10, 'kJ/mol'),
    row('liquid heat capacity', '', 120, 'J/(mol K)', '580 K', '700 K'),
  ];
  const salt = substanceOf(forms);

  it('have the names of their forms, in order of temperature', () => {
    expect(salt.changes).toEqual(['alpha-beta', 'beta-gamma', 'fusion']);
    expect(salt.forms).toEqual(['alpha', 'beta', 'gamma']);
    expect(salt.ladder(1e5).rungs.map(({ phase, form }) => form ?? phase)).toEqual([
      'alpha',
      'beta',
      'gamma',
      'liquid',
    ]);
  });

  it('stand on the path with their heats', () => {
    const total = heat(salt, at(300), at(650), 1e5);
    expect(total).toBeCloseTo(100 * 80 + 2000 + 100 * 90 + 3000 + 100 * 95 + 10000 + 50 * 120, 6);
  });

  it('are carried by the heat capacities of their own forms', () => {
    expect(salt.latent('alpha-beta', 'isobaric').at(410)).toBeCloseTo(2000 + 10 * (90 - 80), 9);
    expect(salt.latentSlope('fusion', 'isobaric').at(600)).toBeCloseTo(120 - 95, 9);
    expect(salt.heatCapacity('solid', 1e5, 'beta').at(450)).toBeCloseTo(90, 9);
  });
});

describe('sublimation', () => {
  const rows: readonly Row[] = [
    row('melting temperature', '', 0, 'degC'),
    row('heat of fusion', '', 330, 'kJ/kg'),
    row('solid heat capacity', '', 2, 'kJ/(kg K)', -60, 0),
    row('liquid heat capacity', '', 4, 'kJ/(kg K)', 0, 100),
    row('gas heat capacity', '', 1.9, 'kJ/(kg K)', -60, 150),
    row('heat of vaporization', 'polynomial in degC', '2500; -2.4', 'kJ/kg', 0, 100),
    row('heat of sublimation', 'constant', 2835, 'kJ/kg', -60, 0),
    row('vapour pressure', 'table', '0:611; 25:3169; 50:12352; 100:101418', 'Pa; degC'),
    row('sublimation pressure', 'table', '-60:1.08; -40:12.84; -20:103.2; 0:611', 'Pa; degC'),
  ];
  const frost = substanceOf(rows);

  it('happens below the pressure at which the solid melts, and only there', () => {
    expect(frost.changes).toEqual(['fusion', 'vaporization', 'sublimation']);
    expect(frost.ladder(50).gaps.map(({ change }) => change)).toEqual(['sublimation']);
    expect(frost.ladder(2000).gaps.map(({ change }) => change)).toEqual(['fusion', 'vaporization']);
    const dried = heat(frost, at(233.15), { form: 'saturated', phase: 'gas' }, 103.2);
    // 20 K of the solid, then its heat of sublimation, per kilogram.
    expect(dried).toBeCloseTo(20 * 2000 + 2.835e6, 3);
  });

  it('keeps one zero of enthalpy for the solid at every pressure', () => {
    expect(frost.enthalpy('solid', 50).at(233.15)).toBeCloseTo(frost.enthalpy('solid', 1e5).at(233.15), 6);
  });

  it('has one two-phase line of the stable phases, both ways', () => {
    const pressure = frost.saturationPressure('stable');
    const back = frost.saturationTemperature('stable');
    expect([Math.round(pressure.at(253.15)), Math.round(pressure.at(298.15))]).toEqual([103, 3169]);
    for (const t of [220, 250, 273, 280, 360]) expect(back.at(pressure.at(t))).toBeCloseTo(t, 6);
    expect(frost.saturationPressure('ice').to).toBeCloseTo(273.15, 9);
    expect(frost.saturationPressure('liquid').from).toBeCloseTo(273.15, 9);
  });
});

describe('a material of which only a composition is known', () => {
  const extract = substanceOf([row('composition', '', 'water 0.9; carbohydrate 0.1', '', 0, 95)]);

  it('is heated and cooled, per kilogram', () => {
    expect(extract.molarMass).toBeNaN();
    const warmed = heat(extract, at(283.15), at(333.15), ATMOSPHERE_PA);
    const mean = warmed / 50;
    // Choi and Okos (1986) at 35 °C, the middle: 0.9 · 4179.7 + 0.1 · 1610.2; the curve bends by less than 1 J/(kg K) over it.
    expect(Math.abs(mean - (0.9 * 4179.7 + 0.1 * 1610.2))).toBeLessThan(2);
  });

  it('does not boil, melt or vaporize, and says what row would say so', () => {
    const { missingAbove, gaps } = extract.ladder(ATMOSPHERE_PA);
    expect([gaps.length, missingAbove]).toEqual([0, 'liquid heat capacity of wash']);
    expect(problemOf(() => extract.latent('vaporization', 'coexistence')).message).toContain(
      'add a row "heat of vaporization" for wash',
    );
  });
});
