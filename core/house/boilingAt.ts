import { Problem, shortNumber } from '../problem';
import { readable } from './given';
import type { MaterialData } from './materialData';

/** A pressure that agrees with a boiling temperature's own within its rounding. */
const SAME_PRESSURE = 1e-3;

export function samePressure(a: number, b: number): boolean {
  return Math.abs(a / b - 1) <= SAME_PRESSURE;
}

/** Where a material begins to boil or sublime at a pressure, or what is lacking to say so. */
export type Boiling =
  | { readonly change: 'vaporization' | 'sublimation'; readonly temperatureK: number }
  | { readonly lacking: string; readonly liquidToK: number };

/**
 * The transition to the vapour at a pressure: from the vapour pressure over the liquid, over the solid below the
 * melting temperature, or from a boiling temperature at just this pressure.
 *
 * @throws Problem `range` for a pressure below the vapour pressures given, where no liquid is known to last
 */
export function boilingAt(data: MaterialData, pressurePa: number): Boiling {
  const meltingK = readable(data.transitions.get('fusion'))?.temperatureK;
  const overSolid = readable(data.pressures.get('solid'));
  if (overSolid !== undefined) {
    const temperatureK = overSolid.shape.inverse(pressurePa);
    if (temperatureK >= overSolid.fromK && temperatureK <= overSolid.toK && temperatureK <= (meltingK ?? Infinity)) {
      return { change: 'sublimation', temperatureK };
    }
  }
  const overLiquid = readable(data.pressures.get('liquid'));
  if (overLiquid !== undefined) {
    const lowest = overLiquid.shape.at(overLiquid.fromK);
    const highest = overLiquid.shape.at(overLiquid.toK);
    if (pressurePa >= lowest && pressurePa <= highest) {
      const temperatureK = overLiquid.shape.inverse(pressurePa);
      if (temperatureK >= (meltingK ?? 0)) return { change: 'vaporization', temperatureK };
    }
    if (pressurePa > highest) {
      return { lacking: `vapour pressure above ${shortNumber(highest)} Pa`, liquidToK: overLiquid.toK };
    }
    throw new Problem({
      code: 'range',
      argument: 'pressure',
      quantity: 'pressure',
      received: pressurePa,
      from: meltingK === undefined ? lowest : Math.max(lowest, overLiquid.shape.at(meltingK)),
      to: highest,
      subject: `heating paths of ${data.name}`,
    });
  }
  const point = readable(data.transitions.get('vaporization'));
  if (point === undefined) return { lacking: 'vapour pressure', liquidToK: Infinity };
  if (samePressure(pressurePa, point.pressurePa)) {
    return { change: 'vaporization', temperatureK: point.temperatureK };
  }
  return { lacking: `vapour pressure at ${shortNumber(pressurePa)} Pa`, liquidToK: point.temperatureK };
}
