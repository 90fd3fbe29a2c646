import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { NEAREST_TO_CRITICAL_K } from '../../../core/water/ranges';
import {
  meltingHeat,
  meltingSlope,
  sublimationHeat,
  sublimationPressure,
  sublimationSlope,
} from '../../../core/water/iceEquilibriumLines';
import { liquidVapourTemperature, sublimationTemperature } from '../../../core/water/lineTemperature';
import * as fast from '../../../core/water/fastLines';
import { CRITICAL_FROM_K, LN_PRESSURE_SCALE, SUPERCOOLED_TO_K } from '../../../core/water/fastPathPlan';
import { phaseBranch } from '../../../core/water/phaseBranch';
import { liquidVapourPressure, vaporizationHeat, vaporizationSlope } from '../../../core/water/saturationLine';
import { pieceTowardsEnd } from '../../../core/water/chebyshevPieces';
import { expectWithin, MOLAR_MASS } from './reference';

const CRITICAL_K = 647.096;
const liquid = phaseBranch('liquid', 101325);
const ice = phaseBranch('solid', 101325);

/**
 * The bound is 1e-9 of the value. On the last 0.05 K below the critical point the full solution itself scatters, since
 * the densities of the two phases are found to fewer and fewer digits: by 3e-7 of the latent heat 1/1024 K below Tc,
 * falling with the distance to the power 3/2 (measured as the scatter about a straight line through close neighbours).
 */
function bound(temperatureK: number): number {
  const distance = CRITICAL_K - temperatureK;
  return distance > 0.05 ? 1e-9 : Math.max(1e-9, 3e-7 * (1 / 1024 / distance) ** 1.5);
}

/** A latent-heat slope can pass through zero: its bound is relative to 1 J/(mol K) at least. */
const slopeScale = (value: number) => Math.max(1, Math.abs(value));

interface Held {
  readonly name: string;
  readonly from: number;
  readonly to: number;
  readonly fast: (x: number) => number;
  readonly full: (x: number) => number;
  readonly tolerance: (x: number, value: number) => number;
}

const relative = (_x: number, value: number) => 1e-9 * Math.abs(value);
const ofSlope = (_x: number, value: number) => 1e-9 * slopeScale(value);

const held: readonly Held[] = [
  {
    name: 'heat of vaporization',
    from: 235,
    to: NEAREST_TO_CRITICAL_K,
    fast: fast.fastVaporizationHeat,
    full: (t) => MOLAR_MASS * vaporizationHeat(t),
    tolerance: (t, value) => bound(t) * value,
  },
  {
    name: 'slope of the heat of vaporization',
    from: 235,
    to: NEAREST_TO_CRITICAL_K,
    fast: fast.fastVaporizationSlope,
    full: (t) => MOLAR_MASS * vaporizationSlope(t),
    // a slope scatters three times as much as its function: the heat capacities diverge
    tolerance: (t, value) => (CRITICAL_K - t > 0.1 ? 1 : 3) * bound(t) * slopeScale(value),
  },
  {
    name: 'pressure of the liquid-vapour line',
    from: 235,
    to: CRITICAL_K,
    fast: fast.fastLiquidVapourPressure,
    full: liquidVapourPressure,
    tolerance: relative,
  },
  {
    name: 'heat of sublimation',
    from: 130,
    to: 273.16,
    fast: fast.fastSublimationHeat,
    full: (t) => MOLAR_MASS * sublimationHeat(t),
    tolerance: relative,
  },
  {
    name: 'slope of the heat of sublimation',
    from: 130,
    to: 273.16,
    fast: fast.fastSublimationSlope,
    full: (t) => MOLAR_MASS * sublimationSlope(t),
    tolerance: ofSlope,
  },
  {
    name: 'pressure of the ice-vapour line',
    from: 130,
    to: 273.16,
    fast: fast.fastSublimationPressure,
    full: sublimationPressure,
    tolerance: relative,
  },
  {
    name: 'heat of fusion along the melting line',
    from: 251.165,
    to: 273.16,
    fast: fast.fastMeltingHeat,
    full: (t) => MOLAR_MASS * meltingHeat(t),
    tolerance: relative,
  },
  {
    name: 'slope of the heat of fusion along the melting line',
    from: 251.165,
    to: 273.16,
    fast: fast.fastMeltingSlope,
    full: (t) => MOLAR_MASS * meltingSlope(t),
    tolerance: ofSlope,
  },
  {
    name: 'heat of fusion at one atmosphere',
    from: 235,
    to: 273.16,
    fast: fast.fastFusionHeat,
    full: (t) => MOLAR_MASS * (liquid.enthalpy(t) - ice.enthalpy(t)),
    tolerance: relative,
  },
  {
    name: 'slope of the heat of fusion at one atmosphere',
    from: 235,
    to: 273.16,
    fast: fast.fastFusionSlope,
    full: (t) => MOLAR_MASS * (liquid.heatCapacity(t) - ice.heatCapacity(t)),
    tolerance: ofSlope,
  },
  {
    name: 'temperature of the liquid-vapour line (over ln p)',
    from: Math.log(liquidVapourPressure(235)) + 1e-12,
    to: Math.log(22.064e6),
    fast: (lnP) => fast.fastLiquidVapourTemperature(Math.exp(lnP)),
    full: (lnP) => liquidVapourTemperature(Math.exp(lnP)),
    tolerance: relative,
  },
  {
    name: 'temperature of the ice-vapour line (over ln p)',
    from: Math.log(sublimationPressure(130)) + 1e-12,
    to: Math.log(611.654771),
    fast: (lnP) => fast.fastSublimationTemperature(Math.exp(lnP)),
    full: (lnP) => sublimationTemperature(Math.exp(lnP)),
    tolerance: relative,
  },
];

describe('the fast path against the full solution', () => {
  for (const { name, from, to, fast: quick, full, tolerance } of held) {
    it(`${name} over its whole range`, () => {
      const compare = (x: number) => {
        const value = full(x);
        expectWithin(quick(x), value, tolerance(x, value), `${name} at ${x}`);
      };
      for (let i = 0; i <= 600; i++) compare(i === 600 ? to : from + ((to - from) * i) / 600);
      fc.assert(
        fc.property(fc.double({ min: from, max: to, noNaN: true }), (x) => {
          compare(x);
        }),
        { seed: 20021, numRuns: 300 },
      );
    });
  }

  it('heat and slope of vaporization in every piece towards the critical point', () => {
    for (let piece = 0; piece < 32; piece++) {
      const [near, far] = pieceTowardsEnd(piece);
      for (const share of [0.01, 0.21, 0.5, 0.77, 0.99]) {
        const t = CRITICAL_K - (near + share * (far - near));
        const heat = MOLAR_MASS * vaporizationHeat(t);
        expectWithin(fast.fastVaporizationHeat(t), heat, bound(t) * heat, `heat at ${t}`);
        const slope = MOLAR_MASS * vaporizationSlope(t);
        const tolerance = (CRITICAL_K - t > 0.1 ? 1 : 3) * bound(t) * Math.abs(slope);
        expectWithin(fast.fastVaporizationSlope(t), slope, tolerance, `slope at ${t}`);
      }
    }
  });

  it('on the last 1/1024 K, beyond the full solution, both carry the same power law on', () => {
    for (const distance of [9e-4, 1e-4, 1e-6]) {
      const full = MOLAR_MASS * vaporizationHeat(CRITICAL_K - distance);
      // both start from values with a scatter of 3e-7, and the power law multiplies that of its exponent by ln(1000)
      expectWithin(fast.fastVaporizationHeat(CRITICAL_K - distance), full, 2e-6 * full, `heat ${distance} K below Tc`);
    }
    expect(fast.fastVaporizationHeat(CRITICAL_K)).toBe(0);
    expect(fast.fastLiquidVapourPressure(CRITICAL_K)).toBe(22.064e6);
    expect(fast.fastLiquidVapourTemperature(22.064e6)).toBe(CRITICAL_K);
  });

  it('answers at every border itself, where one table hands over to the next', () => {
    for (const t of [235, SUPERCOOLED_TO_K, CRITICAL_FROM_K, NEAREST_TO_CRITICAL_K]) {
      const heat = MOLAR_MASS * vaporizationHeat(t);
      expectWithin(fast.fastVaporizationHeat(t), heat, bound(t) * heat, `heat at ${t}`);
    }
    const lnBorder = Math.log(22.064e6) - 768 / LN_PRESSURE_SCALE;
    for (let i = -20; i <= 20; i++) {
      const pressurePa = Math.exp(lnBorder) * (1 + i * Number.EPSILON);
      const temperatureK = liquidVapourTemperature(pressurePa);
      expectWithin(fast.fastLiquidVapourTemperature(pressurePa), temperatureK, 1e-9 * temperatureK, `border ${i}`);
    }
  });

  it('pieces meet at their borders', () => {
    const critical = Array.from({ length: 32 }, (_, piece) => CRITICAL_K - pieceTowardsEnd(piece)[0]);
    const supercooled = Array.from({ length: 9 }, (_, piece) => 233 + pieceTowardsEnd(22 + piece)[1]);
    const middle = Array.from(
      { length: 9 },
      (_, i) => SUPERCOOLED_TO_K + ((CRITICAL_FROM_K - SUPERCOOLED_TO_K) * (i + 1)) / 10,
    );
    for (const border of [...critical, ...supercooled, ...middle, SUPERCOOLED_TO_K, CRITICAL_FROM_K]) {
      const step = 1e-12 * border;
      const heatJump = fast.fastVaporizationHeat(border + step) - fast.fastVaporizationHeat(border - step);
      // what the function itself changes over two steps, and 5e-10 for two truncated series
      const own = 2 * step * Math.abs(fast.fastVaporizationSlope(Math.min(border, NEAREST_TO_CRITICAL_K)));
      expectWithin(heatJump, 0, 1.1 * own + 5e-10 * fast.fastVaporizationHeat(border), `heat at border ${border}`);
      const pressureJump = fast.fastLiquidVapourPressure(border + step) - fast.fastLiquidVapourPressure(border - step);
      // ln p changes by less than 0.1 a kelvin, which is 1e-10 over two steps
      expectWithin(pressureJump, 0, 2e-10 * fast.fastLiquidVapourPressure(border), `pressure at border ${border}`);
    }
    const even = (from: number, to: number, pieces: number) =>
      Array.from({ length: pieces - 1 }, (_, i) => from + ((to - from) * (i + 1)) / pieces);
    for (const [f, borders] of [
      [fast.fastSublimationHeat, even(130, 273.16, 10)],
      [fast.fastSublimationPressure, even(130, 273.16, 10)],
      [fast.fastMeltingHeat, even(251.165, 273.16, 8)],
      [fast.fastFusionHeat, supercooled.filter((border) => border < 273)],
    ] as const) {
      for (const border of borders) {
        const step = 1e-12 * border;
        const jump = f(border + step) - f(border - step);
        expectWithin(jump, 0, 1e-10 * f(border), `border at ${border}`);
      }
    }
  });
});
