import type { Block, Ref } from '../../port';
import { formatArea, parseArea, parseReference, type Area } from '../address';
import { CELLS_PER_CROSSING, readBlocks } from './readBlocks';
import { runExcel } from './runExcel';

async function usedRefs(context: Excel.RequestContext): Promise<Ref[]> {
  const sheets = context.workbook.worksheets.load('items/name');
  await context.sync();
  const used = sheets.items.map((sheet) => sheet.getUsedRangeOrNullObject(true).load('address'));
  await context.sync();
  return used.flatMap((range) => {
    const ref = range.isNullObject ? null : parseReference(range.address);
    return ref === null ? [] : [ref];
  });
}

function matches(pattern: RegExp, text: unknown): boolean {
  pattern.lastIndex = 0;
  return typeof text === 'string' && text.startsWith('=') && pattern.test(text);
}

/** The smallest area around the matching formulas of one piece, or null. */
function matchArea(pattern: RegExp, formulas: readonly (readonly unknown[])[], piece: Area): Area | null {
  let top = Number.POSITIVE_INFINITY;
  let left = Number.POSITIVE_INFINITY;
  let bottom = -1;
  let right = -1;
  for (const [r, row] of formulas.entries()) {
    for (const [c, text] of row.entries()) {
      if (!matches(pattern, text)) continue;
      top = Math.min(top, r);
      left = Math.min(left, c);
      bottom = Math.max(bottom, r);
      right = Math.max(right, c);
    }
  }
  if (bottom < 0) return null;
  return { top: piece.top + top, left: piece.left + left, rows: bottom - top + 1, columns: right - left + 1 };
}

async function scanPiece(pattern: RegExp, sheetName: string, piece: Area): Promise<Block | null> {
  return runExcel(async (context) => {
    const sheet = context.workbook.worksheets.getItemOrNullObject(sheetName);
    await context.sync();
    if (sheet.isNullObject) return null;
    const range = sheet.getRange(formatArea(piece)).load('formulas');
    await context.sync();
    const area = matchArea(pattern, range.formulas, piece);
    if (area === null) return null;
    const [block] = await readBlocks(context, [{ sheet: sheetName, address: formatArea(area) }]);
    // Text that only looks like a formula was read above, and is none here.
    const holds = block?.formulas.some((row) => row.some((text) => matches(pattern, text))) === true;
    return holds ? block : null;
  });
}

/** Walks the used cells of every sheet in pieces below the platform's size cap, until `signal` stops it. */
export async function* scanFormulas(pattern: RegExp, signal: AbortSignal): AsyncIterable<Block> {
  const stopped = () => signal.aborted;
  if (stopped()) return;
  for (const ref of await runExcel(usedRefs)) {
    const area = parseArea(ref.address);
    if (area === null) continue;
    const rows = Math.max(1, Math.floor(CELLS_PER_CROSSING / area.columns));
    for (let done = 0; done < area.rows; done += rows) {
      if (stopped()) return;
      const piece = { ...area, top: area.top + done, rows: Math.min(rows, area.rows - done) };
      const block = await scanPiece(pattern, ref.sheet, piece);
      if (stopped()) return;
      if (block !== null) yield block;
    }
  }
}
