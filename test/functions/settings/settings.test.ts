import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { plainWords } from '../../../core/problem';
import { unitOf } from '../../../core/units/unitOf';
import { SETTINGS } from '../../../functions/settings/schema';
import {
  DEFAULT_SETTINGS,
  parseSettingsBlock,
  parseSettingsText,
  readSettingsBlock,
  settingsFor,
  settingsRows,
  settingsStamp,
  settingsText,
  type Settings,
} from '../../../functions/settings/settings';
import { problemOf } from '../../core/units/problemOf';

const OPTIONS = ['answer', 'kind', 'surface', 'at_pressure'];
const read = (text: string): Settings => parseSettingsText(text, DEFAULT_SETTINGS, OPTIONS);

describe('the defaults', () => {
  it('are the documented ones', () => {
    expect(settingsRows(DEFAULT_SETTINGS)).toEqual([
      ['Temperature', 'degC'],
      ['Pressure', 'kPa'],
      ['Barometer', '101.325 kPa'],
      ['Heat', 'kJ/kg'],
      ['Heat capacity', 'kJ/(kg K)'],
      ['Amount', 'kg'],
      ['Energy', 'kJ'],
      ['Flow', 'kg/h'],
      ['Power', 'kW'],
      ['Out of range', 'refuse'],
      ['Decimal separator', '.'],
    ]);
    expect(settingsRows(DEFAULT_SETTINGS).map(([, value]) => value)).toEqual(SETTINGS.map((row) => row.default));
  });

  it('every choice of the schema is read as it is written', () => {
    for (const row of SETTINGS) {
      for (const choice of row.choices) {
        const settings = read(`${row.key}=${choice}`);
        expect(settingsRows(settings).find(([label]) => label === row.label)?.[1]).toBe(choice);
      }
    }
  });
});

describe('a settings text', () => {
  it.each([
    ['temperature=K; heat=kJ/mol', 'K', 'kJ/mol'],
    [' Temperature = K ;; HEAT = kJ mol⁻¹ ; ', 'K', 'kJ/mol'],
    ['temperature=K\nheat=kJ/mol', 'K', 'kJ/mol'],
    ['temperature=K\r\nheat=kJ/mol\r\n', 'K', 'kJ/mol'],
  ])('%j', (text, temperature, heat) => {
    const { units } = read(text);
    expect([units.temperature.symbol, units.heat.symbol]).toEqual([temperature, heat]);
    expect(units.pressure).toBe(DEFAULT_SETTINGS.units.pressure);
  });

  it.each(['heat_capacity', 'Heat capacity', 'HEATCAPACITY', 'heat-capacity'])('takes %s for the same key', (key) => {
    expect(read(`${key}=J/(mol K)`).units.heatCapacity).toBe(unitOf('J/(mol K)'));
  });

  it('keeps options under the name that the function gave, with their words as they are', () => {
    expect(read('At Pressure = 2 bar; KIND=standard').options).toEqual({ at_pressure: '2 bar', kind: 'standard' });
    expect(parseSettingsText('kind=isobaric', read('kind=standard; answer=source'), OPTIONS).options).toEqual({
      kind: 'isobaric',
      answer: 'source',
    });
  });

  it('reads pressures as gauge where it says so, and the barometer', () => {
    const settings = read('pressure=kPa gauge; barometer=29.92 inHg');
    expect(settings.units.pressure).toMatchObject({ symbol: 'kPa gauge', gauge: true, factor: 1000 });
    // 29.92 · 3386.388640341 Pa (NIST SP 811: 3.386389 E+03 Pa to the inch of mercury)
    expect(settings.barometerPa).toBeCloseTo(101320.748, 3);
  });

  it('reads the decimal separator before the barometer, wherever it stands', () => {
    const settings = read('barometer=101,5 kPa; decimal=,');
    expect([settings.decimal, settings.barometerPa]).toEqual([',', 101500]);
    expect(settingsText(settings)).toContain('barometer=101,5 kPa');
    expect(read('decimal=comma').decimal).toBe(',');
  });

  it('gives the base itself where it says nothing', () => {
    expect(read('')).toBe(DEFAULT_SETTINGS);
    expect(read(' ; \n ;')).toBe(DEFAULT_SETTINGS);
  });

  it('round-trips any settings', () => {
    const rows = SETTINGS.filter((row) => row.choices.length > 0 && row.kind !== 'decimal');
    const pairs = fc.record(Object.fromEntries(rows.map((row) => [row.key, fc.constantFrom(...row.choices)])));
    const barometer = fc.integer({ min: 1, max: 200_000 });
    fc.assert(
      fc.property(pairs, barometer, fc.constantFrom('.', ','), (chosen, pa, decimal) => {
        const text = Object.entries(chosen).map(([key, value]) => `${key}=${value}`);
        const settings = read([...text, `barometer=${pa} Pa`, `decimal=${decimal}`, 'kind=standard'].join('; '));
        expect(parseSettingsText(settingsText(settings), DEFAULT_SETTINGS, OPTIONS)).toEqual(settings);
        expect(parseSettingsBlock(settingsRows(settings), DEFAULT_SETTINGS)).toEqual({ ...settings, options: {} });
        expect(settings.barometerPa).toBe(pa);
      }),
      { seed: 5, numRuns: 300 },
    );
  });

  it.each([
    ['tempreature=K', 'settings key tempreature', 'the key "tempreature"', 'temperature'],
    ['surfce=ice', 'settings key surfce', 'the key "surfce"', 'surface'],
    ['kelp=1', 'settings key kelp', 'the key "kelp"', undefined],
    ['temperature=K; Temperature=degC', 'settings key Temperature', 'it a second time, as "degC"', undefined],
    ['temperature', 'settings', '"temperature"', undefined],
    ['=K', 'settings', '"=K"', undefined],
    ['temperature=', 'settings key temperature', 'nothing', undefined],
    ['temperature=F', 'settings key temperature', '"F", which is ambiguous', undefined],
    ['heat=kJ', 'settings key heat', '"kJ", a unit of energy', undefined],
    ['heat=kJ/kgg', 'settings key heat', '"kJ/kgg"', 'kJ/kg'],
    ['barometer=101.325', 'settings key barometer', '"101.325"', undefined],
    ['barometer=1 bar gauge', 'settings key barometer', '"1 bar gauge"', undefined],
    ['barometer=0 Pa', 'settings key barometer', '"0 Pa"', undefined],
    ['decimal=,; barometer=101.325 kPa', 'settings key barometer', '"101.325 kPa"', undefined],
    ['out_of_range=extnd', 'settings key out_of_range', '"extnd"', 'extend'],
    ['decimal=;', 'settings key decimal', 'nothing', undefined],
    ['decimal=x', 'settings key decimal', '"x"', undefined],
  ])('refuses %j', (text, argument, received, near) => {
    const problem = problemOf(() => read(text));
    expect(problem).toMatchObject({ argument, received });
    expect(problem.nearest).toBe(near);
  });

  it('refuses an option that this function does not know', () => {
    expect(problemOf(() => parseSettingsText('kind=standard', DEFAULT_SETTINGS)).allowed).not.toContain('kind');
  });
});

describe('a Units block', () => {
  it('takes blank rows, and texts around the words, as they come', () => {
    const settings = parseSettingsBlock(
      [
        [' Temperature ', ' K '],
        ['', ''],
        [null, null],
        [0, 0],
        ['heat capacity', 'J/(mol K)'],
      ],
      DEFAULT_SETTINGS,
    );
    expect(settings.units.temperature.symbol).toBe('K');
    expect(settings.units.heatCapacity.symbol).toBe('J/(mol K)');
  });

  const cell = (row: number, column: 0 | 1, text: string): object => ({ row, column, text });
  it.each([
    [
      [
        ['Temperature', 'K'],
        ['Presure', 'kPa'],
      ],
      cell(1, 0, 'Presure'),
      /^Units row 2 \(Presure\): .*nearest: pressure$/,
    ],
    [
      [
        ['Temperature', 'K'],
        ['Pressure', ''],
      ],
      cell(1, 1, ''),
      /^Units row 2 \(Pressure\): allowed a value, as kPa, .*nothing$/,
    ],
    [
      [
        ['Temperature', 'K'],
        ['Pressure', 0],
      ],
      cell(1, 1, '0'),
      /^Units row 2 \(Pressure\): .*nothing$/,
    ],
    [
      [['Temperature', 'Kelvinn']],
      cell(0, 1, 'Kelvinn'),
      /^Units row 1 \(Temperature\): .*"Kelvinn"; nearest: kelvin$/,
    ],
    [[['Pressure', { error: '#REF!' }]], cell(0, 1, '#REF!'), /^Units row 1 \(Pressure\): .*"#REF!"$/],
    [[['Pressure', { code: '#N/A' }]], cell(0, 1, '#N/A'), /"#N\/A"$/],
    [[['', 'kPa']], cell(0, 0, ''), /^Units row 1: allowed a label beside "kPa"; received a blank$/],
    [
      [
        ['Heat', 'kJ/kg'],
        ['Heat', 'kJ/kg'],
      ],
      cell(1, 0, 'Heat'),
      /^Units row 2 \(Heat\): .*a second time/,
    ],
    [[['Barometer', 101.325]], cell(0, 1, '101.325'), /^Units row 1 \(Barometer\): .*"101.325"$/],
    [
      [['Temperature', 'K', 'a note']],
      cell(0, 1, 'K'),
      /^Units row 1 \(Temperature\): allowed two columns.*3 columns$/,
    ],
    [[['kind', 'standard']], cell(0, 0, 'kind'), /^Units row 1 \(kind\): .*the key "kind"/],
  ] as [unknown[][], object, RegExp][])('names the damaged cell of %j', (values, place, message) => {
    const { fault } = readSettingsBlock(values, DEFAULT_SETTINGS);
    expect(fault).toMatchObject(place);
    const problem = problemOf(() => parseSettingsBlock(values, DEFAULT_SETTINGS));
    expect(plainWords(problem)).toMatch(message);
    expect(fault?.message).toBe(
      problem.nearest === undefined ? problem.allowed : `${problem.allowed}; nearest: ${problem.nearest}`,
    );
  });

  it('tells which settings have no row', () => {
    const rows = settingsRows(DEFAULT_SETTINGS);
    expect(readSettingsBlock(rows, DEFAULT_SETTINGS)).toEqual({ settings: DEFAULT_SETTINGS, missing: [] });
    const some = readSettingsBlock(rows.slice(1, 10), DEFAULT_SETTINGS);
    expect(some.missing).toEqual(['Temperature', 'Decimal separator']);
  });
});

describe('settingsFor', () => {
  const block = (): string[][] => settingsRows(read('temperature=K')).map((row) => [...row]);

  it('puts every part onto the base, from left to right', () => {
    const settings = settingsFor(
      [block(), [['heat=kJ/mol; kind=standard']], 'temperature=degF'],
      DEFAULT_SETTINGS,
      OPTIONS,
    );
    expect(settings.units.temperature.symbol).toBe('degF');
    expect(settings.units.heat.symbol).toBe('kJ/mol');
    expect(settings.options).toEqual({ kind: 'standard' });
  });

  it('does not count blanks, in whatever form they come', () => {
    expect(settingsFor([], DEFAULT_SETTINGS, OPTIONS)).toBe(DEFAULT_SETTINGS);
    for (const blank of [null, undefined, '', 0, [[null]], [['']], [[0]], [[''], [null]]]) {
      expect(settingsFor([blank], DEFAULT_SETTINGS, OPTIONS), JSON.stringify(blank)).toBe(DEFAULT_SETTINGS);
    }
  });

  it('reads a column of texts, each by itself', () => {
    const settings = settingsFor([[['heat=kJ/mol'], [null], ['kind=standard']]], DEFAULT_SETTINGS, OPTIONS);
    expect([settings.units.heat.symbol, settings.options['kind']]).toEqual(['kJ/mol', 'standard']);
  });

  it('gives the same object for the same cells, and another as soon as one cell differs', () => {
    const first = settingsFor([block(), 'kind=standard'], DEFAULT_SETTINGS, OPTIONS);
    expect(settingsFor([block(), 'kind=standard'], DEFAULT_SETTINGS, OPTIONS)).toBe(first);
    const cells = block();
    expect(settingsFor([cells, 'kind=standard'], DEFAULT_SETTINGS, OPTIONS)).toBe(first);
    const row = cells[3];
    if (row !== undefined) row[1] = 'J/g';
    const second = settingsFor([cells, 'kind=standard'], DEFAULT_SETTINGS, OPTIONS);
    expect(second.units.heat.symbol).toBe('J/g');
    expect(settingsFor([block(), 'kind=standard'], DEFAULT_SETTINGS, OPTIONS)).toBe(first);
    expect(settingsFor([block(), 'kind=isobaric'], DEFAULT_SETTINGS, OPTIONS).options['kind']).toBe('isobaric');
  });

  it('does not mix up bases or lists of options', () => {
    const other = read('heat=J/g');
    expect(settingsFor(['temperature=K'], other, OPTIONS).units.heat.symbol).toBe('J/g');
    expect(settingsFor(['temperature=K'], DEFAULT_SETTINGS, OPTIONS).units.heat.symbol).toBe('kJ/kg');
    expect(settingsFor(['kind=standard'], DEFAULT_SETTINGS, OPTIONS).options['kind']).toBe('standard');
    expect(problemOf(() => settingsFor(['kind=standard'], DEFAULT_SETTINGS, ['answer'])).received).toBe(
      'the key "kind"',
    );
  });

  it('forgets the oldest rather than growing, and never answers with the wrong one', () => {
    const texts = Array.from({ length: 40 }, (_, i) => `at_pressure=${i + 1} kPa`);
    for (let round = 0; round < 3; round++) {
      for (const text of texts) {
        expect(`at_pressure=${settingsFor([text], DEFAULT_SETTINGS, OPTIONS).options['at_pressure'] ?? ''}`).toBe(text);
      }
    }
  });

  it('refuses what is no settings argument, again and again', () => {
    for (let i = 0; i < 2; i++) {
      expect(problemOf(() => settingsFor([5], DEFAULT_SETTINGS, OPTIONS)).received).toBe('5');
      expect(problemOf(() => settingsFor([[['a', 'b', 'c']]], DEFAULT_SETTINGS, OPTIONS)).received).toBe('3 columns');
      expect(problemOf(() => settingsFor(['foo=1'], DEFAULT_SETTINGS, OPTIONS)).received).toBe('the key "foo"');
    }
  });
});

describe('the stamp', () => {
  it('changes with any unit setting and with the edition, not with options', () => {
    const stamp = settingsStamp(DEFAULT_SETTINGS, '1');
    expect(stamp).toMatch(/^[0-9a-f]{16}$/);
    expect(settingsStamp(read('kind=standard'), '1')).toBe(stamp);
    const others = SETTINGS.map((row) => {
      const value = row.kind === 'barometer' ? '100 kPa' : (row.choices[1] ?? '');
      return settingsStamp(read(`${row.key}=${value}`), '1');
    });
    expect(new Set([stamp, settingsStamp(DEFAULT_SETTINGS, '2'), ...others]).size).toBe(SETTINGS.length + 2);
  });
});
