import { STANDARD_ATMOSPHERE_PA } from '../atmosphere';
import type { LatentKind, Mark } from '../answer';
import { Problem, shortNumber } from '../problem';
import type { Change, Curve, Phase } from '../substance';
import { samePressure } from './boilingAt';
import { missing, need, readable } from './given';
import { IDEAL_GAS, joined, NO_MARKS } from './marks';
import { heatKey, usualKind, type HeatCapacityData, type HeatData, type MaterialData } from './materialData';
import type { MaterialLadder, MaterialRung } from './materialLadder';
import { formsOf, heatCapacityOf } from './stations';

/** What a change is asked for: the heat, or its slope with temperature. */
export type Answered = 'latent' | 'slope';

/** What latent heats need of the substance around them. */
export interface Around {
  readonly data: MaterialData;
  ladder(pressurePa: number): MaterialLadder;
}

/**
 * Latent heat or its slope of the kind asked.
 *
 * A kind that the data give is answered from them. The isobaric kind is otherwise the difference of the phases'
 * enthalpies at that pressure, from the heat of transition and both heat capacities; the coexistence kind of a change
 * between condensed phases is known where their two-phase line is, at the transition temperature. Nothing else is
 * turned from one kind into another.
 */
export function latentCurve(
  around: Around,
  change: Change,
  kind: LatentKind,
  answered: Answered,
  pressurePa = STANDARD_ATMOSPHERE_PA,
): Curve {
  const { data } = around;
  const given = data.heats.get(heatKey(change, kind));
  const toVapour = change === 'vaporization' || change === 'sublimation';
  const elsewhere = kind === 'isobaric' && toVapour && !samePressure(pressurePa, pressureOf(data, change));
  if (given !== undefined && !elsewhere) {
    const found = need(data, given, `heat of ${change}`);
    if (found.single && kind === 'isobaric' && !toVapour) return betweenSolids(data, change, found, answered);
    return found.single
      ? atTransition(data, change, kind, found, answered)
      : alongData(data, change, kind, found, answered);
  }
  if (kind === 'coexistence' && !toVapour) {
    const same = need(data, data.heats.get(heatKey(change, 'isobaric')), `heat of ${change}`);
    return atTransition(data, change, kind, same, answered);
  }
  const usual = usualKind(change);
  const anyGiven = [...data.heats.entries()].find(([key]) => key.startsWith(`${change} `));
  if (kind === 'isobaric' && data.heats.has(heatKey(change, usual))) {
    need(data, data.heats.get(heatKey(change, usual)), `heat of ${change}`);
    return atPressure(around, change, answered, pressurePa);
  }
  if (anyGiven === undefined) throw missing(data, `heat of ${change}`);
  throw missing(data, `heat of ${change}, ${kind},`);
}

function pressureOf(data: MaterialData, change: Change): number {
  return readable(data.transitions.get(change))?.pressurePa ?? STANDARD_ATMOSPHERE_PA;
}

interface Parts {
  readonly from: number;
  readonly to: number;
  readonly method: string;
  readonly sources: readonly string[];
  readonly marks: readonly Mark[];
  readonly at: (temperatureK: number) => number;
  readonly share: number | undefined;
}

function curveOf(data: MaterialData, change: Change, kind: LatentKind, answered: Answered, parts: Parts): Curve {
  const { share, marks, at, ...rest } = parts;
  const slope = answered === 'slope';
  return {
    axis: 'temperature',
    ...rest,
    subject: `${slope ? 'slope of the heat of ' : ''}${change} of ${data.name}`,
    unit: slope ? 'J/(mol K)' : 'J/mol',
    kind,
    at,
    ...(share === undefined || slope ? {} : { uncertaintyAt: (t) => Math.abs(share * at(t)) }),
    marksAt: () => marks,
  };
}

/** Where a heat of vaporization ends its slope: at the critical point that has no finite value. */
const BEFORE_THE_END_K = 1e-3;

function alongData(data: MaterialData, change: Change, kind: LatentKind, found: HeatData, answered: Answered): Curve {
  const { shape, fromK, toK, method, sources, marks, relativeUncertainty } = found;
  const slope = answered === 'slope';
  return curveOf(data, change, kind, answered, {
    from: fromK,
    to: slope && !Number.isFinite(shape.slope(toK)) ? toK - BEFORE_THE_END_K : toK,
    method: slope ? `derivative of: ${method}` : method,
    sources,
    marks,
    at: slope ? (t) => shape.slope(t) : (t) => shape.at(t),
    share: relativeUncertainty,
  });
}

/** A heat that is known at the transition temperature only. */
function atTransition(
  data: MaterialData,
  change: Change,
  kind: LatentKind,
  found: HeatData,
  answered: Answered,
): Curve {
  const at = transitionK(data, change);
  if (answered === 'slope') {
    throw missing(data, `temperature slope of the heat of ${change}, ${kind},`);
  }
  const value = found.shape.at(at);
  const { method, sources, marks, relativeUncertainty: share } = found;
  return curveOf(data, change, kind, answered, { from: at, to: at, method, sources, marks, at: () => value, share });
}

function transitionK(data: MaterialData, change: Change): number {
  return need(data, data.transitions.get(change), temperatureWords(change)).temperatureK;
}

/** The words of the transition temperature of a change, as its row says it. */
export function temperatureWords(change: Change): string {
  if (change === 'fusion') return 'melting temperature';
  return change === 'vaporization' ? 'boiling temperature' : `${change} temperature`;
}

/** The phases of a change, cold and hot; solid-solid changes have two forms of the solid. */
export const ENDS: Readonly<Record<string, readonly [Phase, Phase]>> = {
  fusion: ['solid', 'liquid'],
  vaporization: ['liquid', 'gas'],
  sublimation: ['solid', 'gas'],
};

/** Fusion and solid-solid changes carried by the heat capacities of both phases, where both are known. */
function betweenSolids(data: MaterialData, change: Change, found: HeatData, answered: Answered): Curve {
  const at = transitionK(data, change);
  const heat = found.shape.at(at);
  const [coldForm, hotForm] = change === 'fusion' ? [formsOf(data.solidChanges).at(-1)] : change.split('-');
  const cold = heatCapacityOf(data, 'solid', coldForm);
  const hot = change === 'fusion' ? heatCapacityOf(data, 'liquid') : heatCapacityOf(data, 'solid', hotForm);
  return carried(data, change, answered, { at, heat, found, cold, hot }, found.method);
}

/** The isobaric kind of a change to the vapour at a pressure, from where the phases meet at that pressure. */
function atPressure(around: Around, change: Change, answered: Answered, pressurePa: number): Curve {
  const { data } = around;
  const ladder = around.ladder(pressurePa);
  const index = ladder.gaps.findIndex((gap) => gap.change === change);
  const gap = ladder.gaps[index];
  const cold: MaterialRung | undefined = ladder.rungs[index];
  const hot: MaterialRung | undefined = ladder.rungs[index + 1];
  const found = need(data, data.heats.get(heatKey(change, usualKind(change))), `heat of ${change}`);
  if (gap === undefined || cold === undefined || hot === undefined) {
    throw new Problem({
      code: 'missing',
      subject: `heat of ${change} of ${data.name} at ${shortNumber(pressurePa)} Pa`,
      reason: `it needs the transition at that pressure; there is no ${ladder.missingAbove ?? 'such data'}`,
    });
  }
  const joint = { at: gap.temperatureK, heat: gap.above - gap.below, found, cold: cold.cp, hot: hot.cp };
  return carried(data, change, answered, joint, 'heat where the two phases meet at that pressure');
}

interface Joint {
  readonly at: number;
  readonly heat: number;
  readonly found: HeatData;
  readonly cold: HeatCapacityData | undefined;
  readonly hot: HeatCapacityData | undefined;
}

/** L(T) = L(T*) + ∫(cp hot − cp cold) dT over the range of both; at T* only where one of them is not known there. */
function carried(data: MaterialData, change: Change, answered: Answered, joint: Joint, method: string): Curve {
  const { at, heat, found, cold, hot } = joint;
  const from = Math.max(cold?.fromK ?? NaN, hot?.fromK ?? NaN);
  const to = Math.min(cold?.toK ?? NaN, hot?.toK ?? NaN);
  const { relativeUncertainty: share } = found;
  if (cold === undefined || hot === undefined || !(from <= at && at <= to)) {
    if (answered === 'slope') {
      const lacking = cold === undefined ? 0 : hot === undefined ? 1 : -1;
      const phase = ENDS[change]?.[lacking as 0 | 1];
      throw missing(
        data,
        phase === undefined ? 'heat capacities of both phases at the transition' : `${phase} heat capacity`,
      );
    }
    const { sources, marks } = found;
    return curveOf(data, change, 'isobaric', answered, {
      from: at,
      to: at,
      method,
      sources,
      marks,
      at: () => heat,
      share,
    });
  }
  const sources = [...new Set([...found.sources, ...cold.sources, ...hot.sources])];
  const marks = joined(found.marks, cold.marks, hot.marks, ENDS[change]?.[1] === 'gas' ? IDEAL_GAS : NO_MARKS);
  const a = cold.shape;
  const b = hot.shape;
  if (answered === 'slope') {
    return curveOf(data, change, 'isobaric', answered, {
      ...{ from, to, sources, marks, share: undefined },
      method: 'heat-capacity difference of the two phases',
      at: (t) => b.at(t) - a.at(t),
    });
  }
  return curveOf(data, change, 'isobaric', answered, {
    ...{ from, to, sources, marks, share },
    method: `${method}, carried by the heat capacities of both phases`,
    at: (t) => heat + b.area(at, t) - a.area(at, t),
  });
}
