import { MOLAR_GAS_CONSTANT } from './constants';
import type { FluidLine } from './fluidLine';
import type { FluidNumbers } from './fluidNumbers';
import { emptyLiquidVolume, liquidVolume } from './liquidVolume';

/** The liquid of a fluid on and off its saturation line. */
export interface LiquidPhase {
  /** h = h(saturated) + (v − T·dv/dT)·(p − p_sat), J/mol */
  readonly enthalpy: (temperatureK: number, pressurePa: number) => number;
  /** Its derivative with temperature, J/(mol K). */
  readonly heatCapacity: (temperatureK: number, pressurePa: number) => number;
  readonly saturatedHeatCapacity: (temperatureK: number) => number;
  /** (v − T·dv/dT)·dp_sat/dT, J/(mol K) */
  readonly pressureTerm: (temperatureK: number) => number;
}

const scratch = emptyLiquidVolume();

export function liquidPhase(numbers: FluidNumbers, line: FluidLine): LiquidPhase {
  const { acentric, criticalK, criticalPa } = numbers;
  const volumeScale = (MOLAR_GAS_CONSTANT * criticalK) / criticalPa;

  /** ∂h/∂p, m³/mol; its derivative with temperature stays in `secondTerm`. */
  function byPressure(k: number): number {
    const t = k / criticalK;
    const { volume, first, second } = liquidVolume(acentric, t, scratch);
    secondTerm = (-volumeScale * t * second) / criticalK;
    return volumeScale * (volume - t * first);
  }
  let secondTerm = 0;

  const pressureTerm = (k: number): number => byPressure(k) * line.pressure(k) * line.lnSlope(k);

  return {
    enthalpy: (k, p) => line.liquid(k) + byPressure(k) * (p - line.pressure(k)),
    heatCapacity(k, p) {
      const saturated = line.pressure(k);
      const slope = line.liquidSlope(k) - byPressure(k) * saturated * line.lnSlope(k);
      return slope + secondTerm * (p - saturated);
    },
    saturatedHeatCapacity: (k) => line.liquidSlope(k) - pressureTerm(k),
    pressureTerm,
  };
}
