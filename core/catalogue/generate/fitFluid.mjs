import { leastSquares } from './leastSquares.mjs';

/** Unknowns in their order: Wagner's terms, latent heat, liquid enthalpy, polar term of the vapour. */
const PRESSURE = 0;
const LATENT = 5;
const LIQUID = 11;
const POLAR = 18;
const BONDING = 19;
const SIZE = 20;

/** For a vapour in pairs: shifts of the enthalpy of pairing, kJ/mol, and of ln K, in the place of the two terms. */
const PAIRS = { polar: [0, 4], bonding: [0, 0.4] };

/**
 * How far a class of fluids may leave corresponding states: mean and standard deviation of the polar and the bonding term,
 * curvature of the ratio to corresponding states for latent heat and pressure, share of the departure that is unsure.
 */
const CLASSES = {
  normal: {
    polar: [0, 0.0005],
    bonding: [0, 1e-6],
    bend: 0.25,
    pressureBend: 0.25,
    vapour: 0.008,
    freedom: 1,
    heatBend: 0.006,
  },
  polar: {
    polar: [0.006, 0.006],
    bonding: [0, 1e-6],
    bend: 1,
    pressureBend: 0.6,
    vapour: 0.015,
    freedom: 1.5,
    heatBend: 0.012,
  },
  strong: {
    polar: [0.035, 0.01],
    bonding: [0, 1e-6],
    bend: 1.5,
    pressureBend: 0.8,
    vapour: 0.02,
    freedom: 1.5,
    heatBend: 0.012,
  },
  nitrile: {
    polar: [0.1, 0.02],
    bonding: [0, 1e-6],
    bend: 2,
    pressureBend: 0.8,
    vapour: 0.03,
    freedom: 1.5,
    heatBend: 0.012,
  },
  bonded: {
    polar: [0.016, 0.006],
    bonding: [0.0001, 0.0001],
    bend: 2.5,
    pressureBend: 1,
    vapour: 0.02,
    freedom: 1.5,
    heatBend: 0.015,
  },
  alcohol: {
    polar: [0, 0.004],
    bonding: [0.003, 0.0015],
    bend: 5,
    pressureBend: 1.5,
    vapour: 0.03,
    freedom: 8,
    heatBend: 0.06,
  },
};

const GRID_FROM = 0.2;

/**
 * Fits saturation pressure, heat of vaporization and liquid enthalpy of one fluid together, so that they agree: Clapeyron's
 * equation and h(vapour) − h(liquid) = ΔHvap are kept on a grid of temperatures, each as well as the vapour is known there.
 *
 * @param models the bundled models of core/fluid
 * @param fluid constants, class, ideal gas and dimer where known
 * @param points from `readPoints`
 * @param joint false: latent heat and heat capacities are fitted without each other
 */
export function fitFluid(models, fluid, points, joint = true) {
  const pairs = fluid.vapour?.dimer === undefined ? {} : PAIRS;
  const { expectedPolar: expected } = fluid;
  const polar = expected === undefined ? {} : { polar: [expected, 0.25 * expected + 0.001] };
  const kind = { ...CLASSES[fluid.class], ...polar, ...pairs };
  let state = start(models, fluid, kind);
  for (let round = 0; round < ROUNDS; round++) {
    const rows = [
      ...priors(models, fluid, kind, state),
      ...smoothHeat(models, fluid, kind, points),
      ...points.flatMap((p) => dataRow(models, fluid, state, p)).map((row) => tempered(row, state)),
      ...(joint ? [...clapeyron(models, fluid, kind, state), ...closure(models, fluid, kind, state)] : []),
    ];
    if (!joint) rows.push(...splitRows(models, fluid, kind, state));
    const { x, covariance } = leastSquares(rows, SIZE);
    state = unpack(x, covariance);
  }
  const rows = {
    pressure: (t) => withTerms(PRESSURE, pressureBasis(models, t)),
    latent: (t) => withTerms(LATENT, latentBasis(models, t)),
    liquid: (t) => withTerms(LIQUID, liquidBasis(models, t)),
    heatCapacity: (t) => withTerms(LIQUID, liquidSlopeBasis(models, t)),
  };
  return { ...state, liquid: joint ? refined(models, fluid, state) : extended(models, state.liquid), rows };
}

const ROUNDS = 12;

/** Degrees of freedom of the t distribution that the errors of cited points are taken from: one bad print moves little. */
const FREEDOM = 3;

function tempered({ row, value, sigma }, { x }) {
  if (x === undefined) return { row, value, sigma };
  const residual = (row.reduce((sum, element, i) => sum + element * x[i], 0) - value) / sigma;
  return { row, value, sigma: sigma * Math.sqrt((FREEDOM + residual * residual) / (FREEDOM + 1)) };
}

function unpack(x, covariance) {
  return {
    x,
    covariance,
    pressure: x.slice(PRESSURE, LATENT),
    latent: x.slice(LATENT, LIQUID),
    liquid: x.slice(LIQUID, POLAR),
    polar: x[POLAR],
    bonding: x[BONDING],
  };
}

/** Vapour-pressure terms of Ambrose and Walton for an acentric factor. */
export function ambroseWalton(w) {
  return [
    -5.97616 - 5.03365 * w - 0.64771 * w * w,
    1.29874 + 1.11505 * w + 2.41539 * w * w,
    -0.60394 - 5.41217 * w - 4.26979 * w * w,
    -1.06841 - 7.46628 * w + 3.25259 * w * w,
    0,
  ];
}

function start(models, { acentric }, kind) {
  return {
    pressure: ambroseWalton(acentric),
    latent: null,
    liquid: null,
    polar: kind.polar[0],
    bonding: kind.bonding[0],
  };
}

const empty = () => new Array(SIZE).fill(0);

const pressureBasis = (models, t) => models.PRESSURE_POWERS.map((e) => (1 - t) ** e / t);
const latentBasis = (models, t) => models.LATENT_POWERS.map((e) => (1 - t) ** e);
const latentSlopeBasis = (models, t) => models.LATENT_POWERS.map((e) => -e * (1 - t) ** (e - 1));
const liquidBasis = (models, t) => {
  const s = models.liquidVariable(t);
  return [Math.cbrt(1 - t), Math.cbrt(1 - t) ** 2, 1, s, s * s, s ** 3, s ** 4];
};
const liquidSlopeBasis = (models, t) => {
  const s = models.liquidVariable(t);
  const third = Math.cbrt(1 - t);
  const step = models.liquidVariable(1) - models.liquidVariable(0);
  return [-1 / (3 * third * third), -2 / (3 * third), 0, 1, 2 * s, 3 * s * s, 4 * s ** 3].map((slope, i) =>
    i < 2 ? slope : slope * step,
  );
};

function withTerms(offset, terms, row = empty(), factor = 1) {
  terms.forEach((term, i) => (row[offset + i] += term * factor));
  return row;
}

/** Reduced pressure on the line of the present round. */
const reducedPressure = (models, state, t) => Math.exp(models.lnReducedPressure(state.pressure, t));

/** Grid of reduced temperatures from the melting point to near the critical one. */
function grid({ meltingK, criticalK }, to, step = 0.03) {
  const from = Math.max(GRID_FROM, meltingK / criticalK);
  const count = Math.max(2, Math.round((to - from) / step));
  return Array.from({ length: count + 1 }, (_, i) => from + ((to - from) * i) / count);
}

/** Latent heat of corresponding states after Lee and Kesler with Ambrose and Walton's line, divided by R·Tc. */
export function latentOfCorrespondingStates(models, w, t) {
  const p = Math.exp(models.lnReducedPressure(ambroseWalton(w), t));
  const out = models.emptyDeparture();
  if (!models.vapourDeparture(t, p, w, 0, 0, out)) return undefined;
  const liquid = models.liquidVolume(w, t, models.emptyLiquidVolume());
  const gap = out.compressibility - (p * liquid.volume) / t;
  return gap * models.lnPressureSlope(ambroseWalton(w), t) * t * t;
}

function priors(models, fluid, kind, state) {
  const rows = [];
  const { acentric: w } = fluid;
  const mean = ambroseWalton(w);
  const scales = [0.8, 2, 4, 8 * kind.freedom, 2 * kind.freedom ** 2];
  mean.forEach((value, i) => {
    const row = empty();
    row[PRESSURE + i] = 1;
    rows.push({ row, value, sigma: scales[i] });
  });
  // the difference from corresponding states bends little between the boiling and the critical point
  const ts = Array.from({ length: 12 }, (_, i) => 0.45 + 0.05 * i);
  for (let i = 1; i < ts.length - 1; i++) {
    const h = ts[i + 1] - ts[i];
    const row = withTerms(
      PRESSURE,
      [ts[i - 1], ts[i], ts[i + 1]]
        .map((t) => pressureBasis(models, t))
        .reduce((sum, b, k) => sum.map((s, j) => s + b[j] * [1, -2, 1][k]), [0, 0, 0, 0, 0]),
    );
    const value = row.slice(PRESSURE, LATENT).reduce((sum, b, j) => sum + b * mean[j], 0);
    rows.push({ row, value, sigma: kind.pressureBend * h * h * 2 * (ts[i] < 0.7 ? 10 : 1) });
  }
  // the ratio to corresponding states changes slowly with temperature
  const us = Array.from({ length: 24 }, (_, i) => 0.28 + 0.03 * i).filter(
    (t) => t <= 0.97 && latentOfCorrespondingStates(models, w, t) !== undefined,
  );
  const ratio = us.map((t) => {
    const reference = latentOfCorrespondingStates(models, w, t);
    return latentBasis(models, t).map((b) => b / reference);
  });
  for (let i = 1; i < us.length - 1; i++) {
    const h = us[i + 1] - us[i];
    const second = ratio[i].map((_, j) => ratio[i - 1][j] - 2 * ratio[i][j] + ratio[i + 1][j]);
    rows.push({ row: withTerms(LATENT, second), value: 0, sigma: kind.bend * h * h * 2 * (us[i] < 0.75 ? 2.5 : 1) });
  }
  for (let i = 0; i < us.length; i += 3) {
    rows.push({ row: withTerms(LATENT, ratio[i]), value: 1, sigma: 0.15 });
  }
  models.LATENT_POWERS.forEach((_, i) => {
    const row = empty();
    row[LATENT + i] = 1;
    rows.push({ row, value: i === 0 ? 6.5 + 5 * w : 0, sigma: [3, 12, 12, 12, 12, 12][i] * kind.freedom });
  });
  // vapour and liquid approach their common enthalpy alike
  const half = empty();
  half[LIQUID] = 1;
  half[LATENT] = 0.45;
  rows.push({ row: half, value: 0, sigma: 0.3 });
  [3, 1e4, 40, 10, 4, 2].forEach((sigma, i) => {
    const row = empty();
    row[LIQUID + 1 + i] = 1;
    rows.push({ row, value: 0, sigma: i < 2 ? sigma : sigma * kind.freedom });
  });
  [kind.polar, kind.bonding].forEach(([value, sigma], i) => {
    const row = empty();
    row[POLAR + i] = 1;
    rows.push({ row, value, sigma });
  });
  return rows;
}

/** Apart from its rise at the critical point a liquid's heat capacity bends upwards, and little: this part of itself over a step. */
const HEAT_BEND = 0.006;
const HEAT_STEP = 0.06;

function smoothHeat(models, fluid, kind, points) {
  const known = points.filter(({ kind: of }) => of === 'cp').map(({ value }) => value / models.MOLAR_GAS_CONSTANT);
  if (known.length === 0) return [];
  const scale = known.sort((a, b) => a - b)[Math.floor(known.length / 2)];
  const rows = [];
  for (let t = fluid.meltingK / fluid.criticalK + HEAT_STEP; t < 0.8; t += HEAT_STEP / 2) {
    const [before, here, after] = [-HEAT_STEP, 0, HEAT_STEP].map((h) => liquidSlopeBasis(models, t + h));
    const row = withTerms(
      LIQUID,
      here.map((element, i) => (i < 2 ? 0 : before[i] - 2 * element + after[i])),
    );
    rows.push({ row, value: HEAT_BEND * scale, sigma: kind.heatBend * scale });
  }
  return rows;
}

/** The model of the vapour with its two fitted terms. */
export function vapourWith({ vapour }, { polar, bonding }) {
  return vapour.dimer === undefined
    ? { ...vapour, polar, bonding }
    : { ...vapour, pairing: { heat: 1000 * polar, lnConstant: bonding } };
}

/** The vapour on the line, with the derivatives of its compressibility and enthalpy by the two terms of attraction. */
function vapourOnLine(models, fluid, state, t) {
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

/** (v − T·dv/dT)·dp/dT of the saturated liquid, divided by R. */
function liquidTerm(models, fluid, state, t) {
  const p = reducedPressure(models, state, t);
  const v = models.liquidVolume(fluid.acentric, t, models.emptyLiquidVolume());
  return (v.volume - t * v.first) * p * models.lnPressureSlope(state.pressure, t);
}

function dataRow(models, fluid, state, { kind, temperatureK, value, sigma }) {
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
  vapour.by.forEach((by, i) => (row[POLAR + i] -= by.enthalpy / rc));
  return [{ row, value: reduced + fixed / rc, sigma: sigma * reduced }];
}

/** Where the vapour is known well: its ideal gas has data, and the departure is small. */
function clapeyron(models, fluid, kind, state) {
  const rows = [];
  for (const t of grid(fluid, 0.955)) {
    const v = vapourOnLine(models, fluid, state, t);
    if (v === undefined) continue;
    const liquid = models.liquidVolume(fluid.acentric, t, models.emptyLiquidVolume());
    const gap = v.compressibility - (v.pressure * liquid.volume) / t;
    const psi = t * t * models.lnPressureSlope(state.pressure, t);
    // latent = gap·psi, both linear in their unknowns around the present round
    const row = withTerms(LATENT, latentBasis(models, t));
    const slopes = pressureBasis(models, t).map((_, i) => psiOf(models, i, t));
    withTerms(PRESSURE, slopes, row, -gap);
    v.by.forEach((by, i) => (row[POLAR + i] -= by.compressibility * psi));
    const value = -(v.by[0].compressibility * state.polar + v.by[1].compressibility * state.bonding) * psi;
    const latent = gap * psi;
    const real = 1 - v.compressibility;
    const sigma = latent * Math.hypot(0.002, kind.vapour * real, (t > 0.92 ? 0.2 : 0.06) * real * real) * 1.4;
    rows.push({ row, value, sigma });
  }
  return rows;
}

/** Tr²·d/dTr of the i-th pressure term: the slope against −1/Tr. */
function psiOf(models, i, t) {
  const e = models.PRESSURE_POWERS[i];
  const x = 1 - t;
  return -(e * x ** (e - 1) * t + x ** e);
}

/** h(liquid) + latent = h(vapour) on the line. */
function closure(models, fluid, kind, state) {
  if (fluid.vapour === undefined) return [];
  const rc = models.MOLAR_GAS_CONSTANT * fluid.criticalK;
  const rows = [];
  for (const t of grid(fluid, 0.955)) {
    const v = vapourOnLine(models, fluid, state, t);
    if (v === undefined) continue;
    const temperatureK = t * fluid.criticalK;
    const departure = v.enthalpy - models.nasa9Enthalpy(fluid.vapour.ideal, temperatureK);
    const row = withTerms(LIQUID, liquidBasis(models, t), withTerms(LATENT, latentBasis(models, t)));
    v.by.forEach((by, i) => (row[POLAR + i] -= by.enthalpy / rc));
    const value = (v.enthalpy - v.by[0].enthalpy * state.polar - v.by[1].enthalpy * state.bonding) / rc;
    const cold = Math.max(0, fluid.idealFromK - temperatureK);
    const pairs = fluid.vapour.dimer === undefined ? 0 : 100;
    const sigma = (Math.hypot(4, pairs, 3.6 * kind.vapour * departure, 0.15 * cold) * 1.6) / rc;
    rows.push({ row, value, sigma });
  }
  return rows;
}

const extended = (models, liquid) => [...liquid, ...new Array(models.LIQUID_DEGREE + 3 - liquid.length).fill(0)];

/** Where the vapour lacks this much of ideal volume, half of what is left of the closure is its, and half the liquid's. */
const HALF_SHARE = 0.01;

/**
 * Terms of the saturated liquid to `LIQUID_DEGREE`, which take over what is left of h(vapour) − latent − h(liquid) where the
 * vapour is nearly ideal and so cannot be the cause.
 */
function refined(models, fluid, state) {
  const full = extended(models, state.liquid);
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

/** Without the joint rows the liquid enthalpy still needs a zero and the vapour a mean. */
function splitRows() {
  const row = empty();
  row[LIQUID + 2] = 1;
  return [{ row, value: 0, sigma: 1 }];
}
