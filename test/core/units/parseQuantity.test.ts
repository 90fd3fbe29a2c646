import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { parseQuantity } from '../../../core/units/parseQuantity';
import type { UnitKind } from '../../../core/units/unit';
import { problemOf } from './problemOf';

const POINT = { decimal: '.', barometerPa: 101325 } as const;
const COMMA = { decimal: ',', barometerPa: 95000 } as const;

describe('parseQuantity', () => {
  it.each([
    ['140 degF', 'temperature', 333.15],
    ['140°F', 'temperature', 333.15],
    ['-20 °C', 'temperature', 253.15],
    ['−20 °C', 'temperature', 253.15],
    ['– 20 °C', 'temperature', 253.15],
    ['273.15K', 'temperature', 273.15],
    ['12 kPa', 'pressure', 12000],
    ['3 bar gauge', 'pressure', 401325],
    ['3 barg', 'pressure', 401325],
    ['-0.5 bar(g)', 'pressure', 51325],
    ['0 Pa', 'pressure', 0],
    ['1.5e3 Pa', 'pressure', 1500],
    ['1.5E+3 Pa', 'pressure', 1500],
    ['1.5×10³ Pa', 'pressure', 1500],
    ['1.5·10^3 Pa', 'pressure', 1500],
    ['1 200 kPa', 'pressure', 1.2e6],
    ['1\u202f013\u202f250 mPa', 'pressure', 1013.25],
    ['.5 bar', 'pressure', 50000],
    ['5 K', 'difference', 5],
    ['5 degC', 'difference', 5],
    ['9 degF', 'difference', 5],
    ['-9 Δ°F', 'difference', -5],
    ['0 K', 'difference', 0],
    ['2257 kJ/kg', 'heat', 2257000],
    ['10 kcal_th/mol', 'heat', 41840],
    ['1 Btu_IT/lb', 'heat', 2326],
    ['36 kg/h', 'flow', 0.01],
    ['12 %', 'share', 0.12],
    ['0.12', 'share', 0.12],
    ['18.015 g/mol', 'molarMass', 0.018015],
  ] as [string, UnitKind, number][])('%s as %s', (text, kind, si) => {
    const got = parseQuantity(text, kind, POINT).si;
    // At most three roundings: the factor, the product and the sum with an offset.
    expect(Math.abs(got - si), `${got} against ${si}`).toBeLessThanOrEqual(
      3 * Number.EPSILON * Math.max(Math.abs(si), 300),
    );
  });

  it('takes the decimal comma where the workbook says so', () => {
    expect(parseQuantity('2,5 bar', 'pressure', COMMA).si).toBe(250000);
    expect(parseQuantity('1 bar gauge', 'pressure', COMMA).si).toBe(195000);
    expect(parseQuantity('1,5e-1 bar', 'pressure', COMMA).si).toBe(15000);
  });

  it.each([
    ['140 F', 'temperature', '140 degF'],
    ['25 C', 'temperature', '25 degC'],
    ['1,200 kPa', 'pressure', '1200 kPa or 1.200 kPa'],
    ['2,5 bar', 'pressure', '2.5 bar'],
    ['1,200.5 kPa', 'pressure', '1200.5 kPa'],
    ['1.200,5 kPa', 'pressure', '1200.5 kPa'],
    ['1,200,000 Pa', 'pressure', '1200000 Pa'],
    ['540 cal/g', 'heat', '540 cal_th/g or 540 cal_IT/g'],
    ['970 Btu/lb', 'heat', '970 Btu_IT/lb or 970 Btu_th/lb'],
    ['3 ton', 'amount', '3 t or 3 ton_short or 3 ton_long'],
  ] as [string, UnitKind, string][])('refuses %s with the likely spellings', (text, kind, allowed) => {
    expect(problemOf(() => parseQuantity(text, kind, POINT))).toMatchObject({ allowed, received: `"${text}"` });
  });

  it('refuses a point for thousands where the comma is decimal', () => {
    expect(problemOf(() => parseQuantity('1.200 kPa', 'pressure', COMMA)).allowed).toBe('1200 kPa or 1,200 kPa');
  });

  it.each([
    ['0 K', 'temperature', 'a temperature above absolute zero, 0 K'],
    ['-273.15 degC', 'temperature', 'a temperature above absolute zero, 0 K'],
    ['-500 degF', 'temperature', 'a temperature above absolute zero, 0 K'],
    ['-1 Pa', 'pressure', 'an absolute pressure of at least 0 Pa'],
    ['-2 bar gauge', 'pressure', 'an absolute pressure of at least 0 Pa'],
    ['5 degC difference', 'temperature', 'a unit of temperature, as K, degC, degF, degR'],
    ['5 kJ', 'pressure', 'a unit of pressure, as kPa, bar, psi, mmHg, kPa gauge'],
    ['12', 'pressure', 'a number with a unit of pressure, as kPa, bar, psi, mmHg, kPa gauge'],
    ['kPa', 'pressure', 'a number with a unit of pressure, as kPa, bar, psi, mmHg, kPa gauge'],
    ['1e999 Pa', 'pressure', 'a number with a unit of pressure, as kPa, bar, psi, mmHg, kPa gauge'],
    ['', 'temperature', 'a number with a unit of temperature, as K, degC, degF, degR'],
    ['1.2.3 bar', 'pressure', 'a number with a unit of pressure, as kPa, bar, psi, mmHg, kPa gauge'],
  ] as [string, UnitKind, string][])('refuses %s as %s', (text, kind, allowed) => {
    expect(problemOf(() => parseQuantity(text, kind, POINT)).allowed).toBe(allowed);
  });

  it('names the argument it was told', () => {
    expect(problemOf(() => parseQuantity('12', 'pressure', POINT, 'at_pressure')).argument).toBe('at_pressure');
  });

  it('gives a finite number or a problem for any text', () => {
    const alphabet = fc.constantFrom(...'0123456789.,-+eE ()/*^°CFKkPabrgJmol·⁻¹%Δ−'.split(''));
    fc.assert(
      fc.property(
        fc.array(alphabet, { maxLength: 16 }),
        fc.constantFrom<UnitKind>('temperature', 'pressure', 'heat', 'share'),
        (letters, kind) => {
          let si = 0;
          try {
            si = parseQuantity(letters.join(''), kind, POINT).si;
          } catch (thrown) {
            expect(thrown).toHaveProperty('data.code', 'argument');
          }
          expect(Number.isFinite(si)).toBe(true);
        },
      ),
      { seed: 3, numRuns: 3000 },
    );
  });
});
