import {
  ICE_G0,
  ICE_R1,
  ICE_R20,
  ICE_R21,
  ICE_R22,
  ICE_REDUCING_PRESSURE_PA,
  ICE_S0,
  ICE_T1,
  ICE_T2,
  NORMAL_PRESSURE_PA,
  TRIPLE_TEMPERATURE_K,
} from './iceCoefficients';

/** Properties of ice Ih at one temperature and pressure, per kilogram, in SI. */
export interface IceState {
  temperatureK: number;
  pressure: number;
  /** J/kg */
  gibbs: number;
  enthalpy: number;
  /** J/(kg K) */
  entropy: number;
  cp: number;
  /** g_p, m3/kg */
  volume: number;
  /** g_Tp, m3/(kg K) */
  volumeByTemperature: number;
  /** g_pp, m3/(kg Pa) */
  volumeByPressure: number;
  /** g_TT, J/(kg K2) */
  gibbsTT: number;
}

/** A state to be filled. */
export function emptyIceState(): IceState {
  return {
    temperatureK: 0,
    pressure: 0,
    gibbs: 0,
    enthalpy: 0,
    entropy: 0,
    cp: 0,
    volume: 0,
    volumeByTemperature: 0,
    volumeByPressure: 0,
    gibbsTT: 0,
  };
}

const [g00, g01, g02, g03, g04] = ICE_G0;
const P0 = NORMAL_PRESSURE_PA / ICE_REDUCING_PRESSURE_PA;

/** Real and imaginary part of the bracket of one resonance term and of its first two tau derivatives. */
interface Bracket {
  re: number;
  im: number;
  re1: number;
  im1: number;
  re2: number;
  im2: number;
}
const first: Bracket = { re: 0, im: 0, re1: 0, im1: 0, re2: 0, im2: 0 };
const second: Bracket = { re: 0, im: 0, re1: 0, im1: 0, re2: 0, im2: 0 };

/**
 * (t - tau) ln(t - tau) + (t + tau) ln(t + tau) - 2 t ln t - tau^2/t for complex t with positive imaginary part,
 * with its derivatives -ln(t - tau) + ln(t + tau) - 2 tau/t and 1/(t - tau) + 1/(t + tau) - 2/t, in real arithmetic.
 */
function bracket(t: readonly [number, number], tau: number, out: Bracket): void {
  const [x, y] = t;
  const square = x * x + y * y;
  const below = x - tau;
  const above = x + tau;
  const belowSquare = below * below + y * y;
  const aboveSquare = above * above + y * y;
  const lnBelow = 0.5 * Math.log(belowSquare);
  const lnAbove = 0.5 * Math.log(aboveSquare);
  const lnT = 0.5 * Math.log(square);
  const angleBelow = Math.atan2(y, below);
  const angleAbove = Math.atan2(y, above);
  const angleT = Math.atan2(y, x);
  const inverseRe = x / square;
  const inverseIm = -y / square;
  out.re =
    below * lnBelow -
    y * angleBelow +
    (above * lnAbove - y * angleAbove) -
    2 * (x * lnT - y * angleT) -
    tau * tau * inverseRe;
  out.im =
    below * angleBelow +
    y * lnBelow +
    (above * angleAbove + y * lnAbove) -
    2 * (x * angleT + y * lnT) -
    tau * tau * inverseIm;
  out.re1 = lnAbove - lnBelow - 2 * tau * inverseRe;
  out.im1 = angleAbove - angleBelow - 2 * tau * inverseIm;
  out.re2 = below / belowSquare + above / aboveSquare - 2 * inverseRe;
  out.im2 = -y / belowSquare - y / aboveSquare - 2 * inverseIm;
}

/**
 * All properties of ice Ih at a temperature and pressure.
 *
 * g(T, p) = g0(p) - s0 Tt tau + Tt Re sum r_k [(t_k - tau) ln(t_k - tau) + (t_k + tau) ln(t_k + tau) - 2 t_k ln t_k - tau^2/t_k]
 *
 * @param temperatureK 0 K to the melting or sublimation curve
 * @param pressurePa 0 Pa to about 210 MPa
 * @param out filled and given back
 * @source IAPWS R10-06(2009), Eqs. 1 to 3, with s0 of the reference state of R6-95
 */
export function iceState(temperatureK: number, pressurePa: number, out: IceState): IceState {
  const tau = temperatureK / TRIPLE_TEMPERATURE_K;
  const q = pressurePa / ICE_REDUCING_PRESSURE_PA - P0;
  bracket(ICE_T1, tau, first);
  bracket(ICE_T2, tau, second);
  const g0 = g00 + q * (g01 + q * (g02 + q * (g03 + q * g04)));
  const g0p = (g01 + q * (2 * g02 + q * (3 * g03 + q * 4 * g04))) / ICE_REDUCING_PRESSURE_PA;
  const g0pp = (2 * g02 + q * (6 * g03 + q * 12 * g04)) / (ICE_REDUCING_PRESSURE_PA * ICE_REDUCING_PRESSURE_PA);
  const r2re = ICE_R20[0] + q * (ICE_R21[0] + q * ICE_R22[0]);
  const r2im = ICE_R20[1] + q * (ICE_R21[1] + q * ICE_R22[1]);
  const r2pRe = (ICE_R21[0] + 2 * q * ICE_R22[0]) / ICE_REDUCING_PRESSURE_PA;
  const r2pIm = (ICE_R21[1] + 2 * q * ICE_R22[1]) / ICE_REDUCING_PRESSURE_PA;
  const r2ppRe = (2 * ICE_R22[0]) / (ICE_REDUCING_PRESSURE_PA * ICE_REDUCING_PRESSURE_PA);
  const r2ppIm = (2 * ICE_R22[1]) / (ICE_REDUCING_PRESSURE_PA * ICE_REDUCING_PRESSURE_PA);
  const [r1re, r1im] = ICE_R1;
  const heat = r1re * first.re - r1im * first.im + (r2re * second.re - r2im * second.im);
  const heat1 = r1re * first.re1 - r1im * first.im1 + (r2re * second.re1 - r2im * second.im1);
  const heat2 = r1re * first.re2 - r1im * first.im2 + (r2re * second.re2 - r2im * second.im2);
  const gibbs = g0 - ICE_S0 * temperatureK + TRIPLE_TEMPERATURE_K * heat;
  const gibbsT = heat1 - ICE_S0;
  const gibbsTT = heat2 / TRIPLE_TEMPERATURE_K;
  out.temperatureK = temperatureK;
  out.pressure = pressurePa;
  out.gibbs = gibbs;
  out.entropy = -gibbsT;
  out.enthalpy = g0 + TRIPLE_TEMPERATURE_K * (heat - tau * heat1);
  out.cp = 0 - temperatureK * gibbsTT;
  out.gibbsTT = gibbsTT;
  out.volume = g0p + TRIPLE_TEMPERATURE_K * (r2pRe * second.re - r2pIm * second.im);
  out.volumeByTemperature = r2pRe * second.re1 - r2pIm * second.im1;
  out.volumeByPressure = g0pp + TRIPLE_TEMPERATURE_K * (r2ppRe * second.re - r2ppIm * second.im);
  return out;
}
