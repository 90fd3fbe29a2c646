import { fluid } from '../../fluid/fluid';
import { fluidNames, unpackFluid } from '../../fluid/unpackFluid';
import type { CatalogueEntry, Substance } from '../../substance';
import { fluidSources, packedFluids } from './fluids.generated';

/** Process fluids, with numbers fitted to cited values by `core/catalogue/generate`. */
export const fluidEntries: readonly CatalogueEntry[] = packedFluids.map(entryOf);

function entryOf(packed: string): CatalogueEntry {
  let made: Substance | undefined;
  return {
    ...fluidNames(packed),
    group: 'fluid',
    make: () => (made ??= fluid(unpackFluid(packed, fluidSources))),
  };
}
