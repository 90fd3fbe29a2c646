import { build } from 'esbuild';
import path from 'node:path';
import { gzipSync } from 'node:zlib';
import { describe, expect, it } from 'vitest';
import { Problem } from '../../../core/problem';
import { unitOf } from '../../../core/units/unitOf';
import { freeUnit } from '../../../functions/settings/freeUnit';

const root = path.resolve(import.meta.dirname, '../../..');

describe('freeUnit', () => {
  it.each([
    ['kcal_th per mol', 'kcal_th/mol'],
    ['kW h / t', 'kWh/t'],
    ['kilojoule per kilogram', 'kJ/kg'],
    ['kilojoules per kilogram', 'kJ/kg'],
    ['megajoule / tonne', 'kJ/kg'],
    ['kPa gauge', 'kPa gauge'],
    ['°C', 'degC'],
    ['kilowatt', 'kW'],
  ])('%s is %s, the same as the functions read', async (text, symbol) => {
    expect(await freeUnit(text)).toBe(unitOf(symbol));
  });

  it.each([
    // 1 erg = 1e-7 J and 1 dyn = 1e-5 N: SI Brochure, 9th edition, and NIST SP 811, Appendix B.
    ['erg/(g K)', 'heatCapacity', 'mass', 1e-4],
    ['dyn/cm2', 'pressure', null, 0.1],
    ['decagram/hour', 'flow', 'mass', 0.01 / 3600],
    ['GW h/megagram', 'heat', 'mass', 3.6e9],
  ] as const)('%s has a size of its own', async (text, kind, basis, factor) => {
    const unit = await freeUnit(text, kind);
    expect(unit).toMatchObject({ kind, basis, offset: 0 });
    expect(unit.factor).toBe(factor);
  });

  it.each([
    ['cal per g', 'cal_th/g or cal_IT/g'],
    ['slug BTU', 'a unit, as kJ/kg, degC, kPa'],
    ['BTU', 'Btu_IT or Btu_th'],
    ['pint', 'a unit, as kJ/kg, degC, kPa'],
    ['volt', 'a unit, as kJ/kg, degC, kPa'],
    ['m^9999', 'a unit, as kJ/kg, degC, kPa'],
    ['nonsense', 'a unit, as kJ/kg, degC, kPa'],
  ])('%s stays refused', async (text, allowed) => {
    await expect(freeUnit(text)).rejects.toMatchObject({ data: { code: 'argument', allowed } });
  });

  it('says what is expected', async () => {
    const refusal = freeUnit('kilojoule', 'heat');
    await expect(refusal).rejects.toBeInstanceOf(Problem);
    await expect(refusal).rejects.toMatchObject({ data: { received: '"kilojoule", a unit of energy' } });
  });

  it('keeps the unit language out of what the functions load first', async () => {
    const contents = ['settings', 'store', 'schema']
      .map((file) => `export * from './functions/settings/${file}';`)
      .join('\n');
    const { outputFiles, metafile } = await build({
      stdin: { contents, resolveDir: root },
      bundle: true,
      minify: true,
      write: false,
      metafile: true,
      target: 'es2020',
      format: 'esm',
    });
    expect(Object.keys(metafile.inputs).filter((input) => /mathjs|unitLanguage|definitions/.test(input))).toEqual([]);
    // Units and settings take a small part of the 100 kB that the functions bundle aims at.
    expect(gzipSync(outputFiles[0]?.contents ?? '').length).toBeLessThan(12_000);
  });
});
