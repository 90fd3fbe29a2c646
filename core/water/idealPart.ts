import { IDEAL_EINSTEIN, IDEAL_LINEAR } from './fluidCoefficients';

/** The part of the ideal-gas Helmholtz energy that depends on temperature alone: phi0 = ln(delta) + `phi`. */
export interface IdealParts {
  phi: number;
  /** tau phi0_tau */
  t: number;
  /** tau^2 phi0_tautau */
  tt: number;
}

const [n1, n2, n3] = IDEAL_LINEAR;
const terms = IDEAL_EINSTEIN.length;
const factor = Float64Array.from(IDEAL_EINSTEIN, ([n]) => n);
const gamma = Float64Array.from(IDEAL_EINSTEIN, ([, g]) => g);

/**
 * Ideal-gas part of the reduced Helmholtz energy of water, without its ln(delta).
 *
 * phi0 = ln delta + n1 + n2 tau + n3 ln tau + sum n_i ln(1 - exp(-gamma_i tau)), i = 4..8
 *
 * @param tau Tc/T, from 0.5 to 5 (130 K and above)
 * @param out filled and given back
 * @source IAPWS R6-95(2018), Eq. 5 and Tables 1 and 4
 */
export function idealPart(tau: number, out: IdealParts): IdealParts {
  let phi = n1 + n2 * tau + n3 * Math.log(tau);
  let t = n2 * tau + n3;
  let tt = -n3;
  for (let i = 0; i < terms; i++) {
    const n = factor[i] as number;
    const x = (gamma[i] as number) * tau;
    const e = Math.exp(-x);
    const share = e / (1 - e);
    phi += n * Math.log1p(-e);
    t += n * x * share;
    tt -= n * x * x * share * (1 + share);
  }
  out.phi = phi;
  out.t = t;
  out.tt = tt;
  return out;
}
