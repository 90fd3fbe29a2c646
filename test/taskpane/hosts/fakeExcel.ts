import { formatArea, formatReference, parseArea, type Area } from '../../../taskpane/hosts/address';
import type { Ref } from '../../../taskpane/port';
import type { MemoryCell, MemorySheet, MemoryWorkbook } from '../memoryWorkbook';
import { FakeContext, FakeExcelError } from './fakeContext';
import { asTyped, shownValue, valueType } from './fakeTyping';

type Handler = (args: Record<string, unknown>) => Promise<void>;
type EventName = 'selection' | 'changed' | 'calculated' | 'activated';

interface Cells {
  readonly sheet: MemorySheet;
  readonly area: Area;
  readonly entire: boolean;
}

/** Excel's object model over a workbook in memory, as far as the host uses it. */
export class FakeExcel {
  readonly contexts: FakeContext[] = [];
  readonly runOptions: unknown[] = [];
  readonly calculations: string[] = [];
  readonly dirty: string[] = [];
  readonly settings = new Map<string, unknown>();
  readonly chartsMade: { at: string; series: { x: string; y: string; label: string }[]; titles: string[] }[] = [];
  /** Requirement sets this Excel is without, as `ExcelApi 1.18`. */
  readonly without = new Set<string>();
  decimalSeparator = '.';
  startup = 'None';
  selectionError: string | null = null;
  /** Fails the next write to this cell, as `Sheet!A1`, with a code of the platform. */
  failWrite: { readonly at: string; readonly code: string } | null = null;
  /** Builds from before ExcelApi 1.14 do not say who made a change. */
  saysWhoChanged = true;
  private entireSelection: 'rows' | 'columns' | null = null;
  private readonly handlers = new Map<EventName, Set<Handler>>();

  constructor(readonly book: MemoryWorkbook) {
    if (book.sheets.size === 0) book.addSheet('Sheet1');
  }

  /** Total of crossings to the host. */
  get syncs(): number {
    return this.contexts.reduce((sum, context) => sum + context.syncs, 0);
  }

  /** The globals `Excel` and `Office`. */
  globals(): { readonly Excel: unknown; readonly Office: unknown } {
    const supported = (set: string, version: string) => !this.without.has(`${set} ${version}`);
    return {
      Excel: {
        run: (first: unknown, second?: unknown) => this.run(first, second),
        NamedItemScope: { workbook: 'Workbook', worksheet: 'Worksheet' },
        CalculationType: { recalculate: 'Recalculate', full: 'Full', fullRebuild: 'FullRebuild' },
        ChartType: { xyscatter: 'XYScatter', xyscatterLinesNoMarkers: 'XYScatterLinesNoMarkers' },
        EventSource: { local: 'Local', remote: 'Remote' },
        EventTriggerSource: { unknown: 'Unknown', thisLocalAddin: 'ThisLocalAddin' },
      },
      Office: {
        context: { requirements: { isSetSupported: supported } },
        StartupBehavior: { none: 'None', load: 'Load' },
        addin: {
          getStartupBehavior: () => Promise.resolve(this.startup),
          setStartupBehavior: (behavior: string) => {
            this.startup = behavior;
            return Promise.resolve();
          },
        },
      },
    };
  }

  handlerCount(): number {
    return [...this.handlers.values()].reduce((sum, set) => sum + set.size, 0);
  }

  /** A person selects cells, or whole rows or columns. */
  async select(ref: Ref, entire: 'rows' | 'columns' | null = null): Promise<void> {
    this.book.selected = ref;
    this.entireSelection = entire;
    await this.fire('selection', {});
  }

  /** A person types, here or in another session. */
  async type(ref: Ref, cells: readonly (readonly unknown[])[], source: 'Local' | 'Remote' = 'Local'): Promise<void> {
    const { top, left } = this.book.area(ref);
    for (const [r, row] of cells.entries()) {
      for (const [c, cell] of row.entries()) this.book.write(ref.sheet, top + r, left + c, asTyped(cell));
    }
    this.book.calculate();
    await this.fire('changed', this.changeArgs(ref, source, 'Unknown'));
  }

  async fire(name: EventName, args: Record<string, unknown>): Promise<void> {
    for (const handler of [...(this.handlers.get(name) ?? [])]) await handler(args);
  }

  private changeArgs(ref: Ref, source: string, trigger: string): Record<string, unknown> {
    const args = { worksheetId: this.id(ref.sheet), address: ref.address, source };
    return this.saysWhoChanged ? { ...args, triggerSource: trigger } : args;
  }

  private id(sheet: string): string {
    return `{${sheet.toLowerCase()}}`;
  }

  private async run(first: unknown, second?: unknown): Promise<unknown> {
    const batch = (second ?? first) as (context: unknown) => Promise<unknown>;
    const reused = first instanceof FakeContext ? first : undefined;
    if (reused === undefined) this.runOptions.push(second === undefined ? {} : first);
    const context = reused ?? new FakeContext();
    if (reused === undefined) this.contexts.push(context);
    (context as unknown as { workbook: unknown }).workbook = this.workbook(context);
    const result = await batch(context);
    await context.sync();
    return result;
  }

  private sheetByKey(key: string): MemorySheet | null {
    const plain = key.startsWith('{') ? key.slice(1, -1) : key;
    return this.book.sheet(plain) ?? null;
  }

  private event(context: FakeContext, name: EventName): unknown {
    return {
      add: (handler: Handler) => {
        context.push(() => {
          this.handlers.set(name, (this.handlers.get(name) ?? new Set()).add(handler));
        });
        return {
          context,
          remove: () => {
            context.push(() => {
              this.handlers.get(name)?.delete(handler);
            });
          },
        };
      },
    };
  }

  private workbook(context: FakeContext): unknown {
    return context.object({
      type: 'Workbook',
      resolve: () => this.book,
      properties: {},
      members: {
        worksheets: this.worksheets(context),
        names: this.names(context),
        settings: this.settingItems(context),
        notes: this.notes(context),
        comments: this.comments(context),
        application: this.application(context),
        onSelectionChanged: this.event(context, 'selection'),
        getSelectedRange: () =>
          this.range(context, () => {
            if (this.selectionError !== null) throw new FakeExcelError(this.selectionError);
            const { selected } = this.book;
            return selected === null
              ? null
              : this.cells(selected.sheet, selected.address, this.entireSelection !== null);
          }),
      },
    });
  }

  private application(context: FakeContext): unknown {
    return context.object({
      type: 'Application',
      resolve: () => this,
      properties: { decimalSeparator: { get: () => this.decimalSeparator } },
      members: {
        calculate: (type: string) => {
          context.push(() => {
            this.calculations.push(type);
            this.book.calculate();
            void this.fire('calculated', {});
          });
        },
      },
    });
  }

  private worksheets(context: FakeContext): unknown {
    return context.object({
      type: 'WorksheetCollection',
      resolve: () => this.book,
      properties: {},
      items: () => [...this.book.sheets.values()].map((sheet) => this.worksheet(context, sheet.name, false) as object),
      members: {
        getItem: (key: string) => this.worksheet(context, key, false),
        getItemOrNullObject: (key: string) => this.worksheet(context, key, true),
        add: (name: string) => {
          context.push(() => {
            if (this.book.sheet(name) !== undefined) throw new FakeExcelError('ItemAlreadyExists');
            this.book.addSheet(name);
          });
          return this.worksheet(context, name, false);
        },
        onChanged: this.event(context, 'changed'),
        onCalculated: this.event(context, 'calculated'),
        onActivated: this.event(context, 'activated'),
      },
    });
  }

  private worksheet(context: FakeContext, key: string, orNull: boolean): unknown {
    const find = () => {
      const sheet = this.sheetByKey(key);
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
      properties: { name: { get: (sheet) => sheet.name }, id: { get: (sheet) => this.id(sheet.name) } },
      members: {
        protection: context.object<MemorySheet>({
          type: 'WorksheetProtection',
          resolve: find,
          properties: { protected: { get: (sheet) => sheet.protected } },
        }),
        charts: { add: (type: string, source: unknown) => this.chart(context, type, source) },
        activate: () => {
          context.push(() => {
            const { name } = need();
            void this.fire('activated', { worksheetId: this.id(name) });
          });
        },
        delete: () => {
          context.push(() => {
            this.book.sheets.delete(need().name.toLowerCase());
          });
        },
        getRange: (address: string) => this.range(context, () => this.cells(need().name, address)),
        getRanges: (addresses: string) => {
          if (addresses.length >= 8192) throw new FakeExcelError('InvalidArgument', 'address too long');
          return {
            setDirty: () => {
              context.push(() => {
                for (const address of addresses.split(',')) this.dirty.push(`${need().name}!${address}`);
              });
            },
          };
        },
        getUsedRangeOrNullObject: () =>
          this.range(context, () => {
            const { name } = need();
            const used = this.book.used(name);
            return used === null ? null : this.cells(name, formatArea(used));
          }),
      },
    });
  }

  private cells(sheetName: string, address: string, entire = false): Cells {
    const sheet = this.book.sheet(sheetName);
    const area = parseArea(address);
    if (sheet === undefined) throw new FakeExcelError('ItemNotFound');
    if (area === null) throw new FakeExcelError('InvalidArgument');
    return { sheet, area, entire };
  }

  private grid<T>({ sheet, area }: Cells, pick: (cell: MemoryCell) => T): T[][] {
    return Array.from({ length: area.rows }, (_, r) =>
      Array.from({ length: area.columns }, (__, c) => pick(this.book.cell(sheet.name, area.top + r, area.left + c))),
    );
  }

  private range(context: FakeContext, resolve: () => Cells | null): unknown {
    const spills = (cells: Cells) => this.grid(cells, (cell) => cell.spilledFrom !== undefined).flat();
    const ref = ({ sheet, area }: Cells): Ref => ({ sheet: sheet.name, address: formatArea(area) });
    const fixed = { get: () => undefined, set: () => undefined };
    const plain = (type: string, names: readonly string[]) =>
      context.object<Cells>({ type, resolve, properties: Object.fromEntries(names.map((name) => [name, fixed])) });
    return context.object<Cells>({
      type: 'Range',
      resolve,
      properties: {
        address: { get: (cells) => (cells.entire ? `${cells.sheet.name}!A:A` : formatReference(ref(cells))) },
        values: { get: (cells) => this.grid(cells, (cell) => shownValue(cell.value)) },
        valueTypes: { get: (cells) => this.grid(cells, (cell) => valueType(cell.value)) },
        formulas: {
          get: (cells) => this.grid(cells, (cell) => (cell.formula === '' ? shownValue(cell.value) : cell.formula)),
          set: (cells, value) => {
            this.writeCells(cells, value as unknown[][]);
          },
        },
        hasSpill: {
          get: (cells) => {
            const marks = spills(cells);
            return marks.every(Boolean) ? true : marks.some(Boolean) ? null : false;
          },
        },
        isEntireColumn: { get: (cells) => cells.entire && this.entireSelection === 'columns' },
        isEntireRow: { get: (cells) => cells.entire && this.entireSelection === 'rows' },
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
            this.book.selected = ref(cells);
            void this.fire('selection', {});
          });
        },
        getUsedRangeOrNullObject: () =>
          this.range(context, () => {
            const cells = resolve();
            const used = cells === null ? null : this.book.used(cells.sheet.name);
            if (cells === null || used === null) return null;
            const { area } = cells;
            const along = this.entireSelection === 'rows';
            const cut = along
              ? { ...used, top: area.top, rows: area.rows }
              : { ...used, left: area.left, columns: area.columns };
            return this.cells(cells.sheet.name, formatArea(cut));
          }),
        getSpillParentOrNullObject: () =>
          this.range(context, () => {
            const cells = resolve();
            if (cells === null) return null;
            if (cells.area.rows * cells.area.columns !== 1) throw new FakeExcelError('InvalidArgument');
            const origin = this.book.cell(cells.sheet.name, cells.area.top, cells.area.left).spilledFrom;
            if (origin === undefined) return null;
            const [top = 0, left = 0] = origin.split(',').map(Number);
            return this.cells(cells.sheet.name, formatArea({ top, left, rows: 1, columns: 1 }));
          }),
        refOf: () => {
          const cells = resolve();
          return cells === null ? '' : formatReference(ref(cells));
        },
      },
    });
  }

  private writeCells({ sheet, area }: Cells, grid: unknown[][]): void {
    const fits = grid.length === area.rows && grid.every((row) => row.length === area.columns);
    if (!fits) throw new FakeExcelError('InvalidArgument', 'the array does not have the shape of the range');
    if (sheet.protected) throw new FakeExcelError('AccessDenied');
    for (const [r, row] of grid.entries()) {
      for (const [c, input] of row.entries()) {
        const at = formatReference({
          sheet: sheet.name,
          address: formatArea({ top: area.top + r, left: area.left + c, rows: 1, columns: 1 }),
        });
        if (this.failWrite?.at === at) {
          const { code } = this.failWrite;
          this.failWrite = null;
          throw new FakeExcelError(code);
        }
        this.book.write(sheet.name, area.top + r, area.left + c, asTyped(input));
      }
    }
    this.book.calculate();
    const ref = { sheet: sheet.name, address: formatArea(area) };
    void Promise.resolve().then(() => this.fire('changed', this.changeArgs(ref, 'Local', 'ThisLocalAddin')));
  }

  private names(context: FakeContext): unknown {
    const formulaOf = (ref: Ref | 'broken') =>
      ref === 'broken' || this.book.sheet(ref.sheet) === undefined
        ? '=#REF!$A$1'
        : `=${formatReference({ ...ref, address: ref.address.replace(/([A-Z]+)(\d+)/g, '$$$1$$$2') })}`;
    const item = (name: string, orNull: boolean) =>
      context.object({
        type: 'NamedItem',
        resolve: () => {
          const found = this.book.names.get(name.toLowerCase()) ?? null;
          if (found === null && !orNull) throw new FakeExcelError('ItemNotFound');
          return found;
        },
        properties: {
          name: { get: (found) => found.name },
          formula: {
            get: (found) => formulaOf(found.ref),
            set: (found, value) => {
              this.book.setName(found.name, String(value));
            },
          },
          value: { get: (found) => formulaOf(found.ref).slice(1) },
          scope: { get: () => 'Workbook' },
        },
        members: {
          delete: () => {
            context.push(() => this.book.names.delete(name.toLowerCase()));
          },
        },
      });
    return context.object({
      type: 'NamedItemCollection',
      resolve: () => this.book,
      properties: {},
      items: () => [...this.book.names.values()].map(({ name }) => item(name, false) as object),
      members: {
        getItem: (name: string) => item(name, false),
        getItemOrNullObject: (name: string) => item(name, true),
        add: (name: string, range: { refOf: () => string }) => {
          context.push(() => {
            if (this.book.names.has(name.toLowerCase())) throw new FakeExcelError('ItemAlreadyExists');
            this.book.setName(name, range.refOf());
          });
          return item(name, false);
        },
      },
    });
  }

  private settingItems(context: FakeContext): unknown {
    return {
      add: (key: string, value: unknown) => {
        context.push(() => this.settings.set(key, value));
      },
      getItemOrNullObject: (key: string) =>
        context.object({
          type: 'Setting',
          resolve: () => (this.settings.has(key) ? { value: this.settings.get(key) } : null),
          properties: { value: { get: (found) => found.value } },
        }),
    };
  }

  private noteParts(at: string): { readonly sheet: MemorySheet; readonly address: string } {
    const match = /^'?(.+?)'?!(.+)$/.exec(at);
    const sheet = this.book.sheet(match?.[1] ?? '');
    if (sheet === undefined) throw new FakeExcelError('ItemNotFound');
    return { sheet, address: match?.[2] ?? '' };
  }

  private notes(context: FakeContext): unknown {
    const item = (at: string, orNull: boolean) =>
      context.object({
        type: 'Note',
        resolve: () => {
          const place = this.noteParts(at);
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
            this.range(context, () => {
              const { sheet, address } = this.noteParts(at);
              return this.cells(sheet.name, address);
            }),
          delete: () => {
            context.push(() => {
              const { sheet, address } = this.noteParts(at);
              sheet.notes.delete(address);
            });
          },
        },
      });
    const everything = () =>
      [...this.book.sheets.values()].flatMap(({ name, notes }) =>
        [...notes.keys()].map((address) => item(formatReference({ sheet: name, address }), false) as object),
      );
    return context.object({
      type: 'NoteCollection',
      resolve: () => this.book,
      properties: {},
      items: everything,
      members: {
        getItem: (at: string) => item(at, false),
        getItemByCell: (at: string) => item(at, false),
        getItemOrNullObject: (at: string) => item(at, true),
        add: (at: string, text: string) => {
          context.push(() => {
            const { sheet, address } = this.noteParts(at);
            if (sheet.notes.has(address)) throw new FakeExcelError('InvalidOperation');
            sheet.notes.set(address, text);
          });
        },
      },
    });
  }

  /** Comments are kept where notes are; a host uses one or the other. */
  private comments(context: FakeContext): unknown {
    return this.notes(context);
  }

  private chart(context: FakeContext, type: string, source: unknown): unknown {
    if (type !== 'XYScatter') throw new FakeExcelError('InvalidArgument');
    const made = { at: '', series: [] as { x: string; y: string; label: string }[], titles: [] as string[] };
    const refOf = (range: unknown) => (range as { refOf: () => string }).refOf();
    context.push(() => {
      made.series.push({ label: 'from the source range', x: '', y: refOf(source) });
      this.chartsMade.push(made);
    });
    const title = () =>
      context.object({
        type: 'ChartTitle',
        resolve: () => made,
        properties: { text: { get: () => '', set: (_, text) => made.titles.push(String(text)) } },
      });
    const series = (find: () => { x: string; y: string; label: string }) =>
      context.object({
        type: 'ChartSeries',
        resolve: find,
        properties: { name: { get: (found) => found.label }, chartType: { get: () => '', set: () => undefined } },
        members: {
          delete: () => {
            context.push(() => made.series.splice(made.series.indexOf(find()), 1));
          },
          setXAxisValues: (range: unknown) => {
            context.push(() => {
              find().x = refOf(range);
            });
          },
          setValues: (range: unknown) => {
            context.push(() => {
              find().y = refOf(range);
            });
          },
        },
      });
    return context.object({
      type: 'Chart',
      resolve: () => made,
      properties: {
        width: { get: () => 0, set: () => undefined },
        height: { get: () => 0, set: () => undefined },
      },
      members: {
        title: title(),
        axes: { categoryAxis: { title: title() }, valueAxis: { title: title() } },
        setPosition: (range: unknown) => {
          context.push(() => {
            made.at = refOf(range);
          });
        },
        series: context.object({
          type: 'ChartSeriesCollection',
          resolve: () => made,
          properties: {},
          items: () => made.series.map((found) => series(() => found) as object),
          members: {
            add: (label: string) => {
              const found = { label, x: '', y: '' };
              context.push(() => made.series.push(found));
              return series(() => found);
            },
          },
        }),
      },
    });
  }
}
