import type { Change, Curve } from '../substance';
import { need } from './given';
import { ENDS, latentCurve, type Around } from './latentCurves';
import { IDEAL_GAS, joined, NO_MARKS } from './marks';

/**
 * The part of the coexistence slope that is no heat-capacity difference: the slope of the heat given less the
 * difference of the heat capacities given, J/(mol K).
 */
export function coexistenceTermCurve(around: Around, change: Change): Curve {
  const { data } = around;
  const line = latentCurve(around, change, 'coexistence', 'slope');
  const [coldPhase, hotPhase] = ENDS[change] ?? ['solid', 'solid'];
  const cold = need(data, data.heatCapacities.get(coldPhase), `${coldPhase} heat capacity`);
  const hot = need(data, data.heatCapacities.get(hotPhase), `${hotPhase} heat capacity`);
  const marks = joined(line.marksAt?.(line.from) ?? NO_MARKS, cold.marks, hot.marks, IDEAL_GAS);
  return {
    axis: 'temperature',
    subject: `pressure term of the heat of ${change} of ${data.name}`,
    from: Math.max(line.from, cold.fromK, hot.fromK),
    to: Math.min(line.to, cold.toK, hot.toK),
    unit: 'J/(mol K)',
    sources: [...new Set([...line.sources, ...cold.sources, ...hot.sources])],
    method: 'slope of the heat along the two-phase line less the difference of the heat capacities',
    at: (t) => line.at(t) - (hot.shape.at(t) - cold.shape.at(t)),
    marksAt: () => marks,
  };
}
