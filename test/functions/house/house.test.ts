import { beforeEach, describe, expect, it } from 'vitest';
import { HOUSE_HEADS } from '../../../core/house/houseRow';
import { constant } from '../../../functions/constant';
import { currentRegistry, takeMissed } from '../../../functions/house/currentRegistry';
import { isHouseBlock } from '../../../functions/house/isHouseBlock';
import { readHouseBlock } from '../../../functions/house/readHouseBlock';
import { createHouseStore, houseStore } from '../../../functions/house/store';
import { heat } from '../../../functions/heat';
import { heatCap } from '../../../functions/heatCap';
import { latent } from '../../../functions/latent';
import { settingsRows, DEFAULT_SETTINGS } from '../../../functions/settings/settings';
import { settingsStore } from '../../../functions/settings/store';
import { call, cellOf, faultOf } from '../host';

type Row = (string | number | null)[];

const row = (
  substance: string,
  property: string,
  form: string,
  coefficients: string | number,
  unit: string,
  from: number | null = null,
  to: number | null = null,
): Row => [substance, property, form, coefficients, unit, from, to, 'plant laboratory', 'B'];

const wax = (cp: string | number): Row[] => [
  [...HOUSE_HEADS],
  row('kelp wax', 'melting temperature', '', 58, 'degC'),
  row('kelp wax', 'heat of fusion', '', 180, 'kJ/kg'),
  row('kelp wax', 'solid heat capacity', '', 2, 'kJ/(kg K)', 0, 58),
  row('kelp wax', 'liquid heat capacity', '', cp, 'kJ/(kg K)', 58, 110),
];

const publish = (values: Row[]): boolean => houseStore.publish(readHouseBlock({ values, firstRow: 4, decimal: '.' }));

const value = (
  fn: (...args: never[]) => unknown,
  args: readonly unknown[],
  settings: readonly unknown[] = [],
): unknown => cellOf(call(fn, args, settings));

beforeEach(() => {
  settingsStore.publish({ state: 'absent' });
  houseStore.publish({ state: 'absent' });
  takeMissed();
});

describe('the store', () => {
  it('tells of changes only, and counts them', () => {
    const store = createHouseStore();
    const seen: string[] = [];
    const stop = store.subscribe(({ state }) => seen.push(state));
    const state = readHouseBlock({ values: wax(2.1), firstRow: 4, decimal: '.' });
    expect([store.publish(state), store.publish({ ...state }), store.version()]).toEqual([true, false, 1]);
    expect(store.publish(readHouseBlock({ values: wax(2.2), firstRow: 4, decimal: '.' }))).toBe(true);
    expect(store.publish({ state: 'broken', text: '#REF!' })).toBe(true);
    expect(store.publish({ state: 'broken', text: '#REF!' })).toBe(false);
    stop();
    store.publish({ state: 'absent' });
    expect(seen).toEqual(['ready', 'ready', 'broken']);
    expect(store.version()).toBe(4);
  });

  it('counts the place and the decimal separator too, on which messages and numbers rest', () => {
    const stamp = (firstRow: number, decimal: '.' | ','): string =>
      readHouseBlock({ values: wax(2.1), firstRow, decimal }).stamp;
    expect(new Set([stamp(4, '.'), stamp(5, '.'), stamp(4, ',')]).size).toBe(3);
  });
});

describe('a substance of the workbook', () => {
  it('works in functions like a built-in one, in any unit of mass', () => {
    publish(wax(2.1));
    expect(value(heatCap, ['Kelp wax', 'liquid', 70])).toBeCloseTo(2.1, 12);
    expect(value(latent, ['kelp wax', 'melting'], ['heat=kcal_th/kg'])).toBeCloseTo(180 / 4.184, 9);
    // 38 K of the solid, the heat of fusion, 12 K of the liquid.
    expect(value(heat, ['kelp wax', 20, 70])).toBeCloseTo(38 * 2 + 180 + 12 * 2.1, 9);
    expect(value(constant, ['kelp wax', 'melting temperature'])).toBeCloseTo(58, 9);
  });

  it('without a molar mass refuses units of moles, in words', () => {
    publish(wax(2.1));
    const { code, message } = faultOf(() => call(latent, ['kelp wax', 'melting'], ['heat=kJ/mol']));
    expect(code).toBe('#VALUE!');
    expect(message).toContain('molar mass');
    expect(message).toContain('a material without one');
  });

  it('answers from edited rows at once', () => {
    publish(wax(2.1));
    expect(value(heatCap, ['kelp wax', 'liquid', 70])).toBeCloseTo(2.1, 12);
    publish(wax(2.4));
    expect(value(heatCap, ['kelp wax', 'liquid', 70])).toBeCloseTo(2.4, 12);
    houseStore.publish({ state: 'absent' });
    expect(faultOf(() => call(heatCap, ['kelp wax', 'liquid', 70])).code).toBe('#VALUE!');
  });

  it('answers with its row where that cannot be read, and only there', () => {
    publish(wax('much'));
    const { code, message } = faultOf(() => call(heatCap, ['kelp wax', 'liquid', 70]));
    expect(code).toBe('#VALUE!');
    expect(message).toMatch(/^Substances row 8 \(kelp wax, liquid heat capacity\), coefficients: /);
    expect(value(latent, ['kelp wax', 'melting'])).toBeCloseTo(180, 9);
    expect(value(heatCap, ['water', 'liquid', 70])).toBeGreaterThan(4);
  });

  it('is out of range as a built-in one is', () => {
    publish(wax(2.1));
    const { code, message } = faultOf(() => call(heatCap, ['kelp wax', 'liquid', 150]));
    expect(code).toBe('#N/A');
    expect(message).toBe('temperature 150 degC is outside [58 degC, 110 degC] for heat capacity of liquid kelp wax');
  });

  it('names the row that would give a missing piece', () => {
    publish(wax(2.1));
    const { code, message } = faultOf(() => call(latent, ['kelp wax', 'vaporization', 90]));
    expect([code, message.includes('kelp wax')]).toEqual(['#N/A', true]);
  });
});

describe('the registry in force', () => {
  it('is made once for a state', () => {
    publish(wax(2.1));
    expect(currentRegistry()).toBe(currentRegistry());
    expect(currentRegistry().entry('kelp wax')?.group).toBe('house');
  });

  it('says that the workbook is not read yet, and remembers that it was asked', () => {
    houseStore.publish({ state: 'unread' });
    expect(currentRegistry().find('water').name).toBe('water');
    expect(takeMissed()).toBe(false);
    const { code, message } = faultOf(() => call(heatCap, ['kelp wax', 'liquid', 70]));
    expect(code).toBe('#N/A');
    expect(message).toContain('not read yet');
    expect([takeMissed(), takeMissed()]).toEqual([true, false]);
  });

  it('says that the name of the block leads nowhere', () => {
    houseStore.publish({ state: 'broken', text: '#REF!' });
    expect(faultOf(() => call(heatCap, ['kelp wax', 'liquid', 70])).message).toContain('Latentry_substances');
    expect(value(heatCap, ['water', 'liquid', 70])).toBeGreaterThan(4);
  });
});

describe('the block among the settings of a formula', () => {
  const long = [...wax(2.1), ...Array.from({ length: 50 }, () => new Array<null>(9).fill(null))];

  it('is known by its header', () => {
    expect(isHouseBlock(long)).toBe(true);
    expect(isHouseBlock(settingsRows(DEFAULT_SETTINGS))).toBe(false);
    expect([isHouseBlock('x'), isHouseBlock([]), isHouseBlock([['Substance', 'Property']])]).toEqual([
      false,
      false,
      false,
    ]);
  });

  it('sets nothing and takes the place of no settings', () => {
    publish(wax(2.1));
    const units = settingsRows({ ...DEFAULT_SETTINGS });
    for (const settings of [[long], [units, long], [long, units], [long, 'heat_capacity=J/(kg K)']]) {
      const factor = settings.includes('heat_capacity=J/(kg K)') ? 1000 : 1;
      expect(value(heatCap, ['kelp wax', 'liquid', 70], settings)).toBeCloseTo(2.1 * factor, 9);
    }
  });

  it('leaves the settings of the workbook in force, long as it is', () => {
    publish(wax(2.1));
    const settings = { ...DEFAULT_SETTINGS, outOfRange: 'extend' as const };
    settingsStore.publish({ state: 'ready', settings, stamp: 'extend' });
    expect(value(heatCap, ['kelp wax', 'liquid', 150], [long])).toBeCloseTo(2.1, 12);
  });

  it('may stand where an optional quantity is left out', () => {
    publish(wax(2.1));
    expect(cellOf(call(latent, ['kelp wax', 'melting', long]))).toBeCloseTo(180, 9);
  });
});
