import { answer } from './edge/answer';
import { curvePlan } from './edge/curvePlan';
import { substanceKey, surfaceOption } from './edge/keys';
import { onScale } from './edge/scale';
import type { CellwiseSpec } from './edge/spec';

const spec: CellwiseSpec = {
  family: 'cellwise',
  name: 'SATPRESSURE',
  args: [
    { name: 'substance', kind: 'key' },
    { name: 'temperature', kind: 'temperature' },
  ],
  options: ['surface'],
  plan: (keys, settings) => {
    const curve = substanceKey(keys[0]).saturationPressure(surfaceOption(settings));
    return curvePlan(curve, onScale(settings.units.pressure, settings), settings, 'temperature');
  },
};

/**
 * Saturation pressure over the stable phase at a temperature: over ice below the triple point, over liquid above it.
 * @customfunction SATPRESSURE
 * @requiresParameterAddresses
 * @param substance Substance by name, formula or CAS number, as "water".
 * @param temperature Temperature in the workbook's unit, or text with a unit as "-20 degC".
 * @param [settings] Latentry_units, or text as "pressure=Pa; surface=liquid".
 * @param invocation The call itself.
 * @returns Pressure in the workbook's pressure unit.
 */
export function satPressure(
  substance: any[][],
  temperature: any[][],
  settings?: any[][][],
  invocation?: CustomFunctions.Invocation,
): any[][] {
  return answer(spec, [substance, temperature, settings, invocation]);
}
