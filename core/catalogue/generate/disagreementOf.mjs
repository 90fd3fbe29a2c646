import { vapourWith } from './fit/vapourOnLine.mjs';
import { fitFluid } from './fitFluid.mjs';
import { leastSquares } from './leastSquares.mjs';
import { deviation } from './spreadOf.mjs';

const NODES = 13;

/** Least standard uncertainty of the enthalpy difference of vapour and liquid heat capacities, J/(mol K). */
const VAPOUR_SHARE = 0.1;

/**
 * L(T) fitted without heat capacities less h(vapour) − h(liquid) with the liquid fitted without latent heats, as a cubic in
 * T/Tc between the melting point and 0.8 Tc: only its differences mean something.
 *
 * @returns [fromK, toK, standard uncertainty over the range, cubic], or undefined where the vapour or the heat
 * capacity of the liquid at two temperatures is unknown
 */
export function disagreementOf(models, fluid, points, joint) {
  if (fluid.vapour === undefined || !hasSlope(points)) return undefined;
  const apart = fitFluid(models, fluid, points, false);
  const { criticalK, criticalPa } = fluid;
  const from = Math.max(fluid.meltingK / criticalK, 0.3);
  const to = 0.8;
  const r = models.MOLAR_GAS_CONSTANT;
  const out = models.emptyVapourState();
  const model = vapourWith(fluid, joint);
  const rows = [];
  for (let i = 0; i < NODES; i++) {
    const t = from + ((to - from) * i) / (NODES - 1);
    const p = criticalPa * Math.exp(models.lnReducedPressure(joint.pressure, t));
    if (!models.vapourState(model, t * criticalK, p, out)) continue;
    const reduced = models.reducedLatent(apart.latent, t) + models.reducedLiquid(apart.liquid, t);
    rows.push({ row: [1, t, t * t, t ** 3], value: r * criticalK * reduced - out.enthalpy, sigma: 1 });
  }
  const cubic = leastSquares(rows, 4).x;
  const difference = (row) => row(to).map((element, i) => element - row(from)[i]);
  const departure = out.enthalpy - models.nasa9Enthalpy(fluid.vapour.ideal, to * criticalK);
  const uncertainty = Math.hypot(
    r * criticalK * deviation(apart, difference(apart.rows.latent)),
    r * criticalK * deviation(apart, difference(apart.rows.liquid)),
    VAPOUR_SHARE * departure,
  );
  cubic[0] = 0;
  return [Math.ceil(from * criticalK * 100) / 100, Math.floor(to * criticalK * 100) / 100, uncertainty, ...cubic];
}

/** Two heat capacities so far apart say how it changes, K. */
const APART_K = 30;

function hasSlope(points) {
  const ts = points.filter(({ kind }) => kind === 'cp').map(({ temperatureK }) => temperatureK);
  return Math.max(...ts) - Math.min(...ts) > APART_K;
}
