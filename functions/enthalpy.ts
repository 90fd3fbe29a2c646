import { placeState } from '../core/path/placeState';
import { fromMolar } from '../core/units/fromMolar';
import { answer } from './edge/answer';
import { substanceKey } from './edge/keys';
import { orAtmosphere, placeRecord } from './edge/pathPlan';
import type { CellwiseSpec } from './edge/spec';
import { stateKey } from './edge/stateText';

const spec: CellwiseSpec = {
  family: 'cellwise',
  name: 'ENTHALPY',
  args: [
    { name: 'substance', kind: 'key' },
    { name: 'state', kind: 'key' },
    { name: 'pressure', kind: 'pressure', optional: true },
  ],
  options: [],
  plan: (keys, settings) => {
    const substance = substanceKey(keys[0]);
    const state = stateKey('state', keys[1], settings);
    const { scale } = fromMolar(settings.units.heat, substance.molarMass);
    const place = (p: number) => placeState(substance, state, orAtmosphere(p), settings.outOfRange);
    return {
      compute: (p) => place(p).enthalpy * scale,
      record: (p) => placeRecord(place(p), substance.ladder(orAtmosphere(p)), substance.enthalpyReference),
      toCell: (si) => si * scale,
    };
  },
};

/**
 * Enthalpy of one state, for balances; its zero is named by answer=method.
 * @customfunction ENTHALPY
 * @requiresParameterAddresses
 * @param substance Substance by name, formula or CAS number, as "water".
 * @param state Temperature in the workbook's unit, or text as "98 degC liquid", "saturated vapor", "vapor fraction 0.95", "subcooled 5 K".
 * @param [pressure] Absolute pressure unless it says gauge; one standard atmosphere when left out.
 * @param [settings] Latentry_units, or text as "heat=kJ/mol".
 * @param invocation The call itself.
 * @returns Enthalpy in the workbook's heat unit.
 */
export function enthalpy(
  substance: any[][],
  state: any[][],
  pressure?: any[][],
  settings?: any[][][],
  invocation?: CustomFunctions.Invocation,
): any[][] {
  return answer(spec, [substance, state, pressure, settings, invocation]);
}
