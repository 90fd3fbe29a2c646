import type { Check } from './check';

type Inputs = readonly (readonly [string, string | number])[];

const SETTINGS = 'temperature=K; pressure=bar; heat=kJ/mol; heat_capacity=J/(mol K)';
const SMITH =
  'Smith, Van Ness & Abbott, Introduction to Chemical Engineering Thermodynamics, 7th ed., Sec. 4.3 (from memory)';
const FELDER = 'Felder & Rousseau, Elementary Principles of Chemical Processes, 3rd ed.';
const POLING = 'Poling, Prausnitz & O’Connell, The Properties of Gases and Liquids, 5th ed., Appendix A';
const HALF = 'half of the last published digit';

const check = (
  method: string,
  rows: Inputs,
  [expected, within, because]: readonly [number, number, string],
  source: string,
  settings = SETTINGS,
): Check => ({ call: 'ESTIMATE', args: [method, { rows }], settings, expected, within, because, source });

/** Boiling and critical temperature (K), critical pressure (bar), acentric factor, latent heat at the boiling point (kJ/mol). */
const FLUIDS: readonly (readonly [number, number, number, number, number])[] = [
  [353.24, 562.05, 48.95, 0.21, 30.72],
  [341.88, 507.6, 30.25, 0.3, 28.85],
  [307.59, 466.7, 36.4, 0.281, 26.52],
];

/** Method, and its typical error in percent. */
const BOILING: readonly (readonly [string, number])[] = [
  ['riedel', 2],
  ['chen', 1.5],
  ['vetere', 1.5],
  ['acentric factor', 2],
];

const boilingChecks = FLUIDS.flatMap(([boiling, critical, pressure, acentric, latent]) =>
  BOILING.map(([method, percent]) =>
    check(
      method,
      [
        ...(method === 'acentric factor'
          ? [['temperature', boiling] as const, ['acentric factor', acentric] as const]
          : [['boiling temperature', boiling] as const, ['critical pressure', pressure] as const]),
        ['critical temperature', critical],
      ],
      [latent, (percent / 100) * latent, `the method's typical error, ${percent} %`],
      `${POLING}: printed latent heat at the boiling point`,
    ),
  ),
);

/** Estimates against published worked examples, and against measured values within the typical error. */
export const estimateChecks: readonly Check[] = [
  check(
    'watson',
    [
      ['latent heat', 2257],
      ['at temperature', 373.15],
      ['to temperature', 573.15],
      ['critical temperature', 647.1],
    ],
    [1371, 1.9, 'half of the last digit, and 1.4 for reduced temperatures that the source rounds to three digits'],
    SMITH,
    'temperature=K; heat=kJ/kg',
  ),
  check(
    'watson',
    [
      ['latent heat', 36.8],
      ['at temperature', 337.9],
      ['to temperature', 473],
      ['critical temperature', 513.2],
    ],
    [21.0, 0.05, HALF],
    `${FELDER}, Example 8.4-3 (from memory)`,
  ),
  check(
    'trouton',
    [
      ['boiling temperature', 337.9],
      ['trouton constant', 109],
    ],
    [36.8, 0.05, HALF],
    `${FELDER}, Example 8.4-3 (from memory)`,
  ),
  check('kopp', [['formula', 'Ca(OH)2']], [79, 0.5, HALF], `${FELDER}, Sec. 8.3c (from memory)`),
  ...boilingChecks,
  check(
    'composition',
    [
      ['temperature', 298.15],
      ['water', 1],
    ],
    [4.1816, 0.016, 'the 0.4 % within which the part of water holds'],
    'IAPWS R6-95(2018), saturated liquid at 25 °C',
    'temperature=K; heat_capacity=kJ/(kg K)',
  ),
  check(
    'composition',
    [
      ['temperature', 253.15],
      ['ice', 1],
    ],
    [1.9498, 0.039, 'the 2 % within which the part of ice holds'],
    'IAPWS R10-06(2009), ice at -20 °C and 101.325 kPa',
    'temperature=K; heat_capacity=kJ/(kg K)',
  ),
];
