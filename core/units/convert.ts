import { Problem } from '../problem';
import { conversion, type ConversionNeeds } from './conversion';
import type { Unit } from './unit';

/**
 * Converts one value from a unit to another; `conversion` is the compiled form for many.
 *
 * @param value number in `from`
 * @param from unit of the value
 * @param to unit of the result, of the same kind
 * @param needs molar mass (kg/mol), barometer (Pa), and whether a temperature is a `point` or a `difference`
 * @returns number in `to`
 * @throws Problem `argument` for units of different kinds, for what is needed and missing, and for a value that is not finite
 * or lies at or below absolute zero, or below zero absolute pressure
 * @source NIST Special Publication 811 (2008), Appendix B
 * @example
 * convert(100, unitOf('degC'), unitOf('degF'), { as: 'point' }) // => 212
 */
export function convert(value: number, from: Unit, to: Unit, needs: ConversionNeeds = {}): number {
  const { scale, offset } = conversion(from, to, needs);
  if (from.gauge && value * from.factor + (needs.barometerPa ?? Infinity) < 0) {
    throw refused('an absolute pressure of at least 0 Pa', value, from);
  }
  if (from.kind === 'pressure' && !from.gauge && value < 0)
    throw refused('an absolute pressure of at least 0 Pa', value, from);
  const isPoint = from.kind === 'temperature' && to.kind === 'temperature' && needs.as !== 'difference';
  if (isPoint && value * from.factor + from.offset <= 0)
    throw refused('a temperature above absolute zero, 0 K', value, from);
  const result = scale * value + offset;
  if (!Number.isFinite(result)) throw refused('a finite number', value, from);
  return result;
}

function refused(allowed: string, value: number, unit: Unit): Problem {
  return new Problem({ code: 'argument', argument: 'value', allowed, received: `${value} ${unit.symbol}` });
}
