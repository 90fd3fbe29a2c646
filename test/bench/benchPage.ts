import type { Change, WorkbookHost } from '../../taskpane/port';
import { servedPage } from '../browser/support/servedPage';
import { readable } from './measure';

const CELLS = 10_000;
const HOTTEST = 371;

/** Writes 10,000 formulas into the page's grid and waits for the last of them; milliseconds of each round. */
async function inThePage([cells, hottest]: readonly [number, number]): Promise<Record<string, number[]>> {
  const { host } = (globalThis as unknown as { LatentryPage: { host: WorkbookHost } }).LatentryPage;
  const place = { sheet: 'Bench', address: `B1:B${cells}` };
  const last = { sheet: 'Bench', address: `B${cells}` };
  const column = <T>(of: (i: number) => T): T[][] => Array.from({ length: cells }, (_, i) => [of(i)]);
  const write = (change: Change): Promise<void> => host.apply([change], 'bench');
  await write({ kind: 'sheet', name: 'Bench' });
  const temperatures = column((i) => 1 + ((hottest - 1) * i) / cells);
  await write({ kind: 'cells', ref: { sheet: 'Bench', address: `A1:A${cells}` }, values: temperatures });
  const formulas = {
    EXP: (row: number) => `=EXP(A${row}/100)`,
    LATENT: (row: number) => `=LATENTRY.LATENT("water","vaporization",A${row})`,
  };
  const times: Record<string, number[]> = { EXP: [], LATENT: [] };
  for (let round = 0; round < 3; round++) {
    for (const [name, formula] of Object.entries(formulas)) {
      await write({ kind: 'cells', ref: place, values: column(() => null) });
      const start = performance.now();
      await write({ kind: 'cells', ref: place, formulas: column((i) => formula(i + 1)) });
      for (;;) {
        const [block] = await host.read([last]);
        if (typeof block?.values[0]?.[0] === 'number') break;
        await new Promise((resolve) => setTimeout(resolve, 20));
      }
      times[name]?.push(performance.now() - start);
    }
  }
  return times;
}

/** Function cells on the page's grid, in a real browser, against cells of a built-in function. */
export async function benchPage(): Promise<void> {
  const served = await servedPage();
  try {
    const { page } = await served.open();
    const times = await page.evaluate(inThePage, [CELLS, HOTTEST] as const);
    const median = (name: string): number => ([...(times[name] ?? [])].sort((a, b) => a - b)[1] ?? NaN) / 1000;
    process.stdout.write(
      `\n${CELLS} formula cells typed into the grid, in Chromium (aim: function cells at most 2× EXP cells)\n`,
    );
    for (const name of ['EXP', 'LATENT']) {
      process.stdout.write(
        `  ${`${name} cells`.padEnd(58)} ${readable(median(name)).padStart(10)}  ×${(median(name) / median('EXP')).toFixed(2)}\n`,
      );
    }
  } finally {
    await served.close();
  }
}
