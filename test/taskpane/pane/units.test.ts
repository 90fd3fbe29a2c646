import { describe, expect, it } from 'vitest';
import { SETTINGS } from '../../../functions/settings/schema';
import { DEFAULT_SETTINGS, parseSettingsText, settingsRows } from '../../../functions/settings/settings';
import { checkDraft, draftOf, textsOf } from '../../../taskpane/pane/units/draft';
import { previewText } from '../../../taskpane/pane/units/previewText';
import { readCells } from '../../../taskpane/pane/readCells';
import type { Block, Cell } from '../../../taskpane/port';
import { memoryHost } from '../memoryHost';

const block = (values: Cell[][]): Block => ({
  ref: { sheet: 'Units', address: `A1:B${values.length}` },
  values,
  formulas: values.map((row) => row.map(() => '')),
});

describe('the draft of the settings', () => {
  it('is the defaults where a workbook has no block', () => {
    expect(textsOf(draftOf(null))).toEqual(settingsRows(DEFAULT_SETTINGS));
    expect(checkDraft(draftOf(null))).toEqual({ settings: DEFAULT_SETTINGS, errors: {} });
  });

  it('keeps the spelling of the sheet, good or bad', () => {
    const draft = draftOf(
      block([
        ['Heat', 'kJ kg⁻¹'],
        ['Flow', 'buckets'],
        ['Barometer', '1 atm'],
      ]),
    );
    expect([draft['heat'], draft['flow'], draft['barometer'], draft['power']]).toEqual([
      'kJ kg⁻¹',
      'buckets',
      '1 atm',
      'kW',
    ]);
    const { settings, errors } = checkDraft(draft);
    expect(settings).toBeUndefined();
    expect(Object.keys(errors)).toEqual(['flow']);
    expect(errors['flow']).toMatch(/^Allowed: .+\. Received: "buckets"/);
  });

  it('reads the barometer with the decimal separator of the same form', () => {
    const draft = { ...draftOf(null), decimal: ',', barometer: '98,5 kPa' };
    expect(checkDraft(draft).settings?.barometerPa).toBe(98_500);
    expect(checkDraft({ ...draft, decimal: '.' }).errors['barometer']).toBeDefined();
  });

  it('has one field for every setting', () => {
    expect(Object.keys(draftOf(null))).toEqual(SETTINGS.map(({ key }) => key));
  });
});

describe('the example line', () => {
  it.each([
    // IAPWS R6-95(2018) at 333.15 K, to the digits shown; IAPWS SR1-86(1992): 2357.7 kJ/kg, 19.946 kPa.
    ['', 'Water at 60 °C: latent heat 2357.65 kJ/kg, saturation pressure 19.9464 kPa'],
    [
      'temperature=degF; heat=J/g; pressure=mbar',
      'Water at 140 °F: latent heat 2357.65 J/g, saturation pressure 199.464 mbar',
    ],
    [
      'decimal=,; pressure=kPa gauge; barometer=100 kPa',
      'Water at 60 °C: latent heat 2357,65 kJ/kg, saturation pressure −80,0536 kPa gauge',
    ],
  ])('follows %j', (text, line) => {
    expect(previewText(parseSettingsText(text, DEFAULT_SETTINGS))).toBe(line);
  });
});

describe('readCells', () => {
  it('reads small ranges in one crossing', async () => {
    const host = memoryHost();
    host.type({ sheet: 'Data', address: 'A1:B2' }, [
      [1, 2],
      [3, 4],
    ]);
    const refs = [
      { sheet: 'Data', address: 'A1:A2' },
      { sheet: 'Data', address: 'B1:B2' },
    ];
    const blocks = await readCells(host, refs, { signal: new AbortController().signal, progress: () => undefined });
    expect(blocks.map(({ values }) => values)).toEqual([
      [[1], [3]],
      [[2], [4]],
    ]);
    expect(host.crossings).toBe(1);
  });

  it('joins the pieces of a large range and tells how far it is', async () => {
    const host = memoryHost();
    host.book.addSheet('Data');
    host.type({ sheet: 'Data', address: 'A50000' }, [[7]]);
    const shares: number[] = [];
    const reading = { signal: new AbortController().signal, progress: (share: number) => shares.push(share) };
    const [read] = await readCells(host, [{ sheet: 'Data', address: 'A1:B50000' }], reading);
    expect(read?.values).toHaveLength(50_000);
    expect(read?.values.at(-1)).toEqual([7, null]);
    expect(shares.at(-1)).toBe(1);
    expect(shares).toEqual([...shares].sort((a, b) => a - b));
    expect(host.crossings).toBe(3);
  });

  it('stops between pieces when told to', async () => {
    const host = memoryHost();
    host.book.addSheet('Data');
    const control = new AbortController();
    const reading = { signal: control.signal, progress: () => control.abort() };
    await expect(readCells(host, [{ sheet: 'Data', address: 'A1:B50000' }], reading)).rejects.toThrow(DOMException);
    expect(host.crossings).toBe(1);
  });
});
