import type { OutOfRange } from '../evaluate';
import type { Substance } from '../substance';
import { endsOf } from './heatSteps';
import type { State } from './state';

/**
 * Heat per amount taken up between two states at one pressure, through every phase and transition between them.
 *
 * heat = h(to) − h(from)
 *
 * @param substance the substance
 * @param from first state
 * @param to last state
 * @param pressurePa absolute pressure
 * @param policy whether temperatures beyond the published range are extended
 * @returns J/mol, negative where heat is given up
 * @throws Problem as `heatSteps` does
 * @example
 * import { heat, water } from 'latentry';
 * heat(water, { form: 'saturated', phase: 'liquid' }, { form: 'saturated', phase: 'gas' }, 101325) / water.molarMass // => 2256471.6
 */
export function heat(
  substance: Substance,
  from: State,
  to: State,
  pressurePa: number,
  policy: OutOfRange = 'refuse',
): number {
  const [a, b] = endsOf(substance, from, to, pressurePa, policy);
  return b.enthalpy - a.enthalpy;
}
