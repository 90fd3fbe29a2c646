import type { Answer, Mark } from './answer';
import { Problem } from './problem';
import type { Curve } from './substance';

/** What to do with an axis value outside a curve's published range. */
export type OutOfRange = 'refuse' | 'extend';

/** Throws when `x` is off the curve's range and the policy refuses, or when the extension has no finite value. */
export function valueAt(curve: Curve, x: number, policy: OutOfRange = 'refuse', argument: string = curve.axis): number {
  if (x >= curve.from && x <= curve.to) return finite(curve, x, argument);
  if (policy === 'refuse' || !Number.isFinite(x)) throw outside(curve, x, argument);
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
  if (x < curve.from || x > curve.to) {
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
