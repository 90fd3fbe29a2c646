import { describe, expect, it } from 'vitest';
import { evaluate } from '../../../core/evaluate';
import { Problem } from '../../../core/problem';
import { idealGasEnthalpy } from '../../../core/water/idealGas';
import { liquidVapourPressure, saturationAt } from '../../../core/water/saturationLine';
import { water } from '../../../core/water/water';
import type { Curve, Phase } from '../../../core/substance';
import { expectWithin, MOLAR_MASS } from './reference';

function problemOf(action: () => unknown): string {
  try {
    action();
  } catch (problem) {
    if (problem instanceof Problem) return problem.message;
    throw problem;
  }
  throw new Error('no problem was thrown');
}

const codes = (curve: Curve, x: number) => evaluate(curve, x).marks.map((mark) => mark.code);

describe('constants', () => {
  const valueOf = (item: string) => water.constants.find((datum) => datum.item === item)!.value;

  it('each has its own source', () => {
    for (const { item, source, value } of water.constants) {
      expect(source.length, item).toBeGreaterThan(10);
      expect(Number.isFinite(value), item).toBe(true);
    }
  });

  it('those that follow from the equations do follow from them', () => {
    const half = (digits: number) => 0.5 * 10 ** -digits;
    expectWithin(water.transitionTemperature('fusion')!, valueOf('melting temperature'), half(6), 'melting');
    expectWithin(water.saturationTemperature('stable').at(101325), valueOf('boiling temperature'), half(6), 'boiling');
    expectWithin(saturationAt(273.16).pressure, valueOf('triple pressure'), half(6), 'triple pressure');
    const acentric = -Math.log10(liquidVapourPressure(0.7 * 647.096) / valueOf('critical pressure')) - 1;
    expectWithin(acentric, valueOf('acentric factor'), half(6), 'acentric factor');
  });
});

describe('kinds and ranges', () => {
  it('default kinds: vaporization and sublimation along the line, fusion at one pressure', () => {
    expect(water.changes.map((change) => water.defaultKind(change))).toEqual([
      'isobaric',
      'coexistence',
      'coexistence',
    ]);
    expect(water.transitionTemperature('vaporization')).toBeUndefined();
  });

  it('every curve has a finite value at both ends of its range', () => {
    const curves: Curve[] = [];
    for (const change of water.changes) {
      curves.push(water.coexistenceTerm(change));
      for (const kind of ['coexistence', 'standard'] as const) {
        curves.push(water.latent(change, kind), water.latentSlope(change, kind));
      }
      const pressurePa = change === 'sublimation' ? 50 : 101325;
      curves.push(water.latent(change, 'isobaric', pressurePa), water.latentSlope(change, 'isobaric', pressurePa));
    }
    for (const surface of ['stable', 'ice', 'liquid'] as const) {
      curves.push(water.saturationPressure(surface), water.saturationTemperature(surface));
    }
    for (const phase of ['solid', 'liquid', 'gas'] as const) {
      curves.push(water.heatCapacity(phase, 'saturated'), water.heatCapacity(phase, 'standard'));
      for (const pressurePa of [1, 600, 101325, 1e7, 2.5e7, 2e8]) {
        curves.push(water.heatCapacity(phase, pressurePa), water.enthalpy(phase, pressurePa));
      }
    }
    for (const curve of curves) {
      for (const x of [curve.from, curve.to, 0.5 * (curve.from + curve.to)]) {
        expect(Number.isFinite(evaluate(curve, x).value), `${curve.subject} at ${x}`).toBe(true);
      }
      expect(curve.sources.length).toBeGreaterThan(0);
    }
  });

  it('outside its range a curve refuses with the range in the words', () => {
    const vaporization = water.latent('vaporization', 'coexistence');
    expect(problemOf(() => evaluate(vaporization, 650))).toBe(
      'temperature 650 K is outside [235 K, 647.096 K] for vaporization of water along its coexistence line',
    );
    expect(problemOf(() => evaluate(water.heatCapacity('gas', 'standard'), 120))).toMatch(/outside \[130 K, 1273 K\]/);
    // metastable vapour at one atmosphere is not followed to room temperature
    expect(problemOf(() => evaluate(water.latent('vaporization', 'isobaric'), 298.15))).toMatch(
      /is outside \[34\d\.\d+ K/,
    );
  });

  it('extends vapour beyond 1273 K when asked, but nothing to where the equations lose their sense', () => {
    expect(evaluate(water.heatCapacity('gas', 101325), 1400, 'extend').marks.map((mark) => mark.code)).toEqual([
      'extended',
    ]);
    expect(problemOf(() => evaluate(water.heatCapacity('liquid', 101325), 200, 'extend'))).toMatch(/outside/);
    expect(problemOf(() => evaluate(water.latent('vaporization', 'coexistence'), 660, 'extend'))).toMatch(/outside/);
    expect(problemOf(() => evaluate(water.heatCapacity('gas', 'standard'), 100, 'extend'))).toMatch(/outside/);
  });

  it('refuses pressures and changes that it has no equation for', () => {
    expect(problemOf(() => water.latent('vaporization', 'isobaric', 3e7))).toMatch(/pressure 30000000 Pa is outside/);
    expect(problemOf(() => water.enthalpy('solid', 3e8))).toMatch(/ice Ih/);
    expect(problemOf(() => water.latent('sublimation', 'isobaric', 101325))).toMatch(/colder phase ends at 273\.16 K/);
    expect(problemOf(() => water.heatCapacity('gas', -5))).toMatch(/pressure -5 Pa is outside/);
    expect(problemOf(() => water.heatCapacity('gas', Number.NaN))).toMatch(/finite number/);
    expect(problemOf(() => water.latent('alpha-gamma', 'coexistence'))).toMatch(/fusion, vaporization, sublimation/);
    expect(problemOf(() => water.ladder(2e9))).toMatch(/heating paths of water/);
  });
});

describe('marks', () => {
  it('supercooled liquid, superheated phases and supersaturated vapour are marked metastable', () => {
    expect(codes(water.latent('vaporization', 'coexistence'), 260)).toEqual(['metastable']);
    expect(codes(water.latent('vaporization', 'coexistence'), 300)).toEqual([]);
    expect(codes(water.latent('fusion', 'isobaric'), 263.15)).toEqual(['metastable']);
    expect(codes(water.latent('fusion', 'isobaric'), water.transitionTemperature('fusion')!)).toEqual([]);
    expect(codes(water.latent('vaporization', 'isobaric'), 360)).toEqual(['metastable']);
    expect(codes(water.heatCapacity('liquid', 101325), 400)).toEqual(['metastable']);
    expect(codes(water.heatCapacity('liquid', 101325), 300)).toEqual([]);
    expect(codes(water.saturationPressure('liquid'), 253.15)).toEqual(['metastable']);
    expect(codes(water.saturationPressure('stable'), 253.15)).toEqual([]);
  });

  it('the last tenth of a kelvin below the critical point is marked', () => {
    expect(codes(water.latent('vaporization', 'coexistence'), 647.05)).toEqual(['near-critical']);
    expect(codes(water.heatCapacity('liquid', 'saturated'), 647.05)).toEqual(['near-critical']);
  });

  it('vapour below its condensation temperature is the ideal-gas vapour and says so', () => {
    const vapour = water.enthalpy('gas', 101325);
    expect(codes(vapour, 300)).toEqual(['ideal-gas']);
    expect(codes(vapour, 380)).toEqual([]);
    expect(vapour.at(300)).toBe(MOLAR_MASS * idealGasEnthalpy(300));
    // the real vapour lies below the ideal one: attraction lowers its enthalpy by some 0.24 kJ/mol at the boiling point
    const boiling = water.saturationTemperature('stable').at(101325);
    const step = vapour.at(boiling - 1e-6) - vapour.at(boiling + 1e-6);
    expect(step).toBeGreaterThan(100);
    expect(step).toBeLessThan(400);
  });
});

describe('ladders at the edges', () => {
  const phases = (pressurePa: number): (Phase | 'supercritical')[] =>
    water.ladder(pressurePa).rungs.map(({ phase }) => phase);

  it('sublimation below the triple-point pressure, three phases above, one fluid above the critical pressure', () => {
    expect(phases(100)).toEqual(['solid', 'gas']);
    expect(phases(1e5)).toEqual(['solid', 'liquid', 'gas']);
    expect(phases(3e7)).toEqual(['solid', 'supercritical']);
    expect(phases(3e8)).toEqual(['supercritical']);
  });

  it('a supercritical rung is one curve through the critical temperature', () => {
    const [, fluid] = water.ladder(2.3e7).rungs;
    expectWithin(fluid!.enthalpy(647.096 + 1e-7), fluid!.enthalpy(647.096 - 1e-7), 1e-3, 'at Tc'); // cp is 0.4 kJ/(mol K)
  });

  it('above 208.566 MPa the path starts at the melting curve and says why', () => {
    const [fluid] = water.ladder(3e8).rungs;
    expectWithin(fluid!.fromK, 254.964, 5e-4, 'melting of ice III at 300 MPa (R14-08, inverted)');
    expect(problemOf(() => fluid!.enthalpy(250))).toMatch(/ice III, V and VI have no equation of state here/);
  });

  it('near the critical pressure the two fluid phases still join', () => {
    for (const below of [1e-2, 1e-3, 1e-4, 2e-5]) {
      const { gaps } = water.ladder(22.064e6 * (1 - below));
      const gap = gaps.at(-1)!;
      expect(gap.change).toBe('vaporization');
      expect(gap.above).toBeGreaterThan(gap.below);
    }
    expect(phases(22.0639e6)).toEqual(['solid', 'supercritical']);
  });
});
