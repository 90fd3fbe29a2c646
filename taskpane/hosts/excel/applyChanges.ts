import type { Change, Ref } from '../../port';
import { formatReference } from '../address';
import { HostFailure } from '../hostFailure';
import { cellToExcel } from './cells';
import { queueFormat } from './formats';
import { notesOfHost } from './notes';
import { restore } from './restore';
import { runExcel } from './runExcel';
import { survey, type Survey } from './survey';

type CellsChange = Extract<Change, { kind: 'cells' }>;

/** What to give `Range.formulas`; null leaves a cell as it is. */
function contents({ values, formulas }: CellsChange): (string | number | boolean | null)[][] | null {
  const shape = formulas ?? values;
  if (shape === undefined) return null;
  return shape.map((row, r) =>
    row.map((_, c) => {
      const formula = formulas?.[r]?.[c] ?? '';
      if (formula !== '') return formula;
      const value = values?.[r]?.[c];
      return value === undefined ? null : cellToExcel(value);
    }),
  );
}

function queue(context: Excel.RequestContext, changes: readonly Change[], before: Survey): void {
  const { worksheets, names } = context.workbook;
  const sheets = new Set(before.sheets);
  const named = new Set([...before.names].flatMap(([name, formula]) => (formula === null ? [] : [name.toLowerCase()])));
  const notes = new Map(before.notes);
  const rangeOf = (ref: Ref) => worksheets.getItem(ref.sheet).getRange(ref.address);
  for (const change of changes) {
    if (change.kind === 'sheet') {
      if (!sheets.has(change.name.toLowerCase())) worksheets.add(change.name);
      sheets.add(change.name.toLowerCase());
    } else if (change.kind === 'name') {
      const known = named.has(change.name.toLowerCase());
      if (known) names.getItem(change.name).formula = absolute(change.ref);
      else names.add(change.name, rangeOf(change.ref));
      named.add(change.name.toLowerCase());
    } else if (change.kind === 'note') {
      const at = formatReference(change.ref);
      notesOfHost().write(context, change.ref, change.text, notes.get(at) ?? null);
      notes.set(at, change.text === '' ? null : change.text);
    } else {
      const cells = contents(change);
      if (cells !== null) rangeOf(change.ref).formulas = cells;
    }
  }
  // Looks come last: a failure before them leaves every look as it was.
  for (const change of changes) {
    if (change.kind === 'cells' && change.format !== undefined) queueFormat(rangeOf(change.ref), change.format);
  }
}

function absolute({ sheet, address }: Ref): string {
  return `=${formatReference({ sheet, address: address.replace(/\$?([A-Za-z]+)\$?(\d+)/g, '$$$1$$$2') })}`;
}

/**
 * Looks first, then writes all changes in one batch. Where the batch fails part way, what it did is taken back.
 * `expect` is told of each write, so that its event can be known as our own.
 */
export async function applyChanges(changes: readonly Change[], expect: (ref: Ref) => void): Promise<void> {
  let before: Survey | undefined;
  const first = changes.flatMap((change) => (change.kind === 'sheet' ? [] : [change.ref]))[0];
  const oneUndoStep = Office.context.requirements.isSetSupported('ExcelApi', '1.20');
  try {
    await runExcel(
      async (context) => {
        const found = await survey(context, changes);
        if (found.errors.length > 0) throw new HostFailure(found.errors);
        before = found;
        for (const change of changes) if (change.kind === 'cells') expect(change.ref);
        queue(context, changes, found);
        await context.sync();
      },
      first,
      oneUndoStep ? { mergeUndoGroup: true } : {},
    );
  } catch (error) {
    if (before === undefined) throw error;
    await restore(changes, before).catch((second: unknown) => {
      throw new AggregateError([error, second], 'the change failed, and not all of it could be taken back');
    });
    throw error;
  }
}
