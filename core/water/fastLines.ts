import {
  pieceTowardsEnd,
  piecewise,
  piecewiseTowardsEnd,
  readPieces,
  SMALLEST_DISTANCE,
  type ChebyshevPieces,
} from './chebyshevPieces';
import { bridgeLatent, bridgePressure, criticalBridge } from './criticalBridge';
import * as data from './fastPath.generated';
import {
  BOILING_PIECES,
  CRITICAL_FROM_K,
  LN_PRESSURE_SCALE,
  SUPERCOOLED_END_K,
  SUPERCOOLED_TO_K,
} from './fastPathPlan';
import { CRITICAL_TEMPERATURE_K } from './fluidCoefficients';
import { NEAREST_TO_CRITICAL_K } from './ranges';
import { CRITICAL_PRESSURE_PA } from './saturationAuxiliary';

/**
 * The saturation and ice lines as Chebyshev pieces, fitted to the full solution by `generate/generateFastPath.mjs` and
 * held to it within 1e-9 by a test. Heats in J/mol, slopes in J/(mol K). Ranges are the caller's to keep.
 */
interface LiquidVapourTables {
  readonly supercooled: ChebyshevPieces;
  readonly middle: ChebyshevPieces;
  readonly critical: ChebyshevPieces;
}

const heat: LiquidVapourTables = {
  supercooled: readPieces(data.SUPERCOOLED_HEAT),
  middle: readPieces(data.VAPORIZATION_HEAT),
  critical: readPieces(data.CRITICAL_HEAT),
};
const slope: LiquidVapourTables = {
  supercooled: readPieces(data.SUPERCOOLED_SLOPE),
  middle: readPieces(data.VAPORIZATION_SLOPE),
  critical: readPieces(data.CRITICAL_SLOPE),
};
const lnPressure: LiquidVapourTables = {
  supercooled: readPieces(data.SUPERCOOLED_LN_PRESSURE),
  middle: readPieces(data.VAPORIZATION_LN_PRESSURE),
  critical: readPieces(data.CRITICAL_LN_PRESSURE),
};
const boilingInverse = readPieces(data.BOILING_INVERSE);
const supercooledInverse = readPieces(data.SUPERCOOLED_INVERSE);
const sublimationHeat = readPieces(data.SUBLIMATION_HEAT);
const sublimationSlope = readPieces(data.SUBLIMATION_SLOPE);
const sublimationLnPressure = readPieces(data.SUBLIMATION_LN_PRESSURE);
const frostInverse = readPieces(data.FROST_INVERSE);
const meltingHeat = readPieces(data.MELTING_HEAT);
const meltingSlope = readPieces(data.MELTING_SLOPE);
const fusionHeat = readPieces(data.FUSION_HEAT);
const fusionSlope = readPieces(data.FUSION_SLOPE);

function onLine(tables: LiquidVapourTables, temperatureK: number): number {
  if (temperatureK < SUPERCOOLED_TO_K) return piecewiseTowardsEnd(tables.supercooled, temperatureK - SUPERCOOLED_END_K);
  // at the border itself the even pieces answer: the numbered ones end just before their largest distance
  if (temperatureK <= CRITICAL_FROM_K) return piecewise(tables.middle, temperatureK);
  return piecewiseTowardsEnd(tables.critical, CRITICAL_TEMPERATURE_K - temperatureK);
}

/** The last 1/1024 K: continued from the last values of the tables themselves, so that they meet. */
const bridge = makeBridge();
function makeBridge() {
  const pressure = Math.exp(onLine(lnPressure, NEAREST_TO_CRITICAL_K));
  const latent = onLine(heat, NEAREST_TO_CRITICAL_K);
  // Clapeyron's slope of the line barely changes over 1/1024 K; the pressure itself fixes it to 1e-9 of its value
  const pressureSlope = (CRITICAL_PRESSURE_PA - pressure) / (CRITICAL_TEMPERATURE_K - NEAREST_TO_CRITICAL_K);
  return criticalBridge(pressure, pressureSlope, latent, onLine(slope, NEAREST_TO_CRITICAL_K));
}
const LARGEST_BOILING_DISTANCE = pieceTowardsEnd(BOILING_PIECES[1])[1];
const LN_CRITICAL = Math.log(CRITICAL_PRESSURE_PA);
const LAST_STRETCH_K = CRITICAL_TEMPERATURE_K - 1 / piecewiseTowardsEnd(boilingInverse, SMALLEST_DISTANCE);

/** J/mol, 235 K to 647.096 K. */
export function fastVaporizationHeat(temperatureK: number): number {
  return temperatureK <= NEAREST_TO_CRITICAL_K ? onLine(heat, temperatureK) : bridgeLatent(bridge, temperatureK);
}

/** J/(mol K), 235 K to `NEAREST_TO_CRITICAL_K`. */
export function fastVaporizationSlope(temperatureK: number): number {
  return onLine(slope, temperatureK);
}

/** Pa, 235 K to 647.096 K. */
export function fastLiquidVapourPressure(temperatureK: number): number {
  return temperatureK <= NEAREST_TO_CRITICAL_K
    ? Math.exp(onLine(lnPressure, temperatureK))
    : bridgePressure(bridge, temperatureK);
}

/** K, from the pressure of the liquid-vapour line at 235 K to the critical pressure. */
export function fastLiquidVapourTemperature(pressurePa: number): number {
  const lnP = Math.log(pressurePa);
  const distance = (LN_CRITICAL - lnP) * LN_PRESSURE_SCALE;
  if (distance >= LARGEST_BOILING_DISTANCE) return 1 / piecewise(supercooledInverse, lnP);
  if (distance >= SMALLEST_DISTANCE) return 1 / piecewiseTowardsEnd(boilingInverse, distance);
  return CRITICAL_TEMPERATURE_K - (distance / SMALLEST_DISTANCE) * LAST_STRETCH_K;
}

/** J/mol, 130 K to 273.16 K. */
export function fastSublimationHeat(temperatureK: number): number {
  return piecewise(sublimationHeat, temperatureK);
}

/** J/(mol K), 130 K to 273.16 K. */
export function fastSublimationSlope(temperatureK: number): number {
  return piecewise(sublimationSlope, temperatureK);
}

/** Pa, 130 K to 273.16 K. */
export function fastSublimationPressure(temperatureK: number): number {
  return Math.exp(piecewise(sublimationLnPressure, temperatureK));
}

/** K, from the pressure of the ice-vapour line at 130 K to the triple-point pressure. */
export function fastSublimationTemperature(pressurePa: number): number {
  return 1 / piecewise(frostInverse, Math.log(pressurePa));
}

/** J/mol along the melting line, 251.165 K to 273.16 K. */
export function fastMeltingHeat(temperatureK: number): number {
  return piecewise(meltingHeat, temperatureK);
}

/** J/(mol K) along the melting line, 251.165 K to 273.16 K. */
export function fastMeltingSlope(temperatureK: number): number {
  return piecewise(meltingSlope, temperatureK);
}

/** J/mol at one atmosphere, 235 K to 273.16 K. */
export function fastFusionHeat(temperatureK: number): number {
  return piecewiseTowardsEnd(fusionHeat, temperatureK - SUPERCOOLED_END_K);
}

/** J/(mol K) at one atmosphere, 235 K to 273.16 K. */
export function fastFusionSlope(temperatureK: number): number {
  return piecewiseTowardsEnd(fusionSlope, temperatureK - SUPERCOOLED_END_K);
}
