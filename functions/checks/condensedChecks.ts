import type { Check } from './check';

const SOURCES = [
  'CRC Handbook, Enthalpy of Fusion, from memory',
  'NIST-JANAF Thermochemical Tables, 4th ed. (1998), from memory',
  'CRC Handbook, Physical Constants of Inorganic Compounds, from memory',
  "Poling, Prausnitz and O'Connell (2001), Appendix A, Section B",
  'CRC Handbook, Enthalpy of Vaporization, from memory',
] as const;

/** Substance, change, printed value in kJ/mol, source, and the temperature where it is not that of the transition. */
const CHANGES: readonly (readonly [string, string, number, number, number?])[] = [
  ['aluminium', 'fusion', 10.71, 0],
  ['aluminium oxide', 'fusion', 111.1, 1],
  ['ammonium nitrate', 'fusion', 5.86, 0],
  ['cadmium', 'fusion', 6.21, 0],
  ['calcium', 'alpha-beta', 0.93, 1],
  ['calcium chloride', 'fusion', 28.05, 0],
  ['cobalt', 'alpha-beta', 0.45, 1],
  ['cobalt', 'fusion', 16.2, 0],
  ['gallium', 'fusion', 5.59, 0],
  ['iodine', 'vaporization', 41.57, 3, 457.56],
  ['iron', 'alpha-gamma', 0.9, 1],
  ['iron', 'gamma-delta', 0.84, 1],
  ['iron(III) chloride', 'fusion', 43.1, 1],
  ['lead', 'fusion', 4.77, 0],
  ['lithium', 'fusion', 3, 0],
  ['lithium hydroxide', 'fusion', 20.9, 0],
  ['magnesium', 'fusion', 8.48, 0],
  ['magnesium chloride', 'fusion', 43.1, 1],
  ['magnesium oxide', 'fusion', 77, 1],
  ['mercury', 'fusion', 2.295, 0],
  ['mercury', 'vaporization', 59.11, 4, 629.77],
  ['nickel', 'fusion', 17.48, 0],
  ['potassium', 'fusion', 2.335, 0],
  ['potassium chloride', 'fusion', 26.53, 0],
  ['potassium fluoride', 'fusion', 27.2, 0],
  ['potassium nitrate', 'fusion', 9.6, 0],
  ['silicon', 'fusion', 50.21, 0],
  ['silicon dioxide', 'fusion', 9.6, 0],
  ['silver', 'fusion', 11.28, 0],
  ['sodium chloride', 'fusion', 28.16, 0],
  ['sodium fluoride', 'fusion', 33.35, 1],
  ['sodium sulfate', 'fusion', 23.85, 0],
  ['sulfur', 'fusion', 1.721, 1],
  ['zinc', 'fusion', 7.32, 0],
  ['zirconium', 'fusion', 21, 0],
];

/** Boiling temperatures at one atmosphere, K. */
const BOILING: readonly (readonly [string, number])[] = [
  ['aluminium', 2792],
  ['copper', 2835],
  ['iron', 3134],
  ['lead', 2022],
  ['magnesium', 1363],
  ['potassium', 1032],
  ['silver', 2435],
  ['sodium', 1156],
  ['zinc', 1180],
];

/** Vapour pressure of mercury: degC, mmHg. */
const MERCURY: readonly (readonly [number, number])[] = [
  [200, 17.3],
  [300, 247],
  [360, 806],
];

/** Printed values for metals, salts and oxides, and what follows from the NASA-9 gases: boiling points, mercury's pressures. */
export const condensedChecks: readonly Check[] = [
  ...CHANGES.map(([name, change, value, source, temperatureK]): Check => ({
    call: 'LATENT',
    args: temperatureK === undefined ? [name, change] : [name, change, temperatureK],
    settings: 'temperature=K; heat=kJ/mol',
    expected: value,
    within: 0.03 * value,
    because: 'critical tables differ by up to 3 %',
    source: SOURCES[source] ?? '',
  })),
  ...BOILING.map(([name, value]): Check => ({
    call: 'SATTEMPERATURE',
    args: [name, 101.325],
    settings: 'temperature=K; pressure=kPa',
    expected: value,
    within: 0.004 * value,
    because: 'critical tables differ by up to 0.4 %',
    source: SOURCES[2],
  })),
  ...MERCURY.map(([celsius, value]): Check => ({
    call: 'SATPRESSURE',
    args: ['mercury', celsius],
    settings: 'temperature=degC; pressure=mmHg',
    expected: value,
    within: 0.03 * value,
    because: 'the printed table, and the gas and liquid data, each within 1 to 2 %',
    source: 'R data set pressure (Handbook of Chemistry and Physics, CRC Press, 1973)',
  })),
];
