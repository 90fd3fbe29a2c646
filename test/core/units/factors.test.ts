import { execFileSync } from 'node:child_process';
import path from 'node:path';
import { describe, expect, it } from 'vitest';
import { DEFINITIONS, TABLE } from '../../../core/units/definitions';
import { FACTORS } from '../../../core/units/factors.generated';
import { rationalOf } from '../../../core/units/rational';
import { readUnitLanguage } from '../../../functions/settings/unitLanguage';
import reference from '../../reference/units-conversions.json';
import { conversion } from '../../../core/units/conversion';
import { unitOf } from '../../../core/units/unitOf';
import { exactOf } from '../../../core/units/makeUnit';
import { exactOfText, ulpsBetween } from './ulp';

const root = path.resolve(import.meta.dirname, '../../..');

/** Names that the reference writes in words. */
const NAMES: Readonly<Record<string, string>> = {
  'hp (550 ft*lbf/s)': 'hp_mechanical',
  'hp (electric)': 'hp_electric',
  'hp (boiler)': 'hp_boiler',
  'ton of refrigeration': 'ton_refrigeration',
  'MBtu_IT/h (10^6)': 'MMBtu_IT/h',
};

const named = (text: string): string => NAMES[text] ?? text;

/** The unit language writes powers with a caret, and a difference of temperatures as a unit of its own. */
const inLanguage = (text: string): string => named(text).replace(/(?<=\b(?:m|ft|cm))([23])\b/g, '^$1');

describe('the factor table', () => {
  it('is what the generator writes', () => {
    const script = path.join(root, 'core/units/generate/generateUnits.mjs');
    expect(execFileSync(process.execPath, [script, '--check'], { encoding: 'utf8' })).toBe('');
  }, 60_000);

  it('holds every definition but the differences, which are units of the language only', () => {
    const symbols = Object.values(FACTORS).flatMap((group) => Object.keys(group));
    const defined = DEFINITIONS.map(([name]) => name).filter((name) => !name.endsWith('_difference'));
    expect(symbols).toEqual(expect.arrayContaining(defined));
    expect(symbols.sort()).toEqual(Object.values(TABLE).flat().sort());
  });

  const entries = Object.values(FACTORS).flatMap((group) => Object.entries(group) as [string, string][]);
  it.each(entries)('and the unit language give %s the same exact value', (symbol, text) => {
    const [factor = '', offset = '0'] = text.split('+');
    const language = readUnitLanguage(symbol);
    expect(rationalOf(factor)).toEqual(language.factor);
    expect(rationalOf(offset)).toEqual(language.offset);
    // The parser of unit texts takes each symbol for exactly this.
    expect(exactOf(unitOf(symbol)).factor).toEqual(language.factor);
    expect(unitOf(symbol).symbol).toBe(symbol);
  });

  it('has degree differences without an offset', () => {
    for (const [name, of] of [
      ['degC_difference', 'degC'],
      ['degF_difference', 'degF'],
    ] as const) {
      const difference = readUnitLanguage(name);
      expect(difference.offset.n).toBe(0n);
      expect(difference.factor).toEqual(exactOf(unitOf(of, 'difference')).factor);
    }
  });
});

describe('conversion factors of NIST SP 811 (2008), Appendix B, and the SI Brochure', () => {
  it('are all there', () => {
    expect(reference.conversions).toHaveLength(96);
    expect(reference.conversions.filter((row) => 'printed' in row)).toHaveLength(40);
  });

  it.each(reference.conversions)('$category: $from in $to', (row) => {
    const as = row.category === 'temperature difference' ? 'difference' : undefined;
    const { scale, offset } = conversion(unitOf(named(row.from)), unitOf(named(row.to)), { as });
    // The table is exact and rounded once: the nearest double, no unit in the last place off.
    expect(scale, `${scale} against ${row.factor}`).toBe(row.factor);
    expect(offset).toBe(0);

    const from = readUnitLanguage(inLanguage(row.from)).factor;
    const to = readUnitLanguage(inLanguage(row.to)).factor;
    const stated = exactOfText(row.exact);
    // `exact` of ft*lbf and of the mechanical horsepower is a decimal cut at 17 digits: equal to half a unit of the last.
    const difference = from.n * to.d * stated.d - stated.n * from.d * to.n;
    const size = difference < 0n ? -difference : difference;
    const cut = /\.\d{14,}$/.test(row.exact);
    if (cut) expect(size * 2n).toBeLessThanOrEqual(from.d * to.n);
    else expect(size).toBe(0n);

    if (row.printed !== undefined) {
      const printed = Number(row.printed.replace(' ', ''));
      const decimals = (/\.(\d+) E/.exec(row.printed)?.[1] ?? '').length;
      const exponent = Number(/E([+-]\d+)$/.exec(row.printed)?.[1]);
      const half = 0.5 * 10 ** (exponent - decimals);
      // Half a unit of the last printed digit; 1e-12 of the value for the binary form of the printed number.
      expect(Math.abs(scale - printed)).toBeLessThanOrEqual(half + 1e-12 * printed);
    }
  });

  it.each(reference.gasConstant.inOtherUnits)('the gas constant (CODATA 2018) in $unit', ({ unit, value }) => {
    const { scale } = conversion(unitOf(reference.gasConstant.unit), unitOf(unit));
    // One product of two rounded doubles: at most two units in the last place.
    expect(ulpsBetween(scale * reference.gasConstant.value, value)).toBeLessThanOrEqual(2);
  });
});

describe('temperature scales of NIST SP 811, Appendix B.8', () => {
  const scales = ['K', 'degC', 'degF', 'degR'] as const;
  it.each(reference.temperatureScales.points)('$K K', (point) => {
    for (const from of scales) {
      for (const to of scales) {
        const { scale, offset } = conversion(unitOf(from), unitOf(to), { as: 'point' });
        const result = scale * point[from] + offset;
        // Two roundings of numbers up to 460 beside the result's own, and the point's own decimal-to-binary error.
        const tolerance = 4 * Number.EPSILON * Math.max(Math.abs(point[to]), Math.abs(offset), 460);
        expect(Math.abs(result - point[to]), `${from} to ${to}: ${result}`).toBeLessThanOrEqual(tolerance);
      }
    }
  });

  it('convert the exact points exactly', () => {
    const degF = conversion(unitOf('degC'), unitOf('degF'), { as: 'point' });
    expect(degF).toEqual({ scale: 1.8, offset: 32 });
    expect(conversion(unitOf('K'), unitOf('degF'), { as: 'point' })).toEqual({ scale: 1.8, offset: -459.67 });
  });
});
