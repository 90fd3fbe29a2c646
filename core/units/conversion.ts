import { Problem } from '../problem';
import { barometerOf } from './barometer';
import { differenceUnit } from './differenceUnit';
import { kindWords } from './kindWords';
import { between, type Linear } from './linear';
import { checkedMolarMass } from './perMole';
import type { Unit } from './unit';

/** What a conversion may need beyond its two units. */
export interface ConversionNeeds {
  /** kg/mol, between mass and moles. */
  readonly molarMass?: number | undefined;
  /** Pa, between gauge and absolute pressures. */
  readonly barometerPa?: number | undefined;
  /** Whether a temperature is a point on its scale or a difference. */
  readonly as?: 'point' | 'difference' | undefined;
}

/**
 * Compiles the conversion from one unit to another: y = scale · x + offset.
 *
 * @param from unit of x
 * @param to unit of y, of the same kind; per mass against molar needs `molarMass`, gauge needs `barometerPa`, two
 * different temperature scales need `as` unless one of the units says `difference`
 * @throws Problem `argument` for units of different kinds, and for what is needed and missing
 * @source NIST Special Publication 811 (2008), Appendix B
 * @example
 * conversion(unitOf('degC'), unitOf('degF'), { as: 'point' }) // => { scale: 1.8, offset: 32 }
 */
export function conversion(from: Unit, to: Unit, needs: ConversionNeeds = {}): Linear {
  if (isTemperature(from) && isTemperature(to)) return temperatureConversion(from, to, needs.as);
  if (from.kind !== to.kind) {
    throw new Problem({
      code: 'argument',
      argument: 'to',
      allowed: `a unit of ${kindWords(from.kind)}, as ${from.symbol} is`,
      received: `${to.symbol}, a unit of ${kindWords(to.kind)}`,
    });
  }
  const { scale, offset } = between(from, to);
  if (from.basis !== to.basis) return { scale: scale * basisFactor(from, to, needs.molarMass), offset: 0 };
  if (from.gauge === to.gauge) return { scale, offset };
  return { scale, offset: (barometerOf(from, needs.barometerPa) - barometerOf(to, needs.barometerPa)) / to.factor };
}

function isTemperature(unit: Unit): boolean {
  return unit.kind === 'temperature' || unit.kind === 'difference';
}

function temperatureConversion(from: Unit, to: Unit, as: ConversionNeeds['as']): Linear {
  const difference = from.kind === 'difference' || to.kind === 'difference';
  if (difference && as === 'point') {
    const said = from.kind === 'difference' ? from : to;
    throw new Problem({
      code: 'argument',
      argument: 'kind',
      allowed: 'difference',
      received: `point, with ${said.symbol}`,
    });
  }
  if (difference || as === 'difference') return between(differenceUnit(from), differenceUnit(to));
  if (as === 'point' || from.offset === to.offset) return between(from, to);
  throw new Problem({
    code: 'argument',
    argument: 'kind',
    allowed: 'point or difference: a temperature and a temperature difference convert differently',
    received: `${from.symbol} to ${to.symbol} without it`,
  });
}

/** SI of `from`'s basis to SI of `to`'s basis. */
function basisFactor(from: Unit, to: Unit, molarMass: number | undefined): number {
  const mass = checkedMolarMass(molarMass, `to go from ${from.symbol} to ${to.symbol}`);
  const perAmount = from.kind === 'heat' || from.kind === 'heatCapacity';
  return (from.basis === 'mass') === perAmount ? mass : 1 / mass;
}
