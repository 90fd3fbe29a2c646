import type { Ladder } from '../../../../core/substance';
import { number } from '../../look/number';
import { rungName, stableAt } from '../facts/stableAt';
import { written, type UnitWriter } from '../facts/unitWriter';
import type { Crossing } from './crossings';

/** What the slider says with each move: the temperature, what is stable there, and the heat between neighbouring curves. */
export function sliderWords(
  ladder: Ladder,
  crossings: readonly Crossing[],
  temperatureK: number,
  { temperature, heat, decimal }: UnitWriter,
): string {
  const { rung, gap } = stableAt(ladder, temperatureK);
  const state = gap?.change ?? (rung === undefined ? 'nothing known' : rungName(rung));
  const heats = crossings.slice(1).map((upper, i) => {
    const lower = crossings[i] ?? upper;
    const between = number(Number(((upper.enthalpy - lower.enthalpy) * heat.scale).toPrecision(5)), decimal);
    return `${lower.name} to ${upper.name} ${between} ${heat.unit}`;
  });
  return [written(temperatureK, temperature, decimal), state, ...heats].join(', ');
}
