import type { Mark } from '../answer';
import type { Curve, Surface } from '../substance';
import { need, readable } from './given';
import { joined, NO_MARKS } from './marks';
import type { MaterialData, PressureData } from './materialData';

interface Line {
  readonly given: PressureData;
  readonly meltingK: number | undefined;
  readonly over: 'solid' | 'liquid';
  readonly fromK: number;
  readonly toK: number;
}

/** The two-phase line over one condensed phase; the stable one ends where the phase melts. */
function lineOf(data: MaterialData, surface: Surface): Line {
  const meltingK = readable(data.transitions.get('fusion'))?.temperatureK;
  const solid = data.pressures.get('solid');
  const over = surface === 'ice' || (surface === 'stable' && !data.pressures.has('liquid') && solid !== undefined);
  const phase = over ? 'solid' : 'liquid';
  const given = need(data, data.pressures.get(phase), over ? 'sublimation pressure' : 'vapour pressure');
  return { given, meltingK, over: phase, fromK: given.fromK, toK: given.toK };
}

function marksAt({ meltingK, over, given }: Line): (temperatureK: number) => readonly Mark[] {
  const text = `${over}: the other phase is the stable one here`;
  const away = joined(given.marks, [{ code: 'metastable', text }]);
  if (meltingK === undefined) return () => given.marks;
  return (t) => ((over === 'liquid' ? t < meltingK : t > meltingK) ? away : given.marks);
}

/** Vapour pressure over a condensed phase, Pa against K. */
export function materialPressure(data: MaterialData, surface: Surface): Curve {
  const both = bothStable(data, surface);
  if (both !== undefined) return stablePressure(data, ...both);
  const line = lineOf(data, surface);
  const { shape, method, sources, relativeUncertainty: share } = line.given;
  return {
    axis: 'temperature',
    from: line.fromK,
    to: line.toK,
    subject: `vapour pressure of ${line.over} ${data.name}`,
    unit: 'Pa',
    method,
    sources,
    at: (t) => shape.at(t),
    ...(share === undefined ? {} : { uncertaintyAt: (t) => share * shape.at(t) }),
    marksAt: marksAt(line),
  };
}

/** The temperature of the two-phase line at a pressure, K against Pa. */
export function materialBoiling(data: MaterialData, surface: Surface): Curve {
  const both = bothStable(data, surface);
  const [under, line] = both ?? [undefined, lineOf(data, surface)];
  const { shape, method, sources } = line.given;
  const change = under?.given.shape.at(under.toK) ?? 0;
  const inverse =
    under === undefined
      ? (p: number) => shape.inverse(p)
      : (p: number) => (p < change ? under.given.shape.inverse(p) : shape.inverse(p));
  const marks = marksAt(line);
  return {
    axis: 'pressure',
    from: under === undefined ? shape.at(line.fromK) : under.given.shape.at(under.fromK),
    to: shape.at(line.toK),
    subject: `saturation temperature of ${data.name}`,
    unit: 'K',
    method: `inverse of: ${method}`,
    sources: both === undefined ? sources : joinedSources(both),
    at: inverse,
    marksAt: (p) => (under === undefined ? marks(inverse(p)) : NO_MARKS),
  };
}

/** The lines over solid and liquid cut where they meet, where both are known up to there. */
function bothStable(data: MaterialData, surface: Surface): [Line, Line] | undefined {
  if (surface !== 'stable') return undefined;
  const meltingK = readable(data.transitions.get('fusion'))?.temperatureK;
  const solid = readable(data.pressures.get('solid'));
  const liquid = readable(data.pressures.get('liquid'));
  if (meltingK === undefined || solid === undefined || liquid === undefined) return undefined;
  if (!(solid.fromK < meltingK && meltingK <= solid.toK && liquid.fromK <= meltingK && meltingK < liquid.toK)) {
    return undefined;
  }
  return [
    { given: solid, meltingK, over: 'solid', fromK: solid.fromK, toK: meltingK },
    { given: liquid, meltingK, over: 'liquid', fromK: meltingK, toK: liquid.toK },
  ];
}

function stablePressure(data: MaterialData, under: Line, above: Line): Curve {
  const cold = under.given.shape;
  const hot = above.given.shape;
  const marks = joined(under.given.marks, above.given.marks);
  return {
    axis: 'temperature',
    from: under.fromK,
    to: above.toK,
    subject: `vapour pressure of ${data.name}`,
    unit: 'Pa',
    method: `below the melting temperature ${under.given.method}; above it ${above.given.method}`,
    sources: joinedSources([under, above]),
    at: (t) => (t < above.fromK ? cold.at(t) : hot.at(t)),
    marksAt: () => marks,
  };
}

function joinedSources(lines: readonly Line[]): readonly string[] {
  return [...new Set(lines.flatMap(({ given }) => given.sources))];
}
