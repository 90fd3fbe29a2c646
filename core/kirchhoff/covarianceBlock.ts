import { Problem } from '../problem';

/** Entries that differ by no more than this share of their standard uncertainties are taken as equal. */
const SAME = 1e-9;

/**
 * Checks that a block of numbers can be a covariance: square, symmetric, no direction with a negative variance.
 *
 * @param block rows of finite numbers
 * @param size rows and columns it must have
 * @param argument name for the message
 * @throws Problem of code `argument` saying which of these fails
 */
export function checkCovariance(block: readonly (readonly number[])[], size: number, argument: string): void {
  const refuse = (received: string): Problem =>
    new Problem({
      code: 'argument',
      argument,
      allowed: `a symmetric covariance block of ${size} rows and ${size} columns without negative variances`,
      received,
    });
  if (block.length !== size || block.some((row) => row.length !== size)) {
    throw refuse(`${block.length} rows and ${block[0]?.length ?? 0} columns`);
  }
  if (block.some((row) => !row.every(Number.isFinite))) throw refuse('an entry that is not a finite number');
  const at = (i: number, j: number): number => block[i]?.[j] ?? 0;
  const scale = block.map((_, i) => Math.sqrt(Math.max(0, at(i, i))));
  for (let i = 0; i < size; i++) {
    if (at(i, i) < 0) throw refuse(`variance ${at(i, i)} in row ${i + 1}`);
    for (let j = 0; j < i; j++) {
      const together = (scale[i] ?? 0) * (scale[j] ?? 0);
      if (Math.abs(at(i, j) - at(j, i)) > SAME * together) {
        throw refuse(`${at(i, j)} and ${at(j, i)} across the diagonal in rows ${i + 1} and ${j + 1}`);
      }
      if (Math.abs(at(i, j)) > (1 + SAME) * together) {
        throw refuse(`a correlation outside [-1, 1] between ${j + 1} and ${i + 1}`);
      }
    }
  }
  if (!isPositive(at, scale, size)) throw refuse('correlations that contradict each other');
}

/** Cholesky factorization of the correlations, each diagonal raised by the tolerance. */
function isPositive(at: (i: number, j: number) => number, scale: readonly number[], size: number): boolean {
  const factor: number[][] = [];
  for (let i = 0; i < size; i++) {
    const row: number[] = [];
    for (let j = 0; j <= i; j++) {
      const together = (scale[i] ?? 0) * (scale[j] ?? 0);
      let rest = i === j ? 1 + SAME : together === 0 ? 0 : at(i, j) / together;
      for (let k = 0; k < j; k++) rest -= (row[k] ?? 0) * ((i === j ? row : factor[j])?.[k] ?? 0);
      if (i === j && rest <= 0) return false;
      row.push(i === j ? Math.sqrt(rest) : rest / (factor[j]?.[j] ?? 1));
    }
    factor.push(row);
  }
  return true;
}
