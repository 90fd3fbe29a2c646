import { STANDARD_ATMOSPHERE_PA } from '../../../core/atmosphere';
import { useMemo, useState } from 'react';
import { evaluate } from '../../../core/evaluate';
import { Problem, type ProblemData } from '../../../core/problem';
import type { Ladder, Substance } from '../../../core/substance';
import { factOf } from './facts/fact';
import { temperatureWindow, widened, type Window } from './diagram/temperatureWindow';

const ROOM_K = 298.15;

/** What a card shows: at which pressure and temperature, and which part of the diagram. */
export interface CardState {
  readonly pressurePa: number;
  readonly temperatureK: number;
  /** Place of the transition that the diagram is drawn around; all of them where there is none. */
  readonly around: number | undefined;
  readonly ladder: Ladder | undefined;
  /** Why there is no ladder at this pressure. */
  readonly problem: ProblemData | undefined;
  readonly window: Window;
  readonly setPressure: (pressurePa: number) => void;
  /** Moves within the diagram. */
  readonly setTemperature: (temperatureK: number) => void;
  /** Goes to a temperature, and widens the diagram where it lies outside. */
  readonly goTo: (temperatureK: number) => void;
  readonly setAround: (place: number | undefined) => void;
}

function ladderAt(substance: Substance, pressurePa: number): { ladder?: Ladder; problem?: ProblemData } {
  try {
    return { ladder: substance.ladder(pressurePa) };
  } catch (error) {
    if (error instanceof Problem) return { problem: error.data };
    throw error;
  }
}

/** 25 °C where the diagram holds it and a latent heat is known there, else the first transition, else the middle. */
export function firstTemperature(substance: Substance, ladder: Ladder | undefined, window: Window): number {
  const inside = (kelvin: number) => kelvin >= window.fromK && kelvin <= window.toK;
  const first = ladder?.gaps.find(({ temperatureK }) => inside(temperatureK));
  if (inside(ROOM_K) && (first === undefined || hasLatentAt(substance, ROOM_K))) return ROOM_K;
  return first?.temperatureK ?? (window.fromK + window.toK) / 2;
}

function hasLatentAt(substance: Substance, temperatureK: number): boolean {
  return substance.changes.some((change) => {
    const fact = factOf(() => evaluate(substance.latent(change, substance.defaultKind(change)), temperatureK));
    return fact.answer !== undefined;
  });
}

function onLadder(ladder: Ladder | undefined, temperatureK: number): boolean {
  const [first, last] = [ladder?.rungs[0], ladder?.rungs.at(-1)];
  return first !== undefined && last !== undefined && temperatureK >= first.fromK && temperatureK <= last.toK;
}

/** Where nothing is known of a ladder: the surroundings of 25 °C. */
const NOWHERE: Window = { fromK: 273.15, toK: 323.15 };

/** The state of one card; another substance is another card. */
export function useCard(substance: Substance): CardState {
  const [pressurePa, setPressure] = useState(STANDARD_ATMOSPHERE_PA);
  const [around, setAround] = useState<number>();
  const { ladder, problem } = useMemo(() => ladderAt(substance, pressurePa), [substance, pressurePa]);
  const base = useMemo(() => (ladder === undefined ? NOWHERE : temperatureWindow(ladder, around)), [ladder, around]);
  const [temperatureK, setTemperature] = useState(() => firstTemperature(substance, ladder, base));
  const [also, setAlso] = useState<number>();
  const window = useMemo(
    () => (also === undefined || !onLadder(ladder, also) ? base : widened(base, also)),
    [ladder, base, also],
  );
  return {
    pressurePa,
    temperatureK,
    around,
    ladder,
    problem,
    window,
    setPressure: (next) => {
      setPressure(next);
      setAround(undefined);
      setAlso(temperatureK);
    },
    setTemperature,
    goTo: (next) => {
      setTemperature(next);
      setAlso(next);
    },
    setAround: (place) => {
      setAround(place);
      const at = place === undefined ? undefined : ladder?.gaps[place]?.temperatureK;
      if (at !== undefined) setTemperature(at);
      setAlso(at ?? temperatureK);
    },
  };
}
