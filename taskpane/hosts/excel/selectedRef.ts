import type { Ref } from '../../port';
import { parseReference } from '../address';
import { excelCode } from './runExcel';

/**
 * The selected block; whole rows or columns are cut to the cells in use.
 * Null while a chart or several areas are selected.
 */
export async function selectedRef(context: Excel.RequestContext): Promise<Ref | null> {
  const range = context.workbook.getSelectedRange().load('address,isEntireColumn,isEntireRow');
  try {
    await context.sync();
  } catch (error) {
    if (excelCode(error) === 'InvalidSelection' || excelCode(error) === 'ItemNotFound') return null;
    throw error;
  }
  if (!range.isEntireColumn && !range.isEntireRow) return parseReference(range.address);
  const used = range.getUsedRangeOrNullObject(true).load('address');
  await context.sync();
  return used.isNullObject ? null : parseReference(used.address);
}
