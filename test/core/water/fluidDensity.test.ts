import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { fluidDensity } from '../../../core/water/fluidDensity';
import { emptyFluidState } from '../../../core/water/fluidState';
import { meltingTemperature } from '../../../core/water/boundaries';
import { saturationAt } from '../../../core/water/saturationLine';
import { expectWithin } from './reference';

const CRITICAL_K = 647.096;
const CRITICAL_PA = 22.064e6;
const state = emptyFluidState();
const seeded = { seed: 1995, numRuns: 1500 };

/**
 * p(rho(T, p)) = p. The pressure of a liquid is a small difference of large terms: it is known to some 1e-13 of the
 * stiffness rho (dp/drho), which for cold liquid is 2 GPa; near 235 K, where powers up to tau^50 cancel, to 1e-12.
 */
function roundTrip(temperatureK: number, pressurePa: number, phase: 'liquid' | 'gas'): number {
  const density = fluidDensity(temperatureK, pressurePa, phase, state);
  const stiffness = density * state.pressureByDensity;
  const words = `pressure of ${phase} at ${temperatureK} K`;
  expectWithin(state.pressure, pressurePa, 1e-12 * (stiffness + pressurePa), words);
  expect(state.pressureByDensity).toBeGreaterThan(0);
  return density;
}

const lnPressure = (from: number, to: number) =>
  fc.double({ min: Math.log(from), max: Math.log(to), noNaN: true }).map(Math.exp);
const kelvin = (from: number, to: number) => fc.double({ min: from, max: to, noNaN: true });

describe('density solver: the pressure comes back (R6-95)', () => {
  it('above the critical temperature, 1 Pa to 1000 MPa', () => {
    fc.assert(
      fc.property(kelvin(CRITICAL_K, 1273), lnPressure(1, 1e9), (t, p) => {
        roundTrip(t, p, 'gas');
      }),
      seeded,
    );
  });

  it('liquid from the melting curve or 235 K to the critical temperature, stable', () => {
    fc.assert(
      fc.property(kelvin(235, CRITICAL_K - 0.01), lnPressure(700, 1e9), (t, p) => {
        fc.pre(p > saturationAt(t).pressure && (p <= 208e6 || t > meltingTemperature(p)));
        expect(roundTrip(t, p, 'liquid')).toBeGreaterThan(322);
      }),
      seeded,
    );
  });

  it('liquid below its vapour pressure, superheated, to 580 K', () => {
    fc.assert(
      fc.property(kelvin(235, 580), lnPressure(1, 1e7), (t, p) => {
        fc.pre(p < saturationAt(t).pressure);
        expect(roundTrip(t, p, 'liquid')).toBeLessThanOrEqual(saturationAt(t).liquid.density * (1 + 1e-12));
      }),
      seeded,
    );
  });

  it('vapour below the saturation pressure', () => {
    fc.assert(
      fc.property(kelvin(235, CRITICAL_K - 0.01), kelvin(1e-9, 1), (t, share) => {
        const density = roundTrip(t, share * saturationAt(t).pressure, 'gas');
        expect(density).toBeLessThanOrEqual(saturationAt(t).vapour.density * (1 + 1e-9));
      }),
      seeded,
    );
  });

  it('density rises with pressure through the near-critical region', () => {
    for (const t of [CRITICAL_K, 647.1, 647.2, 648, 650]) {
      let last = 0;
      for (let i = 0; i <= 200; i++) {
        const density = roundTrip(t, CRITICAL_PA * (0.98 + 0.0002 * i), 'gas');
        expect(density).toBeGreaterThan(last);
        last = density;
      }
    }
  });

  it('says NaN where a branch has no such pressure', () => {
    expect(fluidDensity(300, 101325, 'gas')).toBeNaN(); // far beyond the spinodal of the vapour
    expect(fluidDensity(640, 1e5, 'liquid')).toBeNaN(); // liquid cannot be superheated that far
  });
});
