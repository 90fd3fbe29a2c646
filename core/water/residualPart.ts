import { EXPONENTIAL_TERMS, GAUSSIAN_TERMS, POLYNOMIAL_TERMS } from './fluidCoefficients';
import type { HelmholtzParts } from './helmholtzParts';
import { addNonanalytic } from './nonanalyticPart';

const plain = [...POLYNOMIAL_TERMS.map(([n, d, t]) => [n, d, t, 0] as const), ...EXPONENTIAL_TERMS];
const polynomials = POLYNOMIAL_TERMS.length;
const count = plain.length;
const coefficient = Float64Array.from(plain, ([n]) => n);
const deltaPower = Int32Array.from(plain, ([, d]) => d);
const tauPower = Float64Array.from(plain, ([, , t]) => t);
const decayPower = Int32Array.from(plain, ([, , , c]) => c);

const HIGHEST_DELTA = 16;
const HIGHEST_TAU = 50;
const deltas = new Float64Array(HIGHEST_DELTA);
const decays = new Float64Array(7);
const decayDeltas = new Float64Array(7);
const taus = new Float64Array(HIGHEST_TAU + 1);
/** n tau^t of every term at the temperature of the last call: density iterations stay at one temperature. */
const atTau = new Float64Array(count);
let lastTau = Number.NaN;

function prepareTau(tau: number): void {
  taus[0] = 1;
  for (let i = 1; i <= HIGHEST_TAU; i++) taus[i] = (taus[i - 1] as number) * tau;
  const half = Math.sqrt(tau);
  const quarter = Math.sqrt(half);
  const eighth = Math.sqrt(quarter);
  for (let i = 0; i < count; i++) {
    const t = tauPower[i] as number;
    const whole = Math.floor(t);
    let power = whole < 0 ? 1 / tau : (taus[whole] as number);
    const rest = 8 * (t - whole);
    if (rest >= 4) power *= half;
    if (rest % 4 >= 2) power *= quarter;
    if (rest % 2 >= 1) power *= eighth;
    atTau[i] = (coefficient[i] as number) * power;
  }
  lastTau = tau;
}

/**
 * Residual part of the reduced Helmholtz energy of water with all first and second derivatives.
 *
 * phir = sum n delta^d tau^t [exp(-delta^c)] + Gaussian terms 52 to 54 + nonanalytic terms 55 and 56
 *
 * @param delta rho/rhoc, above 0
 * @param tau Tc/T, above 0
 * @param out filled and given back; derivatives scaled as `HelmholtzParts` says
 * @source IAPWS R6-95(2018), Eq. 6 and Tables 2 and 5
 */
export function residualPart(delta: number, tau: number, out: HelmholtzParts): HelmholtzParts {
  if (tau !== lastTau) prepareTau(tau);
  deltas[0] = 1;
  for (let i = 1; i < HIGHEST_DELTA; i++) deltas[i] = (deltas[i - 1] as number) * delta;
  decays[0] = 1;
  decayDeltas[0] = 0;
  for (let c = 1; c <= 6; c++) {
    if (c === 5) continue;
    const power = deltas[c] as number;
    decays[c] = Math.exp(-power);
    decayDeltas[c] = c * power;
  }
  let phi = 0;
  let d1 = 0;
  let d2 = 0;
  let t1 = 0;
  let t2 = 0;
  let dt = 0;
  for (let i = 0; i < polynomials; i++) {
    const d = deltaPower[i] as number;
    const t = tauPower[i] as number;
    const term = (atTau[i] as number) * (deltas[d] as number);
    phi += term;
    d1 += term * d;
    d2 += term * d * (d - 1);
    t1 += term * t;
    t2 += term * t * (t - 1);
    dt += term * d * t;
  }
  for (let i = polynomials; i < count; i++) {
    const d = deltaPower[i] as number;
    const t = tauPower[i] as number;
    const c = decayPower[i] as number;
    const cPower = decayDeltas[c] as number;
    const term = (atTau[i] as number) * (deltas[d] as number) * (decays[c] as number);
    const slope = d - cPower;
    phi += term;
    d1 += term * slope;
    d2 += term * (slope * (slope - 1) - c * cPower);
    t1 += term * t;
    t2 += term * t * (t - 1);
    dt += term * slope * t;
  }
  for (const [n, d, t, alpha, beta, gamma, epsilon] of GAUSSIAN_TERMS) {
    const away = delta - epsilon;
    const cold = tau - gamma;
    const exponent = alpha * away * away + beta * cold * cold;
    if (exponent > 700) continue;
    const term = n * (deltas[d] as number) * (taus[t] as number) * Math.exp(-exponent);
    const slopeD = d - 2 * alpha * delta * away;
    const slopeT = t - 2 * beta * tau * cold;
    phi += term;
    d1 += term * slopeD;
    d2 += term * (slopeD * slopeD - d - 2 * alpha * delta * delta);
    t1 += term * slopeT;
    t2 += term * (slopeT * slopeT - t - 2 * beta * tau * tau);
    dt += term * slopeD * slopeT;
  }
  out.phi = phi;
  out.d = d1;
  out.dd = d2;
  out.t = t1;
  out.tt = t2;
  out.dt = dt;
  addNonanalytic(delta, tau, out);
  return out;
}
