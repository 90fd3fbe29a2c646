import { beforeAll, describe, expect, it } from 'vitest';
import { estimate } from '../../functions/estimate';
import { methodNames } from '../../functions/estimating/methods';
import { houseStore } from '../../functions/house/store';
import { settingsStore } from '../../functions/settings/store';
import { call, cellOf, faultOf, HostError } from './host';

beforeAll(() => {
  settingsStore.publish({ state: 'absent' });
  houseStore.publish({ state: 'absent' });
});

type Table = readonly (readonly unknown[])[];

const BENZENE: Table = [
  ['boiling temperature / K', 353.24],
  ['critical temperature', '562.05 K'],
  ['critical pressure', '48.95 bar'],
  ['acentric factor', 0.21],
];
const MOLAR = 'heat=kJ/mol; heat_capacity=J/(mol K)';

const rowOf = (method: string, inputs: Table, settings = MOLAR): unknown[] => {
  const table = call(estimate, [method, inputs], [settings]) as unknown[][];
  expect(table).toHaveLength(1);
  return table[0] ?? [];
};
const near = (value: unknown, expected: number, within: number): void => {
  expect(Math.abs((value as number) - expected), `${String(value)} against ${expected}`).toBeLessThanOrEqual(within);
};
const words = (method: unknown, inputs: Table | undefined, settings = MOLAR): string => {
  const { code, message } = faultOf(() => call(estimate, [method, inputs], [settings]));
  return `${code} ${message}`;
};

describe('ESTIMATE', () => {
  // computed independently with R = 8.314: half of the last digit and 5e-5 of the value
  it.each([
    ['riedel', 30.639, 0.02],
    ['Chen', 30.548, 0.015],
    ['VETERE', 30.382, 0.015],
    ['trouton', 31.085, 0.04],
    ['kistiakowsky', 30.164, 0.045],
  ])('%s of benzene, with the typical standard uncertainty beside it', (method, value, share) => {
    const [latent, uncertainty, ...rest] = rowOf(method, BENZENE);
    near(latent, value, 0.0005 + 5e-5 * value);
    near(uncertainty, share * (latent as number), 1e-12);
    expect(rest).toEqual([]);
  });

  it('takes a column of methods, one row each, blanks staying blank, a fault in its place', () => {
    const table = call(estimate, [[['riedel'], [null], ['watson']], BENZENE], [MOLAR]) as unknown[][];
    expect(table[1]).toEqual(['', '']);
    near(table[0]?.[0], 30.639, 0.002);
    expect(table[2]?.[0]).toBeInstanceOf(HostError);
  });

  it('reads units from the label, from the value, or from the workbook', () => {
    const inputs = (...rows: Table): unknown => rowOf('trouton', rows)[0];
    near(inputs(['boiling temperature / °C', 80.09]), 31.085, 0.0005);
    near(inputs(['Boiling point', '176.162 degF']), 31.085, 0.0005);
    near(inputs(['boiling_temperature', 80.09]), 31.085, 0.0005);
    near(rowOf('trouton', [['normal boiling temperature', 353.24]], `${MOLAR}; temperature=K`)[0], 31.085, 0.0005);
    // Felder & Rousseau, Example 8.4-3: half of the last printed digit
    near(
      rowOf('trouton', [
        ['boiling temperature', '337.9 K'],
        ['trouton constant', 109],
      ])[0],
      36.8,
      0.05,
    );
  });

  it('goes from moles to mass with a row for the molar mass (g/mol) or a substance, else refuses', () => {
    near(rowOf('riedel', [...BENZENE, ['molar mass', 78.114]], 'heat=kJ/kg')[0], 30639 / 78.114, 0.05);
    near(rowOf('riedel', [...BENZENE, ['molar mass', '0.078114 kg/mol']], 'heat=kJ/kg')[0], 30639 / 78.114, 0.05);
    expect(words('riedel', BENZENE, 'heat=kJ/kg')).toBe(
      '#VALUE! molar mass: allowed a positive number or a substance, to go between mass and moles in kJ/kg; received nothing',
    );
  });

  it('Watson needs no molar mass where both sides are per mass (Smith, Van Ness & Abbott, Sec. 4.3: 1371)', () => {
    const inputs: Table = [
      ['latent heat', 2257],
      ['at temperature', 100],
      ['to temperature', 300],
      ['critical temperature', '647.1 K'],
    ];
    const [value] = rowOf('watson', inputs, 'heat=kJ/kg');
    near(value, 1371, 1.9); // the source rounds reduced temperatures to three digits
    const [inBtu] = rowOf('watson', inputs, 'heat=kJ/kg; temperature=degC');
    expect(inBtu).toBe(value);
    near(rowOf('watson', [...inputs.slice(1), ['latent heat', '2257 kJ/kg'], ['molar mass', 18.015]])[0], 24.72, 0.005);
  });

  it('fills what is missing from a substance, and its own rows win', () => {
    const [riedel] = rowOf('riedel', [['substance', 'water']], 'heat=kJ/kg');
    near(riedel, 2256.5, 0.04 * 2256.5); // water associates: 3.5 % off the 2256.5 kJ/kg of IAPWS R6-95
    const [own] = rowOf(
      'riedel',
      [
        ['substance', 'water'],
        ['critical pressure', '200 bar'],
      ],
      'heat=kJ/kg',
    );
    expect(own).toBeLessThan(riedel as number);
    // Cp(liquid) 75.3 J/(mol K) at 298.15 K (IAPWS R6-95): 10.58 + 0.26 · 75.3
    near(rowOf('chickos vaporization', [['substance', 'water']])[0], -30.16, 0.01);
    near(rowOf('kopp', [['substance', 'water']])[0], 36.2, 1e-12); // 2 · 9.6 + 17
    expect(words('riedel', [['substance', 'watr']])).toMatch(/^#VALUE! substance: allowed .*nearest: water$/);
  });

  it('shows the parts of the record', () => {
    const part = (name: string): unknown => cellOf(call(estimate, ['riedel', BENZENE], [`${MOLAR}; answer=${name}`]));
    near(part('value'), 30.639, 0.002);
    near(part('uncertainty'), 0.6128, 0.0001);
    near(part('expanded'), 1.2256, 0.0002);
    expect(part('kind')).toMatch(/^coexistence/);
    expect(part('method')).toMatch(/^Riedel.*typical error 2 % \(k = 1\)/);
    expect(part('source')).toBe('L. Riedel, Chem. Ing. Tech. 26 (1954) 679');
    expect(part('range')).toBe('[7.875 degC, 176.49 degC]');
    expect(part('status')).toBe('ok');
    expect(cellOf(call(estimate, ['hurst-harrison', [['formula', 'NaCl']]], [`${MOLAR}; answer=status`]))).toBe(
      'unconfirmed: the contributions are from memory',
    );
  });

  it('is #N/A with the range outside it, and extended when asked', () => {
    const cold: Table = [
      ['substance', 'water'],
      ['temperature', 20],
    ];
    const refusal =
      'temperature 20 degC is outside [115.108 degC, 373.946 degC] for the acentric-factor correlation: 0.6 to 1 of the critical temperature';
    expect(words('acentric factor', cold)).toBe(`#N/A ${refusal}`);
    expect(cellOf(call(estimate, ['pitzer', cold], [`${MOLAR}; answer=status`]))).toBe(`#N/A ${refusal}`);
    near(rowOf('pitzer', cold, 'out_of_range=extend')[0], 2453.5, 0.05 * 2453.5); // IAPWS R6-95 at 20 °C
    expect(cellOf(call(estimate, ['pitzer', cold], ['out_of_range=extend; answer=status']))).toMatch(/^extended: /);
  });

  it('carries latent heats by the group difference, and gives the difference alone', () => {
    const inputs: Table = [
      ['latent heat', '35.21 kJ/mol'],
      ['at temperature', '337.69 K'],
      ['to temperature', 25],
      ['liquid heat capacity', '81.12 J/(mol K)'],
    ];
    near(rowOf('vaporization by heat capacity difference', inputs)[0], 35.21 + 0.0316712 * 39.54, 1e-5); // by hand
    near(rowOf('vaporization heat capacity difference', inputs)[0], -31.6712, 1e-9);
    near(rowOf('sublimation heat capacity difference', [['solid heat capacity / J/(mol K)', 165.7]])[0], -25.605, 1e-9);
  });

  it('sums constituents, with their own heat capacity or that of the catalogue', () => {
    const own: Table = [
      ['amount of A', 0.64],
      ['heat capacity of A', '25.1 J/(mol K)'],
      ['Amount of B', 0.36],
      ['heat capacity of b / J/(mol K)', 26.1],
    ];
    near(rowOf('neumann-kopp', own)[0], 25.46, 1e-12);
    const alloy: Table = [
      ['temperature', 25],
      ['amount of iron', 0.64],
      ['amount of nickel', 0.36],
    ];
    const [perMole] = rowOf('neumann', alloy);
    near(perMole, 25.46, 0.1); // NASA-9: Fe 25.1, Ni 26.0 J/(mol K)
    const [perMass] = rowOf('neumann', alloy, 'heat_capacity=J/(kg K)');
    near(perMass, (perMole as number) / 0.05687, 0.01); // 0.64 · 55.845 + 0.36 · 58.693 g/mol
    expect(
      words('neumann', [
        ['amount of kelpium', 1],
        ['temperature', 25],
      ]),
    ).toMatch(/^#VALUE! substance: .*received "kelpium"/);
  });

  it('adds up a composition, percentages too', () => {
    const food: Table = [
      ...[
        ['temperature', 25],
        ['protein', '15 %'],
        ['carbohydrate / %', 20],
        ['fiber', 0.01],
      ],
      ...[
        ['ash', 0.005],
        ['fat', 0.2],
        ['water', 0.435],
      ],
    ];
    near(rowOf('composition', food, '')[0], 2.8698, 0.00005); // half of the last digit
    expect(words('choi-okos', food.slice(0, 4))).toBe(
      '#VALUE! mass fractions: allowed a sum of 1 (within 0.005); received a sum of 0.36',
    );
  });

  it('names all that a method needs and what came', () => {
    expect(words('watson', BENZENE)).toBe(
      '#VALUE! inputs of watson: allowed latent heat, at temperature, to temperature, critical temperature, or a substance that has them; received boiling temperature, critical temperature, critical pressure, acentric factor, without latent heat, at temperature, to temperature',
    );
    expect(words('kopp', [['', '']])).toMatch(
      /^#VALUE! inputs of kopp: allowed formula, .*; received nothing, without formula$/,
    );
    expect(words('composition', [['water', 1]])).toMatch(/allowed temperature.*; received water, without temperature$/);
  });

  it('refuses unknown labels and methods with the nearest', () => {
    expect(words('riedel', [...BENZENE, ['boilng temperature', 3]])).toMatch(
      /^#VALUE! inputs: allowed .*; received "boilng temperature"; nearest: boiling temperature$/,
    );
    expect(words('ridel', BENZENE)).toMatch(/^#VALUE! method: allowed watson, .*; received "ridel"; nearest: riedel$/);
  });

  it.each([
    [
      [
        ['critical pressure', '562 K'],
        ['formula', 'NaCl'],
      ],
      /^#VALUE! critical pressure: allowed a unit of pressure, .*; received "K", a unit of temperature$/,
    ],
    [[['critical pressure / K', 562]], /^#VALUE! critical pressure: allowed a unit as .*; received K$/],
    [[['formula', 5]], /^#VALUE! formula: allowed a text; received 5$/],
    [[['formula', 'table salt']], /^#VALUE! formula: allowed a chemical formula, .*; received "table salt"$/],
    [
      [
        ['formula', 'NaCl'],
        ['Formula', 'KCl'],
      ],
      /^#VALUE! inputs: allowed each name once; received "formula" twice$/,
    ],
    [[['formula', true]], /^#VALUE! formula: allowed a text; received true$/],
    [
      [['boiling temperature', true]],
      /^#VALUE! boiling temperature: allowed a number or a text with its unit; received true$/,
    ],
    [[['', 5]], /^#VALUE! inputs: allowed a name beside each value; received a blank$/],
    [
      [['formula'], ['NaCl']],
      /^#VALUE! inputs: allowed a range of two columns: names and values; received a range of 2 × 1$/,
    ],
  ] as const)('refuses unusable inputs %#', (inputs, message) => {
    expect(words('kopp', inputs)).toMatch(message);
  });

  it('skips titles and blank rows, and passes an error cell on', () => {
    const rows: Table = [
      ['Property', 'Value'],
      [null, null],
      ['formula', 'NaCl'],
      ['exponent', null],
    ];
    expect(rowOf('kopp', rows)[0]).toBe(52);
    expect(words('kopp', [['formula', { type: 'Error', basicValue: '#DIV/0!' }]])).toMatch(/^#DIV\/0!/);
    expect(words(null, BENZENE)).toMatch(/^#VALUE! method: allowed a text; received a blank$/);
    expect(words([['kopp', 'riedel']], BENZENE)).toMatch(/^#VALUE! method: allowed one method, or a column of them/);
  });

  it('every listed method is one that it knows', () => {
    for (const method of methodNames) {
      expect(words(method, [['', '']])).toMatch(
        new RegExp(`^#VALUE! inputs of ${method}: allowed .*; received nothing, without .+$`),
      );
    }
    expect(new Set(methodNames).size).toBe(methodNames.length);
  });
});
