import { plainName } from '../catalogue/plainName';
import { makeRegistry, type Registry } from '../catalogue/registry';
import type { CatalogueEntry } from '../substance';
import type { House } from './house';

/** Built-in substances and those of the house as one registry; built-in ones that a row replaces are left out. */
export function houseRegistry(builtIn: readonly CatalogueEntry[], house: House): Registry {
  const replaced = new Set(house.replacing.map(({ name }) => plainName(name)));
  const kept = builtIn.filter(({ name }) => !replaced.has(plainName(name)));
  return makeRegistry([...kept, ...house.entries], house.replacing);
}
