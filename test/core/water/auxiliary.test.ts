import { describe, it } from 'vitest';
import { auxiliarySaturation } from '../../../core/water/saturationAuxiliary';
import { checksOf, expectPrinted } from './reference';

describe('auxiliary saturation equations (IAPWS SR1-86(1992))', () => {
  for (const { id, at, expected } of checksOf('water-auxiliary.json')) {
    it(id, () => {
      const state = auxiliarySaturation(at['T']!);
      const actual: Record<string, number> = {
        p: state.pressure,
        dpdT: state.slope,
        rho_l: state.liquidDensity,
        rho_v: state.vapourDensity,
        alpha: state.alpha,
        h_l: state.liquidEnthalpy,
        h_v: state.vapourEnthalpy,
        phi: state.phi,
        s_l: state.liquidEntropy,
        s_v: state.vapourEntropy,
      };
      for (const [name, value] of Object.entries(expected)) {
        // alpha and h_l of cold liquid are small differences of terms of 1 MJ/kg: one place is 1e-10 J/kg
        expectPrinted(actual[name]!, { ...value, within: value.within + 1e-9 }, name);
      }
    });
  }
});
