import { answer } from './edge/answer';
import { latentPlan } from './edge/latentPlan';
import type { CellwiseSpec } from './edge/spec';

const spec: CellwiseSpec = {
  family: 'cellwise',
  name: 'LATENT',
  args: [
    { name: 'substance', kind: 'key' },
    { name: 'change', kind: 'key' },
    { name: 'temperature', kind: 'temperature', optional: true },
  ],
  options: ['kind', 'at_pressure'],
  plan: (keys, settings) => latentPlan('latent', keys, settings),
};

/**
 * Latent heat of a phase change at a temperature, counted as taken up by the substance.
 * @customfunction LATENT
 * @requiresParameterAddresses
 * @param substance Substance by name, formula or CAS number, as "water".
 * @param change vaporization, fusion or sublimation; condensation, freezing or deposition turn the sign.
 * @param [temperature] Temperature in the workbook's unit, or text with a unit as "140 degF". Fusion: the melting point when left out.
 * @param [settings] Latentry_units, or text as "heat=kJ/mol; kind=standard".
 * @param invocation The call itself.
 * @returns Latent heat in the workbook's heat unit.
 */
export function latent(
  substance: any[][],
  change: any[][],
  temperature?: any[][],
  settings?: any[][][],
  invocation?: CustomFunctions.Invocation,
): any[][] {
  return answer(spec, [substance, change, temperature, settings, invocation]);
}
