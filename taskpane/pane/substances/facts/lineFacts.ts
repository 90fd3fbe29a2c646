import { evaluate } from '../../../../core/evaluate';
import { placeState } from '../../../../core/path/placeState';
import type { Substance } from '../../../../core/substance';
import { factOf } from './fact';
import type { FactsAt } from './latentFacts';
import type { Quantity } from './quantity';

/** The line that vapour shares with what is stable below it, and the enthalpy of the stable state. */
export function lineFacts(substance: Substance, at: FactsAt): Quantity[] {
  const { temperatureK, pressurePa, pressureText, outOfRange } = at;
  const name = { text: substance.name };
  return [
    {
      label: 'saturation pressure',
      name: 'saturation pressure',
      fact: factOf(() => evaluate(substance.saturationPressure('stable'), temperatureK, outOfRange)),
      ask: { name: 'SATPRESSURE', arguments: [name, 'temperature'] },
    },
    {
      label: `saturation temperature at ${pressureText}`,
      name: `saturation temperature at ${pressureText}`,
      fact: factOf(() => evaluate(substance.saturationTemperature('stable'), pressurePa, outOfRange)),
      ask: { name: 'SATTEMPERATURE', arguments: [name, 'stated pressure'] },
    },
    {
      label: 'enthalpy h of the stable state',
      name: 'enthalpy of the stable state',
      fact: factOf(() => {
        const { enthalpy, marks } = placeState(
          substance,
          { form: 'temperature', temperatureK },
          pressurePa,
          outOfRange,
        );
        const { rungs, sources } = substance.ladder(pressurePa);
        const range = { axis: 'temperature' as const, from: rungs[0]?.fromK ?? 0, to: rungs.at(-1)?.toK ?? 0 };
        return { value: enthalpy, unit: 'J/mol', method: substance.enthalpyReference, sources, range, marks };
      }),
      ask: { name: 'ENTHALPY', arguments: [name, 'temperature', 'pressure'] },
    },
  ];
}
