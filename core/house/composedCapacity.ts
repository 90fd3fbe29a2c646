import { compositionHeatCapacity, compositionPolynomial, type Composition } from '../estimate/compositionHeatCapacity';
import type { AreaShape } from './shape';

const ZERO_CELSIUS_K = 273.15;

/** A heat capacity from the composition, where it holds and how sure it is; J/(kg K) against K. */
export interface ComposedCapacity {
  readonly shape: AreaShape;
  readonly fromK: number;
  readonly toK: number;
  uncertaintyAt(temperatureK: number): number;
}

/**
 * Heat capacity of a material from its mass fractions as a curve with its integral. Water counts as liquid also below
 * 0 °C, where its two equations meet with a step of 2 %, as published; what is frozen is given as ice.
 *
 * @param composition mass fractions that add up to 1
 * @source Choi and Okos 1986, see `compositionHeatCapacity`
 */
export function composedCapacity(composition: Composition): ComposedCapacity {
  const { cold, warm, fromK, toK } = compositionPolynomial(composition);
  const areaFromZero = (t: number): number => {
    const [a, b, c] = t < 0 ? cold : warm;
    return t * (a + t * (b / 2 + (t * c) / 3));
  };
  const shape: AreaShape = {
    at: (kelvin) => {
      const t = kelvin - ZERO_CELSIUS_K;
      const [a, b, c] = t < 0 ? cold : warm;
      return a + t * (b + t * c);
    },
    slope: (kelvin) => {
      const t = kelvin - ZERO_CELSIUS_K;
      const [, b, c] = t < 0 ? cold : warm;
      return b + 2 * t * c;
    },
    area: (from, to) => areaFromZero(to - ZERO_CELSIUS_K) - areaFromZero(from - ZERO_CELSIUS_K),
  };
  const uncertaintyAt = (kelvin: number): number =>
    compositionHeatCapacity(composition, Math.min(Math.max(kelvin, fromK), toK)).uncertainty ?? 0;
  return { shape, fromK, toK, uncertaintyAt };
}
