import { describe, expect, it } from 'vitest';
import { substances } from './tour';

/** Standard atomic weights, IUPAC 2021 (abridged to five digits), from memory. */
const WEIGHTS: Readonly<Record<string, number>> = {
  H: 1.008,
  Li: 6.94,
  Be: 9.0122,
  B: 10.81,
  C: 12.011,
  N: 14.007,
  O: 15.999,
  F: 18.998,
  Na: 22.99,
  Mg: 24.305,
  Al: 26.982,
  Si: 28.085,
  P: 30.974,
  S: 32.06,
  Cl: 35.45,
  Ar: 39.95,
  K: 39.098,
  Ca: 40.078,
  Ti: 47.867,
  V: 50.942,
  Cr: 51.996,
  Mn: 54.938,
  Fe: 55.845,
  Co: 58.933,
  Ni: 58.693,
  Cu: 63.546,
  Zn: 65.38,
  Ga: 69.723,
  Ge: 72.63,
  Br: 79.904,
  Rb: 85.468,
  Sr: 87.62,
  Zr: 91.224,
  Nb: 92.906,
  Mo: 95.95,
  Ag: 107.87,
  Cd: 112.41,
  In: 114.82,
  Sn: 118.71,
  I: 126.9,
  Cs: 132.91,
  Ba: 137.33,
  Ta: 180.95,
  W: 183.84,
  Hg: 200.59,
  Pb: 207.2,
  Th: 232.04,
  U: 238.03,
};

/** Mass of a formula as "C2H6O", "Na2SO4.10H2O", "Mg(NO3)2.6H2O"; undefined where it names an element that is not listed. */
function massOf(formula: string): number | undefined {
  let total = 0;
  for (const part of formula.split(/[·*.]/)) {
    const [, times, rest] = /^(\d*)(.*)$/.exec(part) ?? [];
    const mass = groupMass(rest ?? '');
    if (mass === undefined) return undefined;
    total += (times === '' ? 1 : Number(times)) * mass;
  }
  return total;
}

function groupMass(text: string): number | undefined {
  const open = text.indexOf('(');
  if (open >= 0) {
    const close = text.indexOf(')', open);
    const count = /^\d+/.exec(text.slice(close + 1))?.[0] ?? '';
    const [before, inside, after] = [
      groupMass(text.slice(0, open)),
      groupMass(text.slice(open + 1, close)),
      groupMass(text.slice(close + 1 + count.length)),
    ];
    if (before === undefined || inside === undefined || after === undefined) return undefined;
    return before + inside * (count === '' ? 1 : Number(count)) + after;
  }
  let total = 0;
  for (const [, symbol, count] of text.matchAll(/([A-Z][a-z]?)(\d*)/g)) {
    const weight = WEIGHTS[symbol ?? ''];
    if (weight === undefined) return undefined;
    total += weight * (count === '' ? 1 : Number(count));
  }
  return total;
}

describe('constants of every substance', () => {
  it('are finite, each with its item, source and a sensible uncertainty', () => {
    const wrong: string[] = [];
    for (const { name, constants } of substances) {
      const items = constants.map(({ item }) => item);
      if (new Set(items).size !== items.length) wrong.push(`${name}: an item twice`);
      for (const { item, value, unit, uncertainty, source } of constants) {
        const where = `${name} ${item}`;
        if (!Number.isFinite(value)) wrong.push(`${where}: ${value}`);
        if (source.trim().length < 5) wrong.push(`${where}: source "${source}"`);
        if (unit.trim() === '') wrong.push(`${where}: no unit`);
        if (uncertainty !== undefined && !(uncertainty >= 0 && Number.isFinite(uncertainty))) {
          wrong.push(`${where}: uncertainty ${uncertainty}`);
        }
        if (!/^[A-Za-z][A-Za-z0-9 ,-]*$/.test(item)) wrong.push(`${where}: not in full words`);
      }
    }
    expect(wrong).toEqual([]);
  });

  it('keep the order of nature: triple and melting below boiling, boiling below critical', () => {
    const wrong: string[] = [];
    for (const { name, constants } of substances) {
      const at = (item: string): number | undefined => constants.find((datum) => datum.item === item)?.value;
      const rising = [at('melting temperature'), at('boiling temperature'), at('critical temperature')].filter(
        (value) => value !== undefined,
      );
      if (rising.some((value, i) => i > 0 && !(value > rising[i - 1]!))) wrong.push(`${name}: ${rising.join(', ')}`);
    }
    expect(wrong).toEqual([]);
  });

  it('molar mass is that of the formula', () => {
    const wrong: string[] = [];
    let counted = 0;
    for (const { name, formula, molarMass } of substances) {
      // A material that is counted in kilograms has no molar mass of its own.
      const mass = molarMass === 1 || formula === '' ? undefined : massOf(formula);
      if (mass === undefined) continue;
      counted++;
      // Weights rounded to five digits, and editions that differ in the fourth.
      if (Math.abs(molarMass * 1000 - mass) > 4e-4 * mass)
        wrong.push(`${name} ${formula}: ${molarMass * 1000}, ${mass}`);
    }
    expect(wrong).toEqual([]);
    expect(counted).toBeGreaterThan(120);
  });
});
