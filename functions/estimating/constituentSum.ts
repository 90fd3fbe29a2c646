import type { Answer } from '../../core/answer';
import { neumannHeatCapacity } from '../../core/estimate/neumannHeatCapacity';
import { substanceKey } from '../edge/keys';
import { heatCapacityOf, type Inputs } from './inputs';

/**
 * The sum over constituents: the heat capacity of each from its own row, else that of the catalogue's solid at
 * `temperature`.
 */
export function constituentSum(inputs: Inputs): Answer {
  const constituents = inputs.constituents.map((name) => ({
    amount: inputs.need(`amount of ${name}`),
    heatCapacity:
      inputs.si(`heat capacity of ${name}`) ?? heatCapacityOf(substanceKey(name), 'solid', inputs.need('temperature')),
  }));
  return neumannHeatCapacity(constituents);
}
