import { leastSquares } from '../leastSquares.mjs';
import { vapourOnLine } from './vapourOnLine.mjs';

/** Terms of the saturated liquid with zeros to `LIQUID_DEGREE`. */
export const extendLiquid = (models, liquid) => [
  ...liquid,
  ...new Array(models.LIQUID_DEGREE + 3 - liquid.length).fill(0),
];

/** Where the vapour lacks this much of ideal volume, half of what is left of the closure is its, and half the liquid's. */
const HALF_SHARE = 0.01;

/**
 * Terms of the saturated liquid to `LIQUID_DEGREE`, which take over what is left of h(vapour) − latent − h(liquid) where the
 * vapour is nearly ideal and so cannot be the cause.
 */
export function refineLiquid(models, fluid, state) {
  const full = extendLiquid(models, state.liquid);
  if (fluid.vapour === undefined || fluid.vapour.dimer !== undefined) return full;
  const rc = models.MOLAR_GAS_CONSTANT * fluid.criticalK;
  const rows = [];
  const count = 120;
  const from = (0.93 * fluid.meltingK) / fluid.criticalK;
  for (let i = 0; i <= count; i++) {
    const t = from + ((0.995 - from) * i) / count;
    const s = models.liquidVariable(t);
    const row = Array.from({ length: models.LIQUID_DEGREE + 1 }, (_, power) => s ** power);
    const v = t < 0.93 ? vapourOnLine(models, fluid, state, t) : undefined;
    const lack = v === undefined ? 1 : 1 - v.compressibility;
    const share = (lack * lack) / (lack * lack + HALF_SHARE * HALF_SHARE);
    const left =
      v === undefined ? 0 : v.enthalpy / rc - models.reducedLatent(state.latent, t) - models.reducedLiquid(full, t);
    rows.push({ row, value: left * (1 - share), sigma: 1 });
  }
  const { x } = leastSquares(rows, models.LIQUID_DEGREE + 1);
  return full.map((term, i) => (i < 2 ? term : term + x[i - 2]));
}
