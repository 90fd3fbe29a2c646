import { formatArea, formatReference, parseArea, type Area } from '../../../taskpane/hosts/address';
import type { Ref } from '../../../taskpane/port';
import type { MemoryCell, MemorySheet } from '../memoryWorkbook';
import { type FakeContext, FakeExcelError } from './fakeContext';
import type { FakeExcel } from './fakeExcel';
import { asTyped, shownValue, valueType } from './fakeTyping';

export interface Cells {
  readonly sheet: MemorySheet;
  readonly area: Area;
  readonly entire: boolean;
}

export function cellsAt(fake: FakeExcel, sheetName: string, address: string, entire = false): Cells {
  const sheet = fake.book.sheet(sheetName);
  const area = parseArea(address);
  if (sheet === undefined) throw new FakeExcelError('ItemNotFound');
  if (area === null) throw new FakeExcelError('InvalidArgument');
  return { sheet, area, entire };
}

function grid<T>(fake: FakeExcel, { sheet, area }: Cells, pick: (cell: MemoryCell) => T): T[][] {
  return Array.from({ length: area.rows }, (_, r) =>
    Array.from({ length: area.columns }, (__, c) => pick(fake.book.cell(sheet.name, area.top + r, area.left + c))),
  );
}

function writeCells(fake: FakeExcel, { sheet, area }: Cells, grid: unknown[][]): void {
  const fits = grid.length === area.rows && grid.every((row) => row.length === area.columns);
  if (!fits) throw new FakeExcelError('InvalidArgument', 'the array does not have the shape of the range');
  if (sheet.protected) throw new FakeExcelError('AccessDenied');
  for (const [r, row] of grid.entries()) {
    for (const [c, input] of row.entries()) {
      const at = formatReference({
        sheet: sheet.name,
        address: formatArea({ top: area.top + r, left: area.left + c, rows: 1, columns: 1 }),
      });
      if (fake.failWrite?.at === at) {
        const { code } = fake.failWrite;
        fake.failWrite = null;
        throw new FakeExcelError(code);
      }
      fake.book.write(sheet.name, area.top + r, area.left + c, asTyped(input));
    }
  }
  fake.book.calculate();
  const ref = { sheet: sheet.name, address: formatArea(area) };
  void Promise.resolve().then(() => fake.fire('changed', fake.changeArgs(ref, 'Local', 'ThisLocalAddin')));
}

/** A range as the platform makes it. */
export function fakeRange(fake: FakeExcel, context: FakeContext, resolve: () => Cells | null): unknown {
  const spills = (cells: Cells) => grid(fake, cells, (cell) => cell.spilledFrom !== undefined).flat();
  const ref = ({ sheet, area }: Cells): Ref => ({ sheet: sheet.name, address: formatArea(area) });
  const fixed = { get: () => undefined, set: () => undefined };
  const plain = (type: string, names: readonly string[]) =>
    context.object<Cells>({ type, resolve, properties: Object.fromEntries(names.map((name) => [name, fixed])) });
  return context.object<Cells>({
    type: 'Range',
    resolve,
    properties: {
      address: { get: (cells) => (cells.entire ? `${cells.sheet.name}!A:A` : formatReference(ref(cells))) },
      values: { get: (cells) => grid(fake, cells, (cell) => shownValue(cell.value)) },
      valueTypes: { get: (cells) => grid(fake, cells, (cell) => valueType(cell.value)) },
      formulas: {
        get: (cells) => grid(fake, cells, (cell) => (cell.formula === '' ? shownValue(cell.value) : cell.formula)),
        set: (cells, value) => {
          writeCells(fake, cells, value as unknown[][]);
        },
      },
      hasSpill: {
        get: (cells) => {
          const marks = spills(cells);
          return marks.every(Boolean) ? true : marks.some(Boolean) ? null : false;
        },
      },
      isEntireColumn: { get: (cells) => cells.entire && fake.entireSelection === 'columns' },
      isEntireRow: { get: (cells) => cells.entire && fake.entireSelection === 'rows' },
    },
    members: {
      format: {
        font: plain('RangeFont', ['bold', 'italic', 'color']),
        fill: new Proxy(plain('RangeFill', ['color']) as object, {
          get: (target, name, receiver) =>
            name === 'clear' ? () => undefined : (Reflect.get(target, name, receiver) as unknown),
        }),
        protection: context.object<Cells>({
          type: 'FormatProtection',
          resolve,
          properties: { locked: { get: () => true } },
        }),
      },
      select: () => {
        context.push(() => {
          const cells = resolve();
          if (cells === null) throw new FakeExcelError('InvalidObjectPath');
          fake.book.selected = ref(cells);
          void fake.fire('selection', {});
        });
      },
      getUsedRangeOrNullObject: () =>
        fakeRange(fake, context, () => {
          const cells = resolve();
          const used = cells === null ? null : fake.book.used(cells.sheet.name);
          if (cells === null || used === null) return null;
          const { area } = cells;
          const along = fake.entireSelection === 'rows';
          const cut = along
            ? { ...used, top: area.top, rows: area.rows }
            : { ...used, left: area.left, columns: area.columns };
          return cellsAt(fake, cells.sheet.name, formatArea(cut));
        }),
      getSpillParentOrNullObject: () =>
        fakeRange(fake, context, () => {
          const cells = resolve();
          if (cells === null) return null;
          if (cells.area.rows * cells.area.columns !== 1) throw new FakeExcelError('InvalidArgument');
          const origin = fake.book.cell(cells.sheet.name, cells.area.top, cells.area.left).spilledFrom;
          if (origin === undefined) return null;
          const [top = 0, left = 0] = origin.split(',').map(Number);
          return cellsAt(fake, cells.sheet.name, formatArea({ top, left, rows: 1, columns: 1 }));
        }),
      refOf: () => {
        const cells = resolve();
        return cells === null ? '' : formatReference(ref(cells));
      },
    },
  });
}
