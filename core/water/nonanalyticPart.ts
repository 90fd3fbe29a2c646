import { NONANALYTIC_TERMS } from './fluidCoefficients';
import type { HelmholtzParts } from './helmholtzParts';

/** beta = 0.3 of both terms enters as 1/beta, and as 1/(2 beta) = 5/3 in the exponent. */
const INVERSE_BETA = 1 / 0.3;
/** Keeps negative powers of the distance function finite at the critical point itself. */
const SMALLEST_DISTANCE = 1e-40;
/** exp(-700) is 1e-304: a term that small adds nothing. */
const NOTHING = 700;

/**
 * Adds the terms that shape the near-critical region.
 *
 * phir = n Delta^b delta psi; Delta = theta^2 + B x^a; theta = (1 - tau) + A x^(1/(2 beta));
 * psi = exp(-C x - D (tau - 1)^2); x = (delta - 1)^2
 *
 * @source IAPWS R6-95(2018), Eq. 6 and Table 5, terms 55 and 56
 */
export function addNonanalytic(delta: number, tau: number, out: HelmholtzParts): void {
  const away = delta - 1;
  const warm = tau - 1;
  const x = away * away;
  const root = Math.cbrt(x);
  const x23 = root * root; // x^(1/(2 beta) - 1)
  const x53 = x * x23; // x^(1/(2 beta))
  const x25 = x * x * Math.abs(away); // x^(a - 1)
  const x35 = x * x25; // x^a
  for (const [n, b, bigB, bigC, bigD, bigA] of NONANALYTIC_TERMS) {
    const exponent = bigC * x + bigD * warm * warm;
    if (exponent > NOTHING) continue;
    const psi = Math.exp(-exponent);
    const theta = -warm + bigA * x53;
    const distance = Math.max(theta * theta + bigB * x35, SMALLEST_DISTANCE);
    // derivatives of Delta; overAway is its delta derivative divided by (delta - 1)
    const overAway = 2 * INVERSE_BETA * bigA * theta * x23 + 7 * bigB * x25;
    const distanceD = away * overAway;
    const distanceDD =
      overAway +
      35 * bigB * x25 +
      2 * bigA * bigA * INVERSE_BETA * INVERSE_BETA * x23 * x53 +
      INVERSE_BETA * (8 / 3) * bigA * theta * x23;
    // derivatives of Delta^b
    const power = Math.pow(distance, b);
    const bOver = (b * power) / distance;
    const bbOver = ((b - 1) * bOver) / distance;
    const powerD = bOver * distanceD;
    const powerDD = bOver * distanceDD + bbOver * distanceD * distanceD;
    const powerT = -2 * theta * bOver;
    const powerTT = 2 * bOver + 4 * theta * theta * bbOver;
    const powerDT = -2 * bigA * INVERSE_BETA * bOver * away * x23 - 2 * theta * bbOver * distanceD;
    // derivatives of psi, divided by psi
    const psiD = -2 * bigC * away;
    const psiDD = 2 * bigC * (2 * bigC * x - 1);
    const psiT = -2 * bigD * warm;
    const psiTT = 2 * bigD * (2 * bigD * warm * warm - 1);
    const common = n * psi * delta;
    out.phi += common * power;
    out.d += common * (power * (1 + delta * psiD) + delta * powerD);
    out.dd += common * delta * (power * (2 * psiD + delta * psiDD) + 2 * powerD * (1 + delta * psiD) + powerDD * delta);
    out.t += common * tau * (powerT + power * psiT);
    out.tt += common * tau * tau * (powerTT + 2 * powerT * psiT + power * psiTT);
    out.dt +=
      common *
      tau *
      (power * psiT * (1 + delta * psiD) + delta * powerD * psiT + powerT * (1 + delta * psiD) + delta * powerDT);
  }
}
