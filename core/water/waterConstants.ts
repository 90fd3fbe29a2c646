import type { Datum } from '../answer';

const EQUILIBRIUM = 'phase equilibrium of IAPWS R6-95(2018)';

/** Named constants of water, each with its source. */
export const waterConstants: readonly Datum[] = [
  {
    item: 'molar mass',
    value: 0.018015268,
    unit: 'kg/mol',
    source: 'IAPWS R6-95(2018), conversion to molar units',
    confirmed: true,
  },
  {
    item: 'melting temperature',
    value: 273.152519,
    unit: 'K',
    source: 'IAPWS R10-06(2009), Table 6: ice Ih and liquid at 101.325 kPa',
    confirmed: true,
  },
  {
    item: 'boiling temperature',
    value: 373.124296,
    unit: 'K',
    source: `${EQUILIBRIUM} at 101.325 kPa, computed`,
    confirmed: true,
  },
  { item: 'triple temperature', value: 273.16, unit: 'K', source: 'IAPWS R6-95(2018)', confirmed: true },
  { item: 'triple pressure', value: 611.654771, unit: 'Pa', source: `${EQUILIBRIUM} at 273.16 K`, confirmed: true },
  { item: 'critical temperature', value: 647.096, unit: 'K', source: 'IAPWS R6-95(2018), Eq. 1', confirmed: true },
  { item: 'critical pressure', value: 22.064e6, unit: 'Pa', source: 'IAPWS SR1-86(1992)', confirmed: true },
  { item: 'critical density', value: 322, unit: 'kg/m3', source: 'IAPWS R6-95(2018), Eq. 2', confirmed: true },
  {
    item: 'acentric factor',
    value: 0.344292,
    unit: '1',
    source: `computed from its definition, -log10(p_sat(0.7 Tc)/pc) - 1, with ${EQUILIBRIUM}`,
    confirmed: true,
  },
];
