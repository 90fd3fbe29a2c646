import { COMPOSITION_SOURCE, PARTS, type CompositionPart } from '../estimate/compositionConstants';
import { COMPOSITION_PARTS, type Composition } from '../estimate/compositionHeatCapacity';
import { composedCapacity } from './composedCapacity';
import type { HeatCapacityData } from './materialData';
import { readComposition } from './readComposition';
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
  const kilograms = Number.isNaN(molarMass) ? 1 : molarMass;
  const composed = composedCapacity(fractions);
  const remembered = COMPOSITION_PARTS.filter((part) => (fractions[part] ?? 0) > 0 && isRemembered(part));
  const text = `coefficients of ${remembered.join(' and ')} are from memory`;
  const { fromK = composed.fromK, toK = composed.toK } = reader.limits();
  const piece = reader.bounded(
    {
      shape: scaled(composed.shape, kilograms),
      natural: composed,
      method: 'sum over the mass fractions of the constituents (Choi & Okos)',
      marks: remembered.length === 0 ? [] : [{ code: 'unconfirmed', text }],
    },
    { fromK, toK },
  );
  return {
    ...piece,
    sources: [...piece.sources, COMPOSITION_SOURCE],
    uncertaintyAt: (t) => kilograms * composed.uncertaintyAt(t),
    fractions,
  };
}

function isRemembered(part: CompositionPart): boolean {
  return part !== 'water' && PARTS[part].status.startsWith('from memory');
}

function scaled(shape: AreaShape, by: number): AreaShape {
  return {
    at: (t) => by * shape.at(t),
    slope: (t) => by * shape.slope(t),
    area: (from, to) => by * shape.area(from, to),
  };
}
