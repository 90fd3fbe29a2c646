/** Reduced temperatures at which uncertainties are stored, besides the melting point. */
const NODES = [0.4, 0.5, 0.6, 0.7, 0.8, 0.9, 0.95, 0.98];

/** Standard deviations of the fit are widened by this, found from hold-outs (`--hold-out`). */
const WIDENED = { pressure: 1.4, latent: 1.3, heatCapacity: 1.3 };

/** Least relative standard uncertainties: what values of different origin differ by. */
const LEAST = { pressure: 0.0025, latent: 0.0025, heatCapacity: 0.005 };

/** Error of the equation of the vapour at 0.9 Tc, as a part of the latent heat. */
const VAPOUR = { normal: 0.004, polar: 0.01, strong: 0.015, nitrile: 0.02, bonded: 0.012, alcohol: 0.015 };

/**
 * Relative standard uncertainties of a fitted fluid at nodes: of the fit, of the critical constants, of the vapour's equation,
 * and of the forms near the critical point.
 */
export function spreadOf(models, fluid, fit, record) {
  const melting = fluid.meltingK / fluid.criticalK;
  const nodes = [melting, ...NODES.filter((t) => t > melting + 0.02)];
  const critical = {
    temperature: (record.Tc.uncertainty ?? 0.005 * fluid.criticalK) / fluid.criticalK,
    pressure: (record.Pc.uncertainty ?? 0.02 * record.Pc.value) / record.Pc.value,
  };
  const rows = nodes.map((t) => atNode(models, fluid, fit, critical, t));
  const rounded = (values) => values.map((value) => Number(value.toPrecision(2)));
  return {
    nodes: nodes.map((t) => Number(t.toFixed(3))),
    pressure: rounded(rows.map(({ pressure }) => pressure)),
    latent: rounded(rows.map(({ latent }) => latent)),
    heatCapacity: rounded(rows.map(({ heatCapacity }) => heatCapacity)),
  };
}

function atNode(models, fluid, fit, critical, t) {
  const { rows } = fit;
  const heat = models.reducedLatent(fit.latent, t);
  const slope = models.reducedLiquidSlope(fit.liquid, t);
  const near = 1 - t;
  const beyond = Math.max(0, t - 0.6) / 0.3;
  return {
    pressure: Math.hypot(
      LEAST.pressure,
      WIDENED.pressure * deviation(fit, rows.pressure(t)),
      critical.pressure * Math.max(0, (t - 0.7) / 0.3),
      critical.temperature * Math.max(0, (t - 0.7) / 0.3) * 7,
    ),
    latent: Math.hypot(
      LEAST.latent,
      (WIDENED.latent * deviation(fit, rows.latent(t))) / heat,
      VAPOUR[fluid.class] * beyond * beyond,
      (0.38 * critical.temperature * Math.max(0, (t - 0.7) / 0.3)) / near,
      0.0006 / near - 0.003,
    ),
    heatCapacity: Math.hypot(
      LEAST.heatCapacity,
      (WIDENED.heatCapacity * deviation(fit, rows.heatCapacity(t))) / slope,
      t > 0.8 ? 0.004 / near - 0.02 : 0,
    ),
  };
}

export function deviation({ covariance }, row) {
  let sum = 0;
  for (let i = 0; i < row.length; i++) {
    if (row[i] === 0) continue;
    for (let j = 0; j < row.length; j++) sum += row[i] * row[j] * covariance[i][j];
  }
  return Math.sqrt(Math.max(0, sum));
}
