import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { conversion } from '../../../core/units/conversion';
import { convert } from '../../../core/units/convert';
import { differenceUnit } from '../../../core/units/differenceUnit';
import { FACTORS } from '../../../core/units/factors.generated';
import { fromMolar } from '../../../core/units/fromMolar';
import { fromSi } from '../../../core/units/fromSi';
import { rationalOfDouble } from '../../../core/units/makeUnit';
import { doubleOf } from '../../../core/units/rational';
import { toMolar } from '../../../core/units/toMolar';
import { toSi } from '../../../core/units/toSi';
import type { Unit } from '../../../core/units/unit';
import { unitOf } from '../../../core/units/unitOf';
import { SETTINGS } from '../../../functions/settings/schema';
import { problemOf } from './problemOf';
import { ulpsBetween } from './ulp';

/** Molar mass of water, kg/mol: IAPWS R6-95(2018), M = 18.015268 g/mol. */
const WATER = 0.018015268;
const SEED = { seed: 811, numRuns: 500 };

const units: readonly Unit[] = [
  ...Object.values(FACTORS).flatMap((group) => Object.keys(group).map((symbol) => unitOf(symbol))),
  ...SETTINGS.flatMap((row) => (row.unit === undefined ? [] : row.choices.map((choice) => unitOf(choice, row.unit)))),
  ...['degC difference', 'degF difference', 'psi gauge'].map((text) => unitOf(text)),
];

describe('convert', () => {
  it('points and differences on temperature scales differ', () => {
    expect(convert(100, unitOf('degC'), unitOf('degF'), { as: 'point' })).toBe(212);
    expect(convert(100, unitOf('degC'), unitOf('degF'), { as: 'difference' })).toBe(180);
    expect(convert(100, unitOf('degC'), unitOf('degF difference'))).toBe(180);
    expect(ulpsBetween(convert(-40, unitOf('degF'), unitOf('degC'), { as: 'point' }), -40)).toBeLessThanOrEqual(3);
    expect(convert(5, unitOf('K'), unitOf('degR'))).toBe(9);
    expect(convert(25, unitOf('degC'), unitOf('degC'))).toBe(25);
  });

  it('asks which of the two where the text leaves it open', () => {
    const open = problemOf(() => convert(20, unitOf('degC'), unitOf('K')));
    expect(open).toMatchObject({ argument: 'kind', received: 'degC to K without it' });
    expect(open.allowed).toMatch(/^point or difference/);
    const against = problemOf(() => convert(20, unitOf('degC difference'), unitOf('degF'), { as: 'point' }));
    expect(against).toMatchObject({ argument: 'kind', allowed: 'difference' });
  });

  it('goes between moles and mass with the molar mass, and names it when it is missing', () => {
    // Two or three rounded factors: at most three units in the last place.
    expect(
      ulpsBetween(convert(40.65, unitOf('kJ/mol'), unitOf('kJ/kg'), { molarMass: WATER }), 40.65 / WATER),
    ).toBeLessThanOrEqual(3);
    expect(
      ulpsBetween(convert(1, unitOf('kmol/h'), unitOf('kg/h'), { molarMass: WATER }), 18.015268),
    ).toBeLessThanOrEqual(3);
    expect(ulpsBetween(convert(18.015268, unitOf('g'), unitOf('mol'), { molarMass: WATER }), 1)).toBeLessThanOrEqual(3);
    expect(ulpsBetween(convert(1, unitOf('lbmol'), unitOf('lb'), { molarMass: WATER }), 18.015268)).toBeLessThanOrEqual(
      3,
    );
    for (const [from, to] of [
      ['kJ/mol', 'kJ/kg'],
      ['J/(kg K)', 'J/(mol K)'],
      ['kg', 'mol'],
      ['mol/s', 'kg/s'],
    ] as const) {
      expect(problemOf(() => convert(1, unitOf(from), unitOf(to)))).toMatchObject({
        argument: 'molar mass',
        received: 'nothing',
      });
      expect(problemOf(() => convert(1, unitOf(from), unitOf(to), { molarMass: 0 }))).toMatchObject({
        argument: 'molar mass',
      });
    }
  });

  it('goes between gauge and absolute with the barometer, and names it when it is missing', () => {
    expect(convert(3, unitOf('bar gauge'), unitOf('kPa'), { barometerPa: 101325 })).toBe(401.325);
    expect(
      ulpsBetween(convert(401.325, unitOf('kPa'), unitOf('bar gauge'), { barometerPa: 101325 }), 3),
    ).toBeLessThanOrEqual(3);
    expect(convert(14.5, unitOf('psi gauge'), unitOf('psi gauge'))).toBe(14.5);
    expect(problemOf(() => convert(3, unitOf('bar gauge'), unitOf('kPa')))).toMatchObject({ argument: 'barometer' });
  });

  it.each([
    ['-1 kPa', -1, 'kPa', 'bar'],
    ['-2 bar gauge', -2, 'bar gauge', 'bar'],
    ['-274 degC', -274, 'degC', 'K'],
    ['0 K', 0, 'K', 'degC'],
    ['1e308 GJ', 1e308, 'GJ', 'J'],
    ['NaN', NaN, 'kJ', 'J'],
  ] as const)('refuses %s', (_, value, from, to) => {
    const needs = { barometerPa: 101325, as: 'point' } as const;
    expect(problemOf(() => convert(value, unitOf(from), unitOf(to), needs)).argument).toBe('value');
  });

  it('refuses units of different kinds', () => {
    expect(problemOf(() => convert(1, unitOf('kJ'), unitOf('kW')))).toMatchObject({
      argument: 'to',
      allowed: 'a unit of energy, as kJ is',
      received: 'kW, a unit of power',
    });
  });
});

describe('compiled converters', () => {
  // Numbers so small that they have no full set of digits are taken as zero.
  const value = fc.double({ min: -1e6, max: 1e6, noNaN: true }).map((x) => (Math.abs(x) < 1e-200 ? 0 : x));
  const unit = fc.constantFrom(...units);
  const barometerPa = 98765;

  it('toSi and fromSi undo each other for every unit', () => {
    fc.assert(
      fc.property(unit, value, (u, x) => {
        const there = toSi(u, barometerPa);
        const back = fromSi(u, barometerPa);
        const result = back.scale * (there.scale * x + there.offset) + back.offset;
        // Four products and two sums; the sums lose digits in proportion to the offset.
        const tolerance = 4 * Number.EPSILON * (Math.abs(x) + Math.abs(back.offset));
        expect(Math.abs(result - x), `${u.symbol}: ${x} came back as ${result}`).toBeLessThanOrEqual(tolerance);
      }),
      SEED,
    );
  });

  it('any conversion is the way through SI, and its way back undoes it', () => {
    const pairs = units.flatMap((a) => units.filter((b) => a.kind === b.kind).map((b) => [a, b] as const));
    const needs = { molarMass: WATER, barometerPa, as: 'point' } as const;
    fc.assert(
      fc.property(fc.constantFrom(...pairs), value, ([a, b], x) => {
        const forth = conversion(a, b, needs);
        const back = conversion(b, a, needs);
        const y = forth.scale * x + forth.offset;
        const tolerance = 8 * Number.EPSILON * (Math.abs(x) + Math.abs(back.offset));
        expect(Math.abs(back.scale * y + back.offset - x), `${a.symbol} to ${b.symbol}`).toBeLessThanOrEqual(tolerance);
        if (a.basis === b.basis) {
          const si = toSi(a, barometerPa);
          const out = fromSi(b, barometerPa);
          const throughSi = out.scale * (si.scale * x + si.offset) + out.offset;
          const room =
            8 * Number.EPSILON * (Math.abs(throughSi) + Math.abs(out.offset) + Math.abs(out.scale * si.offset));
          expect(Math.abs(throughSi - y), `${a.symbol} to ${b.symbol} through SI`).toBeLessThanOrEqual(room);
        }
      }),
      SEED,
    );
  });

  it('a difference converts as the difference of two points', () => {
    const scales = ['K', 'degC', 'degF', 'degR'].map((text) => unitOf(text));
    fc.assert(
      fc.property(fc.constantFrom(...scales), fc.constantFrom(...scales), value, value, (a, b, x, d) => {
        const point = conversion(a, b, { as: 'point' });
        const difference = conversion(differenceUnit(a), differenceUnit(b));
        const apart = point.scale * (x + d) + point.offset - (point.scale * x + point.offset);
        const tolerance = 8 * Number.EPSILON * (Math.abs(x) + Math.abs(d) + 500) * 2;
        expect(difference.offset).toBe(0);
        expect(Math.abs(apart - difference.scale * d)).toBeLessThanOrEqual(tolerance);
      }),
      SEED,
    );
  });

  it('toMolar and fromMolar undo each other, and agree with the molar unit', () => {
    const amounts = units.filter((u) => u.basis !== null);
    expect(amounts.length).toBeGreaterThan(30);
    for (const u of amounts) {
      // Two or three rounded factors.
      expect(Math.abs(toMolar(u, WATER).scale * fromMolar(u, WATER).scale - 1)).toBeLessThanOrEqual(3 * Number.EPSILON);
    }
    expect(toMolar(unitOf('kJ/kg'), 0.5)).toEqual({ scale: 500, offset: 0 });
    expect(toMolar(unitOf('kJ/mol'))).toEqual({ scale: 1000, offset: 0 });
    expect(toMolar(unitOf('kg'), 0.5)).toEqual({ scale: 2, offset: 0 });
    expect(fromMolar(unitOf('kmol'))).toEqual({ scale: 0.001, offset: 0 });
    expect(problemOf(() => toMolar(unitOf('kJ/kg')))).toMatchObject({ argument: 'molar mass', received: 'nothing' });
    expect(problemOf(() => fromMolar(unitOf('kg/h')))).toMatchObject({ argument: 'molar mass' });
    expect(problemOf(() => toMolar(unitOf('kPa'))).received).toBe('kPa, a unit of pressure');
  });

  it('asks for the barometer of a gauge pressure', () => {
    expect(problemOf(() => toSi(unitOf('barg')))).toMatchObject({ argument: 'barometer' });
    expect(problemOf(() => fromSi(unitOf('barg')))).toMatchObject({ argument: 'barometer' });
  });
});

describe('exact fractions', () => {
  it('are rounded to the nearest double', () => {
    fc.assert(
      fc.property(fc.double({ noNaN: true, noDefaultInfinity: true, min: 1e-200, max: 1e200 }), fc.nat(), (x, k) => {
        const { n, d } = rationalOfDouble(x);
        const common = BigInt(k) + 1n;
        expect(doubleOf({ n: n * common, d: d * common })).toBe(x);
        expect(doubleOf({ n: -n * common, d: d * common })).toBe(-x);
      }),
      SEED,
    );
    // Halfway cases go to the even neighbour; a little more than half goes up.
    const big = 2n ** 60n;
    expect(doubleOf({ n: (big + 2n ** 7n) * 3n ** 20n, d: 3n ** 20n })).toBe(2 ** 60);
    expect(doubleOf({ n: (big + 2n ** 7n) * 3n ** 20n + 1n, d: 3n ** 20n })).toBe(2 ** 60 + 2 ** 8);
  });
});
