import type { Answer, Mark } from '../answer';
import { above } from './boilingPoint';

interface Constants {
  readonly a: number;
  readonly b: number;
  readonly uncertainty: (difference: number) => number;
  readonly error: string;
  readonly source: string;
  readonly marks: readonly Mark[];
}

/** Equations at 298.15 K; the condensed phase is the liquid or the crystal. */
const CONSTANTS: Readonly<Record<'vaporization' | 'sublimation', Constants>> = {
  vaporization: {
    a: 10.58,
    b: 0.26,
    uncertainty: () => 15,
    error: '15 J/(mol K) (k = 1)',
    source:
      'J. S. Chickos et al., Struct. Chem. 4 (1993) 271; J. S. Chickos & W. E. Acree, J. Phys. Chem. Ref. Data 32 (2003) 519',
    marks: [],
  },
  sublimation: {
    a: 0.75,
    b: 0.15,
    uncertainty: (difference) => difference / 3,
    error: 'a third of the difference (k = 1)',
    source:
      'J. S. Chickos et al., Struct. Chem. 4 (1993) 271; J. S. Chickos & W. E. Acree, J. Phys. Chem. Ref. Data 31 (2002) 537',
    marks: [{ code: 'unconfirmed', text: 'the constants and their error are from memory' }],
  },
};

/**
 * Difference of the heat capacities of ideal gas and condensed phase at 298.15 K, from that of the condensed phase alone.
 *
 * Vaporization: Δcp = −(10.58 + 0.26 cp(liquid)); sublimation: Δcp = −(0.75 + 0.15 cp(crystal)), J/(mol K).
 *
 * @param change vaporization or sublimation
 * @param condensedHeatCapacity cp of the liquid or of the crystal at 298.15 K, J/(mol K): measured, or a sum of group values
 * @returns J/(mol K), of the standard kind, negative; standard uncertainty 15 J/(mol K) for vaporization (root mean square over
 * 39 liquids 10 J/(mol K)), a third of the difference for sublimation (from memory)
 * @throws Problem `argument` for a heat capacity that is not positive
 * @source Chickos, Hosseini, Hesse & Liebman, Struct. Chem. 4 (1993) 271; Chickos & Acree, J. Phys. Chem. Ref. Data 31 (2002)
 * 537 and 32 (2003) 519 (constants from memory, those of vaporization confirmed by the benchmark of the tests)
 * @example
 * chickosDifference('vaporization', 81.12).value // => -31.67
 */
export function chickosDifference(
  change: 'vaporization' | 'sublimation',
  condensedHeatCapacity: number,
): Answer & { readonly uncertainty: number } {
  const argument = `${change === 'vaporization' ? 'liquid' : 'solid'} heat capacity`;
  above(argument, condensedHeatCapacity, 0, 'J/(mol K)');
  const { a, b, uncertainty, error, source, marks } = CONSTANTS[change];
  const difference = a + b * condensedHeatCapacity;
  return {
    value: -difference,
    unit: 'J/(mol K)',
    uncertainty: uncertainty(difference),
    kind: 'standard',
    method: `group difference of heat capacities (Chickos et al.) for ${change}, organic compounds; typical error ${error}`,
    sources: [source],
    range: { axis: 'temperature', from: 298.15, to: 298.15 },
    marks,
  };
}
