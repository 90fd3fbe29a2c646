import { Problem } from '../problem';
import { kindWords } from './kindWords';
import type { Unit } from './unit';

/**
 * How many times a molar quantity is the same quantity on the unit's basis: M, 1/M or 1, SI.
 *
 * A molar mass of NaN says that none is known (a plant's own concentrate): such a material is counted in kilograms
 * throughout, so that units of mass need no factor, and units of moles are refused.
 */
export function perMole(unit: Unit, molarMass: number | undefined): number {
  if (Number.isNaN(molarMass) && unit.basis === 'mass') return 1;
  if (unit.basis === 'mole') {
    if (Number.isNaN(molarMass)) checkedMolarMass(molarMass, `for ${unit.symbol}`);
    return 1;
  }
  if (unit.basis === null) {
    throw new Problem({
      code: 'argument',
      argument: 'unit',
      allowed: 'a unit of heat, heat capacity, amount or flow',
      received: `${unit.symbol}, a unit of ${kindWords(unit.kind)}`,
    });
  }
  const mass = checkedMolarMass(molarMass, `to go between mass and moles in ${unit.symbol}`);
  return unit.kind === 'heat' || unit.kind === 'heatCapacity' ? mass : 1 / mass;
}

/** A molar mass in kg/mol that is there and positive. */
export function checkedMolarMass(molarMass: number | undefined, purpose: string): number {
  if (molarMass !== undefined && molarMass > 0 && Number.isFinite(molarMass)) return molarMass;
  throw new Problem({
    code: 'argument',
    argument: 'molar mass',
    allowed: `a positive number or a substance, ${purpose}`,
    received:
      molarMass === undefined ? 'nothing' : Number.isNaN(molarMass) ? 'a material without one' : String(molarMass),
  });
}
