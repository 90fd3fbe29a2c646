import { piecewise, type ChebyshevPieces } from './chebyshevPieces';

const PIECES = 48;
const TERMS = 20;

/**
 * A smooth function as Chebyshev pieces through its own values, made at the first use: for functions that are asked
 * for thousands of times and cost microseconds. Outside [from, to] the function itself answers.
 *
 * @param exact the function; finite on [from, to]
 * @param from one end
 * @param to the other
 */
export function sampled(exact: (x: number) => number, from: number, to: number): (x: number) => number {
  let table: ChebyshevPieces | undefined;
  return (x) => {
    if (!(x >= from && x <= to)) return exact(x);
    table ??= sample(exact, from, to);
    return piecewise(table, x);
  };
}

function sample(exact: (x: number) => number, from: number, to: number): ChebyshevPieces {
  const coefficients = new Float64Array(PIECES * TERMS);
  const width = (to - from) / PIECES;
  const values = new Float64Array(TERMS);
  for (let piece = 0; piece < PIECES; piece++) {
    for (let k = 0; k < TERMS; k++) {
      const node = Math.cos((Math.PI * (k + 0.5)) / TERMS);
      values[k] = exact(from + width * (piece + (1 + node) / 2));
    }
    for (let j = 0; j < TERMS; j++) {
      let sum = 0;
      for (let k = 0; k < TERMS; k++) sum += (values[k] as number) * Math.cos((Math.PI * j * (k + 0.5)) / TERMS);
      coefficients[piece * TERMS + j] = ((j === 0 ? 1 : 2) * sum) / TERMS;
    }
  }
  return { from, to, pieces: PIECES, terms: TERMS, coefficients };
}
