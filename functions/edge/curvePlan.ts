import { evaluate, valueAt } from '../../core/evaluate';
import type { Curve } from '../../core/substance';
import type { Linear } from '../../core/units/linear';
import type { Settings } from '../settings/settings';
import type { Plan } from './spec';

/** The plan of a function that reads one curve at one quantity; `cell` writes SI in the workbook's unit. */
export function curvePlan(curve: Curve, { scale, offset }: Linear, settings: Settings, argument: string): Plan {
  const policy = settings.outOfRange;
  return {
    compute: (x) => valueAt(curve, x, policy, argument) * scale + offset,
    record: (x) => evaluate(curve, x, policy, argument),
    toCell: (si) => si * scale + offset,
    toCellDifference: (si) => si * scale,
  };
}
