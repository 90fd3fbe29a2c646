import type { Gap, Ladder, Rung } from '../../../../core/substance';
import { rungName } from '../facts/stableAt';

/** One line of the diagram's table: a phase with its mean slope, or a transition with its latent heat. SI. */
export type DiagramRow =
  | {
      readonly of: 'phase';
      readonly name: string;
      readonly fromK: number;
      readonly toK: number;
      readonly slope?: number;
    }
  | { readonly of: 'transition'; readonly name: string; readonly atK: number; readonly latent: number };

/** A ladder from cold to hot as a table. */
export function diagramRows({ rungs, gaps }: Ladder): DiagramRow[] {
  return rungs.flatMap((rung, i) => {
    const gap = gaps[i];
    return gap === undefined ? [phaseRow(rung)] : [phaseRow(rung), transitionRow(gap)];
  });
}

function phaseRow(rung: Rung): DiagramRow {
  const { fromK, toK } = rung;
  const slope = toK > fromK ? (rung.enthalpy(toK) - rung.enthalpy(fromK)) / (toK - fromK) : undefined;
  return {
    of: 'phase',
    name: rungName(rung),
    fromK,
    toK,
    ...(slope !== undefined && Number.isFinite(slope) ? { slope } : {}),
  };
}

function transitionRow({ change, temperatureK, below, above }: Gap): DiagramRow {
  return { of: 'transition', name: change, atK: temperatureK, latent: above - below };
}
