import type { Curve, Surface } from '../substance';
import { fluidCurve } from './fluidCurve';
import { lineMarks, sublimationMarks } from './fluidMarks';
import { lacking, requireGas, type FluidParts } from './fluidParts';
import { spreadAt } from './spreadAt';

const METHOD = 'fitted together with latent heat and liquid heat capacity to cited pressures (Wagner form)';
/** Relative standard uncertainty over the solid where a printed temperature of sublimation agrees, and its growth away from there, 1/K. */
const CITED_SPREAD = 0.0025;
const CITED_GROWTH = 0.00015;

const SOLID_METHOD = 'Clapeyron from the triple point down, with the enthalpies of vapour and solid';

/** Pressure of the two-phase line with vapour: over the stable phase, or over solid or liquid by force. */
export function saturationPressure(parts: FluidParts, surface: Surface): Curve {
  const { numbers, line, sublimation } = parts;
  const { name, lineFromK, meltingK, criticalK, spread } = numbers;
  const relative = (k: number): number => spreadAt(spread.nodes, spread.pressure, k / criticalK);
  const shared = { unit: 'Pa', sources: numbers.sources.pressure } as const;
  if (surface === 'liquid' || (surface === 'stable' && sublimation === undefined)) {
    return fluidCurve({
      ...shared,
      from: surface === 'liquid' ? lineFromK : meltingK,
      to: criticalK,
      subject: `saturation pressure of ${surface === 'liquid' ? 'liquid ' : ''}${name}`,
      method: METHOD,
      value: line.pressure,
      uncertaintyAt: (k) => relative(k) * line.pressure(k),
      marksAt: lineMarks(numbers, 'vapour pressure'),
    });
  }
  if (sublimation === undefined) throw noIce(parts);
  const overSolid = surface === 'ice';
  const frostMarks = sublimationMarks(numbers);
  const boilingMarks = lineMarks(numbers, 'vapour pressure');
  const { sublimesAtK } = numbers;
  const overSolidSpread = (k: number): number =>
    sublimesAtK !== undefined && numbers.solid?.lineConfirmed === true
      ? CITED_SPREAD + CITED_GROWTH * Math.abs(k - sublimesAtK)
      : Math.hypot(relative(k), 0.01 + 0.001 * (meltingK - k));
  const value = (k: number): number => (k < meltingK ? sublimation.pressure(k) : line.pressure(k));
  return fluidCurve({
    ...shared,
    from: sublimation.fromK,
    to: overSolid ? meltingK : criticalK,
    subject: `saturation pressure of ${overSolid ? 'solid ' : ''}${name}`,
    method: overSolid ? SOLID_METHOD : `${METHOD}; below the melting point: ${SOLID_METHOD}`,
    value,
    uncertaintyAt: (k) => value(k) * (k < meltingK ? overSolidSpread(k) : relative(k)),
    marksAt: (k) => (k < meltingK ? frostMarks : boilingMarks(k)),
  });
}

/** Temperature of the two-phase line at a pressure: the inverse. */
export function saturationTemperature(parts: FluidParts, surface: Surface): Curve {
  const { numbers, line, sublimation } = parts;
  const { meltingK, criticalPa, unconfirmed } = numbers;
  const pressure = saturationPressure(parts, surface);
  const triplePa = line.pressure(meltingK);
  const solid = sublimation !== undefined && surface !== 'liquid';
  const value = (p: number): number => (solid && p < triplePa ? sublimation.temperature(p) : line.temperature(p));
  const slope = (k: number): number => (solid && k < meltingK ? sublimation.lnSlope(k) : line.lnSlope(k));
  return fluidCurve({
    axis: 'pressure',
    from: pressure.at(pressure.from),
    to: pressure.to === meltingK ? triplePa : criticalPa,
    subject: pressure.subject.replace('pressure', 'temperature'),
    unit: 'K',
    method: pressure.method,
    sources: pressure.sources,
    value,
    uncertaintyAt: (p) => {
      const k = value(p);
      return (pressure.uncertaintyAt?.(k) ?? NaN) / (p * slope(k));
    },
    ...(unconfirmed.has('vapour pressure') || surface === 'liquid' || solid
      ? { marksAt: (p: number) => pressure.marksAt?.(value(p)) ?? [] }
      : {}),
  });
}

function noIce(parts: FluidParts): ReturnType<typeof lacking> {
  requireGas(parts);
  return lacking(`heat capacity of solid ${parts.numbers.name}, so its sublimation pressure`);
}
