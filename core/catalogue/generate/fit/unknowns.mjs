/** Where the unknowns of a fit begin: Wagner's terms, latent heat, liquid enthalpy, the two terms of the vapour. */
export const PRESSURE = 0;
export const LATENT = 5;
export const LIQUID = 11;
export const ATTRACTION = 18;
export const SIZE = 20;

export const emptyRow = () => new Array(SIZE).fill(0);

/** Adds terms, times a factor, to a row from an unknown on. */
export function withTerms(offset, terms, row = emptyRow(), factor = 1) {
  terms.forEach((term, i) => (row[offset + i] += term * factor));
  return row;
}

/** A row for one unknown alone. */
export function rowOf(unknown) {
  return withTerms(unknown, [1]);
}

/** What is known of the unknowns after a round. */
export function unpack(x, covariance) {
  return {
    x,
    covariance,
    pressure: x.slice(PRESSURE, LATENT),
    latent: x.slice(LATENT, LIQUID),
    liquid: x.slice(LIQUID, ATTRACTION),
    polar: x[ATTRACTION],
    bonding: x[ATTRACTION + 1],
  };
}
