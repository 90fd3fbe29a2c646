import { emptyFluidState, fluidState, type FluidState } from './fluidState';
import { auxiliaryLiquidDensity, auxiliaryVapourDensity } from './saturationAuxiliary';

/** Liquid and vapour in equilibrium at one temperature. */
export interface SaturationState {
  readonly liquid: FluidState;
  readonly vapour: FluidState;
  /** Pa */
  pressure: number;
  /** dp/dT along the line, Pa/K */
  slope: number;
}

/** A state to be filled. */
export function emptySaturationState(): SaturationState {
  return { liquid: emptyFluidState(), vapour: emptyFluidState(), pressure: 0, slope: 0 };
}

const MOST_STEPS = 60;

/**
 * Solves liquid-vapour equilibrium: equal pressure and equal Gibbs energy of both phases.
 *
 * Newton's method in both densities, started from the auxiliary equations and run until the steps stop shrinking.
 * The pressure is that of the vapour, which carries more digits than that of the nearly incompressible liquid.
 *
 * @param temperatureK 235 K (supercooled liquid) to `NEAREST_TO_CRITICAL_K`
 * @source IAPWS R6-95(2018), phase-equilibrium condition
 */
export function solveSaturation(temperatureK: number, out: SaturationState): SaturationState {
  const { liquid, vapour } = out;
  let liquidDensity = auxiliaryLiquidDensity(temperatureK);
  let vapourDensity = auxiliaryVapourDensity(temperatureK);
  let lastStep = Infinity;
  for (let i = 0; i < MOST_STEPS; i++) {
    fluidState(temperatureK, liquidDensity, liquid);
    fluidState(temperatureK, vapourDensity, vapour);
    const pressureGap = liquid.pressure - vapour.pressure;
    const gibbsGap = liquid.gibbs - vapour.gibbs;
    // linearized: both pressures move to one value, and both Gibbs energies
    const vapourRise = (pressureGap * liquid.volume - gibbsGap) / (liquid.volume - vapour.volume);
    const liquidRise = vapourRise - pressureGap;
    const vapourStep = vapourRise / (vapour.pressureByDensity * vapourDensity);
    const liquidStep = liquidRise / (liquid.pressureByDensity * liquidDensity);
    const step = Math.max(Math.abs(vapourStep), Math.abs(liquidStep));
    if (!(step < Infinity)) break;
    if (step < 1e-14 || (step < 1e-6 && step >= lastStep)) break;
    const damping = step > 0.3 ? 0.3 / step : 1;
    vapourDensity *= 1 + damping * vapourStep;
    liquidDensity *= 1 + damping * liquidStep;
    if (step < 1e-8 && step < 1e-3 * lastStep) {
      // converging quadratically: the next step would be below rounding
      fluidState(temperatureK, liquidDensity, liquid);
      fluidState(temperatureK, vapourDensity, vapour);
      break;
    }
    lastStep = step;
  }
  out.pressure = vapour.pressure;
  out.slope = (vapour.entropy - liquid.entropy) / (vapour.volume - liquid.volume);
  return out;
}
