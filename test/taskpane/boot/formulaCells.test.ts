import { describe, expect, it } from 'vitest';
import { formulaCells, OUR_FORMULA, readsStore } from '../../../taskpane/boot/formulaCells';
import { textHash } from '../../../taskpane/boot/textHash';

describe('formulas that rest on the settings store', () => {
  it.each([
    ['=LATENTRY.LATENT("water","fusion")', true],
    ['=latentry.latent("water","fusion",,latentry_UNITS)', false],
    ['=LATENTRY.HEAT("water",1,2,,Latentry_units)+LATENTRY.EDITION()', true],
    ['=_xldudf_LATENTRY_LATENT("water","fusion")', true],
    ['=LATENTRY.SOURCE("Latentry_units","x")', true],
    ['=SUM(Latentry_units)', false],
    ['="LATENTRY.X"', false],
    ['=MYLATENTRY.X()', false],
    ['=LATENTRY.TOUNITS(A1,"K",Latentry_units_old)', true],
  ])('%s: %s', (formula, expected) => {
    expect(readsStore(formula)).toBe(expected);
  });

  it('knows our formulas by their namespace only', () => {
    expect(OUR_FORMULA.test('=1+LATENTRY.HEAT(A1)')).toBe(true);
    expect(OUR_FORMULA.test('=SUM(Latentry_units)')).toBe(false);
  });

  it('joins cells below each other', () => {
    const formulas = [
      ['=x', ''],
      ['=x', '=x'],
      ['', ''],
      ['=x', '=y'],
    ];
    const values = formulas.map((row) => row.map(() => null));
    const block = { ref: { sheet: 'S', address: 'B3:C6' }, values, formulas };
    expect(formulaCells(block, (text) => text === '=x').map(({ address }) => address)).toEqual(['B3:B4', 'B6', 'C4']);
  });
});

describe('textHash', () => {
  // Published test vectors of 32-bit FNV-1a: draft-eastlake-fnv, appendix C ("", "a", "foobar").
  it.each([
    ['', '811c9dc5'],
    ['a', 'e40c292c'],
    ['foobar', 'bf9cf968'],
  ])('of "%s" is %s', (text, expected) => {
    expect(textHash(text)).toBe(expected);
  });
});
