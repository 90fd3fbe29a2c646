import { emptyMeltingState, solveMeltingPressure, type MeltingState } from './meltingState';
import { emptySublimationState, solveSublimation, type SublimationState } from './sublimationState';

const sublimationScratch = emptySublimationState();
let sublimationSolvedAt = Number.NaN;

/** Equilibrium of ice and vapour, 130 K to 273.16 K; the last temperature is remembered. */
export function sublimationAt(temperatureK: number): SublimationState {
  if (temperatureK !== sublimationSolvedAt) {
    solveSublimation(temperatureK, sublimationScratch);
    sublimationSolvedAt = temperatureK;
  }
  return sublimationScratch;
}

/** Pressure of the ice-vapour line, Pa. */
export function sublimationPressure(temperatureK: number): number {
  return sublimationAt(temperatureK).pressure;
}

/** Heat of sublimation along the line, J/kg. */
export function sublimationHeat(temperatureK: number): number {
  const { ice, vapour } = sublimationAt(temperatureK);
  return vapour.enthalpy - ice.enthalpy;
}

/** [dv - T (d dv/dT)p] dp/dT along the ice-vapour line, J/(kg K). */
export function sublimationTerm(temperatureK: number): number {
  const { ice, vapour, slope } = sublimationAt(temperatureK);
  return (vapour.volume - ice.volume - temperatureK * (vapour.volumeByTemperature - ice.volumeByTemperature)) * slope;
}

/** Slope of the heat of sublimation along the line, J/(kg K). */
export function sublimationSlope(temperatureK: number): number {
  const { ice, vapour } = sublimationAt(temperatureK);
  return vapour.cp - ice.cp + sublimationTerm(temperatureK);
}

const meltingScratch = emptyMeltingState();
let meltingSolvedAt = Number.NaN;

/** Equilibrium of ice and liquid, 251.165 K to 273.16 K; the last temperature is remembered. */
export function meltingAt(temperatureK: number): MeltingState {
  if (temperatureK !== meltingSolvedAt) {
    solveMeltingPressure(temperatureK, meltingScratch);
    meltingSolvedAt = temperatureK;
  }
  return meltingScratch;
}

/** Heat of fusion along the melting line, J/kg. */
export function meltingHeat(temperatureK: number): number {
  const { ice, liquid } = meltingAt(temperatureK);
  return liquid.enthalpy - ice.enthalpy;
}

/** [dv - T (d dv/dT)p] dp/dT along the melting line, J/(kg K). */
export function meltingTerm(temperatureK: number): number {
  const { ice, liquid, slope } = meltingAt(temperatureK);
  return (liquid.volume - ice.volume - temperatureK * (liquid.volumeByTemperature - ice.volumeByTemperature)) * slope;
}

/** Slope of the heat of fusion along the melting line, J/(kg K). */
export function meltingSlope(temperatureK: number): number {
  const { ice, liquid } = meltingAt(temperatureK);
  return liquid.cp - ice.cp + meltingTerm(temperatureK);
}
