import { leastSquares } from './leastSquares.mjs';

/** How far molecules attract one another beyond corresponding states; a fluid that is not listed is a normal one. */
const CLASSES = {
  alcohol: ['methanol', 'ethanol', '1-propanol', '2-propanol', '1-butanol', 'ethylene glycol', 'glycerol'],
  bonded: ['water', 'ammonia', 'acetic acid', 'formic acid', 'phenol', 'aniline'],
  nitrile: ['acetonitrile'],
  strong: ['dimethylformamide', 'dimethyl sulfoxide'],
  polar: [
    'bromine',
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
/** Dipole moments, debye (common handbook values, from memory): they only say what polar term to expect. */
const DIPOLES = {
  bromine: 0,
  water: 1.85,
  ammonia: 1.47,
  methanol: 1.7,
  ethanol: 1.69,
  '1-propanol': 1.68,
  '2-propanol': 1.66,
  '1-butanol': 1.66,
  'sulfur dioxide': 1.63,
  acetone: 2.88,
  '2-butanone': 2.78,
  'ethyl acetate': 1.78,
  'diethyl ether': 1.15,
  tetrahydrofuran: 1.7,
  '1,4-dioxane': 0.4,
  acetonitrile: 3.92,
  dimethylformamide: 3.82,
  'dimethyl sulfoxide': 3.96,
  pyridine: 2.2,
  dichloromethane: 1.6,
  chloroform: 1.04,
  '1,2-dichloroethane': 1.4,
  phenol: 1.45,
  aniline: 1.53,
};

/** Of Tsonopoulos's polar term this much remains on top of Lee and Kesler: what the equation of state of water asks for. */
const POLAR_SHARE = 0.45;

/** Tsonopoulos, AIChE J. 20 (1974) 263, for ketones, ethers, esters and nitriles; reduced dipole moment. */
function expectedPolar(name, criticalK, criticalPa) {
  const dipole = DIPOLES[name];
  if (dipole === undefined) return undefined;
  const reduced = (1e5 * dipole * dipole * (criticalPa / 101325)) / criticalK ** 2;
  return POLAR_SHARE * (2.14e-4 * reduced + 4.308e-21 * reduced ** 8);
}

/** Bonds that turn and rings that pucker: below the ideal-gas data each keeps about this much of R for longest. */
const ROTORS = {
  methanol: 1,
  ethanol: 2,
  '1-propanol': 3,
  '2-propanol': 3,
  '1-butanol': 4,
  acetone: 2,
  '2-butanone': 3,
  'ethyl acetate': 4,
  'diethyl ether': 4,
  tetrahydrofuran: 1,
  '1,4-dioxane': 1,
  acetonitrile: 0,
  propane: 2,
  'n-butane': 3,
  isobutane: 3,
  'n-pentane': 4,
  'n-hexane': 5,
  'n-heptane': 6,
  'n-octane': 7,
  'n-decane': 9,
  cyclohexane: 1,
  toluene: 1,
  'o-xylene': 2,
  'p-xylene': 2,
  ethylbenzene: 2,
  styrene: 1,
  phenol: 1,
  aniline: 1,
  '1,2-dichloroethane': 1,
};
const ROTOR_FLOOR = 0.4;
const DIMERS = { 'acetic acid': '(CH3COOH)2', 'formic acid': '(HCOOH)2' };

/** What the fit needs of a record besides its points. */
export function fluidOfRecord(models, record) {
  const { name } = record;
  const criticalK = record.Tc.value;
  const criticalPa = record.Pc.value * 1e5;
  const acentric = record.acentric_factor.value;
  const rotors = ROTORS[name] ?? 0;
  const floor = rotors === 0 ? undefined : Number((4 + ROTOR_FLOOR * rotors).toFixed(1));
  const known = idealGas(models, record);
  const ideal = known === undefined || floor === undefined ? known : models.withFloor(known, floor);
  const dimer = DIMERS[name] === undefined ? {} : { dimer: models.nasa9Species(DIMERS[name]) };
  return {
    name,
    class: Object.keys(CLASSES).find((key) => CLASSES[key].includes(name)) ?? 'normal',
    criticalK,
    criticalPa,
    acentric,
    meltingK: record.Tm.value,
    boilingK: record.Tb.value,
    floor,
    expectedPolar: expectedPolar(name, criticalK, criticalPa),
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
