import { intervalAt } from './intervalAt';
import { cpOverR } from './nasa9Cp';
import { NASA9_R } from './nasa9Source';
import type { Nasa9Interval, Nasa9Species } from './nasa9Types';

/**
 * Enthalpy at 1 bar; zero for the elements in their reference state at 298.15 K.
 *
 * H/(R·T) = −a1·T⁻² + a2·ln(T)/T + a3 + a4·T/2 + a5·T²/3 + a6·T³/4 + a7·T⁴/5 + b1/T
 *
 * Beyond [fromK, toK] it is the integral of the extended heat capacity of `nasa9Cp`.
 *
 * @param species from `nasa9Species`
 * @param temperatureK above 0 K
 * @returns J/mol
 * @source McBride, Zehe & Gordon, NASA/TP-2002-211556 (2002), equation for H°/(RT)
 * @example
 * import { nasa9Enthalpy, nasa9Species } from 'latentry';
 * nasa9Enthalpy(nasa9Species('C2H5OH'), 298.15) // => -234950
 */
export function nasa9Enthalpy(species: Nasa9Species, temperatureK: number): number {
  const { fromK, toK } = species;
  if (temperatureK < fromK) {
    const { floor, height, thetaK } = species.low;
    const start = enthalpyOverR(intervalAt(species, fromK), fromK);
    const heat = (t: number): number => floor * t + height * vibration(thetaK, t);
    return NASA9_R * (start + heat(temperatureK) - heat(fromK));
  }
  if (temperatureK > toK) {
    const last = intervalAt(species, toK);
    return NASA9_R * (enthalpyOverR(last, toK) + cpOverR(last, toK) * (temperatureK - toK));
  }
  return NASA9_R * enthalpyOverR(intervalAt(species, temperatureK), temperatureK);
}

/** θ/(e^(θ/T) − 1): what one vibration holds at T, K. */
function vibration(thetaK: number, t: number): number {
  return thetaK / Math.expm1(thetaK / t);
}

/** H/R of one interval, K. */
export function enthalpyOverR({ a, b1 }: Nasa9Interval, t: number, logarithm = Math.log(t)): number {
  return (
    -(a[0] ?? 0) / t +
    (a[1] ?? 0) * logarithm +
    b1 +
    t * ((a[2] ?? 0) + t * ((a[3] ?? 0) / 2 + t * ((a[4] ?? 0) / 3 + t * ((a[5] ?? 0) / 4 + (t * (a[6] ?? 0)) / 5))))
  );
}
