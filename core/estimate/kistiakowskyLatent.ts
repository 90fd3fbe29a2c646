import type { Answer } from '../answer';
import type { OutOfRange } from '../evaluate';
import { GAS_CONSTANT } from '../kirchhoff/kirchhoff';
import { above } from './boilingPoint';
import { estimated } from './estimated';

/**
 * Latent heat of vaporization at the normal boiling point after Kistiakowsky.
 *
 * ΔHvap = Tb (36.61 + R ln Tb).
 *
 * @param boilingK normal boiling temperature, [70, 500] K
 * @param policy whether a boiling temperature outside is refused or extended
 * @returns J/mol; typical error 4.5 % (k = 1): root mean square over 37 non-associating fluids; 2 % for hydrocarbons
 * @throws Problem `argument` for a temperature that is not positive, `range` outside the boiling temperatures
 * @source W. Kistiakowsky, Z. Phys. Chem. 107 (1923) 65, in the form of Reid, Prausnitz & Poling, The Properties of Gases and
 * Liquids, 4th ed. (from memory, confirmed by the benchmark of the tests)
 * @example
 * kistiakowskyLatent(353.24).value // => 30164
 */
export function kistiakowskyLatent(boilingK: number, policy: OutOfRange = 'refuse'): Answer {
  above('boiling temperature', boilingK, 0, 'K');
  const value = boilingK * (36.61 + GAS_CONSTANT * Math.log(boilingK));
  return estimated(
    {
      subject: "Kistiakowsky's rule",
      unit: 'J/mol',
      kind: 'coexistence',
      method:
        "Kistiakowsky's rule, at the normal boiling point; typical error 4.5 % (k = 1) for non-associating liquids, 2 % for hydrocarbons",
      sources: [
        'W. Kistiakowsky, Z. Phys. Chem. 107 (1923) 65, as in Reid, Prausnitz & Poling, The Properties of Gases and Liquids, 4th ed.',
      ],
    },
    { argument: 'boiling temperature', temperatureK: boilingK, fromK: 70, toK: 500 },
    value,
    0.045 * value,
    policy,
  );
}
