import { describe, it } from 'vitest';
import { emptyIceState, iceState } from '../../../core/water/iceState';
import { checksOf, expectPrinted } from './reference';

describe('ice Ih (IAPWS R10-06(2009) Table 6; Wright et al. 2010)', () => {
  for (const { id, at, expected } of checksOf('water-ice.json')) {
    it(id, () => {
      const ice = iceState(at['T']!, at['p']!, emptyIceState());
      const { gibbs, volume, entropy, volumeByTemperature, volumeByPressure, gibbsTT, enthalpy, cp } = ice;
      const actual: Record<string, number> = {
        g: gibbs,
        g_p: volume,
        g_T: -entropy,
        g_pp: volumeByPressure,
        g_Tp: volumeByTemperature,
        g_TT: gibbsTT,
        h: enthalpy,
        f: gibbs - ice.pressure * volume,
        u: enthalpy - ice.pressure * volume,
        s: entropy,
        cp,
        rho: 1 / volume,
        alpha: volumeByTemperature / volume,
        beta: -volumeByTemperature / volumeByPressure,
        kappa_T: -volumeByPressure / volume,
        kappa_s: (volumeByTemperature ** 2 - gibbsTT * volumeByPressure) / (volume * gibbsTT),
      };
      for (const [name, value] of Object.entries(expected)) {
        // g and f are small differences of terms of 632 kJ/kg, whose last place is 1.2e-10 J/kg
        const slack = name === 'g' || name === 'f' ? 6e5 * 8 * Number.EPSILON : 0;
        expectPrinted(actual[name]!, { ...value, within: value.within + slack }, name);
      }
    });
  }
});
