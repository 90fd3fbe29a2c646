import ownFaults from './support/axe';
import { readFile } from 'node:fs/promises';
import type { Download, Page } from 'playwright-core';
import { afterAll, afterEach, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import {
  calculated,
  type OpenedPage,
  readCell,
  readCells,
  select,
  type ServedPage,
  servedPage,
  started,
  typeInto,
} from './support/servedPage';
import { fileChooser } from './support/fileChooser';

let server: ServedPage;
let opened: OpenedPage;
let page: Page;

beforeAll(async () => {
  server = await servedPage();
});
afterAll(() => server.close());
beforeEach(async () => {
  opened = await server.open();
  page = opened.page;
});
afterEach(async () => {
  await opened.close();
  expect(opened.complaints).toEqual([]);
});

/**
 * Latent heat of vaporization of water at 60 °C from IAPWS R6-95(2018) by equal pressure and Gibbs energy:
 * 2357.6545 kJ/kg; IF97 tables print 2357.7.
 */
const LATENT_60_KJ_KG = 2357.65;
/** Half a unit of the last digit given. */
const HALF_DIGIT = 0.005;

async function saved(): Promise<Download> {
  const [download] = await Promise.all([page.waitForEvent('download'), page.click('#save')]);
  return download;
}

describe('the local page', () => {
  it('answers a formula that is typed with keys', async () => {
    await typeInto(page, 'Latent heat', 'H40', '=LATENTRY.LATENT("water","vaporization",60)');
    const value = (await readCell(page, 'Latent heat', 'H40')) as number;
    expect(Math.abs(value - LATENT_60_KJ_KG)).toBeLessThanOrEqual(HALF_DIGIT);
  });

  it('offers functions while a name is typed, and their arguments after the bracket', async () => {
    await select(page, 'Latent heat', 'H40');
    await page.keyboard.type('=LATENTRY.LAT', { delay: 20 });
    await page.getByText('counted as taken up', { exact: false }).first().waitFor();
    await page.keyboard.type('ENT(', { delay: 20 });
    await page.getByText('[temperature]', { exact: false }).first().waitFor();
    await page.keyboard.press('Escape');
    await page.keyboard.press('Escape');
  });

  it('lets every cell follow a unit that is changed on the Units sheet, and back with Undo', async () => {
    await typeInto(page, 'Latent heat', 'H40', '=LATENTRY.LATENT("water","vaporization",60)');
    const before = (await readCell(page, 'Latent heat', 'C12')) as number;
    const heatRow = (await readCells(page, 'Units', 'A4:B14')).values.findIndex(([label]) => label === 'Heat');
    await typeInto(page, 'Units', `B${heatRow + 4}`, 'J/g');
    await typeInto(page, 'Units', `B${heatRow + 4}`, 'J/kg');
    // With the block in the formula the grid's own graph carries the change; without it the settings store does.
    for (const cell of ['C12', 'H40']) {
      await expect.poll(() => readCell(page, 'Latent heat', cell), { timeout: 20_000 }).toBeGreaterThan(2_000_000);
    }
    const inJoule = (await readCell(page, 'Latent heat', 'C12')) as number;
    // A factor of exactly 1000; one rounding in each conversion.
    expect(Math.abs(inJoule / before - 1000)).toBeLessThanOrEqual(1000 * 4 * Number.EPSILON);
    await page.click('#undo');
    await page.click('#undo');
    await expect.poll(() => readCell(page, 'Latent heat', 'C12'), { timeout: 20_000 }).toBe(before);
  });

  it('lets formulas find the blocks that they name when a sheet is renamed or a row is inserted above', async () => {
    // Longer than 64 characters and shorter: the grid keeps parsed formulas in two ways.
    await typeInto(
      page,
      'Latent heat',
      'J40',
      '=LATENTRY.LATENT("kelp wax","fusion",,Latentry_units,Latentry_substances)',
    );
    await typeInto(page, 'Latent heat', 'J41', '=INDEX(Latentry_substances,5,4)');
    await page.evaluate(() => {
      globalThis.LatentryPage!.grid.sheet('Substances')!.setName('Ours');
      globalThis.LatentryPage!.grid.sheet('Units')!.setName('Our units');
    });
    await calculated(page);
    await typeInto(page, 'Ours', 'D12', '190');
    const both = () => readCells(page, 'Latent heat', 'J40:J41').then(({ values }) => values.flat().map(Number));
    await expect.poll(both).toEqual([190, 190]);
    await page.evaluate(() => void globalThis.LatentryPage!.grid.sheet('Ours')!.insertRows(3, 1));
    await calculated(page);
    await typeInto(page, 'Ours', 'D13', '200');
    await expect.poll(both).toEqual([200, 200]);
    expect(await readCell(page, 'Latent heat', 'C12')).toBeTypeOf('number');
  });

  it('says at the row of a substance why it can’t be used, and marks the cell', async () => {
    await typeInto(page, 'Substances', 'D12', 'x180');
    await select(page, 'Substances', 'A12');
    const line = page.locator('#cell-status');
    await expect
      .poll(() => line.textContent())
      .toMatch(/^Substances row 12 \(kelp wax, heat of fusion\), coefficients: /);
    const mark = (row: number, column: number) =>
      page.evaluate(
        ([r, c]) => globalThis.LatentryPage!.grid.sheet('Substances')!.getSheet().getCell(r, c)?.markers?.tr?.color,
        [row, column] as const,
      );
    expect(await mark(11, 3)).toBe('#c0392b');
    // A form that the list of usual ones doesn't hold is none the worse for it.
    expect(await mark(13, 2)).toBeUndefined();
    await typeInto(page, 'Substances', 'D12', '180');
    await select(page, 'Substances', 'A12');
    await expect.poll(() => line.textContent()).toBe('');
    expect(await mark(11, 3)).toBeUndefined();
  });

  it('shows spilled numbers as wide as their columns', async () => {
    await typeInto(page, 'Latent heat', 'J40', '=LATENTRY.HEATSTEPS("iron",20,1600)');
    const shown = await page.evaluate(() => {
      const sheet = globalThis.LatentryPage!.grid.sheet('Latent heat')!.getSheet();
      return [12, 13].map((column) => String(sheet.getCell(40, column)?.v));
    });
    // A column of the usual width has room for ten characters.
    for (const text of shown) expect(text).toMatch(/^[\d.]{4,10}$/);
    const kept = (await readCells(page, 'Latent heat', 'M41')).values[0]?.[0];
    expect(Math.abs(Number(kept) - Number(shown[0]))).toBeGreaterThan(0);
  });

  it('draws a chart that follows its cells and outlives a reload', async () => {
    const cells = (address: string) => ({ sheet: 'Latent heat', address });
    await page.evaluate(
      async ([x, y, at]) => {
        const series = [{ label: 'latent heat', x, y, draw: 'points' as const }];
        const spec = { title: 'Water', xLabel: 'T', yLabel: 'latent heat', series };
        await globalThis.LatentryPage!.host.chart(spec, at);
      },
      [cells('A6:A19'), cells('C6:C19'), cells('B8')] as const,
    );
    const points = page.locator('figure.chart circle');
    await expect.poll(() => points.count()).toBe(14);
    await typeInto(page, 'Latent heat', 'A19', '125');
    await page.reload();
    await started(page);
    await select(page, 'Latent heat', 'A1');
    await expect.poll(() => points.count()).toBe(14);
    await expect.poll(() => points.last().innerHTML()).toContain('latent heat: 125,');
  });

  it('shows the words of an error below the formula bar, and over the cell', async () => {
    await typeInto(page, 'Latent heat', 'H40', '=LATENTRY.LATENT("water","vaporization",900)');
    await select(page, 'Latent heat', 'H40');
    const line = page.locator('#cell-status');
    await expect.poll(() => line.textContent()).toMatch(/^H40 shows #N\/A: temperature 900 degC is outside \[/);
    const block = await readCells(page, 'Latent heat', 'H40');
    expect(block.values[0]?.[0]).toMatchObject({ error: '#N/A', message: expect.stringContaining('900') });
    await typeInto(page, 'Latent heat', 'H40', '=1/0');
    await select(page, 'Latent heat', 'H40');
    await expect.poll(() => line.textContent()).toBe('H40 shows #DIV/0!: division by zero, or by an empty cell');
  });

  it('keeps what was typed over a reload, also just before it', async () => {
    await typeInto(page, 'Cover', 'F40', 'kelp batch 7');
    await page.reload();
    await started(page);
    expect(await readCell(page, 'Cover', 'F40')).toBe('kelp batch 7');
    expect(await page.title()).toMatch(/^• /);
    const table = await readCells(page, 'Latent heat', 'A6:F19');
    expect(table.values.flat().every((value) => typeof value === 'number')).toBe(true);
    // Sooner than the page keeps changes by itself: what is still to be kept is kept while the page closes.
    await page.evaluate(() => globalThis.LatentryPage!.grid.sheet('Cover')!.getRange('F41').setValue('hurried'));
    await page.reload();
    await started(page);
    expect(await readCell(page, 'Cover', 'F41')).toBe('hurried');
  });

  it('asks before it goes while a cell is still being typed in', async () => {
    let asked = 0;
    page.on('dialog', (dialog) => {
      asked += 1;
      void dialog.accept();
    });
    await page.reload();
    await started(page);
    expect(asked).toBe(0);
    await select(page, 'Cover', 'F42');
    await page.keyboard.type('half a wo');
    await page.reload();
    expect(asked).toBe(1);
  });

  it('saves a file that opens with the same numbers and formulas', async () => {
    await typeInto(page, 'Latent heat', 'H40', '=LATENTRY.LATENT("water","vaporization",60)');
    const before = await readCells(page, 'Latent heat', 'A1:H60');
    const download = await saved();
    expect(download.suggestedFilename()).toBe('Standard workbook.xlsx');
    const file = await readFile(await download.path());
    await typeInto(page, 'Latent heat', 'H40', '1');
    await fileChooser(page, { name: 'pilot plant.xlsx', bytes: file }, () => page.click('#open'));
    await page.getByRole('button', { name: "Don't save" }).click();
    await page.getByText('pilot plant', { exact: true }).waitFor();
    await calculated(page);
    expect(await readCells(page, 'Latent heat', 'A1:H60')).toEqual(before);
    const again = await saved();
    expect(again.suggestedFilename()).toBe('pilot plant.xlsx');
    // Nothing changed in between: every part keeps its bytes.
    expect(Buffer.compare(await readFile(await again.path()), file)).toBe(0);
  });

  it('refuses a file that is no workbook in words, and leaves the workbook as it was', async () => {
    await typeInto(page, 'Cover', 'F40', 'still here');
    const bytes = Buffer.from('temperature;latent heat\n60;2357.65\n');
    await fileChooser(page, { name: 'data.xlsx', bytes }, () => page.click('#open'));
    const notice = page.locator('#notice');
    await notice.waitFor();
    expect(await notice.innerText()).toContain('"data.xlsx" was not opened, your workbook is as it was.');
    expect(await notice.innerText()).toContain('zip');
    expect(await readCell(page, 'Cover', 'F40')).toBe('still here');
    await notice.getByRole('button', { name: 'Close' }).click();
    expect(await notice.isVisible()).toBe(false);
  });

  it('asks before a new workbook takes the place of changes, and keeps them when told so', async () => {
    await page.click('#new');
    expect(await page.locator('#ask').isVisible()).toBe(false);
    await calculated(page);
    await typeInto(page, 'Cover', 'F40', 'not yet saved');
    await page.click('#new');
    await page.locator('#ask').waitFor();
    await page.keyboard.press('Escape');
    expect(await readCell(page, 'Cover', 'F40')).toBe('not yet saved');
    await page.click('#new');
    await page.getByRole('button', { name: "Don't save" }).click();
    await expect.poll(() => readCell(page, 'Cover', 'F40')).toBeNull();
  });

  it('reaches every button of the bar with the keyboard alone, in order', async () => {
    await typeInto(page, 'Cover', 'F40', 'a step');
    await page.locator('#new').focus();
    const reached: string[] = [];
    for (let i = 0; i < 5; i++) {
      reached.push(await page.evaluate(() => document.activeElement?.id ?? ''));
      await page.keyboard.press('Tab');
    }
    expect(reached).toEqual(['new', 'open', 'save', 'undo', 'pane-toggle']);
    await page.locator('#pane-toggle').focus();
    await page.keyboard.press('Enter');
    expect(await page.locator('#pane').isVisible()).toBe(false);
    expect(await page.locator('#pane-toggle').getAttribute('aria-expanded')).toBe('false');
    await page.keyboard.press('Enter');
    await page.locator('#pane').waitFor();
  });

  it('has no accessibility faults of its own, in light, dark and narrow', async () => {
    await page.getByRole('tab').first().waitFor();
    expect(await ownFaults(page)).toEqual([]);
    await page.emulateMedia({ colorScheme: 'dark' });
    expect(await ownFaults(page)).toEqual([]);
    await page.setViewportSize({ width: 320, height: 720 });
    expect(await ownFaults(page)).toEqual([]);
  });

  it('works at a width of 320 pixels: nothing runs off to the side', async () => {
    await page.setViewportSize({ width: 320, height: 720 });
    const widths = await page.evaluate(() => [document.documentElement.scrollWidth, innerWidth]);
    expect(widths[0]).toBe(widths[1]);
    const grid = await page.locator('#sheet').boundingBox();
    const pane = await page.locator('#pane').boundingBox();
    expect(grid!.height).toBeGreaterThan(250);
    expect(pane!.y).toBeGreaterThanOrEqual(grid!.y + grid!.height - 1);
    await typeInto(page, 'Latent heat', 'A6', '60');
    expect(await readCell(page, 'Latent heat', 'A6')).toBe(60);
  });
});
