import type { Answer, LatentKind } from '../answer';
import { Problem } from '../problem';
import type { Change } from '../substance';
import { missing, need } from './given';
import { latentCurve, type Around } from './latentCurves';
import { joined, NO_MARKS } from './marks';
import { heatKey, usualKind, type MaterialData } from './materialData';
import { materialHeatCapacity } from './phaseCurves';
import { formsOf } from './stations';

/** The usual kind, unless only another one is given. */
export function defaultKind(data: MaterialData, change: Change): LatentKind {
  const usual = usualKind(change);
  const kinds = [usual, 'coexistence', 'isobaric', 'standard'] as const;
  return kinds.find((kind) => data.heats.has(heatKey(change, kind))) ?? usual;
}

/** [L(to) − L(from)] − ∫Δcp dT where the heat is given by itself over a range; the two-phase line to the vapour needs real-gas data. */
export function disagreementOf(around: Around, change: Change, fromK: number, toK: number): Answer {
  const { data } = around;
  const kind = defaultKind(data, change);
  if (kind === 'coexistence') {
    throw missing(
      data,
      `real-gas correction along the two-phase line, without which the heat of ${change} and heat capacities can't be compared,`,
    );
  }
  const found = need(data, data.heats.get(heatKey(change, kind)), `heat of ${change}`);
  if (found.single) throw missing(data, `heat of ${change} at a second temperature`);
  const curve = latentCurve(around, change, kind, 'latent');
  const hotPhase =
    change === 'vaporization' || change === 'sublimation' ? 'gas' : change === 'fusion' ? 'liquid' : 'solid';
  const coldPhase = change === 'vaporization' ? 'liquid' : 'solid';
  const [coldForm, hotForm] = hotPhase === 'solid' ? change.split('-') : [formsOf(data.solidChanges).at(-1), undefined];
  const cold = materialHeatCapacity(data, coldPhase, 'standard', coldPhase === 'solid' ? coldForm : undefined);
  const hot = materialHeatCapacity(data, hotPhase, 'standard', hotForm);
  const from = Math.max(curve.from, cold.from, hot.from);
  const to = Math.min(curve.to, cold.to, hot.to);
  for (const received of [fromK, toK]) {
    if (received >= from && received <= to) continue;
    throw new Problem({
      code: 'range',
      argument: 'temperature',
      quantity: 'temperature',
      received,
      from,
      to,
      subject: `disagreement about ${change} of ${data.name}`,
    });
  }
  const area = (phase: string, form: string | undefined): number => {
    const given = data.heatCapacities.get(form ?? phase) ?? data.heatCapacities.get(phase);
    return need(data, given, `${phase} heat capacity`).shape.area(fromK, toK);
  };
  return {
    value:
      curve.at(toK) -
      curve.at(fromK) -
      (area(hotPhase, hotForm) - area(coldPhase, coldPhase === 'solid' ? coldForm : undefined)),
    unit: 'J/mol',
    kind,
    method: 'change of the heat given less the integral of the heat-capacity difference given',
    sources: [...new Set([...curve.sources, ...cold.sources, ...hot.sources])],
    range: { axis: 'temperature', from, to },
    marks: joined(
      curve.marksAt?.(fromK) ?? NO_MARKS,
      cold.marksAt?.(fromK) ?? NO_MARKS,
      hot.marksAt?.(fromK) ?? NO_MARKS,
    ),
  };
}
