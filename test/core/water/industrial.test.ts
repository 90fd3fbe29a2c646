import { describe, it } from 'vitest';
import { fluidStateAt } from '../../../core/water/fluidDensity';
import { emptyFluidState, fluidState, type FluidState } from '../../../core/water/fluidState';
import { liquidVapourTemperature } from '../../../core/water/lineTemperature';
import { liquidVapourPressure } from '../../../core/water/saturationLine';
import { checksOf, expectDeviation, inSi, type Check } from './reference';

const state = emptyFluidState();

function stateOf({ at, model }: Check): FluidState {
  if (at['rho'] !== undefined) return fluidState(at['T']!, at['rho'], state);
  fluidStateAt(at['T']!, at['p']! * 1e6, model.endsWith('region 1') ? 'liquid' : 'gas', state);
  return state;
}

describe('the industrial formulation as a cross-check (IAPWS R7-97(2012) Tables 5, 15, 33, 35, 36)', () => {
  for (const check of checksOf('water-industrial.json')) {
    it(`${check.source}: ${check.id} differs by the stated deviation`, () => {
      const { at, expected } = check;
      const actual: Record<string, () => number> = {
        v: () => stateOf(check).volume,
        h: () => stateOf(check).enthalpy,
        u: () => stateOf(check).internalEnergy,
        s: () => stateOf(check).entropy,
        cp: () => stateOf(check).cp,
        w: () => stateOf(check).soundSpeed,
        p: () => (at['rho'] === undefined ? liquidVapourPressure(at['T']!) : stateOf(check).pressure),
        T: () => liquidVapourTemperature(at['p']! * 1e6),
      };
      for (const [name, value] of Object.entries(expected)) {
        const printed = inSi(value);
        const own = value.within / Math.abs(value.value);
        expectDeviation(actual[name]!() / printed - 1, value.deviationOfR695!, own, name);
      }
    });
  }
});
