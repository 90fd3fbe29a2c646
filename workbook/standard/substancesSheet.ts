import { HOUSE_PROPERTIES } from '../../core/house/houseProperty';
import { HOUSE_HEADS } from '../../core/house/houseRow';
import { HOUSE_FORMS } from '../../core/house/readForm';
import type { Settings } from '../../functions/settings/settingsType';
import type { BookCell, BookName, BookSheet } from '../book';
import { emptySheet } from '../emptySheet';
import { choiceSource } from './listsSheet';
import { put, putFormula } from './place';
import { UNITS_NAME, unitInForce } from './unitHead';

/** The block of the team's own substances, by its name in the workbook. */
export const SUBSTANCES_NAME = 'Latentry_substances';

const HEAD = 8;
const ROOM = 50;
const LAST = HEAD + ROOM;

const DEMO = 'demo, invented for this workbook';
const CONCENTRATE = 'kelp concentrate';

/** Invented: a kelp extract concentrate, moist and frozen. */
const ROWS: readonly (readonly (string | number | null)[])[] = [
  [
    CONCENTRATE,
    'composition',
    'mass fractions',
    'water 0.72; carbohydrate 0.17; protein 0.04; fibre 0.02; ash 0.05',
    null,
    0,
    95,
    DEMO,
    'A',
  ],
  [
    CONCENTRATE,
    'solid composition',
    'mass fractions',
    'ice 0.60; water 0.12; carbohydrate 0.17; protein 0.04; fibre 0.02; ash 0.05',
    null,
    -35,
    -12,
    DEMO,
    'A',
  ],
  ['kelp wax', 'melting temperature', 'constant', 58, 'degC', null, null, DEMO, 'A'],
  ['kelp wax', 'heat of fusion', 'constant', 180, 'kJ/kg', null, null, DEMO, 'A'],
  ['kelp wax', 'solid heat capacity', 'table', '10:1.92; 30:2.10; 58:2.45', 'kJ/(kg K)', 10, 58, DEMO, 'A'],
  ['kelp wax', 'liquid heat capacity', 'polynomial in degC', '2.05; 0.0021', 'kJ/(kg K)', 58, 110, DEMO, 'A'],
];

/** Beside the names, which stay in view: the words go with the columns that they speak of. */
const HOW: readonly string[] = [
  'One property a row. A name that stands here works in every function, beside the built-in substances.',
  'Numbers of a polynomial or a table are parted by semicolons: 2.05; 0.0021 or 10:1.92; 30:2.10. Equations take temperatures in K, tables and ranges in °C, unless a cell says another unit.',
  'A row that can’t be read is named in the side pane and in the answers that need it.',
];

const PROPERTY_PROMPT =
  'A solid-solid change has the names of its forms: heat of alpha-beta, alpha-beta temperature. A heat may say its kind: heat of vaporization, standard.';
const FORM_PROMPT =
  'Blank for a single value. "polynomial in degC" or "table in K" say the unit of temperatures among the coefficients.';

/**
 * The team's own substances: header, room for rows, a demo of two invented materials and two answers from them.
 *
 * @param settings - those on the Units sheet, for the unit that is shown before the first calculation
 */
export function substancesSheet(settings: Settings): BookSheet {
  const heat = unitInForce('heat', settings);
  const cells: Record<string, BookCell> = {};
  const rowHeights: Record<string, number> = { '1': 34, '2': 20, '3': 34, '4': 34, [String(HEAD)]: 34 };
  put(cells, 'A1', 'Substances', 'title');
  HOW.forEach((text, i) => put(cells, `B${2 + i}`, text, 'subtitle'));
  answer(cells, 5, 'Heat to warm the concentrate from 10 to 60 °C', `HEAT("${CONCENTRATE}","10 degC","60 degC",,`);
  answer(cells, 6, 'Heat to melt kelp wax that is at 20 °C', 'HEAT("kelp wax","20 degC","melting liquid",,');
  for (const row of [5, 6]) putFormula(cells, `E${row}`, heat.formula, 'label', heat.shown);
  HOUSE_HEADS.forEach((head, i) => put(cells, `${letter(i)}${HEAD}`, head, 'heading'));
  for (let row = HEAD + 1; row <= LAST; row++) {
    HOUSE_HEADS.forEach((_, i) => {
      const value = ROWS[row - HEAD - 1]?.[i] ?? null;
      const range = RANGE_COLUMNS.includes(i);
      put(cells, `${letter(i)}${row}`, value, range ? 'limit' : 'input', range ? undefined : '@');
    });
  }
  return {
    ...emptySheet('Substances'),
    cells,
    columnWidths: { A: 22, B: 24, C: 22, D: 54, E: 16, F: 14, G: 14, H: 36, I: 12 },
    rowHeights,
    merges: ['B2:D2', 'B3:D3', 'B4:D4', 'B5:C5', 'B6:C6'],
    lists: [
      {
        range: `B${HEAD + 1}:B${LAST}`,
        values: HOUSE_PROPERTIES,
        source: choiceSource('property'),
        prompt: PROPERTY_PROMPT,
        open: true,
      },
      {
        range: `C${HEAD + 1}:C${LAST}`,
        values: HOUSE_FORMS,
        source: choiceSource('form'),
        prompt: FORM_PROMPT,
        open: true,
      },
    ],
    freeze: { rows: HEAD, columns: 1 },
    gridLines: false,
    print: { landscape: true, fitWidth: true },
  };
}

/** The valid range; all other entries stay as typed, so that 10:1.92 is no time of day and a CAS number no date. */
const RANGE_COLUMNS = [5, 6];

function letter(column: number): string {
  return String.fromCharCode(65 + column);
}

function answer(cells: Record<string, BookCell>, row: number, words: string, call: string): void {
  put(cells, `B${row}`, words, 'label');
  putFormula(cells, `D${row}`, `=LATENTRY.${call}${UNITS_NAME},${SUBSTANCES_NAME})`, 'answer', null, '#,##0.00');
}

/** The name under which the block is found, its header included. */
export const substancesName: BookName = {
  name: SUBSTANCES_NAME,
  formula: `Substances!$A$${HEAD}:$I$${LAST}`,
};
