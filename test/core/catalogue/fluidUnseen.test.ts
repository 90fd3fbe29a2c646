import { describe, expect, it } from 'vitest';
import { catalogue } from '../../../core/catalogue/find';
import { AIMS } from './fluidAims';
import { judge, quantile, unseen, type Judged } from './fluidReference';

const judged: readonly Judged[] = unseen.values.map(judge).filter((one) => one !== undefined);

const percent = (share: number): string => `${(100 * share).toFixed(2)} %`;

/** What a failure prints: the figures by fluid, worst first. */
function figures(some: readonly Judged[]): string {
  const byFluid = new Map<string, Judged[]>();
  for (const one of some) byFluid.set(one.at.fluid, [...(byFluid.get(one.at.fluid) ?? []), one]);
  return [...byFluid]
    .map(([fluid, list]) => ({ fluid, list, worst: Math.max(...list.map((j) => Math.abs(j.deviation))) }))
    .sort((a, b) => b.worst - a.worst)
    .map(({ fluid, list }) => {
      const each = list.map((j) => `${j.at.T_K} K ${percent(j.deviation)} (±${percent(2 * j.stated)})`);
      return `${fluid}: ${each.join(', ')}`;
    })
    .join('\n');
}

describe('fluids against published values that no fit has seen', () => {
  it('compares hundreds of values of at least 25 fluids', () => {
    expect(judged.length).toBeGreaterThan(400);
    expect(new Set(judged.map(({ at }) => at.fluid)).size).toBeGreaterThanOrEqual(25);
  });

  it('the published values agree with the printed boiling points and enthalpies there, as their file says', () => {
    for (const [fluid, { T_K, p_sat_kPa, dHvap_kJ_per_mol }] of Object.entries(unseen.agreement)) {
      const substance = catalogue.entry(fluid)?.make();
      if (substance === undefined) throw new Error(`no such fluid: ${fluid}`);
      const p = substance.saturationPressure('stable').at(T_K) / 1000;
      expect(Math.abs(p_sat_kPa / p - 1), `${fluid}: ${p_sat_kPa} kPa, catalogue ${p}`).toBeLessThan(0.015);
      if (dHvap_kJ_per_mol === undefined) continue;
      const latent = substance.latent('vaporization', 'coexistence').at(T_K) / 1000;
      expect(Math.abs(dHvap_kJ_per_mol / latent - 1), `${fluid}: ${dHvap_kJ_per_mol}, ${latent}`).toBeLessThan(0.02);
    }
  });

  it.each(AIMS)('$name: half of them within $median, 95 % within $most', ({ of, median, most }) => {
    const some = judged.filter(of);
    const sizes = some.map(({ deviation }) => Math.abs(deviation));
    const [half, nearlyAll] = [quantile(sizes, 0.5), quantile(sizes, 0.95)];
    const words = `${some.length} values: median ${percent(half)}, 95 % within ${percent(nearlyAll)}\n${figures(some)}`;
    expect(half, words).toBeLessThanOrEqual(median);
    expect(nearlyAll, words).toBeLessThanOrEqual(most);
  });

  it.each(AIMS)('$name: the expanded uncertainty covers 95 %, beside that of the published value', ({ of }) => {
    const some = judged.filter(of);
    // Two values with an uncertainty each: what may lie between them is the root of the sum of squares.
    const outside = some.filter(
      ({ deviation, stated, published }) => Math.abs(deviation) > Math.hypot(2 * stated, published),
    );
    const share = 1 - outside.length / some.length;
    expect(
      some.every(({ stated }) => Number.isFinite(stated)),
      'an uncertainty is stated everywhere',
    ).toBe(true);
    expect(share, `${percent(share)} of ${some.length} covered; outside:\n${figures(outside)}`).toBeGreaterThanOrEqual(
      0.95,
    );
  });
});
