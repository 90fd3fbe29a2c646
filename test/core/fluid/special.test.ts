import { describe, expect, it } from 'vitest';
import { findSubstance } from '../../../core/catalogue/find';
import { heat } from '../../../core/path/heat';
import { heatSteps } from '../../../core/path/heatSteps';

describe('carbon dioxide', () => {
  const co2 = findSubstance('carbon dioxide');

  it('has no liquid at one atmosphere: its path is the vapour from the temperature of sublimation on', () => {
    const { rungs, gaps, missingBelow } = co2.ladder(101325);
    expect(rungs.map(({ phase, fromK }) => [phase, fromK])).toEqual([['gas', 194.67]]);
    expect(gaps).toEqual([]);
    expect(missingBelow).toBe('heat capacity of solid carbon dioxide');
  });

  it('refuses what leads to the solid with words', () => {
    const bare = (temperatureK: number) => ({ form: 'temperature', temperatureK }) as const;
    expect(() => heat(co2, bare(150), bare(300), 101325)).toThrow(/heat capacity of solid carbon dioxide/);
    expect(() => co2.saturationPressure('ice')).toThrow(/heat capacity of solid carbon dioxide/);
  });

  it('melts and boils above the triple-point pressure', () => {
    const { steps } = heatSteps(co2, { form: 'melting', phase: 'solid' }, { form: 'saturated', phase: 'gas' }, 1e6);
    expect(steps.map(({ label }) => label)).toEqual(['fusion', 'liquid', 'vaporization']);
  });
});

describe('acids, whose vapour is half in pairs', () => {
  /** Konicek & Wadso, Acta Chem. Scand. 24 (1970) 2612: to the ideal vapour of single molecules at 298.15 K. */
  it.each([
    ['acetic acid', 51600, 0.08],
    ['formic acid', 46300, 0.03],
  ])('%s: the standard kind is that of single molecules, about twice the real one', (name, standard, within) => {
    const acid = findSubstance(name);
    const [single, real] = [acid.latent('vaporization', 'standard'), acid.latent('vaporization', 'coexistence')];
    // the heat of pairing is known to some kJ/mol only, and the stated uncertainty (k = 2) says so
    expect(Math.abs(single.at(298.15) / standard - 1)).toBeLessThan(within);
    expect(Math.abs(single.at(298.15) - standard)).toBeLessThan(2 * (single.uncertaintyAt?.(298.15) ?? 0));
    expect(single.at(298.15) / real.at(298.15)).toBeGreaterThan(1.8);
  });

  it('their notes say so', () => {
    expect(findSubstance('formic acid').notes.join()).toMatch(/pairs/);
  });
});

describe('what the catalogue lacks is named', () => {
  it.each(['glycerol', 'ethylene glycol', 'dimethylformamide', 'dimethyl sulfoxide'])('%s: vapour', (name) => {
    const fluid = findSubstance(name);
    expect(() => fluid.heatCapacity('gas', 101325)).toThrow(`heat capacity of ${name} vapour`);
    expect(() => fluid.latent('vaporization', 'standard')).toThrow(`heat capacity of ${name} vapour`);
    expect(fluid.latent('vaporization', 'coexistence').at(400)).toBeGreaterThan(3e4);
    expect(fluid.ladder(101325).gaps.map(({ change }) => change)).toEqual(['fusion', 'vaporization']);
  });

  it('ethanol: solid', () => {
    const ethanol = findSubstance('ethanol');
    expect(() => ethanol.heatCapacity('solid', 101325)).toThrow('heat capacity of solid ethanol');
    expect(() => ethanol.latentSlope('fusion', 'isobaric')).toThrow('heat capacity of solid ethanol');
    expect(() => ethanol.latent('sublimation', 'coexistence')).toThrow(/heat capacity of solid ethanol/);
    expect(ethanol.changes).toEqual(['fusion', 'vaporization']);
    expect(ethanol.latent('fusion', 'isobaric').at(159.05)).toBe(5010);
  });

  it('ethanol: beyond the pressure at which the vapour on the line is described', () => {
    expect(() => findSubstance('ethanol').ladder(6e6)).toThrow(/heating paths of ethanol/);
  });
});

describe('sublimation where the solid is known', () => {
  it('naphthalene: pressure over the solid at 298.15 K', () => {
    const naphthalene = findSubstance('naphthalene');
    const p = naphthalene.saturationPressure('ice').at(298.15);
    // recommended value 10.9 to 11.1 Pa (sublimation-pressure standard, from memory); ours is not fitted to it
    expect(Math.abs(p / 11 - 1)).toBeLessThan(0.1);
    const latent = naphthalene.latent('sublimation', 'coexistence');
    // 72.6 kJ/mol at 298.15 K (from memory); the solid's heat capacity is one value
    expect(Math.abs(latent.at(298.15) / 72600 - 1)).toBeLessThan(0.02);
  });

  it.each(['naphthalene', 'phenol', 'bromine'])(
    '%s: sublimation = fusion + vaporization at the melting point',
    (name) => {
      const fluid = findSubstance(name);
      const k = fluid.transitionTemperature('fusion') ?? NaN;
      const sum = fluid.latent('fusion', 'isobaric').at(k) + fluid.latent('vaporization', 'coexistence').at(k);
      const sublimation = fluid.latent('sublimation', 'coexistence').at(k);
      // the liquid of the fusion is at one atmosphere, that of the triple point is not: (v − T·dv/dT)·Δp, below 10 J/mol
      expect(Math.abs(sublimation - sum)).toBeLessThan(20);
      const pressures = fluid.saturationPressure('stable');
      expect(Math.abs(pressures.at(k - 1e-9) / pressures.at(k + 1e-9) - 1)).toBeLessThan(1e-8);
    },
  );

  it('naphthalene: the slope is the derivative along the line', () => {
    const naphthalene = findSubstance('naphthalene');
    const latent = naphthalene.latent('sublimation', 'coexistence');
    const slope = naphthalene.latentSlope('sublimation', 'coexistence');
    for (const k of [280, 300, 330, 350]) {
      const numeric = (latent.at(k + 1e-3) - latent.at(k - 1e-3)) / 2e-3;
      // the term takes a central difference with a step of 0.1 %
      expect(Math.abs(numeric - slope.at(k))).toBeLessThan(1e-3);
    }
  });
});
