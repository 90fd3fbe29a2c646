import { Problem } from '../problem';
import type { Given, MaterialData } from './materialData';

/**
 * The data of a piece, where they are there and readable.
 *
 * @throws Problem of the row that can't be read, or `missing` naming the piece
 */
export function need<T>(data: MaterialData, given: Given<T> | undefined, piece: string): T {
  if (given instanceof Problem) throw given;
  if (given === undefined) throw missing(data, piece);
  return given;
}

/** The same without exceptions: `undefined` for what is missing or can't be read. */
export function readable<T>(given: Given<T> | undefined): T | undefined {
  return given instanceof Problem ? undefined : given;
}

/** A piece that the material lacks. */
export function missing(data: MaterialData, piece: string): Problem {
  return new Problem({ code: 'missing', subject: `${piece} of ${data.name}`, reason: data.lack(piece) });
}
