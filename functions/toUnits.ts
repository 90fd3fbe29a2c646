import { convert } from '../core/units/convert';
import { unitOf } from '../core/units/unitOf';
import { answer } from './edge/answer';
import { substanceKey, textKey, wordOption } from './edge/keys';
import type { CellwiseSpec, Key, Plan } from './edge/spec';
import type { Settings } from './settings/settings';

const spec: CellwiseSpec = {
  family: 'cellwise',
  name: 'TOUNITS',
  args: [
    { name: 'value', kind: 'number' },
    { name: 'from', kind: 'key' },
    { name: 'to', kind: 'key' },
    { name: 'substance', kind: 'key', optional: true },
  ],
  options: ['kind'],
  plan,
};

function plan([fromText, toText, substance]: readonly Key[], settings: Settings): Plan {
  const from = unitOf(textKey('from', fromText), undefined, 'from');
  const to = unitOf(textKey('to', toText), undefined, 'to');
  const as = wordOption(settings, 'kind', ['point', 'difference'], undefined);
  const molarMass = substance === undefined ? undefined : substanceKey(substance).molarMass;
  const needs = { molarMass, barometerPa: settings.barometerPa, as };
  return { compute: (value) => convert(value, from, to, needs) };
}

/**
 * A value converted between units: molar against per mass with a substance, gauge against absolute with the barometer.
 * @customfunction TOUNITS
 * @requiresParameterAddresses
 * @param value Number in the unit `from`.
 * @param from Unit of the value, as "kcal_th/mol" or "bar gauge".
 * @param to Unit of the answer, as "kJ/kg" or "kPa".
 * @param [substance] Substance whose molar mass stands between moles and mass.
 * @param [settings] Latentry_units, or text as "kind=point" or "kind=difference" for temperatures.
 * @param invocation The call itself.
 * @returns Number in the unit `to`.
 */
export function toUnits(
  value: any[][],
  from: any[][],
  to: any[][],
  substance?: any[][],
  settings?: any[][][],
  invocation?: CustomFunctions.Invocation,
): any[][] {
  return answer(spec, [value, from, to, substance, settings, invocation]);
}
