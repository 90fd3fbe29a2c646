/**
 * Our units, written in the unit language: `[name, factor, unit, offset]` says that `name` is `factor` times `unit`,
 * counted from `offset` (in its own degrees) below its zero. Factors are exact: decimals or fractions.
 * The generator turns them into `factors.generated.ts`; the reader of free unit text uses them too.
 * Sources: SI Brochure, 9th edition; NIST Special Publication 811 (2008), Appendix B.
 */
export type UnitDefinition = readonly [name: string, factor: string, unit: string, offset?: string];

export const DEFINITIONS: readonly UnitDefinition[] = [
  ['degC', '1', 'K', '273.15'],
  ['degF', '5/9', 'K', '459.67'],
  ['degR', '5/9', 'K'],
  ['degC_difference', '1', 'K'],
  ['degF_difference', '5/9', 'K'],

  ['in', '0.0254', 'm'],
  ['ft', '12', 'in'],
  ['lb', '0.45359237', 'kg'],
  ['oz', '1/16', 'lb'],
  ['t', '1000', 'kg'],
  ['Mg', '1000', 'kg'],
  ['ton_short', '2000', 'lb'],
  ['ton_long', '2240', 'lb'],
  ['lbmol', '453.59237', 'mol'],
  ['d', '86400', 's'],
  ['gal_US', '231', 'in^3'],
  ['gal_UK', '4.54609', 'dm^3'],

  ['kgf', '9.80665', 'N'],
  ['lbf', '0.45359237', 'kgf'],
  ['atm', '101325', 'Pa'],
  ['torr', '1/760', 'atm'],
  ['mtorr', '0.001', 'torr'],
  ['mmHg', '133.322387415', 'Pa'],
  ['inHg', '25.4', 'mmHg'],
  ['mmH2O', '9.80665', 'Pa'],
  ['inH2O', '25.4', 'mmH2O'],
  ['psi', '1', 'lbf/in^2'],

  ['Wh', '3600', 'J'],
  ['kWh', '1000', 'Wh'],
  ['MWh', '1000', 'kWh'],
  ['GWh', '1000', 'MWh'],
  ['cal_th', '4.184', 'J'],
  ['kcal_th', '1000', 'cal_th'],
  ['cal_IT', '4.1868', 'J'],
  ['kcal_IT', '1000', 'cal_IT'],
  ['Btu_IT', '1055.05585262', 'J'],
  ['Btu_th', '5/9', 'cal_th lb/g'],
  ['kBtu_IT', '1000', 'Btu_IT'],
  ['MMBtu_IT', '1000000', 'Btu_IT'],
  ['therm_EC', '100000', 'Btu_IT'],
  ['therm_US', '105480400', 'J'],

  ['hp_mechanical', '550', 'ft lbf/s'],
  ['hp_metric', '75', 'm kgf/s'],
  ['hp_electric', '746', 'W'],
  ['hp_boiler', '9809.5', 'W'],
  ['ton_refrigeration', '12000', 'Btu_IT/h'],
];

/** The units of the table by what they measure; prefixed ones come from the unit language itself. */
export const TABLE: Readonly<Record<string, readonly string[]>> = {
  temperature: ['K', 'degC', 'degF', 'degR'],
  length: ['um', 'mm', 'cm', 'dm', 'm', 'km', 'in', 'ft'],
  mass: ['ug', 'mg', 'g', 'kg', 'Mg', 't', 'lb', 'oz', 'ton_short', 'ton_long'],
  amount: ['umol', 'mmol', 'mol', 'kmol', 'lbmol'],
  time: ['ms', 's', 'min', 'h', 'd'],
  volume: ['uL', 'mL', 'L', 'gal_US', 'gal_UK'],
  force: ['N', 'kN', 'kgf', 'lbf'],
  pressure: [
    ...['mPa', 'Pa', 'hPa', 'kPa', 'MPa', 'GPa', 'mbar', 'bar', 'atm'],
    ...['mtorr', 'torr', 'mmHg', 'inHg', 'mmH2O', 'inH2O', 'psi'],
  ],
  energy: [
    ...['mJ', 'J', 'kJ', 'MJ', 'GJ', 'Wh', 'kWh', 'MWh', 'GWh', 'cal_th', 'kcal_th', 'cal_IT', 'kcal_IT'],
    ...['Btu_IT', 'Btu_th', 'kBtu_IT', 'MMBtu_IT', 'therm_EC', 'therm_US'],
  ],
  power: [
    ...['mW', 'W', 'kW', 'MW', 'GW'],
    ...['hp_mechanical', 'hp_metric', 'hp_electric', 'hp_boiler', 'ton_refrigeration'],
  ],
};
