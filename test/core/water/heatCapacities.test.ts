import { describe, it } from 'vitest';
import { emptyFluidState, fluidState } from '../../../core/water/fluidState';
import { water } from '../../../core/water/water';
import { checksOf, expectDeviation, expectPrinted, inSi, MOLAR_MASS, type Check } from './reference';

const ONE_ATMOSPHERE = 101325;

/** Our value of a quantity of the reference file, per kilogram. */
function ours(name: string, { at, table }: Check): number {
  const t = at['T'] ?? at['t']! + 273.15;
  const saturated = (phase: 'liquid' | 'gas') => water.heatCapacity(phase, 'saturated').at(t) / MOLAR_MASS;
  const iceAt = at['p'] ?? ONE_ATMOSPHERE;
  switch (name) {
    case 'cp_l':
      // other deviations are stated against the saturated liquid, whatever the table's pressure
      return table.startsWith('standard')
        ? water.heatCapacity('liquid', 'standard').at(t) / MOLAR_MASS
        : saturated('liquid');
    case 'cp_v':
      return saturated('gas');
    case 'delta_cp':
      return saturated('gas') - saturated('liquid');
    case 'cp0':
    case 'cp0_molar':
      return water.heatCapacity('gas', 'standard').at(t) / MOLAR_MASS;
    case 'h':
      return water.enthalpy('solid', iceAt).at(t) / MOLAR_MASS;
    case 'cp':
      return at['rho'] === undefined
        ? water.heatCapacity('solid', iceAt).at(t) / MOLAR_MASS
        : fluidState(t, at['rho'], emptyFluidState()).cp;
    default:
      throw new Error(`no such quantity here: ${name}`);
  }
}

const checks = checksOf('water-heat-capacities.json');

describe('computed and published heat capacities (R6-95, R10-06; Wright et al. 2010), every printed digit', () => {
  for (const check of checks) {
    if (!check.status.startsWith('computed') && check.status !== 'published') continue;
    it(check.id, () => {
      for (const [name, value] of Object.entries(check.expected)) expectPrinted(ours(name, check), value, name);
    });
  }
});

describe('printed heat capacities lie where the reference says (WP2002 and handbook tables)', () => {
  for (const check of checks) {
    const stated = Object.entries(check.expected).filter(([, value]) => value.deviation !== undefined);
    if (stated.length === 0) continue;
    it(`${check.id}: ${check.source}`, () => {
      for (const [name, value] of stated) {
        const own = value.within / value.value;
        expectDeviation(inSi(value) / ours(name, check) - 1, value.deviation!, own, name);
      }
    });
  }
});
