import { studentTBothTails } from '../statistics/studentTBothTails';
import { studentTQuantile } from '../statistics/studentTQuantile';
import type { Curvature, Interval, LineDiagnostics, LineFit } from './fitTypes';
import type { LeftOut } from './leftOut';
import { firstHalf } from './lineSums';
import type { LineSolution } from './solveLine';

/** What goes into a description besides the numbers of the line. */
export interface LineContext {
  readonly reference: number;
  readonly coverage: number;
  readonly leftOut: readonly LeftOut[];
  readonly curvature: () => Curvature | undefined;
  readonly diagnostics: () => LineDiagnostics;
}

/** Everything that a straight line says, from its solution: value y(t) = ȳ + b (t − x̄), with u² = s²/n + (t − x̄)² s²/Σ(x − x̄)². */
export function describeLine(solution: LineSolution, context: LineContext): LineFit {
  const { count, spread, residualSquares } = solution;
  const degreesOfFreedom = count - 2;
  const slope = solution.slope + solution.slopeRest;
  const scatter = degreesOfFreedom > 0 ? residualSquares / degreesOfFreedom : undefined;
  const coverageFactor =
    scatter === undefined ? undefined : -studentTQuantile((1 - context.coverage) / 2, degreesOfFreedom);
  const uAt = (temperature: number): number | undefined =>
    scatter === undefined
      ? undefined
      : Math.sqrt(scatter * (1 / count + (temperature - solution.centre) ** 2 / spread));
  const around = (value: number, u: number | undefined): Interval | undefined =>
    u === undefined || coverageFactor === undefined
      ? undefined
      : { lower: value - coverageFactor * u, upper: value + coverageFactor * u };

  const uSlope = scatter === undefined ? undefined : Math.sqrt(scatter / spread);
  const latent = lineAt(solution, context.reference);
  const uLatent = uAt(context.reference);
  const intercept = lineAt(solution, 0);
  const uIntercept = uAt(0);
  const explained = slope * slope * spread;
  return {
    method: 'line',
    solution,
    count,
    leftOut: context.leftOut,
    reference: context.reference,
    latent,
    uLatent,
    latentInterval: around(latent, uLatent),
    slope,
    uSlope,
    slopeInterval: around(slope, uSlope),
    covariance: scatter === undefined ? undefined : ((context.reference - solution.centre) * scatter) / spread,
    intercept,
    uIntercept,
    interceptInterval: around(intercept, uIntercept),
    degreesOfFreedom,
    residualSd: scatter === undefined ? undefined : Math.sqrt(scatter),
    coverage: context.coverage,
    coverageFactor,
    rSquared: explained + residualSquares > 0 ? explained / (explained + residualSquares) : undefined,
    pSlope:
      uSlope === undefined || (uSlope === 0 && slope === 0)
        ? undefined
        : studentTBothTails(slope / uSlope, degreesOfFreedom),
    centre: solution.centre,
    lowest: solution.lowest,
    highest: solution.highest,
    curvature: once(context.curvature),
    diagnostics: once(context.diagnostics),
  };
}

/** The line at a temperature, the product taken in twice the working precision. */
function lineAt(solution: LineSolution, temperature: number): number {
  const away = temperature - solution.centre;
  const head = firstHalf(away);
  const tail = away - head;
  const main = solution.centreLatent + solution.slope * head + solution.slope * tail;
  return main + (solution.centreRest + solution.slopeRest * away);
}

function once<T>(work: () => T): () => T {
  let done: { readonly value: T } | undefined;
  return () => (done ??= { value: work() }).value;
}
