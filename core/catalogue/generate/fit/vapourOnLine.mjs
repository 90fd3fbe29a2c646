/** Reduced pressure on the line of the present round. */
export const reducedPressure = (models, state, t) => Math.exp(models.lnReducedPressure(state.pressure, t));

/** The model of the vapour with its two fitted terms. */
export function vapourWith({ vapour }, { polar, bonding }) {
  return vapour.dimer === undefined
    ? { ...vapour, polar, bonding }
    : { ...vapour, pairing: { heat: 1000 * polar, lnConstant: bonding } };
}

/** The vapour on the line, with the derivatives of its compressibility and enthalpy by the two terms of attraction. */
export function vapourOnLine(models, fluid, state, t) {
  const p = reducedPressure(models, state, t);
  const at = (polar, bonding) => {
    if (fluid.vapour === undefined) {
      const out = models.emptyDeparture();
      return models.vapourDeparture(t, p, fluid.acentric, polar, bonding, out) ? out : undefined;
    }
    const out = models.emptyVapourState();
    const model = vapourWith(fluid, { polar, bonding });
    return models.vapourState(model, t * fluid.criticalK, p * fluid.criticalPa, out) ? out : undefined;
  };
  const middle = at(state.polar, state.bonding);
  const steps = fluid.vapour?.dimer === undefined ? [1e-4, 1e-6] : [1e-2, 1e-3];
  const derived = steps.map((step, i) => {
    const above = at(state.polar + (i === 0 ? step : 0), state.bonding + (i === 1 ? step : 0));
    const below = at(state.polar - (i === 0 ? step : 0), state.bonding - (i === 1 ? step : 0));
    if (above === undefined || below === undefined) return undefined;
    return {
      compressibility: (above.compressibility - below.compressibility) / (2 * step),
      enthalpy: (above.enthalpy - below.enthalpy) / (2 * step),
    };
  });
  if (middle === undefined || derived.includes(undefined)) return undefined;
  return { ...middle, pressure: p, by: derived };
}
