import { SETTINGS, type SettingRow } from './schema';
import type { Settings } from './settingsType';

/** The settings as rows of the Units sheet: label and value. */
export function settingsRows(settings: Settings): [label: string, value: string][] {
  return SETTINGS.map((row) => [row.label, valueOf(row, settings)]);
}

/** The settings as one text, `key=value; key=value`, options last. */
export function settingsText(settings: Settings): string {
  const rows = SETTINGS.map((row) => [row.key, valueOf(row, settings)]);
  return [...rows, ...Object.entries(settings.options)].map(([key, value]) => `${key}=${value}`).join('; ');
}

function valueOf(row: SettingRow, settings: Settings): string {
  if (row.unit !== undefined) return settings.units[row.unit].symbol;
  switch (row.kind) {
    case 'barometer':
      return barometerText(settings);
    case 'outOfRange':
      return settings.outOfRange;
    default:
      return settings.decimal;
  }
}

/** In kPa where that says it exactly, else in Pa. */
function barometerText({ barometerPa, decimal }: Settings): string {
  const kilopascal = barometerPa / 1000;
  const text = kilopascal * 1000 === barometerPa ? `${kilopascal} kPa` : `${barometerPa} Pa`;
  return text.replace('.', decimal);
}
