import { written, type UnitWriter } from '../facts/unitWriter';
import type { Diagram } from './diagramOf';

/** How the diagram is read: what slopes, gaps and dashes are, as far as it has them. */
export function captionWords({ pressurePa, gaps, lines }: Diagram, writer: UnitWriter): string {
  const { pressure, heat, heatCapacity, decimal } = writer;
  const at = written(pressurePa, pressure, decimal);
  const slope = `A line’s slope is a heat capacity, in ${heatCapacity.unit}`;
  const words = [
    gaps.length === 0
      ? `${slope}. All of it is at ${at}.`
      : `${slope}; a gap is a latent heat, in ${heat.unit}, of the isobaric kind, since all of it is at ${at}.`,
    ...(lines.some(({ stable }) => !stable) ? ['Dashed: not the stable phase.'] : []),
  ];
  return words.join(' ');
}
