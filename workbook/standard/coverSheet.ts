import type { BookCell, BookSheet } from '../book';
import { emptySheet } from '../emptySheet';
import { put, putFormula } from './place';
import type { StandardStyle } from './styles';

const SHEETS: readonly (readonly [string, string])[] = [
  ['Units', 'The units of every answer in this workbook. Change one here, and all sheets follow.'],
  ['Latent heat', 'Water for the evaporator and ice for the freeze-dryer, by temperature.'],
  [
    'ΔCp fit',
    'A line through published latent heats: its slope and kind; carries a latent heat to another temperature.',
  ],
  ['Substances', 'The plant’s own materials, a property a row. What stands there works in every function.'],
  ['Checks', 'Each function against a published figure. Look here first when an answer surprises.'],
];

const STEPS: readonly string[] = [
  'Choose the units on the sheet Units. Numbers that you typed are not converted; look at the input cells afterwards.',
  'Change the warm cells only. Answers beside them are formulas, and a spilled column has its formula in the top cell.',
  'Let every new formula end with the block of units: =LATENTRY.LATENT("water","vaporization",60,Latentry_units)',
  'Read the checks before you issue the workbook, and write a line into the table of revisions.',
];

const CAUTIONS: readonly string[] = [
  'For engineering calculation only. Someone qualified checks every figure before it is built, bought or released upon.',
  'Pressure equipment, steam, cryogens, flammable vapour such as ethanol, relief and refrigeration sizing, and food and drug processes follow the local codes and licensed practice, which come before anything in this workbook.',
  'Kelp extract is not pure water: dissolved solids raise its boiling point and lower its freezing point. The tables are for the pure substance.',
];

const LEGEND: readonly (readonly [StandardStyle, string, string])[] = [
  ['input', 'input', 'typed by a person; yours to change'],
  ['answer', 'answer', 'computed; leave it as it is'],
  ['data', 'data', 'a published figure with its source on the sheet'],
  ['note', 'note', 'explains, and enters no calculation'],
  ['caution', 'caution', 'read before use'],
];

/**
 * The first sheet: what the workbook is for, how to use it, what its colours mean, its revisions and cautions.
 *
 * @param revisionDate - date of the first revision as text, or `''` to be filled in by hand
 */
export function coverSheet(revisionDate: string): BookSheet {
  const cells: Record<string, BookCell> = {};
  put(cells, 'B2', 'Heat of evaporation and freeze-drying', 'title');
  put(
    cells,
    'B3',
    'Small coastal pilot plant: kelp extract is evaporated and freeze-dried; ethanol is recovered from the wash.',
    'subtitle',
  );
  put(cells, 'B4', 'Computed by', 'note');
  putFormula(cells, 'C4', '=LATENTRY.EDITION()', 'note');
  const merges = ['B2:D2', 'B3:D3', 'C4:D4'];
  const rowHeights: Record<string, number> = { '2': 36, '3': 34 };
  let row = 6;
  const section = (words: string) => {
    for (const column of ['B', 'C', 'D']) put(cells, `${column}${row}`, column === 'B' ? words : null, 'section');
    rowHeights[String(row)] = 24;
    row++;
  };
  const wide = (text: string, style: StandardStyle, height: number) => {
    for (const column of ['B', 'C', 'D']) put(cells, `${column}${row}`, column === 'B' ? text : null, style);
    merges.push(`B${row}:D${row}`);
    rowHeights[String(row)] = height;
    row++;
  };

  section('Cautions');
  CAUTIONS.forEach((text, i) => wide(text, 'caution', i === 1 ? 50 : 34));
  row++;
  section('Sheets');
  for (const [name, purpose] of SHEETS) {
    put(cells, `B${row}`, name, 'text');
    put(cells, `C${row}`, purpose, 'text');
    merges.push(`C${row}:D${row}`);
    rowHeights[String(row)] = 20;
    row++;
  }
  row++;
  section('How to use it');
  STEPS.forEach((text, i) => wide(`${i + 1}.  ${text}`, 'text', text.length > 100 ? 34 : 20));
  row++;
  section('Colours');
  for (const [style, name, meaning] of LEGEND) {
    put(cells, `B${row}`, name, style);
    put(cells, `C${row}`, meaning, 'label');
    rowHeights[String(row)] = 20;
    row++;
  }
  row++;
  section('Revisions');
  put(cells, `B${row}`, 'Revision, date', 'heading');
  put(cells, `C${row}`, 'What changed, and why', 'heading');
  put(cells, `D${row}`, 'Checked', 'heading');
  const first = revisionDate === '' ? 'A' : `A, ${revisionDate}`;
  for (let i = 1; i <= 4; i++) {
    put(cells, `B${row + i}`, i === 1 ? first : null, 'input');
    put(cells, `C${row + i}`, i === 1 ? 'First issue' : null, 'input');
    put(cells, `D${row + i}`, null, 'input');
  }
  return {
    ...emptySheet('Cover'),
    cells,
    columnWidths: { A: 3, B: 22, C: 78, D: 18 },
    rowHeights,
    merges,
    gridLines: false,
    print: { landscape: false, fitWidth: true },
  };
}
