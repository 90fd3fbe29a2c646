import { answer } from './edge/answer';
import { latentSpec } from './edge/latentPlan';

const spec = latentSpec('DELTACP', 'latentSlope');

/**
 * Temperature slope of the latent heat of the same kind: the heat-capacity difference for the isobaric and standard kinds.
 * @customfunction DELTACP
 * @requiresParameterAddresses
 * @param substance Substance by name, formula or CAS number, as "water".
 * @param change vaporization, fusion or sublimation; condensation, freezing or deposition turn the sign.
 * @param [temperature] Temperature in the workbook's unit, or text with a unit. Fusion: the melting point when left out.
 * @param [settings] Latentry_units, or text as "heat_capacity=J/(mol K); kind=standard".
 * @param invocation The call itself.
 * @returns Slope in the workbook's heat-capacity unit.
 */
export function deltaCp(
  substance: any[][],
  change: any[][],
  temperature?: any[][],
  settings?: any[][][],
  invocation?: CustomFunctions.Invocation,
): any[][] {
  return answer(spec, [substance, change, temperature, settings, invocation]);
}
