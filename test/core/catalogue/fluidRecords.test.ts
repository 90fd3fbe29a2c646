import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { FLUID_CHECK_ROWS } from '../../../functions/checks/fluidCheckRows';

interface Value {
  readonly value: number;
  readonly source: string;
  readonly status?: string;
  readonly confirmed?: boolean;
  readonly rejected?: string;
  readonly uncertainty?: number;
  readonly agrees?: unknown;
  readonly alternatives?: readonly Value[];
}

interface Fluid {
  readonly name: string;
  readonly synonyms: readonly string[];
  readonly formula: string;
  readonly cas: string;
  readonly Tb: Value;
  readonly check_values: Readonly<Record<string, readonly Value[]>>;
}

const records = JSON.parse(
  readFileSync(new URL('../../../core/catalogue/generate/records/fluids.json', import.meta.url), 'utf8'),
) as { sources: Record<string, string>; fluids: readonly Fluid[] };

/** Every object with a source, wherever it stands. */
function valuesIn(node: unknown, where: string): { where: string; value: Value }[] {
  if (Array.isArray(node)) return node.flatMap((item, i) => valuesIn(item, `${where}[${i}]`));
  if (typeof node !== 'object' || node === null) return [];
  const here = 'source' in node ? [{ where, value: node as Value }] : [];
  return [...here, ...Object.entries(node).flatMap(([key, child]) => valuesIn(child, `${where}.${key}`))];
}

const values = records.fluids.flatMap((fluid) => valuesIn(fluid, fluid.name));

describe('cited data of the fluids', () => {
  it('are of 51 fluids, each value with a source in full', () => {
    expect(records.fluids).toHaveLength(51);
    expect(values.length).toBeGreaterThan(1500);
    for (const { where, value } of values) {
      expect(records.sources[value.source]?.length ?? 0, `${where}: ${value.source}`).toBeGreaterThan(15);
    }
  });

  it('every source is used', () => {
    const used = JSON.stringify(records.fluids);
    expect(Object.keys(records.sources).filter((key) => !used.includes(`"${key}"`))).toEqual([]);
  });

  it('a value from memory counts as confirmed only where another agrees, and a rejected one never', () => {
    const wrong = values
      .filter(
        ({ value }) =>
          (value.status === 'from memory' && value.confirmed === true && value.agrees === undefined) ||
          (value.rejected !== undefined && value.confirmed === true),
      )
      .map(({ where }) => where);
    expect(wrong).toEqual([]);
  });

  it('every value in use says whether it is confirmed', () => {
    const alternative = /alternatives\[|antoine|wagner/;
    const silent = values.filter(({ where, value }) => !alternative.test(where) && value.confirmed === undefined);
    expect(silent.map(({ where }) => where)).toEqual([]);
  });

  it('the checks that users see are printed values of these records', () => {
    const strays: string[] = [];
    for (const [name, boiling, atBoiling, at298, fusion] of FLUID_CHECK_ROWS) {
      const fluid = records.fluids.find((one) => one.name === name);
      if (fluid === undefined) {
        strays.push(name);
        continue;
      }
      const lists = fluid.check_values;
      for (const [printed, list] of [
        [boiling, [fluid.Tb]],
        [atBoiling, lists.dHvap_at_Tb],
        [at298, lists.dHvap_298_15],
        [fusion, lists.dHfus_at_Tm],
      ] as const) {
        if (printed === 0) continue;
        // The rows keep five digits.
        const found = list?.some((v) => v.rejected === undefined && Math.abs(v.value - printed[0]) <= 5e-5 * v.value);
        if (found !== true) strays.push(`${name}: ${printed[0]}`);
      }
    }
    // Mercury and iodine are checked with the condensed substances.
    expect(FLUID_CHECK_ROWS).toHaveLength(records.fluids.length - 2);
    expect(strays).toEqual([]);
  });
});
