import type { Answer, LatentKind, Mark } from '../answer';
import type { OutOfRange } from '../evaluate';
import { Problem } from '../problem';

/** What is known of a method before it is fed with numbers. */
export interface Method {
  /** What its range belongs to in a message, as in "Riedel's estimate". */
  readonly subject: string;
  readonly unit: string;
  readonly kind?: LatentKind;
  /** Equation by name, and its typical error in words. */
  readonly method: string;
  readonly sources: readonly string[];
  readonly marks?: readonly Mark[];
}

/** The place on the method's axis, and the range in which it holds; SI. */
export interface Place {
  readonly argument: string;
  readonly temperatureK: number;
  readonly fromK: number;
  readonly toK: number;
}

/**
 * The record of one estimate.
 *
 * @throws Problem `range` outside the method's range (unless extended), and where its equation has no finite value
 */
export function estimated(
  method: Method,
  { argument, temperatureK, fromK, toK }: Place,
  value: number,
  uncertainty: number,
  policy: OutOfRange,
): Answer {
  const inside = temperatureK >= fromK && temperatureK <= toK;
  if (!Number.isFinite(value) || (!inside && policy === 'refuse')) {
    throw new Problem({
      code: 'range',
      argument,
      quantity: 'temperature',
      received: temperatureK,
      from: fromK,
      to: toK,
      subject: method.subject,
    });
  }
  const marks = [...(method.marks ?? [])];
  if (!inside) marks.push({ code: 'extended', text: `outside the range of ${method.subject}` });
  return {
    value,
    unit: method.unit,
    uncertainty: Math.abs(uncertainty),
    kind: method.kind,
    method: method.method,
    sources: method.sources,
    range: { axis: 'temperature', from: fromK, to: toK },
    marks,
  };
}
