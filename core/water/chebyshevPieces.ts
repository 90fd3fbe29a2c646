/** A function as Chebyshev series on pieces, laid out one after another. */
export interface ChebyshevPieces {
  /** Even pieces: the interval that they share out. Pieces towards an end: the first and last piece, as numbered below. */
  readonly from: number;
  readonly to: number;
  readonly pieces: number;
  /** Coefficients a piece. */
  readonly terms: number;
  readonly coefficients: Float64Array;
}

/** What the generator writes: whole numbers, each a count of `step`. */
export interface ChebyshevData {
  readonly from: number;
  readonly to: number;
  readonly terms: number;
  readonly step: number;
  readonly counts: readonly number[];
}

export function readPieces({ from, to, terms, step, counts }: ChebyshevData): ChebyshevPieces {
  return {
    from,
    to,
    pieces: counts.length / terms,
    terms,
    coefficients: Float64Array.from(counts, (count) => count * step),
  };
}

/** Clenshaw's recurrence for `terms` coefficients from `offset`; `x` in [-1, 1]. */
export function clenshaw(coefficients: Float64Array, offset: number, terms: number, x: number): number {
  const twice = 2 * x;
  let later = 0;
  let now = 0;
  for (let i = offset + terms - 1; i > offset; i--) {
    const next = twice * now + ((coefficients[i] as number) - later);
    later = now;
    now = next;
  }
  return x * now + ((coefficients[offset] as number) - later);
}

/** Value at `x` in [from, to]: the piece is found by one division. */
export function piecewise(table: ChebyshevPieces, x: number): number {
  const place = ((x - table.from) / (table.to - table.from)) * table.pieces;
  let piece = place | 0;
  if (piece >= table.pieces) piece = table.pieces - 1;
  return clenshaw(table.coefficients, piece * table.terms, table.terms, 2 * (place - piece) - 1);
}

/** Pieces towards a singular end are two to each doubling of the distance from it; piece 0 begins here. */
export const SMALLEST_DISTANCE = 2 ** -10;

/** Bounds of one of those pieces, in the distance. */
export function pieceTowardsEnd(piece: number): readonly [from: number, to: number] {
  const width = SMALLEST_DISTANCE * 2 ** ((piece >> 1) - 1);
  const from = (2 + (piece & 1)) * width;
  return [from, from + width];
}

/** Value at a distance from the singular end: the piece is found from the leading bits of the distance. */
export function piecewiseTowardsEnd(table: ChebyshevPieces, distance: number): number {
  const bits = (distance * 2048) | 0;
  const octave = 30 - Math.clz32(bits);
  const half = (bits >> octave) & 1;
  const width = (1 << octave) / 2048;
  const offset = (2 * octave + half - table.from) * table.terms;
  return clenshaw(table.coefficients, offset, table.terms, (2 * distance) / width - (5 + 2 * half));
}
