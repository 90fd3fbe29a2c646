import { FIT_ROWS } from '../../core/fit/fitTable';
import type { Check } from './check';

/** NIST StRD Norris: x is the reference reading, y the customer's. */
const norrisX = {
  name: 'Norris_x',
  values: [
    0.2, 337.4, 118.2, 884.6, 10.1, 226.5, 666.3, 996.3, 448.6, 777.0, 558.2, 0.4, 0.6, 775.5, 666.9, 338.0, 447.5,
    11.6, 556.0, 228.1, 995.8, 887.6, 120.2, 0.3, 0.3, 556.8, 339.1, 887.2, 999.0, 779.0, 11.1, 118.3, 229.2, 669.1,
    448.9, 0.5,
  ],
};
const norrisY = {
  name: 'Norris_y',
  values: [
    0.1, 338.8, 118.1, 888.0, 9.2, 228.1, 668.5, 998.5, 449.1, 778.9, 559.2, 0.3, 0.1, 778.1, 668.8, 339.3, 448.9, 10.8,
    557.7, 228.3, 998.0, 888.8, 119.6, 0.3, 0.6, 557.6, 339.3, 888.0, 998.5, 778.9, 10.2, 117.6, 228.9, 668.4, 449.2,
    0.2,
  ],
};

/** JCGM 100:2008, Table H.6: thermometer reading in degC and its correction. */
const gumT = {
  name: 'H3_reading',
  values: [21.521, 22.012, 22.512, 23.003, 23.507, 23.999, 24.513, 25.002, 25.503, 26.01, 26.511],
};
const gumB = {
  name: 'H3_correction',
  values: [-0.171, -0.169, -0.166, -0.159, -0.164, -0.165, -0.156, -0.157, -0.159, -0.161, -0.16],
};

const SETTINGS = 'temperature=degC; heat=kJ/kg; heat_capacity=kJ/(kg K)';
const NORRIS = 'NIST StRD, linear regression, Norris (certified values)';
const GUM = 'JCGM 100:2008 (GUM), H.3 and Table H.6';

const norris = (label: string, column: number, expected: number): Check => ({
  call: 'FITDELTACP',
  args: [norrisX, norrisY],
  settings: SETTINGS,
  pick: { label, column },
  expected,
  within: 5e-14 * Math.abs(expected),
  because: '13 digits of the 15 certified: rounding of the sums in double precision',
  source: NORRIS,
});

const gum = (label: string, column: number, expected: number, within: number): Check => ({
  call: 'FITDELTACP',
  args: [gumT, gumB],
  settings: `${SETTINGS}; reference=20 degC`,
  pick: { label, column },
  expected,
  within,
  because: 'half of the last published digit',
  source: GUM,
});

/** Certified and published straight lines; the numbers stand in for temperatures and latent heats. */
export const fitChecks: readonly Check[] = [
  norris(FIT_ROWS.slope, 1, 1.00211681802045),
  norris(FIT_ROWS.slope, 2, 0.000429796848199937),
  norris(FIT_ROWS.intercept, 1, -0.262323073774029),
  norris(FIT_ROWS.residualSd, 1, 0.884796396144373),
  norris(FIT_ROWS.rSquared, 1, 0.999993745883712),
  gum(FIT_ROWS.latent, 1, -0.1712, 5e-5),
  gum(FIT_ROWS.latent, 2, 0.0029, 5e-5),
  gum(FIT_ROWS.slope, 1, 0.00218, 5e-6),
  gum(FIT_ROWS.slope, 2, 0.00067, 5e-6),
];
