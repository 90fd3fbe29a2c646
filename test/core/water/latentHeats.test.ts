import { describe, it } from 'vitest';
import { meltingAt, meltingHeat, sublimationAt, sublimationHeat } from '../../../core/water/iceEquilibriumLines';
import {
  saturationAt,
  vaporizationHeat,
  vaporizationSlope,
  vaporizationTerm,
} from '../../../core/water/saturationLine';
import { water } from '../../../core/water/water';
import { checksOf, expectDeviation, expectPrinted, expectWithin, inSi, MOLAR_MASS, type Check } from './reference';

const ONE_ATMOSPHERE = 101325;

function temperatureOf({ at }: Check): number {
  return at['T'] ?? at['t']! + 273.15;
}

/** Our value of a quantity of the reference files, per kilogram. */
function ours(name: string, check: Check): number {
  const t = check.at['p'] !== undefined && check.at['t'] === undefined ? Number.NaN : temperatureOf(check);
  const molar = (value: number) => value / MOLAR_MASS;
  const byName: Record<string, () => number> = {
    h_fg: () => vaporizationHeat(t),
    h_ig: () => sublimationHeat(t),
    h_if: () => {
      if (check.model === 'R6-95 + R10-06 melting' && check.at['T'] !== undefined) return meltingHeat(t);
      if (check.id === 'calc-triple') return meltingHeat(t);
      const fusion = water.latent('fusion', 'isobaric', ONE_ATMOSPHERE);
      // printed figures for "0 °C" are heats at the normal melting point, 2.5 mK higher
      const atMelting = Number.isNaN(t) || check.table === 'printed fusion';
      return molar(fusion.at(atMelting ? water.transitionTemperature('fusion')! : t));
    },
    T_melt: () => water.transitionTemperature('fusion')!,
    h_l: () => saturationAt(t).liquid.enthalpy,
    h_v: () => saturationAt(t).vapour.enthalpy,
    s_fg: () => saturationAt(t).vapour.entropy - saturationAt(t).liquid.entropy,
    p: () => saturationAt(t).pressure,
    p_sat: () => saturationAt(t).pressure,
    p_sub: () => sublimationAt(t).pressure,
    dhfg_dT_sat: () => vaporizationSlope(t),
    dhv_dT_sat: () => alongLine(t, 'vapour'),
    dhl_dT_sat: () => alongLine(t, 'liquid'),
    cp_v: () => saturationAt(t).vapour.cp,
    cp_l: () => saturationAt(t).liquid.cp,
    delta_cp: () =>
      check.at['p'] === undefined
        ? saturationAt(t).vapour.cp - saturationAt(t).liquid.cp
        : molar(water.latentSlope('fusion', 'isobaric', ONE_ATMOSPHERE).at(t)),
    slope_minus_delta_cp: () => vaporizationTerm(t),
    dpsat_dT: () => saturationAt(t).slope,
    delta_vap_H_standard: () => molar(water.latent('vaporization', 'standard').at(t)),
    h_ideal_gas: () => molar(water.latent('vaporization', 'standard').at(t) + water.enthalpy('liquid', 1e5).at(t)),
    'h_l_0.1MPa': () => molar(water.enthalpy('liquid', 1e5).at(t)),
    delta_cp_standard: () => molar(water.latentSlope('vaporization', 'standard').at(t)),
  };
  const value = byName[name];
  if (value === undefined) throw new Error(`no such quantity here: ${name}`);
  return value();
}

function alongLine(t: number, phase: 'liquid' | 'vapour'): number {
  const { slope, [phase]: state } = saturationAt(t);
  return state.cp + (state.volume - t * state.volumeByTemperature) * slope;
}

const checks = checksOf('water-latent-heats.json');
const estimates = checks.filter(({ at }) => at['t_from'] !== undefined);

describe('computed and published latent heats (R6-95, R10-06; Wright et al. 2010), every printed digit', () => {
  for (const check of checks) {
    if (estimates.includes(check) || check.model === 'R7-97') continue;
    if (!check.status.startsWith('computed') && check.status !== 'published') continue;
    it(check.id, () => {
      for (const [name, value] of Object.entries(check.expected)) expectPrinted(ours(name, check), value, name);
    });
  }
});

describe('printed figures and correlations lie where the reference says (FAO-56, Stull, Murphy-Koop, tables)', () => {
  for (const check of checks) {
    const stated = Object.entries(check.expected).filter(([, value]) => value.deviation !== undefined);
    if (stated.length === 0) continue;
    it(`${check.id}: ${check.source}`, () => {
      for (const [name, value] of stated) {
        const printed = inSi(value);
        const own = value.within / value.value;
        expectDeviation(printed / ours(name, check) - 1, value.deviation!, own, name);
      }
    });
  }
});

describe('carrying the latent heat to another temperature with heat capacities alone (R6-95)', () => {
  for (const { id, at, expected } of estimates) {
    it(id, () => {
      const from = at['t_from']! + 273.15;
      const to = at['t_to']! + 273.15;
      const start = vaporizationHeat(from);
      const difference = (t: number) => saturationAt(t).vapour.cp - saturationAt(t).liquid.cp;
      const mean = (slope: (t: number) => number) => 0.5 * (slope(from) + slope(to));
      expectPrinted(start, expected['h_fg_from']!, 'from');
      expectPrinted(vaporizationHeat(to), expected['h_fg_to']!, 'to');
      expectPrinted(start + difference(from) * (to - from), expected['estimate_delta_cp_at_from']!, 'one difference');
      expectPrinted(start + mean(difference) * (to - from), expected['estimate_mean_delta_cp']!, 'mean difference');
      expectPrinted(
        start + mean(vaporizationSlope) * (to - from),
        expected['estimate_mean_saturation_slope']!,
        'mean slope of the line',
      );
    });
  }
});

describe('figures that the whole project quotes', () => {
  it('heat of vaporization at 60 °C is 2357.65 kJ/kg (R6-95, computed)', () => {
    expectWithin(vaporizationHeat(333.15), 2357.65e3, 5, 'h_fg'); // half a unit of the last digit
  });

  it('fusion at −10 °C: 311.6 kJ/kg at one atmosphere, 305.4 along the melting line at about 110 MPa', () => {
    expectWithin(water.latent('fusion', 'isobaric').at(263.15) / MOLAR_MASS, 311.6e3, 50, 'isobaric');
    expectWithin(meltingHeat(263.15), 305.4e3, 50, 'coexistence');
    expectWithin(meltingAt(263.15).pressure, 110e6, 2e6, 'melting pressure'); // given as a round figure
  });

  it('the three slopes of vaporization at 298.15 K are −42.70, −40.89 and −41.74 J/(mol K)', () => {
    const pressurePa = water.saturationPressure('stable').at(298.15);
    const half = 0.005; // half a unit of the last printed digit
    expectWithin(water.latentSlope('vaporization', 'coexistence').at(298.15), -42.7, half, 'coexistence');
    expectWithin(water.latentSlope('vaporization', 'isobaric', pressurePa).at(298.15), -40.89, half, 'isobaric');
    expectWithin(water.latentSlope('vaporization', 'standard').at(298.15), -41.74, half, 'standard');
  });

  it('−20 °C: 103.24 Pa over ice, 125.46 Pa over supercooled water', () => {
    expectWithin(water.saturationPressure('stable').at(253.15), 103.24, 0.005, 'ice');
    expectWithin(water.saturationPressure('liquid').at(253.15), 125.46, 0.005, 'liquid');
  });
});
