/** J/(mol K), exact since 2019. */
export const MOLAR_GAS_CONSTANT = 8.314462618;

/** Pressure of the standard state, Pa. */
export const STANDARD_PRESSURE_PA = 1e5;
