import { emptyFluidState, type FluidState } from './fluidState';
import { fluidStateAt } from './fluidDensity';
import { emptyIceState, iceState, type IceState } from './iceState';
import { meltingPressureFit } from './iceLines';

/** Ice Ih and liquid in equilibrium. */
export interface MeltingState {
  readonly ice: IceState;
  readonly liquid: FluidState;
  temperatureK: number;
  /** Pa */
  pressure: number;
  /** dp/dT along the line, Pa/K; negative */
  slope: number;
}

/** A state to be filled. */
export function emptyMeltingState(): MeltingState {
  return { ice: emptyIceState(), liquid: emptyFluidState(), temperatureK: 0, pressure: 0, slope: 0 };
}

function finish(temperatureK: number, pressurePa: number, out: MeltingState): MeltingState {
  out.temperatureK = temperatureK;
  out.pressure = pressurePa;
  out.slope = (out.liquid.entropy - out.ice.entropy) / (out.liquid.volume - out.ice.volume);
  return out;
}

/**
 * Solves ice-liquid equilibrium at a temperature: the pressure at which both have the same Gibbs energy.
 *
 * @param temperatureK 251.165 K to 273.16 K
 * @source IAPWS R6-95(2018) with R10-06(2009), phase-equilibrium condition
 */
export function solveMeltingPressure(temperatureK: number, out: MeltingState): MeltingState {
  const { ice, liquid } = out;
  let pressure = meltingPressureFit('Ih', temperatureK);
  let lastStep = Infinity;
  for (let i = 0; i < 30; i++) {
    fluidStateAt(temperatureK, pressure, 'liquid', liquid);
    iceState(temperatureK, pressure, ice);
    const step = (ice.gibbs - liquid.gibbs) / (liquid.volume - ice.volume);
    if (step === 0 || (i > 2 && Math.abs(step) >= lastStep)) break;
    lastStep = Math.abs(step);
    pressure += step;
  }
  return finish(temperatureK, pressure, out);
}

/**
 * Solves ice-liquid equilibrium at a pressure: the temperature at which both have the same Gibbs energy.
 *
 * @param pressurePa 611.654771 Pa to 208.566 MPa
 * @source IAPWS R6-95(2018) with R10-06(2009), phase-equilibrium condition
 */
export function solveMeltingTemperature(pressurePa: number, out: MeltingState): MeltingState {
  const { ice, liquid } = out;
  let temperature = 273.16 - 7.4e-8 * pressurePa - 1.5e-16 * pressurePa * pressurePa;
  let lastStep = Infinity;
  for (let i = 0; i < 30; i++) {
    fluidStateAt(temperature, pressurePa, 'liquid', liquid);
    iceState(temperature, pressurePa, ice);
    const step = (ice.gibbs - liquid.gibbs) / (ice.entropy - liquid.entropy);
    if (Math.abs(step) < 1e-14 * temperature || (i > 3 && Math.abs(step) >= lastStep)) break;
    lastStep = Math.abs(step);
    temperature += step;
  }
  return finish(temperature, pressurePa, out);
}
