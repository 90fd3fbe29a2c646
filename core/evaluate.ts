import type { Answer, Mark } from './answer';
import { Problem } from './problem';
import type { Curve } from './substance';

/** What to do with an axis value outside a curve's published range. */
export type OutOfRange = 'refuse' | 'extend';

/** What unit conversion and the solver of an end leave of it, as a part of the value: the end itself is meant. */
const ROUNDING = 1e-9;

/**
 * Throws when `x` is off the curve's range and the policy refuses, or when the extension has no finite value. Nothing is
 * extended to a temperature or pressure of zero and below.
 */
export function valueAt(curve: Curve, x: number, policy: OutOfRange = 'refuse', argument: string = curve.axis): number {
  if (x >= curve.from && x <= curve.to) return finite(curve, x, argument);
  const end = endAt(curve, x);
  if (end !== undefined) return finite(curve, end, argument);
  if (policy === 'refuse' || !Number.isFinite(x) || x <= 0) throw outside(curve, x, argument);
  return finite(curve, x, argument);
}

/** The checked value with its uncertainty, range, sources and marks. */
export function evaluate(
  curve: Curve,
  x: number,
  policy: OutOfRange = 'refuse',
  argument: string = curve.axis,
): Answer {
  const value = valueAt(curve, x, policy, argument);
  const marks: Mark[] = [...(curve.marksAt?.(x) ?? [])];
  if ((x < curve.from || x > curve.to) && endAt(curve, x) === undefined) {
    marks.push({ code: 'extended', text: `outside the published range of ${curve.subject}` });
  }
  return {
    value,
    unit: curve.unit,
    uncertainty: curve.uncertaintyAt?.(x),
    kind: curve.kind,
    method: curve.method,
    sources: curve.sources,
    range: { axis: curve.axis, from: curve.from, to: curve.to },
    marks,
  };
}

/** The end of the range that a place outside it stands for, where only rounding has set the two apart. */
function endAt({ from, to }: Curve, x: number): number | undefined {
  const end = x < from ? from : to;
  return Math.abs(x - end) <= ROUNDING * Math.abs(end) ? end : undefined;
}

function finite(curve: Curve, x: number, argument: string): number {
  const value = curve.at(x);
  if (Number.isFinite(value)) return value;
  throw outside(curve, x, argument);
}

function outside(curve: Curve, x: number, argument: string): Problem {
  return new Problem({
    code: 'range',
    argument,
    quantity: curve.axis,
    received: x,
    from: curve.from,
    to: curve.to,
    subject: curve.subject,
  });
}
