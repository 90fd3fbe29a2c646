import { entries } from '../../../core/catalogue/entries';
import { EMPTY_HOUSE, type House } from '../../../core/house/house';
import { houseRegistry } from '../../../core/house/houseRegistry';
import { readHouse } from '../../../core/house/readHouse';
import { Problem } from '../../../core/problem';
import type { Substance } from '../../../core/substance';

export type Row = readonly (string | number | boolean | null)[];

/** The sheet row that the first row of a test stands on. */
export const FIRST_ROW = 5;

/** A row with a source, so that only what a test is about is marked. */
export function row(
  property: string,
  form: string,
  coefficients: string | number,
  unit = '',
  from: string | number | null = null,
  to: string | number | null = null,
  substance = 'wash',
): Row {
  return [substance, property, form, coefficients, unit, from, to, 'plant laboratory', 'B'];
}

export function houseOf(rows: readonly Row[], decimal: '.' | ',' = '.'): House {
  return readHouse(rows, { decimal, firstRow: FIRST_ROW, builtIn: entries });
}

/** A house substance of rows that hold no faults. */
export function substanceOf(rows: readonly Row[], name = 'wash'): Substance {
  const house = houseOf(rows);
  if (house.faults.some(({ severity }) => severity === 'error')) throw new Error(JSON.stringify(house.faults));
  return houseRegistry(entries, house).find(name);
}

export const NO_HOUSE = EMPTY_HOUSE;

/** The problem that something throws. */
export function problemOf(run: () => unknown): Problem {
  try {
    run();
  } catch (thrown) {
    if (thrown instanceof Problem) return thrown;
    throw thrown;
  }
  throw new Error('expected a problem');
}

/** A recovered wash, complete from the solid to the vapour: round figures near those of ethanol, invented for the tests. */
export const WASH: readonly Row[] = [
  row('molar mass', '', 46, 'g/mol'),
  row('melting temperature', '', 159, 'K'),
  row('heat of fusion', '', 5, 'kJ/mol'),
  row('solid heat capacity', 'polynomial', '0.6; 0.0065', 'kJ/(kg K)', '90 K', '159 K'),
  row(
    'liquid heat capacity',
    'table in K',
    '159:1.9; 250:2.1; 300:2.44; 350:2.95; 400:3.6',
    'kJ/(kg K)',
    '159 K',
    '400 K',
  ),
  row('gas heat capacity', 'polynomial in degC', '1.38; 0.0026', 'kJ/(kg K)', '200 K', '500 K'),
  row('heat of vaporization', 'Majer-Svoboda', '50.43; -0.4475; 0.4989; 513.9', 'kJ/mol', '250 K', '500 K'),
  row('vapour pressure', 'Antoine', '5.37229; 1670.409; -40.191', 'bar; K', '273 K', '370 K'),
];
