import type { Ref } from '../../port';
import { formatReference } from '../address';

/** The notes of a workbook, or on hosts from before notes its comments. */
export interface Notes {
  /** The text at each reference, null where there is none; one or two crossings. */
  read(context: Excel.RequestContext, refs: readonly Ref[]): Promise<(string | null)[]>;
  /** Queues the change; `present` is what `read` gave. */
  write(context: Excel.RequestContext, ref: Ref, text: string, present: string | null): void;
}

const notes: Notes = {
  async read(context, refs) {
    const found = refs.map((ref) => context.workbook.notes.getItemOrNullObject(formatReference(ref)).load('content'));
    await context.sync();
    return found.map((note) => (note.isNullObject ? null : note.content));
  },
  write(context, ref, text, present) {
    const all = context.workbook.notes;
    const at = formatReference(ref);
    if (present === null) {
      if (text !== '') all.add(at, text);
    } else if (text === '') all.getItem(at).delete();
    else all.getItem(at).content = text;
  },
};

const comments: Notes = {
  async read(context, refs) {
    const all = context.workbook.comments.load('items/content');
    await context.sync();
    const places = all.items.map((comment) => comment.getLocation().load('address'));
    await context.sync();
    const texts = new Map(places.map((place, i) => [place.address, all.items[i]?.content ?? '']));
    return refs.map((ref) => texts.get(formatReference(ref)) ?? null);
  },
  write(context, ref, text, present) {
    const all = context.workbook.comments;
    const at = formatReference(ref);
    if (present === null) {
      if (text !== '') all.add(at, text);
    } else if (text === '') all.getItemByCell(at).delete();
    else all.getItemByCell(at).content = text;
  },
};

/** Notes where this Excel has them (ExcelApi 1.18), else comments. */
export function notesOfHost(): Notes {
  return Office.context.requirements.isSetSupported('ExcelApi', '1.18') ? notes : comments;
}
