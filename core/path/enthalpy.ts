import type { OutOfRange } from '../evaluate';
import type { Substance } from '../substance';
import { placeState } from './placeState';
import type { State } from './state';

/**
 * Enthalpy of one state at a pressure, on the reference that the substance names.
 *
 * @param substance the substance; its `enthalpyReference` says where zero is
 * @param state the state
 * @param pressurePa absolute pressure
 * @param policy whether a temperature beyond the published range is extended
 * @returns J/mol
 * @throws Problem as `placeState` does
 * @example
 * import { enthalpy, water } from 'latentry';
 * enthalpy(water, { form: 'temperature', temperatureK: 298.15 }, 1e5) / water.molarMass // => 104918.9
 */
export function enthalpy(
  substance: Substance,
  state: State,
  pressurePa: number,
  policy: OutOfRange = 'refuse',
): number {
  return placeState(substance, state, pressurePa, policy).enthalpy;
}
