import type { Mark } from '../answer';
import type { Curve, Surface } from '../substance';
import { CRITICAL_TEMPERATURE_K } from './fluidCoefficients';
import {
  fastLiquidVapourPressure,
  fastLiquidVapourTemperature,
  fastSublimationPressure,
  fastSublimationTemperature,
} from './fastLines';
import { COLDEST_LIQUID_K, COLDEST_VAPOUR_K, TRIPLE_K, TRIPLE_PRESSURE_PA } from './ranges';
import { CRITICAL_PRESSURE_PA } from './saturationAuxiliary';
import { R10_06, R6_95 } from './sources';

const SUPERCOOLED: readonly Mark[] = [
  { code: 'metastable', text: 'vapour pressure of supercooled liquid: ice is the stable phase here' },
];
const NO_MARKS: readonly Mark[] = [];
const METHOD = 'equal pressure and Gibbs energy of both phases';

interface Side {
  readonly from: number;
  readonly to: number;
  readonly subject: string;
  readonly sources: readonly string[];
}

const sides: Readonly<Record<Surface, Side>> = {
  stable: { from: COLDEST_VAPOUR_K, to: CRITICAL_TEMPERATURE_K, subject: 'water', sources: [R6_95, R10_06] },
  ice: { from: COLDEST_VAPOUR_K, to: TRIPLE_K, subject: 'ice', sources: [R6_95, R10_06] },
  liquid: { from: COLDEST_LIQUID_K, to: CRITICAL_TEMPERATURE_K, subject: 'liquid water', sources: [R6_95] },
};

const pressureOf: Readonly<Record<Surface, (temperatureK: number) => number>> = {
  stable: (t) => (t < TRIPLE_K ? fastSublimationPressure(t) : fastLiquidVapourPressure(t)),
  ice: fastSublimationPressure,
  liquid: fastLiquidVapourPressure,
};

const temperatureOf: Readonly<Record<Surface, (pressurePa: number) => number>> = {
  stable: (p) => (p < TRIPLE_PRESSURE_PA ? fastSublimationTemperature(p) : fastLiquidVapourTemperature(p)),
  ice: fastSublimationTemperature,
  liquid: fastLiquidVapourTemperature,
};

function pressureCurve(surface: Surface): Curve {
  const { from, to, subject, sources } = sides[surface];
  const at = pressureOf[surface];
  return {
    axis: 'temperature',
    from,
    to,
    subject: `saturation pressure of ${subject}`,
    unit: 'Pa',
    method: METHOD,
    sources,
    at: (t) => (t >= from && t <= to ? at(t) : Number.NaN),
    marksAt: (t) => (surface === 'liquid' && t < TRIPLE_K ? SUPERCOOLED : NO_MARKS),
  };
}

function temperatureCurve(surface: Surface): Curve {
  const side = sides[surface];
  const from = pressureOf[surface](side.from);
  const to = side.to === TRIPLE_K ? TRIPLE_PRESSURE_PA : CRITICAL_PRESSURE_PA;
  const at = temperatureOf[surface];
  return {
    axis: 'pressure',
    from,
    to,
    subject: `saturation temperature of ${side.subject}`,
    unit: 'K',
    method: METHOD,
    sources: side.sources,
    at: (p) => (p >= from && p <= to ? at(p) : Number.NaN),
    marksAt: (p) => (surface === 'liquid' && p < TRIPLE_PRESSURE_PA ? SUPERCOOLED : NO_MARKS),
  };
}

const pressures: Partial<Record<Surface, Curve>> = {};
const temperatures: Partial<Record<Surface, Curve>> = {};

/** Pressure of the two-phase line with vapour: of the stable condensed phase, or of ice or liquid by force. */
export function saturationPressureCurve(surface: Surface): Curve {
  return (pressures[surface] ??= pressureCurve(surface));
}

/** Temperature of the two-phase line with vapour at a pressure: the inverse of the saturation pressure. */
export function saturationTemperatureCurve(surface: Surface): Curve {
  return (temperatures[surface] ??= temperatureCurve(surface));
}
