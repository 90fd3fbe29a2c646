import { describe, expect, it } from 'vitest';
import { catalogue } from '../../../../core/catalogue/find';
import type { CatalogueEntry } from '../../../../core/substance';
import { nearestEntry } from '../../../../taskpane/pane/substances/search/nearestEntry';
import { resultWords } from '../../../../taskpane/pane/substances/search/resultWords';
import { searchEntries } from '../../../../taskpane/pane/substances/search/searchEntries';

const entry = (name: string, formula: string, cas: string, synonyms: readonly string[] = []): CatalogueEntry => ({
  name,
  formula,
  cas,
  synonyms,
  group: 'fluid',
  make: () => {
    throw new Error(`${name} was built by a search`);
  },
});

const ENTRIES = [
  entry('ethanol', 'C2H6O', '64-17-5', ['ethyl alcohol', 'spirit']),
  entry('methanol', 'CH4O', '67-56-1', ['methyl alcohol']),
  entry('ethane', 'C2H6', '74-84-0'),
  entry('sodium nitrate', 'NaNO3', '7631-99-4', ['Chile saltpetre']),
];
const names = (text: string) => searchEntries(ENTRIES, text).map(({ entry: { name } }) => name);

describe('searchEntries', () => {
  it('lists everything for a blank text, in the order given', () => {
    expect(names('  ')).toEqual(['ethanol', 'methanol', 'ethane', 'sodium nitrate']);
  });

  it('puts a whole name before a beginning, and a beginning before an inside', () => {
    expect(names('ethan')).toEqual(['ethanol', 'ethane', 'methanol']);
    expect(names('ETHANE')).toEqual(['ethane']);
    expect(names('nitrate')).toEqual(['sodium nitrate']);
  });

  it('puts names before synonyms that begin alike, and those before words inside', () => {
    const found = searchEntries(catalogue.entries, 'ethan').map(({ entry: { name } }) => name);
    // Acetic acid is also called ethanoic acid; methanol only holds the letters.
    const places = ['ethanol', 'acetic acid', 'methanol'].map((name) => found.indexOf(name));
    expect(places[0]).toBe(0);
    expect(places).toEqual(places.toSorted((a, b) => a - b));
    expect(new Set(places).size).toBe(3);
  });

  it.each([
    ['C2H6', ['ethane', 'ethanol'], 'formula C2H6'],
    ['67-56', ['methanol'], 'CAS 67-56-1'],
    ['methyl', ['methanol'], 'methyl alcohol'],
    ['saltpetre', ['sodium nitrate'], 'Chile saltpetre'],
  ])('finds %j and says by which word', (text, found, by) => {
    expect(names(text)).toEqual(found);
    expect(searchEntries(ENTRIES, text)[0]?.by).toBe(by);
  });

  it('says no other word where the name itself was hit', () => {
    expect(searchEntries(ENTRIES, 'methanol')[0]?.by).toBeUndefined();
  });

  it('finds every substance of the catalogue by its name first, among all the others', () => {
    for (const { name } of catalogue.entries) {
      expect(searchEntries(catalogue.entries, name)[0]?.entry.name).toBe(name);
    }
  });
});

describe('nearestEntry', () => {
  it('knows what a slip of the pen meant, and is silent about a word that is like none', () => {
    expect(nearestEntry(ENTRIES, 'ehtanol')?.name).toBe('ethanol');
    expect(nearestEntry(ENTRIES, 'metyl alcohol')?.name).toBe('methanol');
    expect(nearestEntry(ENTRIES, 'quartz')).toBeUndefined();
  });
});

describe('resultWords', () => {
  it('counts, names the first, and says what was meant', () => {
    expect(resultWords('', searchEntries(ENTRIES, ''), undefined)).toBe('4 substances.');
    expect(resultWords('ethan', searchEntries(ENTRIES, 'ethan'), undefined)).toBe('3 matches, first ethanol.');
    expect(resultWords('nitrate', searchEntries(ENTRIES, 'nitrate'), undefined)).toBe('One match: sodium nitrate.');
    expect(resultWords('ehtanol', [], 'ethanol')).toBe('Nothing is called “ehtanol” here. Nearest: ethanol.');
    expect(resultWords('quartz', [], undefined)).toBe('Nothing is called “quartz” here, nor nearly so.');
  });
});
