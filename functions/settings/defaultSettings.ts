import { unitOf } from '../../core/units/unitOf';
import { SETTINGS, type UnitSetting } from './schema';
import type { Settings } from './settingsType';

const NO_OPTIONS: Readonly<Record<string, string>> = Object.freeze({});

function defaultUnit(setting: UnitSetting): Settings['units'][UnitSetting] {
  const row = SETTINGS.find((r) => r.unit === setting);
  return unitOf(row?.default ?? '', setting);
}

/** What holds where a workbook has no Units sheet. The barometer is one standard atmosphere (10th CGPM, 1954). */
export const DEFAULT_SETTINGS: Settings = Object.freeze({
  units: Object.freeze({
    temperature: defaultUnit('temperature'),
    pressure: defaultUnit('pressure'),
    heat: defaultUnit('heat'),
    heatCapacity: defaultUnit('heatCapacity'),
    amount: defaultUnit('amount'),
    energy: defaultUnit('energy'),
    flow: defaultUnit('flow'),
    power: defaultUnit('power'),
  }),
  barometerPa: 101325,
  outOfRange: 'refuse',
  decimal: '.',
  options: NO_OPTIONS,
});
