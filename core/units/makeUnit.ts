import { ZERO, doubleOf, type Rational } from './rational';
import type { Basis, Unit, UnitKind } from './unit';

interface Exact {
  readonly factor: Rational;
  readonly offset: Rational;
}

const exact = new WeakMap<Unit, Exact>();
const known = new Map<string, Unit>();

/** One object a unit: the same symbol and kind always give the same one, with its factor rounded once. */
export function makeUnit(
  symbol: string,
  kind: UnitKind,
  basis: Basis,
  factor: Rational,
  offset: Rational = ZERO,
  gauge = false,
): Unit {
  const key = `${kind} ${symbol}`;
  const found = known.get(key);
  if (found !== undefined) return found;
  const unit = Object.freeze({ symbol, kind, factor: doubleOf(factor), offset: doubleOf(offset), basis, gauge });
  exact.set(unit, { factor, offset });
  known.set(key, unit);
  return unit;
}

/** Factor and offset of a unit as exact fractions; those of a hand-made unit are its doubles. */
export function exactOf(unit: Unit): Exact {
  return exact.get(unit) ?? { factor: rationalOfDouble(unit.factor), offset: rationalOfDouble(unit.offset) };
}

/** A finite double is a whole number divided by a power of two. */
export function rationalOfDouble(value: number): Rational {
  let scaled = value;
  let d = 1n;
  while (!Number.isInteger(scaled)) {
    scaled *= 2;
    d *= 2n;
  }
  return { n: BigInt(scaled), d };
}
