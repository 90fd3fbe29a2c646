import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { condensedEntries } from '../../../../core/catalogue/condensed/entries';
import { elements } from '../../../../core/catalogue/condensed/elements';
import { halides } from '../../../../core/catalogue/condensed/halides';
import { oxides } from '../../../../core/catalogue/condensed/oxides';
import { salts } from '../../../../core/catalogue/condensed/salts';
import { findChange } from '../../../../core/catalogue/find';
import { nasa9Gibbs } from '../../../../core/nasa9/nasa9Gibbs';
import { formsOf } from '../../../../core/nasa9/substance/forms';
import { plainWords, Problem } from '../../../../core/problem';
import type { Substance } from '../../../../core/substance';
import { expectWithin } from '../../water/reference';

interface Transition {
  readonly substance: string;
  /** null where both sides are one form. */
  readonly change: string | null;
  readonly T: number;
  readonly dH?: number;
  readonly dS?: number;
  readonly dCp?: number;
  readonly dG?: number;
  readonly secondOrder?: boolean;
  readonly published?: readonly { value: number; status: string; source: string }[];
  readonly largestRelativeDifference?: number;
}

const file = new URL('../../../reference/nasa9-transitions.json', import.meta.url);
const { transitions } = JSON.parse(readFileSync(file, 'utf8')) as { transitions: Transition[] };
const records = [...elements, ...halides, ...salts, ...oxides];

function substanceOf(name: string): Substance {
  const entry = condensedEntries.find((one) => one.name === name);
  if (entry === undefined) throw new Error(`no entry ${name}`);
  return entry.make();
}

function problemOf(run: () => unknown): string {
  try {
    run();
  } catch (thrown) {
    if (thrown instanceof Problem) return plainWords(thrown.data);
    throw thrown;
  }
  throw new Error('nothing was refused');
}

const first = transitions.filter(({ secondOrder, change }) => secondOrder !== true && change !== null);
const second = transitions.filter(({ secondOrder }) => secondOrder === true);

describe('transitions of the condensed data set', () => {
  it('are all there: 94 of them, 10 without latent heat', () => {
    expect(transitions.length).toBe(94);
    expect(second.length).toBe(10);
  });

  it.each(first.map((one) => [`${one.substance} ${one.change ?? ''} at ${one.T} K`, one] as const))(
    '%s',
    (what, one) => {
      const substance = substanceOf(one.substance);
      const change = one.change ?? '';
      expect(substance.changes).toContain(change);
      expect(substance.transitionTemperature(change)).toBe(one.T);
      const latent = substance.latent(change, 'isobaric');
      const slope = substance.latentSlope(change, 'isobaric');
      if (one.dH !== undefined) {
        // half a unit of the last printed digit
        expectWithin(latent.at(one.T) / 1000, one.dH, 0.5e-4 * (1 + 1e-9), `${what} dH, kJ/mol`);
        expectWithin(
          latent.at(one.T) / one.T,
          one.dS ?? NaN,
          0.5e-4 + Math.abs(one.dG ?? 0) / one.T + 1e-6,
          `${what} dS`,
        );
        expectWithin(slope.at(one.T), one.dCp ?? NaN, 0.5e-3 * (1 + 1e-9), `${what} dCp`);
      }
      const differences = (one.published ?? []).map(({ value }) => Math.abs(latent.at(one.T) / 1000 - value) / value);
      if (one.largestRelativeDifference !== undefined) {
        // printed to four decimals; referred to the published value or to the smaller of the two
        expectWithin(Math.max(...differences), one.largestRelativeDifference, 6e-4, `${what} against published values`);
        const sigma = latent.uncertaintyAt?.(one.T) ?? 0;
        for (const { value } of one.published ?? []) {
          expect(
            Math.abs(latent.at(one.T) - 1000 * value),
            `${what}: published ${value} within its uncertainty`,
          ).toBeLessThanOrEqual(sigma);
        }
      }
      expect(substance.latent(change, 'standard').at(one.T)).toBe(latent.at(one.T));
    },
  );

  it('have equal Gibbs energies on both sides', () => {
    let checked = 0;
    for (const record of records) {
      const forms = formsOf(record);
      forms.slice(1).forEach((warm, i) => {
        const cold = forms[i];
        if (cold === undefined) return;
        const gap = nasa9Gibbs(warm.species, warm.fromK) - nasa9Gibbs(cold.species, cold.toK);
        // rounding of the coefficients: at most 0.1 J/mol, of G up to 1e6 J/mol
        expectWithin(gap, 0, 0.1, `${record.name} ${cold.changeAbove ?? ''} dG`);
        checked++;
      });
    }
    expect(checked).toBe(first.length + second.filter(({ change }) => change !== null).length);
  });

  it('without latent heat are lambda points, and refused as such', () => {
    for (const { substance: name, change, T } of second) {
      const substance = substanceOf(name);
      if (name === 'potassium hydroxide') {
        // 298.15 K: one entry of the data set ends, nothing happens
        expect(substance.lambdaPoints).toBeUndefined();
        continue;
      }
      const point = substance.lambdaPoints?.find(({ temperatureK }) => temperatureK === T);
      expect(point, `${name} at ${T} K`).toBeDefined();
      if (change !== null) expect(point?.name).toBe(change);
      expect(substance.changes).not.toContain(point?.name);
      expect(problemOf(() => findChange(substance, point?.name ?? ''))).toMatch(/second-order.*no latent heat/);
      expect(problemOf(() => substance.latent(point?.name ?? '', 'isobaric'))).toContain(name);
    }
  });

  it('where the data set and handbooks differ much, a note says so', () => {
    for (const name of ['tungsten', 'lithium carbonate', 'potassium carbonate', 'sodium carbonate']) {
      expect(substanceOf(name).notes.join(' '), name).toMatch(/Published values differ much: fusion/);
    }
    for (const name of ['lithium carbonate', 'potassium carbonate', 'sodium carbonate'])
      expect(substanceOf(name).notes.join(' ')).toContain('6 to 10 %');
  });

  it('solid-solid changes are found in both directions', () => {
    for (const entry of condensedEntries) {
      const substance = entry.make();
      for (const change of substance.changes) {
        expect(findChange(substance, change)).toEqual({ change, sign: 1 });
        const [cold, warm] = change.split('-');
        if (warm === undefined) continue;
        expect(findChange(substance, `${warm}-${cold ?? ''}`), `${substance.name} ${warm}-${cold ?? ''}`).toEqual({
          change,
          sign: -1,
        });
      }
    }
  });
});
