/**
 * The points of one fluid that the fit uses, each with the relative standard deviation that it is given there.
 *
 * `p`: pressure in Pa; `latent`: real vapour at saturation, J/mol; `standard`: ideal gas minus liquid, J/mol; `cp`: liquid at
 * saturation, J/(mol K). Rejected prints are in no fit.
 */
export function readPoints(models, record) {
  return [...pressures(record), ...latents(record), ...heatCapacities(record), ...liquidOfNasa9(models, record)];
}

const usable = (value) => value !== undefined && value.rejected === undefined;

/** What memory alone stands behind is given this many times the deviation. */
const UNCONFIRMED = 2.5;

function point(kind, temperatureK, value, sigma, from) {
  const confirmed = from.confirmed !== false;
  return {
    kind,
    temperatureK,
    value,
    sigma: confirmed ? sigma : sigma * UNCONFIRMED,
    source: from.source,
    detail: from.detail,
    confirmed,
  };
}

function pressures({ vapour_pressure_points: points, Tc, Tb, name }) {
  const read = points
    .filter(usable)
    .filter(({ T_K }) => T_K < 0.995 * Tc.value)
    .map((from) => point('p', from.T_K, from.p_kPa * 1000, deviationOfPressure(from), from));
  if (name === 'carbon dioxide') return read;
  const covered = read.some(({ temperatureK }) => Math.abs(temperatureK - Tb.value) < 3);
  return [...read, point('p', Tb.value, 101325, covered ? 0.008 : 0.006, Tb)];
}

/** Equations fitted to measurements; end points of a handbook's correlation, extrapolated the more the lower they lie. */
function deviationOfPressure({ source, p_kPa }) {
  if (source !== 'perry2-8') return 0.005 * Math.hypot(1, Math.log(p_kPa / 60) / 1.2);
  if (p_kPa > 5) return 0.01;
  return p_kPa > 0.1 ? 0.025 : p_kPa > 1e-3 ? 0.08 : p_kPa > 1e-4 ? 0.2 : 0.5;
}

/** The same of the enthalpy of vaporization that goes with such an end point. */
function deviationOfEnd({ T_K }, points) {
  const end = points.find((from) => from.source === 'perry2-8' && Math.abs(from.T_K - T_K) < 1);
  const p = end?.p_kPa ?? 1;
  return p > 0.1 ? 0.01 : p > 1e-3 ? 0.015 : p > 1e-4 ? 0.03 : 0.06;
}

function latents({
  vapour_pressure_points,
  dHvap_points,
  check_values,
  dHvap_correlation_majer_svoboda: majer,
  Tb,
  name,
}) {
  const read = [];
  for (const from of dHvap_points.filter(usable)) {
    read.push(point('latent', from.T_K, from.value * 1000, deviationOfEnd(from, vapour_pressure_points), from));
  }
  const atTb = (check_values.dHvap_at_Tb ?? []).filter(usable);
  if (name !== 'carbon dioxide') {
    for (const from of atTb) {
      read.push(point('latent', from.T_K ?? Tb.value, from.value * 1000, 0.006 * Math.sqrt(atTb.length), from));
    }
  }
  for (const from of (check_values.dHvap_298_15 ?? []).filter(usable)) {
    const standard = /standard enthalpy|monomeric/.test(from.note ?? '');
    const stated = from.uncertainty === undefined ? 0.005 : Math.max(0.003, from.uncertainty / from.value);
    read.push(point(standard ? 'standard' : 'latent', 298.15, from.value * 1000, stated, from));
  }
  for (const from of (check_values.dHvap_other_T ?? []).filter(usable)) {
    read.push(point('latent', from.T_K, from.value * 1000, 0.006, from));
  }
  if (majer !== undefined) read.push(...majerPoints(majer));
  return read;
}

const MAJER_POINTS = 6;

/** The correlation of calorimetric values by Majer and Svoboda, read at equal steps over its range. */
export function majerPoints(majer, count = MAJER_POINTS) {
  const { A, alpha, beta, Tc_K, Tmin_K, Tmax_K } = majer;
  return Array.from({ length: count }, (_, i) => {
    const t = Tmin_K + ((Tmax_K - Tmin_K) * i) / (count - 1);
    const reduced = t / Tc_K;
    const value = 1000 * A * Math.exp(-alpha * reduced) * (1 - reduced) ** beta;
    return point('latent', t, value, 0.003 * Math.sqrt(count / 2), majer);
  });
}

function heatCapacities({ Cp_liquid, Tc }) {
  return (Cp_liquid.values ?? [])
    .filter(usable)
    .filter(({ T_K }) => T_K < 0.97 * Tc.value)
    .map((from) => point('cp', from.T_K, from.value, deviationOfHeatCapacity(from.T_K / Tc.value, from), from));
}

/** End points of a handbook's correlation are worse; near the critical point it matters along which path they were meant. */
function deviationOfHeatCapacity(reduced, { source }) {
  if (source !== 'perry2-72') return 0.006;
  return reduced < 0.8 ? 0.008 : reduced < 0.85 ? 0.03 : 0.12;
}

const LIQUID_POINTS = 6;

/** Heat capacities of a liquid of the nine-coefficient data, read at equal steps between melting point and 0.8 Tc. */
function liquidOfNasa9(models, { nasa9, Tm, Tc }) {
  if (!nasa9?.liquid) return [];
  const liquid = models.nasa9Species(nasa9.liquid);
  const from = Math.max(liquid.fromK, Tm.value);
  const to = Math.min(liquid.toK, 0.8 * Tc.value);
  return Array.from({ length: LIQUID_POINTS }, (_, i) => {
    const t = from + ((to - from) * i) / (LIQUID_POINTS - 1);
    return point('cp', t, models.nasa9Cp(liquid, t), 0.008 * Math.sqrt(LIQUID_POINTS / 2), { source: 'nasa9' });
  });
}
