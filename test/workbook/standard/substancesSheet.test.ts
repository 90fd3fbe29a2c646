import { beforeAll, describe, expect, it } from 'vitest';
import { entries } from '../../../core/catalogue/entries';
import { readHouse } from '../../../core/house/readHouse';
import { HOUSE_PROPERTIES, readProperty } from '../../../core/house/houseProperty';
import { heat } from '../../../functions/heat';
import { houseStore } from '../../../functions/house/store';
import { readHouseBlock } from '../../../functions/house/readHouseBlock';
import { DEFAULT_SETTINGS, settingsRows } from '../../../functions/settings/settings';
import { namedBlock } from '../../../workbook/engine/namedBlock';
import { standardBook } from '../../../workbook/standard/standardBook';
import { call, cellOf } from '../../functions/host';

const book = standardBook();
const block = namedBlock(book, 'latentry_substances');
if (block?.area === undefined) throw new Error('no block of substances');
const { values, area } = block;
const sheet = book.sheets.find(({ name }) => name === 'Substances');

describe('the sheet of substances', () => {
  it('is the block Latentry_substances with its header and room for fifty rows', () => {
    expect(area).toEqual({ top: 7, left: 0, rows: 51, columns: 9 });
    expect(
      values
        .slice(7)
        .flat()
        .every((value) => value === null),
    ).toBe(true);
  });

  it('holds a demo without a fault, each row said to be invented', () => {
    const house = readHouse(values, { decimal: '.', firstRow: area.top + 1, builtIn: entries });
    expect(house.faults).toEqual([]);
    expect(house.entries.map(({ name }) => name)).toEqual(['kelp concentrate', 'kelp wax']);
    for (const row of values.slice(1, 7)) expect(row[7]).toBe('demo, invented for this workbook');
  });

  it('offers properties that can be read, and forms, from the hidden lists', () => {
    const lists = book.sheets.find(({ name }) => name === 'Lists')?.cells ?? {};
    for (const { range, source = '', values: choices } of sheet?.lists ?? []) {
      const [, column = '', last = ''] = /^Lists!\$([A-Z]+)\$2:\$[A-Z]+\$(\d+)$/.exec(source) ?? [];
      expect(range).toMatch(/^[BC]9:[BC]58$/);
      const held = Array.from({ length: Number(last) - 1 }, (_, i) => lists[`${column}${i + 2}`]?.value);
      expect(held).toEqual(choices);
    }
    for (const words of HOUSE_PROPERTIES) expect(readProperty(words)).toBeDefined();
  });
});

describe('its two answers', () => {
  beforeAll(() => {
    houseStore.publish(readHouseBlock({ values, firstRow: area.top + 1, decimal: '.' }));
  });

  it.each([
    // Choi and Okos (1986) at 35 °C, the middle of the path: 0.72 water, 0.17 carbohydrate, 0.04 protein, 0.02 fibre, 0.05 ash
    // with 4179.7, 1610.2, 2048.9, 1904.3, 1154.2 J/(kg K); the curve bends by less than 2 J/(kg K) over it.
    ['D5', 50 * (0.72 * 4.1797 + 0.17 * 1.6102 + 0.04 * 2.0489 + 0.02 * 1.9043 + 0.05 * 1.1542), 0.1],
    // 38 K of the solid between 2.0 and 2.45 kJ/(kg K), then 180 kJ/kg.
    ['D6', 38 * 2.215 + 180, 38 * 0.225],
  ])('%s', (address, expected, within) => {
    const formula = sheet?.cells[address]?.formula ?? '';
    const [, substance, from, to] =
      /^=LATENTRY\.HEAT\("(.+?)","(.+?)","(.+?)",,Latentry_units,Latentry_substances\)$/.exec(formula) ?? [];
    const settings = [settingsRows(DEFAULT_SETTINGS), values];
    const value = cellOf(call(heat, [substance, from, to, undefined], settings));
    expect(Math.abs(Number(value) - expected)).toBeLessThanOrEqual(within);
  });
});
