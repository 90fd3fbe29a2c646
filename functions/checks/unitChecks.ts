import type { Check } from './check';

const unit = (from: string, to: string, expected: number, source: string, settings = ''): Check => ({
  call: 'TOUNITS',
  args: [1, from, to],
  settings,
  expected,
  within: 1e-15 * Math.abs(expected),
  because: 'exact factor, rounded once',
  source,
});

const SP811 = 'NIST SP 811 (2008), Appendix B';

/** Unit factors that a wrong calorie, Btu or barometer would change. */
export const unitChecks: readonly Check[] = [
  unit('cal_th/g', 'J/kg', 4184, SP811),
  unit('cal_IT/g', 'J/kg', 4186.8, SP811),
  unit('Btu_IT/lb', 'J/kg', 2326, SP811),
  unit('mmHg', 'Pa', 133.322387415, 'NIST SP 811 (2008), Appendix B, conventional millimetre of mercury'),
  unit('atm', 'Pa', 101325, SP811),
  unit('kWh/t', 'kJ/kg', 3.6, SP811),
];
