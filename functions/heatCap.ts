import type { Answer } from '../core/answer';
import { evaluate, valueAt } from '../core/evaluate';
import { meanOver } from '../core/meanOver';
import { Problem } from '../core/problem';
import { answer } from './edge/answer';
import { phaseKey, substanceKey, wordOption } from './edge/keys';
import { orAtmosphere } from './edge/pathPlan';
import type { CellwiseSpec, Key, Plan } from './edge/spec';
import type { Settings } from './settings/settings';
import type { Curve } from '../core/substance';
import { fromMolar } from '../core/units/fromMolar';

const spec: CellwiseSpec = {
  family: 'cellwise',
  name: 'HEATCAP',
  args: [
    { name: 'substance', kind: 'key' },
    { name: 'phase', kind: 'key' },
    { name: 'temperature', kind: 'temperature' },
    { name: 'pressure', kind: 'pressure', optional: true },
    { name: 'mean_to', kind: 'temperature', optional: true },
  ],
  options: ['kind', 'along'],
  plan,
};

function plan(keys: readonly Key[], settings: Settings): Plan {
  const substance = substanceKey(keys[0]);
  const { phase, form } = phaseKey(substance, keys[1]);
  const standard = wordOption(settings, 'kind', ['real', 'standard'], 'real') === 'standard';
  const saturated = wordOption(settings, 'along', ['pressure', 'saturation'], 'pressure') === 'saturation';
  let last: { pressurePa: number; curve: Curve } | undefined;
  const curveAt = (pressurePa: number): Curve => {
    if ((standard || saturated) && pressurePa === pressurePa) {
      throw new Problem({
        code: 'argument',
        argument: 'pressure',
        allowed: `none with ${standard ? 'kind=standard' : 'along=saturation'}`,
        received: 'a pressure',
      });
    }
    const at = orAtmosphere(pressurePa);
    if (last === undefined || last.pressurePa !== at) {
      last = {
        pressurePa: at,
        curve: substance.heatCapacity(phase, standard ? 'standard' : saturated ? 'saturated' : at, form),
      };
    }
    return last.curve;
  };
  const { scale } = fromMolar(settings.units.heatCapacity, substance.molarMass);
  const value = (temperatureK: number, pressurePa: number, meanToK: number): number => {
    const curve = curveAt(pressurePa);
    return meanToK === meanToK
      ? meanOver(curve, temperatureK, meanToK, settings.outOfRange)
      : valueAt(curve, temperatureK, settings.outOfRange);
  };
  return {
    compute: (t, p, m) => value(t, p, m) * scale,
    record: (t, p, m): Answer => ({ ...evaluate(curveAt(p), t, settings.outOfRange), value: value(t, p, m) }),
    toCell: (si) => si * scale,
  };
}

/**
 * Heat capacity of a phase at constant pressure, or its mean between two temperatures.
 * @customfunction HEATCAP
 * @requiresParameterAddresses
 * @param substance Substance by name, formula or CAS number, as "water".
 * @param phase solid, liquid or gas, or the name of a crystal form as "gamma".
 * @param temperature Temperature in the workbook's unit, or text with a unit.
 * @param [pressure] Pressure of the phase; one standard atmosphere when left out.
 * @param [mean_to] Other end of the interval, for the mean heat capacity over it.
 * @param [settings] Latentry_units, or text as "kind=standard" (ideal gas) or "along=saturation".
 * @param invocation The call itself.
 * @returns Heat capacity in the workbook's heat-capacity unit.
 */
export function heatCap(
  substance: any[][],
  phase: any[][],
  temperature: any[][],
  pressure?: any[][],
  mean_to?: any[][],
  settings?: any[][][],
  invocation?: CustomFunctions.Invocation,
): any[][] {
  return answer(spec, [substance, phase, temperature, pressure, mean_to, settings, invocation]);
}
