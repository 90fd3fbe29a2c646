import { latentBasis, liquidSlopeBasis, pressureBasis } from './bases.mjs';
import { ambroseWalton, latentOfCorrespondingStates } from './correspondingStates.mjs';
import { ATTRACTION, LATENT, LIQUID, PRESSURE, rowOf, withTerms } from './unknowns.mjs';

/** What is expected before any value is seen: corresponding states, and smooth departures from them. */
export function priorRows(models, fluid, kind, points) {
  return [
    ...pressureRows(models, fluid, kind),
    ...latentRows(models, fluid, kind),
    ...liquidRows(kind),
    ...heatCapacityRows(models, fluid, kind, points),
    ...[kind.polar, kind.bonding].map(([value, sigma], i) => ({ row: rowOf(ATTRACTION + i), value, sigma })),
  ];
}

/** Second difference of three lists, element by element. */
const bendOf = ([before, here, after]) => here.map((element, i) => before[i] - 2 * element + after[i]);

/** Up to here cited pressures hold the curve, beyond it only its form does. */
const HELD_TO = 0.7;

/** The difference from corresponding states bends little, least so between the boiling and the critical point. */
function pressureRows(models, { acentric }, kind) {
  const mean = ambroseWalton(acentric);
  const scales = [0.8, 2, 4, 8 * kind.freedom, 2 * kind.freedom ** 2];
  const rows = mean.map((value, i) => ({ row: rowOf(PRESSURE + i), value, sigma: scales[i] }));
  const step = 0.05;
  for (let i = 1; i < 11; i++) {
    const t = 0.45 + step * i;
    const bend = bendOf([t - step, t, t + step].map((at) => pressureBasis(models, at)));
    const value = bend.reduce((sum, element, j) => sum + element * mean[j], 0);
    const sigma = 2 * kind.pressureBend * step * step * (t < HELD_TO ? 10 : 1);
    rows.push({ row: withTerms(PRESSURE, bend), value, sigma });
  }
  return rows;
}

/** Terms stay of this size, whatever the values say. */
const LATENT_SCALES = [3, 12, 12, 12, 12, 12];

/** The ratio to corresponding states changes slowly with temperature, most slowly near the critical point. */
function latentRows(models, { acentric }, kind) {
  const step = 0.03;
  const ratios = Array.from({ length: 24 }, (_, i) => 0.28 + step * i)
    .filter((t) => t <= 0.97)
    .flatMap((t) => {
      const reference = latentOfCorrespondingStates(models, acentric, t);
      return reference === undefined ? [] : [{ t, terms: latentBasis(models, t).map((b) => b / reference) }];
    });
  const rows = [];
  for (let i = 1; i < ratios.length - 1; i++) {
    const bend = bendOf(ratios.slice(i - 1, i + 2).map(({ terms }) => terms));
    const sigma = 2 * kind.bend * step * step * (ratios[i].t < 0.75 ? 2.5 : 1);
    rows.push({ row: withTerms(LATENT, bend), value: 0, sigma });
  }
  for (let i = 0; i < ratios.length; i += 3) {
    rows.push({ row: withTerms(LATENT, ratios[i].terms), value: 1, sigma: 0.15 });
  }
  models.LATENT_POWERS.forEach((_, i) => {
    rows.push({
      row: rowOf(LATENT + i),
      value: i === 0 ? 6.5 + 5 * acentric : 0,
      sigma: LATENT_SCALES[i] * kind.freedom,
    });
  });
  return rows;
}

/** Of the term τ^(1/3) of the latent heat nearly half is the liquid's: vapour and liquid approach their common enthalpy alike. */
const LIQUID_SHARE = 0.45;

/** Of τ^(2/3) and the powers of s; the constant is free. */
const LIQUID_SCALES = [3, 1e4, 40, 10, 4, 2];

function liquidRows(kind) {
  const half = withTerms(LATENT, [LIQUID_SHARE], rowOf(LIQUID));
  return [
    { row: half, value: 0, sigma: 0.3 },
    ...LIQUID_SCALES.map((scale, i) => ({
      row: rowOf(LIQUID + 1 + i),
      value: 0,
      sigma: i < 2 ? scale : scale * kind.freedom,
    })),
  ];
}

/** Apart from its rise at the critical point a liquid's heat capacity bends upwards, and little: this part of itself over a step. */
const HEAT_BEND = 0.006;
const HEAT_STEP = 0.06;

function heatCapacityRows(models, fluid, kind, points) {
  const known = points.filter(({ kind: of }) => of === 'cp').map(({ value }) => value / models.MOLAR_GAS_CONSTANT);
  if (known.length === 0) return [];
  const scale = known.sort((a, b) => a - b)[Math.floor(known.length / 2)];
  const rows = [];
  for (let t = fluid.meltingK / fluid.criticalK + HEAT_STEP; t < 0.8; t += HEAT_STEP / 2) {
    const bend = bendOf([-HEAT_STEP, 0, HEAT_STEP].map((h) => liquidSlopeBasis(models, t + h)));
    const row = withTerms(LIQUID, [0, 0, ...bend.slice(2)]);
    rows.push({ row, value: HEAT_BEND * scale, sigma: kind.heatBend * scale });
  }
  return rows;
}
