import { clapeyronRows, closureRows } from './fit/agreementRows.mjs';
import { latentBasis, liquidBasis, liquidSlopeBasis, pressureBasis } from './fit/bases.mjs';
import { ambroseWalton } from './fit/correspondingStates.mjs';
import { dataRows } from './fit/dataRows.mjs';
import { fluidClass } from './fit/fluidClass.mjs';
import { priorRows } from './fit/priorRows.mjs';
import { extendLiquid, refineLiquid } from './fit/refineLiquid.mjs';
import { LATENT, LIQUID, PRESSURE, rowOf, SIZE, unpack, withTerms } from './fit/unknowns.mjs';
import { leastSquares } from './leastSquares.mjs';

/** Rounds of linear least squares: the vapour on the line, and the weights of outlying values, follow the last one. */
const ROUNDS = 12;

/** Degrees of freedom of the t distribution that the errors of cited values are taken from: one bad print moves little. */
const FREEDOM = 3;

/**
 * Fits saturation pressure, heat of vaporization and liquid enthalpy of one fluid together, so that they agree: Clapeyron's
 * equation and h(vapour) − h(liquid) = ΔHvap are kept on a grid of temperatures, each as well as the vapour is known there.
 *
 * @param models the bundled models of core/fluid
 * @param fluid constants, class, ideal gas and dimer where known
 * @param points from `readPoints`
 * @param joint false: latent heat and heat capacities are fitted without each other
 * @returns terms, their covariance, and `rows`: what each unknown contributes to a property at a reduced temperature
 */
export function fitFluid(models, fluid, points, joint = true) {
  const kind = fluidClass(fluid);
  const expected = priorRows(models, fluid, kind, points);
  let state = { pressure: ambroseWalton(fluid.acentric), polar: kind.polar[0], bonding: kind.bonding[0] };
  for (let round = 0; round < ROUNDS; round++) {
    const cited = points.flatMap((point) => dataRows(models, fluid, state, point, joint));
    const agreement = joint
      ? [...clapeyronRows(models, fluid, kind, state), ...closureRows(models, fluid, kind, state)]
      : [{ row: rowOf(LIQUID + 2), value: 0, sigma: 1 }];
    const rows = [...expected, ...cited.map((row) => tempered(row, state)), ...agreement];
    const { x, covariance } = leastSquares(rows, SIZE);
    state = unpack(x, covariance);
  }
  return {
    ...state,
    liquid: joint ? refineLiquid(models, fluid, state) : extendLiquid(models, state.liquid),
    rows: {
      pressure: (t) => withTerms(PRESSURE, pressureBasis(models, t)),
      latent: (t) => withTerms(LATENT, latentBasis(models, t)),
      liquid: (t) => withTerms(LIQUID, liquidBasis(models, t)),
      heatCapacity: (t) => withTerms(LIQUID, liquidSlopeBasis(models, t)),
    },
  };
}

/** A row with the deviation that the t distribution gives a value so far off. */
function tempered({ row, value, sigma }, { x }) {
  if (x === undefined) return { row, value, sigma };
  const residual = (row.reduce((sum, element, i) => sum + element * x[i], 0) - value) / sigma;
  return { row, value, sigma: sigma * Math.sqrt((FREEDOM + residual * residual) / (FREEDOM + 1)) };
}
