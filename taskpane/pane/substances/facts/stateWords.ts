import type { Ladder } from '../../../../core/substance';
import { rungName, stableAt } from './stableAt';
import { written, type UnitWriter } from './unitWriter';

/** What is stable at a temperature and pressure, in words. */
export function stateWords(ladder: Ladder, temperatureK: number, writer: UnitWriter): string {
  const { temperature, pressure, decimal } = writer;
  const at = `At ${written(temperatureK, temperature, decimal)} and ${written(ladder.pressurePa, pressure, decimal)}`;
  const { rung, gap } = stableAt(ladder, temperatureK);
  if (gap !== undefined) {
    const place = ladder.gaps.indexOf(gap);
    const [below, above] = [ladder.rungs[place], ladder.rungs[place + 1]];
    const sides =
      below === undefined || above === undefined ? '' : `, ${rungName(below)} and ${rungName(above)} together`;
    return `${at}: ${gap.change}${sides}.`;
  }
  if (rung !== undefined) {
    return rung.phase === 'supercritical' ? `${at}: supercritical fluid.` : `${at}: ${rungName(rung)} is stable.`;
  }
  return `${at}: nothing is known of the stable phase.`;
}
