import { shortNumber } from '../problem';
import type { Curve, Phase } from '../substance';
import { missing, need } from './given';
import { IDEAL_GAS, joined, NO_MARKS } from './marks';
import type { MaterialData } from './materialData';
import type { MaterialLadder } from './materialLadder';

function phaseName(data: MaterialData, phase: Phase, form: string | undefined): string {
  return `${form === undefined ? phase : `${phase} ${form}`} ${data.name}`;
}

/**
 * Heat capacity of a phase: condensed phases have the one that is given at every pressure, a real vapour has that of the
 * ideal gas and is marked so.
 */
export function materialHeatCapacity(
  data: MaterialData,
  phase: Phase,
  at: number | 'saturated' | 'standard',
  form?: string,
): Curve {
  const own = form === undefined ? undefined : data.heatCapacities.get(form);
  const piece = form === undefined ? `${phase} heat capacity` : `${phase} ${form} heat capacity`;
  const given = need(data, own ?? data.heatCapacities.get(phase), piece);
  const { shape, fromK, toK, method, sources, relativeUncertainty: share } = given;
  const uncertaintyAt = given.uncertaintyAt ?? (share === undefined ? undefined : (t: number) => share * shape.at(t));
  const marks = phase === 'gas' && at !== 'standard' ? joined(given.marks, IDEAL_GAS) : given.marks;
  return {
    axis: 'temperature',
    from: fromK,
    to: toK,
    subject: `heat capacity of ${phaseName(data, phase, form)}`,
    unit: 'J/(mol K)',
    ...(at === 'standard' ? { kind: 'standard' as const } : {}),
    method,
    sources,
    at: (t) => shape.at(t),
    ...(uncertaintyAt === undefined ? {} : { uncertaintyAt }),
    marksAt: () => marks,
  };
}

/** Enthalpy of a phase on the ladder of a pressure, also where another phase is the stable one there. */
export function materialEnthalpy(data: MaterialData, ladder: MaterialLadder, phase: Phase, form?: string): Curve {
  const rung = ladder.rungs.find((each) => each.phase === phase && (form === undefined || each.form === form));
  if (rung === undefined) throw missing(data, `enthalpy of the ${phase}, which no path at this pressure reaches`);
  const { cp, fromK, toK } = rung;
  const marks = joined(cp?.marks ?? NO_MARKS, phase === 'gas' ? IDEAL_GAS : NO_MARKS);
  const away = joined(marks, [{ code: 'metastable', text: `${phase}: another phase is the stable one here` }]);
  return {
    axis: 'temperature',
    from: cp?.fromK ?? fromK,
    to: cp?.toK ?? toK,
    subject: `enthalpy of ${phaseName(data, phase, form)} at ${shortNumber(ladder.pressurePa)} Pa`,
    unit: 'J/mol',
    method: 'heat capacity added up from where enthalpy is zero, with the heats of transition between',
    sources: ladder.sources,
    at: (t) => rung.enthalpy(t),
    marksAt: (t) => (t < fromK || t > toK ? away : marks),
  };
}
