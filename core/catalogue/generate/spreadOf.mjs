/** Reduced temperatures at which uncertainties are stored, besides the melting point. */
const NODES = [0.4, 0.5, 0.6, 0.7, 0.8, 0.9, 0.95, 0.98];

/** Standard deviations of the fit are widened by this, found from hold-outs (`--report`). */
const WIDENED = { pressure: 1.2, latent: 1.1, heatCapacity: 1.5 };

/** Least relative standard uncertainties: what values of different origin differ by. */
const LEAST = { pressure: 0.0025, latent: 0.0025, heatCapacity: 0.006 };

/** Between the highest cited pressure and the critical point nothing holds the pressure but its form: relative, at the most. */
const BETWEEN = { normal: 0.001, polar: 0.003, strong: 0.004, nitrile: 0.005, bonded: 0.004, alcohol: 0.007 };

/** Error of the equation of the vapour at 0.9 Tc, as a part of the latent heat. */
const VAPOUR = { normal: 0.006, polar: 0.01, strong: 0.015, nitrile: 0.02, bonded: 0.012, alcohol: 0.015 };

/**
 * Relative standard uncertainties of a fitted fluid at nodes: of the fit, of the critical constants, of the vapour's equation,
 * and of the forms near the critical point.
 */
export function spreadOf(models, fluid, fit, record, points) {
  const melting = fluid.meltingK / fluid.criticalK;
  const nodes = [melting, ...NODES.filter((t) => t > melting + 0.02)];
  const critical = {
    temperature: (record.Tc.uncertainty ?? 0.005 * fluid.criticalK) / fluid.criticalK,
    pressure: (record.Pc.uncertainty ?? 0.02 * record.Pc.value) / record.Pc.value,
  };
  const misfits = residuals(models, fluid, fit, points);
  const rows = nodes.map((t) => {
    const node = atNode(models, fluid, fit, critical, t);
    const disagreeing = (kind) => DISAGREEING * misfitNear(misfits, kind, t);
    return {
      pressure: Math.hypot(node.pressure, disagreeing('p')),
      latent: Math.hypot(node.latent, disagreeing('latent')),
      heatCapacity: Math.hypot(node.heatCapacity, disagreeing('cp')),
    };
  });
  const rounded = (values) => values.map((value) => Number(value.toPrecision(2)));
  return {
    nodes: nodes.map((t) => Number(t.toFixed(3))),
    pressure: rounded(rows.map(({ pressure }) => pressure)),
    latent: rounded(rows.map(({ latent }) => latent)),
    heatCapacity: rounded(rows.map(({ heatCapacity }) => heatCapacity)),
  };
}

/** Of what cited values near a node differ from the fit, this much is added to its uncertainty. */
const DISAGREEING = 0.7;

/** How far around a node values count, in reduced temperature. */
const NEAR = 0.06;

/** Relative residuals, each with the weight that the t distribution leaves a value so far off. */
function residuals(models, fluid, fit, points) {
  return points
    .filter(({ kind }) => kind !== 'standard')
    .map(({ kind, temperatureK, value, sigma }) => {
      const t = temperatureK / fluid.criticalK;
      const residual = fittedAt(models, fluid, fit, kind, t) / value - 1;
      return { kind, t, residual, weight: 1 / (3 + (residual / sigma) ** 2) };
    });
}

/** What the fit gives: Pa, J/mol, J/(mol K). */
export function fittedAt(models, { criticalK, criticalPa, acentric }, fit, kind, t) {
  const r = models.MOLAR_GAS_CONSTANT;
  const p = Math.exp(models.lnReducedPressure(fit.pressure, t));
  if (kind === 'p') return criticalPa * p;
  if (kind === 'latent') return r * criticalK * models.reducedLatent(fit.latent, t);
  const v = models.liquidVolume(acentric, t, models.emptyLiquidVolume());
  const along = models.reducedLiquidSlope(fit.liquid, t);
  return r * (along - (v.volume - t * v.first) * p * models.lnPressureSlope(fit.pressure, t));
}

function misfitNear(misfits, kind, t) {
  let sum = 0;
  let weights = 0.02;
  for (const one of misfits) {
    if (one.kind !== kind) continue;
    const weight = one.weight * Math.exp(-0.5 * ((one.t - t) / NEAR) ** 2);
    sum += weight * one.residual * one.residual;
    weights += weight;
  }
  return Math.sqrt(sum / weights);
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
      BETWEEN[fluid.class] * Math.max(0, (t - 0.7) * near * 44),
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
