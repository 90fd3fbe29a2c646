import { GAS_CONSTANT } from './fluidCoefficients';
import { emptyFluidState, fluidState, type FluidState } from './fluidState';
import { emptyIceState, iceState, type IceState } from './iceState';
import { sublimationPressureFit } from './iceLines';

/** Ice Ih and vapour in equilibrium at one temperature. */
export interface SublimationState {
  readonly ice: IceState;
  readonly vapour: FluidState;
  /** Pa */
  pressure: number;
  /** dp/dT along the line, Pa/K */
  slope: number;
}

/** A state to be filled. */
export function emptySublimationState(): SublimationState {
  return { ice: emptyIceState(), vapour: emptyFluidState(), pressure: 0, slope: 0 };
}

/**
 * Solves ice-vapour equilibrium: equal Gibbs energy at one temperature and pressure.
 *
 * Newton's method in the logarithm of the vapour density, started from the fitted sublimation pressure.
 *
 * @param temperatureK 130 K (below it the ideal-gas part of R6-95 has no data) to 273.16 K
 * @source IAPWS R6-95(2018) with R10-06(2009), phase-equilibrium condition
 */
export function solveSublimation(temperatureK: number, out: SublimationState): SublimationState {
  const { ice, vapour } = out;
  let density = sublimationPressureFit(temperatureK) / (GAS_CONSTANT * temperatureK);
  let lastStep = Infinity;
  for (let i = 0; i < 30; i++) {
    fluidState(temperatureK, density, vapour);
    iceState(temperatureK, vapour.pressure, ice);
    const step = (ice.gibbs - vapour.gibbs) / ((vapour.volume - ice.volume) * vapour.pressureByDensity * density);
    if (Math.abs(step) < 1e-15 || (i > 2 && Math.abs(step) >= lastStep)) break;
    lastStep = Math.abs(step);
    density *= 1 + step;
  }
  out.pressure = vapour.pressure;
  out.slope = (vapour.entropy - ice.entropy) / (vapour.volume - ice.volume);
  return out;
}
