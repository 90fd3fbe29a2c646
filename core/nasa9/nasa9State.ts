import { intervalAt } from './intervalAt';
import { cpOverR, nasa9Cp } from './nasa9Cp';
import { enthalpyOverR, nasa9Enthalpy } from './nasa9Enthalpy';
import { entropyOverR, nasa9Entropy } from './nasa9Entropy';
import { NASA9_R } from './nasa9Source';
import type { Nasa9Species } from './nasa9Types';

/** Heat capacity, enthalpy and Gibbs energy at one temperature, J/(mol K) and J/mol. */
export interface Nasa9State {
  heatCapacity: number;
  enthalpy: number;
  gibbs: number;
}

export function emptyNasa9State(): Nasa9State {
  return { heatCapacity: NaN, enthalpy: NaN, gibbs: NaN };
}

/**
 * All of `nasa9Cp`, `nasa9Enthalpy` and `nasa9Gibbs` at once, for loops that need them together.
 *
 * @param species from `nasa9Species`
 * @param temperatureK above 0 K
 * @param out filled in
 * @source McBride, Zehe & Gordon, NASA/TP-2002-211556 (2002)
 */
export function nasa9State(species: Nasa9Species, temperatureK: number, out: Nasa9State): void {
  if (temperatureK >= species.fromK && temperatureK <= species.toK) {
    const interval = intervalAt(species, temperatureK);
    const logarithm = Math.log(temperatureK);
    out.heatCapacity = NASA9_R * cpOverR(interval, temperatureK);
    out.enthalpy = NASA9_R * enthalpyOverR(interval, temperatureK, logarithm);
    out.gibbs = out.enthalpy - temperatureK * NASA9_R * entropyOverR(interval, temperatureK, logarithm);
    return;
  }
  out.heatCapacity = nasa9Cp(species, temperatureK);
  out.enthalpy = nasa9Enthalpy(species, temperatureK);
  out.gibbs = out.enthalpy - temperatureK * nasa9Entropy(species, temperatureK);
}
