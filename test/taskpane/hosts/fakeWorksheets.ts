import { formatArea } from '../../../taskpane/hosts/address';
import type { MemorySheet } from '../memoryWorkbook';
import { fakeChart } from './fakeChart';
import { type FakeContext, FakeExcelError } from './fakeContext';
import type { FakeExcel } from './fakeExcel';
import { cellsAt, fakeRange } from './fakeRange';

function fakeWorksheet(fake: FakeExcel, context: FakeContext, key: string, orNull: boolean): unknown {
  const find = () => {
    const sheet = fake.sheetByKey(key);
    if (sheet === null && !orNull) throw new FakeExcelError('ItemNotFound', 'The requested resource does not exist.');
    return sheet;
  };
  const need = () => {
    const sheet = find();
    if (sheet === null) throw new FakeExcelError('InvalidObjectPath');
    return sheet;
  };
  return context.object<MemorySheet>({
    type: 'Worksheet',
    resolve: find,
    properties: { name: { get: (sheet) => sheet.name }, id: { get: (sheet) => fake.id(sheet.name) } },
    members: {
      protection: context.object<MemorySheet>({
        type: 'WorksheetProtection',
        resolve: find,
        properties: { protected: { get: (sheet) => sheet.protected } },
      }),
      charts: { add: (type: string, source: unknown) => fakeChart(fake, context, type, source) },
      activate: () => {
        context.push(() => {
          const { name } = need();
          void fake.fire('activated', { worksheetId: fake.id(name) });
        });
      },
      delete: () => {
        context.push(() => {
          fake.book.sheets.delete(need().name.toLowerCase());
        });
      },
      getRange: (address: string) => fakeRange(fake, context, () => cellsAt(fake, need().name, address)),
      getRanges: (addresses: string) => {
        if (addresses.length >= 8192) throw new FakeExcelError('InvalidArgument', 'address too long');
        return {
          setDirty: () => {
            context.push(() => {
              for (const address of addresses.split(',')) fake.dirty.push(`${need().name}!${address}`);
            });
          },
        };
      },
      getUsedRangeOrNullObject: () =>
        fakeRange(fake, context, () => {
          const { name } = need();
          const used = fake.book.used(name);
          return used === null ? null : cellsAt(fake, name, formatArea(used));
        }),
    },
  });
}

/** The sheets of the workbook and their events. */
export function fakeWorksheets(fake: FakeExcel, context: FakeContext): unknown {
  return context.object({
    type: 'WorksheetCollection',
    resolve: () => fake.book,
    properties: {},
    items: () =>
      [...fake.book.sheets.values()].map((sheet) => fakeWorksheet(fake, context, sheet.name, false) as object),
    members: {
      getItem: (key: string) => fakeWorksheet(fake, context, key, false),
      getItemOrNullObject: (key: string) => fakeWorksheet(fake, context, key, true),
      add: (name: string) => {
        context.push(() => {
          if (fake.book.sheet(name) !== undefined) throw new FakeExcelError('ItemAlreadyExists');
          fake.book.addSheet(name);
        });
        return fakeWorksheet(fake, context, name, false);
      },
      onChanged: fake.event(context, 'changed'),
      onCalculated: fake.event(context, 'calculated'),
      onActivated: fake.event(context, 'activated'),
    },
  });
}
