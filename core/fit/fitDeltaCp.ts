import { Problem } from '../problem';
import { bendOf } from './bendOf';
import { describeLine } from './describeLine';
import type { LineFit } from './fitTypes';
import type { LeftOut } from './leftOut';
import { unequalLengths } from './readRows';
import { rowsOfLine } from './rowsOfLine';
import { solveLine } from './solveLine';

export interface FitOptions {
  /** Temperature at which the latent heat is given; the mean temperature when absent. */
  readonly reference?: number | undefined;
  /** Probability of the intervals, in (0, 1); 0.95 when absent. */
  readonly coverage?: number | undefined;
  /** Rows that `readRows` left out, carried along in the result. */
  readonly leftOut?: readonly LeftOut[] | undefined;
}

/**
 * Heat-capacity difference from latent heats at several temperatures: the slope of their least-squares line.
 *
 * ΔH(T) = ΔH(T₀) + ΔCp (T − T₀); standard errors from the scatter with n − 2 degrees of freedom, intervals by Student t.
 * The slope is of the kind that the latent heats are: a line through saturation data gives the slope along saturation,
 * which is not the difference of two heat capacities.
 *
 * @param temperatures finite numbers in one unit, at least two different ones; any order
 * @param latents as many finite numbers in one unit
 * @param options reference temperature, coverage, rows left out before
 * @returns the fit in the units of the data. Two rows give the exact line without uncertainties (no degree of freedom)
 * @throws Problem of code `argument` for fewer than two rows, unequal lengths, equal temperatures, values that are not
 * finite or too large or small to square, a coverage outside (0, 1)
 * @source JCGM 100:2008 (GUM), H.3; N. Draper, H. Smith, Applied Regression Analysis, 3rd ed. (1998), chapter 1
 * @example
 * import { fitDeltaCp } from 'latentry';
 * fitDeltaCp([0, 10, 20, 30, 40], [2500.8, 2477.3, 2453.76, 2429.82, 2405.12]).slope // => -2.3884
 */
export function fitDeltaCp(
  temperatures: ArrayLike<number>,
  latents: ArrayLike<number>,
  options: FitOptions = {},
): LineFit {
  const { coverage = 0.95, leftOut = [] } = options;
  if (!(coverage > 0 && coverage < 1)) throw refused('coverage', 'a probability inside (0, 1)', String(coverage));
  if (temperatures.length !== latents.length) throw unequalLengths(temperatures.length, latents.length);
  if (temperatures.length < 2) {
    const received = `${temperatures.length} after leaving out ${leftOut.length}`;
    throw refused('temperatures', 'at least 2 rows with a temperature and a latent heat', received);
  }
  const x = dense(temperatures);
  const y = dense(latents);
  const solution = solveLine(x, y);
  if (solution.lowest === solution.highest && Number.isFinite(solution.lowest)) {
    throw refused('temperatures', 'at least 2 different temperatures', `${solution.lowest} in all ${x.length} rows`);
  }
  if (!Number.isFinite(solution.spread + solution.residualSquares + solution.slope) || solution.spread === 0) {
    refuseInfinite('temperatures', x);
    refuseInfinite('latents', y);
    throw refused('temperatures', 'numbers whose squares can be held', 'numbers too large or too close together');
  }
  const reference = options.reference ?? solution.centre;
  if (!Number.isFinite(reference)) throw refused('reference', 'a finite temperature', String(reference));
  return describeLine(solution, {
    reference,
    coverage,
    leftOut,
    curvature: () => bendOf(x, y, solution),
    diagnostics: () => rowsOfLine(x, y, solution),
  });
}

/** One memory layout for the loops, whatever came in. */
function dense(values: ArrayLike<number>): Float64Array {
  return values instanceof Float64Array ? values : new Float64Array(values);
}

function refuseInfinite(argument: string, values: Float64Array): void {
  const index = values.findIndex((value) => !Number.isFinite(value));
  if (index >= 0) throw refused(argument, 'finite numbers', `no finite number in row ${index + 1}`);
}

function refused(argument: string, allowed: string, received: string): Problem {
  return new Problem({ code: 'argument', argument, allowed, received });
}
