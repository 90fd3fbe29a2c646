import { emptyNasa9State, nasa9State } from './nasa9State';
import type { Nasa9Species } from './nasa9Types';

const state = emptyNasa9State();

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
 * import { nasa9Gibbs, nasa9Species } from 'latentry';
 * nasa9Gibbs(nasa9Species('N2'), 298.15) // => -57128.4
 */
export function nasa9Gibbs(species: Nasa9Species, temperatureK: number): number {
  nasa9State(species, temperatureK, state);
  return state.gibbs;
}
