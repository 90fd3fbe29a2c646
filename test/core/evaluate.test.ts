import { describe, expect, it } from 'vitest';
import { catalogue } from '../../core/catalogue/find';
import { evaluate, valueAt } from '../../core/evaluate';
import { meanOver } from '../../core/meanOver';
import { plainWords, Problem } from '../../core/problem';
import type { Curve } from '../../core/substance';

const line = (from: number, to: number): Curve => ({
  axis: 'temperature',
  from,
  to,
  subject: 'heat of wax',
  unit: 'J/mol',
  method: 'straight line',
  sources: ['made for this test'],
  at: (t) => 10 * t,
});

function wordsOf(run: () => unknown): string {
  try {
    return `no problem: ${String(run())}`;
  } catch (thrown) {
    if (thrown instanceof Problem) return plainWords(thrown.data);
    throw thrown;
  }
}

describe('the ends of a range', () => {
  it('are met where unit conversion or a solver leaves the last digits over, and then are no extension', () => {
    const curve = line(300, 400);
    expect(valueAt(curve, 400 * (1 + 2e-16))).toBe(4000);
    expect(valueAt(curve, 400 + 3e-7)).toBe(4000);
    expect(valueAt(curve, 300 - 2e-7)).toBe(3000);
    expect(evaluate(curve, 400 + 3e-7, 'extend').marks).toEqual([]);
    expect(wordsOf(() => valueAt(curve, 400 + 5e-7))).toBe(
      'temperature 400 K is outside [300 K, 400 K] for heat of wax',
    );
  });

  it('of a boiling line are reached at the pressure that the message names', () => {
    for (const name of ['aluminium', 'iron', 'zinc']) {
      const curve = catalogue.find(name).saturationTemperature('stable');
      expect(wordsOf(() => valueAt(curve, 1e6))).toMatch(/^no problem: \d+\.\d+$/);
    }
  });

  it('that fall together are named once', () => {
    expect(wordsOf(() => valueAt(line(350, 350), 340))).toBe('temperature 340 K: heat of wax is known at 350 K only');
  });
});

describe('an extension', () => {
  it('does not go to absolute zero and below, nor to no pressure, for any substance', () => {
    for (const { name } of catalogue.entries) {
      const substance = catalogue.find(name);
      for (const change of substance.changes) {
        for (const kind of ['coexistence', 'isobaric', 'standard'] as const) {
          const curves = [() => substance.latent(change, kind), () => substance.latentSlope(change, kind)];
          for (const make of curves) {
            let curve: Curve;
            try {
              curve = make();
            } catch (thrown) {
              if (thrown instanceof Problem) continue;
              throw thrown;
            }
            if (curve.from <= 0) continue;
            for (const t of [0, -5]) {
              expect(
                wordsOf(() => valueAt(curve, t, 'extend')),
                `${change} of ${name}, ${kind}`,
              ).toMatch(/^temperature (0|-5) K(: | is outside)/);
            }
          }
        }
      }
    }
  });

  it('of a mean that has no finite value is refused with the range', () => {
    const water = catalogue.find('water').heatCapacity('liquid', 101325);
    expect(wordsOf(() => meanOver(water, 298.15, 10_000, 'extend'))).toMatch(
      /^mean_to 10000 K is outside \[235 K, 590\.\d+ K\] for heat capacity of liquid water at 101325 Pa$/,
    );
  });
});
