import type { Page } from 'playwright-core';
import { HostFailure } from '../../../taskpane/hosts/hostFailure';
import type { Block, HostError, HostEvent, WorkbookHost } from '../../../taskpane/port';
import type { HostHarness } from '../../taskpane/hostContract';

type Method = Exclude<keyof WorkbookHost, 'can' | 'locale' | 'on' | 'scan' | 'names'>;
type Answer = { readonly value?: unknown; readonly errors?: readonly HostError[]; readonly words?: string };

let listeners = 0;
const heard = new Map<number, (event: HostEvent) => void>();

/** Lets the page tell its events to the tests; once a page. */
export async function hearEvents(page: Page): Promise<void> {
  await page.exposeFunction('tellTest', (id: number, event: HostEvent) => heard.get(id)?.(event));
}

/** An empty workbook in the page's grid, and its port called across the browser's protocol. */
export async function pageHarness(page: Page): Promise<HostHarness> {
  await page.evaluate(() => {
    const sheet = {
      name: 'Start',
      cells: {},
      columnWidths: {},
      rowHeights: {},
      merges: [],
      lists: [],
      freeze: { rows: 0, columns: 0 },
      gridLines: true,
      hidden: false,
      print: { landscape: false, fitWidth: false },
    };
    globalThis.LatentryPage!.grid.open({ sheets: [sheet], names: [], styles: {}, properties: {} });
  });
  const stops: (() => void)[] = [];
  const call = async (method: Method, ...args: unknown[]): Promise<never> => {
    const answer: Answer = await page.evaluate(
      async ([name, given]) => {
        try {
          const host = globalThis.LatentryPage!.host as unknown as Record<string, (...all: unknown[]) => unknown>;
          return { value: await host[name]!(...given) };
        } catch (error) {
          return { errors: (error as { errors?: HostError[] }).errors ?? [], words: String(error) };
        }
      },
      [method, args] as const,
    );
    if (answer.words === undefined) return answer.value as never;
    throw answer.errors?.length ? new HostFailure(answer.errors) : new Error(answer.words);
  };
  const host: WorkbookHost = {
    can: { chart: true, undoGroup: true, startup: false, file: true },
    locale: { decimal: '.', list: ',' },
    selection: () => call('selection'),
    read: (refs) => call('read', refs),
    names: async (prefix) =>
      new Map(await page.evaluate(async (text) => [...(await globalThis.LatentryPage!.host.names(text))], prefix)),
    scan: async function* (formula, signal) {
      const blocks: Block[] = await page.evaluate(
        async ([source, aborted]) => {
          const control = new AbortController();
          if (aborted) control.abort();
          const found: Block[] = [];
          for await (const block of globalThis.LatentryPage!.host.scan(new RegExp(source), control.signal))
            found.push(block);
          return found;
        },
        [formula.source, signal.aborted] as const,
      );
      yield* blocks;
    },
    check: (changes) => call('check', changes),
    apply: (changes, label) => call('apply', changes, label),
    recalculate: (refs) => call('recalculate', refs),
    reveal: (ref) => call('reveal', ref),
    chart: (spec, at) => call('chart', spec, at),
    state: (key, value) => call('state', key, value),
    startup: (on) => call('startup', on),
    on: (event, listener) => {
      const id = (listeners += 1);
      heard.set(id, listener);
      const started = page.evaluate(
        ([name, key]) => {
          const outside = globalThis as unknown as { tellTest: (id: number, event: object) => void };
          globalThis.LatentryPage!.host.on(name, (happened) => outside.tellTest(key, happened));
        },
        [event, id] as const,
      );
      const stop = () => {
        heard.delete(id);
      };
      void started.catch(stop);
      stops.push(stop);
      return stop;
    },
  };
  return {
    host,
    select: async (ref) => {
      await page.evaluate(({ sheet, address }) => {
        const { grid } = globalThis.LatentryPage!;
        grid.sheet(sheet)!.activate();
        grid.sheet(sheet)!.getRange(address).activate();
      }, ref);
    },
    type: async (ref, cells) => {
      await page.evaluate(
        async ([{ sheet, address }, values]) => {
          const { grid } = globalThis.LatentryPage!;
          const range = grid.sheet(sheet)!.getRange(address);
          const at = grid.sheet(sheet)!.getRange(range.getRow(), range.getColumn(), values.length, values[0]!.length);
          at.setValues(
            values.map((row) =>
              row.map((value) =>
                typeof value === 'string' && value.startsWith('=') ? { f: value } : { v: value as string | number },
              ),
            ),
          );
          await grid.api.getFormula().onCalculationResultApplied(20_000);
        },
        [ref, cells] as const,
      );
    },
    protect: async (sheet) => {
      await page.evaluate(async (name) => {
        const permission = globalThis.LatentryPage!.grid.sheet(name)!.getWorksheetPermission();
        await permission.protect();
        await permission.setReadOnly();
      }, sheet);
    },
    breakName: async (name) => {
      await page.evaluate(
        (text) => globalThis.LatentryPage!.grid.workbook().getDefinedName(text)!.setFormula('=#REF!'),
        name,
      );
    },
    activate: async (sheet) => {
      await page.evaluate((name) => void globalThis.LatentryPage!.grid.sheet(name)!.activate(), sheet);
    },
    noteAt: (ref) =>
      page.evaluate(({ sheet, address }) => {
        const worksheet = globalThis.LatentryPage!.grid.sheet(sheet)!;
        const range = worksheet.getRange(address);
        const note: unknown = worksheet.getSheet().getCellRaw(range.getRow(), range.getColumn())?.custom?.['note'];
        return typeof note === 'string' ? note : null;
      }, ref),
    dispose: () => {
      for (const stop of stops) stop();
    },
  };
}
