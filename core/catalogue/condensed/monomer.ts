import type { VapourRecord } from '../../nasa9/substance/record';

/** A vapour that holds dimers, of which the data set has the monomer only: the standard kind is given, to the monomer. */
export function monomer(name: string): VapourRecord {
  const lacking = 'it holds dimers, which the catalogue has no data for; kind=standard is to the monomer';
  return { species: [[name, 1]], highestPa: 1e6, lacking };
}
