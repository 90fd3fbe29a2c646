import type { Ref } from '../../../taskpane/port';
import type { MemorySheet, MemoryWorkbook } from '../memoryWorkbook';
import { FakeContext, FakeExcelError } from './fakeContext';
import { fakeNames } from './fakeNames';
import { fakeNotes } from './fakeNotes';
import { cellsAt, fakeRange } from './fakeRange';
import { asTyped } from './fakeTyping';
import { fakeWorksheets } from './fakeWorksheets';

type Handler = (args: Record<string, unknown>) => Promise<void>;
type EventName = 'selection' | 'changed' | 'calculated' | 'activated';

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
  entireSelection: 'rows' | 'columns' | null = null;
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

  changeArgs(ref: Ref, source: string, trigger: string): Record<string, unknown> {
    const args = { worksheetId: this.id(ref.sheet), address: ref.address, source };
    return this.saysWhoChanged ? { ...args, triggerSource: trigger } : args;
  }

  id(sheet: string): string {
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

  sheetByKey(key: string): MemorySheet | null {
    const plain = key.startsWith('{') ? key.slice(1, -1) : key;
    return this.book.sheet(plain) ?? null;
  }

  event(context: FakeContext, name: EventName): unknown {
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
        worksheets: fakeWorksheets(this, context),
        names: fakeNames(this, context),
        settings: this.settingItems(context),
        notes: fakeNotes(this, context),
        comments: fakeNotes(this, context),
        application: this.application(context),
        onSelectionChanged: this.event(context, 'selection'),
        getSelectedRange: () =>
          fakeRange(this, context, () => {
            if (this.selectionError !== null) throw new FakeExcelError(this.selectionError);
            const { selected } = this.book;
            return selected === null
              ? null
              : cellsAt(this, selected.sheet, selected.address, this.entireSelection !== null);
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
}
