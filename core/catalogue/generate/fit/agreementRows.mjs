import { latentBasis, liquidBasis, slopeBasis } from './bases.mjs';
import { ATTRACTION, LATENT, LIQUID, PRESSURE, withTerms } from './unknowns.mjs';
import { vapourOnLine } from './vapourOnLine.mjs';

/** Nearer to the critical point neither the equation of the vapour nor the forms agree well enough. */
const GRID_TO = 0.955;
const GRID_FROM = 0.2;
const GRID_STEP = 0.03;

/** Grid values lean on one another: each counts as less than one of its own; an error of pairing is
 * one and the same all along. */
const CORRELATED = { clapeyron: 1.4, closure: 1.6, pairs: 3 };

/** Reduced temperatures from the melting point to near the critical one. */
function grid({ meltingK, criticalK }) {
  const from = Math.max(GRID_FROM, meltingK / criticalK);
  const count = Math.max(2, Math.round((GRID_TO - from) / GRID_STEP));
  return Array.from({ length: count + 1 }, (_, i) => from + ((GRID_TO - from) * i) / count);
}

/** Clapeyron's equation on the grid, as well as the volume of the vapour is known. */
export function clapeyronRows(models, fluid, kind, state) {
  const rows = [];
  for (const t of grid(fluid)) {
    const v = vapourOnLine(models, fluid, state, t);
    if (v === undefined) continue;
    const liquid = models.liquidVolume(fluid.acentric, t, models.emptyLiquidVolume());
    const gap = v.compressibility - (v.pressure * liquid.volume) / t;
    const psi = t * t * models.lnPressureSlope(state.pressure, t);
    // latent = gap·psi, both linear in their unknowns around the present round
    const row = withTerms(LATENT, latentBasis(models, t));
    withTerms(PRESSURE, slopeBasis(models, t), row, -gap);
    v.by.forEach((by, i) => (row[ATTRACTION + i] -= by.compressibility * psi));
    const value = -(v.by[0].compressibility * state.polar + v.by[1].compressibility * state.bonding) * psi;
    const latent = gap * psi;
    const real = 1 - v.compressibility;
    const sigma =
      latent * Math.hypot(0.002, kind.vapour * real, (t > 0.92 ? 0.2 : 0.06) * real * real) * CORRELATED.clapeyron;
    rows.push({ row, value, sigma });
  }
  return rows;
}

/** h(liquid) + latent = h(vapour) on the grid, as well as the enthalpy of the vapour is known, J/mol. */
export function closureRows(models, fluid, kind, state) {
  if (fluid.vapour === undefined) return [];
  const rc = models.MOLAR_GAS_CONSTANT * fluid.criticalK;
  const rows = [];
  for (const t of grid(fluid)) {
    const v = vapourOnLine(models, fluid, state, t);
    if (v === undefined) continue;
    const temperatureK = t * fluid.criticalK;
    const departure = v.enthalpy - models.nasa9Enthalpy(fluid.vapour.ideal, temperatureK);
    const row = withTerms(LIQUID, liquidBasis(models, t), withTerms(LATENT, latentBasis(models, t)));
    v.by.forEach((by, i) => (row[ATTRACTION + i] -= by.enthalpy / rc));
    const value = (v.enthalpy - v.by[0].enthalpy * state.polar - v.by[1].enthalpy * state.bonding) / rc;
    const cold = Math.max(0, fluid.idealFromK - temperatureK);
    const leaning = fluid.vapour.dimer === undefined ? CORRELATED.closure : CORRELATED.pairs;
    const sigma = (Math.hypot(4, 3.6 * kind.vapour * departure, 0.15 * cold) * leaning) / rc;
    rows.push({ row, value, sigma });
  }
  return rows;
}
