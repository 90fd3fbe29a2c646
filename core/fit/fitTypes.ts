import type { LeftOut } from './leftOut';
import type { LineSolution } from './solveLine';

/** An interval that covers the true value with a stated probability. */
export interface Interval {
  readonly lower: number;
  readonly upper: number;
}

/**
 * What a prediction from a fit needs: a value and a slope at a reference temperature with their covariance.
 * Units are those of the data. Uncertainties are undefined where no degree of freedom is left to estimate them.
 */
export interface FitBasis {
  readonly reference: number;
  /** Latent heat at the reference temperature. */
  readonly latent: number;
  readonly uLatent: number | undefined;
  /** ΔCp: the slope of latent heat against temperature. */
  readonly slope: number;
  readonly uSlope: number | undefined;
  /** Covariance of `latent` and `slope`. */
  readonly covariance: number | undefined;
  readonly degreesOfFreedom: number;
  /** Standard deviation of a single observation about the line. */
  readonly residualSd: number | undefined;
  readonly coverage: number;
  /** Half width of an interval in standard uncertainties (Student t). */
  readonly coverageFactor: number | undefined;
  readonly lowest: number;
  readonly highest: number;
}

/** Whether the data bend away from a straight line. */
export interface Curvature {
  /** Coefficient of (T − T̄)² in the parabola through the same data. */
  readonly coefficient: number;
  readonly uncertainty: number;
  readonly degreesOfFreedom: number;
  /** Probability of a bend at least as strong from scatter alone. */
  readonly probability: number;
}

/** One number a row, in the order of the data. */
export interface LineDiagnostics {
  /** Observed minus fitted. */
  readonly residuals: Float64Array;
  /** Weight of the row's own observation in its fitted value, in [1/n, 1]. */
  readonly leverages: Float64Array;
  /** Residual over its own standard deviation, s √(1 − h); 0 for a row that alone fixes the line. Undefined without scatter. */
  readonly studentized: Float64Array | undefined;
}

/** A straight line through ΔH–T data, with everything that a reader may ask of it. */
export interface LineFit extends FitBasis {
  readonly method: 'line';
  /** The bare numbers that everything else is made from. */
  readonly solution: LineSolution;
  /** Rows used. */
  readonly count: number;
  readonly leftOut: readonly LeftOut[];
  readonly latentInterval: Interval | undefined;
  readonly slopeInterval: Interval | undefined;
  /** Value of the line where the temperature scale of the data reads zero. */
  readonly intercept: number;
  readonly uIntercept: number | undefined;
  readonly interceptInterval: Interval | undefined;
  /** Share of the variation that the line explains; undefined where the latent heats are all equal. */
  readonly rSquared: number | undefined;
  /** Probability of a slope at least as steep from scatter alone; undefined without scatter and slope. */
  readonly pSlope: number | undefined;
  /** Mean temperature: the reference at which the covariance is zero. */
  readonly centre: number;
  /** Worked out when asked: undefined for fewer than four rows or three different temperatures. */
  curvature(): Curvature | undefined;
  /** Worked out when asked: three numbers a row. */
  diagnostics(): LineDiagnostics;
}
