import { readFileSync, readdirSync } from 'node:fs';
import { mkdtemp, rm } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { build } from 'esbuild';
import type { Browser, BrowserContextOptions, Page } from 'playwright-core';
import { launchChromium } from './support/launchChromium';

const ORIGIN = 'http://pane.test';

const html = `<!doctype html><html lang="en"><head><meta charset="utf-8"><title>Pane</title>
<link rel="icon" href="data:,"><style>html,body{margin:0}</style></head>
<body><main id="pane"></main><script type="module" src="${ORIGIN}/paneEntry.js"></script></body></html>`;

/** A browser with the pane, bundled by itself over a workbook in memory. */
export interface PaneBrowser {
  open(options?: BrowserContextOptions): Promise<Page>;
  /** Addresses that a page asked for outside its own bundle. */
  readonly foreign: string[];
  close(): Promise<void>;
}

export async function openPaneBrowser(): Promise<PaneBrowser> {
  const folder = await mkdtemp(path.join(tmpdir(), 'latentry-pane-'));
  await build({
    entryPoints: [path.join(import.meta.dirname, 'paneEntry.tsx')],
    outdir: folder,
    bundle: true,
    splitting: true,
    format: 'esm',
    target: 'es2022',
    jsx: 'automatic',
    minify: true,
    define: { 'process.env.NODE_ENV': '"production"' },
    logLevel: 'error',
  });
  const files = new Map(readdirSync(folder).map((name) => [`/${name}`, readFileSync(path.join(folder, name), 'utf8')]));
  const browser = await launchChromium();
  const foreign: string[] = [];
  return {
    foreign,
    open: (options) => openPage(browser, files, foreign, options),
    close: async () => {
      await browser.close();
      await rm(folder, { recursive: true, force: true });
    },
  };
}

async function openPage(
  browser: Browser,
  files: ReadonlyMap<string, string>,
  foreign: string[],
  options: BrowserContextOptions = {},
): Promise<Page> {
  const context = await browser.newContext({ viewport: { width: 320, height: 900 }, ...options });
  const page = await context.newPage();
  page.on('pageerror', (error) => {
    throw error;
  });
  await page.route('**/*', async (route) => {
    const url = new URL(route.request().url());
    const file = files.get(url.pathname);
    if (url.origin === ORIGIN && url.pathname === '/') await route.fulfill({ contentType: 'text/html', body: html });
    else if (url.origin === ORIGIN && file !== undefined) {
      await route.fulfill({ contentType: 'text/javascript; charset=utf-8', body: file });
    } else {
      foreign.push(url.href);
      await route.abort();
    }
  });
  await page.goto(`${ORIGIN}/`);
  await page.getByRole('tab').first().waitFor();
  return page;
}
