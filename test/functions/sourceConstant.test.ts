import { beforeAll, describe, expect, it } from 'vitest';
import { catalogue } from '../../core/catalogue/find';
import { constant } from '../../functions/constant';
import { houseStore } from '../../functions/house/store';
import { settingsStore } from '../../functions/settings/store';
import { source } from '../../functions/source';
import { call, cellOf, faultOf } from './host';

beforeAll(() => {
  settingsStore.publish({ state: 'absent' });
  houseStore.publish({ state: 'absent' });
});

const sourceOf = (substance: string, item: string, settings: string[] = []): string =>
  cellOf(call(source, [substance, item], settings)) as string;
const faultWords = (fn: typeof source, substance: string, item: string): string => {
  const { code, message } = faultOf(() => call(fn, [substance, item]));
  return `${code} ${message}`;
};

describe('CONSTANT', () => {
  it('gives every constant of every substance, finite and in the unit it promises', () => {
    for (const { name } of catalogue.entries) {
      const substance = catalogue.find(name);
      for (const { item, value, unit } of substance.constants) {
        const cell = cellOf(call(constant, [name, item], ['temperature=K; pressure=Pa'])) as number;
        expect(cell, `${item} of ${name}`).toBe(unit === 'kg/mol' ? value * 1000 : value);
      }
    }
  });

  it('knows points as temperatures, and other words for the molar mass', () => {
    expect(cellOf(call(constant, ['iron', 'melting point']))).toBe(
      cellOf(call(constant, ['iron', 'melting temperature'])),
    );
    expect(cellOf(call(constant, ['water', 'Normal boiling point']))).toBe(
      cellOf(call(constant, ['water', 'boiling_temperature'])),
    );
    expect(cellOf(call(constant, ['water', 'freezing point'], ['temperature=K']))).toBe(273.152519);
    expect(cellOf(call(constant, ['water', 'molecular weight']))).toBe(0.018015268 * 1000);
    expect(cellOf(call(constant, ['water', 'triple pressure'], ['pressure=Pa']))).toBe(611.654771);
  });

  it('tells what a substance lacks from a word that is none', () => {
    expect(faultWords(constant, 'erythritol', 'critical pressure')).toBe(
      '#N/A critical pressure of erythritol: not in the catalogue; it has molar mass, melting temperature',
    );
    expect(faultWords(constant, 'erythritol', 'boiling point')).toMatch(/^#N\/A boiling temperature of erythritol: /);
    expect(faultWords(constant, 'water', 'criticl pressure')).toMatch(
      /^#VALUE! item: allowed molar mass, .*; received "criticl pressure"; nearest: critical pressure$/,
    );
  });
});

describe('SOURCE', () => {
  it('cites a constant with its uncertainty and standing', () => {
    expect(sourceOf('water', 'molar mass')).toBe(
      'IAPWS R6-95(2018), conversion to molar units; no stated uncertainty; confirmed',
    );
    expect(sourceOf('erythritol', 'melting point')).toMatch(
      /from memory; standard uncertainty 1 K \(k = 1\); unconfirmed$/,
    );
  });

  it('cites a curve with its range in the workbook’s unit, uncertainty, standing and notes', () => {
    const words = sourceOf('water', 'Evaporation', ['temperature=K']);
    expect(words).toMatch(
      /^IAPWS R6-95\(2018\).*; valid from 235 K to 647\.096 K; no stated uncertainty; confirmed; One equation/,
    );
    expect(sourceOf('water', 'saturation temperature', ['pressure=bar'])).toMatch(/valid from .* bar to 220\.64 bar/);
    expect(sourceOf('erythritol', 'fusion')).toMatch(
      /valid at 117\.7 degC only; standard uncertainty 16\.99 kJ\/kg \(k = 1\) at 117\.7 degC; unconfirmed: from memory/,
    );
  });

  it('knows crystal forms, named changes and their opposite, kinds, and notes', () => {
    expect(sourceOf('iron', 'solid gamma heat capacity')).toMatch(/NASA\/TP-2002-211556.*; valid from /);
    expect(sourceOf('iron', 'gamma heat capacity')).toBe(sourceOf('iron', 'solid gamma heat capacity'));
    expect(sourceOf('iron', 'gamma-alpha')).toBe(sourceOf('iron', 'alpha-gamma'));
    const real = sourceOf('water', 'vaporization');
    expect(sourceOf('water', 'vaporization', ['kind=standard'])).not.toBe(real);
    expect(sourceOf('water', 'gas heat capacity', ['kind=standard'])).toBe(
      sourceOf('water', 'ideal gas heat capacity'),
    );
    expect(sourceOf('water', 'notes')).toMatch(/^One equation of state.*construction$/);
    expect(faultOf(() => call(source, ['water', 'fusion'], ['kind=standrd'])).message).toMatch(/nearest: standard/);
  });

  it('answers every item that it lists, for every substance', () => {
    let asked = 0;
    for (const { name } of catalogue.entries) {
      const { message } = faultOf(() => call(source, [name, 'qqq']));
      const items = /^item: allowed (.*); received "qqq"$/.exec(message)?.[1]?.split(', ') ?? [];
      expect(items, name).toContain('molar mass');
      for (const item of items) {
        expect(sourceOf(name, item).length, `${item} of ${name}`).toBeGreaterThan(0);
        expect(sourceOf(name, item), `${item} of ${name}`).not.toMatch(/\bNaN\b|Infinity|undefined|^;| 1 \(k = 1\)$/);
        asked++;
      }
    }
    expect(asked).toBeGreaterThan(500);
  });

  it('names the piece that is missing, and the nearest word for a slip', () => {
    expect(faultWords(source, 'erythritol', 'saturation pressure')).toMatch(/^#N\/A .*erythritol: /);
    expect(faultWords(source, 'erythritol', 'vaporization')).toMatch(/^#N\/A vaporization of erythritol: /);
    expect(faultWords(source, 'erythritol', 'critical pressure')).toMatch(
      /^#N\/A critical pressure of erythritol: not in/,
    );
    expect(faultWords(source, 'iron', 'curie point')).toMatch(/^#N\/A curie point of iron .*second-order/);
    expect(faultWords(source, 'water', 'liqid heat capacity')).toMatch(
      /^#VALUE! item: .*nearest: liquid heat capacity$/,
    );
    expect(faultWords(source, 'water', 'viscosity')).toMatch(
      /^#VALUE! item: allowed fusion, .*; received "viscosity"$/,
    );
  });
});
