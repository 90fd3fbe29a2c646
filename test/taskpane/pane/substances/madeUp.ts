import { readHouse } from '../../../../core/house/readHouse';
import type { Substance } from '../../../../core/substance';

/**
 * A made-up substance of two crystal forms, per kilogram: alpha 1 kJ/(kg K), 20 kJ/kg to beta at 30 °C, beta 1.5, 100 kJ/kg
 * to the liquid at 80 °C, liquid 2. Straight lines, so that every number of a test can be had by hand. No vapour.
 */
const ROWS = [
  ['wax two', 'solid alpha heat capacity', 'constant', 1, 'kJ/(kg K)', -50, 60, 'made up', '1'],
  ['wax two', 'alpha-beta temperature', 'constant', 30, 'degC', '', '', 'made up', '1'],
  ['wax two', 'heat of alpha-beta', 'constant', 20, 'kJ/kg', '', '', 'made up', '1'],
  ['wax two', 'solid beta heat capacity', 'constant', 1.5, 'kJ/(kg K)', 0, 80, 'made up', '1'],
  ['wax two', 'melting temperature', 'constant', 80, 'degC', '', '', 'made up', '1'],
  ['wax two', 'heat of fusion', 'constant', 100, 'kJ/kg', '', '', 'made up', '1'],
  ['wax two', 'liquid heat capacity', 'constant', 2, 'kJ/(kg K)', 60, 200, 'made up', '1'],
  ['wax two', 'synonym', 'text', 'two-wax', '', '', '', 'made up', '1'],
];

export function madeUp(): Substance {
  const { entries, faults } = readHouse(ROWS, { decimal: '.', firstRow: 1, builtIn: [] });
  const errors = faults.filter(({ severity }) => severity === 'error');
  const [entry] = entries;
  if (entry === undefined || errors.length > 0) throw new Error(errors.map(({ message }) => message).join('\n'));
  return entry.make();
}
