import type { Ladder } from '../../../../core/substance';
import { rungName, stableAt } from './stableAt';
import { written, type UnitWriter } from './unitWriter';

/** What is stable at a temperature, in words: "At 25 °C: liquid". */
export function stateWords(ladder: Ladder | undefined, temperatureK: number, writer: UnitWriter): string {
  const at = `At ${written(temperatureK, writer.temperature, writer.decimal)}`;
  if (ladder === undefined) return at;
  const { rung, gap } = stableAt(ladder, temperatureK);
  if (gap !== undefined) {
    const place = ladder.gaps.indexOf(gap);
    const sides = ladder.rungs.slice(place, place + 2).map(rungName);
    return `${at}: ${gap.change}, ${sides.join(' and ')} together`;
  }
  if (rung === undefined) return `${at}: ${beyondWords(ladder, temperatureK)}`;
  return rung.phase === 'supercritical' ? `${at}: supercritical fluid` : `${at}: ${rungName(rung)}`;
}

/** What a path beyond the ends of the ladder lacks. */
function beyondWords({ rungs, missingBelow, missingAbove }: Ladder, temperatureK: number): string {
  const lacking = temperatureK < (rungs[0]?.fromK ?? 0) ? missingBelow : missingAbove;
  return lacking === undefined ? 'the stable phase is not known' : `beyond the ${lacking}`;
}
