import { intervalAt } from './intervalAt';
import { einstein } from './lowTail';
import { NASA9_R } from './nasa9Source';
import type { Nasa9Interval, Nasa9Species } from './nasa9Types';

/**
 * Heat capacity of a gas (ideal), a liquid or a crystal form at 1 bar.
 *
 * cp/R = a1·T⁻² + a2·T⁻¹ + a3 + a4·T + a5·T² + a6·T³ + a7·T⁴
 *
 * Beyond [fromK, toK] the value is an extension, for the caller to mark: below, one vibration continues value and slope
 * (a liquid keeps its heat capacity), above, the heat capacity is kept; so it stays bounded.
 *
 * @param species from `nasa9Species`
 * @param temperatureK above 0 K
 * @returns J/(mol K)
 * @source McBride, Zehe & Gordon, NASA/TP-2002-211556 (2002), equation for Cp°/R
 * @example
 * import { nasa9Cp, nasa9Species } from 'latentry';
 * nasa9Cp(nasa9Species('N2'), 298.15) // => 29.1244
 */
export function nasa9Cp(species: Nasa9Species, temperatureK: number): number {
  if (temperatureK < species.fromK) {
    const { floor, height, thetaK } = species.low;
    return NASA9_R * (floor + height * einstein(thetaK / temperatureK));
  }
  const t = temperatureK > species.toK ? species.toK : temperatureK;
  return NASA9_R * cpOverR(intervalAt(species, t), t);
}

/** cp/R of one interval. */
export function cpOverR({ a }: Nasa9Interval, t: number): number {
  return (
    ((a[0] ?? 0) / t + (a[1] ?? 0)) / t +
    (a[2] ?? 0) +
    t * ((a[3] ?? 0) + t * ((a[4] ?? 0) + t * ((a[5] ?? 0) + t * (a[6] ?? 0))))
  );
}
