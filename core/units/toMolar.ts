import type { Linear } from './linear';
import { perMole } from './perMole';
import type { Unit } from './unit';

/**
 * Compiles the conversion from a unit of heat, heat capacity, amount or flow to molar SI: J/mol, J/(mol K), mol, mol/s.
 *
 * h_molar = M · h_mass; n = m / M
 *
 * @param unit unit per or of mass, or per or of moles
 * @param molarMass kg/mol; needed for units on the basis of mass
 * @throws Problem `argument` for a missing molar mass, or for a unit without an amount in it
 * @example
 * toMolar(unitOf('kJ/kg'), 0.018).scale // => 18
 */
export function toMolar(unit: Unit, molarMass?: number): Linear {
  return { scale: unit.factor * perMole(unit, molarMass), offset: 0 };
}
