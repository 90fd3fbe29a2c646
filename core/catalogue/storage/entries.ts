import type { CatalogueEntry, Substance } from '../../substance';
import { storageMaterials, type StorageRecord } from './materials';
import { storageMaterial } from './storageMaterial';

/** Heat-storage materials: melting temperature and heat of fusion, with heat capacities where published. */
export const storageEntries: readonly CatalogueEntry[] = storageMaterials.map(entryOf);

function entryOf(record: StorageRecord): CatalogueEntry {
  const { name, formula, cas, synonyms } = record;
  let made: Substance | undefined;
  return {
    name,
    formula,
    cas,
    synonyms: synonyms?.split(';') ?? [],
    group: 'storage material',
    make: () => (made ??= storageMaterial(record)),
  };
}
