import type { Block, Change, Ref } from '../../port';
import { formatArea, formatReference, parseArea } from '../address';
import { cellToExcel } from './cells';
import { notesOfHost } from './notes';
import { runExcel } from './runExcel';
import type { Survey } from './survey';

/** What the cells of `block` held; cells that a formula spilled into are left free for it. */
function formerContents(block: Block, spilled: ReadonlySet<string>): (string | number | boolean)[][] {
  const area = parseArea(block.ref.address);
  return block.values.map((row, r) =>
    row.map((value, c) => {
      const address = formatArea({ top: (area?.top ?? 0) + r, left: (area?.left ?? 0) + c, rows: 1, columns: 1 });
      if (spilled.has(formatReference({ sheet: block.ref.sheet, address }))) return '';
      const formula = block.formulas[r]?.[c] ?? '';
      return formula === '' ? cellToExcel(value) : formula;
    }),
  );
}

/** Puts back what a batch that failed part way had changed already: contents, names, notes, new sheets. */
export async function restore(changes: readonly Change[], before: Survey): Promise<void> {
  await runExcel(async (context) => {
    const { worksheets, names } = context.workbook;
    const newSheets = changes
      .filter((change) => change.kind === 'sheet')
      .filter(({ name }) => !before.sheets.has(name.toLowerCase()))
      .map(({ name }) => worksheets.getItemOrNullObject(name));
    const newNames = [...before.names]
      .filter(([, formula]) => formula === null)
      .map(([name]) => names.getItemOrNullObject(name));
    await context.sync();
    for (const item of newNames) if (!item.isNullObject) item.delete();
    for (const [name, formula] of before.names) if (formula !== null) names.getItem(name).formula = formula;
    for (const [change, block] of before.blocks) {
      if (change.values === undefined && change.formulas === undefined) continue;
      worksheets.getItem(block.ref.sheet).getRange(block.ref.address).formulas = formerContents(block, before.spilled);
    }
    for (const sheet of newSheets) if (!sheet.isNullObject) sheet.delete();
    await context.sync();
    const refs = noteRefs(changes, before);
    if (refs.length === 0) return;
    const present = await notesOfHost().read(context, refs);
    for (const [i, ref] of refs.entries()) {
      notesOfHost().write(context, ref, before.notes.get(formatReference(ref)) ?? '', present[i] ?? null);
    }
    await context.sync();
  });
}

function noteRefs(changes: readonly Change[], before: Survey): Ref[] {
  const refs = new Map<string, Ref>();
  for (const change of changes) {
    if (change.kind !== 'note') continue;
    const at = formatReference(change.ref);
    if (before.notes.has(at)) refs.set(at, change.ref);
  }
  return [...refs.values()];
}
