import { describe, expect, it } from 'vitest';
import { DEFAULT_SETTINGS } from '../../../functions/settings/defaultSettings';
import { parseSettingsBlock } from '../../../functions/settings/parseSettingsBlock';
import { SETTINGS } from '../../../functions/settings/schema';
import { parseArea, parseReference } from '../../../taskpane/hosts/address';
import { readXlsx } from '../../../workbook/file/readXlsx';
import { callsOurs, formulaCells } from './formulaCells';
import { writeXlsx } from '../../../workbook/file/writeXlsx';
import { spilledCells } from '../../../workbook/spilledCells';
import { standardBook } from '../../../workbook/standard/standardBook';
import { WATER_SR1_86 } from '../../../workbook/standard/latentHeatData';

const book = standardBook();
const sheet = (name: string) => {
  const found = book.sheets.find((each) => each.name === name);
  if (found === undefined) throw new Error(`no sheet ${name}`);
  return found;
};

const textAt = (name: string, address: string): string => {
  const value = sheet(name).cells[address]?.value;
  return typeof value === 'string' ? value : '';
};

describe('the standard workbook', () => {
  it('has its sheets in order, the lists of choices hidden', () => {
    expect(book.sheets.map(({ name, hidden }) => [name, hidden])).toEqual([
      ['Cover', false],
      ['Units', false],
      ['Latent heat', false],
      ['ΔCp fit', false],
      ['Substances', false],
      ['Checks', false],
      ['Lists', true],
    ]);
  });

  it('is plain data, and the same after a file', async () => {
    expect(JSON.parse(JSON.stringify(book))).toEqual(book);
    const read = (await readXlsx(writeXlsx(book))).book;
    expect({ ...read, sheets: read.sheets.map(({ id: _id, ...rest }) => rest) }).toEqual(book);
  });

  it('points only at looks that it has', () => {
    const used = book.sheets.flatMap(({ cells }) => Object.values(cells).map(({ style }) => style));
    for (const style of new Set(used)) expect(Object.keys(book.styles)).toContain(style);
  });

  it('puts no spill over another cell that holds something', () => {
    for (const each of book.sheets) {
      for (const address of spilledCells(each)) {
        expect(each.cells[address], `${each.name}!${address}`).toMatchObject({ value: null });
        expect(each.cells[address]).not.toHaveProperty('formula');
      }
    }
  });

  it('passes the Units block with every function that takes settings', () => {
    const without = formulaCells(book).filter(
      ({ formula }) =>
        callsOurs(formula) &&
        !/LATENTRY\.(?:EDITION|SELFCHECK)\(\)/.test(formula) &&
        !formula.includes('Latentry_units'),
    );
    expect(without).toEqual([]);
    expect(formulaCells(book).filter(({ formula }) => callsOurs(formula)).length).toBeGreaterThan(12);
  });

  it('says what it is not for', () => {
    const text = Object.values(sheet('Cover').cells)
      .map(({ value }) => (typeof value === 'string' ? value : ''))
      .join('\n');
    for (const word of [
      'engineering calculation only',
      'Pressure equipment',
      'steam',
      'cryogens',
      'flammable vapour',
      'relief',
      'refrigeration',
      'food and drug',
      'local codes',
      'licensed practice',
    ]) {
      expect(text).toContain(word);
    }
  });
});

describe('its Units sheet', () => {
  const name = book.names.find((each) => each.name === 'Latentry_units');
  const ref = parseReference(name?.formula ?? '');
  const area = parseArea(ref?.address ?? '');

  it('is the block Latentry_units of the whole workbook, a row a setting', () => {
    expect(name).not.toHaveProperty('sheet');
    expect(ref?.sheet).toBe('Units');
    expect(area).toEqual({ top: 3, left: 0, rows: SETTINGS.length, columns: 2 });
  });

  it('reads as the documented defaults', () => {
    const rows = SETTINGS.map((_, i) => ['A', 'B'].map((column) => sheet('Units').cells[`${column}${i + 4}`]?.value));
    expect(rows[0]).toEqual(['Temperature', 'degC']);
    expect(rows[2]).toEqual(['Barometer', '101.325 kPa']);
    expect(parseSettingsBlock(rows, DEFAULT_SETTINGS)).toEqual(DEFAULT_SETTINGS);
  });

  it('offers the choices of each setting, from cells that hold them', () => {
    for (const [i, { choices }] of SETTINGS.entries()) {
      const list = sheet('Units').lists.find(({ range }) => range === `B${i + 4}`);
      expect(list?.values ?? []).toEqual(choices);
      if (list === undefined) continue;
      const from = parseReference(list.source ?? '');
      const cells = parseArea(from?.address ?? '');
      const held = choices.map(
        (_, n) => sheet('Lists').cells[`${String.fromCharCode(65 + (cells?.left ?? 0))}${n + 2}`]?.value,
      );
      expect([from?.sheet, cells?.top, cells?.rows, held]).toEqual(['Lists', 1, choices.length, choices]);
    }
  });
});

describe('its headings', () => {
  it('show before any calculation what their formula gives', () => {
    const heads = formulaCells(book).filter(({ formula }) => formula.includes('INDEX(Latentry_units'));
    expect(heads.length).toBeGreaterThan(8);
    for (const { formula, value } of heads) {
      const [, words = '', row = ''] = /^=(?:"(.*, )"&)?INDEX\(Latentry_units,(\d+),2\)$/.exec(formula) ?? [];
      expect(value).toBe(`${words}${textAt('Units', `B${Number(row) + 3}`)}`);
    }
  });
});

describe('its latent heats for the fit', () => {
  it('lie near the line of FAO-56 between 0 and 40 °C', () => {
    // FAO Irrigation and Drainage Paper 56 (1998), Annex 3, eq. 3-1: λ = 2.501 − 2.361e-3 t, MJ/kg, printed to 4 digits;
    // half a unit of the last printed digit of 2.501 is 0.5 kJ/kg, and the straight line itself bends by up to 1 kJ/kg.
    for (const [temperatureK, latent] of WATER_SR1_86.filter(([t]) => t < 314)) {
      expect(Math.abs(latent - (2501 - 2.361 * (temperatureK - 273.15)))).toBeLessThan(1.5);
    }
  });
});
