import type { LatentKind, Mark } from '../answer';
import type { Curve } from '../substance';

/** What differs between the curves of a fluid. */
export interface FluidCurveParts {
  readonly axis?: 'temperature' | 'pressure';
  readonly from: number;
  readonly to: number;
  readonly subject: string;
  readonly unit: Curve['unit'];
  readonly kind?: LatentKind;
  readonly method: string;
  readonly sources: readonly string[];
  readonly value: (x: number) => number;
  readonly uncertaintyAt?: (x: number) => number | undefined;
  readonly marksAt?: (x: number) => readonly Mark[];
  /** Beyond these the value is not a number, whatever the policy; the range where they are absent. */
  readonly reach?: readonly [number, number];
}

export function fluidCurve(parts: FluidCurveParts): Curve {
  const { value, from, to, reach = [from, to], axis = 'temperature', ...rest } = parts;
  const [lowest, highest] = reach;
  const { kind, uncertaintyAt, marksAt } = rest;
  return {
    axis,
    from,
    to,
    subject: rest.subject,
    unit: rest.unit,
    method: rest.method,
    sources: rest.sources,
    at: (x) => (x >= lowest && x <= highest ? value(x) : NaN),
    ...(kind === undefined ? {} : { kind }),
    ...(uncertaintyAt === undefined ? {} : { uncertaintyAt }),
    ...(marksAt === undefined ? {} : { marksAt }),
  };
}
