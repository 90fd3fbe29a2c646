import { existsSync } from 'node:fs';
import { createServer } from 'node:http';
import type { AddressInfo } from 'node:net';
import path from 'node:path';
import type { Browser, BrowserContextOptions, Page } from 'playwright-core';
import type { Block } from '../../../taskpane/port';
import { servePage } from '../../../workbook/run/servePage.mjs';
import { launchChromium } from './launchChromium';

const DIST = path.resolve(import.meta.dirname, '../../../dist');

/** The built page, served as `npm start` serves it, in a real browser. */
export interface ServedPage {
  readonly address: string;
  readonly browser: Browser;
  /** A fresh profile with the page open and calculated; what the page complains of is collected. */
  open(options?: BrowserContextOptions): Promise<OpenedPage>;
  close(): Promise<void>;
}

export interface OpenedPage {
  readonly page: Page;
  /** Exceptions and console errors so far. */
  readonly complaints: string[];
  close(): Promise<void>;
}

/** Starts server and browser. */
export async function servedPage(): Promise<ServedPage> {
  if (!existsSync(path.join(DIST, 'page.js'))) throw new Error('dist/page.js is not there: run "npm run build" first');
  const handler = servePage(DIST);
  const server = createServer((request, response) => void handler(request, response));
  await new Promise<void>((resolve) => server.listen(0, '127.0.0.1', resolve));
  const address = `http://127.0.0.1:${(server.address() as AddressInfo).port}/`;
  const browser = await launchChromium();
  return {
    address,
    browser,
    open: async (options = { viewport: { width: 1280, height: 800 } }) => {
      const context = await browser.newContext(options);
      const page = await context.newPage();
      const complaints: string[] = [];
      page.on('pageerror', (error) => complaints.push(error.message));
      page.on('console', (message) => {
        if (message.type() === 'error') complaints.push(`${message.text()} ${message.location().url}`);
      });
      // Without the dialogue of the system, files are saved among the downloads.
      await page.addInitScript(() => Reflect.deleteProperty(globalThis, 'showSaveFilePicker'));
      await page.goto(address);
      await started(page);
      return { page, complaints, close: () => context.close() };
    },
    close: async () => {
      await browser.close();
      server.closeAllConnections();
      await new Promise((resolve) => server.close(resolve));
    },
  };
}

/** Waits until the page runs and has calculated. */
export async function started(page: Page): Promise<void> {
  await page.waitForFunction(() => globalThis.LatentryPage !== undefined, undefined, { timeout: 60_000 });
  await calculated(page);
}

/** Waits until nothing is left to calculate. */
export async function calculated(page: Page): Promise<void> {
  await page.evaluate(() => globalThis.LatentryPage?.grid.api.getFormula().onCalculationResultApplied(60_000));
}

/** Values and formulas of cells, through the page's own port. */
export async function readCells(page: Page, sheet: string, address: string): Promise<Block> {
  const block = await page.evaluate(
    async ([name, cells]) => (await globalThis.LatentryPage?.host.read([{ sheet: name, address: cells }]))?.[0],
    [sheet, address] as const,
  );
  if (block === undefined) throw new Error(`no block for ${sheet}!${address}`);
  return block;
}

/** The value of one cell. */
export async function readCell(page: Page, sheet: string, address: string): Promise<unknown> {
  return (await readCells(page, sheet, address)).values[0]?.[0];
}

/** Brings a cell into view, as a person would by clicking it, and types with real keys. */
export async function typeInto(page: Page, sheet: string, address: string, text: string): Promise<void> {
  await select(page, sheet, address);
  await page.keyboard.type(text, { delay: 5 });
  await page.keyboard.press('Enter');
  await calculated(page);
}

/** Selects cells with the keyboard's focus on the grid. */
export async function select(page: Page, sheet: string, address: string): Promise<void> {
  const canvas = page.locator('canvas[id^="univer-sheet-main-canvas"]');
  const reveal = () =>
    page.evaluate(([name, cells]) => globalThis.LatentryPage?.host.reveal({ sheet: name, address: cells }), [
      sheet,
      address,
    ] as const);
  await reveal();
  const box = await canvas.boundingBox();
  if (box === null) throw new Error('the grid is not in view');
  // In the first column, where no chart lies.
  await canvas.click({ position: { x: 60, y: box.height / 2 } });
  await reveal();
}
