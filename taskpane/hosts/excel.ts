import type { Ref, WorkbookHost } from '../port';
import { formatReference, parseArea } from './address';
import { applyChanges } from './excel/applyChanges';
import { drawChart } from './excel/drawChart';
import { excelEvents } from './excel/excelEvents';
import { fileState } from './excel/fileState';
import { ownWrites } from './excel/ownWrites';
import { readBlocks } from './excel/readBlocks';
import { readNames } from './excel/readNames';
import { recalculateCells } from './excel/recalculateCells';
import { runExcel } from './excel/runExcel';
import { scanFormulas } from './excel/scanFormulas';
import { selectedRef } from './excel/selectedRef';
import { startupBehavior } from './excel/startupBehavior';
import { survey } from './excel/survey';
import { HostFailure } from './hostFailure';
import { occupied } from './occupied';

async function reveal(ref: Ref): Promise<void> {
  if (parseArea(ref.address) === null) {
    const text = `address: allowed A1 style; received "${formatReference(ref)}"`;
    throw new HostFailure([{ reason: 'bad reference', ref, text }]);
  }
  await runExcel(async (context) => {
    const sheet = context.workbook.worksheets.getItem(ref.sheet);
    sheet.activate();
    sheet.getRange(ref.address).select();
    await context.sync();
  }, ref);
}

async function readLocale(): Promise<WorkbookHost['locale']> {
  return runExcel(async (context) => {
    const application = context.workbook.application.load('decimalSeparator');
    await context.sync();
    const decimal = application.decimalSeparator;
    // Excel does not tell its list separator; where the comma is taken, it is the semicolon.
    return { decimal, list: decimal === ',' ? ';' : ',' };
  });
}

/** The port over the workbook that is open in Excel. Call after `Office.onReady`. */
export async function excelHost(): Promise<WorkbookHost> {
  const writes = ownWrites();
  const { requirements } = Office.context;
  return {
    can: {
      chart: true,
      undoGroup: requirements.isSetSupported('ExcelApi', '1.20'),
      startup: requirements.isSetSupported('SharedRuntime', '1.1'),
      file: false,
    },
    locale: await readLocale(),
    selection: () => runExcel(selectedRef),
    read: (refs) => runExcel((context) => readBlocks(context, refs), refs[0]),
    names: (prefix) => runExcel((context) => readNames(context, prefix)),
    scan: scanFormulas,
    check: (changes) =>
      runExcel(async (context) => {
        const { errors, blocks } = await survey(context, changes);
        const hits = [...blocks].map(([change, block]) => occupied(change, block));
        return [...errors, ...hits.filter((hit) => hit !== null)];
      }),
    apply: (changes) => applyChanges(changes, writes.expect),
    recalculate: recalculateCells,
    reveal,
    chart: drawChart,
    state: fileState,
    startup: startupBehavior,
    on: excelEvents(writes),
  };
}
