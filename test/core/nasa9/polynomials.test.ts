import { execFileSync } from 'node:child_process';
import { readFileSync } from 'node:fs';
import path from 'node:path';
import { describe, expect, it } from 'vitest';
import { intervalAt } from '../../../core/nasa9/intervalAt';
import { nasa9Cp } from '../../../core/nasa9/nasa9Cp';
import { nasa9Enthalpy } from '../../../core/nasa9/nasa9Enthalpy';
import { nasa9Entropy } from '../../../core/nasa9/nasa9Entropy';
import { nasa9Gibbs } from '../../../core/nasa9/nasa9Gibbs';
import { nasa9Species } from '../../../core/nasa9/nasa9Species';
import { emptyNasa9State, nasa9State } from '../../../core/nasa9/nasa9State';
import { packedSpecies } from '../../../core/nasa9/species.generated';
import { Problem } from '../../../core/problem';
import { expectWithin } from '../water/reference';

const root = path.resolve(import.meta.dirname, '../../..');
const read = (file: string): unknown => JSON.parse(readFileSync(path.join(root, file), 'utf8'));

interface Transcribed {
  readonly name: string;
  readonly phase: string;
  readonly gramsPerMole: number;
  readonly formation: number;
  readonly reportFromK?: number;
  readonly intervals: readonly (readonly number[])[];
}
const transcribed = (read('core/nasa9/generate/species.json') as { species: Transcribed[] }).species;
const all = Object.keys(packedSpecies).map(nasa9Species);

describe('packed data', () => {
  it('are what the script writes from the transcribed data set', () => {
    const script = path.join(root, 'core/nasa9/generate/generateNasa9.mjs');
    expect(() => execFileSync(process.execPath, [script, '--check'], { stdio: 'pipe' })).not.toThrow();
  });

  it('hold every transcribed number as the same double', () => {
    for (const { name, gramsPerMole, intervals, reportFromK } of transcribed) {
      const species = nasa9Species(name === 'KOH(a)' ? 'KOH(b)' : name);
      expect(species.molarMass, name).toBe(gramsPerMole / 1000);
      intervals.forEach(([from = NaN, to = NaN, ...rest], i) => {
        const kept = species.intervals.find((one) => one.toK === to);
        expect(kept, `${name} to ${to}`).toBeDefined();
        expect([...(kept?.a ?? []), kept?.b1, kept?.b2], name).toEqual(rest);
        expect(kept?.fromK, name).toBe(i === 0 ? (reportFromK ?? from) : from);
      });
    }
  });

  it('refuse a species that is not there', () => {
    for (const name of ['Xe', '', 'constructor']) expect(() => nasa9Species(name), name).toThrow(Problem);
  });
});

describe('nine-coefficient polynomials', () => {
  it('give the enthalpy of formation that the data set prints, at 298.15 K', () => {
    let checked = 0;
    for (const { name, phase, formation, intervals } of transcribed) {
      const species = nasa9Species(name === 'KOH(a)' ? 'KOH(b)' : name);
      // a form that is not the one at 298.15 K prints the formation enthalpy of that one
      if (!(species.fromK <= 298.15 && species.toK >= 298.15) || (phase !== 'gas' && (intervals[0]?.[0] ?? 0) > 300))
        continue;
      // the coefficients have ten digits of terms of the size of |H| and R·T·1000
      expectWithin(nasa9Enthalpy(species, 298.15), formation, name === 'Hg(L)' ? 0.6 : 0.05, name);
      checked++;
    }
    expect(checked).toBeGreaterThan(110);
  });

  it('give the entropies of the CODATA Key Values at 298.15 K', () => {
    const { entropies } = read('test/reference/nasa9-values.json') as {
      entropies: { species: string; value: number; within: number }[];
    };
    // the key values' own uncertainty, and half a unit of the third decimal of entropies at 1 bar
    for (const { species, value, within } of entropies) {
      expectWithin(nasa9Entropy(nasa9Species(species), 298.15), value, 2 * within + 0.005, species);
    }
  });

  it.each(all.map((species) => [species.name, species] as const))(
    '%s: cp is the slope of H, cp/T that of S',
    (_, species) => {
      const temperatures = [
        0.5 * species.fromK,
        0.9 * species.fromK,
        ...species.intervals.flatMap(({ fromK, toK }) => [fromK + 0.2 * (toK - fromK), fromK + 0.7 * (toK - fromK)]),
        1.1 * species.toK,
      ];
      for (const t of temperatures) {
        const h = 1e-4 * t;
        const cp = nasa9Cp(species, t);
        const byEnthalpy = (nasa9Enthalpy(species, t + h) - nasa9Enthalpy(species, t - h)) / (2 * h);
        const byEntropy = (t * (nasa9Entropy(species, t + h) - nasa9Entropy(species, t - h))) / (2 * h);
        // h²·cp''/6, and the rounding of H and S over 2h; the transcribed terms cancel to about 1e-13 of 1e8 J/mol
        expectWithin(byEnthalpy, cp, 2e-6 * cp + 5e-4, `${species.name} dH/dT at ${t} K`);
        expectWithin(byEntropy, cp, 2e-6 * cp + 5e-4, `${species.name} T·dS/dT at ${t} K`);
        const state = emptyNasa9State();
        nasa9State(species, t, state);
        expect(state).toEqual({ heatCapacity: cp, enthalpy: nasa9Enthalpy(species, t), gibbs: nasa9Gibbs(species, t) });
        const difference = nasa9Enthalpy(species, t) - t * nasa9Entropy(species, t);
        expectWithin(nasa9Gibbs(species, t), difference, 1e-12 * Math.abs(difference) + 1e-9, `${species.name} G`);
      }
    },
  );

  it('join: H, S go on across the ends of intervals and into the extensions', () => {
    for (const species of all) {
      for (const { toK } of species.intervals.slice(0, -1)) {
        const jump = nasa9Enthalpy(species, toK + 1e-9) - nasa9Enthalpy(species, toK);
        // at a second-order point the data set's own rounding leaves up to 1 J/mol (chromium), 0.003 in liquid sulfur
        expectWithin(jump, 0, 1.1, `${species.name} H at ${toK} K`);
      }
      for (const end of [species.fromK, species.toK]) {
        const e = 1e-12 * end;
        for (const f of [nasa9Cp, nasa9Enthalpy, nasa9Entropy]) {
          const scale = Math.abs(f(species, end)) + 1000;
          expectWithin(f(species, end + e), f(species, end - e), 1e-8 * scale, `${species.name} ${f.name} at ${end} K`);
        }
      }
    }
  });

  it('stay bounded outside their range: cp between its floor and its value at the end', () => {
    for (const species of all) {
      const atLow = nasa9Cp(species, species.fromK);
      for (const part of [1e-3, 0.05, 0.3, 0.6, 0.95]) {
        const cp = nasa9Cp(species, part * species.fromK);
        expect(cp, `${species.name} at ${part} of its lower limit`).toBeGreaterThanOrEqual(0);
        expect(cp, species.name).toBeLessThanOrEqual(atLow * (1 + 1e-12));
        expect(Number.isFinite(nasa9Enthalpy(species, part * species.fromK)), species.name).toBe(true);
        expect(Number.isFinite(nasa9Gibbs(species, part * species.fromK)), species.name).toBe(true);
      }
      expect(nasa9Cp(species, 2 * species.toK), species.name).toBe(nasa9Cp(species, species.toK));
    }
  });

  it('crystals lose their heat capacity towards 0 K, gases keep that of translation and rotation', () => {
    // quartz and corundum: far below their 200 K, from 0 to 1 % of the value at the end
    for (const name of ['AL2O3(a)', 'MgO(cr)', 'C(gr)']) expect(nasa9Cp(nasa9Species(name), 10)).toBeLessThan(0.01);
    expectWithin(nasa9Cp(nasa9Species('CO2'), 10), 3.5 * 8.31451, 1e-6, 'carbon dioxide, a linear molecule');
    expectWithin(nasa9Cp(nasa9Species('C2H5OH'), 3), 4 * 8.31451, 1e-6, 'ethanol, a bent molecule');
  });

  it('an interval ends where the next one begins', () => {
    const iron = nasa9Species('Fe(a)');
    expect(intervalAt(iron, 500).toK).toBe(500);
    expect(intervalAt(iron, 500.1).fromK).toBe(500);
    expect(intervalAt(iron, 5000).toK).toBe(1184);
    expect(intervalAt(iron, 1).fromK).toBe(200);
  });

  it('say where the release of 2021 reset the lower limit', () => {
    expect([nasa9Species('C3H8').fromK, nasa9Species('C3H8').releaseFromK]).toEqual([200, 300]);
    expect([nasa9Species('N2').fromK, nasa9Species('N2').releaseFromK]).toEqual([200, 200]);
  });
});
