import type { Settings } from '../settings/settings';
import { ArgReader } from './argReader';
import type { Block } from './block';
import { CellFault } from './cell';
import { faultOf } from './cellError';
import { commonShape } from './broadcast';
import { answerPart, showPart, statusOf, type AnswerPart } from './evidence';
import { planFor } from './lastPlan';
import type { CellwiseSpec, Element, Key, Plan } from './spec';

/** Computes every element of the common shape of the arguments by itself. */
export function runCellwise(
  spec: CellwiseSpec,
  blocks: readonly (Block | undefined)[],
  settings: Settings,
): Element[][] {
  const shape = commonShape(blocks);
  const part = answerPart(settings);
  const readers = spec.args.map((arg, i) => new ArgReader(arg, blocks[i], settings));
  const keyed = readers.filter((r) => r.isKey);
  const quantities = readers.filter((r) => !r.isKey);
  const plans: PlanFinder = (keys) => planFor(spec, keys, settings);
  const only = quantities.find((r) => r.varies);
  if (part === 'value' && keyed.every((r) => !r.varies) && quantities.every((r) => r === only || !r.varies)) {
    return runColumn(shape, keyed, quantities, only, plans, settings);
  }
  const rows: Element[][] = [];
  for (let r = 0; r < shape.rows; r++) {
    const row: Element[] = [];
    for (let c = 0; c < shape.columns; c++) row.push(oneElement(r, c, keyed, quantities, plans, part, settings));
    rows.push(row);
  }
  return rows;
}

type PlanFinder = (keys: readonly Key[]) => Plan;

/** One plan, at most one argument that varies: nothing is allocated per element but its row. */
function runColumn(
  shape: { rows: number; columns: number },
  keyed: readonly ArgReader[],
  quantities: readonly ArgReader[],
  only: ArgReader | undefined,
  plans: PlanFinder,
  settings: Settings,
): Element[][] {
  const keys = keyed.map((r) => r.key(0, 0));
  for (const key of keys) if (key instanceof CellFault) return filled(shape, key);
  const plan = plans(keys as Key[]);
  const fixed = [NaN, NaN, NaN, NaN];
  let slot = 0;
  for (const [i, reader] of quantities.entries()) {
    if (reader === only) {
      slot = i;
      continue;
    }
    const value = reader.quantity(0, 0);
    if (typeof value !== 'number') return filled(shape, value === '' ? reader.blankFault() : value);
    fixed[i] = value;
  }
  const [f0 = NaN, f1 = NaN, f2 = NaN, f3 = NaN] = fixed;
  const { compute } = plan;
  const at: (x: number) => number | string =
    slot === 0
      ? (x) => compute(x, f1, f2, f3)
      : slot === 1
        ? (x) => compute(f0, x, f2, f3)
        : slot === 2
          ? (x) => compute(f0, f1, x, f3)
          : (x) => compute(f0, f1, f2, x);
  const element = (r: number, c: number): Element => {
    const x = only === undefined ? f0 : only.quantity(r, c);
    if (typeof x !== 'number') return x;
    try {
      return at(x);
    } catch (thrown) {
      return faultOf(thrown, settings);
    }
  };
  const rows: Element[][] = new Array<Element[]>(shape.rows);
  for (let r = 0; r < shape.rows; r++) {
    const row = [element(r, 0)];
    for (let c = 1; c < shape.columns; c++) row.push(element(r, c));
    rows[r] = row;
  }
  return rows;
}

function filled(shape: { rows: number; columns: number }, element: Element): Element[][] {
  return Array.from({ length: shape.rows }, () => new Array<Element>(shape.columns).fill(element));
}

function oneElement(
  r: number,
  c: number,
  keyed: readonly ArgReader[],
  quantities: readonly ArgReader[],
  plans: PlanFinder,
  part: AnswerPart,
  settings: Settings,
): Element {
  const keys: Key[] = [];
  for (const reader of keyed) {
    const key = reader.key(r, c);
    if (key instanceof CellFault) return part === 'status' ? statusOf(key) : key;
    if (key === '') return '';
    keys.push(key);
  }
  const numbers: number[] = [];
  for (const reader of quantities) {
    const value = reader.quantity(r, c);
    if (value instanceof CellFault) return part === 'status' ? statusOf(value) : value;
    if (value === '') return '';
    numbers.push(value);
  }
  try {
    const plan = plans(keys);
    if (part !== 'value') return showPart(part, plan, numbers, settings);
    const [a = NaN, b = NaN, x = NaN, d = NaN] = numbers;
    return plan.compute(a, b, x, d);
  } catch (thrown) {
    const fault = faultOf(thrown, settings);
    return part === 'status' ? statusOf(fault) : fault;
  }
}
