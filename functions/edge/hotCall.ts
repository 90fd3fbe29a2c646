import type { Settings } from '../settings/settings';
import { lastPlanOf } from './lastPlan';
import type { CellwiseSpec } from './spec';

/**
 * The shortest way for the commonest call: single cells, the keys and settings of the last call, plain numbers.
 * Anything else, an error included, gives `undefined` and is left to the general way, which gives the same answer.
 */
export function hotCall(
  spec: CellwiseSpec,
  positional: readonly unknown[],
  settings: Settings,
): unknown[][] | undefined {
  const last = lastPlanOf(spec);
  if (last === undefined || last.settings !== settings || settings.options['answer'] !== undefined) return undefined;
  let key = 0;
  let slot = 0;
  let a = NaN;
  let b = NaN;
  let c = NaN;
  let d = NaN;
  for (let i = 0; i < spec.args.length; i++) {
    const raw = positional[i];
    const isKey = spec.args[i]?.kind === 'key';
    if (raw === undefined || raw === null) {
      if (spec.args[i]?.optional !== true || (isKey && last.keys[key++] !== undefined)) return undefined;
      if (!isKey) slot++;
      continue;
    }
    const cell = singleCell(raw);
    // A 0 may be a blank in disguise, which the general way finds out.
    if (isKey) {
      if (cell === '' || cell === 0 || cell !== last.keys[key++]) return undefined;
      continue;
    }
    if (typeof cell !== 'number' || cell === 0 || cell - cell !== 0) return undefined;
    const si = cell * (last.factors[i] as number) + (last.offsets[i] as number);
    if (slot === 0) a = si;
    else if (slot === 1) b = si;
    else if (slot === 2) c = si;
    else d = si;
    slot++;
  }
  try {
    const value = last.plan.compute(a, b, c, d);
    return typeof value === 'string' || value - value === 0 ? [[value]] : undefined;
  } catch {
    return undefined;
  }
}

/** The cell of a 1 × 1 block; `undefined` for anything larger. */
function singleCell(raw: unknown): unknown {
  if (!Array.isArray(raw) || raw.length !== 1) return undefined;
  const row: unknown = raw[0];
  return Array.isArray(row) && row.length === 1 ? row[0] : undefined;
}
