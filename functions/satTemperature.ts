import { answer } from './edge/answer';
import { curvePlan } from './edge/curvePlan';
import { substanceKey, surfaceOption } from './edge/keys';
import { onScale } from './edge/scale';
import type { CellwiseSpec } from './edge/spec';

const spec: CellwiseSpec = {
  family: 'cellwise',
  name: 'SATTEMPERATURE',
  args: [
    { name: 'substance', kind: 'key' },
    { name: 'pressure', kind: 'pressure' },
  ],
  options: ['surface'],
  plan: (keys, settings) => {
    const curve = substanceKey(keys[0]).saturationTemperature(surfaceOption(settings));
    return curvePlan(curve, onScale(settings.units.temperature, settings), settings, 'pressure');
  },
};

/**
 * Temperature at which a substance boils, or below the triple-point pressure sublimes, at a pressure.
 * @customfunction SATTEMPERATURE
 * @requiresParameterAddresses
 * @param substance Substance by name, formula or CAS number, as "water".
 * @param pressure Pressure in the workbook's unit (absolute unless that says gauge), or text as "2 bar gauge".
 * @param [settings] Latentry_units, or text as "temperature=K; surface=liquid".
 * @param invocation The call itself.
 * @returns Temperature in the workbook's unit.
 */
export function satTemperature(
  substance: any[][],
  pressure: any[][],
  settings?: any[][][],
  invocation?: CustomFunctions.Invocation,
): any[][] {
  return answer(spec, [substance, pressure, settings, invocation]);
}
