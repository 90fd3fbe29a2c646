import { Problem } from '../problem';
import { describeLine } from './describeLine';
import type { Curvature, LineDiagnostics, LineFit } from './fitTypes';

/** new = factor · old + offset */
export interface ScaleChange {
  readonly factor: number;
  readonly offset: number;
}

/**
 * The same fit in other units, worked out on the coefficients and not on the data.
 *
 * With T′ = aT + b and ΔH′ = cΔH: slope′ = slope·c/a, u and covariance with their factors, the reference moved along,
 * the intercept at T′ = 0; probabilities, R² and degrees of freedom stay.
 *
 * @param fit from `fitDeltaCp`
 * @param temperature change of the temperature scale, factor not 0
 * @param latentFactor factor of the latent heats, not 0; negative turns the direction of the change round
 * @returns the fit in the new units
 * @throws Problem of code `argument` for a factor that is 0 or not finite
 * @example
 * import { convertLine, fitDeltaCp } from 'latentry';
 * const fit = fitDeltaCp([0, 10, 20, 30, 40], [2500.8, 2477.3, 2453.76, 2429.82, 2405.12]);
 * convertLine(fit, { factor: 1, offset: 273.15 }, 0.018015268).intercept // => 56.8115
 */
export function convertLine(fit: LineFit, temperature: ScaleChange, latentFactor: number): LineFit {
  const { factor, offset } = temperature;
  refuseUnusable('temperature factor', factor, true);
  refuseUnusable('temperature offset', offset, false);
  refuseUnusable('latent factor', latentFactor, true);
  const old = fit.solution;
  const ends = [factor * old.lowest + offset, factor * old.highest + offset] as const;
  const steeper = latentFactor / factor;
  return describeLine(
    {
      count: old.count,
      centre: factor * old.centre + offset,
      centreLatent: latentFactor * (old.centreLatent + old.centreRest),
      centreRest: 0,
      slope: 0,
      slopeRest: steeper * (old.slope + old.slopeRest),
      spread: factor * factor * old.spread,
      residualSquares: latentFactor * latentFactor * old.residualSquares,
      lowest: Math.min(...ends),
      highest: Math.max(...ends),
    },
    {
      reference: factor * fit.reference + offset,
      coverage: fit.coverage,
      leftOut: fit.leftOut,
      curvature: () => scaleCurvature(fit.curvature(), steeper / factor),
      diagnostics: () => scaleRows(fit.diagnostics(), latentFactor),
    },
  );
}

function scaleCurvature(curvature: Curvature | undefined, scale: number): Curvature | undefined {
  if (curvature === undefined) return undefined;
  return {
    ...curvature,
    coefficient: scale * curvature.coefficient,
    uncertainty: Math.abs(scale) * curvature.uncertainty,
  };
}

function scaleRows(rows: LineDiagnostics, scale: number): LineDiagnostics {
  return {
    residuals: rows.residuals.map((residual) => scale * residual),
    leverages: rows.leverages,
    studentized: rows.studentized?.map((value) => Math.sign(scale) * value),
  };
}

function refuseUnusable(argument: string, value: number, nonzero: boolean): void {
  if (Number.isFinite(value) && !(nonzero && value === 0)) return;
  const allowed = nonzero ? 'a finite number other than 0' : 'a finite number';
  throw new Problem({ code: 'argument', argument, allowed, received: String(value) });
}
