import { Problem } from '../problem';
import type { LeftOut } from './leftOut';

/** Numbers ready for a fit, and what was left behind. */
export interface Rows {
  readonly temperatures: Float64Array;
  readonly latents: Float64Array;
  readonly leftOut: readonly LeftOut[];
  /** Row number, as given, of each number kept. */
  rowOf(index: number): number;
}

/**
 * Sorts the rows of two columns into numbers to fit and rows to leave out.
 *
 * A row with a blank (null, undefined or empty text) in either column is left out with its reason; a row with anything
 * else that is not a finite number is an error, because dropping it in silence would change the answer.
 *
 * @param temperatures one cell a row, without the header
 * @param latents as many cells
 * @param firstRow number of the first row in messages: 2 where a header row stands above the data
 * @returns the numbers in their order, and the rows left out
 * @throws Problem of code `argument` for unequal lengths, and for text, a truth value or an error, naming its row
 * @example
 * import { readRows } from 'latentry';
 * readRows([10, null, 30], [2477.3, null, 2429.8]).leftOut[0].row // => 2
 */
export function readRows(temperatures: readonly unknown[], latents: readonly unknown[], firstRow = 1): Rows {
  const given = temperatures.length;
  if (latents.length !== given) throw unequalLengths(given, latents.length);
  const keptTemperatures = new Float64Array(given);
  const keptLatents = new Float64Array(given);
  const leftOut: LeftOut[] = [];
  const skipped: number[] = [];
  let kept = 0;
  for (let i = 0; i < given; i++) {
    const temperature = temperatures[i];
    const latent = latents[i];
    if (Number.isFinite(temperature) && Number.isFinite(latent)) {
      keptTemperatures[kept] = temperature as number;
      keptLatents[kept] = latent as number;
      kept += 1;
      continue;
    }
    leftOut.push({ row: firstRow + i, reason: reasonToLeaveOut(temperature, latent, firstRow + i) });
    skipped.push(kept);
  }
  return {
    temperatures: keptTemperatures.subarray(0, kept),
    latents: keptLatents.subarray(0, kept),
    leftOut,
    rowOf: (index) => firstRow + index + countUpTo(skipped, index),
  };
}

export function unequalLengths(temperatures: number, latents: number): Problem {
  return new Problem({
    code: 'argument',
    argument: 'latents',
    allowed: `as many rows as temperatures (${temperatures})`,
    received: `${latents} rows`,
  });
}

function reasonToLeaveOut(temperature: unknown, latent: unknown, row: number): string {
  refuseUnlessNumberOrBlank('temperatures', temperature, row);
  refuseUnlessNumberOrBlank('latents', latent, row);
  if (!isBlank(temperature)) return 'no latent heat';
  return isBlank(latent) ? 'blank' : 'no temperature';
}

function refuseUnlessNumberOrBlank(argument: string, cell: unknown, row: number): void {
  if (isBlank(cell) || Number.isFinite(cell)) return;
  const shown = typeof cell === 'string' ? JSON.stringify(cell) : plainCell(cell);
  throw new Problem({
    code: 'argument',
    argument,
    allowed: 'finite numbers; rows with a blank are left out',
    received: `${shown} in row ${row}`,
  });
}

function plainCell(cell: unknown): string {
  return typeof cell === 'number' || typeof cell === 'boolean' ? String(cell) : 'no number';
}

function isBlank(cell: unknown): boolean {
  return cell === null || cell === undefined || (typeof cell === 'string' && cell.trim() === '');
}

/** How many entries of a sorted list are at most `limit`. */
function countUpTo(sorted: readonly number[], limit: number): number {
  let low = 0;
  let high = sorted.length;
  while (low < high) {
    const middle = (low + high) >> 1;
    if ((sorted[middle] as number) <= limit) low = middle + 1;
    else high = middle;
  }
  return low;
}
