import { CellValueType } from '@univerjs/core';
import { describe, expect, it } from 'vitest';
import { emptySheet } from '../../../workbook/emptySheet';
import type { Book } from '../../../workbook/book';
import { bookToGrid } from '../../../workbook/page/bookToGrid';
import { cellValue, gridCell } from '../../../workbook/page/grid/cellValue';
import { fitNumber } from '../../../workbook/page/grid/fitNumber';
import { bookStyle, gridStyle } from '../../../workbook/page/grid/gridStyle';
import { bookLists, isOpen, listRule } from '../../../workbook/page/grid/listRule';
import { charactersOfPixels, pixelsOfCharacters } from '../../../workbook/page/grid/measures';
import { addressOf } from '../../../workbook/page/grid/rangeOf';
import { styleKeys } from '../../../workbook/page/grid/styleKeys';
import { standardStyles } from '../../../workbook/standard/styles';

describe('cells of the grid', () => {
  it.each([12.5, 0, true, false, 'kelp', '12.5', '=A1', 'TRUE', '1/2', '#N/A as text', null])(
    'keeps %j as it is',
    (value) => expect(cellValue(gridCell(value))).toBe(value),
  );

  it('keeps error codes apart from texts that look like one', () => {
    expect(cellValue(gridCell({ error: '#N/A' }))).toEqual({ error: '#N/A' });
    expect(cellValue({ v: '#N/A', t: CellValueType.FORCE_STRING })).toBe('#N/A');
  });

  it('takes an empty text from a formula only', () => {
    expect(cellValue({ v: '', f: '=""' })).toBe('');
    expect(cellValue({ v: '' })).toBeNull();
  });
});

describe('numbers in the general format', () => {
  it.each([
    [2357.6545202949833, 9, '2357.6545'],
    [60, 9, '60'],
    [-0.0023742958951887414, 10, '-0.0023743'],
    [0.1 + 0.2, 10, '0.3'],
    [2357654.520303868, 4, '2360000'],
  ])('%d in %d characters is %s', (value, characters, text) => expect(fitNumber(value, characters)).toBe(text));
});

describe('looks', () => {
  it.each(Object.entries(standardStyles))('"%s" of the standard workbook survives the grid', (_key, style) => {
    const kept = bookStyle(gridStyle(style));
    expect(gridStyle(kept)).toEqual(gridStyle(style));
  });

  it('finds the key again, the format of a single cell beside it', () => {
    const keys = styleKeys({ styles: { warm: { fill: 'FFF4DC', bold: true } } });
    expect(keys.of(gridStyle({ fill: 'FFF4DC', bold: true }))).toEqual({ style: 'warm' });
    expect(keys.of(gridStyle({ fill: 'FFF4DC', bold: true, format: '0.0' }))).toEqual({ style: 'warm', format: '0.0' });
    expect(keys.of(gridStyle({ italic: true }))).toEqual({ style: 'look1' });
    expect(keys.styles()).toEqual({ warm: { fill: 'FFF4DC', bold: true }, look1: { italic: true } });
  });
});

describe('lists of choices', () => {
  const back = (values: string[]) => bookLists(listRule({ range: 'B4:B6', values }, 'x')!, addressOf);
  it('keeps choices, also those that hold a comma or a quote', () => {
    expect(back(['kJ/kg', 'J/g'])).toEqual([{ range: 'B4:B6', values: ['kJ/kg', 'J/g'] }]);
    expect(back(['.', ',', 'a "b"'])).toEqual([{ range: 'B4:B6', values: ['.', ',', 'a "b"'] }]);
  });
});

describe('lists of usual choices', () => {
  it('stay open to other entries in the grid and back', () => {
    const rule = listRule({ range: 'C9:C20', values: ['table', 'polynomial'], open: true }, 'x');
    expect(rule && isOpen(rule)).toBe(true);
    expect(bookLists(rule!, addressOf)).toEqual([{ range: 'C9:C20', values: ['table', 'polynomial'], open: true }]);
    expect(isOpen(listRule({ range: 'B4', values: ['kJ', 'J'] }, 'y')!)).toBe(false);
  });
});

describe('a book for the grid', () => {
  const book: Book = {
    sheets: [
      {
        ...emptySheet('Data'),
        cells: {
          A1: { value: 3 },
          B1: { value: 6, formula: '=A1*2' },
          C1: { value: 1, formula: '=LATENTRY.LATENT("water","vaporization",A1)' },
          D1: { value: 1, formula: '=A1:A2', spill: 'D1:D2' },
          D2: { value: 2 },
        },
        columnWidths: { B: 20 },
      },
    ],
    names: [{ name: 'Twice', formula: 'Data!$B$1' }],
    styles: {},
    properties: {},
  };
  const sheet = bookToGrid(book, 'b', ['s']).sheets['s']!;

  it('keeps the value of a plain formula, and leaves ours and spilling ones to be calculated', () => {
    expect(sheet.cellData?.[0]?.[1]).toMatchObject({ f: '=A1*2', v: 6 });
    expect(sheet.cellData?.[0]?.[2]).toEqual({ f: '=LATENTRY.LATENT("water","vaporization",A1)' });
    expect(sheet.cellData?.[0]?.[3]).toEqual({ f: '=A1:A2' });
    expect(sheet.cellData?.[1]?.[3]).toEqual({});
  });

  it('gives widths in pixels that come back as the same characters', () => {
    expect(sheet.columnData?.[1]).toEqual({ w: 145 });
    for (const characters of [2, 8.43, 20, 64.5]) {
      // A pixel is a seventh of a character; rounding to whole pixels is at most half of one away.
      expect(Math.abs(charactersOfPixels(pixelsOfCharacters(characters)) - characters)).toBeLessThanOrEqual(
        0.5 / 7 + 0.005,
      );
    }
  });
});
