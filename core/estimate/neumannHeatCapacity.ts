import type { Answer } from '../answer';
import { Problem } from '../problem';
import { above } from './boilingPoint';

/** A constituent of a solid: an element of an alloy, a simple oxide of a mixed one. */
export interface Constituent {
  /** Moles of it in one mole of what is asked; mole fractions for an alloy. */
  readonly amount: number;
  /** Its own heat capacity, J/(mol K). */
  readonly heatCapacity: number;
}

const RELATIVE_ERROR = 0.03;

/**
 * Heat capacity of an alloy or a compound from that of its constituents, by the rule of Neumann and Kopp.
 *
 * cp = Σ n_i cp_i.
 *
 * @param constituents amounts (mol) and heat capacities (J/(mol K)), all at one temperature and away from transitions
 * @returns J/(mol K) of what the amounts make up; typical error 3 % (k = 1)
 * @throws Problem `argument` for no constituent, an amount or a heat capacity that is not positive
 * @source J. Leitner et al., Thermochim. Acta 497 (2010) 7: mixed oxides at room temperature (error from memory)
 * @example
 * neumannHeatCapacity([{ amount: 0.36, heatCapacity: 26.1 }, { amount: 0.64, heatCapacity: 25.1 }]).value // => 25.46
 */
export function neumannHeatCapacity(constituents: readonly Constituent[]): Answer {
  let value = 0;
  for (const { amount, heatCapacity } of constituents) {
    above('amount', amount, 0, 'mol');
    above('heat capacity', heatCapacity, 0, 'J/(mol K)');
    value += amount * heatCapacity;
  }
  if (constituents.length === 0) {
    throw new Problem({
      code: 'argument',
      argument: 'constituents',
      allowed: 'at least one, with its amount',
      received: 'none',
    });
  }
  return {
    value,
    unit: 'J/(mol K)',
    uncertainty: RELATIVE_ERROR * value,
    method: 'rule of Neumann and Kopp: sum over the constituents; typical error 3 % (k = 1)',
    sources: ['J. Leitner et al., Thermochim. Acta 497 (2010) 7'],
    range: { axis: 'temperature', from: 298.15, to: 298.15 },
    marks: [{ code: 'unconfirmed', text: 'the typical error is from memory' }],
  };
}
