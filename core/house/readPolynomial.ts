import type { Unit } from '../units/unit';
import { polynomialShape } from './polynomialShape';
import type { Read, RowReader } from './rowReader';
import type { AreaShape } from './shape';

/** Bounds for a constant that says none, K: within them it is no wonder. */
const ANYWHERE = { fromK: 1, toK: 3000 };

const MOST_COEFFICIENTS = 12;

/** A constant, or c0; c1; c2; … in powers of T/K or of the temperature in the unit that the form says. */
export function readPolynomial(reader: RowReader, scale: number, temperature: Unit | undefined): Read<AreaShape> {
  const numbers = reader.bareNumbers(1, MOST_COEFFICIENTS, `c0; c1; c2; … (at most ${MOST_COEFFICIENTS})`);
  const factor = temperature?.factor ?? 1;
  const coefficients = numbers.map((value, i) => (value * scale) / factor ** i);
  const shape = polynomialShape(coefficients, temperature?.offset ?? 0);
  if (coefficients.length === 1) return { shape, natural: ANYWHERE, method: 'constant' };
  return { shape, natural: undefined, method: `polynomial in ${temperature?.symbol ?? 'K'}` };
}
