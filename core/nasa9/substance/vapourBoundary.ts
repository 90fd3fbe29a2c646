import type { CondensedModel } from './model';

/** Where the vapour begins at a pressure. */
export interface VapourBoundary {
  readonly change: 'vaporization' | 'sublimation';
  readonly temperatureK: number;
}

/**
 * The temperature at which a substance boils at a pressure, or sublimes where that comes before melting.
 *
 * @param model with or without data of the vapour
 * @param pressurePa absolute pressure
 * @returns absent without data of the vapour, above the pressure to which it is an ideal gas, and below the pressure of
 * the coldest solid
 */
export function vapourBoundary(model: CondensedModel, pressurePa: number): VapourBoundary | undefined {
  const { overSolid, overLiquid, meltingK = -Infinity } = model;
  const hottest = overLiquid ?? overSolid;
  const coldest = overSolid ?? overLiquid;
  if (hottest === undefined || coldest === undefined) return undefined;
  if (pressurePa > hottest.toPa || pressurePa < coldest.fromPa) return undefined;
  if (overSolid !== undefined && pressurePa <= overSolid.toPa) {
    const temperatureK = overSolid.temperatureK(pressurePa);
    if (overLiquid === undefined || temperatureK < meltingK) return { change: 'sublimation', temperatureK };
  }
  // equal within the rounding of the coefficients at the triple point: never below it
  return { change: 'vaporization', temperatureK: Math.max(hottest.temperatureK(pressurePa), meltingK) };
}
