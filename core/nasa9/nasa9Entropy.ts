import { intervalAt } from './intervalAt';
import { cpOverR } from './nasa9Cp';
import { NASA9_R } from './nasa9Source';
import type { Nasa9Interval, Nasa9Species } from './nasa9Types';

/**
 * Entropy at 1 bar.
 *
 * S/R = −a1·T⁻²/2 − a2·T⁻¹ + a3·ln T + a4·T + a5·T²/2 + a6·T³/3 + a7·T⁴/4 + b2
 *
 * Beyond [fromK, toK] it is the integral of the extended heat capacity of `nasa9Cp` over the temperature.
 *
 * @param species from `nasa9Species`
 * @param temperatureK above 0 K
 * @returns J/(mol K)
 * @source McBride, Zehe & Gordon, NASA/TP-2002-211556 (2002), equation for S°/R
 * @example
 * import { nasa9Entropy, nasa9Species } from 'latentry';
 * nasa9Entropy(nasa9Species('N2'), 298.15) // => 191.6097
 */
export function nasa9Entropy(species: Nasa9Species, temperatureK: number): number {
  const { fromK, toK } = species;
  if (temperatureK < fromK) {
    const { floor, height, thetaK } = species.low;
    const start = entropyOverR(intervalAt(species, fromK), fromK);
    const gain = (t: number): number => floor * Math.log(t) + height * vibration(thetaK / t);
    return NASA9_R * (start + gain(temperatureK) - gain(fromK));
  }
  if (temperatureK > toK) {
    const last = intervalAt(species, toK);
    return NASA9_R * (entropyOverR(last, toK) + cpOverR(last, toK) * Math.log(temperatureK / toK));
  }
  return NASA9_R * entropyOverR(intervalAt(species, temperatureK), temperatureK);
}

/** Entropy of one vibration at x = θ/T, divided by R. */
function vibration(x: number): number {
  return x > 700 ? 0 : x / Math.expm1(x) - Math.log(-Math.expm1(-x));
}

/** S/R of one interval. */
export function entropyOverR({ a, b2 }: Nasa9Interval, t: number, logarithm = Math.log(t)): number {
  return (
    (-(a[0] ?? 0) / (2 * t) - (a[1] ?? 0)) / t +
    (a[2] ?? 0) * logarithm +
    b2 +
    t * ((a[3] ?? 0) + t * ((a[4] ?? 0) / 2 + t * ((a[5] ?? 0) / 3 + (t * (a[6] ?? 0)) / 4)))
  );
}
