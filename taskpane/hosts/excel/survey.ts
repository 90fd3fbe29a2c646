import type { Block, Change, HostError, Ref } from '../../port';
import { formatReference, parseArea, parseReference, formatArea } from '../address';
import { checkShapes } from '../checkShapes';
import { notesOfHost } from './notes';
import { CELLS_PER_CROSSING, readBlocks } from './readBlocks';

type CellsChange = Extract<Change, { kind: 'cells' }>;

/** What stands in the workbook where changes want to go. */
export interface Survey {
  /** Everything that forbids the changes; occupied cells do not. */
  readonly errors: readonly HostError[];
  readonly sheets: ReadonlySet<string>;
  readonly blocks: ReadonlyMap<CellsChange, Block>;
  /** Cells that another cell's formula spills into, as `Sheet!A1`. */
  readonly spilled: ReadonlySet<string>;
  /** Formula of each name that a change points anew; null where there is no such name yet. */
  readonly names: ReadonlyMap<string, string | null>;
  readonly notes: ReadonlyMap<string, string | null>;
}

async function spilledCells(context: Excel.RequestContext, blocks: readonly Block[]): Promise<Set<string>> {
  const spilled = new Set<string>();
  if (blocks.length === 0 || !Office.context.requirements.isSetSupported('ExcelApi', '1.12')) return spilled;
  const rangeOf = (ref: Ref) => context.workbook.worksheets.getItem(ref.sheet).getRange(ref.address);
  const ranges = blocks.map((block) => rangeOf(block.ref).load('hasSpill'));
  await context.sync();
  const cells = blocks.flatMap((block, i) => {
    const area = parseArea(block.ref.address);
    // Null means that some cells spill and some do not.
    if (ranges[i]?.hasSpill === false || area === null) return [];
    return block.values.flatMap((row, r) =>
      row.flatMap((value, c) => {
        if (value === null) return [];
        const address = formatArea({ top: area.top + r, left: area.left + c, rows: 1, columns: 1 });
        return [{ sheet: block.ref.sheet, address }];
      }),
    );
  });
  if (cells.length === 0) return spilled;
  const parents = cells.map((ref) => rangeOf(ref).getSpillParentOrNullObject().load('address'));
  await context.sync();
  for (const [i, ref] of cells.entries()) {
    const parent = parents[i];
    if (parent === undefined || parent.isNullObject) continue;
    if (parseReference(parent.address)?.address !== ref.address) spilled.add(formatReference(ref));
  }
  return spilled;
}

async function protectedCells(context: Excel.RequestContext, refs: readonly Ref[]): Promise<HostError[]> {
  const found = refs.map((ref) => {
    const sheet = context.workbook.worksheets.getItem(ref.sheet);
    const protection = sheet.protection.load('protected');
    return { ref, protection, cells: sheet.getRange(ref.address).format.protection.load('locked') };
  });
  await context.sync();
  return found
    .filter(({ protection, cells }) => protection.protected && (cells.locked as boolean | null) !== false)
    .map(({ ref }) => ({ reason: 'protected', ref, text: `${formatReference(ref)} is protected` }));
}

/** Looks at everything that `changes` would touch, before anything is written. */
export async function survey(context: Excel.RequestContext, changes: readonly Change[]): Promise<Survey> {
  const present = context.workbook.worksheets.load('items/name');
  const nameChanges = changes.filter((change) => change.kind === 'name');
  const items = nameChanges.map(({ name }) => context.workbook.names.getItemOrNullObject(name).load('formula'));
  await context.sync();
  const sheets = new Set(present.items.map(({ name }) => name.toLowerCase()));
  const errors = checkShapes(changes, [...sheets], CELLS_PER_CROSSING);
  const names = new Map(
    nameChanges.map(({ name }, i) => [name, items[i]?.isNullObject === false ? String(items[i].formula) : null]),
  );

  const standing = (ref: Ref) => sheets.has(ref.sheet.toLowerCase()) && parseArea(ref.address) !== null;
  const cellChanges = changes.filter((change) => change.kind === 'cells').filter(({ ref }) => standing(ref));
  const noteRefs = changes.flatMap((change) => (change.kind === 'note' && standing(change.ref) ? [change.ref] : []));
  const touched = [...cellChanges.map(({ ref }) => ref), ...noteRefs];
  if (touched.length > 0) errors.push(...(await protectedCells(context, touched)));
  const tooLarge = errors.some(({ reason }) => reason === 'too large');
  const read = tooLarge
    ? []
    : await readBlocks(
        context,
        cellChanges.map(({ ref }) => ref),
      );
  const blocks = new Map(read.flatMap((block, i) => (cellChanges[i] === undefined ? [] : [[cellChanges[i], block]])));
  const texts = noteRefs.length === 0 ? [] : await notesOfHost().read(context, noteRefs);
  const notes = new Map(noteRefs.map((ref, i) => [formatReference(ref), texts[i] ?? null]));
  return { errors, sheets, blocks, names, notes, spilled: await spilledCells(context, read) };
}
