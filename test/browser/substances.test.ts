import type { Page } from 'playwright-core';
import { afterAll, afterEach, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import type { Cell } from '../../taskpane/port';
import { openPaneBrowser, type PaneBrowser } from './paneBrowser';
import type { PaneTest } from './paneEntry';
import ownFaults from './support/axe';

declare global {
  var paneTest: PaneTest;
}

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

const type = (address: string, cells: Cell[][], sheet = 'Data'): Promise<void> =>
  page.evaluate(([a, c, s]) => paneTest.host.type({ sheet: s, address: a }, c), [address, cells, sheet] as const);
const select = (address: string): Promise<void> =>
  page.evaluate((a) => paneTest.host.select({ sheet: 'Data', address: a }), address);
const value = async (address: string): Promise<Cell | undefined> =>
  (await page.evaluate((a) => paneTest.host.book.values({ sheet: 'Data', address: a }), address))[0]?.[0];
const formula = async (address: string): Promise<string | undefined> =>
  (await page.evaluate((a) => paneTest.host.book.formulas({ sheet: 'Data', address: a }), address))[0]?.[0];
const steps = (): Promise<number> => page.evaluate(() => paneTest.host.undoLog.length);
const button = (name: string | RegExp) => page.getByRole('button', { name });
const alert = () => page.getByRole('alert').filter({ visible: true });
const field = () => page.getByRole('combobox', { name: 'Find a substance' });
const listed = () => page.getByRole('listbox', { name: 'Substances' });
const slider = () => page.getByRole('slider', { name: 'Temperature' });
const press = async (...keys: string[]): Promise<void> => {
  for (const key of keys) await page.keyboard.press(key);
};

async function openSection(): Promise<void> {
  await page.evaluate(() => paneTest.start());
  await page.getByRole('tab', { name: 'Substances' }).click();
  await field().waitFor();
}

async function openCard(name: string): Promise<void> {
  await openSection();
  await field().fill(name);
  await field().press('Enter');
  await page.getByRole('article', { name }).waitFor();
  await page.getByRole('img', { name: /^Enthalpy of/ }).waitFor();
}

describe('finding a substance', () => {
  it('by keyboard alone: type, arrow down, Enter', async () => {
    await page.evaluate(() => paneTest.start());
    await page.getByRole('tab', { name: 'Units' }).focus();
    await press('ArrowLeft');
    expect(await page.evaluate(() => document.activeElement?.textContent)).toBe('Substances');
    await field().waitFor();
    await press('Tab');
    expect(await field().evaluate((input) => input === document.activeElement)).toBe(true);
    await page.keyboard.type('steam');
    await listed().getByRole('option', { name: 'water steam' }).waitFor();
    await page.getByRole('status').filter({ hasText: 'One match: water.' }).waitFor();
    await press('ArrowDown');
    const active = await field().getAttribute('aria-activedescendant');
    expect(await listed().getByRole('option', { selected: true }).getAttribute('id')).toBe(active);
    await press('Enter');
    await page.getByRole('article', { name: 'water' }).waitFor();
    expect(await field().getAttribute('aria-expanded')).toBe('false');
    expect(await field().inputValue()).toBe('water');
  });

  it.each([
    ['7732-18-5', 'CAS 7732-18-5'],
    ['H2O', 'formula H2O'],
  ])('by %s, and says by which word', async (text, by) => {
    await openSection();
    await field().fill(text);
    await listed()
      .getByRole('option', { name: `water ${by}` })
      .click();
    await page.getByRole('article', { name: 'water' }).waitFor();
  });

  it('says what was probably meant, and takes it', async () => {
    await openSection();
    await field().fill('watre');
    await page.getByRole('status').filter({ hasText: 'Nothing is called “watre” here. Nearest: water.' }).waitFor();
    await field().press('Enter');
    await page.getByRole('article', { name: 'water' }).waitFor();
  });

  it('lists everything without a word, and closes with Escape', async () => {
    await openSection();
    await field().click();
    const all = await listed().getByRole('option').count();
    await page
      .getByRole('status')
      .filter({ hasText: `${all} substances.` })
      .waitFor();
    await press('Escape');
    expect(await listed().getByRole('option').count()).toBe(0);
  });
});

describe('the card', () => {
  it('leads with the diagram, in words and as a table too', async () => {
    await openCard('water');
    const words = await page.getByRole('img', { name: /^Enthalpy of/ }).getAttribute('aria-label');
    expect(words).toMatch(/fusion at 0\.00251\d+ °C over a gap of 333\.\d+ kJ\/kg/);
    expect(words).toMatch(/vaporization at 99\.9743 °C over a gap of 2256\.\d+ kJ\/kg/);
    await page.getByText('The diagram as a table').click();
    expect(await page.getByRole('row', { name: /^vaporization/ }).innerText()).toContain('2256.');
  });

  it('moves the temperature with the arrow keys, and all numbers with it', async () => {
    await openCard('water');
    expect(await slider().getAttribute('aria-valuetext')).toMatch(/^25 °C, liquid, liquid to ideal gas \d+/);
    await slider().focus();
    await press('ArrowRight', 'ArrowRight');
    await page.getByTestId('state').filter({ hasText: 'At 27 °C: liquid' }).waitFor();
    await press('PageUp');
    await page.getByTestId('state').filter({ hasText: 'At 37 °C: liquid' }).waitFor();
    await press('Home');
    await page.getByTestId('state').filter({ hasText: ': solid' }).waitFor();
    await page.getByRole('textbox', { name: 'Temperature, °C' }).fill('60');
    await page.getByTestId('state').filter({ hasText: 'At 60 °C: liquid' }).waitFor();
    const row = page.getByRole('row', { name: /^ΔH on the two-phase line 2/ });
    // IAPWS SR1-86(1992): 2357.7 kJ/kg at 60 °C.
    expect(await row.innerText()).toMatch(/2357\.[67]\d* kJ\/kg/);
    await page.getByRole('textbox', { name: 'Temperature, °C' }).press('ArrowUp');
    await page.getByTestId('state').filter({ hasText: 'At 61 °C' }).waitFor();
  });

  it('moves the temperature by dragging, and catches a transition', async () => {
    await openCard('water');
    const box = await page.getByTestId('diagram').boundingBox();
    if (box === null) throw new Error('the diagram has no box');
    await page.mouse.move(box.x + 100, box.y + 150);
    await page.mouse.down();
    await page.mouse.move(box.x + 110, box.y + 150);
    await expect.poll(() => page.getByTestId('state').innerText()).not.toContain('At 25 °C');
    // The frame of the window from −45 to 145 °C is 228 px wide and begins at 54 px: boiling stands near 228 px.
    for (let x = 215; x <= 240; x++) {
      await page.mouse.move(box.x + x, box.y + 150);
      if ((await page.getByTestId('state').innerText()).includes('vaporization')) break;
    }
    expect(await page.getByTestId('state').innerText()).toBe('At 99.9743 °C: vaporization, liquid and gas together');
    await page.mouse.up();
    await page.mouse.move(box.x + 100, box.y + 150);
    expect(await page.getByTestId('state').innerText()).toContain('At 99.9743 °C');
  });

  it('takes another pressure, and says what it can’t draw', async () => {
    await openCard('water');
    await page.getByRole('textbox', { name: 'Pressure, kPa' }).fill('0.3');
    await page.getByRole('img', { name: /sublimation at/ }).waitFor();
    await page.getByRole('textbox', { name: 'Pressure, kPa' }).fill('2 GPa');
    await page.getByText(/^No diagram: pressure 2000000 kPa is outside/).waitFor();
    await page.getByRole('textbox', { name: 'Pressure, kPa' }).fill('soon');
    await page.getByText(/pressure: allowed/).waitFor();
  });

  it('names each kind honestly, with its own slope', async () => {
    await openCard('water');
    await page
      .getByRole('row', { name: /^slope along saturation/ })
      .first()
      .waitFor();
    expect(await page.getByText('ΔCp at 101.325 kPa').first().isVisible()).toBe(false);
    await page.getByRole('textbox', { name: 'Temperature, °C' }).fill('99');
    await page.getByText('Other kinds of this heat').nth(1).click();
    for (const label of ['ΔCp at 101.325 kPa', 'ΔCp° of the standard states']) {
      await page.getByText(label).filter({ visible: true }).first().waitFor();
    }
  });

  it('follows the units of the workbook', async () => {
    await openCard('water');
    await page.getByRole('tab', { name: 'Units' }).click();
    await page.getByLabel('Heat', { exact: true }).selectOption('kJ/mol');
    await button('Create the Units sheet').click();
    await page.getByText('Written to the sheet Units').waitFor();
    await page.getByRole('tab', { name: 'Substances' }).click();
    // IAPWS R6-95(2018): 44.0 kJ/mol at 25 °C.
    await page.getByRole('row', { name: /^ΔH on the two-phase line 43\.98\d+ kJ\/mol/ }).waitFor();
  });

  it('shows ranges, methods, sources, constants and whether the data agree', async () => {
    await openCard('water');
    await page
      .getByText(/^vaporization, coexistence/)
      .first()
      .click();
    await page.getByText('IAPWS R6-95(2018)').filter({ visible: true }).first().waitFor();
    expect(await page.getByRole('row', { name: /^molar mass/ }).innerText()).toContain('18.0153 g/mol');
    await page.getByText('Do its data agree?').waitFor();
    await page.getByText(/differ by/).waitFor();
  });
});

describe('inserting a formula', () => {
  it('puts it with the shown temperature into the selected cell; the cell gives the number shown', async () => {
    await openCard('water');
    await select('B3:C9');
    await button('Insert formula: vaporization: ΔH on the two-phase line').click();
    await page.getByRole('status').filter({ hasText: 'In Data!B3 now:' }).waitFor();
    expect(await formula('B3')).toBe('=LATENTRY.LATENT("water","vaporization",25,Latentry_units)');
    // IAPWS SR1-86(1992): 2441.7 kJ/kg at 25 °C.
    expect(Math.abs(Number(await value('B3')) - 2441.7)).toBeLessThanOrEqual(0.055);
    expect(await steps()).toBe(1);
    // The Units sheet came in the same step; the next formula finds it.
    await select('B4');
    await button('Insert formula: vaporization: slope along saturation').click();
    await page.getByRole('status').filter({ hasText: 'In Data!B4 now:' }).waitFor();
    // IAPWS R6-95(2018): −42.70 J/(mol K), at 18.015268 g/mol.
    expect(Math.abs(Number(await value('B4')) + 42.7 / 18.015268)).toBeLessThanOrEqual(3e-4);
    expect(await steps()).toBe(2);
  });

  it('reads the temperature from a cell when one is named', async () => {
    await openCard('water');
    await type('A2', [[60]]);
    await select('B2');
    await page.getByRole('textbox', { name: 'Temperature in formulas' }).fill('a2');
    await button('Insert formula: saturation pressure').first().click();
    await page.getByRole('status').filter({ hasText: 'In Data!B2 now:' }).waitFor();
    expect(await formula('B2')).toBe('=LATENTRY.SATPRESSURE("water",A2,Latentry_units)');
    // IAPWS SR1-86(1992): 19.946 kPa at 60 °C.
    expect(Math.abs(Number(await value('B2')) - 19.946)).toBeLessThanOrEqual(5.5e-4);
    await page.getByRole('textbox', { name: 'Temperature in formulas' }).fill('A2:A9');
    await button('Insert formula: saturation pressure').first().click();
    await alert().filter({ hasText: 'one cell, as A2' }).waitFor();
  });

  it('asks before it writes over anything', async () => {
    await openCard('water');
    await type('B3', [['mine']]);
    await select('B3');
    const insert = button('Insert formula: heat capacity: liquid');
    await insert.click();
    await alert().filter({ hasText: 'Nothing was written: Data!B3 is not empty' }).waitFor();
    expect(await steps()).toBe(0);
    await button('Use the free cell Data!C3').click();
    await page.getByRole('status').filter({ hasText: 'In Data!C3 now:' }).waitFor();
    expect(await value('B3')).toBe('mine');
    // IAPWS R6-95(2018): 4.1813 kJ/(kg K) at 25 °C and 101.325 kPa.
    expect(Math.abs(Number(await value('C3')) - 4.1813)).toBeLessThanOrEqual(5.5e-5);
    await insert.click();
    await button('Write over Data!B3').click();
    await page.getByRole('status').filter({ hasText: 'In Data!B3 now:' }).waitFor();
    expect(await formula('B3')).toBe('=LATENTRY.HEATCAP("water","liquid",25,,,Latentry_units)');
  });

  it('says so where no cell is selected, and inserts constants', async () => {
    await openCard('water');
    await button('Insert formula: constant: molar mass').click();
    await alert().filter({ hasText: 'nothing is selected' }).waitFor();
    await select('A1');
    await button('Insert formula: constant: molar mass').click();
    await page.getByRole('status').filter({ hasText: 'In Data!A1 now:' }).waitFor();
    // IAPWS R6-95(2018): 18.015268 g/mol; one rounding from kg/mol.
    expect(Math.abs(Number(await value('A1')) - 18.015268)).toBeLessThanOrEqual(4e-15);
  });
});

describe('a substance of the workbook’s own', () => {
  const input = (label: string) => page.getByLabel(label, { exact: true });
  const fill = async (texts: Readonly<Record<string, string>>): Promise<void> => {
    for (const [label, text] of Object.entries(texts)) await input(label).fill(text);
  };
  const add = () => button('Add to the Substances sheet');

  it('is checked, written as rows, listed with a badge, and works in formulas that follow its rows', async () => {
    await openSection();
    await page.getByText('Add a substance of your own').click();
    await fill({ Name: 'kelp extract', Property: 'liquid heat capacty', Coefficients: '3.6' });
    await add().click();
    await page.getByText('Perhaps liquid heat capacity?').waitFor();
    await expect.poll(() => input('Property').evaluate((e) => e === document.activeElement)).toBe(true);
    expect(await steps()).toBe(0);
    await fill({ Property: 'liquid heat capacity', Unit: 'kJ/(kg K)', 'Valid from': '0', 'Valid to': '90' });
    await fill({ Source: 'our own log' });
    await add().click();
    await page.getByText('Written to Substances!A5:I5').waitFor();
    await fill({ Property: 'melting temperature', Coefficients: '-3', Unit: 'degC' });
    await add().click();
    await page.getByText('Written to Substances!A6:I6').waitFor();
    await button('Show kelp extract').click();
    await page.getByRole('article', { name: 'kelp extract' }).waitFor();
    await select('B2');
    await button('Insert formula: heat capacity: liquid').click();
    await page.getByRole('status').filter({ hasText: 'In Data!B2 now:' }).waitFor();
    expect(await formula('B2')).toBe(
      '=LATENTRY.HEATCAP("kelp extract","liquid",25,,,Latentry_units,Latentry_substances)',
    );
    // 3.6 as typed, through J/(kg K) and back: two roundings.
    expect(Math.abs(Number(await value('B2')) - 3.6)).toBeLessThanOrEqual(2e-15);
    await field().fill('kelp');
    expect(await listed().getByRole('option').first().innerText()).toMatch(/kelp extract[\s\S]*house/);
  });

  it('shows rows that can’t be read with their message', async () => {
    await page.evaluate(() => paneTest.host.book.addSheet('Substances'));
    await type(
      'A1:I2',
      [
        ['Substance', 'Property', 'Form', 'Coefficients', 'Unit', 'Valid from', 'Valid to', 'Source', 'Revision'],
        ['brine', 'liquid heat capacity', 'constant', 3.1, 'kJ/kg', 0, 50, 'our own log', 1],
      ],
      'Substances',
    );
    await page.evaluate(() => {
      paneTest.host.book.names.set('latentry_substances', {
        name: 'Latentry_substances',
        ref: { sheet: 'Substances', address: 'A1:I2' },
      });
    });
    await openSection();
    await page.getByText(/^Substances row 2 \(brine, liquid heat capacity\), unit: allowed/).waitFor();
  });
});

describe('the section for everyone', () => {
  it.each([
    ['light', {}],
    ['dark', { colorScheme: 'dark' as const }],
    ['contrast', { forcedColors: 'active' as const }],
  ])('has nothing for axe-core to find at 320 px, %s', async (_, options) => {
    await page.context().close();
    page = await browser.open(options);
    await openSection();
    await field().fill('wat');
    await field().press('ArrowDown');
    expect(await ownFaults(page)).toEqual([]);
    await field().press('Enter');
    await page.getByRole('img', { name: /^Enthalpy of/ }).waitFor();
    for (const details of await page.locator('details').all()) await details.locator('summary').click();
    await button('Insert formula: constant: molar mass').click();
    await alert().first().waitFor();
    expect(await ownFaults(page)).toEqual([]);
    expect(await page.evaluate(() => document.documentElement.scrollWidth)).toBe(320);
    expect(browser.foreign).toEqual([]);
  });
});
