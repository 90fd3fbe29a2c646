import { spreadOf } from './spreadOf.mjs';

const short = (value, digits = 7) => String(Number(value.toPrecision(digits))).replace(/^(-?)0\./, '$1.');
const join = (values, digits) => values.map((value) => short(value, digits)).join(',');

/** The line is followed this far below the melting point; liquid there is supercooled. */
const SUPERCOOLED = 0.94;

/** Crystals of the nine-coefficient data that belong to a fluid. */
const CRYSTALS = { bromine: 'Br2(cr)' };

/** Solids whose heat capacity is known at one temperature are followed from this one on, K. */
const SOLID_FROM_K = 273.15;

/** Text of one fluid for the generated file, in the order of FLUID_FIELDS. */
export function packFluid(models, { record, fluid, points, fit, disagreement }, citations) {
  const spread = spreadOf(models, fluid, fit, record, points);
  const { criticalK } = fluid;
  const sublimes = record.name === 'carbon dioxide' ? record.Tb.value : undefined;
  const lineFromK = Math.ceil(SUPERCOOLED * Math.min(fluid.meltingK, 303) * 100) / 100;
  const fusion = fusionOf(record);
  const fields = {
    name: record.name,
    formula: record.formula,
    cas: record.cas,
    synonyms: record.synonyms.join(';'),
    gas: gasOf(fluid, record),
    dimer: dimerOf(fluid, points),
    limits: [lineFromK, vapourEnd(models, fluid, fit), ...(sublimes === undefined ? [] : [sublimes])]
      .map((k) => short(k))
      .join(','),
    terms: [fit.polar, fit.bonding].map((term) => short(Math.abs(term) < 2e-5 ? 0 : term, 3)).join(','),
    pressure: join(fit.pressure, 8),
    latent: join(fit.latent, 8),
    liquid: join(zeroed(models, fluid, fit), 8),
    nodes: join(spread.nodes, 3),
    pressureSpread: join(spread.pressure, 2),
    latentSpread: join(spread.latent, 2),
    heatCapacitySpread: join(spread.heatCapacity, 2),
    constants: constantsOf(record, citations),
    fusion: fusion === undefined ? '' : cited(fusion, citations),
    solid: solidOf(models, record, citations),
    disagreement: disagreement === undefined ? '' : join(disagreement, 6),
    latentSources: sourcesOf(points, ['latent', 'standard'], citations),
    pressureSources: sourcesOf(points, ['p'], citations),
    heatCapacitySources: sourcesOf(points, ['cp'], citations),
    gasSources: gasSourcesOf(record, citations),
    unconfirmed: unconfirmedOf(points).join(';'),
    notes: notesOf(record, fluid, points).join(';'),
  };
  return models.FLUID_FIELDS.map((field) => {
    const text = fields[field];
    if (text.includes('|')) throw new Error(`${record.name}: a bar in ${field}`);
    return text;
  }).join('|');
}

/** Without an ideal gas the liquid at its melting point is the zero. */
function zeroed(models, { vapour, meltingK, criticalK }, { liquid }) {
  if (vapour !== undefined) return liquid;
  const zero = models.reducedLiquid(liquid, meltingK / criticalK);
  return liquid.map((term, i) => (i === 2 ? term - zero : term));
}

/** The hottest point on the line where the equation has a vapour, with some distance to where it has none. */
function vapourEnd(models, fluid, fit) {
  const { criticalK, acentric } = fluid;
  const dimer = fluid.vapour?.dimer;
  const attraction = dimer === undefined ? [fit.polar, fit.bonding] : [0, 0];
  let t = 0.97;
  for (; t > 0.7; t -= 0.005) {
    const ahead = t + 0.012;
    const p = Math.exp(models.lnReducedPressure(fit.pressure, ahead));
    if (models.vapourDeparture(ahead, p, acentric, ...attraction, models.emptyDeparture())) break;
  }
  return Math.floor((dimer === undefined ? t : Math.min(t, 0.9)) * criticalK * 10) / 10;
}

function gasOf(fluid, record) {
  const gas = gasWithoutFloor(fluid, record);
  return gas === '' || fluid.floor === undefined ? gas : `${gas}~${fluid.floor}`;
}

function dimerOf({ vapour }, points) {
  if (vapour?.dimer === undefined) return '';
  const { sigma } = points.find(({ kind }) => kind === 'standard');
  return `${vapour.dimer.name}~${short(sigma, 2)}`;
}

function gasWithoutFloor({ vapour }, { nasa9, Cp_gas_points: gasPoints }) {
  if (vapour === undefined) return '';
  if (gasPoints === undefined || nasa9?.gas) return nasa9.gas;
  const [interval] = vapour.ideal.intervals;
  const cubic = interval.a.slice(2, 6).map((coefficient, power) => coefficient * 1000 ** power);
  return `=${interval.fromK},${interval.toK},${join(cubic, 7)}`;
}

function cited({ value, uncertainty, source, detail, confirmed }, citations) {
  const u = uncertainty === undefined ? '' : short(uncertainty, 2);
  return `${short(value, 9)},${u},${citations.place(source, detail)},${confirmed === false ? 0 : 1}`;
}

function constantsOf(record, citations) {
  const { name, Tm, Tb, Tc, Pc, acentric_factor: acentric } = record;
  const pascal = {
    ...Pc,
    value: Pc.value * 1e5,
    ...(Pc.uncertainty === undefined ? {} : { uncertainty: Pc.uncertainty * 1e5 }),
  };
  const carbonDioxide = name === 'carbon dioxide';
  const { molar_mass: mass } = record;
  const rows = [
    ['molar mass', { ...mass, value: mass.value / 1000 }],
    ['melting temperature', Tm],
    [carbonDioxide ? 'sublimation temperature' : 'boiling temperature', Tb],
    ['critical temperature', Tc],
    ['critical pressure', pascal],
    ['acentric factor', acentric],
  ];
  if (carbonDioxide) rows.push(...tripleOf(record));
  return rows.map(([item, from]) => `${item},${cited(from, citations)}`).join(';');
}

/** The melting temperature of carbon dioxide is that of its triple point, whose pressure is printed. */
function tripleOf({ Tm, vapour_pressure_points: points }) {
  const end = points.find(({ T_K, rejected }) => rejected === undefined && Math.abs(T_K - Tm.value) < 0.02);
  if (end === undefined) throw new Error('no triple pressure of carbon dioxide');
  return [
    ['triple temperature', Tm],
    ['triple pressure', { ...end, value: end.p_kPa * 1000, uncertainty: undefined }],
  ];
}

/** Least relative standard uncertainty of an enthalpy of fusion, and that of a value from memory. */
const FUSION_LEAST = 0.005;
const FUSION_UNCONFIRMED = 0.05;

/** The middle one of the prints, with half their spread. */
export function fusionOf({ check_values }) {
  const prints = (check_values.dHfus_at_Tm ?? []).filter(({ rejected }) => rejected === undefined);
  if (prints.length === 0) return undefined;
  const sorted = [...prints].sort((a, b) => a.value - b.value);
  const chosen = prints.length > 2 ? sorted[Math.floor((sorted.length - 1) / 2)] : prints[0];
  const spread = (sorted[sorted.length - 1].value - sorted[0].value) / 2;
  const least = chosen.confirmed === false ? FUSION_UNCONFIRMED : prints.length === 1 ? 0.01 : FUSION_LEAST;
  return {
    ...chosen,
    value: chosen.value * 1000,
    uncertainty: 1000 * Math.max(spread, least * chosen.value),
  };
}

function solidOf(models, { name, Cp_solid: solids, solid_density: density, molar_mass: molarMass }, citations) {
  const crystal = CRYSTALS[name];
  if (crystal !== undefined) {
    return `${models.nasa9Species(crystal).fromK},${crystal},${citations.place('nasa9')},1,1`;
  }
  const [first, colder] = solids;
  if (first === undefined) return '';
  const confirmed = solids.every((one) => one.confirmed) ? 1 : 0;
  const head = [first.value, citations.place(first.source, first.detail), confirmed];
  if (colder === undefined) return [SOLID_FROM_K, ...head, 0].join(',');
  const slope = (first.value - colder.value) / (first.T_K - colder.T_K);
  const volume = molarMass.value / 1000 / density.value;
  // the cited temperature of sublimation at one atmosphere agrees, as a test says
  return [colder.T_K, ...head, 1, short(slope, 4), first.T_K, short(volume, 4)].join(',');
}

function sourcesOf(points, kinds, citations) {
  const places = points
    .filter(({ kind }) => kinds.includes(kind))
    .map(({ source, detail }) => citations.place(source, detail?.length > 60 ? undefined : collectionOf(detail)));
  return [...new Set(places)].join(',');
}

/** Only the collection that a value was taken from belongs to its citation, not how a point was computed. */
function collectionOf(detail) {
  return detail !== undefined && /Yaws|VDI|Joback|CRC|NIST|Perry/.test(detail) ? detail : undefined;
}

function gasSourcesOf({ nasa9, Cp_gas_points: gasPoints }, citations) {
  if (nasa9?.gas) return String(citations.place('nasa9'));
  if (gasPoints === undefined) return '';
  return [...new Set(gasPoints.map(({ source }) => citations.place(source)))].join(',');
}

const PROPERTIES = { p: 'vapour pressure', latent: 'latent heat', cp: 'liquid heat capacity' };

/** Properties of which the confirmed values are too few to hold the curve: fewer than two besides the cold end. */
export function unconfirmedOf(points) {
  return Object.entries(PROPERTIES)
    .filter(([kind]) => {
      const own = points.filter((p) => p.kind === kind && !(p.source === 'perry2-8' || p.source === 'perry2-69'));
      return own.length > 0 && own.filter((p) => p.confirmed).length < (kind === 'p' ? 2 : 1);
    })
    .map(([, property]) => property);
}

function notesOf(record, fluid, points) {
  const notes = [...(record.notes ?? [])].map((note) => note.replace(/;/g, ','));
  notes.push(
    fluid.vapour === undefined
      ? 'No heat capacity of the ideal gas is in the catalogue, so paths end at the boiling point'
      : 'Latent heat, vapour pressure and heat capacities are fitted together, DISAGREEMENT gives what they differ by when fitted apart',
  );
  if (fluid.vapour?.dimer !== undefined) {
    notes.push('The vapour is a mixture of single molecules and pairs in equilibrium, per mole of single molecules');
  }
  const doubtful = unconfirmedOf(points);
  if (record.Cp_solid?.some(({ confirmed }) => !confirmed)) doubtful.push('solid heat capacity');
  if (doubtful.length > 0) notes.push(`Unconfirmed: ${doubtful.join(', ')}`);
  return notes;
}
