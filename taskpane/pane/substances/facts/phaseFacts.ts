import { evaluate } from '../../../../core/evaluate';
import type { Phase, Substance } from '../../../../core/substance';
import { factOf } from './fact';
import type { FactsAt } from './latentFacts';
import type { Quantity } from './quantity';

/** A phase of a substance, one crystal form of the solid where it has several. */
export interface NamedPhase {
  readonly phase: Phase;
  readonly form?: string;
}

/** Solid forms from cold to hot, liquid, gas. */
export function phasesOf({ forms }: Substance): NamedPhase[] {
  const solids: NamedPhase[] =
    forms === undefined || forms.length === 0
      ? [{ phase: 'solid' }]
      : forms.map((form) => ({ phase: 'solid' as const, form }));
  return [...solids, { phase: 'liquid' }, { phase: 'gas' }];
}

/** Heat capacities of every phase at a pressure, and of the ideal gas. */
export function heatCapacityFacts(substance: Substance, at: FactsAt): Quantity[] {
  const phases = phasesOf(substance).map(({ phase, form }): Quantity => {
    const label = form === undefined ? phase : `${phase} (${form})`;
    return {
      label,
      name: `heat capacity: ${label}`,
      fact: factOf(() => evaluate(substance.heatCapacity(phase, at.pressurePa, form), at.temperatureK, at.outOfRange)),
      ask: {
        name: 'HEATCAP',
        arguments: [{ text: substance.name }, { text: form ?? phase }, 'temperature', 'pressure', 'blank'],
      },
    };
  });
  const ideal: Quantity = {
    label: 'ideal gas',
    name: 'heat capacity: ideal gas',
    fact: factOf(() => evaluate(substance.heatCapacity('gas', 'standard'), at.temperatureK, at.outOfRange)),
    ask: {
      name: 'HEATCAP',
      arguments: [{ text: substance.name }, { text: 'gas' }, 'temperature', 'blank', 'blank'],
      kind: 'standard',
    },
  };
  return [...phases, ideal];
}
