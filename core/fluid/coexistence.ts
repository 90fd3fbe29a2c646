import { Problem } from '../problem';
import type { Change, Curve } from '../substance';
import { fluidCurve } from './fluidCurve';
import { lineMarks, NO_MARKS, solidMarks, sublimationMarks } from './fluidMarks';
import { lacking, requireGas, type FluidParts } from './fluidParts';
import { spreadAt } from './spreadAt';

export type Answered = 'latent' | 'slope' | 'term';

/** The slope grows without bound at the critical point: it ends this far below, as a part of the critical temperature. */
const SLOPE_END = 1e-5;

const WORDS: Readonly<Record<Answered, string>> = { latent: '', slope: 'slope of ', term: 'pressure term of ' };
const METHODS: Readonly<Record<Answered, string>> = {
  latent:
    'fitted together with vapour pressure and liquid heat capacity (Clapeyron, enthalpy of the real vapour) to cited values',
  slope: 'derivative of the fitted latent heat along the saturation line',
  term: '[v − T(∂v/∂T)p]·dp/dT of vapour less that of liquid, from the equations of both',
};

/** Latent heat, its slope, or the part of the slope that is not a heat-capacity difference, along a two-phase line. */
export function coexistence(parts: FluidParts, change: Change, answered: Answered): Curve {
  if (change === 'vaporization') return vaporization(parts, answered);
  if (change === 'sublimation') return sublimation(parts, answered);
  if (change !== 'fusion') throw noSuchChange(parts, change);
  throw lacking(`volume change of melting of ${parts.numbers.name}, so fusion along its line`);
}

function vaporization(parts: FluidParts, answered: Answered): Curve {
  const { numbers, line, liquid } = parts;
  const { name, lineFromK, criticalK, vapourToK, spread } = numbers;
  const value = {
    latent: line.latent,
    slope: line.latentSlope,
    term: (k: number) => requireGas(parts).pressureTerm(k) - liquid.pressureTerm(k),
  }[answered];
  if (answered === 'term') requireGas(parts);
  const relative = (k: number): number => spreadAt(spread.nodes, spread.latent, k / criticalK);
  return fluidCurve({
    from: lineFromK,
    to: answered === 'latent' ? criticalK : answered === 'slope' ? criticalK * (1 - SLOPE_END) : vapourToK,
    subject: `${WORDS[answered]}vaporization of ${name} along its coexistence line`,
    unit: answered === 'latent' ? 'J/mol' : 'J/(mol K)',
    kind: 'coexistence',
    method: METHODS[answered],
    sources: numbers.sources.latent,
    value,
    marksAt: lineMarks(numbers, 'latent heat'),
    ...(answered === 'latent' ? { uncertaintyAt: (k: number) => relative(k) * line.latent(k) } : {}),
  });
}

function sublimation(parts: FluidParts, answered: Answered): Curve {
  const { numbers, solid, sublimation: line } = parts;
  const gas = requireGas(parts);
  if (solid === undefined || line === undefined) throw lacking(`heat capacity of solid ${numbers.name}`);
  const { name, fusion, criticalK, spread } = numbers;
  const latent = (k: number): number => gas.enthalpy(k, line.pressure(k)) - solid.enthalpy(k);
  const term = (k: number): number => {
    const h = 1e-3;
    const p = line.pressure(k);
    return ((gas.enthalpy(k, p * (1 + h)) - gas.enthalpy(k, p * (1 - h))) / (2 * h)) * line.lnSlope(k);
  };
  const slope = (k: number): number => gas.heatCapacity(k, line.pressure(k)) - solid.heatCapacity(k) + term(k);
  const marks = answered === 'slope' ? solidMarks(numbers) : sublimationMarks(numbers);
  const uncertainty = (k: number): number => {
    const vaporizing = spreadAt(spread.nodes, spread.latent, k / criticalK) * latent(k);
    const below = 0.1 * solid.heatCapacity(k) * (numbers.meltingK - k);
    return Math.hypot(vaporizing, fusion?.uncertainty ?? 0, below);
  };
  return fluidCurve({
    from: line.fromK,
    to: line.toK,
    subject: `${WORDS[answered]}sublimation of ${name} along its coexistence line`,
    unit: answered === 'latent' ? 'J/mol' : 'J/(mol K)',
    kind: 'coexistence',
    method:
      'enthalpy of the real vapour less that of the solid: enthalpy of fusion at the melting point, heat capacity of the solid below',
    sources: [
      ...new Set([
        ...numbers.sources.latent,
        ...(fusion === undefined ? [] : [fusion.source]),
        ...(numbers.solid === undefined ? [] : [numbers.solid.source]),
      ]),
    ],
    value: { latent, slope, term }[answered],
    // at the melting point the heat capacity plays no part in the latent heat
    marksAt: (k) => (answered === 'latent' && k === numbers.meltingK ? NO_MARKS : marks),
    ...(answered === 'latent' ? { uncertaintyAt: uncertainty } : {}),
  });
}

export function noSuchChange({ numbers }: FluidParts, change: Change): Problem {
  return new Problem({
    code: 'missing',
    subject: `${change} of ${numbers.name}`,
    reason: 'no such transition in the catalogue',
  });
}
