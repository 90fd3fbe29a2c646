import { describe, expect, it } from 'vitest';
import { emptyDeparture, vapourDeparture } from '../../../core/fluid/leeKesler';

const out = emptyDeparture();

function at(t: number, p: number, acentric: number, polar = 0, bonding = 0) {
  expect(vapourDeparture(t, p, acentric, polar, bonding, out)).toBe(true);
  return { ...out };
}

describe('departure of a real vapour after Lee and Kesler', () => {
  /**
   * Second virial coefficients after Tsonopoulos, AIChE J. 20 (1974) 263: an equation of its own, from other data. The two
   * correlations differ by at most 0.05 from Tr = 0.7 up, where the coefficient itself is −0.7 (and −0.6 per acentric factor).
   */
  it.each([0.7, 0.8, 1, 1.5, 2.5])('second virial coefficient at Tr = %d', (t) => {
    const simple = 0.1445 - 0.33 / t - 0.1385 / t ** 2 - 0.0121 / t ** 3 - 0.000607 / t ** 8;
    const byAcentric = 0.0637 + 0.331 / t ** 2 - 0.423 / t ** 3 - 0.008 / t ** 8;
    const p = 1e-6;
    for (const w of [0, 0.3978]) {
      const virial = ((at(t, p, w).compressibility - 1) * t) / p;
      expect(Math.abs(virial - simple - w * byAcentric)).toBeLessThan(0.05);
    }
  });

  const states = [
    [0.6, 0.01, 0.2, 0, 0],
    [0.75, 0.08, 0.35, 0.02, 0],
    [0.8, 0.1, 0.6, 0, 0.003],
    [0.9, 0.4, 0.1, 0, 0],
    [1.4, 0.7, 0.35, 0.02, 0.001],
  ] as const;

  it.each(states)('its derivatives are those of the enthalpy: %d, %d, %d, %d, %d', (t, p, w, a, b) => {
    const here = at(t, p, w, a, b);
    const h = 1e-5;
    const byT = (at(t + h, p, w, a, b).enthalpy - at(t - h, p, w, a, b).enthalpy) / (2 * h);
    const byP = (at(t, p + h * p, w, a, b).enthalpy - at(t, p - h * p, w, a, b).enthalpy) / (2 * h * p);
    // central differences of step 1e-5: the next term is below 1e-7 of the derivative, rounding 1e-11/1e-5
    expect(Math.abs(byT / here.heatCapacity - 1)).toBeLessThan(1e-6);
    expect(Math.abs(byP / here.byPressure - 1)).toBeLessThan(1e-6);
  });

  it.each(states)('(∂h/∂p)T = v − T(∂v/∂T)p: %d, %d, %d, %d, %d', (t, p, w, a, b) => {
    const h = 1e-5;
    const volume = (k: number): number => (at(k, p, w, a, b).compressibility * k) / p;
    const thermodynamic = volume(t) - (t * (volume(t + h) - volume(t - h))) / (2 * h);
    expect(Math.abs(at(t, p, w, a, b).byPressure / thermodynamic - 1)).toBeLessThan(1e-6);
  });

  it('is the ideal gas at no pressure', () => {
    const { compressibility, enthalpy } = at(0.7, 1e-9, 0.3, 0.02, 0.001);
    expect(Math.abs(compressibility - 1)).toBeLessThan(1e-8);
    expect(Math.abs(enthalpy)).toBeLessThan(1e-7);
  });

  it('says where it has no vapour', () => {
    expect(vapourDeparture(0.6, 0.5, 0.2, 0, 0, out)).toBe(false);
  });
});
