import { describe, expect, it } from 'vitest';
import type { Answer } from '../../../core/answer';
import { acentricLatent } from '../../../core/estimate/acentricLatent';
import type { BoilingPoint } from '../../../core/estimate/boilingPoint';
import { chenLatent } from '../../../core/estimate/chenLatent';
import { kistiakowskyLatent } from '../../../core/estimate/kistiakowskyLatent';
import { riedelLatent } from '../../../core/estimate/riedelLatent';
import { troutonLatent } from '../../../core/estimate/troutonLatent';
import { vetereLatent } from '../../../core/estimate/vetereLatent';
import { Problem } from '../../../core/problem';
import { exampleOf, near, nonAssociating, reference, statesScatter } from './reference';

interface Fluid {
  readonly boilingK: number;
  readonly criticalK: number;
  readonly criticalBar: number;
  readonly acentricFactor: number;
}

const point = ({ boilingK, criticalK, criticalBar }: Fluid): BoilingPoint => ({
  boilingK,
  criticalK,
  criticalPressurePa: criticalBar * 1e5,
});

/** Each method by the name that the benchmark has for it. */
const METHODS: readonly (readonly [string, (fluid: Fluid) => Answer])[] = [
  ['riedel_1.093', (fluid) => riedelLatent(point(fluid))],
  ['chen', (fluid) => chenLatent(point(fluid))],
  ['vetere_F1', (fluid) => vetereLatent(point(fluid))],
  ['pitzer_at_Tb', ({ boilingK, criticalK, acentricFactor }) => acentricLatent(boilingK, criticalK, acentricFactor)],
  ['trouton_88', ({ boilingK }) => troutonLatent(boilingK)],
  ['kistiakowsky', ({ boilingK }) => kistiakowskyLatent(boilingK)],
];

describe.each(METHODS)('%s', (name, estimate) => {
  it.each(reference.computedBenchmarks)('agrees with another computation for $name', (fluid) => {
    const other = (fluid.computed[name] ?? NaN) * 1000;
    // half of its last digit, 0.5 J/mol, and the gas constant with 4 digits there: 5e-5
    near(estimate(fluid).value, other, 0.5 + 5e-5 * other);
  });

  it('has the scatter about printed latent heats that it states, for non-associating fluids', () => {
    const inRange = nonAssociating.filter(({ boilingK, criticalK }) => {
      if (name.startsWith('trouton')) return boilingK >= 150;
      return !name.startsWith('pitzer') || boilingK >= 0.6 * criticalK;
    });
    expect(inRange.length).toBeGreaterThanOrEqual(30);
    const answers = inRange.map((fluid) => ({ fluid, answer: estimate(fluid) }));
    const deviations = answers.map(({ fluid, answer }) => answer.value / 1000 / fluid.latentAtBoiling - 1);
    const [first] = answers;
    statesScatter((first?.answer.uncertainty ?? NaN) / (first?.answer.value ?? NaN), deviations);
  });

  it('names its kind, source and typical error', () => {
    const [benzene] = reference.computedBenchmarks;
    if (benzene === undefined) throw new Error('no benchmark');
    const { kind, unit, sources, method, marks } = estimate(benzene);
    expect({ kind, unit, marks }).toEqual({ kind: 'coexistence', unit: 'J/mol', marks: [] });
    expect(sources.join()).toMatch(/\d{4}/);
    expect(method).toMatch(/typical error [\d.]+ % \(k = 1\)/);
  });
});

describe('estimates at the boiling point', () => {
  const benzene = { boilingK: 353.24, criticalK: 562.05, criticalPressurePa: 48.95e5 };

  it("reproduces Trouton's rule for methanol (Felder & Rousseau, Example 8.4-3)", () => {
    const { result } = exampleOf('trouton-watson-methanol');
    near(troutonLatent(337.9, 109).value / 1000, result.intermediate ?? NaN, 0.05); // half of the last printed digit
  });

  it("Vetere's factor brings higher alcohols nearer, 1-propanol to 4 %", () => {
    const alcohol = reference.fluids.find(({ name }) => name === '1-propanol');
    if (alcohol === undefined) throw new Error('no 1-propanol');
    const miss = (factor: number): number =>
      Math.abs(vetereLatent(point(alcohol), factor).value / 1000 / alcohol.latentAtBoiling - 1);
    expect(miss(1.05)).toBeLessThan(0.04);
    expect(miss(1.05)).toBeLessThan(miss(1));
  });

  it('is 0 at the critical temperature by the acentric factor, and has no value beyond', () => {
    expect(acentricLatent(562.05, 562.05, 0.21).value).toBe(0);
    expect(() => acentricLatent(562.06, 562.05, 0.21, 'extend')).toThrow(Problem);
  });

  it('refuses a boiling point outside the range in words, and extends when asked', () => {
    const helium = { boilingK: 4.22, criticalK: 5.195, criticalPressurePa: 227500 }; // from memory
    expect(() => riedelLatent(helium)).toThrow(
      "boiling temperature 4.22 K is outside [2.5975 K, 4.156 K] for Riedel's estimate: 0.5 to 0.8 of the critical temperature",
    );
    expect(riedelLatent(helium, 'extend').marks.map(({ code }) => code)).toEqual(['extended']);
    expect(() => troutonLatent(77.3)).toThrow(
      "boiling temperature 77.3 K is outside [150 K, 500 K] for Trouton's rule",
    );
  });

  it.each([
    [{ ...benzene, boilingK: 0 }, 'boiling temperature: allowed a number above 0; received 0 K'],
    [{ ...benzene, criticalK: NaN }, 'critical temperature: allowed a number above 0; received NaN K'],
    [
      { ...benzene, criticalPressurePa: 48.95 },
      'critical pressure: allowed a number above 101325 Pa; received 48.95 Pa',
    ],
  ])('refuses numbers out of bounds %#', (bad, words) => {
    expect(() => chenLatent(bad)).toThrow(words);
  });

  it('refuses an acentric factor that is none', () => {
    expect(() => acentricLatent(300, 400, 21)).toThrow('acentric factor: allowed a number in [-0.3, 1.5]; received 21');
  });
});
