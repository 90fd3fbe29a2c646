import { CRITICAL_TEMPERATURE_K } from './fluidCoefficients';

/**
 * How the fast path shares out its tables. Near 233 K the supercooled liquid of R6-95 changes steeply, and towards the
 * critical point everything does: there the pieces widen with the distance from that end. Between them they are even.
 */
export const SUPERCOOLED_END_K = 233;
/** First and last numbered piece: distances 2 K to 48 K, that is 235 K to 281 K. */
export const SUPERCOOLED_PIECES = [22, 30] as const;
export const SUPERCOOLED_TO_K = SUPERCOOLED_END_K + 48;
/** Distances 2^-10 K to 64 K. */
export const CRITICAL_PIECES = [0, 31] as const;
export const CRITICAL_FROM_K = CRITICAL_TEMPERATURE_K - 64;
/**
 * Boiling temperature (its inverse) by the distance of ln p from its critical value, stretched by a factor that sets the first piece
 * 1/1000 K below Tc; to about 285 K, and even pieces in ln p below.
 */
export const LN_PRESSURE_SCALE = 75;
export const BOILING_PIECES = [0, 38] as const;
