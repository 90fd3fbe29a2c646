import { formatReference } from '../../../taskpane/hosts/address';
import type { MemorySheet } from '../memoryWorkbook';
import { type FakeContext, FakeExcelError } from './fakeContext';
import type { FakeExcel } from './fakeExcel';
import { cellsAt, fakeRange } from './fakeRange';

function noteParts(fake: FakeExcel, at: string): { readonly sheet: MemorySheet; readonly address: string } {
  const match = /^'?(.+?)'?!(.+)$/.exec(at);
  const sheet = fake.book.sheet(match?.[1] ?? '');
  if (sheet === undefined) throw new FakeExcelError('ItemNotFound');
  return { sheet, address: match?.[2] ?? '' };
}

/** Notes, and comments too: they are kept in the same place, a host uses one or the other. */
export function fakeNotes(fake: FakeExcel, context: FakeContext): unknown {
  const item = (at: string, orNull: boolean) =>
    context.object({
      type: 'Note',
      resolve: () => {
        const place = noteParts(fake, at);
        if (place.sheet.notes.has(place.address)) return place;
        if (orNull) return null;
        throw new FakeExcelError('ItemNotFound');
      },
      properties: {
        content: {
          get: ({ sheet, address }) => sheet.notes.get(address),
          set: ({ sheet, address }, text) => sheet.notes.set(address, String(text)),
        },
      },
      members: {
        getLocation: () =>
          fakeRange(fake, context, () => {
            const { sheet, address } = noteParts(fake, at);
            return cellsAt(fake, sheet.name, address);
          }),
        delete: () => {
          context.push(() => {
            const { sheet, address } = noteParts(fake, at);
            sheet.notes.delete(address);
          });
        },
      },
    });
  const everything = () =>
    [...fake.book.sheets.values()].flatMap(({ name, notes }) =>
      [...notes.keys()].map((address) => item(formatReference({ sheet: name, address }), false) as object),
    );
  return context.object({
    type: 'NoteCollection',
    resolve: () => fake.book,
    properties: {},
    items: everything,
    members: {
      getItem: (at: string) => item(at, false),
      getItemByCell: (at: string) => item(at, false),
      getItemOrNullObject: (at: string) => item(at, true),
      add: (at: string, text: string) => {
        context.push(() => {
          const { sheet, address } = noteParts(fake, at);
          if (sheet.notes.has(address)) throw new FakeExcelError('InvalidOperation');
          sheet.notes.set(address, text);
        });
      },
    },
  });
}
