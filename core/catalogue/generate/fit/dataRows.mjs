import { latentBasis, liquidBasis, liquidSlopeBasis, pressureBasis } from './bases.mjs';
import { ATTRACTION, LATENT, LIQUID, PRESSURE, withTerms } from './unknowns.mjs';
import { reducedPressure, vapourOnLine } from './vapourOnLine.mjs';

/** (v − T·dv/dT)·dp/dT of the saturated liquid, divided by R. */
function liquidTerm(models, fluid, state, t) {
  const p = reducedPressure(models, state, t);
  const v = models.liquidVolume(fluid.acentric, t, models.emptyLiquidVolume());
  return (v.volume - t * v.first) * p * models.lnPressureSlope(state.pressure, t);
}

/** The level of the liquid of an acid below its single molecules is held this much tighter than the print is certain. */
const LEVEL_SHARE = 0.3;

/** The rows of one cited value: none where it needs the vapour of a fluid that has none. */
export function dataRows(models, fluid, state, { kind, temperatureK, value, sigma }, joint) {
  const t = temperatureK / fluid.criticalK;
  const { MOLAR_GAS_CONSTANT: r } = models;
  if (kind === 'p') {
    return [{ row: withTerms(PRESSURE, pressureBasis(models, t)), value: Math.log(value / fluid.criticalPa), sigma }];
  }
  if (kind === 'cp') {
    const reduced = value / r;
    return [
      {
        row: withTerms(LIQUID, liquidSlopeBasis(models, t)),
        value: reduced + liquidTerm(models, fluid, state, t),
        sigma: sigma * reduced,
      },
    ];
  }
  const reduced = value / (r * fluid.criticalK);
  const row = withTerms(LATENT, latentBasis(models, t));
  if (kind === 'latent') return [{ row, value: reduced, sigma: sigma * reduced }];
  if (!fluid.vapour) return [];
  const vapour = vapourOnLine(models, fluid, state, t);
  const ideal = models.nasa9Enthalpy(fluid.vapour.ideal, temperatureK);
  const rc = r * fluid.criticalK;
  const terms = [state.polar, state.bonding];
  const fixed = vapour.by.reduce((sum, by, i) => sum - by.enthalpy * terms[i], vapour.enthalpy - ideal);
  vapour.by.forEach((by, i) => (row[ATTRACTION + i] -= by.enthalpy / rc));
  const toReal = { row, value: reduced + fixed / rc, sigma: sigma * reduced };
  if (fluid.vapour.dimer === undefined || !joint) return [toReal];
  // where the vapour is mostly pairs, the liquid lies the printed enthalpy below the single molecules, whatever the pairs do
  const level = withTerms(LIQUID, liquidBasis(models, t));
  return [toReal, { row: level, value: ideal / rc - reduced, sigma: LEVEL_SHARE * sigma * reduced }];
}
