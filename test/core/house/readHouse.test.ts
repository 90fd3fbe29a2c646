import { describe, expect, it } from 'vitest';
import { entries } from '../../../core/catalogue/entries';
import { houseRegistry } from '../../../core/house/houseRegistry';
import { HOUSE_HEADS } from '../../../core/house/houseRow';
import { HOUSE_PROPERTIES, readProperty } from '../../../core/house/houseProperty';
import { readHouse } from '../../../core/house/readHouse';
import { FIRST_ROW, houseOf, problemOf, row, substanceOf, WASH, type Row } from './rows';

const errors = (rows: readonly Row[]): string[] =>
  houseOf(rows)
    .faults.filter(({ severity }) => severity === 'error')
    .map(({ message }) => message);

describe('properties', () => {
  it.each([
    ['Heat of melting', { is: 'heat', change: 'fusion', kind: 'isobaric' }],
    ['latent heat of vaporisation', { is: 'heat', change: 'vaporization', kind: 'coexistence' }],
    ['enthalpy of vaporization (standard)', { is: 'heat', change: 'vaporization', kind: 'standard' }],
    ['heat of alpha-beta', { is: 'heat', change: 'alpha-beta', kind: 'isobaric' }],
    ['alpha-beta temperature', { is: 'transition', change: 'alpha-beta' }],
    ['freezing point', { is: 'transition', change: 'fusion' }],
    ['boiling temperature at 10 kPa', { is: 'transition', change: 'vaporization', at: '10 kPa' }],
    ['ideal gas heat capacity', { is: 'heat capacity', phase: 'gas' }],
    ['heat capacity of the vapour', { is: 'heat capacity', phase: 'gas' }],
    ['solid alpha heat capacity', { is: 'heat capacity', phase: 'solid', form: 'alpha' }],
    ['saturation pressure', { is: 'pressure', over: 'liquid' }],
    ['sublimation pressure', { is: 'pressure', over: 'solid' }],
    ['Solid composition', { is: 'composition', phase: 'solid' }],
    ['Critical  temperature', { is: 'constant', item: 'critical temperature' }],
    ['replaces built-in', { is: 'replaces built-in' }],
  ])('%s', (text, expected) => {
    expect(readProperty(text)).toMatchObject(expected);
  });

  it.each(['heat capacity', 'heat of friction', 'heat of alpha-alpha', 'melting temperature at 3 bar', 'colour', ''])(
    '%j is none',
    (text) => {
      expect(readProperty(text)).toBeUndefined();
    },
  );

  it('knows every property of the list', () => {
    for (const words of HOUSE_PROPERTIES) expect(readProperty(words), words).toBeDefined();
  });
});

describe('the block', () => {
  const brine = row('liquid heat capacity', '', 3.1, 'kJ/(kg K)', -10, 60, 'brine');

  it('may have a header, blank rows and blank cells of every sort', () => {
    const blank = [null, '', null, '', null, null, null, null, null];
    const house = houseOf([blank, HOUSE_HEADS, blank, brine, blank]);
    expect(house.faults).toEqual([]);
    expect(house.entries.map(({ name }) => name)).toEqual(['brine']);
  });

  it('reads ranges in the unit of their head, and columns in the order of the header', () => {
    const head = ['Property', 'Substance', 'Remark', 'Value', 'Unit', 'Valid to / K', 'Valid from / K'];
    const line = ['liquid heat capacity', 'brine', 'from the still', 3.1, 'kJ/(kg K)', 333.15, 263.15];
    const house = readHouse([head, line], { decimal: '.', firstRow: 1, builtIn: entries });
    const curve = house.entries[0]?.make().heatCapacity('liquid', 1e5);
    expect([curve?.from, curve?.to, curve?.at(300)]).toEqual([263.15, 333.15, 3100]);
  });

  it('has no substances where it is empty', () => {
    expect(houseOf([]).entries).toEqual([]);
    expect(houseOf([HOUSE_HEADS]).faults).toEqual([]);
  });

  it('reads numbers of texts with the decimal separator in force', () => {
    const line = row(
      'liquid heat capacity',
      'polynomial in degC',
      '3,1; 0,002',
      'kJ/(kg K)',
      '-10,5',
      '60 degC',
      'brine',
    );
    const curve = houseOf([line], ',').entries[0]?.make().heatCapacity('liquid', 1e5);
    expect(curve?.from).toBeCloseTo(262.65, 9);
    expect(curve?.at(283.15)).toBeCloseTo(3120, 9);
    expect(errors([line])[0]).toMatch(
      /^Substances row 5 \(brine, liquid heat capacity\), coefficients: .*received "3,1"/,
    );
  });
});

describe('a row that cannot be read', () => {
  it.each([
    [
      row('liquid heat capacity', 'polinomial', 3, 'kJ/(kg K)', 0, 9),
      /, form: allowed constant, polynomial, table; received "polinomial"; nearest: polynomial/,
    ],
    [row('liquid heat capacity', '', 'three', 'kJ/(kg K)', 0, 9), /, coefficients: .*received "three"/],
    [row('liquid heat capacity', '', 3, 'kJ/kg', 0, 9), /, unit: .*received "kJ\/kg", a unit of heat per amount/],
    [row('liquid heat capacity', '', 3, '', 0, 9), /, unit: allowed a unit, as kJ\/\(kg K\); received nothing/],
    [
      row('liquid heat capacity', '', 3, 'J/(mol K)', 0, 9),
      /, unit: allowed a unit of mass, as kJ\/kg, or a row "molar mass"/,
    ],
    [row('liquid heat capacity', '', 3, 'kJ/(kg K)', 9, 0), /, valid to: .*received 0/],
    [row('liquid heat capacity', '', 3, 'kJ/(kg K)', 'cold', 9), /, valid from: .*received "cold"/],
    [
      row('liquid heat capacity', 'polynomial', '3; 0.01', 'kJ/(kg K)'),
      /, valid from: .*no end of its own; received nothing/,
    ],
    [
      row('liquid heat capacity', 'polynomial', '-3; 0.001', 'kJ/(kg K)', 0, 9),
      /, coefficients: .*above 0 over its range/,
    ],
    [row('liquid heat capacity', 'table', '20:2.1; 10:2.2', 'kJ/(kg K)'), /, coefficients: .*temperatures that rise/],
    [
      row('liquid heat capacity', 'table', '20:2.1; 40:2.2', 'kJ/(kg K)', 0, 40),
      /, valid from: allowed within \[293.15, 313.15\] K/,
    ],
    [row('liquid heat capacity', 'table', '20:2.1; 40', 'kJ/(kg K)'), /, coefficients: .*received "40"/],
    [row('heat of vaporization', 'Watson', '846; 351', 'kJ/kg'), /, coefficients: .*received no critical temperature/],
    [
      row('heat of vaporization', 'Watson', '846; 600; 514', 'kJ/kg'),
      /, coefficients: .*below the critical one, 514 K; received 600 K/,
    ],
    [row('vapour pressure', 'Antoine', '7; 1500; 230', 'kPa', 0, 90), /, unit: .*received "kPa"/],
    [
      row('vapour pressure', 'Antoine', '7; 1500; 230', 'kPa gauge; degC', 0, 90),
      /, unit: allowed a unit of absolute pressure/,
    ],
    [row('vapour pressure', 'Antoine', '7; -1500; 230', 'kPa; degC', 0, 90), /, coefficients: allowed a B above 0/],
    [
      row('vapour pressure', 'Antoine', '7; 1500; 230', 'kPa; degC', -240, 90),
      /, coefficients: allowed C \+ t above 0 at "valid from"; received C \+ t = -10/,
    ],
    [row('vapour pressure', 'table', '20:5; 40:4', 'kPa; degC'), /, coefficients: allowed pressures above 0 that rise/],
    [row('composition', '', 'water 0.6; sugar 0.4'), /, coefficients: .*received "sugar 0.4"/],
    [
      row('composition', '', 'water 0.6; protein 0.3'),
      /, coefficients: allowed mass fractions that add up to 1; received a sum of 0.9/,
    ],
    [row('composition', '', 'water 0.6; water 0.4'), /, coefficients: allowed each constituent once/],
    [row('molar mass', '', -46, 'g/mol'), /, coefficients: allowed a molar mass above 0; received -46/],
    [row('melting temperature', '', 40), /, coefficients: .*received 40 without a unit/],
    [row('boiling temperature at 3 furlongs', '', 40, 'degC'), /, property: .*received "furlongs"/],
    [row('colour', '', 'green'), /, property: .*received "colour"/],
    [row('heat of fushion', '', 5, 'kJ/kg'), /; nearest: heat of fusion$/],
    [
      row('melting temperature', '', 40, 'degC', null, null, ''),
      /^Substances row 5, substance: allowed the name of a substance/,
    ],
  ])('%j', (line, message) => {
    const found = errors([line]);
    expect(found).toHaveLength(1);
    expect(found[0]).toMatch(/^Substances row 5/);
    expect(found[0]).toMatch(message);
  });

  it('leaves other rows and other substances in work, and answers for its own property with its words', () => {
    const rows = [
      ...WASH.filter(([, property]) => property !== 'solid heat capacity'),
      row('solid heat capacity', 'polynom', '0.6; 0.0065', 'kJ/(kg K)', '90 K', '159 K'),
      row('liquid heat capacity', '', 3.1, 'kJ/(kg K)', -10, 60, 'brine'),
    ];
    const house = houseOf(rows);
    const registry = houseRegistry(entries, house);
    const wash = registry.find('wash');
    expect(wash.heatCapacity('liquid', 1e5).at(300) / wash.molarMass).toBeCloseTo(2440, 9);
    expect(registry.find('brine').heatCapacity('liquid', 1e5).at(300)).toBe(3100);
    const [fault] = house.faults;
    expect(fault).toMatchObject({ row: FIRST_ROW + 7, column: 'form', substance: 'wash', severity: 'error' });
    expect(problemOf(() => wash.heatCapacity('solid', 1e5)).message).toBe(fault?.message);
    // Fusion is known at its temperature; the colder phase has no more than that.
    expect(wash.ladder(101325).missingBelow).toBe('solid heat capacity of wash');
  });

  it('is named where a piece is missing, since it may be that one', () => {
    const rows = [row('liquid heat capacity', '', 3, 'kJ/(kg K)', 0, 9), row('heat of fushion', '', 5, 'kJ/kg')];
    const wash = houseRegistry(entries, houseOf(rows)).find('wash');
    const problem = problemOf(() => wash.latent('fusion', 'isobaric'));
    expect(problem.data.code).toBe('missing');
    expect(problem.message).toBe(
      'heat of fusion of wash: add a row "heat of fusion" for wash to the Substances sheet; not read: row 6',
    );
  });

  it('takes the molar mass with it, which others need, but not what is given per mass', () => {
    const rows = [
      row('molar mass', '', 'heavy', 'g/mol'),
      row('liquid heat capacity', '', 3, 'kJ/(kg K)', 0, 9),
      row('solid heat capacity', '', 90, 'J/(mol K)', -9, 0),
    ];
    const house = houseOf(rows);
    expect(house.faults.filter(({ row: at }) => at === FIRST_ROW)).toHaveLength(1);
    const wash = houseRegistry(entries, house).find('wash');
    expect(problemOf(() => wash.heatCapacity('solid', 1e5)).message).toContain('row 5 (wash, molar mass)');
  });
});

describe('a cell error', () => {
  it('is said as what stands in the cell', () => {
    const line = [...row('liquid heat capacity', '', 3, 'kJ/(kg K)', 0, 90)] as unknown[];
    line[3] = { error: '#REF!' };
    const { faults } = readHouse([line], { decimal: '.', firstRow: FIRST_ROW, builtIn: [] });
    expect(faults[0]?.message).toContain('received "#REF!"');
  });
});

describe('warnings', () => {
  it('say where a range is missing, and mark the answers', () => {
    const house = houseOf([row('liquid heat capacity', '', 3, 'kJ/(kg K)')]);
    expect(house.faults.map(({ severity, column }) => [severity, column])).toEqual([['warning', 'valid from']]);
    const marks = house.entries[0]?.make().heatCapacity('liquid', 1e5).marksAt?.(300);
    expect(marks).toEqual([{ code: 'unconfirmed', text: 'Substances row 5 does not say where it is valid' }]);
  });

  it('are not given for a composition, a table with a range, and what needs no range', () => {
    expect(
      houseOf([
        row('composition', '', 'water 0.6; carbohydrate 0.4'),
        row('melting temperature', '', 2, 'degC'),
        row('heat of fusion', '', 200, 'kJ/kg'),
      ]).faults,
    ).toEqual([]);
  });

  it('mark a row without a source', () => {
    const line = ['brine', 'liquid heat capacity', '', 3, 'kJ/(kg K)', 0, 60, '', ''];
    const curve = houseOf([line]).entries[0]?.make().heatCapacity('liquid', 1e5);
    expect(curve?.sources).toEqual(['Substances row 5: no source given']);
    expect(curve?.marksAt?.(300)).toMatchObject([{ code: 'unconfirmed' }]);
  });
});

describe('names', () => {
  const own = (substance: string): Row => row('liquid heat capacity', '', 3, 'kJ/(kg K)', 0, 90, substance);
  const text = (property: string, word: string | boolean, substance = 'wash'): Row => [
    substance,
    property,
    'text',
    word,
  ];

  it('lead to a substance by name, formula, CAS number and synonyms', () => {
    const rows = [own('wash'), text('formula', 'X9Z'), text('CAS', '0-00-1'), text('synonym', 'first run; low wine')];
    const registry = houseRegistry(entries, houseOf(rows));
    for (const word of ['Wash', 'x9z', '0-00-1', 'low wine', 'FIRST RUN'])
      expect(registry.find(word).name).toBe('wash');
    expect(registry.find('wash')).toMatchObject({ formula: 'X9Z', cas: '0-00-1', group: 'house' });
  });

  it('of a built-in substance stay with it, and the clash is said', () => {
    const rows = [own('Ethanol'), own('steam')];
    const house = houseOf(rows);
    expect(house.faults.map(({ severity, message }) => [severity, message.split(';')[0]])).toEqual([
      ['error', 'Substances row 5 (Ethanol), substance: the name is that of the built-in substance ethanol'],
      ['error', 'Substances row 6 (steam), substance: the name is that of the built-in substance water'],
    ]);
    const registry = houseRegistry(entries, house);
    expect(registry.find('ethanol').group).toBe('fluid');
    expect(registry.find('steam').name).toBe('water');
  });

  it('win where a row says so, by every word they have', () => {
    const rows = [own('ethanol'), text('replaces built-in', 'yes', 'ethanol'), text('CAS', '64-17-5', 'ethanol')];
    const house = houseOf(rows);
    expect(house.faults).toEqual([]);
    const registry = houseRegistry(entries, house);
    expect(registry.find('Ethanol').group).toBe('house');
    expect(registry.find('64-17-5').group).toBe('house');
    expect(registry.entries.filter(({ name }) => name === 'ethanol')).toHaveLength(1);
    expect(registry.find('water').group).toBe('fluid');
  });

  it('that replace a built-in one answer to its formula, number and synonyms too, but for those it shares', () => {
    const registry = houseRegistry(entries, houseOf([own('water'), text('replaces built-in', 'yes', 'water')]));
    for (const word of ['H2O', 'steam', '7732-18-5']) expect(registry.find(word).group, word).toBe('house');
    const xylene = houseRegistry(entries, houseOf([own('o-xylene'), text('replaces built-in', 'yes', 'o-xylene')]));
    expect(xylene.find('1,2-xylene').group).toBe('house');
    expect(xylene.entry('C8H10')).toBeUndefined();
  });

  it('may be carbon monoxide, which is no cobalt', () => {
    const house = houseOf([own('carbon monoxide'), text('formula', 'CO', 'carbon monoxide')]);
    expect(house.faults).toEqual([]);
    const registry = houseRegistry(entries, house);
    expect([registry.find('CO').name, registry.find('Co').name]).toEqual(['carbon monoxide', 'cobalt']);
  });

  it('do not win where the row says no, and anything else is refused', () => {
    expect(houseOf([own('ethanol'), text('replaces built-in', 'no', 'ethanol')]).replacing).toEqual([]);
    expect(houseOf([own('wash'), text('replaces built-in', true)]).faults[0]).toMatchObject({ severity: 'warning' });
    expect(errors([own('ethanol'), text('replaces built-in', 'perhaps', 'ethanol')]).join()).toMatch(/yes or no/);
  });

  it('that are a formula or a synonym of another substance lead there, with a warning', () => {
    const rows = [own('wash'), text('formula', 'H2O'), text('synonym', 'mash'), own('mash')];
    const house = houseOf(rows);
    expect(house.faults.map(({ row: at, severity, message }) => [at, severity, message.split(': ')[1]])).toEqual([
      [6, 'warning', '"H2O" leads to the built-in substance water, not here'],
      [7, 'warning', '"mash" leads to the substance mash, not here'],
    ]);
    const registry = houseRegistry(entries, house);
    expect(registry.find('H2O').name).toBe('water');
    expect(registry.find('mash').name).toBe('mash');
    expect(registry.find('wash').formula).toBe('H2O');
  });

  it('are the same without regard to case and spaces, so that rows of one substance belong together', () => {
    const rows = [own('Kelp wax'), row('melting temperature', '', 58, 'degC', null, null, 'kelp  WAX')];
    expect(houseOf(rows).entries.map(({ name }) => name)).toEqual(['Kelp wax']);
  });

  it('a second row for a property takes both out of use and names itself', () => {
    const rows = [own('wash'), own('wash')];
    const house = houseOf(rows);
    expect(house.faults).toMatchObject([{ row: 6, severity: 'error' }]);
    expect(house.faults[0]?.message).toContain('allowed one row for each property; received a second row');
    const wash = houseRegistry(entries, house).find('wash');
    expect(problemOf(() => wash.heatCapacity('liquid', 1e5)).message).toBe(house.faults[0]?.message);
  });

  it('a composition and a heat capacity of the same phase are two rows for one property', () => {
    expect(errors([own('wash'), row('composition', '', 'water 1')])).toHaveLength(1);
  });
});

describe('compositions', () => {
  it('add up within the rounding of their printed digits and are scaled to 1', () => {
    const cp = (text: string): number =>
      substanceOf([row('composition', '', text)])
        .heatCapacity('liquid', 1e5)
        .at(313.15);
    expect(cp('water 0.667; protein 0.167; carbohydrate 0.167')).toBeCloseTo(
      cp('water 66.6334 %; protein 16.6833 %; carbohydrate 16.6833 %'),
      2,
    );
    expect(cp('water=1')).toBe(cp('Water: 100 %'));
  });

  it('with ice are a solid up to 0 °C, others a liquid', () => {
    const frozen = substanceOf([row('composition', '', 'ice 0.6; carbohydrate 0.4')]);
    expect(frozen.heatCapacity('solid', 1e5).to).toBe(273.15);
    expect(problemOf(() => frozen.heatCapacity('liquid', 1e5)).data.code).toBe('missing');
    expect(frozen.notes.join()).toContain('melting is not counted in');
  });

  it('state an uncertainty, and what rests on memory', () => {
    const curve = substanceOf([row('composition', '', 'water 0.9; fibre 0.1')]).heatCapacity('liquid', 1e5);
    const u = curve.uncertaintyAt?.(313.15) ?? 0;
    // Two per cent for the rule of mixing and a little for the parts.
    expect(u / curve.at(313.15)).toBeGreaterThan(0.015);
    expect(u / curve.at(313.15)).toBeLessThan(0.03);
    expect(curve.marksAt?.(313.15)).toEqual([{ code: 'unconfirmed', text: 'coefficients of fibre are from memory' }]);
  });
});

describe('what a slip makes of a row', () => {
  it('a thousandfold heat capacity is warned of, with what is usual', () => {
    const { faults } = houseOf([row('liquid heat capacity', '', 4100, 'kJ/(kg K)', 0, 100)]);
    expect(faults.map(({ severity, message }) => [severity, message])).toEqual([
      [
        'warning',
        'Substances row 5 (wash, liquid heat capacity), unit: 4100 kJ/(kg K) at 273.15 K is unusual; usual [0.1, 20] kJ/(kg K)',
      ],
    ]);
    // Mercury, hydrogen and a metal near absolute zero are real.
    const fine = [
      row('liquid heat capacity', '', 0.14, 'kJ/(kg K)', 0, 100),
      row('gas heat capacity', '', 14.3, 'kJ/(kg K)', 0, 100),
      row('solid heat capacity', '', 0.01, 'kJ/(kg K)', '10 K', '20 K'),
    ];
    expect(houseOf(fine).faults).toEqual([]);
  });

  it('a truth value is shown as received, not as nothing', () => {
    const [message] = errors([row('liquid heat capacity', '', true as unknown as string, 'kJ/(kg K)', 0, 100)]);
    expect(message).toMatch(/; received true$/);
  });

  it('commas part the constituents of a composition', () => {
    const text = (words: string): Row => row('composition', '', words);
    const [semicolons, commas] = ['water 0.8; fat 0.2', 'water: 0.8, fat: 0.2'].map((words) =>
      substanceOf([text(words)])
        .heatCapacity('liquid', 101325)
        .at(320),
    );
    expect(commas).toBe(semicolons);
    const decimal = houseOf([text('water 0,8, fat 0,2')], ',');
    expect(decimal.faults).toEqual([]);
  });
});
