import { lowTail } from '../nasa9/lowTail';
import { cpOverR } from '../nasa9/nasa9Cp';
import { NASA9_R } from '../nasa9/nasa9Source';
import type { Nasa9Interval, Nasa9Species } from '../nasa9/nasa9Types';

/** Heat capacity divided by R that a bent molecule keeps as T → 0: translation and rotation. */
const BENT_FLOOR = 4;

/**
 * An ideal gas whose heat capacity is a cubic in T fitted to cited points; its enthalpy is zero at 298.15 K.
 *
 * @param a four coefficients of cp/R for the powers 0 to 3 of T/(1000 K)
 * @param fromK colder end of the points; below, one vibration continues value and slope
 * @param toK hotter end; above, the heat capacity is kept
 */
export function gasFromPoints(
  name: string,
  molarMass: number,
  a: readonly number[],
  fromK: number,
  toK: number,
): Nasa9Species {
  const scaled = a.map((coefficient, power) => coefficient / 1000 ** power);
  const [a0 = 0, a1 = 0, a2 = 0, a3 = 0] = scaled;
  const t = 298.15;
  const b1 = -t * (a0 + t * (a1 / 2 + t * (a2 / 3 + (t * a3) / 4)));
  const interval: Nasa9Interval = { fromK, toK, a: [0, 0, a0, a1, a2, a3, 0], b1, b2: 0 };
  const cp = cpOverR(interval, fromK);
  const slope = (cpOverR(interval, fromK + 0.01) - cp) / 0.01;
  return {
    name,
    phase: 'gas',
    molarMass,
    comment: `cubic in T through cited points, ${NASA9_R} J/(mol K)`,
    intervals: [interval],
    fromK,
    toK,
    releaseFromK: fromK,
    low: lowTail(fromK, cp, slope, BENT_FLOOR),
  };
}

/** The same gas with another heat capacity, divided by R, that is left as T → 0 below its data. */
export function withFloor(gas: Nasa9Species, floor: number): Nasa9Species {
  const [first] = gas.intervals;
  if (first === undefined) return gas;
  const cp = cpOverR(first, gas.fromK);
  const slope = (cpOverR(first, gas.fromK + 0.01) - cp) / 0.01;
  return { ...gas, low: lowTail(gas.fromK, cp, slope, floor) };
}
