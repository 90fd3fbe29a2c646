import type { Ref } from '../../port';
import { runExcel } from './runExcel';

/** `Worksheet.getRanges` takes fewer than 8,192 characters. */
const LONGEST_ADDRESS = 8_191;

/** Addresses of each sheet, joined by commas, none longer than the platform takes. */
export function addressBatches(refs: readonly Ref[], longest = LONGEST_ADDRESS): Ref[] {
  const batches: { sheet: string; address: string }[] = [];
  const open = new Map<string, { sheet: string; address: string }>();
  for (const { sheet, address } of refs) {
    const batch = open.get(sheet.toLowerCase());
    if (batch !== undefined && batch.address.length + 1 + address.length <= longest) {
      batch.address += `,${address}`;
      continue;
    }
    const next = { sheet, address };
    open.set(sheet.toLowerCase(), next);
    batches.push(next);
  }
  return batches;
}

/** Marks just these cells as dirty and lets Excel calculate what is dirty, never a whole workbook. */
export async function recalculateCells(refs: readonly Ref[]): Promise<void> {
  if (refs.length === 0) return;
  await runExcel(async (context) => {
    for (const { sheet, address } of addressBatches(refs)) {
      context.workbook.worksheets.getItem(sheet).getRanges(address).setDirty();
    }
    context.workbook.application.calculate(Excel.CalculationType.recalculate);
    await context.sync();
  }, refs[0]);
}
