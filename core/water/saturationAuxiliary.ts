import { CRITICAL_DENSITY, CRITICAL_TEMPERATURE_K } from './fluidCoefficients';

/** Critical pressure used with the saturation equations, Pa (IAPWS SR1-86(1992)). */
export const CRITICAL_PRESSURE_PA = 22.064e6;

/**
 * Auxiliary equations for saturated water; they start the solvers and serve as an independent check.
 *
 * @source IAPWS SR1-86(1992), Eqs. 1 to 7 (Wagner and Pruss 1993), 273.16 K to 647.096 K
 */
export interface AuxiliarySaturation {
  /** Pa */
  readonly pressure: number;
  /** Pa/K */
  readonly slope: number;
  /** kg/m3 */
  readonly liquidDensity: number;
  readonly vapourDensity: number;
  /** J/kg */
  readonly alpha: number;
  readonly liquidEnthalpy: number;
  readonly vapourEnthalpy: number;
  /** J/(kg K) */
  readonly phi: number;
  readonly liquidEntropy: number;
  readonly vapourEntropy: number;
}

function lnReducedPressure(temperatureK: number): number {
  const tau = 1 - temperatureK / CRITICAL_TEMPERATURE_K;
  const root = Math.sqrt(tau);
  const t3 = tau * tau * tau;
  const sum =
    -7.85951783 * tau +
    1.84408259 * tau * root -
    11.7866497 * t3 +
    22.6807411 * t3 * root -
    15.9618719 * t3 * tau +
    1.80122502 * t3 * t3 * tau * root;
  return (CRITICAL_TEMPERATURE_K / temperatureK) * sum;
}

/** ln(p/pc) = (Tc/T)(a1 tau + a2 tau^1.5 + a3 tau^3 + a4 tau^3.5 + a5 tau^4 + a6 tau^7.5), Pa. */
export function auxiliaryPressure(temperatureK: number): number {
  return CRITICAL_PRESSURE_PA * Math.exp(lnReducedPressure(temperatureK));
}

/** rho_l/rhoc = 1 + b1 tau^(1/3) + b2 tau^(2/3) + b3 tau^(5/3) + b4 tau^(16/3) + b5 tau^(43/3) + b6 tau^(110/3), kg/m3. */
export function auxiliaryLiquidDensity(temperatureK: number): number {
  const tau = 1 - temperatureK / CRITICAL_TEMPERATURE_K;
  const root = Math.cbrt(tau);
  return (
    CRITICAL_DENSITY *
    (1 +
      1.99274064 * root +
      1.09965342 * root ** 2 -
      0.510839303 * root ** 5 -
      1.75493479 * root ** 16 -
      45.5170352 * root ** 43 -
      674694.45 * root ** 110)
  );
}

/** ln(rho_v/rhoc) = c1 tau^(2/6) + c2 tau^(4/6) + c3 tau^(8/6) + c4 tau^(18/6) + c5 tau^(37/6) + c6 tau^(71/6), kg/m3. */
export function auxiliaryVapourDensity(temperatureK: number): number {
  const tau = 1 - temperatureK / CRITICAL_TEMPERATURE_K;
  const root = Math.cbrt(tau);
  const half = Math.sqrt(root);
  return (
    CRITICAL_DENSITY *
    Math.exp(
      -2.0315024 * root -
        2.6830294 * root ** 2 -
        5.38626492 * root ** 4 -
        17.2991605 * root ** 9 -
        44.7586581 * half ** 37 -
        63.9201063 * half ** 71,
    )
  );
}

/** All quantities of the release at one temperature, 273.16 K to 647.096 K. */
export function auxiliarySaturation(temperatureK: number): AuxiliarySaturation {
  const theta = temperatureK / CRITICAL_TEMPERATURE_K;
  const tau = 1 - theta;
  const pressure = auxiliaryPressure(temperatureK);
  const slope =
    (-pressure / temperatureK) *
    (lnReducedPressure(temperatureK) -
      7.85951783 +
      1.5 * 1.84408259 * tau ** 0.5 -
      3 * 11.7866497 * tau ** 2 +
      3.5 * 22.6807411 * tau ** 2.5 -
      4 * 15.9618719 * tau ** 3 +
      7.5 * 1.80122502 * tau ** 6.5);
  const liquidDensity = auxiliaryLiquidDensity(temperatureK);
  const vapourDensity = auxiliaryVapourDensity(temperatureK);
  const [d1, d2, d3, d4, d5] = [-5.65134998e-8, 2690.66631, 127.287297, -135.003439, 0.981825814];
  const alpha =
    1000 *
    (-1135.905627715 + d1 * theta ** -19 + d2 * theta + d3 * theta ** 4.5 + d4 * theta ** 5 + d5 * theta ** 54.5);
  const phi =
    (1000 / CRITICAL_TEMPERATURE_K) *
    (2319.5246 +
      (19 / 20) * d1 * theta ** -20 +
      d2 * Math.log(theta) +
      (9 / 7) * d3 * theta ** 3.5 +
      (5 / 4) * d4 * theta ** 4 +
      (109 / 107) * d5 * theta ** 53.5);
  return {
    pressure,
    slope,
    liquidDensity,
    vapourDensity,
    alpha,
    liquidEnthalpy: alpha + (temperatureK / liquidDensity) * slope,
    vapourEnthalpy: alpha + (temperatureK / vapourDensity) * slope,
    phi,
    liquidEntropy: phi + slope / liquidDensity,
    vapourEntropy: phi + slope / vapourDensity,
  };
}
