import { describe, expect, it } from 'vitest';
import { catalogue } from '../../../core/catalogue/find';
import { plainName } from '../../../core/catalogue/plainName';
import { makeRegistry } from '../../../core/catalogue/registry';
import { Problem } from '../../../core/problem';
import type { CatalogueEntry } from '../../../core/substance';
import { ask } from './tour';

const { entries } = catalogue;
const wordsOf = ({ name, formula, cas, synonyms }: CatalogueEntry): string[] =>
  [name, formula, cas, ...synonyms].filter((word) => word !== '');
const names = new Set(entries.map(({ name }) => plainName(name)));

/** Which entries a word may mean: the one whose name it is, else all that carry it. */
function meantBy(word: string): readonly CatalogueEntry[] {
  const plain = plainName(word);
  const own = entries.filter(({ name }) => plainName(name) === plain);
  return own.length > 0 ? own : entries.filter((entry) => wordsOf(entry).some((w) => plainName(w) === plain));
}

/** A CAS registry number ends with the sum of its other digits, each times its place from the right, modulo 10. */
function casHolds(cas: string): boolean {
  const digits = Array.from(cas.replace(/-/g, ''));
  const sum = digits
    .slice(0, -1)
    .reverse()
    .reduce((s, digit, i) => s + (i + 1) * Number(digit), 0);
  return /^\d{2,7}-\d\d-\d$/.test(cas) && sum % 10 === Number(digits.at(-1));
}

describe('the catalogue by its names', () => {
  it('covers what it promises: 50 fluids besides water, 60 metals, salts and oxides, 20 storage materials', () => {
    const count = (...groups: string[]): number => entries.filter(({ group }) => groups.includes(group)).length;
    expect(count('fluid') - 1).toBeGreaterThanOrEqual(50);
    expect(count('element', 'salt', 'oxide')).toBeGreaterThanOrEqual(60);
    expect(count('storage material')).toBeGreaterThanOrEqual(20);
  });

  it('finds every entry by name, formula, CAS number and synonym, or names the candidates', () => {
    const wrong: string[] = [];
    for (const entry of entries) {
      for (const word of wordsOf(entry)) {
        const meant = meantBy(word);
        const found = ask(() => catalogue.find(word));
        if (meant.length === 1) {
          if (found instanceof Problem || found.name !== meant[0]?.name) wrong.push(`${word}: not ${meant[0]?.name}`);
        } else if (!(found instanceof Problem) || !meant.every(({ name }) => found.message.includes(name))) {
          wrong.push(`${word}: does not name ${meant.map(({ name }) => name).join(', ')}`);
        }
      }
    }
    expect(wrong).toEqual([]);
  });

  it('answers in whatever case, spaces, hyphens or underscores a name is written', () => {
    const wrong = entries
      .flatMap((entry) => wordsOf(entry).filter((word) => meantBy(word).length === 1))
      .filter((word) => {
        // the one formula that its case tells from another's
        const spelt = word === 'Co' ? word : word.toUpperCase().replace(/[ -]/g, '_');
        return catalogue.entry(spelt)?.name !== catalogue.entry(word)?.name;
      });
    expect(wrong).toEqual([]);
  });

  it('takes carbon monoxide for no cobalt', () => {
    expect(catalogue.entry('Co')?.name).toBe('cobalt');
    expect([catalogue.entry('CO'), catalogue.entry('co')]).toEqual([undefined, undefined]);
    expect(catalogue.entry('CO2')?.name).toBe('carbon dioxide');
  });

  it('answers to figures below the line, any dot of crystal water, and dashes of print', () => {
    const found = ['Na₂SO₄', 'Na2SO4·10H2O', 'Na₂SO₄•10H₂O', 'MgCl2∙6H2O', 'R‑717', 'n–hexane'].map(
      (word) => catalogue.entry(word)?.name,
    );
    const hydrate = 'sodium sulfate decahydrate';
    const chloride = 'magnesium chloride hexahydrate';
    expect(found).toEqual(['sodium sulfate', hydrate, hydrate, chloride, 'ammonia', 'n-hexane']);
  });

  it('calls no other substance near that only its letters bring close', () => {
    for (const word of ['helium', 'propylene', 'propylene glycol', 'nitric acid', 'isohexane', 'NO', 'HF']) {
      const problem = ask(() => catalogue.find(word));
      expect(problem instanceof Problem ? Object.keys(problem.data) : [problem.name], word).toEqual([
        'code',
        'argument',
        'allowed',
        'received',
      ]);
    }
  });

  it('a name with one letter left out is refused with that name, or with one as near', () => {
    const wrong: string[] = [];
    for (const { name } of entries) {
      if (name.length < 6) continue;
      const slip = name.slice(0, 3) + name.slice(4);
      if (catalogue.entry(slip) !== undefined || meantBy(slip).length > 0) continue;
      const problem = ask(() => catalogue.find(slip));
      const near = problem instanceof Problem && problem.data.code === 'argument' ? problem.data.nearest : undefined;
      if (near === undefined || !names.has(plainName(near))) wrong.push(`${slip} for ${name}: ${near ?? 'nothing'}`);
    }
    expect(wrong).toEqual([]);
  });

  it('a formula of several substances is refused with their names, until one is named', () => {
    for (const [formula, some] of [
      ['C3H8O', ['1-propanol', '2-propanol']],
      ['C4H10', ['n-butane', 'isobutane']],
      ['C8H10', ['o-xylene', 'p-xylene', 'ethylbenzene']],
      ['C4H8O', ['2-butanone', 'tetrahydrofuran']],
      ['C4H8O2', ['ethyl acetate', '1,4-dioxane']],
      ['C4H10O', ['1-butanol', 'diethyl ether']],
    ] as const) {
      const problem = ask(() => catalogue.find(formula));
      expect(problem, formula).toBeInstanceOf(Problem);
      for (const name of some) expect((problem as Problem).message).toContain(name);
      for (const name of some) expect(catalogue.entry(name)?.name).toBe(name);
    }
  });

  it('names are unlike one another, plain, and in lower case but for what must be a capital', () => {
    expect(names.size).toBe(entries.length);
    for (const { name } of entries) {
      expect(name).toBe(name.trim());
      expect(name, name).toMatch(/^[a-z0-9(]/);
    }
  });

  it('CAS numbers hold their own check digit and belong to one entry each', () => {
    const numbers = entries.map(({ cas }) => cas).filter((cas) => cas !== '');
    expect(numbers.filter((cas) => !casHolds(cas))).toEqual([]);
    expect(numbers.filter((cas, i) => numbers.indexOf(cas) !== i)).toEqual([]);
  });

  it('a substance agrees with its entry, and is made once', () => {
    for (const entry of entries) {
      const made = entry.make();
      expect(made, entry.name).toBe(entry.make());
      expect({ ...made, make: undefined }).toMatchObject({
        name: entry.name,
        formula: entry.formula,
        cas: entry.cas,
        synonyms: entry.synonyms,
        group: entry.group,
      });
    }
  });

  it('is listed and searched without making a single substance', () => {
    const idle = entries.map((entry) => ({
      ...entry,
      make: (): never => {
        throw new Error(`${entry.name} was made`);
      },
    }));
    const registry = makeRegistry(idle);
    expect(registry.entries.map(wordsOf).flat().length).toBeGreaterThan(entries.length);
    for (const { name } of idle) expect(registry.entry(name)?.name).toBe(name);
    expect(ask(() => registry.find('no such substance'))).toBeInstanceOf(Problem);
  });
});
