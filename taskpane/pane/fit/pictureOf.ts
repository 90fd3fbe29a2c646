import { latentFromFit } from '../../../core/fit/latentFromFit';
import { number, prettyUnit } from '../look/number';
import type { BandPoint, DrawnPoint, FitPicture } from './drawFit';
import type { FitView } from './fitView';

/** More points than this are thinned for the picture; the fit always uses all. */
const MOST_POINTS = 1500;
const BAND_STEPS = 60;

export interface Picture extends Omit<FitPicture, 'width'> {
  /** How the points were thinned, or undefined where all are drawn. */
  readonly thinned: string | undefined;
}

/** What is drawn of a fit, with the words for it. */
export function pictureOf({ fit, temperatures, latents, units }: FitView): Picture {
  const { residuals } = fit.diagnostics();
  const drawn = thinnedRows(residuals);
  const x = prettyUnit(units.temperature.symbol);
  const y = prettyUnit(units.heat.symbol);
  const points = drawn.map((i): DrawnPoint => ({
    x: temperatures[i] ?? 0,
    y: latents[i] ?? 0,
    residual: residuals[i] ?? 0,
  }));
  const band = Array.from({ length: BAND_STEPS + 1 }, (_, i): BandPoint => {
    const at = fit.lowest + ((fit.highest - fit.lowest) * i) / BAND_STEPS;
    const { value, lineInterval } = latentFromFit(fit, at);
    return { x: at, y: value, low: lineInterval?.lower ?? value, high: lineInterval?.upper ?? value };
  });
  const [first, last] = [band[0], band.at(-1)];
  const largest = points.reduce((most, point) => Math.max(most, Math.abs(point.residual)), 0);
  return {
    points,
    band,
    xLabel: `T / ${x}`,
    yLabel: `ΔH / ${y}`,
    words:
      `${fit.count} points and their line, from ${number(first?.y ?? 0)} ${y} at ${number(fit.lowest)} ${x} ` +
      `to ${number(last?.y ?? 0)} ${y} at ${number(fit.highest)} ${x}. ` +
      `The largest residual is ${number(largest)} ${y}.`,
    thinned:
      drawn.length === fit.count
        ? undefined
        : `Drawn: ${drawn.length} of ${fit.count} points, the lowest and the highest residual of each run of rows. The fit uses all.`,
  };
}

/** Every row, or of each run of rows the two with the lowest and highest residual, so that no outlier is hidden. */
export function thinnedRows(residuals: ArrayLike<number>): number[] {
  const n = residuals.length;
  if (n <= MOST_POINTS) return Array.from({ length: n }, (_, i) => i);
  const runs = MOST_POINTS / 2;
  const kept: number[] = [];
  for (let run = 0; run < runs; run++) {
    const start = Math.floor((run * n) / runs);
    const end = Math.floor(((run + 1) * n) / runs);
    let low = start;
    let high = start;
    for (let i = start + 1; i < end; i++) {
      if ((residuals[i] as number) < (residuals[low] as number)) low = i;
      if ((residuals[i] as number) > (residuals[high] as number)) high = i;
    }
    kept.push(Math.min(low, high));
    if (low !== high) kept.push(Math.max(low, high));
  }
  return kept;
}
