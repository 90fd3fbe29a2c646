import { fittedAt, spreadOf } from './spreadOf.mjs';

const SPREADS = { p: 'pressure', latent: 'latent', cp: 'heatCapacity' };

/** Every cited value that the fit used, what the fit gives there, and its relative standard uncertainty. */
export function citedValues(models, { record, fluid, points, fit }) {
  const spread = spreadOf(models, fluid, fit, record, points);
  return points
    .filter(({ kind }) => kind !== 'standard')
    .map(({ kind, temperatureK, value, source, detail, confirmed }) => {
      const reduced = temperatureK / fluid.criticalK;
      const stated = models.spreadAt(spread.nodes, spread[SPREADS[kind]], reduced);
      const deviation = fittedAt(models, fluid, fit, kind, reduced) / value - 1;
      const within = Math.abs(deviation) <= 2 * stated;
      return { name: fluid.name, kind, temperatureK, value, source, detail, confirmed, deviation, stated, within };
    });
}
