import { nasa9Cp } from '../nasa9/nasa9Cp';
import { nasa9Enthalpy } from '../nasa9/nasa9Enthalpy';
import type { Nasa9Species } from '../nasa9/nasa9Types';
import type { FluidLine } from './fluidLine';
import type { FluidNumbers } from './fluidNumbers';
import { emptyVapourState, vapourState, type VapourModel } from './vapourModel';

/** The vapour of a fluid: real on and off its saturation line, and ideal. */
export interface GasPhase {
  readonly ideal: Nasa9Species;
  /** J/mol; NaN where the equation has no vapour. */
  readonly enthalpy: (temperatureK: number, pressurePa: number) => number;
  /** Its derivative with temperature, J/(mol K). */
  readonly heatCapacity: (temperatureK: number, pressurePa: number) => number;
  /** (∂h/∂p)·dp_sat/dT on the line, J/(mol K) */
  readonly pressureTerm: (temperatureK: number) => number;
  /** pv/(RT); NaN where the equation has no vapour. */
  readonly compressibility: (temperatureK: number, pressurePa: number) => number;
  readonly idealEnthalpy: (temperatureK: number) => number;
  readonly idealHeatCapacity: (temperatureK: number) => number;
}

/** How fast the correction dies away above the line, as a part of the critical temperature. */
const FADING = 0.15;

const state = emptyVapourState();

/**
 * The vapour, with what is left between the line and the equation of the vapour as a correction that is proportional to
 * pressure, as that of a second virial coefficient is:
 *
 * h(T, p) = h°(T) + departure(T, p) + g(T)·p, g = [h(liquid) + ΔHvap − h° − departure(T, p_sat)]/p_sat
 *
 * so that on the line the vapour lies exactly ΔHvap above the liquid.
 */
export function gasPhase(numbers: FluidNumbers, ideal: Nasa9Species, line: FluidLine): GasPhase {
  const { criticalK, criticalPa, acentric, polar, bonding, dimer, lineFromK, vapourToK } = numbers;
  const model: VapourModel = {
    criticalK,
    criticalPa,
    acentric,
    ideal,
    ...(dimer === undefined
      ? { polar, bonding }
      : { polar: 0, bonding: 0, dimer, pairing: { heat: 1000 * polar, lnConstant: bonding } }),
  };
  let correction = 0;
  let correctionSlope = 0;

  function onLine(k: number): void {
    const p = line.pressure(k);
    if (!vapourState(model, k, p, state)) {
      correction = NaN;
      correctionSlope = NaN;
      return;
    }
    const lnSlope = line.lnSlope(k);
    const gap = line.liquid(k) + line.latent(k) - state.enthalpy;
    const slope = line.liquidSlope(k) + line.latentSlope(k) - state.heatCapacity - state.byPressure * p * lnSlope;
    correction = gap / p;
    correctionSlope = (slope - gap * lnSlope) / p;
  }

  onLine(vapourToK);
  const hot = { value: correction, slope: correctionSlope };
  onLine(lineFromK);
  const cold = { value: correction, slope: correctionSlope };
  const fading = FADING * criticalK;

  /** g and its slope at a temperature; beyond the ends of the line they go on smoothly. */
  function correct(k: number): void {
    if (k >= lineFromK && k <= vapourToK) {
      onLine(k);
    } else if (k > vapourToK) {
      const beyond = k - vapourToK;
      const decay = Math.exp(-beyond / fading);
      const start = hot.slope + hot.value / fading;
      correction = (hot.value + start * beyond) * decay;
      correctionSlope = start * decay - correction / fading;
    } else {
      correction = cold.value + cold.slope * (k - lineFromK);
      correctionSlope = cold.slope;
    }
  }

  return {
    ideal,
    enthalpy(k, p) {
      correct(k);
      return vapourState(model, k, p, state) ? state.enthalpy + correction * p : NaN;
    },
    heatCapacity(k, p) {
      correct(k);
      return vapourState(model, k, p, state) ? state.heatCapacity + correctionSlope * p : NaN;
    },
    pressureTerm(k) {
      correct(k);
      const p = line.pressure(k);
      return vapourState(model, k, p, state) ? (state.byPressure + correction) * p * line.lnSlope(k) : NaN;
    },
    compressibility: (k, p) => (vapourState(model, k, p, state) ? state.compressibility : NaN),
    idealEnthalpy: (k) => nasa9Enthalpy(ideal, k),
    idealHeatCapacity: (k) => nasa9Cp(ideal, k),
  };
}
