import type { Mark } from '../answer';
import type { OutOfRange } from '../evaluate';
import { Problem } from '../problem';
import type { Gap, Ladder, Substance } from '../substance';
import type { Place } from './place';
import { placeState } from './placeState';
import type { State } from './state';

/** One leg of a path: along a phase, or across a transition. */
export interface HeatStep {
  /** `liquid`, `vaporization`; `condensation` where the path goes down; `liquid to solid` where a metastable state ends. */
  readonly label: string;
  readonly fromK: number;
  readonly toK: number;
  /** J/mol taken up. */
  readonly heat: number;
}

export interface HeatPath {
  readonly steps: readonly HeatStep[];
  /** J/mol taken up from the first state to the last. */
  readonly heat: number;
  readonly marks: readonly Mark[];
  readonly from: Place;
  readonly to: Place;
  readonly ladder: Ladder;
}

const DOWNWARD: Readonly<Record<string, string>> = {
  fusion: 'freezing',
  vaporization: 'condensation',
  sublimation: 'deposition',
};

/**
 * The path between two states at one pressure, leg by leg: along each phase and across each transition between them.
 *
 * heat = h(to) − h(from), so that the legs add up to it and the way back gives it with the sign turned.
 *
 * An end that is a bare temperature exactly on a transition is taken on the side of the other end: the transition is
 * not crossed. A metastable end first changes to the stable phase at its own temperature; between two states of one
 * phase the path stays in that phase.
 *
 * @param substance the substance
 * @param from first state
 * @param to last state
 * @param pressurePa absolute pressure, the same for both
 * @param policy whether temperatures beyond the published range are extended
 * @returns the legs, their sum in J/mol, and marks of both ends
 * @throws Problem as `placeState` does, and `argument` where both ends are the same bare temperature on a transition
 */
export function heatSteps(
  substance: Substance,
  from: State,
  to: State,
  pressurePa: number,
  policy: OutOfRange = 'refuse',
): HeatPath {
  const ladder = substance.ladder(pressurePa);
  const [a, b] = decided(
    placeState(substance, from, pressurePa, policy),
    placeState(substance, to, pressurePa, policy),
    ladder,
  );
  const steps = staysInPhase(a, b)
    ? [{ label: a.phase, fromK: a.temperatureK, toK: b.temperatureK, heat: b.enthalpy - a.enthalpy }]
    : [...leaving(a, ladder), ...climb(stable(a, ladder), stable(b, ladder), ladder), ...arriving(b, ladder)];
  return { steps, heat: b.enthalpy - a.enthalpy, marks: [...a.marks, ...b.marks], from: a, to: b, ladder };
}

/** Puts an end that lies on a transition on the side of the other end. */
function decided(a: Place, b: Place, ladder: Ladder): [Place, Place] {
  if (a.undecided !== true && b.undecided !== true) return [a, b];
  if (a.undecided === true && b.undecided === true && a.temperatureK === b.temperatureK) {
    throw new Problem({
      code: 'argument',
      argument: 'from and to',
      allowed: 'states that say the phase, as "saturated liquid": both ends lie on a transition',
      received: 'the same bare temperature twice',
    });
  }
  const sided = (place: Place, other: Place): Place => {
    if (place.undecided !== true) return place;
    const gapIndex = ladder.gaps.findIndex((gap) => gap.temperatureK === place.temperatureK);
    const gap = ladder.gaps[gapIndex];
    if (gap === undefined) return place;
    const above =
      other.segment > 2 * gapIndex + 1 || (other.segment === 2 * gapIndex + 1 && other.enthalpy > gap.below);
    const rung = ladder.rungs[above ? gapIndex + 1 : gapIndex];
    if (rung === undefined) return place;
    const text = `exactly at ${gap.change}: taken as ${rung.phase}, the side of the other end; name the phase to be sure`;
    return {
      ...place,
      enthalpy: above ? gap.above : gap.below,
      segment: above ? 2 * gapIndex + 2 : 2 * gapIndex,
      phase: rung.phase,
      marks: [{ code: 'near-transition', text }],
    };
  };
  return [sided(a, b), sided(b, a)];
}

function staysInPhase(a: Place, b: Place): boolean {
  return a.phase === b.phase && (a.metastable !== undefined || b.metastable !== undefined);
}

/** The stable state at the temperature of a metastable one. */
function stable(place: Place, ladder: Ladder): Place {
  const rung = ladder.rungs[place.segment / 2];
  if (place.metastable === undefined || rung === undefined) return place;
  return { ...place, enthalpy: rung.enthalpy(place.temperatureK), phase: rung.phase };
}

function leaving(place: Place, ladder: Ladder): HeatStep[] {
  return place.metastable === undefined ? [] : [change(place, stable(place, ladder))];
}

function arriving(place: Place, ladder: Ladder): HeatStep[] {
  return place.metastable === undefined ? [] : [change(stable(place, ladder), place)];
}

function change(a: Place, b: Place): HeatStep {
  return {
    label: `${a.phase} to ${b.phase}`,
    fromK: a.temperatureK,
    toK: b.temperatureK,
    heat: b.enthalpy - a.enthalpy,
  };
}

/** The legs between two stable places; downward they are the upward legs turned round. */
function climb(a: Place, b: Place, ladder: Ladder): HeatStep[] {
  if (a.segment < b.segment || (a.segment === b.segment && a.enthalpy <= b.enthalpy)) return upward(a, b, ladder);
  return upward(b, a, ladder)
    .reverse()
    .map(({ label, fromK, toK, heat }) => ({ label: DOWNWARD[label] ?? label, fromK: toK, toK: fromK, heat: -heat }));
}

function upward(a: Place, b: Place, ladder: Ladder): HeatStep[] {
  const steps: HeatStep[] = [];
  for (let segment = a.segment; segment <= b.segment; segment++) {
    const span = spanOf(segment, ladder);
    const start = segment === a.segment ? a : span.start;
    const end = segment === b.segment ? b : span.end;
    const heat = end.enthalpy - start.enthalpy;
    if (start.temperatureK === end.temperatureK && heat === 0) continue;
    steps.push({ label: span.label, fromK: start.temperatureK, toK: end.temperatureK, heat });
  }
  return steps;
}

interface Point {
  readonly temperatureK: number;
  readonly enthalpy: number;
}

/** The whole of a segment: a rung between the gaps at its ends, or a gap from its lower side to its upper. */
function spanOf(segment: number, ladder: Ladder): { label: string; start: Point; end: Point } {
  const open: Point = { temperatureK: NaN, enthalpy: NaN };
  const side = (gap: Gap | undefined, at: 'below' | 'above'): Point =>
    gap === undefined ? open : { temperatureK: gap.temperatureK, enthalpy: gap[at] };
  const index = Math.floor(segment / 2);
  const gap = ladder.gaps[index];
  if (segment % 2 === 1) return { label: gap?.change ?? '', start: side(gap, 'below'), end: side(gap, 'above') };
  return {
    label: ladder.rungs[index]?.phase ?? '',
    start: side(ladder.gaps[index - 1], 'above'),
    end: side(gap, 'below'),
  };
}
