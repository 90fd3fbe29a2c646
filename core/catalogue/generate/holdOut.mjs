import { fitFluid } from './fitFluid.mjs';
import { cubicThrough, fluidOfRecord } from './fluidsOfRecords.mjs';
import { ELEMENTS, readRecords } from './fitAll.mjs';
import { loadModels, MODELS } from './loadModels.mjs';
import { majerPoints, readPoints } from './readPoints.mjs';
import { fittedAt, spreadOf } from './spreadOf.mjs';

/** The models of the fluids and the equation of state of water, which here plays a fluid with few data. */
export const loadForHoldOut = () => loadModels([...MODELS, 'fluid/spreadAt', 'water/saturationLine', 'water/idealGas']);

const SPREADS = { p: 'pressure', latent: 'latent', cp: 'heatCapacity' };

/** A fit against values that it has not seen: relative deviation, and the relative standard uncertainty it states there. */
function judged(models, fluid, fit, record, points, { kind, temperatureK, value }) {
  const reduced = temperatureK / fluid.criticalK;
  const spread = spreadOf(models, fluid, fit, record, points);
  return {
    name: fluid.name,
    kind,
    reduced,
    deviation: fittedAt(models, fluid, fit, kind, reduced) / value - 1,
    stated: models.spreadAt(spread.nodes, spread[SPREADS[kind]], reduced),
  };
}

/** Fluids with a calorimetric equation, fitted without it and compared with it over its range. */
export async function majerHoldOut(models) {
  const { fluids } = await readRecords();
  return fluids.flatMap((record) => {
    const majer = record.dHvap_correlation_majer_svoboda;
    if (majer === undefined) return [];
    const fluid = fluidOfRecord(models, record);
    const points = readPoints(models, record).filter(({ source }) => source !== majer.source);
    const fit = fitFluid(models, fluid, points);
    return majerPoints(majer, 9).map((unseen) => judged(models, fluid, fit, record, points, unseen));
  });
}

/** Every pressure and heat capacity inside the range of the others, left out with those at the same temperature. */
export async function leaveOneOut(models) {
  const { fluids } = await readRecords();
  return fluids
    .filter(({ name }) => !ELEMENTS.has(name))
    .flatMap((record) => {
      const fluid = fluidOfRecord(models, record);
      const points = readPoints(models, record);
      return points
        .filter((point) => isInner(point, points))
        .map((unseen) => {
          const rest = points.filter((point) => point.kind !== unseen.kind || !isNear(point, unseen));
          return judged(models, fluid, fitFluid(models, fluid, rest), record, rest, unseen);
        });
    });
}

const isNear = (a, b) => Math.abs(a.temperatureK - b.temperatureK) < 2;

function isInner(point, points) {
  if (point.kind !== 'p' && point.kind !== 'cp') return false;
  const others = points.filter(({ kind }) => kind === point.kind).filter((other) => !isNear(other, point));
  const ts = others.map(({ temperatureK }) => temperatureK);
  return Math.min(...ts) < point.temperatureK && point.temperatureK < Math.max(...ts);
}

const WATER = {
  criticalK: 647.096,
  criticalPa: 22.064e6,
  acentric: 0.344292,
  meltingK: 273.16,
  molarMass: 0.018015268,
};

/** Water fitted from as few values as a fluid has, read from its equation of state, and compared with that. */
export function waterHoldOut(models) {
  const { molarMass } = WATER;
  const exact = (kind, temperatureK) => {
    const { liquid, vapour, pressure } = models.saturationAt(temperatureK);
    if (kind === 'p') return pressure;
    return molarMass * (kind === 'cp' ? liquid.cp : vapour.enthalpy - liquid.enthalpy);
  };
  const value = (kind, sigma) => (temperatureK) => ({
    kind,
    temperatureK,
    sigma,
    value: exact(kind, temperatureK),
    source: 'R6-95',
    confirmed: true,
  });
  const points = [
    value('p', 0.025)(273.16),
    ...[290.6, 306, 319, 333.2, 354.5, 373.12, 384.5, 393.4].map(value('p', 0.006)),
    value('latent', 0.01)(273.16),
    value('latent', 0.006)(373.12),
    value('latent', 0.005)(298.15),
    value('cp', 0.006)(298.15),
    ...[273.16, 480].map(value('cp', 0.008)),
  ];
  const gas = [298.15, 350, 400, 450, 500, 600, 800].map((k) => ({
    T_K: k,
    value: molarMass * models.idealGasHeatCapacity(k),
  }));
  const ideal = models.gasFromPoints('water', molarMass, cubicThrough(models, gas), 298.15, 800);
  const fluid = {
    ...WATER,
    name: 'water',
    class: 'bonded',
    idealFromK: 298.15,
    vapour: { ...WATER, polar: 0, bonding: 0, ideal },
  };
  const fit = fitFluid(models, fluid, points);
  const record = { Tc: { uncertainty: 0.1 }, Pc: { uncertainty: 0.1, value: 220.64 } };
  return ['p', 'latent', 'cp'].flatMap((kind) =>
    Array.from({ length: 11 }, (_, i) => 0.45 + 0.045 * i)
      .filter((reduced) => kind !== 'cp' || reduced < 0.86)
      .map((reduced) => judged(models, fluid, fit, record, points, value(kind, 0)(reduced * WATER.criticalK))),
  );
}
