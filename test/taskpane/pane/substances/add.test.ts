import { describe, expect, it } from 'vitest';
import { HOUSE_HEADS } from '../../../../core/house/houseRow';
import { draftRow, EMPTY_DRAFT } from '../../../../taskpane/pane/substances/add/draftRow';
import { rowFaults } from '../../../../taskpane/pane/substances/add/rowFaults';
import { coefficientsHint, unitHint } from '../../../../taskpane/pane/substances/add/rowHints';
import type { Block, Cell } from '../../../../taskpane/port';

const heat = { ...EMPTY_DRAFT, substance: 'brine', property: 'liquid heat capacity', unit: 'kJ/(kg K)' };
const blockOf = (rows: readonly Cell[][]): Block => ({
  ref: { sheet: 'Substances', address: `A3:I${3 + rows.length}` },
  values: [[...HOUSE_HEADS], ...rows],
  formulas: [[], ...rows.map(() => [])].map(() => new Array<string>(9).fill('')),
});

describe('draftRow', () => {
  it('makes numbers of plain numbers, in the workbook’s spelling, and leaves blanks out', () => {
    expect(draftRow({ ...heat, coefficients: '3,1', 'valid from': '−5', 'valid to': '280 K' }, ',')).toEqual({
      substance: 'brine',
      property: 'liquid heat capacity',
      unit: 'kJ/(kg K)',
      coefficients: 3.1,
      'valid from': -5,
      'valid to': '280 K',
    });
    expect(draftRow({ ...heat, coefficients: '7647-14-5', property: 'CAS' }, '.').coefficients).toBe('7647-14-5');
  });
});

describe('rowFaults', () => {
  const good = draftRow({ ...heat, coefficients: '3.1', 'valid from': '0', 'valid to': '50', source: 'log' }, '.');

  it('finds nothing wrong with a whole row, with or without a sheet', () => {
    expect(rowFaults(undefined, good, '.')).toEqual({ errors: {}, warnings: [] });
    expect(rowFaults(blockOf([]), good, '.')).toEqual({ errors: {}, warnings: [] });
  });

  it('puts each error at its column, the nearest word first', () => {
    const slip = rowFaults(undefined, { ...good, property: 'liquid heat capacty' }, '.');
    expect(slip.errors.property).toMatch(/^Perhaps liquid heat capacity\? Allowed /);
    const unit = rowFaults(undefined, { ...good, unit: 'kJ/kg' }, '.');
    expect(Object.keys(unit.errors)).toEqual(['unit']);
  });

  it('sees what the other rows of the sheet make of it', () => {
    const row: Cell[] = ['brine', 'liquid heat capacity', '', 3, 'kJ/(kg K)', 0, 50, 'log', 1];
    expect(rowFaults(blockOf([row]), good, '.').errors.property).toMatch(/one row for each property/);
    const clash = rowFaults(undefined, { ...good, substance: 'water' }, '.');
    expect(clash.errors.substance).toMatch(/built-in substance water/);
  });

  it('keeps a row without a range as a warning', () => {
    const { errors, warnings } = rowFaults(undefined, { ...good, 'valid from': null, 'valid to': null }, '.');
    expect(errors).toEqual({});
    expect(warnings.join()).toMatch(/valid as far as the form itself goes/);
  });
});

describe('the hints of the form', () => {
  it('say how coefficients and units are written', () => {
    expect(coefficientsHint('table')).toContain('20:2.1');
    expect(coefficientsHint('')).toContain('A number');
    expect(unitHint('vapour pressure')).toContain('kPa; degC');
    expect(unitHint('heat of alpha-beta')).toBe('As kJ/kg');
    expect(unitHint('melting temperature')).toBe('As degC');
    expect(unitHint('acentric factor')).toBe('None');
    expect(unitHint('liquid heet')).toBe('As the property asks');
  });
});
