import { CRITICAL_TEMPERATURE_K } from './fluidCoefficients';

/** Molar mass of water that IAPWS uses to pass to molar units, kg/mol. */
export const MOLAR_MASS = 0.018015268;

/** Highest temperature and pressure of R6-95. */
export const HOTTEST_FLUID_K = 1273;
export const HIGHEST_PRESSURE_PA = 1000e6;
/** Below any pressure of the ice-vapour line from 130 K: there is vapour only. */
export const LOWEST_PRESSURE_PA = 1e-8;
/** The ideal-gas part of R6-95 starts here. */
export const COLDEST_VAPOUR_K = 130;
/**
 * Supercooled liquid is followed down to here. Ice forms in clean small droplets at about this temperature (common
 * practice, no source), and a few kelvin below it the liquid branch of R6-95 loses its sense: its heat capacity falls to zero.
 */
export const COLDEST_LIQUID_K = 235;
export const TRIPLE_K = 273.16;
/** Triple-point pressure that follows from equal Gibbs energy of R6-95 liquid and vapour, Pa. */
export const TRIPLE_PRESSURE_PA = 611.654771;
/** Where ice Ih, ice III and liquid meet: the cold end of the melting line of ice Ih (R14-08). */
export const COLDEST_MELTING_K = 251.165;
/**
 * Up to here the equilibrium of liquid and vapour is solved; on the last 1/1024 K the two densities differ by too
 * little for double precision, and the saturation line is carried on as a power law to the critical point.
 */
export const NEAREST_TO_CRITICAL_K = CRITICAL_TEMPERATURE_K - 1 / 1024;
/** Heat capacities of the saturated phases grow without bound towards the critical point; from here on numbers are marked. */
export const NEAR_CRITICAL_K = CRITICAL_TEMPERATURE_K - 0.1;
export const NORMAL_PRESSURE_PA = 101325;
export const STANDARD_PRESSURE_PA = 1e5;
