import type { Mark } from '../answer';
import type { OutOfRange } from '../evaluate';
import { Problem } from '../problem';
import type { Ladder, Substance } from '../substance';
import { climb, type HeatStep } from './climb';
import type { Place } from './place';
import { placeState, transitionAt } from './placeState';
import type { State } from './state';

export type { HeatStep };

export interface HeatPath {
  readonly steps: readonly HeatStep[];
  /** J/mol taken up from the first state to the last. */
  readonly heat: number;
  readonly marks: readonly Mark[];
  readonly from: Place;
  readonly to: Place;
  readonly ladder: Ladder;
}

/**
 * The path between two states at one pressure, leg by leg: along each phase and across each transition between them.
 *
 * heat = h(to) − h(from), so that the legs add up to it and the way back gives it with the sign turned.
 *
 * An end that is a bare temperature exactly on a transition is taken on the side of the other end: the transition is
 * not crossed. A metastable end is followed along its own phase where the path leads through that phase, and changes to
 * the stable phase at its own temperature where it does not.
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
  const [a, b] = endsOf(substance, from, to, pressurePa, policy);
  const steps = staysInPhase(a, b) ? alongPhase(a, b) : between(joined(a, b, ladder), joined(b, a, ladder), ladder);
  return { steps, heat: b.enthalpy - a.enthalpy, marks: distinct([...a.marks, ...b.marks]), from: a, to: b, ladder };
}

/** What holds for both ends is said once. */
function distinct(marks: readonly Mark[]): readonly Mark[] {
  return marks.filter(({ text }, i) => marks.findIndex((mark) => mark.text === text) === i);
}

/** Both ends of a path, an undecided one on the side of the other. */
export function endsOf(
  substance: Substance,
  from: State,
  to: State,
  pressurePa: number,
  policy: OutOfRange,
): readonly [Place, Place] {
  const a = placeState(substance, from, pressurePa, policy);
  const b = placeState(substance, to, pressurePa, policy);
  return a.undecided !== true && b.undecided !== true ? [a, b] : decided(a, b, substance.ladder(pressurePa));
}

/** Puts an end that lies on a transition on the side of the other end. */
function decided(a: Place, b: Place, ladder: Ladder): [Place, Place] {
  const gapOfA = transitionAt(ladder, a.temperatureK);
  if (a.undecided === true && b.undecided === true && gapOfA?.index === transitionAt(ladder, b.temperatureK)?.index) {
    throw new Problem({
      code: 'argument',
      argument: 'from and to',
      allowed: 'states that say the phase, as "saturated liquid": both ends lie on a transition',
      received: 'the same bare temperature twice',
    });
  }
  const sided = (place: Place, other: Place): Place => {
    const found = transitionAt(ladder, place.temperatureK);
    if (place.undecided !== true || found === undefined) return place;
    const { gap, index: gapIndex } = found;
    const above =
      other.segment > 2 * gapIndex + 1 || (other.segment === 2 * gapIndex + 1 && other.enthalpy > gap.below);
    const rung = ladder.rungs[above ? gapIndex + 1 : gapIndex];
    if (rung === undefined) return place;
    const text = `exactly at ${gap.change}: taken as ${rung.phase}, the side of the other end; name the phase to be sure`;
    return {
      ...place,
      temperatureK: gap.temperatureK,
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

function alongPhase(a: Place, b: Place): HeatStep[] {
  return a.temperatureK === b.temperatureK ? [] : [leg(a.phase, a, b)];
}

/** A place on the ladder, and the leg that leads there from a metastable state. */
interface Joined {
  readonly place: Place;
  readonly leg: HeatStep | undefined;
}

function joined(place: Place, other: Place, ladder: Ladder): Joined {
  if (place.metastable === undefined) return { place, leg: undefined };
  const door = ownPhaseDoor(place, ladder);
  const warmer = door !== undefined && door.temperatureK > place.temperatureK;
  if (door !== undefined && (warmer ? other.segment >= door.segment : other.segment <= door.segment)) {
    return { place: door, leg: leg(`metastable ${place.phase}`, place, door) };
  }
  const end = stable(place, ladder);
  return { place: end, leg: leg(`${place.phase} to ${end.phase}`, place, end) };
}

/** The end of the phase's own rung that a metastable state comes from: there it is stable again. */
function ownPhaseDoor(place: Place, ladder: Ladder): Place | undefined {
  const index = ladder.rungs.findIndex((rung) => rung.phase === place.metastable);
  const rung = ladder.rungs[index];
  if (rung === undefined) return undefined;
  const cold = place.temperatureK < rung.fromK;
  const gap = ladder.gaps[cold ? index - 1 : index];
  if (gap === undefined) return undefined;
  const enthalpy = cold ? gap.above : gap.below;
  return { temperatureK: gap.temperatureK, enthalpy, segment: 2 * index, phase: rung.phase, marks: [] };
}

function leg(label: string, a: Place, b: Place): HeatStep {
  return { label, fromK: a.temperatureK, toK: b.temperatureK, heat: b.enthalpy - a.enthalpy };
}

/** From one end to the other by way of the ladder; the last leg is that of a metastable end turned round. */
function between(a: Joined, b: Joined, ladder: Ladder): HeatStep[] {
  const legs = climb(a.place, b.place, ladder);
  if (a.leg !== undefined) legs.unshift(a.leg);
  if (b.leg !== undefined) {
    const { label, fromK, toK, heat } = b.leg;
    const words = label.split(' to ').reverse().join(' to ');
    legs.push({ label: words, fromK: toK, toK: fromK, heat: -heat });
  }
  return legs;
}
