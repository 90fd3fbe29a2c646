import { MOLAR_GAS_CONSTANT } from './constants';
import type { FluidLine } from './fluidLine';
import type { FluidNumbers } from './fluidNumbers';
import type { GasPhase } from './gasPhase';
import type { SolidPhase } from './solidPhase';

/** Equilibrium of solid and vapour below the triple point. */
export interface SublimationLine {
  readonly fromK: number;
  readonly toK: number;
  readonly pressure: (temperatureK: number) => number;
  /** d ln p/dT, 1/K */
  readonly lnSlope: (temperatureK: number) => number;
  readonly temperature: (pressurePa: number) => number;
}

/** Abscissae and weights of the 5-point Gauss–Legendre rule on [−1, 1] (Abramowitz & Stegun, Table 25.4). */
const NODES = [0, -0.5384693101056831, 0.5384693101056831, -0.906179845938664, 0.906179845938664];
const WEIGHTS = [
  0.5688888888888889, 0.47862867049936647, 0.47862867049936647, 0.23692688505618908, 0.23692688505618908,
];

/**
 * Clapeyron's equation from the triple point down, with the vapour's departure from the ideal gas in proportion to pressure.
 *
 * d ln p/dT = ΔHsub/(z·R·T²)
 */
export function sublimationLine(
  numbers: FluidNumbers,
  line: FluidLine,
  solid: SolidPhase,
  gas: GasPhase,
): SublimationLine {
  const { meltingK } = numbers;
  const triplePa = line.pressure(meltingK);
  const heat = gas.enthalpy(meltingK, triplePa) - solid.enthalpy(meltingK);
  const departure = heat - (gas.idealEnthalpy(meltingK) - solid.enthalpy(meltingK));
  const lack = 1 - gas.compressibility(meltingK, triplePa);
  const fall = heat / MOLAR_GAS_CONSTANT;

  function lnSlope(k: number): number {
    const share = Math.exp(fall * (1 / meltingK - 1 / k));
    const latent = gas.idealEnthalpy(k) - solid.enthalpy(k) + departure * share;
    return latent / ((1 - lack * share) * MOLAR_GAS_CONSTANT * k * k);
  }

  function pressure(k: number): number {
    const half = 0.5 * (meltingK - k);
    const middle = 0.5 * (meltingK + k);
    let sum = 0;
    for (let i = 0; i < NODES.length; i++) sum += (WEIGHTS[i] ?? 0) * lnSlope(middle + half * (NODES[i] ?? 0));
    return triplePa * Math.exp(-half * sum);
  }

  function temperature(pressurePa: number): number {
    const ln = Math.log(pressurePa / triplePa);
    let k = 1 / (1 / meltingK - ln / fall);
    for (let i = 0; i < 30; i++) {
      const step = (Math.log(pressure(k) / triplePa) - ln) / lnSlope(k);
      k -= step;
      if (Math.abs(step) < 1e-13 * k) break;
    }
    return k;
  }

  return { fromK: solid.fromK, toK: meltingK, pressure, lnSlope, temperature };
}
