import { barometerOf } from './barometer';
import { between, inverseFactor, type Linear } from './linear';
import { siUnit } from './siUnit';
import type { Unit } from './unit';

/**
 * Compiles the conversion from SI of the unit's own basis to a unit.
 *
 * x = scale · SI + offset
 *
 * @param unit unit of x
 * @param barometerPa absolute pressure that gauge pressures are counted from, Pa
 * @throws Problem `argument` for a gauge unit without a barometer
 * @source NIST Special Publication 811 (2008), Appendix B
 * @example
 * fromSi(unitOf('degF')) // => { scale: 1.8, offset: -459.67 }
 */
export function fromSi(unit: Unit, barometerPa?: number): Linear {
  if (unit.gauge) return { scale: inverseFactor(unit), offset: -barometerOf(unit, barometerPa) / unit.factor };
  return between(siUnit(unit.kind, unit.basis), unit);
}
