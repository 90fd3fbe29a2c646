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

/** Distance of the nodes between which ln p is a cubic, K: Clapeyron's equation then holds to 1e-7 of itself. */
const STEP_K = 1;

/** ln p and its slope at equal steps from the coldest temperature up. */
interface Nodes {
  readonly step: number;
  readonly ln: Float64Array;
  readonly slope: Float64Array;
}

/**
 * Clapeyron's equation from the triple point down, with enthalpy and volume of the real vapour.
 *
 * d ln p/dT = ΔHsub/[(z − p·v(solid)/(R·T))·R·T²]
 */
export function sublimationLine(
  { meltingK, solid: stored }: FluidNumbers,
  line: FluidLine,
  solid: SolidPhase,
  gas: GasPhase,
): SublimationLine {
  const { fromK } = solid;
  const solidVolume = stored?.molarVolume ?? 0;
  const coldHeat = gas.idealEnthalpy(fromK) - solid.enthalpy(fromK);
  let known: Nodes | undefined;

  function byClapeyron(k: number, ln: number): number {
    const p = Math.exp(ln);
    const rt = MOLAR_GAS_CONSTANT * k;
    const gap = gas.compressibility(k, p) - (p * solidVolume) / rt;
    return (gas.enthalpy(k, p) - solid.enthalpy(k)) / (gap * rt * k);
  }

  function nodes(): Nodes {
    if (known !== undefined) return known;
    const count = Math.ceil((meltingK - fromK) / STEP_K);
    const step = (meltingK - fromK) / count;
    const ln = new Float64Array(count + 1);
    const slope = new Float64Array(count + 1);
    let y = Math.log(line.pressure(meltingK));
    for (let i = count; ; i--) {
      const k = fromK + i * step;
      const k1 = byClapeyron(k, y);
      ln[i] = y;
      slope[i] = k1;
      if (i === 0) break;
      const k2 = byClapeyron(k - 0.5 * step, y - 0.5 * step * k1);
      const k3 = byClapeyron(k - 0.5 * step, y - 0.5 * step * k2);
      const k4 = byClapeyron(k - step, y - step * k3);
      y -= (step / 6) * (k1 + 2 * k2 + 2 * k3 + k4);
    }
    return (known = { step, ln, slope });
  }

  /** Cubic between two nodes (Hermite); below the coldest the enthalpy of sublimation there is kept. */
  function lnPressure(k: number, derived: boolean): number {
    const { step, ln, slope } = nodes();
    if (k < fromK) {
      const fall = coldHeat / MOLAR_GAS_CONSTANT;
      return derived ? fall / (k * k) : (ln[0] ?? NaN) + fall * (1 / fromK - 1 / k);
    }
    const i = Math.min(Math.floor((k - fromK) / step), ln.length - 2);
    const s = (k - fromK) / step - i;
    const [y0, y1] = [ln[i] as number, ln[i + 1] as number];
    const [d0, d1] = [(slope[i] as number) * step, (slope[i + 1] as number) * step];
    const square = 3 * (y1 - y0) - 2 * d0 - d1;
    const cube = 2 * (y0 - y1) + d0 + d1;
    return derived ? (d0 + s * (2 * square + 3 * s * cube)) / step : y0 + s * (d0 + s * (square + s * cube));
  }

  const triplePa = line.pressure(meltingK);
  const pressure = (k: number): number => (k === meltingK ? triplePa : Math.exp(lnPressure(k, false)));
  const lnSlope = (k: number): number => lnPressure(k, true);

  function temperature(pressurePa: number): number {
    const ln = Math.log(pressurePa);
    const { ln: all } = nodes();
    const [cold, hot] = [all[0] as number, all[all.length - 1] as number];
    const share = (ln - cold) / (hot - cold);
    let k = 1 / (1 / fromK + share * (1 / meltingK - 1 / fromK));
    for (let i = 0; i < 30; i++) {
      const step = (lnPressure(k, false) - ln) / lnPressure(k, true);
      k -= step;
      if (Math.abs(step) < 1e-13 * k) break;
    }
    return k;
  }

  return { fromK, toK: meltingK, pressure, lnSlope, temperature };
}
