/** Molar gas constant of the report; a newer value does not belong to these coefficients, J/(mol K). */
export const NASA9_R = 8.31451;

/** Standard pressure of the report, Pa. */
export const NASA9_STANDARD_PRESSURE_PA = 1e5;

export const NASA9_SOURCE =
  'McBride, Zehe & Gordon, NASA/TP-2002-211556 (2002), nine-coefficient polynomials, data release of 9 September 2021';
