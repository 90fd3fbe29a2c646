import { SETTINGS } from '../../functions/settings/schema';
import { settingsRows } from '../../functions/settings/settingsRows';
import type { Settings } from '../../functions/settings/settingsType';
import type { BookCell, BookList, BookName, BookSheet } from '../book';
import { emptySheet } from '../emptySheet';
import { choiceSource } from './listsSheet';
import { put } from './place';
import { UNITS_NAME } from './unitHead';

const FIRST_ROW = 4;

const NOTES: Readonly<Record<string, string>> = {
  temperature:
    'Also of the typed temperatures. A difference of temperatures is in kelvins or degrees of the same size.',
  pressure: 'Absolute, unless the unit says gauge; gauge pressures stand on the barometer below.',
  barometer: 'A number with its unit. One standard atmosphere is 101.325 kPa.',
  heat: 'Latent heats and enthalpies, per mass or per mole.',
  heat_capacity: 'Heat capacities and ΔCp.',
  amount: 'What a batch is measured in.',
  energy: 'Heat of a batch. Calories and Btu name their kind.',
  flow: 'What a stream is measured in.',
  power: 'Duty of a stream.',
  out_of_range: 'refuse: no answer outside the published range. extend: an answer with a warning.',
  decimal: 'How numbers inside typed texts are written, as in "12.5 kPa".',
};

/**
 * The sheet that every answer's units come from.
 *
 * @param settings - the values that it starts with
 */
export function unitsSheet(settings: Settings): BookSheet {
  const cells: Record<string, BookCell> = {};
  const lists: BookList[] = [];
  const rowHeights: Record<string, number> = { '1': 34, '2': 34 };
  put(cells, 'A1', 'Units', 'title');
  put(
    cells,
    'A2',
    'Every answer in this workbook is given in these units. Choose from the lists, or type another unit of the same kind.',
    'subtitle',
  );
  put(cells, 'A3', 'Setting', 'heading');
  put(cells, 'B3', 'Value', 'heading');
  put(cells, 'C3', 'What it is for', 'heading');
  settingsRows(settings).forEach(([label, value], i) => {
    const row = FIRST_ROW + i;
    const { key = '', choices = [], kind = 'unit' } = SETTINGS[i] ?? {};
    put(cells, `A${row}`, label, 'label');
    put(cells, `B${row}`, value, 'input', '@');
    put(cells, `C${row}`, NOTES[key] ?? null, 'remark');
    rowHeights[String(row)] = 22;
    if (choices.length === 0) return;
    const open = kind === 'unit' ? { open: true } : {};
    lists.push({ range: `B${row}`, values: choices, source: choiceSource(key), ...open });
  });
  return {
    ...emptySheet('Units'),
    cells,
    columnWidths: { A: 22, B: 20, C: 92 },
    rowHeights,
    merges: ['A2:C2'],
    lists,
    gridLines: false,
    print: { landscape: false, fitWidth: true },
  };
}

/** The name under which every formula finds the block, without the heading and the notes. */
export const unitsName: BookName = {
  name: UNITS_NAME,
  formula: `Units!$A$${FIRST_ROW}:$B$${FIRST_ROW + SETTINGS.length - 1}`,
};
