import type { BookCell, BookSheet } from '../book';
import { emptySheet } from '../emptySheet';
import { WATER_SR1_86 } from './latentHeatData';
import { put, putFormula, putSpill } from './place';
import { UNITS_NAME } from './unitHead';

const HEAD = 5;
const FIRST = HEAD + 1;
const LAST = HEAD + WATER_SR1_86.length;
const CARRY = LAST + 3;
/** The units of the published table, whatever the rest of the workbook uses. */
const AS_PRINTED = `${UNITS_NAME},"temperature=K; heat=kJ/kg; heat_capacity=kJ/(kg K)"`;
const FIT = `LATENTRY.FITDELTACP(A${HEAD}:A${LAST},B${HEAD}:B${LAST},,,${AS_PRINTED})`;

/** Published latent heats, the line through them, and Kirchhoff's law with its slope, in the units of the source. */
export function deltaCpSheet(): BookSheet {
  const cells: Record<string, BookCell> = {};
  const rowHeights: Record<string, number> = { '1': 34, '2': 34, '3': 34, [String(HEAD)]: 48 };
  put(cells, 'A1', 'ΔCp from latent heats', 'title');
  put(
    cells,
    'A2',
    'The slope of latent heat against temperature is ΔCp. Replace the two columns by your own data: a unit in a heading wins over the sheet Units.',
    'subtitle',
  );
  put(
    cells,
    'A3',
    'Data: water along the saturation line, IAPWS SR1-86(1992), computed from its equations by Clapeyron’s relation and rounded to 6 digits; coefficients from memory, checked at 273.16 K and 373.1243 K.',
    'note',
  );
  for (const letter of 'ABCDE') put(cells, `${letter}4`, letter === 'A' ? 'Data and line' : null, 'section');
  for (const letter of 'GHI') put(cells, `${letter}4`, letter === 'G' ? 'What the line says' : null, 'section');
  rowHeights['4'] = 24;

  put(cells, `A${HEAD}`, 'T / K', 'heading');
  put(cells, `B${HEAD}`, 'ΔHvap / (kJ/kg)', 'heading');
  put(cells, `C${HEAD}`, 'On the line, kJ/kg', 'heading');
  put(cells, `D${HEAD}`, 'Off the line, kJ/kg', 'heading');
  put(cells, `E${HEAD}`, 'IAPWS-95 at T, kJ/kg', 'heading');
  WATER_SR1_86.forEach(([temperatureK, latent], i) => {
    put(cells, `A${FIRST + i}`, temperatureK, 'input', '0.00');
    put(cells, `B${FIRST + i}`, latent, 'input', '#,##0.00');
  });
  const down = (letter: string) => `${letter}${FIRST}:${letter}${LAST}`;
  putSpill(cells, down('C'), `=INDEX(LATENTRY.FITLATENT(${FIT},${down('A')},${AS_PRINTED}),0,1)`, 'answer', '#,##0.00');
  putSpill(cells, down('D'), `=${down('B')}-${down('C')}`, 'answer', '0.00');
  putSpill(
    cells,
    down('E'),
    `=LATENTRY.LATENT("water","vaporization",${down('A')},${AS_PRINTED})`,
    'answer',
    '#,##0.00',
  );
  putFormula(cells, `G${HEAD}`, `=${FIT}`, 'data');

  for (const letter of 'ABCDE')
    put(cells, `${letter}${CARRY - 1}`, letter === 'A' ? 'Carried by Kirchhoff’s law' : null, 'section');
  rowHeights[String(CARRY - 1)] = 24;
  ['From, K', 'Latent heat there, kJ/kg', 'To, K', 'ΔCp, kJ/(kg K)', 'Latent heat there, kJ/kg'].forEach((words, i) => {
    put(cells, `${'ABCDE'.charAt(i)}${CARRY}`, words, 'heading');
  });
  rowHeights[String(CARRY)] = 32;
  const row = CARRY + 1;
  put(cells, `A${row}`, 373.15, 'input', '0.00');
  put(cells, `B${row}`, 2256.6, 'input', '#,##0.00');
  put(cells, `C${row}`, 298.15, 'input', '0.00');
  putFormula(cells, `D${row}`, `=SLOPE(${down('B')},${down('A')})`, 'answer', null, '0.0000');
  putFormula(
    cells,
    `E${row}`,
    `=LATENTRY.KIRCHHOFF(B${row},A${row},C${row},D${row},${AS_PRINTED})`,
    'answer',
    null,
    '#,##0.00',
  );
  put(
    cells,
    `A${row + 1}`,
    'The line’s slope is the mean ΔCp along the saturation line between 0 and 100 °C. Over a wider range ΔCp is no constant, and the residuals bend.',
    'note',
  );
  rowHeights[String(row + 1)] = 34;
  return {
    ...emptySheet('ΔCp fit'),
    cells,
    columnWidths: { A: 13, B: 18, C: 18, D: 18, E: 20, F: 4, G: 34, H: 18, I: 18, J: 18, K: 18 },
    rowHeights,
    merges: ['A2:I2', 'A3:I3', `A${row + 1}:E${row + 1}`],
    gridLines: false,
    print: { landscape: true, fitWidth: true },
  };
}
