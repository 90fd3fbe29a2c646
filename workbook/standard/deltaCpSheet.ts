import { FIT_COLUMNS, FIT_ROWS } from '../../core/fit/fitTable';
import type { BookCell, BookSheet } from '../book';
import { emptySheet } from '../emptySheet';
import { WATER_SR1_86 } from './latentHeatData';
import { put, putFormula, putSpill } from './place';
import { UNITS_NAME } from './unitHead';

const HEAD = 5;
const FIRST = HEAD + 1;
const LAST = HEAD + WATER_SR1_86.length;
/** The units of the published table, whatever the rest of the workbook uses. */
const AS_PRINTED = `${UNITS_NAME},"temperature=K; heat=kJ/kg; heat_capacity=kJ/(kg K)"`;

const TABLE_ROWS = Object.keys(FIT_ROWS) as (keyof typeof FIT_ROWS)[];
const TABLE = `H${HEAD}:${String.fromCharCode(71 + FIT_COLUMNS.length)}${HEAD + TABLE_ROWS.length}`;
const TABLE_FORMATS: Partial<Record<keyof typeof FIT_ROWS, string>> = {
  slope: '0.0000',
  latent: '#,##0.00',
  reference: '0.00',
  covariance: '0.0E+00',
  intercept: '#,##0.00',
  residualSd: '0.000',
  coverage: '0%',
  coverageFactor: '0.000',
  rSquared: '0.000000',
  pSlope: '0.0E+00',
  bend: '0.0E+00',
  pBend: '0.0E+00',
  lowest: '0.00',
  highest: '0.00',
};

/** Published latent heats, the line through them, and Kirchhoff's law with its slope, in the units of the source. */
export function deltaCpSheet(): BookSheet {
  const cells: Record<string, BookCell> = {};
  const rowHeights: Record<string, number> = { '1': 34, '2': 66, '3': 52, [String(HEAD)]: 48 };
  const section = (row: number, letters: string, words: string) => {
    for (const letter of letters) put(cells, `${letter}${row}`, letter === letters[0] ? words : null, 'section');
    rowHeights[String(row)] = 24;
  };
  put(cells, 'A1', 'ΔCp from latent heats', 'title');
  put(
    cells,
    'A2',
    'The slope of latent heats at one pressure, or of standard ones, is ΔCp; along the saturation line, as here, it holds a part of the line too. Put your own data into the two warm columns: a unit in a heading wins over the sheet Units.',
    'subtitle',
  );
  put(
    cells,
    'A3',
    'Data: water along the saturation line, IAPWS SR1-86(1992), computed from its equations by Clapeyron’s relation and rounded to 6 digits; coefficients from memory, checked at 273.16 K and 373.1243 K.',
    'note',
  );
  section(HEAD - 1, 'ABCDEF', 'Data and line');
  section(HEAD - 1, 'HIJKLMN', 'What the line says');
  putData(cells);
  putFitTable(cells);
  const carry = HEAD + TABLE_ROWS.length + 2;
  section(carry, 'ABCDEF', 'Carried by Kirchhoff’s law');
  rowHeights[String(carry + 1)] = 48;
  rowHeights[String(carry + 3)] = 48;
  putKirchhoff(cells, carry + 1);
  return {
    ...emptySheet('ΔCp fit'),
    cells,
    columnWidths: { A: 11, B: 15, C: 14, D: 13, E: 13, F: 15, G: 2, H: 28, I: 13, J: 18, K: 14, L: 14, M: 20, N: 62 },
    rowHeights,
    merges: ['A2:F2', 'A3:F3', `A${carry + 3}:F${carry + 3}`],
    gridLines: false,
    print: { landscape: true, fitWidth: true },
  };
}

const down = (from: string, to = from) => `${from}${FIRST}:${to}${LAST}`;

function putData(cells: Record<string, BookCell>): void {
  const heads = ['T / K', 'ΔHvap / (kJ/kg)', 'On the line, kJ/kg', 'Its standard uncertainty', 'Off the line, kJ/kg'];
  [...heads, 'IAPWS-95 at T, kJ/kg'].forEach((words, i) =>
    put(cells, `${'ABCDEF'.charAt(i)}${HEAD}`, words, 'columnHead'),
  );
  WATER_SR1_86.forEach(([temperatureK, latent], i) => {
    put(cells, `A${FIRST + i}`, temperatureK, 'input', '0.00');
    put(cells, `B${FIRST + i}`, latent, 'input', '#,##0.00');
  });
  putSpill(cells, down('C', 'D'), `=LATENTRY.FITLATENT(${TABLE},${down('A')},${AS_PRINTED})`, 'answer', '#,##0.00');
  putSpill(cells, down('E'), `=${down('B')}-${down('C')}`, 'answer', '0.00');
  const own = `=LATENTRY.LATENT("water","vaporization",${down('A')},${AS_PRINTED})`;
  putSpill(cells, down('F'), own, 'answer', '#,##0.00');
}

function putFitTable(cells: Record<string, BookCell>): void {
  const data = `A${HEAD}:A${LAST},B${HEAD}:B${LAST},,`;
  const words = '"kind=coexistence; substance=water"';
  putSpill(cells, TABLE, `=LATENTRY.FITDELTACP(${data},${AS_PRINTED},${words})`, 'label', 'General');
  for (let column = 0; column < FIT_COLUMNS.length; column++) {
    const letter = String.fromCharCode(72 + column);
    for (let row = 0; row <= TABLE_ROWS.length; row++) {
      const address = `${letter}${HEAD + row}`;
      const key = TABLE_ROWS[row - 1];
      const numeric = column > 0 && column < 5 && key !== undefined;
      const format = numeric ? TABLE_FORMATS[key] : undefined;
      const style = row === 0 ? (column > 0 && column < 5 ? 'columnHead' : 'heading') : numeric ? 'data' : 'label';
      const { value = null, formula, spill } = cells[address] ?? {};
      cells[address] = {
        value,
        ...(formula === undefined || spill === undefined ? {} : { formula, spill }),
        style,
        ...(format === undefined ? {} : { format }),
      };
    }
  }
}

function putKirchhoff(cells: Record<string, BookCell>, head: number): void {
  const heads = [
    'From, K',
    'Latent heat there, kJ/kg',
    'To, K',
    'Slope of the line, kJ/(kg K)',
    'Latent heat there, kJ/kg',
  ];
  [...heads, 'IAPWS-95 there, kJ/kg'].forEach((words, i) =>
    put(cells, `${'ABCDEF'.charAt(i)}${head}`, words, 'columnHead'),
  );
  const row = head + 1;
  put(cells, `A${row}`, 373.15, 'input', '0.00');
  put(cells, `B${row}`, 2256.6, 'input', '#,##0.00');
  put(cells, `C${row}`, 298.15, 'input', '0.00');
  const slope = `=VLOOKUP("${FIT_ROWS.slope}",${TABLE},2,FALSE)`;
  putFormula(cells, `D${row}`, slope, 'answer', null, '0.0000');
  const carried = `=LATENTRY.KIRCHHOFF(B${row},A${row},C${row},D${row},${AS_PRINTED})`;
  putFormula(cells, `E${row}`, carried, 'answer', null, '#,##0.00');
  const own = `=LATENTRY.LATENT("water","vaporization",C${row},${AS_PRINTED})`;
  putFormula(cells, `F${row}`, own, 'answer', null, '#,##0.00');
  put(
    cells,
    `A${row + 1}`,
    'The slope is the mean along the saturation line between 0 and 100 °C, and not the difference of the heat capacities (−2.27 kJ/(kg K) at 25 °C, IAPWS R6-95). It is no constant: over a wider range the points leave the line in a bend.',
    'note',
  );
}
