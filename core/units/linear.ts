import { exactOf } from './makeUnit';
import { doubleOf, minus, power, times, type Rational } from './rational';
import type { Unit } from './unit';

/** y = scale · x + offset: a conversion, compiled once and cheap for every element. */
export interface Linear {
  readonly scale: number;
  readonly offset: number;
}

const compiled = new WeakMap<Unit, WeakMap<Unit, Linear>>();

/** A conversion between two units as written, compiled once a pair: exact fractions that are rounded once. */
export function between(from: Unit, to: Unit): Linear {
  let targets = compiled.get(from);
  if (targets === undefined) compiled.set(from, (targets = new WeakMap()));
  let linear = targets.get(to);
  if (linear === undefined) targets.set(to, (linear = compile(from, to)));
  return linear;
}

function compile(from: Unit, to: Unit): Linear {
  const a = exactOf(from);
  const b = exactOf(to);
  const perTo = inverse(b.factor);
  return { scale: doubleOf(times(a.factor, perTo)), offset: doubleOf(times(minus(a.offset, b.offset), perTo)) };
}

/** One divided by the factor of a unit, rounded once. */
export function inverseFactor(unit: Unit): number {
  return doubleOf(inverse(exactOf(unit).factor));
}

function inverse(fraction: Rational): Rational {
  return power(fraction, -1);
}
