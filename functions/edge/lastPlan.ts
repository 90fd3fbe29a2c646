import { houseStore } from '../house/store';
import type { Settings } from '../settings/settings';
import type { ArgKind, CellwiseSpec, Key, Plan } from './spec';
import { unitFor } from './unitFor';

/** The plan of a function's last call, kept because most calls repeat it. */
export interface LastPlan {
  readonly keys: readonly Key[];
  readonly settings: Settings;
  readonly plan: Plan;
  /** SI = factor · number + offset, by argument; NaN for keys. */
  readonly factors: readonly number[];
  readonly offsets: readonly number[];
}

let kept = new WeakMap<CellwiseSpec, LastPlan>();

// What a name means may have changed: no kept plan holds.
houseStore.subscribe(() => {
  kept = new WeakMap();
});

export function lastPlanOf(spec: CellwiseSpec): LastPlan | undefined {
  return kept.get(spec);
}

/** The plan for these keys and settings: the last one where they are the same, else a new one, kept from now on. */
export function planFor(spec: CellwiseSpec, keys: readonly Key[], settings: Settings): Plan {
  const last = kept.get(spec);
  if (last !== undefined && last.settings === settings && sameKeys(last.keys, keys)) return last.plan;
  const plan = spec.plan(keys, settings);
  const scales = spec.args.map((arg) => scaleOf(arg.kind, settings));
  const factors = scales.map(({ factor }) => factor);
  kept.set(spec, { keys: [...keys], settings, plan, factors, offsets: scales.map(({ offset }) => offset) });
  return plan;
}

/** How a bare number of an argument becomes SI: by the workbook's unit, gauge pressures with the barometer added. */
export function scaleOf(kind: ArgKind, settings: Settings): { readonly factor: number; readonly offset: number } {
  if (kind === 'key' || kind === 'block') return { factor: NaN, offset: NaN };
  if (kind === 'number') return { factor: 1, offset: 0 };
  const unit = unitFor(kind, settings);
  return { factor: unit.factor, offset: unit.offset + (unit.gauge ? settings.barometerPa : 0) };
}

function sameKeys(a: readonly Key[], b: readonly Key[]): boolean {
  for (let i = 0; i < b.length; i++) if (a[i] !== b[i]) return false;
  return a.length === b.length;
}
