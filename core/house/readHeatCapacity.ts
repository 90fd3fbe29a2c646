import { CHOI_OKOS, choiOkos, COMPOSITION_FROM_K, COMPOSITION_TO_K, CONSTITUENTS, FROM_MEMORY } from './choiOkos';
import type { HeatCapacityData } from './materialData';
import { readComposition, type Composition } from './readComposition';
import type { FormWord } from './readForm';
import { readPolynomial } from './readPolynomial';
import { readTable } from './readTable';
import type { RowReader } from './rowReader';
import type { AreaShape } from './shape';

export const CAPACITY_FORMS: readonly FormWord[] = ['constant', 'polynomial', 'table'];

/** A heat capacity of a phase. */
export function readHeatCapacity(reader: RowReader): HeatCapacityData {
  const { word, temperature } = reader.form(CAPACITY_FORMS);
  const scale = reader.perAmount('heatCapacity');
  const read = word === 'table' ? readTable(reader, scale, temperature) : readPolynomial(reader, scale, temperature);
  const piece = reader.bounded(read, reader.limits());
  reader.checkEnds(piece, (cp) => cp > 0, 'a heat capacity above 0 over its range');
  return piece;
}

/** A heat capacity from the composition; without a range of its own it holds where the equations do. */
export function readComposedCapacity(reader: RowReader): HeatCapacityData & { readonly fractions: Composition } {
  reader.form(['mass fractions']);
  const fractions = reader.cell('coefficients', () =>
    readComposition(reader.text('coefficients'), reader.beside.decimal),
  );
  const molarMass = reader.beside.molarMass();
  const remembered = CONSTITUENTS.filter((name) => FROM_MEMORY.includes(name) && (fractions[name] ?? 0) > 0);
  const text = `constants of ${remembered.join(', ')} are from memory, wholly or in one term`;
  const natural = { fromK: COMPOSITION_FROM_K, toK: COMPOSITION_TO_K };
  const { fromK = natural.fromK, toK = natural.toK } = reader.limits();
  const piece = reader.bounded(
    {
      shape: scaled(choiOkos(fractions), Number.isNaN(molarMass) ? 1 : molarMass),
      natural,
      method: 'sum over the mass fractions of the constituents (Choi and Okos 1986)',
      marks: remembered.length === 0 ? [] : [{ code: 'unconfirmed', text }],
    },
    { fromK, toK },
  );
  return { ...piece, sources: [...piece.sources, CHOI_OKOS], fractions };
}

function scaled(shape: AreaShape, by: number): AreaShape {
  return {
    at: (t) => by * shape.at(t),
    slope: (t) => by * shape.slope(t),
    area: (from, to) => by * shape.area(from, to),
  };
}
