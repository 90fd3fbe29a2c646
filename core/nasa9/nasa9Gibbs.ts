import { nasa9Enthalpy } from './nasa9Enthalpy';
import { nasa9Entropy } from './nasa9Entropy';
import type { Nasa9Species } from './nasa9Types';

/**
 * Gibbs energy at 1 bar.
 *
 * G = H − T·S
 *
 * @param species from `nasa9Species`
 * @param temperatureK above 0 K
 * @returns J/mol
 * @source McBride, Zehe & Gordon, NASA/TP-2002-211556 (2002)
 * @example
 * nasa9Gibbs(nasa9Species('N2'), 298.15) // => -57128.4
 */
export function nasa9Gibbs(species: Nasa9Species, temperatureK: number): number {
  return nasa9Enthalpy(species, temperatureK) - temperatureK * nasa9Entropy(species, temperatureK);
}
