import { nasa9Cp } from '../nasa9/nasa9Cp';
import { nasa9Enthalpy } from '../nasa9/nasa9Enthalpy';
import type { FluidLine } from './fluidLine';
import type { FluidNumbers } from './fluidNumbers';

/** The solid below the melting point. */
export interface SolidPhase {
  readonly fromK: number;
  readonly enthalpy: (temperatureK: number) => number;
  readonly heatCapacity: (temperatureK: number) => number;
}

/** The solid, which lies the enthalpy of fusion below the liquid at the melting point; absent where no heat capacity is known. */
export function solidPhase(numbers: FluidNumbers, line: FluidLine): SolidPhase | undefined {
  const { solid, fusion, meltingK } = numbers;
  if (solid === undefined || fusion === undefined) return undefined;
  const top = line.liquid(meltingK) - fusion.value;
  const { heatCapacity } = solid;
  if (!('intervals' in heatCapacity)) {
    const { value, slope, atK } = heatCapacity;
    return {
      fromK: solid.fromK,
      enthalpy: (k) => top + (k - meltingK) * (value + slope * (0.5 * (k + meltingK) - atK)),
      heatCapacity: (k) => value + slope * (k - atK),
    };
  }
  const atTop = nasa9Enthalpy(heatCapacity, meltingK);
  return {
    fromK: solid.fromK,
    enthalpy: (k) => top + nasa9Enthalpy(heatCapacity, k) - atTop,
    heatCapacity: (k) => nasa9Cp(heatCapacity, k),
  };
}
