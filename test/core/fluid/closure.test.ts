import { describe, expect, it } from 'vitest';
import { fluidEntries } from '../../../core/catalogue/fluids/entries';
import { heat } from '../../../core/path/heat';
import type { Curve } from '../../../core/substance';

const fluids = fluidEntries.map((entry) => entry.make());
const withGas = fluids.filter((fluid) => fluid.ladder(101325).missingAbove === undefined);

/** Temperatures inside a range, both ends left out. */
function inside({ from, to }: { from: number; to: number }, count = 12): number[] {
  return Array.from({ length: count }, (_, i) => from + ((to - from) * (i + 0.5)) / count);
}

function slopeOf(curve: Curve, k: number): number {
  const h = 1e-3;
  return (curve.at(k + h) - curve.at(k - h)) / (2 * h);
}

describe('one enthalpy for all phases of a fluid', () => {
  it('there are 49 fluids, 45 with a heat capacity of their vapour', () => {
    expect(fluids.length).toBe(49);
    expect(withGas.length).toBe(45);
  });

  it.each(fluids)('$name: the slope along the line is the derivative of the latent heat', (fluid) => {
    const latent = fluid.latent('vaporization', 'coexistence');
    const slope = fluid.latentSlope('vaporization', 'coexistence');
    for (const k of inside({ from: latent.from, to: 0.98 * latent.to })) {
      // step 1e-3 K: rounding of the latent heat, 1e-11 J/mol / 1e-3 K, and the third derivative, below 1e-6 of the slope here
      expect(Math.abs(slopeOf(latent, k) / slope.at(k) - 1), `${k} K`).toBeLessThan(1e-6);
    }
    expect(latent.at(latent.to)).toBe(0);
  });

  it.each(withGas)('$name: slope = Δcp of the real phases + pressure term', (fluid) => {
    const slope = fluid.latentSlope('vaporization', 'coexistence');
    const term = fluid.coexistenceTerm('vaporization');
    const [gas, liquid] = [fluid.heatCapacity('gas', 'saturated'), fluid.heatCapacity('liquid', 'saturated')];
    for (const k of inside(term)) {
      const sum = gas.at(k) - liquid.at(k) + term.at(k);
      expect(Math.abs(slope.at(k) - sum), `${k} K`).toBeLessThan(1e-9 * gas.at(k));
    }
  });

  it.each(withGas)('$name: HEAT across boiling is LATENT at that temperature', (fluid) => {
    const latent = fluid.latent('vaporization', 'coexistence');
    const triple = fluid.saturationPressure('liquid').at(fluid.transitionTemperature('fusion') ?? NaN);
    const highest = fluid.saturationPressure('liquid').at(fluid.coexistenceTerm('vaporization').to);
    for (let i = 1; i < 12; i++) {
      const p = Math.max(triple, 1) * (highest / Math.max(triple, 1)) ** (i / 12);
      const gap = fluid.ladder(p).gaps.find(({ change }) => change === 'vaporization');
      if (gap === undefined) throw new Error(`no boiling at ${p} Pa`);
      const across = heat(fluid, { form: 'saturated', phase: 'liquid' }, { form: 'saturated', phase: 'gas' }, p);
      // differences of enthalpies of at most 1e6 J/mol: 1e-16 each, and the boiling temperature to 1e-15
      expect(Math.abs(across - latent.at(gap.temperatureK)), `${p} Pa`).toBeLessThan(1e-8);
    }
  });

  it.each(withGas)('$name: heat capacities are derivatives of enthalpies, off the line too', (fluid) => {
    for (const p of [1e3, 101325, 5e5]) {
      for (const phase of ['liquid', 'gas'] as const) {
        const enthalpy = fluid.enthalpy(phase, p);
        const cp = fluid.heatCapacity(phase, p);
        for (const k of inside(cp, 6)) {
          // where a phase changes to the other's side the curve may switch to the ideal gas: stay in the branch
          if (k < enthalpy.from + 0.01 || k > enthalpy.to - 0.01) continue;
          expect(Math.abs(slopeOf(enthalpy, k) / cp.at(k) - 1), `${phase} ${p} Pa ${k} K`).toBeLessThan(1e-5);
        }
      }
    }
  });

  it.each(withGas)('$name: isobaric and standard slopes are derivatives of their latent heats', (fluid) => {
    for (const kind of ['isobaric', 'standard'] as const) {
      const latent = fluid.latent('vaporization', kind);
      const slope = fluid.latentSlope('vaporization', kind);
      for (const k of inside(latent, 6)) {
        expect(Math.abs(slopeOf(latent, k) - slope.at(k)), `${kind} ${k} K`).toBeLessThan(1e-4);
      }
    }
  });

  it.each(fluids)('$name: saturation temperature is the inverse of saturation pressure', (fluid) => {
    const pressure = fluid.saturationPressure('liquid');
    const temperature = fluid.saturationTemperature('liquid');
    for (const k of inside(pressure)) {
      expect(Math.abs(temperature.at(pressure.at(k)) / k - 1)).toBeLessThan(4e-15);
    }
  });

  it.each(fluids)('$name: a cycle at one pressure returns to zero', (fluid) => {
    const { rungs, gaps } = fluid.ladder(101325);
    const [first, last] = [rungs[0], rungs[rungs.length - 1]];
    if (first === undefined || last === undefined) throw new Error('no rungs');
    const up = rungs.reduce((sum, rung) => sum + rung.enthalpy(rung.toK) - rung.enthalpy(rung.fromK), 0);
    const across = gaps.reduce((sum, gap) => sum + gap.above - gap.below, 0);
    const whole = last.enthalpy(last.toK) - first.enthalpy(first.fromK);
    // a sum of ten numbers below 1e6 J/mol
    expect(Math.abs(up + across - whole)).toBeLessThan(1e-8);
  });
});
