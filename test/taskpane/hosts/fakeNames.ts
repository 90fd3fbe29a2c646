import { formatReference } from '../../../taskpane/hosts/address';
import type { Ref } from '../../../taskpane/port';
import { type FakeContext, FakeExcelError } from './fakeContext';
import type { FakeExcel } from './fakeExcel';

/** The names of the workbook. */
export function fakeNames(fake: FakeExcel, context: FakeContext): unknown {
  const formulaOf = (ref: Ref | 'broken') =>
    ref === 'broken' || fake.book.sheet(ref.sheet) === undefined
      ? '=#REF!$A$1'
      : `=${formatReference({ ...ref, address: ref.address.replace(/([A-Z]+)(\d+)/g, '$$$1$$$2') })}`;
  const item = (name: string, orNull: boolean) =>
    context.object({
      type: 'NamedItem',
      resolve: () => {
        const found = fake.book.names.get(name.toLowerCase()) ?? null;
        if (found === null && !orNull) throw new FakeExcelError('ItemNotFound');
        return found;
      },
      properties: {
        name: { get: (found) => found.name },
        formula: {
          get: (found) => formulaOf(found.ref),
          set: (found, value) => {
            fake.book.setName(found.name, String(value));
          },
        },
        value: { get: (found) => formulaOf(found.ref).slice(1) },
        scope: { get: () => 'Workbook' },
      },
      members: {
        delete: () => {
          context.push(() => fake.book.names.delete(name.toLowerCase()));
        },
      },
    });
  return context.object({
    type: 'NamedItemCollection',
    resolve: () => fake.book,
    properties: {},
    items: () => [...fake.book.names.values()].map(({ name }) => item(name, false) as object),
    members: {
      getItem: (name: string) => item(name, false),
      getItemOrNullObject: (name: string) => item(name, true),
      add: (name: string, range: { refOf: () => string }) => {
        context.push(() => {
          if (fake.book.names.has(name.toLowerCase())) throw new FakeExcelError('ItemAlreadyExists');
          fake.book.setName(name, range.refOf());
        });
        return item(name, false);
      },
    },
  });
}
