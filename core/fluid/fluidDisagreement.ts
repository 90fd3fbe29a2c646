import type { Answer } from '../answer';
import { Problem } from '../problem';
import type { Change } from '../substance';
import { lacking, type FluidParts } from './fluidParts';

/**
 * How far independent data of a fluid disagree between two temperatures: change of the latent heat fitted without heat
 * capacities, less the integral of the heat-capacity difference fitted without latent heats.
 *
 * @returns J/mol, with the standard uncertainty that both fits leave
 * @throws Problem `range` beyond the data, `missing` for other changes than vaporization
 */
export function fluidDisagreement(parts: FluidParts, change: Change, fromK: number, toK: number): Answer {
  const { numbers } = parts;
  const { disagreement, name, criticalK, sources } = numbers;
  if (change !== 'vaporization' || disagreement === undefined) {
    throw lacking(`independent latent heats and heat capacities for ${change} of ${name}`);
  }
  requireInside(disagreement.fromK, disagreement.toK, 'from', fromK, name);
  requireInside(disagreement.fromK, disagreement.toK, 'to', toK, name);
  const at = (k: number): number => disagreement.cubic.reduceRight((sum, c) => sum * (k / criticalK) + c, 0);
  const width = Math.abs(toK - fromK) / (disagreement.toK - disagreement.fromK);
  return {
    value: at(toK) - at(fromK),
    unit: 'J/mol',
    uncertainty: disagreement.uncertainty * Math.sqrt(width),
    kind: 'coexistence',
    method:
      'latent heats fitted without heat capacities, against heat capacities of liquid and real vapour fitted without latent heats',
    sources: [...new Set([...sources.latent, ...sources.heatCapacity, ...sources.gas])],
    range: { axis: 'temperature', from: disagreement.fromK, to: disagreement.toK },
    marks: [],
  };
}

function requireInside(from: number, to: number, argument: string, received: number, name: string): void {
  if (received >= from && received <= to) return;
  throw new Problem({
    code: 'range',
    argument,
    quantity: 'temperature',
    received,
    from,
    to,
    subject: `disagreement of the data for vaporization of ${name}`,
  });
}
