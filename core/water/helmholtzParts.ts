/**
 * A part of the reduced Helmholtz energy phi(delta, tau) with its derivatives, each multiplied by the
 * powers of delta and tau that make it a plain number: `d` is delta phi_delta, `dt` is delta tau phi_delta_tau.
 */
export interface HelmholtzParts {
  phi: number;
  d: number;
  dd: number;
  t: number;
  tt: number;
  dt: number;
}

/** A record to be filled again and again, so that an evaluation allocates nothing. */
export function emptyParts(): HelmholtzParts {
  return { phi: 0, d: 0, dd: 0, t: 0, tt: 0, dt: 0 };
}
