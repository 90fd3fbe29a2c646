import type { Mark } from '../../../../core/answer';
import { Problem } from '../../../../core/problem';
import type { Gap, Ladder, Rung, Substance } from '../../../../core/substance';
import { phasesOf } from '../facts/phaseFacts';
import { rungName, stableAt } from '../facts/stableAt';
import { belongsTo } from './belongsTo';
import { IDEAL_GAS, isIdeal } from './idealGas';

/** Where the line of one temperature meets a curve. */
export interface Crossing {
  readonly name: string;
  readonly enthalpy: number;
  /** Slope of the curve there, J/(mol K), where both sides of the point have a value. */
  readonly slope?: number;
  readonly stable: boolean;
  /** What its reader should know of the curve there, beside what the picture shows. */
  readonly marks: readonly string[];
}

/** The rungs on either side of a transition. */
function beside(ladder: Ladder, gap: Gap): readonly Rung[] {
  const at = ladder.gaps.indexOf(gap);
  return ladder.rungs.slice(at, at + 2);
}

/** Marks that the picture itself shows: by dashes and by the name. */
const SHOWN: readonly Mark['code'][] = ['metastable', 'ideal-gas'];

/** Half the width of the step that a slope is drawn from, K: wide against rounding, narrow against any bend. */
const HALF_K = 0.05;

/** Every curve of the diagram at one temperature, from low to high enthalpy; on a transition, both of its sides. */
export function crossings(substance: Substance, ladder: Ladder, temperatureK: number): Crossing[] {
  const { rung, gap } = stableAt(ladder, temperatureK);
  const found: Crossing[] = [];
  const own = gap === undefined ? (rung === undefined ? [] : [rung]) : beside(ladder, gap);
  for (const [side, one] of own.entries()) {
    const enthalpy = gap === undefined ? undefined : side === 0 ? gap.below : gap.above;
    const crossing = crossingOf(rungName(one), true, temperatureK, (t) => one.enthalpy(t), one.fromK, one.toK);
    if (enthalpy !== undefined) found.push({ ...crossing, name: rungName(one), enthalpy, stable: true, marks: [] });
    else if (crossing !== undefined) found.push(crossing);
  }
  for (const named of phasesOf(substance)) {
    const { phase, form } = named;
    if (own.some((one) => belongsTo(one, phase, form))) continue;
    const curve = attempt(() => substance.enthalpy(phase, ladder.pressurePa, form));
    if (curve === undefined || temperatureK < curve.from || temperatureK > curve.to) continue;
    const crossing = crossingOf(
      isIdeal(curve, temperatureK) ? IDEAL_GAS : rungName(named),
      false,
      temperatureK,
      (t) => curve.at(t),
      curve.from,
      curve.to,
    );
    const marks = (curve.marksAt?.(temperatureK) ?? []).filter(({ code }) => !SHOWN.includes(code));
    if (crossing !== undefined) found.push({ ...crossing, marks: marks.map(({ text }) => text) });
  }
  return found.sort((a, b) => a.enthalpy - b.enthalpy);
}

function crossingOf(
  name: string,
  stable: boolean,
  temperatureK: number,
  enthalpy: (t: number) => number,
  fromK: number,
  toK: number,
): Crossing | undefined {
  const here = attempt(() => enthalpy(temperatureK));
  if (here === undefined || !Number.isFinite(here)) return undefined;
  const low = Math.max(fromK, temperatureK - HALF_K);
  const high = Math.min(toK, temperatureK + HALF_K);
  const slope = high > low ? attempt(() => (enthalpy(high) - enthalpy(low)) / (high - low)) : undefined;
  const known = slope !== undefined && Number.isFinite(slope);
  return { name, enthalpy: here, stable, marks: [], ...(known ? { slope } : {}) };
}

function attempt<T>(work: () => T): T | undefined {
  try {
    return work();
  } catch (error) {
    if (error instanceof Problem) return undefined;
    throw error;
  }
}
