import { answer } from './edge/answer';
import { latentSpec } from './edge/latentPlan';

const spec = latentSpec('LATENT', 'latent');

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
