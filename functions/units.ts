import { answer } from './edge/answer';
import type { BlockwiseSpec } from './edge/spec';
import { settingsRows } from './settings/settings';

const spec: BlockwiseSpec = {
  family: 'blockwise',
  name: 'UNITS',
  args: [],
  options: [],
  run: (_blocks, settings) => settingsRows(settings).map((row) => [...row]),
};

/**
 * The unit settings in force, as a table of two columns.
 * @customfunction UNITS
 * @param [settings] Latentry_units, or text as "temperature=K"; the workbook's own settings when left out.
 * @param invocation The call itself.
 * @returns Setting and value, one a row.
 */
export function units(settings?: any[][][], invocation?: CustomFunctions.Invocation): any[][] {
  return answer(spec, [settings, invocation]);
}
