import { unitOf } from '../../core/units/unitOf';
import type { QuantityKind } from '../../core/units/unit';

/** Settings that are units: the kinds of quantity that cells hold. */
export type UnitSetting = 'temperature' | 'pressure' | 'heat' | 'heatCapacity' | 'amount' | 'energy' | 'flow' | 'power';

/** One row of the Units sheet, and the same setting as a key of a settings text. */
export interface SettingRow {
  /** Spelling in a settings text: `heat_capacity`. */
  readonly key: string;
  /** Label on the Units sheet: `Heat capacity`. */
  readonly label: string;
  readonly kind: 'unit' | 'barometer' | 'outOfRange' | 'decimal';
  /** Which unit a `unit` row sets. */
  readonly unit?: UnitSetting;
  readonly default: string;
  /** Usual values, for lists; units may be any of the right kind. */
  readonly choices: readonly string[];
}

const unit = (key: string, label: string, of: UnitSetting & QuantityKind, choices: readonly string[]): SettingRow => ({
  key,
  label,
  kind: 'unit',
  unit: of,
  default: unitOf(choices[0] ?? '', of).symbol,
  choices,
});

/** The settings in the order of the Units sheet; the first choice of a unit is its default. */
export const SETTINGS: readonly SettingRow[] = [
  unit('temperature', 'Temperature', 'temperature', ['degC', 'K', 'degF', 'degR']),
  unit('pressure', 'Pressure', 'pressure', [
    ...['kPa', 'Pa', 'MPa', 'bar', 'mbar', 'atm', 'psi', 'mmHg', 'torr', 'inHg'],
    ...['kPa gauge', 'bar gauge', 'psi gauge'],
  ]),
  { key: 'barometer', label: 'Barometer', kind: 'barometer', default: '101.325 kPa', choices: [] },
  unit('heat', 'Heat', 'heat', [
    ...['kJ/kg', 'J/g', 'MJ/kg', 'kJ/mol', 'J/mol', 'kcal_th/mol', 'kcal_IT/kg', 'cal_th/g', 'Btu_IT/lb', 'kWh/t'],
  ]),
  unit('heat_capacity', 'Heat capacity', 'heatCapacity', [
    ...['kJ/(kg K)', 'J/(g K)', 'J/(kg K)', 'J/(mol K)', 'cal_th/(mol K)', 'kcal_IT/(kg K)', 'Btu_IT/(lb degF)'],
  ]),
  unit('amount', 'Amount', 'amount', ['kg', 'g', 't', 'lb', 'mol', 'kmol', 'lbmol']),
  unit('energy', 'Energy', 'energy', ['kJ', 'J', 'MJ', 'GJ', 'kWh', 'MWh', 'kcal_th', 'kcal_IT', 'Btu_IT', 'MMBtu_IT']),
  unit('flow', 'Flow', 'flow', ['kg/h', 'kg/s', 't/h', 'g/s', 'lb/h', 'mol/s', 'kmol/h', 'lbmol/h']),
  unit('power', 'Power', 'power', [
    'kW',
    'W',
    'MW',
    'kcal_th/h',
    'Btu_IT/h',
    'MMBtu_IT/h',
    'hp_mechanical',
    'ton_refrigeration',
  ]),
  { key: 'out_of_range', label: 'Out of range', kind: 'outOfRange', default: 'refuse', choices: ['refuse', 'extend'] },
  { key: 'decimal', label: 'Decimal separator', kind: 'decimal', default: '.', choices: ['.', ','] },
];

/** A key as it is compared: case, spaces, underscores and hyphens do not matter. */
export function plainKey(text: string): string {
  return text.toLowerCase().replace(/[\s_\-\u00a0]+/g, '');
}
