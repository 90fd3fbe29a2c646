import { DEFAULT_SETTINGS, settingsRows } from '../../functions/settings/settings';
import type { Change, Ref } from '../port';
import { formulaText, type FormulaAsk, type FormulaAt } from './formulaText';
import { planUnits } from './planUnits';

/** A formula to be put into one cell. */
export interface FormulaInsert {
  readonly cell: Ref;
  readonly ask: FormulaAsk;
  readonly at: FormulaAt;
}

/**
 * Plans the writing of one formula. A workbook without a Units block gets one in the same step, since the formula
 * passes it.
 *
 * @param insert which cell, what is asked, at which temperature and pressure
 * @param withoutUnits true where the workbook has no Units block yet
 */
export function planFormula({ cell, ask, at }: FormulaInsert, withoutUnits = false): Change[] {
  const units = withoutUnits ? planUnits([], settingsRows(DEFAULT_SETTINGS)) : [];
  return [...units, { kind: 'cells', ref: cell, formulas: [[formulaText(ask, at)]], format: 'answer' }];
}
