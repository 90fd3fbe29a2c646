import { barometerOf } from './barometer';
import type { Linear } from './linear';
import type { Unit } from './unit';

/**
 * Compiles the conversion from a unit to SI of the unit's own basis (J/kg for `kJ/kg`, J/mol for `kJ/mol`).
 *
 * SI = scale · x + offset
 *
 * @param unit unit of x
 * @param barometerPa absolute pressure that gauge pressures are counted from, Pa
 * @throws Problem `argument` for a gauge unit without a barometer
 * @source NIST Special Publication 811 (2008), Appendix B
 * @example
 * toSi(unitOf('degC')) // => { scale: 1, offset: 273.15 }
 */
export function toSi(unit: Unit, barometerPa?: number): Linear {
  return { scale: unit.factor, offset: unit.offset + barometerOf(unit, barometerPa) };
}
