import { findSubstance } from '../../../core/catalogue/find';
import { fromMolar } from '../../../core/units/fromMolar';
import { fromSi } from '../../../core/units/fromSi';
import type { Linear } from '../../../core/units/linear';
import type { Settings } from '../../../functions/settings/settings';
import { number, prettyUnit } from '../look/number';

const EXAMPLE_K = 333.15;

/**
 * One line of numbers in the units chosen, computed here: water at 60 °C.
 * @example previewText(DEFAULT_SETTINGS) // => "Water at 60 °C: latent heat 2357.65 kJ/kg, saturation pressure 19.9464 kPa"
 */
export function previewText(settings: Settings): string {
  const water = findSubstance('water');
  const { temperature, heat, pressure } = settings.units;
  const write = (si: number, { scale, offset }: Linear, symbol: string): string =>
    `${number(scale * si + offset, settings.decimal)} ${prettyUnit(symbol)}`;
  const latent = water.latent('vaporization', 'coexistence').at(EXAMPLE_K);
  const saturation = water.saturationPressure('stable').at(EXAMPLE_K);
  return (
    `Water at ${write(EXAMPLE_K, fromSi(temperature), temperature.symbol)}: ` +
    `latent heat ${write(latent, fromMolar(heat, water.molarMass), heat.symbol)}, ` +
    `saturation pressure ${write(saturation, fromSi(pressure, settings.barometerPa), pressure.symbol)}`
  );
}
