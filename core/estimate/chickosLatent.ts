import type { Answer } from '../answer';
import type { OutOfRange } from '../evaluate';
import { above } from './boilingPoint';
import { chickosDifference } from './chickosDifference';
import { estimated } from './estimated';

/** A latent heat, and the heat capacity of the condensed phase that carries it. */
export interface ChickosInput {
  readonly change: 'vaporization' | 'sublimation';
  /** Latent heat at `atK`, J/mol. */
  readonly latent: number;
  readonly atK: number;
  readonly toK: number;
  /** cp of the liquid or of the crystal at 298.15 K, J/(mol K). */
  readonly condensedHeatCapacity: number;
}

const REACH_K = 200;

/**
 * Latent heat carried to another temperature with the group difference of heat capacities.
 *
 * ΔH(T₂) = ΔH(T₁) + Δcp (T₂ − T₁), Δcp as `chickosDifference`.
 *
 * @param input latent heat (J/mol), its temperature and the one wanted (K), at most 200 K apart; cp of the condensed phase
 * @param policy whether a temperature beyond that is refused or extended
 * @returns J/mol; standard uncertainty |T₂ − T₁| times that of the difference, without that of the given latent heat
 * @throws Problem `argument` for numbers that are not positive, `range` for a step beyond 200 K
 * @source Chickos & Acree, J. Phys. Chem. Ref. Data 31 (2002) 537 and 32 (2003) 519, Sec. 5
 * @example
 * chickosLatent({ change: 'vaporization', latent: 35210, atK: 337.69, toK: 298.15, condensedHeatCapacity: 81.12 }).value // => 36462
 */
export function chickosLatent(
  { change, latent, atK, toK, condensedHeatCapacity }: ChickosInput,
  policy: OutOfRange = 'refuse',
): Answer {
  above('latent heat', latent, 0, 'J/mol');
  above('at temperature', atK, 0, 'K');
  above('to temperature', toK, 0, 'K');
  const difference = chickosDifference(change, condensedHeatCapacity);
  return estimated(
    {
      ...difference,
      unit: 'J/mol',
      subject: 'a step of at most 200 K by the group difference',
      kind: 'standard',
      method: `${difference.method} times the step, without the error of the given latent heat`,
    },
    { argument: 'to temperature', temperatureK: toK, fromK: Math.max(0, atK - REACH_K), toK: atK + REACH_K },
    latent + difference.value * (toK - atK),
    difference.uncertainty * (toK - atK),
    policy,
  );
}
