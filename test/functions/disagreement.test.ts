import { beforeAll, describe, expect, it } from 'vitest';
import { catalogue } from '../../core/catalogue/find';
import { Problem } from '../../core/problem';
import { disagreement } from '../../functions/disagreement';
import { houseStore } from '../../functions/house/store';
import { settingsStore } from '../../functions/settings/store';
import { call, cellOf, faultOf } from './host';

beforeAll(() => {
  settingsStore.publish({ state: 'absent' });
  houseStore.publish({ state: 'absent' });
});

/** Two temperatures within the latent heat of a change, where there is a range. */
function inside(name: string, change: string): readonly [number, number] | undefined {
  const substance = catalogue.find(name);
  const curve = orMissing(() => substance.latent(change, substance.defaultKind(change)));
  if (curve === undefined || curve.to <= curve.from) return undefined;
  const { from, to } = curve;
  return [from + 0.4 * (to - from), from + 0.6 * (to - from)];
}

/** What the core gives, and nothing where data are missing or reach less far. */
function orMissing<Value>(ask: () => Value): Value | undefined {
  try {
    return ask();
  } catch (thrown) {
    if (thrown instanceof Problem) return undefined;
    throw thrown;
  }
}

describe('DISAGREEMENT', () => {
  it('is 0 for water, whose data come from one equation, over a range too', () => {
    expect(call(disagreement, ['water', 'vaporization', 25, [[100], [120]]])).toEqual([[0], [0]]);
    expect(cellOf(call(disagreement, ['water', 'vaporization', 25, 100], ['answer=method']))).toMatch(/same equations/);
  });

  it('is the number of the core in the workbook’s unit, turned by words of opposite direction and by swapped ends', () => {
    let compared = 0;
    for (const { name } of catalogue.entries) {
      const substance = catalogue.find(name);
      for (const change of substance.changes) {
        const places = inside(name, change);
        if (places === undefined) continue;
        const [from, to] = places;
        const expected = orMissing(() => substance.disagreement(change, from, to).value);
        if (expected === undefined) continue;
        compared++;
        const cell = (word: string, a: number, b: number): number =>
          cellOf(call(disagreement, [name, word, a, b], ['temperature=K; heat=J/mol'])) as number;
        expect(cell(change, from, to)).toBe(expected);
        const rounding = 1e-9 * Math.max(1, Math.abs(expected), 1e5); // two integrals of some 1e5 J/mol
        expect(Math.abs(cell(change, to, from) + expected), `${name} ${change}`).toBeLessThanOrEqual(rounding);
        if (change === 'vaporization') expect(cell('condensation', from, to)).toBe(-expected);
      }
    }
    expect(compared).toBeGreaterThan(20);
  });

  it('refuses what lies outside, and names it', () => {
    const { code, message } = faultOf(() => call(disagreement, ['water', 'vaporization', 25, 400]));
    expect(code).toBe('#N/A');
    expect(message).toMatch(/^to 400 degC is outside \[.*, 373\.946 degC\] for /);
    expect(faultOf(() => call(disagreement, ['water', 'vaporization', 25, undefined])).message).toMatch(/^to: allowed/);
  });
});
