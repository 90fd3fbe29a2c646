import { describe, it } from 'vitest';
import {
  HIGHEST_ICE_IH_PRESSURE_PA,
  highPressureMeltingTemperature,
  meltingPressureFit,
  sublimationPressureFit,
  type IcePhase,
} from '../../../core/water/iceLines';
import { meltingAt, sublimationAt } from '../../../core/water/iceEquilibriumLines';
import { checksOf, expectDeviation, expectPrinted, expectWithin } from './reference';

describe('melting and sublimation of ice (IAPWS R14-08(2011); equal Gibbs energy of R6-95 and R10-06)', () => {
  for (const { id, model, at, expected } of checksOf('water-ice-lines.json')) {
    it(`${id}: ${model}`, () => {
      const temperatureK = at['T']!;
      const pressure = expected['p']!;
      const phase = /^R14-08 melting (\w+)$/.exec(model)?.[1] as IcePhase | undefined;
      if (phase !== undefined) {
        expectPrinted(meltingPressureFit(phase, temperatureK), pressure, 'p');
        return;
      }
      if (model === 'R14-08 sublimation') {
        expectPrinted(sublimationPressureFit(temperatureK), pressure, 'p');
        return;
      }
      const melting = model.endsWith('melting');
      const solved = melting ? meltingAt(temperatureK).pressure : sublimationAt(temperatureK).pressure;
      // Gibbs energies are known to 1e-10 J/kg, which is 1e-6 Pa on the melting line and 1e-11 of most pressures
      expectPrinted(solved, { ...pressure, within: pressure.within + (melting ? 2e-12 : 0) }, 'p');
      if (pressure.deviationOfFit === undefined) return;
      const fit = melting ? meltingPressureFit('Ih', temperatureK) : sublimationPressureFit(temperatureK);
      expectDeviation(fit / solved - 1, pressure.deviationOfFit, 0, 'deviation of the fit');
    });
  }

  it('melting curves meet at the triple points between ices (R14-08: 350.1 MPa, 632.4 MPa, 2216 MPa)', () => {
    // the release prints these pressures with four digits
    expectWithin(meltingPressureFit('III', 256.164), 350.1e6, 0.05e6, 'III-V-liquid');
    expectWithin(meltingPressureFit('V', 273.31), 632.4e6, 0.05e6, 'V-VI-liquid');
    expectWithin(meltingPressureFit('VI', 355), 2216e6, 0.5e6, 'VI-VII-liquid');
    expectWithin(meltingPressureFit('VII', 355), 2216e6, 1e-6, 'VII starts there');
  });

  it('the melting temperature under high pressure is the inverse of the melting pressure', () => {
    for (const [phase, pressurePa] of [
      ['III', HIGHEST_ICE_IH_PRESSURE_PA],
      ['III', 300e6],
      ['V', 500e6],
      ['VI', 1000e6],
    ] as const) {
      const back = meltingPressureFit(phase, highPressureMeltingTemperature(pressurePa));
      // one rounding of T is 60 roundings of (T/Tref)^60
      expectWithin(back, pressurePa, 200 * Number.EPSILON * pressurePa, phase);
    }
  });
});
