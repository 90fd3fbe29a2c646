import { Problem } from '../problem';
import type { FitBasis, Interval } from './fitTypes';

/** Latent heat at one temperature as a fit predicts it, in the units of the fit. */
export interface FitPrediction {
  readonly value: number;
  /** Standard uncertainty of the line; undefined where the fit left no degree of freedom. */
  readonly uLine: number | undefined;
  /** Standard uncertainty of one new observation there. */
  readonly uObservation: number | undefined;
  readonly lineInterval: Interval | undefined;
  readonly observationInterval: Interval | undefined;
  /** How far the temperature lies outside the data; 0 inside. */
  readonly beyondData: number;
}

/**
 * Latent heat at a temperature from a fit, with its standard uncertainty.
 *
 * ΔH(T) = ΔH(T₀) + ΔCp (T − T₀); u² = u²(ΔH) + 2 (T − T₀) cov + (T − T₀)² u²(ΔCp); one new observation adds s².
 *
 * @param fit a fit, or what `readFitTable` read from a sheet
 * @param temperature in the temperature unit of the fit
 * @returns value, uncertainties, intervals at the coverage of the fit, distance from the data
 * @throws Problem of code `argument` for a temperature that is not finite
 * @source JCGM 100:2008 (GUM), H.3.4, equation (H.15)
 * @example
 * import { fitDeltaCp, latentFromFit } from 'latentry';
 * const fit = fitDeltaCp([0, 10, 20, 30, 40], [2500.8, 2477.3, 2453.76, 2429.82, 2405.12]);
 * latentFromFit(fit, 25).value // => 2441.42
 */
export function latentFromFit(fit: FitBasis, temperature: number): FitPrediction {
  if (!Number.isFinite(temperature)) {
    const received = String(temperature);
    throw new Problem({ code: 'argument', argument: 'temperature', allowed: 'a finite temperature', received });
  }
  const away = temperature - fit.reference;
  const value = fit.latent + fit.slope * away;
  const uLine = lineUncertainty(fit, away);
  const uObservation =
    uLine === undefined || fit.residualSd === undefined ? undefined : Math.hypot(uLine, fit.residualSd);
  const around = (u: number | undefined): Interval | undefined =>
    u === undefined || fit.coverageFactor === undefined
      ? undefined
      : { lower: value - fit.coverageFactor * u, upper: value + fit.coverageFactor * u };
  return {
    value,
    uLine,
    uObservation,
    lineInterval: around(uLine),
    observationInterval: around(uObservation),
    beyondData: Math.max(0, fit.lowest - temperature, temperature - fit.highest),
  };
}

/** u² written as the smallest u² on the line plus a square, so that no digits cancel. */
function lineUncertainty(fit: FitBasis, away: number): number | undefined {
  const { uLatent, uSlope, covariance } = fit;
  if (uLatent === undefined || uSlope === undefined || covariance === undefined) return undefined;
  if (uSlope === 0) return uLatent;
  const atBest = Math.max(0, uLatent * uLatent - (covariance / uSlope) ** 2);
  return Math.hypot(Math.sqrt(atBest), uSlope * away + covariance / uSlope);
}
