import { UNITS_NAME } from '../boot/readSnapshot';
import type { Block, Cell, Change } from '../port';
import type { SettingTexts } from './planUnits';
import { within } from './unitsBlock';

/**
 * Plans the repair of a Units block whose labels can't be read: every label and value is written anew from its first
 * cell, and what else stood inside the block is emptied.
 *
 * @param block the block as it stands
 * @param settings label and value of every setting
 */
export function planUnitsAnew(block: Block, settings: SettingTexts): Change[] {
  const height = Math.max(block.values.length, settings.length);
  const values: Cell[][] = Array.from({ length: height }, (_, row) => [...(settings[row] ?? [null, null])]);
  const ref = within(block.ref, 0, 0, height, 2);
  return [
    { kind: 'cells', ref, values },
    { kind: 'name', name: UNITS_NAME, ref },
  ];
}
