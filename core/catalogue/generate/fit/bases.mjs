/** What each unknown contributes at a reduced temperature: to ln p, to latent heat and to liquid enthalpy over R·Tc. */
export const pressureBasis = (models, t) => models.PRESSURE_POWERS.map((e) => (1 - t) ** e / t);
export const latentBasis = (models, t) => models.LATENT_POWERS.map((e) => (1 - t) ** e);
export const liquidBasis = (models, t) => {
  const s = models.liquidVariable(t);
  return [Math.cbrt(1 - t), Math.cbrt(1 - t) ** 2, 1, s, s * s, s ** 3, s ** 4];
};

export const liquidSlopeBasis = (models, t) => {
  const s = models.liquidVariable(t);
  const third = Math.cbrt(1 - t);
  const step = models.liquidVariable(1) - models.liquidVariable(0);
  return [-1 / (3 * third * third), -2 / (3 * third), 0, 1, 2 * s, 3 * s * s, 4 * s ** 3].map((slope, i) =>
    i < 2 ? slope : slope * step,
  );
};

/** Tr²·d ln p/d Tr of each pressure term: the slope against −1/Tr. */
export const slopeBasis = (models, t) => {
  const x = 1 - t;
  return models.PRESSURE_POWERS.map((e) => -(e * x ** (e - 1) * t + x ** e));
};
