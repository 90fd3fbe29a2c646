import { inverseFactor, type Linear } from './linear';
import { perMole } from './perMole';
import type { Unit } from './unit';

/**
 * Compiles the conversion from molar SI (J/mol, J/(mol K), mol, mol/s) to a unit of heat, heat capacity, amount or flow.
 *
 * h_mass = h_molar / M; m = n · M
 *
 * @param unit unit per or of mass, or per or of moles
 * @param molarMass kg/mol; needed for units on the basis of mass
 * @throws Problem `argument` for a missing molar mass, or for a unit without an amount in it
 * @example
 * fromMolar(unitOf('kJ/mol')).scale // => 0.001
 */
export function fromMolar(unit: Unit, molarMass?: number): Linear {
  return { scale: inverseFactor(unit) / perMole(unit, molarMass), offset: 0 };
}
