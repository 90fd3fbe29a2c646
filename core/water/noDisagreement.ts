import type { Answer } from '../answer';
import { evaluate } from '../evaluate';
import type { Change } from '../substance';
import { coexistenceCurve } from './coexistenceCurves';
import { betweenBranches } from './betweenBranches';

/**
 * The disagreement of water's latent heats and heat capacities, J/mol: 0, since both come from the same equations.
 *
 * @param change fusion, vaporization or sublimation
 * @param fromK one temperature, within the range of that latent heat
 * @param toK the other
 * @throws Problem `range` outside the range of the latent heat
 */
export function noDisagreement(change: Change, fromK: number, toK: number): Answer {
  const curve =
    change === 'fusion' ? betweenBranches(change, 'isobaric', 'latent') : coexistenceCurve(change, 'latent');
  evaluate(curve, fromK, 'refuse', 'from');
  return {
    ...evaluate(curve, toK, 'refuse', 'to'),
    value: 0,
    method: 'latent heat and heat capacities come from the same equations, so they cannot disagree',
  };
}
