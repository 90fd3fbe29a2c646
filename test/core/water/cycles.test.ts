import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { meanOver } from '../../../core/meanOver';
import { saturationAt } from '../../../core/water/saturationLine';
import { sublimationAt } from '../../../core/water/iceEquilibriumLines';
import { water } from '../../../core/water/water';
import type { Curve, Rung } from '../../../core/substance';
import { expectWithin, MOLAR_MASS } from './reference';

const seeded = { seed: 2006, numRuns: 200 };

/** Fourth-order central difference; its truncation is of order h^4 f^(5)/30, its rounding some eps f/h. */
function derivative(curve: Curve, t: number, h: number): number {
  const rise = (step: number) => curve.at(t + step) - curve.at(t - step);
  return (8 * rise(h) - rise(2 * h)) / (12 * h);
}

describe('the three phases share one reference', () => {
  it('sublimation = fusion + vaporization at the triple point, to 1e-9', () => {
    const sublimation = water.latent('sublimation', 'coexistence').at(273.16);
    const fusion = water.latent('fusion', 'coexistence').at(273.16);
    const vaporization = water.latent('vaporization', 'coexistence').at(273.16);
    expectWithin(fusion + vaporization, sublimation, 1e-9 * sublimation, 'sum');
  });

  it('ice to vapour at 611.65 Pa by melting and by subliming: the path does not matter', () => {
    // ice -> liquid -> vapour -> ice along phase enthalpies at one pressure, around T
    const pressurePa = 611.654771;
    const [ice, liquid, gas] = (['solid', 'liquid', 'gas'] as const).map((phase) => water.enthalpy(phase, pressurePa));
    const around =
      liquid!.at(273.16) -
      ice!.at(273.16) +
      (gas!.at(273.16) - liquid!.at(273.16)) -
      water.latent('sublimation', 'coexistence').at(273.16);
    expectWithin(around, 0, 1e-9 * 51000, 'round trip'); // 51 kJ/mol is the largest of the three heats
  });

  it('standard kind: sublimation = fusion + vaporization at any temperature both hold', () => {
    fc.assert(
      fc.property(fc.double({ min: 236, max: 273.16, noNaN: true }), (t) => {
        const sublimation = water.latent('sublimation', 'standard').at(t);
        const sum = water.latent('fusion', 'standard').at(t) + water.latent('vaporization', 'standard').at(t);
        expectWithin(sum, sublimation, 1e-9 * sublimation, `at ${t} K`);
      }),
      seeded,
    );
  });

  it('heating through the triple-point region gives the same vapour just below and just above its pressure', () => {
    const above = water.ladder(611.66).rungs.at(-1)!.enthalpy(300);
    const below = water.ladder(611.65).rungs.at(-1)!.enthalpy(300);
    // (dh/dp)_T of vapour is about -0.2 J/(mol Pa) at 300 K: 0.01 Pa is 2 mJ/mol
    expectWithin(above, below, 5e-3, 'vapour at 300 K');
  });
});

describe('the slope of each kind is the derivative of its own latent heat', () => {
  const cases: readonly (readonly [name: string, latent: Curve, slope: Curve, from: number, to: number])[] = [
    ...(['fusion', 'vaporization', 'sublimation'] as const).flatMap((change) => {
      const range = { fusion: [251.3, 273.05], vaporization: [237, 635], sublimation: [131, 273.05] }[change] as [
        number,
        number,
      ];
      const standard = { fusion: [237, 273.05], vaporization: [237, 580], sublimation: [131, 273.05] }[change] as [
        number,
        number,
      ];
      return [
        [
          `${change}, coexistence`,
          water.latent(change, 'coexistence'),
          water.latentSlope(change, 'coexistence'),
          ...range,
        ] as const,
        [
          `${change}, standard`,
          water.latent(change, 'standard'),
          water.latentSlope(change, 'standard'),
          ...standard,
        ] as const,
      ];
    }),
    [
      'fusion at one atmosphere',
      water.latent('fusion', 'isobaric'),
      water.latentSlope('fusion', 'isobaric'),
      237,
      273.05,
    ],
    [
      'fusion at 50 MPa',
      water.latent('fusion', 'isobaric', 50e6),
      water.latentSlope('fusion', 'isobaric', 50e6),
      237,
      269,
    ],
    [
      'vaporization at 1 atm',
      water.latent('vaporization', 'isobaric'),
      water.latentSlope('vaporization', 'isobaric'),
      346,
      588,
    ],
    [
      'sublimation at 100 Pa',
      water.latent('sublimation', 'isobaric', 100),
      water.latentSlope('sublimation', 'isobaric', 100),
      229,
      273,
    ],
  ];
  for (const [name, latent, slope, from, to] of cases) {
    it(name, () => {
      expect(latent.kind).toBe(slope.kind);
      fc.assert(
        fc.property(fc.double({ min: from, max: to, noNaN: true }), (t) => {
          const value = slope.at(t);
          // h = 0.04 K: rounding 1e-12 of 50 kJ/mol over 0.04 K is 1e-6, the fits add 1e-9 of 50 kJ/mol over a piece;
          // truncation is below both but near 235 K, where the heat capacity of supercooled liquid is steep
          expectWithin(derivative(latent, t, 0.04), value, 2e-6 * Math.max(20, Math.abs(value)), `${name} at ${t} K`);
        }),
        { ...seeded, numRuns: 100 },
      );
    });
  }

  it('coexistence slope = difference of saturated heat capacities + the pressure term', () => {
    const slope = water.latentSlope('vaporization', 'coexistence');
    const term = water.coexistenceTerm('vaporization');
    for (const t of [240, 298.15, 373.15, 500, 600, 640]) {
      const { liquid, vapour } = saturationAt(t);
      const sum = MOLAR_MASS * (vapour.cp - liquid.cp) + term.at(t);
      expectWithin(slope.at(t), sum, 1e-9 * Math.abs(sum), `at ${t} K`); // the bound of the fast path
    }
    const ofSublimation = water.latentSlope('sublimation', 'coexistence');
    for (const t of [140, 200, 270]) {
      const { ice, vapour } = sublimationAt(t);
      const sum = MOLAR_MASS * (vapour.cp - ice.cp) + water.coexistenceTerm('sublimation').at(t);
      expectWithin(ofSublimation.at(t), sum, 1e-8, `sublimation at ${t} K`); // 1e-9 of some 10 J/(mol K)
    }
    const ofFusion = water.latentSlope('fusion', 'coexistence');
    const melts = water.transitionTemperature('fusion')!;
    const sum = water.latentSlope('fusion', 'isobaric').at(melts) + water.coexistenceTerm('fusion').at(melts);
    expectWithin(ofFusion.at(melts), sum, 1e-7, 'fusion'); // the bound of the fast path, 1e-9 of 44 J/(mol K), twice
  });

  it('Clapeyron: the latent heat is T dv dp/dT on every line', () => {
    for (const t of [240, 300, 450, 600, 646]) {
      const { liquid, vapour, slope } = saturationAt(t);
      const heat = t * (vapour.volume - liquid.volume) * slope;
      expectWithin(heat, vapour.enthalpy - liquid.enthalpy, 1e-10 * heat, `at ${t} K`); // rounding of g, some 1e-11 of h
    }
  });
});

describe('lines', () => {
  it('saturation pressure rises with temperature', () => {
    for (const surface of ['stable', 'ice', 'liquid'] as const) {
      const line = water.saturationPressure(surface);
      const { from, to } = line;
      fc.assert(
        fc.property(
          fc.double({ min: from, max: to - 1e-3, noNaN: true }),
          fc.double({ min: 1e-3, max: 5, noNaN: true }),
          (t, more) => {
            expect(line.at(Math.min(t + more, to))).toBeGreaterThan(line.at(t));
          },
        ),
        seeded,
      );
    }
  });

  it('saturation temperature of the saturation pressure is the temperature', () => {
    for (const surface of ['stable', 'ice', 'liquid'] as const) {
      const pressure = water.saturationPressure(surface);
      const temperature = water.saturationTemperature(surface);
      fc.assert(
        fc.property(fc.double({ min: pressure.from + 1e-6, max: pressure.to - 1e-6, noNaN: true }), (t) => {
          // both directions are within 1e-9 of the full solution
          expectWithin(temperature.at(pressure.at(t)), t, 2e-9 * t, surface);
        }),
        seeded,
      );
    }
  });

  it('over ice and over supercooled water the pressures meet at the triple point and part below it', () => {
    const ice = water.saturationPressure('ice');
    const liquid = water.saturationPressure('liquid');
    expectWithin(ice.at(273.16), liquid.at(273.16), 1e-9 * 611.65, 'triple point');
    for (const t of [236, 250, 270]) expect(liquid.at(t)).toBeGreaterThan(ice.at(t));
  });
});

describe('ladders', () => {
  const pressures = [1e-6, 1, 611, 612, 101325, 1e6, 1.6e7, 2.2e7, 2.3e7, 1.5e8, 2.08e8];
  for (const pressurePa of pressures) {
    it(`${pressurePa} Pa: rungs join, gaps are latent heats, enthalpy rises`, () => {
      const { rungs, gaps } = water.ladder(pressurePa);
      expect(rungs.length).toBe(gaps.length + 1);
      gaps.forEach((gap, i) => {
        const [below, above] = [rungs[i] as Rung, rungs[i + 1] as Rung];
        expect(below.toK).toBe(gap.temperatureK);
        expect(above.fromK).toBe(gap.temperatureK);
        expect(gap.below).toBe(below.enthalpy(gap.temperatureK));
        expect(gap.above).toBe(above.enthalpy(gap.temperatureK));
        const curve = water.latent(gap.change, 'coexistence');
        const heat = gap.above - gap.below;
        // the boiling temperature carries a rounding of 1e-13 K, which near Tc moves the heat by its slope
        expectWithin(heat, curve.at(gap.temperatureK), 2e-9 * heat, gap.change);
      });
      for (const rung of rungs) {
        const steps = Array.from({ length: 41 }, (_, i) => rung.fromK + ((rung.toK - rung.fromK) * i) / 40);
        const heats = steps.map((t) => rung.enthalpy(Math.min(t, rung.toK)));
        heats.slice(1).forEach((heat, i) => expect(heat).toBeGreaterThan(heats[i]!));
      }
    });
  }

  it('mean heat capacity times the interval is the rise of enthalpy within a phase', () => {
    for (const [phase, pressurePa, from, to] of [
      ['solid', 101325, 100, 270],
      ['liquid', 101325, 275, 370],
      ['gas', 101325, 380, 1200],
      ['liquid', 1e8, 280, 600],
    ] as const) {
      const heat = meanOver(water.heatCapacity(phase, pressurePa), from, to) * (to - from);
      const enthalpy = water.enthalpy(phase, pressurePa);
      expectWithin(heat, enthalpy.at(to) - enthalpy.at(from), 1e-9 * heat, phase); // quadrature and solver both near rounding
    }
  });
});
