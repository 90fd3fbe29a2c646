import { Problem } from '../../../../core/problem';
import type { Curve, Gap, Ladder, Phase, Rung, Substance } from '../../../../core/substance';
import { phasesOf } from '../facts/phaseFacts';
import { rungName } from '../facts/stableAt';
import { belongsTo } from './belongsTo';
import { IDEAL_GAS, isIdeal } from './idealGas';
import type { Window } from './temperatureWindow';

/** A point of a curve, K and J/mol. */
export interface CurvePoint {
  readonly temperatureK: number;
  readonly enthalpy: number;
}

/** The enthalpy of a phase over temperatures where it is stable, or where it is followed beyond them. */
export interface DiagramLine {
  /** `liquid`, `solid (alpha)`. */
  readonly name: string;
  readonly phase: Rung['phase'];
  readonly stable: boolean;
  readonly points: readonly CurvePoint[];
}

/** An enthalpy-temperature diagram at one pressure, in SI. */
export interface Diagram {
  readonly pressurePa: number;
  readonly window: Window;
  readonly lines: readonly DiagramLine[];
  /** Transitions inside the window. */
  readonly gaps: readonly Gap[];
}

/** Points of one line: a straight line takes two, and no curve of the catalogue bends more than these show. */
const STEPS = 40;

/**
 * What is drawn at one pressure: a line for every rung of the ladder, a dashed line where a phase is followed beyond
 * the temperatures at which it is stable, and the transitions between them.
 *
 * @param followed names of the phases that are followed beyond their own temperatures; all where none are named
 */
export function diagramOf(
  substance: Substance,
  ladder: Ladder,
  window: Window,
  followed: readonly string[] | undefined,
): Diagram {
  const stable = ladder.rungs.map((rung) =>
    lineOf(rung, true, clipped(rung.fromK, rung.toK, window), (t) => rung.enthalpy(t)),
  );
  const beyond = phasesOf(substance).flatMap(({ phase, form }) => {
    if (followed?.includes(rungName({ phase, ...(form === undefined ? {} : { form }) })) === false) return [];
    const curve = curveOf(substance, phase, ladder.pressurePa, form);
    if (curve === undefined) return [];
    const own = ladder.rungs.filter((rung) => belongsTo(rung, phase, form));
    const named = { phase, ...(form === undefined ? {} : { form }) };
    return beside(curve, own).flatMap((part) => {
      const line = lineOf(named, false, clipped(part.fromK, part.toK, window), (t) => curve.at(t));
      return idealApart(line, (t) => isIdeal(curve, t));
    });
  });
  return {
    pressurePa: ladder.pressurePa,
    window,
    lines: [...stable, ...beyond].filter(({ points }) => points.length > 0),
    gaps: ladder.gaps.filter(({ temperatureK }) => temperatureK >= window.fromK && temperatureK <= window.toK),
  };
}

/** The parts of a curve's range outside the rungs on which its phase is stable. */
function beside(curve: Curve, own: readonly Rung[]): Window[] {
  if (own.length === 0) return [{ fromK: curve.from, toK: curve.to }];
  const low = Math.min(...own.map(({ fromK }) => fromK));
  const high = Math.max(...own.map(({ toK }) => toK));
  return [
    { fromK: curve.from, toK: low },
    { fromK: high, toK: curve.to },
  ].filter(({ fromK, toK }) => toK > fromK);
}

function clipped(fromK: number, toK: number, window: Window): Window | undefined {
  const part = { fromK: Math.max(fromK, window.fromK), toK: Math.min(toK, window.toK) };
  return part.fromK > part.toK ? undefined : part;
}

function lineOf(
  rung: Pick<Rung, 'phase' | 'form'>,
  stable: boolean,
  part: Window | undefined,
  enthalpy: (temperatureK: number) => number,
): DiagramLine {
  const points: CurvePoint[] = [];
  if (part !== undefined) {
    const steps = part.toK > part.fromK ? STEPS : 0;
    for (let i = 0; i <= steps; i++) {
      const temperatureK = i === steps ? part.toK : part.fromK + ((part.toK - part.fromK) * i) / STEPS;
      const value = valueOr(() => enthalpy(temperatureK));
      if (value !== undefined) points.push({ temperatureK, enthalpy: value });
    }
  }
  return { name: rungName(rung), phase: rung.phase, stable, points };
}

/** Where a vapour is followed as an ideal gas, that part is a line of its own: it need not meet the real one. */
function idealApart(line: DiagramLine, ideal: (temperatureK: number) => boolean): DiagramLine[] {
  const parts: { ideal: boolean; points: CurvePoint[] }[] = [];
  for (const point of line.points) {
    const here = ideal(point.temperatureK);
    const last = parts.at(-1);
    if (last !== undefined && last.ideal === here) last.points.push(point);
    else parts.push({ ideal: here, points: [point] });
  }
  return parts.map((part) => ({ ...line, name: part.ideal ? IDEAL_GAS : line.name, points: part.points }));
}

/** A phase without an enthalpy at this pressure is not drawn. */
function curveOf(substance: Substance, phase: Phase, pressurePa: number, form?: string): Curve | undefined {
  try {
    return substance.enthalpy(phase, pressurePa, form);
  } catch (error) {
    if (error instanceof Problem) return undefined;
    throw error;
  }
}

/** A point where the equation has no value is left out. */
function valueOr(ask: () => number): number | undefined {
  try {
    const value = ask();
    return Number.isFinite(value) ? value : undefined;
  } catch (error) {
    if (error instanceof Problem) return undefined;
    throw error;
  }
}
