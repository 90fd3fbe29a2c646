import { exactOf, makeUnit } from './makeUnit';
import type { Unit } from './unit';

/**
 * The unit of differences on a temperature scale: K for kelvin and degrees Celsius, `degF difference` for Fahrenheit.
 *
 * @param unit a temperature unit, or a difference already
 * @example
 * differenceUnit(unitOf('degF')).symbol // => 'degF difference'
 */
export function differenceUnit(unit: Unit): Unit {
  if (unit.kind === 'difference') return unit;
  const kelvin = unit.symbol === 'K' || unit.symbol === 'degC';
  return makeUnit(kelvin ? 'K' : `${unit.symbol} difference`, 'difference', null, exactOf(unit).factor);
}
