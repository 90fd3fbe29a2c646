import { COMPOSITION_SOURCE, PARTS, type CompositionPart } from '../estimate/compositionConstants';
import { COMPOSITION_PARTS, type Composition } from '../estimate/compositionHeatCapacity';
import { shortNumber } from '../problem';
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
  warnOfUnusual(reader, piece);
  return piece;
}

/** J/(kg K): from the heaviest metals to hydrogen, away from absolute zero (common practice, no source). */
const USUAL = [100, 20_000] as const;
const COLD_K = 100;

/** A slip of a thousand in the unit is no heat capacity that any material has. */
function warnOfUnusual(reader: RowReader, { shape, fromK, toK }: HeatCapacityData): void {
  const molarMass = reader.beside.molarMass();
  const kilograms = Number.isNaN(molarMass) ? 1 : molarMass;
  for (const t of [fromK, toK]) {
    const cp = shape.at(t) / kilograms;
    if (t < COLD_K || (cp >= USUAL[0] && cp <= USUAL[1])) continue;
    const usual = `[${USUAL[0] / 1000}, ${USUAL[1] / 1000}] kJ/(kg K)`;
    reader.beside.warn('unit', `${shortNumber(cp / 1000)} kJ/(kg K) at ${shortNumber(t)} K is unusual; usual ${usual}`);
    return;
  }
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
