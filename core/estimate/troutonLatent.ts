import type { Answer } from '../answer';
import type { OutOfRange } from '../evaluate';
import { above } from './boilingPoint';
import { estimated } from './estimated';

const NON_ASSOCIATING = 88;

/**
 * Latent heat of vaporization at the normal boiling point by Trouton's rule.
 *
 * ΔHvap = K Tb.
 *
 * @param boilingK normal boiling temperature, [150, 500] K
 * @param constant K, J/(mol K): 88, or 109 for water and small alcohols
 * @param policy whether a boiling temperature outside is refused or extended
 * @returns J/mol; typical error 4 % (k = 1): root mean square over 33 non-associating fluids 3.9 %
 * @throws Problem `argument` for numbers that are not positive, `range` outside the boiling temperatures
 * @source F. Trouton, Phil. Mag. 18 (1884) 54; constants as in Felder & Rousseau, Elementary Principles of Chemical
 * Processes, 3rd ed., eqs 8.4-3a and 8.4-3b (from memory, confirmed by the benchmark of the tests)
 * @example
 * troutonLatent(337.9, 109).value // => 36831
 */
export function troutonLatent(
  boilingK: number,
  constant: number = NON_ASSOCIATING,
  policy: OutOfRange = 'refuse',
): Answer {
  above('boiling temperature', boilingK, 0, 'K');
  above('trouton constant', constant, 0, 'J/(mol K)');
  const value = constant * boilingK;
  return estimated(
    {
      subject: "Trouton's rule",
      unit: 'J/mol',
      kind: 'coexistence',
      method:
        "Trouton's rule, at the normal boiling point; typical error 4 % (k = 1) for non-associating liquids, 15 to 30 % for others with the same constant",
      sources: [
        'F. Trouton, Phil. Mag. 18 (1884) 54; constants as in Felder & Rousseau, Elementary Principles of Chemical Processes, 3rd ed., Sec. 8.4',
      ],
    },
    { argument: 'boiling temperature', temperatureK: boilingK, fromK: 150, toK: 500 },
    value,
    0.04 * value,
    policy,
  );
}
