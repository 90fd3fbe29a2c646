import { HIGHEST_ICE_IH_PRESSURE_PA, highPressureMeltingTemperature } from './iceLines';
import { liquidVapourTemperature, sublimationTemperature } from './lineTemperature';
import { emptyMeltingState, solveMeltingTemperature } from './meltingState';
import { TRIPLE_PRESSURE_PA } from './ranges';
import { remember } from '../remember';

const melting = emptyMeltingState();

/** Melting temperature at a pressure from the triple point to 1000 MPa, K: of ice Ih by equal Gibbs energy, above 208.566 MPa by R14-08. */
export const meltingTemperature = remember((pressurePa) =>
  pressurePa <= HIGHEST_ICE_IH_PRESSURE_PA
    ? solveMeltingTemperature(pressurePa, melting).temperatureK
    : highPressureMeltingTemperature(pressurePa),
);

/** Boiling temperature at a pressure below the critical one, K; below the triple-point pressure of supercooled liquid. */
export const boilingTemperature = remember(liquidVapourTemperature);

/** Temperature below which gas at a pressure below the critical one is not the stable phase, K. */
export const dewOrFrostTemperature = remember((pressurePa) =>
  pressurePa < TRIPLE_PRESSURE_PA ? sublimationTemperature(pressurePa) : liquidVapourTemperature(pressurePa),
);
