import type { Ladder } from '../../../../core/substance';
import { written, type UnitWriter } from '../facts/unitWriter';
import type { Diagram } from './diagramOf';
import type { Window } from './temperatureWindow';

/** How the diagram is read: what slopes, gaps and dashes are, as far as it has them, and what lies beyond its ends. */
export function captionWords({ pressurePa, gaps, lines, window }: Diagram, ladder: Ladder, writer: UnitWriter): string {
  const { pressure, heat, heatCapacity, decimal } = writer;
  const at = written(pressurePa, pressure, decimal);
  const slope = `A line’s slope is a heat capacity, in ${heatCapacity.unit}`;
  const words = [
    gaps.length === 0
      ? `${slope}. All of it is at ${at}.`
      : `${slope}; a gap is a latent heat, in ${heat.unit}, of the isobaric kind, since all of it is at ${at}.`,
    ...(lines.some(({ stable }) => !stable) ? ['Dashed: not the stable phase.'] : []),
    ...lackWords(ladder, window),
  ];
  return words.join(' ');
}

/** What is lacking beyond an end of the ladder that is an edge of the picture. */
function lackWords({ rungs, missingBelow, missingAbove }: Ladder, { fromK, toK }: Window): string[] {
  const [low, high] = [rungs[0]?.fromK, rungs.at(-1)?.toK];
  return [
    ...(missingBelow !== undefined && low !== undefined && fromK <= low
      ? [`Colder it would take the ${missingBelow}.`]
      : []),
    ...(missingAbove !== undefined && high !== undefined && toK >= high
      ? [`Hotter it would take the ${missingAbove}.`]
      : []),
  ];
}
