import { fromMolar } from '../core/units/fromMolar';
import { answer } from './edge/answer';
import { changeKey, substanceKey } from './edge/keys';
import type { CellwiseSpec } from './edge/spec';

const spec: CellwiseSpec = {
  family: 'cellwise',
  name: 'DISAGREEMENT',
  args: [
    { name: 'substance', kind: 'key' },
    { name: 'change', kind: 'key' },
    { name: 'from', kind: 'temperature' },
    { name: 'to', kind: 'temperature' },
  ],
  options: [],
  plan: (keys, settings) => {
    const substance = substanceKey(keys[0]);
    const { change, sign } = changeKey(substance, keys[1]);
    const scale = sign * fromMolar(settings.units.heat, substance.molarMass).scale;
    return {
      compute: (fromK, toK) => substance.disagreement(change, fromK, toK).value * scale,
      record: (fromK, toK) => substance.disagreement(change, fromK, toK),
      toCell: (si) => si * scale,
    };
  },
};

/**
 * How far independent data for a latent heat and for the heat capacities of its phases disagree between two temperatures: its rise less what they make of it, positive where it rises more; 0 where both come from one equation.
 * @customfunction DISAGREEMENT
 * @requiresParameterAddresses
 * @param substance Substance by name, formula or CAS number, as "ethanol".
 * @param change vaporization, fusion, sublimation, or a solid-solid change; words of the opposite direction turn the sign.
 * @param from One temperature in the workbook's unit, or text with a unit.
 * @param to The other temperature.
 * @param [settings] Latentry_units, or text as "heat=kJ/mol" or "answer=method".
 * @param invocation The call itself.
 * @returns Heat per amount in the workbook's unit: [L(to) - L(from)] less the integral of the heat-capacity difference.
 */
export function disagreement(
  substance: any[][],
  change: any[][],
  from: any[][],
  to: any[][],
  settings?: any[][][],
  invocation?: CustomFunctions.Invocation,
): any[][] {
  return answer(spec, [substance, change, from, to, settings, invocation]);
}
