import { plainKey, SETTINGS } from '../../functions/settings/schema';
import { UNITS_NAME } from '../boot/readSnapshot';
import type { Block, Change } from '../port';
import { UNITS_SHEET, unitsRows, within } from './unitsBlock';

/** Settings as they are written on the sheet: label and value. */
export type SettingTexts = readonly (readonly [label: string, value: string])[];

/**
 * Plans the writing of settings into the workbook.
 *
 * With a block, only value cells that differ are rewritten; a setting that has no row is added, below the block where no
 * blank row is left in it, unless it has its default value. Without one, the sheet, the block and its name are made.
 *
 * @param blocks the block named `Latentry_units`, or none
 * @param settings label and value of every setting
 * @param sheet where the block is made
 * @example planUnits([], [['Heat', 'kJ/mol']]).length // => 5
 */
export function planUnits(blocks: readonly Block[], settings: SettingTexts, sheet: string = UNITS_SHEET): Change[] {
  const [block] = blocks;
  return block === undefined ? planSheet(settings, sheet) : planValues(block, settings);
}

function planSheet(settings: SettingTexts, sheet: string): Change[] {
  const last = 3 + settings.length;
  const at = (address: string) => ({ sheet, address });
  const notes = settings.map(([label]) => {
    const choices = SETTINGS.find((row) => row.label === label)?.choices ?? [];
    return [choices.length === 0 ? 'an absolute pressure with its unit' : choices.slice(0, 4).join(' or ')];
  });
  return [
    { kind: 'sheet', name: sheet },
    { kind: 'cells', ref: at('A1'), values: [['Units of this workbook']], format: 'heading' },
    { kind: 'cells', ref: at('A3:C3'), values: [['Setting', 'Value', 'As']], format: 'heading' },
    { kind: 'cells', ref: at(`A4:A${last}`), values: settings.map(([label]) => [label]), format: 'plain' },
    { kind: 'cells', ref: at(`B4:B${last}`), values: settings.map(([, value]) => [value]), format: 'input' },
    { kind: 'cells', ref: at(`C4:C${last}`), values: notes, format: 'note' },
    { kind: 'name', name: UNITS_NAME, ref: at(`A4:B${last}`) },
  ];
}

function planValues(block: Block, settings: SettingTexts): Change[] {
  const rows = unitsRows(block);
  const taken = new Set(rows.map(({ row }) => row));
  const changes: Change[] = [];
  let height = block.values.length;
  for (const [label, value] of settings) {
    const schema = SETTINGS.find((row) => plainKey(row.label) === plainKey(label));
    const present = rows.find(({ key }) => key !== undefined && key === schema?.key);
    if (present !== undefined) {
      if (present.value !== value)
        changes.push({ kind: 'cells', ref: within(block.ref, present.row, 1), values: [[value]] });
      continue;
    }
    if (value === schema?.default) continue;
    let row = 0;
    while (taken.has(row)) row += 1;
    taken.add(row);
    height = Math.max(height, row + 1);
    changes.push({ kind: 'cells', ref: within(block.ref, row, 0, 1, 2), values: [[label, value]] });
  }
  if (height > block.values.length) {
    changes.push({ kind: 'name', name: UNITS_NAME, ref: within(block.ref, 0, 0, height, 2) });
  }
  return changes;
}
