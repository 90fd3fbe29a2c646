import { readFileSync } from 'node:fs';
import { createRequire } from 'node:module';
import type { Page } from 'playwright-core';
import { afterAll, afterEach, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import type { Cell } from '../../taskpane/port';
import { openPaneBrowser, type PaneBrowser } from './paneBrowser';
import type { PaneTest } from './paneEntry';

declare global {
  var paneTest: PaneTest;
}

const axe = readFileSync(createRequire(import.meta.url).resolve('axe-core/axe.min.js'), 'utf8');

/** IAPWS SR1-86(1992): latent heat of vaporization of water; the line's numbers are R's lm, 12 digits printed. */
const set = (
  JSON.parse(readFileSync(new URL('../reference/fitting-enthalpy-temperature.json', import.meta.url), 'utf8')) as {
    sets: { id: string; x: number[]; y: number[]; expected: { slope: number; uSlope: number; intercept: number } }[];
  }
).sets.find(({ id }) => id === 'water-vaporization-0-100C');
if (set === undefined) throw new Error('the reference set is missing');
const DATA: Cell[][] = [['T / K', 'ΔH / kJ kg⁻¹'], ...set.x.map((x, i) => [x, set.y[i] ?? null])];

let browser: PaneBrowser;
let page: Page;

beforeAll(async () => {
  browser = await openPaneBrowser();
});
afterAll(() => browser.close());
beforeEach(async () => {
  page = await browser.open();
});
afterEach(() => page.context().close());

const start = (): Promise<void> => page.evaluate(() => paneTest.start());
const type = (address: string, cells: Cell[][], sheet = 'Data'): Promise<void> =>
  page.evaluate(([a, c, s]) => paneTest.host.type({ sheet: s, address: a }, c), [address, cells, sheet] as const);
const select = (address: string): Promise<void> =>
  page.evaluate((a) => paneTest.host.select({ sheet: 'Data', address: a }), address);
const values = (address: string, sheet = 'Data'): Promise<Cell[][]> =>
  page.evaluate(([a, s]) => paneTest.host.book.values({ sheet: s, address: a }), [address, sheet] as const);
const formulas = (address: string): Promise<string[][]> =>
  page.evaluate((a) => paneTest.host.book.formulas({ sheet: 'Data', address: a }), address);
const steps = (): Promise<number> => page.evaluate(() => paneTest.host.undoLog.length);
const button = (name: string | RegExp) => page.getByRole('button', { name });
const alert = () => page.getByRole('alert').filter({ visible: true });

async function fitData(): Promise<void> {
  await start();
  await type('A1:B12', DATA);
  await select('A1:B12');
  await page.getByRole('tab', { name: 'ΔCp fit' }).click();
  await button('Use selection').click();
  await page.getByText('Fitted 11 points').waitFor();
}

/** Violations of axe-core, by rule and place. */
async function axeFindings(): Promise<string[]> {
  await page.evaluate(axe);
  return page.evaluate(async () => {
    const { axe: run } = globalThis as unknown as {
      axe: { run(): Promise<{ violations: { id: string; nodes: { html: string }[] }[] }> };
    };
    const { violations } = await run.run();
    return violations.flatMap(({ id, nodes }) => nodes.map(({ html }) => `${id}: ${html}`));
  });
}

describe('the section Units', () => {
  it('says that the workbook has not been read, then that it has no Units sheet', async () => {
    await page.getByText('has not been read yet').waitFor();
    await start();
    await page.getByText('has no Units sheet yet').waitFor();
    // IAPWS R6-95(2018), saturation at 333.15 K; IAPWS SR1-86(1992) gives 2357.7 kJ/kg and 19.946 kPa.
    await page.getByText('Water at 60 °C: latent heat 2357.65 kJ/kg, saturation pressure 19.9464 kPa').waitFor();
  });

  it('creates the sheet, and a formula follows the units from then on', async () => {
    await type('A1', [['=LATENTRY.LATENT("water","vaporization",60,Latentry_units)']]);
    await start();
    await button('Create the Units sheet').click();
    await page.getByText('Written to the sheet Units').waitFor();
    expect((await values('A4:B4', 'Units'))[0]).toEqual(['Temperature', 'degC']);
    await button('Apply').waitFor();
    await page.getByLabel('Heat', { exact: true }).selectOption('kJ/mol');
    // 2357.65(1/2) kJ/kg × 18.015268 g/mol (IAPWS R6-95) = 42.4737(1) kJ/mol.
    await page.getByText(/^Water at 60 °C: latent heat 42\.473[678] kJ\/mol/).waitFor();
    await button('Apply').click();
    await expect.poll(async () => (await values('B7', 'Units'))[0]?.[0]).toBe('kJ/mol');
    await expect.poll(async () => Math.abs(Number((await values('A1'))[0]?.[0]) - 42.4737) <= 1e-4).toBe(true);
    expect(await steps()).toBe(2);
  });

  it('keeps a bad barometer at its field and writes nothing', async () => {
    await start();
    await page.getByLabel('Barometer').fill('1 bar gauge');
    await page.getByText('Allowed: an absolute pressure above 0 Pa').waitFor();
    await button('Create the Units sheet').click();
    await alert().filter({ hasText: "Barometer can't be read" }).waitFor();
    expect(await page.evaluate(() => document.activeElement?.getAttribute('aria-invalid'))).toBe('true');
    expect(await steps()).toBe(0);
    await page.getByLabel('Barometer').fill('98 kPa');
    await page.getByLabel('Pressure').selectOption('kPa gauge');
    await page.getByText('saturation pressure −78.0536 kPa gauge').waitFor();
  });

  it('takes a unit that is on no list', async () => {
    await start();
    await page.getByLabel('Heat', { exact: true }).selectOption('another unit');
    await page.getByRole('textbox', { name: 'Heat' }).fill('Wh/g');
    // 2357.65 J/g ÷ 3600 J/Wh
    await page.getByText('latent heat 0.654904 Wh/g').waitFor();
  });

  it('names a cell that cannot be read and repairs it when told to', async () => {
    await start();
    await button('Create the Units sheet').click();
    await button('Apply').waitFor();
    await type('B5', [['kPaa?']], 'Units');
    await alert().filter({ hasText: 'Units!B5 holds “kPaa?”' }).waitFor();
    await button('Write kPa in Units!B5').click();
    await expect.poll(async () => (await values('B5', 'Units'))[0]?.[0]).toBe('kPa');
    await expect.poll(() => page.evaluate(() => paneTest.store.current().state)).toBe('ready');
    expect(await alert().count()).toBe(0);
  });

  it('writes the block anew where a label is at fault', async () => {
    await start();
    await button('Create the Units sheet').click();
    await button('Apply').waitFor();
    await type('A6', [['Barometr']], 'Units');
    await button('Write the whole block anew').click();
    await expect.poll(async () => (await values('A6:B6', 'Units'))[0]).toEqual(['Barometer', '101.325 kPa']);
    await expect.poll(() => page.evaluate(() => paneTest.store.current().state)).toBe('ready');
  });

  it('leaves a sheet of that name alone that holds other things', async () => {
    await page.evaluate(() => paneTest.host.book.addSheet('Units'));
    await type('A1', [['ours']], 'Units');
    await start();
    await button('Create the Units sheet').click();
    await alert().filter({ hasText: 'Units!A1 is not empty' }).waitFor();
    expect(await steps()).toBe(0);
    await button('Use a sheet named “Latentry units”').click();
    await expect.poll(async () => (await values('A4', 'Latentry units'))[0]?.[0]).toBe('Temperature');
    expect(await values('A1', 'Units')).toEqual([['ours']]);
  });
});

describe('the section ΔCp fit', () => {
  it('fits the selection: rounded to the uncertainty, all digits on demand', async () => {
    await fitData();
    const slope = page.getByRole('row', { name: /^Slope/ }).first();
    expect(await slope.innerText()).toContain('−2.434 ± 0.013 kJ/(kg K)');
    expect(await slope.innerText()).toContain('95 % interval −2.463 to −2.405');
    const shown = Number((await slope.getByRole('cell').getAttribute('title'))?.replace('−', '-'));
    // 12 digits printed by R: half a unit of the last.
    expect(Math.abs(shown - set.expected.slope)).toBeLessThanOrEqual(5e-12);
    await page.getByText('The data bend away from a straight line (p below 0.001)').waitFor();
    await page.getByText('It is not ΔCp').waitFor();
  });

  it('draws points, line and residuals with words for both', async () => {
    await fitData();
    const pictures = page.getByRole('img');
    await pictures.nth(1).waitFor();
    expect(await pictures.first().getAttribute('aria-label')).toMatch(/^11 points and their line, from 250\d/);
    expect(await pictures.first().locator('circle').count()).toBe(11);
    expect(await pictures.nth(1).locator('circle').count()).toBe(11);
  });

  it('sets the other kinds beside the slope once the substance is known', async () => {
    await fitData();
    await page.getByLabel('Substance', { exact: true }).selectOption('water');
    await page.getByRole('row', { name: /^coexistence \(yours\)/ }).waitFor();
    for (const kind of ['isobaric', 'standard']) {
      const cells = await page
        .getByRole('row', { name: new RegExp(`^${kind}`) })
        .getByRole('cell')
        .allInnerTexts();
      const [mine, catalogue] = cells.map((text) => Number(text.replace('−', '-')));
      // Slope along the line lies below both heat-capacity differences of water between 0 and 100 °C.
      expect(mine).toBeGreaterThan(set.expected.slope);
      expect(catalogue).toBeGreaterThan(set.expected.slope);
    }
  });

  it('inserts live formulas whose cells give the numbers shown', async () => {
    await fitData();
    await button('Insert live formulas').click();
    await page.getByText('Inserted from Data!D1 on').waitFor();
    expect((await formulas('D2'))[0]?.[0]).toBe(
      '=LATENTRY.FITDELTACP(Data!A1:A12,Data!B1:B12,,,Latentry_units,"reference=298.15 K; kind=coexistence")',
    );
    expect((await formulas('E25'))[0]?.[0]).toBe('=LATENTRY.FITLATENT(D2:J22,D25,Latentry_units)');
    const table = await values('D2:F22');
    const slope = table.find(([label]) => label === 'slope of latent heat');
    // Half a unit of the twelfth digit that R printed.
    expect(Math.abs(Number(slope?.[1]) - set.expected.slope)).toBeLessThanOrEqual(5e-12);
    const [at, latent] = (await values('D25:E25'))[0] ?? [];
    // The reference is 25 °C up to the rounding of 298.15 − 273.15.
    expect(Math.abs(Number(at) - 25)).toBeLessThanOrEqual(1e-12);
    expect(Math.abs(Number(latent) - (set.expected.intercept + 298.15 * set.expected.slope))).toBeLessThanOrEqual(1e-8);
    expect((await values('A4', 'Units'))[0]?.[0]).toBe('Temperature');
    expect(await steps()).toBe(1);
  });

  it('inserts the same numbers as values', async () => {
    await fitData();
    await button('Insert values').click();
    await page.getByText('Inserted from Data!D1 on').waitFor();
    await page.getByLabel('First cell').fill('Data!M1');
    await button('Insert live formulas').click();
    await page.getByText('Inserted from Data!M1 on').waitFor();
    expect((await formulas('D1:J25')).flat().every((text) => text === '')).toBe(true);
    const fixed = await values('D2:J25');
    const live = await values('M2:S25');
    expect(fixed).toHaveLength(live.length);
    for (const [r, row] of live.entries()) {
      for (const [c, cell] of row.entries()) {
        const other = fixed[r]?.[c] ?? null;
        // Pane and function compute the same way; FITLATENT goes through the table once more.
        if (typeof cell === 'number')
          expect(Math.abs(Number(other) - cell)).toBeLessThanOrEqual(1e-12 * Math.abs(cell));
        else expect(other === '' ? null : other).toEqual(cell === '' ? null : cell);
      }
    }
  });

  it('shows what is in the way before anything is written, and takes the next free place when told to', async () => {
    await fitData();
    await type('F7', [['mine']]);
    await button('Insert live formulas').click();
    await alert().filter({ hasText: 'Data!F7 is not empty' }).waitFor();
    expect(await steps()).toBe(0);
    await button('Use the free cells from Data!G1 on').click();
    await page.getByText('Inserted from Data!G1 on').waitFor();
    expect(await values('F7')).toEqual([['mine']]);
  });

  it('reads typed ranges, units chosen for columns without any, and a reference with its own unit', async () => {
    await start();
    await type('A1:A3', [[20], [30], [40]]);
    await type('E1:E3', [[44.2], [43.8], [43.3]]);
    await page.getByRole('tab', { name: 'ΔCp fit' }).click();
    await page.getByRole('textbox', { name: 'Data' }).fill('Data!A1:A3; E1:E3');
    await button('Fit these cells').click();
    await page.getByText('The header names none').first().waitFor();
    await page.getByLabel('Unit of the latent heats').selectOption('kJ/mol');
    await page.getByLabel('Reference temperature').fill('303.15 K');
    // Slope (43.3 − 44.2)/20 kJ/(mol K), value 131.3/3 kJ/mol at the mean temperature.
    await page.getByText('Fitted 3 points: slope −45.0 J/(mol K), ΔH 43.767 kJ/mol at 30 °C').waitFor();
    await button('Insert live formulas').click();
    await page.getByText('Inserted from').waitFor();
    expect((await formulas('G2'))[0]?.[0]).toContain('"heat=kJ/mol; reference=30 degC; kind=coexistence"');
    expect((await values('G6:H6'))[0]?.[0]).toBe('slope of latent heat');
    expect(Number((await values('H25'))[0]?.[0]).toFixed(4)).toBe('43.7667');
  });

  it('shows errors where they happen', async () => {
    await start();
    await page.getByRole('tab', { name: 'ΔCp fit' }).click();
    await button('Use selection').click();
    await alert().filter({ hasText: 'Nothing is selected' }).waitFor();
    await page.getByRole('textbox', { name: 'Data' }).fill('Nowhere!A1:B3');
    await button('Fit these cells').click();
    await alert().filter({ hasText: 'no sheet named "Nowhere"' }).waitFor();
    await type('A1:B4', [
      ['T / °C', 'ΔH / kJ/kg'],
      [20, 2453.5],
      [25, 'n/a'],
      [30, 2429.8],
    ]);
    await page.getByRole('textbox', { name: 'Data' }).fill('Data!A1:B4');
    await button('Fit these cells').click();
    await alert().filter({ hasText: '"n/a" in row 3' }).waitFor();
    await type('B3', [[null]]);
    await page.getByText('Cells of these data have changed').waitFor();
    await button('Fit again').click();
    await page.getByText('row 3 (no latent heat)').waitFor();
  });

  it('shows uncertainty columns without pretending to use them', async () => {
    await start();
    await type('A1:C3', [
      ['T / °C', 'ΔH / kJ/kg', 'u(ΔH) / kJ/kg'],
      [20, 2453.5, 1],
      [30, 2429.8, 1],
    ]);
    await select('A1:C3');
    await page.getByRole('tab', { name: 'ΔCp fit' }).click();
    await button('Use selection').click();
    await page.getByText('used with the weighted and both-variables methods, which come later').waitFor();
    await page.getByText('no uncertainty: two points fix the line').first().waitFor();
  });

  it('stays awake with 100,000 rows: reading can be stopped, the picture is thinned and says so', async () => {
    await start();
    await page.evaluate(() => {
      // Straight into the cells: the workbook in memory looks at all of them at each write.
      const { cells } = paneTest.host.book.addSheet('Data');
      for (let i = 0; i < 100_000; i++) {
        cells.set(`${i},0`, { value: i / 1000, formula: '' });
        cells.set(`${i},1`, { value: 2500 - (2.4 * i) / 1000 + Math.sin(i * 12.9898), formula: '' });
      }
    });
    await page.getByRole('tab', { name: 'ΔCp fit' }).click();
    await page.getByRole('textbox', { name: 'Data' }).fill('Data!A1:B100000');
    await page.evaluate(() => {
      const { host } = paneTest;
      const read = host.read.bind(host);
      let first = true;
      host.read = async (refs) => {
        if (first) {
          first = false;
          await new Promise((resolve) => setTimeout(resolve, 300));
        }
        return read(refs);
      };
    });
    await button('Fit these cells').click();
    await button('Stop reading').click();
    await alert().filter({ hasText: 'Reading was stopped' }).waitFor();
    await button('Fit these cells').click();
    await page.getByText('Fitted 100000 points').waitFor();
    await page.getByText(/Drawn: \d+ of 100000 points/).waitFor();
    expect(await page.getByRole('img').first().locator('circle').count()).toBeLessThanOrEqual(1500);
  });
});

describe('the pane for everyone', () => {
  it.each([
    ['light', {}],
    ['dark', { colorScheme: 'dark' as const }],
    ['contrast', { forcedColors: 'active' as const }],
  ])('has nothing for axe-core to find at 320 px, %s', async (_, options) => {
    await page.context().close();
    page = await browser.open(options);
    await start();
    await page.getByText('has no Units sheet yet').waitFor();
    expect(await axeFindings()).toEqual([]);
    await page.getByLabel('Barometer').fill('none');
    await button('Create the Units sheet').click();
    await alert().first().waitFor();
    expect(await axeFindings()).toEqual([]);
    await page.getByLabel('Barometer').fill('100 kPa');
    await fitData();
    await page.getByLabel('Substance', { exact: true }).selectOption('water');
    await page.getByRole('img').nth(1).waitFor();
    await page.getByText('The picture as a table').click();
    await page.getByText('All digits').click();
    expect(await axeFindings()).toEqual([]);
    expect(await page.evaluate(() => document.documentElement.scrollWidth)).toBe(320);
  });

  it('is worked by keyboard alone', async () => {
    await start();
    await type('A1:B12', DATA);
    await select('A1:B12');
    const press = async (...keys: string[]) => {
      for (const key of keys) await page.keyboard.press(key);
    };
    const focus = () =>
      page.evaluate(() => {
        const element = document.activeElement;
        const label = element?.id === '' ? null : document.querySelector(`label[for="${element?.id ?? ''}"]`);
        return (label ?? element)?.textContent ?? '';
      });
    const tabTo = async (name: string) => {
      for (let i = 0; i < 40; i++) {
        if ((await focus()) === name) return;
        await press('Tab');
      }
      throw new Error(`"${name}" is not reached by Tab; the focus is on "${await focus()}"`);
    };
    await tabTo('Units');
    await press('ArrowRight');
    expect(await focus()).toBe('ΔCp fit');
    await tabTo('Use selection');
    await press('Enter');
    await page.getByText('Fitted 11 points').waitFor();
    expect(await focus()).toBe('Use selection');
    await tabTo('Substance');
    await press('w');
    await page.getByRole('row', { name: /^isobaric/ }).waitFor();
    await tabTo('All digits');
    await press('Enter');
    await page.getByText('its standard uncertainty').first().waitFor();
    await tabTo('First cell');
    await page.keyboard.type('Data!E1');
    await press('Enter');
    await page.getByText('Inserted from Data!E1 on').waitFor();
    await tabTo('Show these cells');
    await press('Enter');
    await expect.poll(() => page.evaluate(() => paneTest.host.book.selected?.address)).toBe('E1');
  });

  it('asks no other place for anything, and leaves the page when told to', async () => {
    await fitData();
    await page.getByRole('img').nth(1).waitFor();
    expect(browser.foreign).toEqual([]);
    await page.evaluate(() => paneTest.unmount());
    expect(await page.evaluate(() => document.getElementById('pane')?.childElementCount)).toBe(0);
    expect(await page.evaluate(() => paneTest.host.book.listenerCount('select'))).toBe(0);
  });
});
