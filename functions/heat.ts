import { heatSteps } from '../core/path/heatSteps';
import { fromMolar } from '../core/units/fromMolar';
import { answer } from './edge/answer';
import { substanceKey } from './edge/keys';
import { orAtmosphere, pathRecord } from './edge/pathPlan';
import type { CellwiseSpec } from './edge/spec';
import { stateKey } from './edge/stateText';

const spec: CellwiseSpec = {
  family: 'cellwise',
  name: 'HEAT',
  args: [
    { name: 'substance', kind: 'key' },
    { name: 'from', kind: 'key' },
    { name: 'to', kind: 'key' },
    { name: 'pressure', kind: 'pressure', optional: true },
  ],
  options: [],
  plan: (keys, settings) => {
    const substance = substanceKey(keys[0]);
    const from = stateKey('from', keys[1], settings);
    const to = stateKey('to', keys[2], settings);
    const { scale } = fromMolar(settings.units.heat, substance.molarMass);
    const path = (p: number) => heatSteps(substance, from, to, orAtmosphere(p), settings.outOfRange);
    return {
      compute: (p) => path(p).heat * scale,
      record: (p) => pathRecord(path(p)),
      toCell: (si) => si * scale,
    };
  },
};

/**
 * Heat per amount taken up between two states at one pressure, through every phase and transition between them.
 * @customfunction HEAT
 * @requiresParameterAddresses
 * @param substance Substance by name, formula or CAS number, as "water".
 * @param from First state: temperature in the workbook's unit, or text as "-20 degC", "98 degC liquid", "saturated liquid", "melting solid".
 * @param to Last state, in the same way.
 * @param [pressure] Absolute pressure unless it says gauge; one standard atmosphere when left out.
 * @param [settings] Latentry_units, or text as "heat=kJ/mol".
 * @param invocation The call itself.
 * @returns Heat in the workbook's heat unit; negative where it is given up.
 */
export function heat(
  substance: any[][],
  from: any[][],
  to: any[][],
  pressure?: any[][],
  settings?: any[][][],
  invocation?: CustomFunctions.Invocation,
): any[][] {
  return answer(spec, [substance, from, to, pressure, settings, invocation]);
}
