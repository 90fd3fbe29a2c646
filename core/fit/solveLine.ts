import { centredSums, firstHalf, means, residualSums } from './lineSums';

/**
 * The bare least-squares line: everything that a description of the fit is made from, in the units of the data.
 * `slope + slopeRest` and `centreLatent + centreRest` carry the digits that one number cannot hold.
 */
export interface LineSolution {
  readonly count: number;
  /** Mean of the temperatures, where slope and value of the line are uncorrelated. */
  readonly centre: number;
  /** Value of the line at the centre. */
  readonly centreLatent: number;
  readonly centreRest: number;
  readonly slope: number;
  readonly slopeRest: number;
  /** Σ(x − x̄)² */
  readonly spread: number;
  /** Σ(residual)² */
  readonly residualSquares: number;
  readonly lowest: number;
  readonly highest: number;
}

/**
 * Straight line by centred least squares with one step of refinement.
 *
 * b₀ = Σ(x − x̄)(y − ȳ)/Σ(x − x̄)², cut to half of its digits; then the residuals from b₀, taken in twice the working
 * precision, are fitted by the same line, and the correction is kept apart from b₀. What is left is the rounding of the
 * residuals, not of the data.
 *
 * @source T. J. Dekker, Numer. Math. 18 (1971) 224 for exact differences and products
 */
export function solveLine(x: Float64Array, y: Float64Array): LineSolution {
  const { meanX, meanY, lowest, highest } = means(x, y);
  const { spread, product } = centredSums(x, y, meanX, meanY);
  const slope = firstHalf(product / spread);
  const rest = residualSums(x, y, meanX, meanY, slope);
  const slopeRest = rest.product / spread;
  const centreRest = rest.sum / x.length;
  const squares = rest.squares - slopeRest * rest.product - centreRest * rest.sum;
  return {
    count: x.length,
    centre: meanX,
    centreLatent: meanY,
    centreRest,
    slope,
    slopeRest,
    spread,
    residualSquares: Math.max(0, squares),
    lowest,
    highest,
  };
}
