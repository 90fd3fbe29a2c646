import { leastSquares } from './leastSquares.mjs';

/** How far molecules attract one another beyond corresponding states; a fluid that is not listed is a normal one. */
const CLASSES = {
  alcohol: ['methanol', 'ethanol', '1-propanol', '2-propanol', '1-butanol', 'ethylene glycol', 'glycerol'],
  bonded: ['water', 'ammonia', 'acetic acid', 'formic acid', 'phenol', 'aniline'],
  nitrile: ['acetonitrile'],
  strong: ['dimethylformamide', 'dimethyl sulfoxide'],
  polar: [
    'sulfur dioxide',
    'acetone',
    '2-butanone',
    'ethyl acetate',
    'diethyl ether',
    'tetrahydrofuran',
    '1,4-dioxane',
    'pyridine',
    'dichloromethane',
    'chloroform',
    '1,2-dichloroethane',
  ],
};
const DIMERS = { 'acetic acid': '(CH3COOH)2', 'formic acid': '(HCOOH)2' };

/** What the fit needs of a record besides its points. */
export function fluidOfRecord(models, record) {
  const { name } = record;
  const criticalK = record.Tc.value;
  const criticalPa = record.Pc.value * 1e5;
  const acentric = record.acentric_factor.value;
  const ideal = idealGas(models, record);
  const dimer = DIMERS[name] === undefined ? {} : { dimer: models.nasa9Species(DIMERS[name]) };
  return {
    name,
    class: Object.keys(CLASSES).find((key) => CLASSES[key].includes(name)) ?? 'normal',
    criticalK,
    criticalPa,
    acentric,
    meltingK: record.Tm.value,
    boilingK: record.Tb.value,
    idealFromK: ideal === undefined ? Infinity : ideal.fromK,
    ...(ideal === undefined
      ? {}
      : { vapour: { criticalK, criticalPa, acentric, polar: 0, bonding: 0, ideal, ...dimer } }),
  };
}

function idealGas(models, record) {
  if (record.nasa9?.gas) return models.nasa9Species(record.nasa9.gas);
  const points = record.Cp_gas_points;
  if (points === undefined) return undefined;
  const coefficients = cubicThrough(models, points);
  const ts = points.map(({ T_K }) => T_K);
  return models.gasFromPoints(
    record.name,
    record.molar_mass.value / 1000,
    coefficients,
    Math.min(...ts),
    Math.max(...ts),
  );
}

/** Coefficients of cp/R for the powers of T/(1000 K). */
export function cubicThrough(models, points) {
  const rows = points.map(({ T_K, value }) => ({
    row: [0, 1, 2, 3].map((power) => (T_K / 1000) ** power),
    value: value / models.NASA9_R,
    sigma: 1,
  }));
  return leastSquares(rows, 4).x;
}
