import type { Mark } from '../answer';
import { valueAt, type OutOfRange } from '../evaluate';
import { Problem, shortNumber } from '../problem';
import type { Gap, Ladder, Phase, Rung, Substance } from '../substance';
import type { Place } from './place';
import type { State } from './state';

/** A bare temperature this near to a transition is answered with a warning, K. */
const NEAR_K = 0.1;

/** A temperature this near is the transition temperature itself: what unit conversion and printed digits leave of it, K. */
const SAME_K = 1e-6;

/** The transition that a temperature stands on. */
export function transitionAt(ladder: Ladder, temperatureK: number): FoundGap | undefined {
  const index = ladder.gaps.findIndex((gap) => Math.abs(gap.temperatureK - temperatureK) <= SAME_K);
  const gap = ladder.gaps[index];
  return gap === undefined ? undefined : { gap, index };
}

/**
 * Finds a state on the ladder of a substance at a pressure.
 *
 * @param substance the substance
 * @param state a temperature with or without a phase, or a state on or beside a transition
 * @param pressurePa absolute pressure
 * @param policy whether a temperature beyond the hottest rung may be extended
 * @returns temperature, enthalpy in J/mol, place on the ladder, and marks (metastable, near a transition)
 * @throws Problem `range` for a temperature off the ladder, `missing` for a transition that does not exist at this pressure,
 * `argument` for a fraction outside [0, 1] and for a difference that leaves the phase
 */
export function placeState(
  substance: Substance,
  state: State,
  pressurePa: number,
  policy: OutOfRange = 'refuse',
): Place {
  const ladder = substance.ladder(pressurePa);
  switch (state.form) {
    case 'temperature':
      return state.phase === undefined
        ? bareTemperature(substance, ladder, state.temperatureK, policy)
        : namedPhase(substance, ladder, state.temperatureK, state.phase, policy);
    case 'saturated':
      return onGap(ladder, boilingGap(substance, ladder, state.phase === 'liquid'), state.phase === 'liquid' ? 0 : 1);
    case 'fraction':
      return onGap(ladder, boilingGap(substance, ladder, false), checkedFraction(state.vapor));
    case 'melting':
      return onGap(ladder, gapOf(substance, ladder, ['fusion']), state.phase === 'solid' ? 0 : 1);
    case 'subcooled':
      return beside(substance, ladder, boilingGap(substance, ladder, true), -state.deltaK, 'subcooled');
    case 'superheated':
      return beside(substance, ladder, boilingGap(substance, ladder, false), state.deltaK, 'superheated');
  }
}

function bareTemperature(substance: Substance, ladder: Ladder, temperatureK: number, policy: OutOfRange): Place {
  const { index, rung } = rungAt(substance, ladder, temperatureK, policy);
  const near = ladder.gaps.find((gap) => Math.abs(gap.temperatureK - temperatureK) <= NEAR_K);
  const marks: Mark[] = [];
  if (temperatureK > rung.toK + SAME_K) {
    marks.push({ code: 'extended', text: `outside the published range of ${rung.phase} ${substance.name}` });
  }
  if (near !== undefined) {
    const away = `${shortNumber(Math.abs(near.temperatureK - temperatureK))} K from ${near.change}`;
    marks.push({ code: 'near-transition', text: `${away}: taken as ${rung.phase}; name the phase to be sure` });
  }
  return {
    temperatureK,
    enthalpy: rung.enthalpy(temperatureK),
    segment: 2 * index,
    phase: rung.phase,
    undecided: transitionAt(ladder, temperatureK) !== undefined,
    marks,
  };
}

function namedPhase(
  substance: Substance,
  ladder: Ladder,
  temperatureK: number,
  phase: Phase,
  policy: OutOfRange,
): Place {
  const found = transitionAt(ladder, temperatureK);
  const side =
    found === undefined ? -1 : ladder.rungs.slice(found.index, found.index + 2).findIndex((r) => fits(r, phase));
  if (found !== undefined && side >= 0) return onGap(ladder, found, side);
  const index = ladder.rungs.findIndex(
    (rung) => fits(rung, phase) && temperatureK >= rung.fromK && temperatureK <= rung.toK,
  );
  const rung = ladder.rungs[index];
  if (rung !== undefined) {
    return { temperatureK, enthalpy: rung.enthalpy(temperatureK), segment: 2 * index, phase: rung.phase, marks: [] };
  }
  const stable = rungAt(substance, ladder, temperatureK, policy);
  if (fits(stable.rung, phase)) return bareTemperature(substance, ladder, temperatureK, policy);
  const curve = substance.enthalpy(phase, ladder.pressurePa);
  const text = `${phase} ${substance.name} is not the stable phase here; ${stable.rung.phase} is`;
  return {
    temperatureK,
    enthalpy: valueAt(curve, temperatureK, policy),
    segment: 2 * stable.index,
    phase,
    metastable: phase,
    marks: [
      { code: 'metastable', text },
      ...(curve.marksAt?.(temperatureK) ?? []).filter((m) => m.code !== 'metastable'),
    ],
  };
}

/** A supercritical rung is liquid and gas in one. */
function fits(rung: Rung, phase: Phase): boolean {
  return rung.phase === phase || (rung.phase === 'supercritical' && phase !== 'solid');
}

function rungAt(
  substance: Substance,
  ladder: Ladder,
  temperatureK: number,
  policy: OutOfRange,
): { index: number; rung: Rung } {
  const first = ladder.rungs[0];
  const last = ladder.rungs[ladder.rungs.length - 1];
  if (first === undefined || last === undefined) {
    throw new Problem({ code: 'missing', subject: `paths of ${substance.name}`, reason: 'no phase at this pressure' });
  }
  // what unit conversion leaves of a transition temperature does not fall off a rung that begins or ends there
  const index = ladder.rungs.findIndex((rung) => temperatureK <= rung.toK + SAME_K);
  const rung = ladder.rungs[index];
  if (rung !== undefined && temperatureK >= first.fromK - SAME_K) return { index, rung };
  const known = last.toK > last.fromK;
  if (policy === 'extend' && known && temperatureK > last.toK) return { index: ladder.rungs.length - 1, rung: last };
  const lacking = temperatureK < first.fromK ? ladder.missingBelow : ladder.missingAbove;
  if (lacking !== undefined) {
    const below = temperatureK < first.fromK;
    const where = substance.group === 'house' ? 'on the Substances sheet' : 'in the catalogue';
    throw new Problem({
      code: 'missing',
      subject: lacking,
      reason: `not ${where}, so no path leads ${below ? 'below' : 'above'}`,
      place: { quantity: 'temperature', value: below ? first.fromK : last.toK },
    });
  }
  throw new Problem({
    code: 'range',
    argument: 'temperature',
    quantity: 'temperature',
    received: temperatureK,
    from: first.fromK,
    to: last.toK,
    subject: `heating paths of ${substance.name} at this pressure`,
  });
}

export interface FoundGap {
  readonly gap: Gap;
  readonly index: number;
}

function gapOf(substance: Substance, ladder: Ladder, changes: readonly string[]): FoundGap {
  const index = ladder.gaps.findIndex((gap) => changes.includes(gap.change));
  const gap = ladder.gaps[index];
  if (gap !== undefined) return { gap, index };
  const there = ladder.gaps.map((g) => g.change).join(', ');
  throw new Problem({
    code: 'missing',
    subject: `${changes.join(' or ')} of ${substance.name}`,
    reason: there === '' ? 'no transition is known at' : `only ${there} at`,
    place: { quantity: 'pressure', value: ladder.pressurePa },
  });
}

/** The gap to the vapour; where only solid and vapour exist there is no liquid side. */
function boilingGap(substance: Substance, ladder: Ladder, liquid: boolean): FoundGap {
  return gapOf(substance, ladder, liquid ? ['vaporization'] : ['vaporization', 'sublimation']);
}

function onGap(ladder: Ladder, { gap, index }: FoundGap, fraction: number): Place {
  const side = ladder.rungs[fraction === 0 ? index : index + 1];
  return {
    temperatureK: gap.temperatureK,
    enthalpy: fraction === 0 ? gap.below : fraction === 1 ? gap.above : gap.below + fraction * (gap.above - gap.below),
    segment: fraction === 0 ? 2 * index : fraction === 1 ? 2 * index + 2 : 2 * index + 1,
    phase: (fraction === 0 || fraction === 1) && side !== undefined ? side.phase : 'two phases',
    marks: [],
  };
}

function beside(substance: Substance, ladder: Ladder, found: FoundGap, deltaK: number, word: string): Place {
  const temperatureK = found.gap.temperatureK + deltaK;
  const index = deltaK < 0 || (deltaK === 0 && word === 'subcooled') ? found.index : found.index + 1;
  const rung = ladder.rungs[index];
  const wrongWay = word === 'subcooled' ? deltaK > 0 : deltaK < 0;
  if (wrongWay || rung === undefined || temperatureK < rung.fromK || temperatureK > rung.toK) {
    const widest = rung === undefined || wrongWay ? 0 : rung.toK - rung.fromK;
    throw new Problem({
      code: 'argument',
      argument: `${word} state of ${substance.name}`,
      allowed: wrongWay ? 'a difference of at least 0 K' : `a difference within [0, ${shortNumber(widest)}] K`,
      received: `${shortNumber(word === 'subcooled' ? -deltaK : deltaK)} K`,
    });
  }
  return { temperatureK, enthalpy: rung.enthalpy(temperatureK), segment: 2 * index, phase: rung.phase, marks: [] };
}

function checkedFraction(vapor: number): number {
  if (vapor >= 0 && vapor <= 1) return vapor;
  throw new Problem({
    code: 'argument',
    argument: 'vapor fraction',
    allowed: 'within [0, 1]',
    received: String(vapor),
  });
}
