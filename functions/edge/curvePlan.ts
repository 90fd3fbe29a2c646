import { evaluate, valueAt } from '../../core/evaluate';
import type { Curve } from '../../core/substance';
import type { Settings } from '../settings/settings';
import type { Plan } from './spec';

/** How a value in SI is written in a cell: cell = si · scale + shift; a difference takes the scale alone. */
export interface CellScale {
  readonly scale: number;
  readonly shift: number;
}

/** The plan of a function that reads one curve at one quantity. */
export function curvePlan(curve: Curve, { scale, shift }: CellScale, settings: Settings, argument: string): Plan {
  const policy = settings.outOfRange;
  return {
    compute: (x) => valueAt(curve, x, policy, argument) * scale + shift,
    record: (x) => evaluate(curve, x, policy, argument),
    toCell: (si) => si * scale + shift,
    toCellDifference: (si) => si * scale,
  };
}
