/** Constants of one of the two fluids between which the correlation interpolates. */
interface Constants {
  readonly b1: number;
  readonly b2: number;
  readonly b3: number;
  readonly b4: number;
  readonly c1: number;
  readonly c2: number;
  readonly c3: number;
  readonly c4: number;
  readonly d1: number;
  readonly d2: number;
  readonly beta: number;
  readonly gamma: number;
}

const SIMPLE: Constants = {
  b1: 0.1181193,
  b2: 0.265728,
  b3: 0.15479,
  b4: 0.030323,
  c1: 0.0236744,
  c2: 0.0186984,
  c3: 0,
  c4: 0.042724,
  d1: 0.155488e-4,
  d2: 0.623689e-4,
  beta: 0.65392,
  gamma: 0.060167,
};

const REFERENCE: Constants = {
  b1: 0.2026579,
  b2: 0.331511,
  b3: 0.027655,
  b4: 0.203488,
  c1: 0.0313385,
  c2: 0.0503618,
  c3: 0.016901,
  c4: 0.041577,
  d1: 0.48736e-4,
  d2: 0.0740336e-4,
  beta: 1.226,
  gamma: 0.03754,
};

/** Acentric factor of the reference fluid. */
const REFERENCE_ACENTRIC = 0.3978;

/** How a real vapour departs from the ideal gas, all reduced by the critical constants. */
export interface Departure {
  /** pv/(RT) */
  compressibility: number;
  /** (h − h°)/(R·Tc) */
  enthalpy: number;
  /** Its derivative with temperature at constant pressure, divided by R. */
  heatCapacity: number;
  /** Its derivative with pressure at constant temperature, against the reduced pressure. */
  byPressure: number;
}

export function emptyDeparture(): Departure {
  return { compressibility: NaN, enthalpy: NaN, heatCapacity: NaN, byPressure: NaN };
}

const MOST_STEPS = 50;

/** Steps this small against the density are rounding. */
const CONVERGED = 1e-14;
const simple = emptyDeparture();
const reference = emptyDeparture();

/**
 * Departure of a real vapour from the ideal gas after Lee and Kesler, with terms of polar attraction.
 *
 * z = z⁽⁰⁾ + (ω/0.3978)·(z⁽ʳ⁾ − z⁽⁰⁾), and so for the enthalpy; the second virial coefficient of both fluids carries the
 * further terms −a/Tr⁶ (dipoles, after Tsonopoulos) and −b/Tr¹² (hydrogen bonds), fitted for each substance.
 *
 * @param t reduced temperature T/Tc
 * @param p reduced pressure p/pc of a vapour, up to where the equation has one
 * @param acentric acentric factor
 * @param polar a of the polar term, 0 for a normal fluid
 * @param bonding b of the hydrogen-bond term, 0 where there is none
 * @param out filled with the result
 * @returns false where the equation has no vapour; `out` is then not to be used
 * @source Lee & Kesler, AIChE J. 21 (1975) 510, Table 1; polar term: Tsonopoulos, AIChE J. 20 (1974) 263
 */
export function vapourDeparture(
  t: number,
  p: number,
  acentric: number,
  polar: number,
  bonding: number,
  out: Departure,
): boolean {
  if (!solved(SIMPLE, t, p, polar, bonding, simple) || !solved(REFERENCE, t, p, polar, bonding, reference))
    return false;
  const share = acentric / REFERENCE_ACENTRIC;
  out.compressibility = simple.compressibility + share * (reference.compressibility - simple.compressibility);
  out.enthalpy = simple.enthalpy + share * (reference.enthalpy - simple.enthalpy);
  out.heatCapacity = simple.heatCapacity + share * (reference.heatCapacity - simple.heatCapacity);
  out.byPressure = simple.byPressure + share * (reference.byPressure - simple.byPressure);
  return true;
}

/** One of the two fluids: Newton's method in the density, which climbs to the root from the ideal gas, then the derivatives there. */
function solved(k: Constants, t: number, p: number, polar: number, bonding: number, out: Departure): boolean {
  const u = 1 / t;
  const u2 = u * u;
  const u3 = u2 * u;
  const u6 = u3 * u3;
  const dipoles = polar * u6;
  const bonds = bonding * u6 * u6;
  const b = k.b1 - u * (k.b2 + u * (k.b3 + u * k.b4)) - dipoles - bonds;
  const c = k.c1 - k.c2 * u + k.c3 * u3;
  const d = k.d1 + k.d2 * u;
  const e = k.c4 * u3;
  const { beta, gamma } = k;
  // density of the virial series where that converges; from below the steps climb to the root without overshooting
  const ideal = p * u;
  const second = b * ideal;
  let s = second > -0.1 ? ideal * (1 - second + 2 * second * second - (c + e * k.beta) * ideal * ideal) : ideal;
  let z = 1;
  let zs = 0;
  let y = 0;
  let damp = 1;
  for (let i = 0; ; i++) {
    const ss = s * s;
    y = gamma * ss;
    damp = Math.exp(-y);
    const s4d = d * ss * ss;
    z = 1 + s * (b + s * c + s4d) + e * ss * (beta + y) * damp;
    zs = b + 2 * c * s + 5 * s4d + 2 * e * s * damp * (beta + 2 * y - y * (beta + y));
    const slope = t * (z + s * zs);
    if (!(slope > 0) || i === MOST_STEPS) return false;
    const step = (p - t * s * z) / slope;
    s += step;
    if (Math.abs(step) <= CONVERGED * s) break;
  }
  const bT = u2 * (k.b2 + u * (2 * k.b3 + 3 * u * k.b4)) + (6 * dipoles + 12 * bonds) * u;
  const bTT = -u3 * (2 * k.b2 + u * (6 * k.b3 + 12 * u * k.b4)) - (42 * dipoles + 156 * bonds) * u2;
  const cT = u2 * (k.c2 - 3 * k.c3 * u2);
  const cTT = -u3 * (2 * k.c2 - 12 * k.c3 * u2);
  const dT = -k.d2 * u2;
  const dTT = 2 * k.d2 * u3;
  const ss = s * s;
  const s4 = ss * ss;
  const bracket = (e / (2 * gamma)) * (beta + 1 - (beta + 1 + y) * damp);
  const zT = s * (bT + s * cT + s4 * dT) - 3 * u * e * ss * (beta + y) * damp;
  const helmholtzT = s * (bT + 0.5 * s * cT + 0.2 * s4 * dT) - 3 * u * bracket;
  const helmholtzTT = s * (bTT + 0.5 * s * cTT + 0.2 * s4 * dTT) + 12 * u2 * bracket;
  const pT = s * (z + t * zT);
  const pS = t * (z + s * zs);
  const hT = pT / s - 1 - t * (2 * helmholtzT + t * helmholtzTT);
  const hS = pS / s - (t * z) / s - t * t * (zT / s);
  out.compressibility = z;
  out.enthalpy = t * (z - 1 - t * helmholtzT);
  out.heatCapacity = hT - (hS * pT) / pS;
  out.byPressure = hS / pS;
  return true;
}
