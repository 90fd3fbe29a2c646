import fc from 'fast-check';
import { strToU8, unzipSync, zipSync } from 'fflate';
import { describe, expect, it } from 'vitest';
import { Problem } from '../../../core/problem';
import { emptySheet } from '../../../workbook/emptySheet';
import { crc32 } from '../../../workbook/file/crc32';
import { DEFAULT_LIMITS, type FileLimits } from '../../../workbook/file/limits';
import { readXlsx } from '../../../workbook/file/readXlsx';
import { writeXlsx } from '../../../workbook/file/writeXlsx';
import { foreignParts, worksheet, zipOf } from './packages';

const EMPTY = worksheet('<sheetData/>');
const small: FileLimits = {
  ...DEFAULT_LIMITS,
  partBytes: 1 << 20,
  totalBytes: 3 << 20,
  ratioFromBytes: 1 << 16,
  parts: 50,
  cells: 1000,
  formulaCharacters: 10_000,
};

/** One message grammar: where, what is allowed, what was received. */
async function refusal(bytes: Uint8Array, limits: FileLimits = small): Promise<string> {
  const error: unknown = await readXlsx(bytes, limits).then(
    () => 'read without complaint',
    (reason: unknown) => reason,
  );
  expect(error).toBeInstanceOf(Problem);
  const { message } = error as Problem;
  expect(message).toMatch(/^file[^:]*: allowed .+; received .+$/s);
  return message;
}

const changed = (name: string, change: (text: string) => string) => {
  const parts = foreignParts(EMPTY);
  return zipOf({ ...parts, [name]: change(parts[name] ?? '') });
};

describe('a file is refused with words', () => {
  it('when it is empty or no package', async () => {
    expect(await refusal(new Uint8Array())).toContain('an empty file');
    expect(await refusal(strToU8('temperature;heat\n60;2357.65\n'))).toContain('a file that is not a zip package');
  });

  it('when it is encrypted, or of the older binary format', async () => {
    expect(await refusal(new Uint8Array([0xd0, 0xcf, 0x11, 0xe0, 0xa1, 0xb1, 0x1a, 0xe1, 0, 0]))).toContain(
      'an encrypted workbook',
    );
    const bytes = zipOf(foreignParts(EMPTY));
    const view = new DataView(bytes.buffer, bytes.byteOffset);
    for (let at = 0; at + 4 < bytes.length; at++)
      if (view.getUint32(at, true) === 0x02014b50) view.setUint16(at + 8, 1, true);
    expect(await refusal(bytes)).toContain('an encrypted package');
  });

  it('when it holds macros', async () => {
    expect(await refusal(zipOf({ ...foreignParts(EMPTY), 'xl/vbaProject.bin': 'x' }))).toContain('macros');
    const type = 'application/vnd.ms-excel.sheet.macroEnabled.main+xml';
    const bytes = changed('[Content_Types].xml', (text) => text.replace(/application\/vnd[^"]*sheet\.main\+xml/, type));
    expect(await refusal(bytes)).toContain('macros');
  });

  it('when it is cut short anywhere', async () => {
    const whole = writeXlsx({
      sheets: [{ ...emptySheet('A'), cells: { A1: { value: 1 } } }],
      names: [],
      styles: {},
      properties: {},
    });
    await fc.assert(
      fc.asyncProperty(fc.integer({ min: 4, max: whole.length - 1 }), async (length) => {
        expect(await refusal(whole.slice(0, length))).toMatch(/cut short|damaged/);
      }),
      { seed: 20_250_705, numRuns: 40 },
    );
  });

  it('when bytes inside a part are damaged', async () => {
    const bytes = zipSync(
      {
        ...unzipSync(
          zipOf(foreignParts(worksheet(`<sheetData><row r="1"><c r="A1"><v>123</v></c></row></sheetData>`))),
        ),
      },
      { level: 0 },
    );
    const text = new TextDecoder('latin1').decode(bytes);
    bytes[text.indexOf('<v>123') + 3] = 0x39;
    expect(await refusal(bytes)).toContain('damaged part');
  });

  it('when it is a zip file or document of another kind', async () => {
    expect(await refusal(zipOf({ 'readme.txt': 'hello' }))).toContain('a zip file of another kind');
    expect(await refusal(changed('_rels/.rels', (text) => text.replace('officeDocument"', 'other"')))).toContain(
      'without a workbook part',
    );
    expect(await refusal(changed('_rels/.rels', (text) => text.replace('/xl/workbook.xml', '/xl/gone.xml')))).toContain(
      'without a workbook part',
    );
    expect(
      await refusal(changed('[Content_Types].xml', (text) => text.replace('sheet.main+xml', 'document.main+xml'))),
    ).toContain('another kind');
  });

  it('when a sheet is missing', async () => {
    const rest = Object.entries(foreignParts(EMPTY)).filter(([name]) => name !== 'xl/worksheets/sheet1.xml');
    expect(await refusal(zipOf(Object.fromEntries(rest)))).toContain('a missing sheet');
  });

  it('when XML declares entities, or does not nest', async () => {
    const bomb = `<!DOCTYPE w [<!ENTITY a "aaaaaaaaaa"><!ENTITY b "&a;&a;&a;">]>${EMPTY}`;
    expect(await refusal(zipOf(foreignParts(bomb)))).toContain('a document type declaration');
    expect(await refusal(zipOf(foreignParts(EMPTY.replace('</worksheet>', ''))))).toContain('XML that breaks off');
    expect(await refusal(zipOf(foreignParts(worksheet('<sheetData>&nope;</sheetData>'))))).toContain(
      'XML that breaks off',
    );
    expect(
      await refusal(zipOf(foreignParts(worksheet('<sheetData><row r="1"><c r="A0"><v>1</v></c></row></sheetData>')))),
    ).toContain('"A0"');
  });
});

describe('a file that costs too much is refused before it is unpacked', () => {
  it('by its own size', async () => {
    expect(await refusal(zipOf(foreignParts(EMPTY)), { ...small, fileBytes: 100 })).toContain('at most 100 bytes');
  });

  it('by the ratio of packing', async () => {
    const parts = { ...foreignParts(EMPTY), 'xl/media/bomb.xml': ' '.repeat(1 << 19) };
    expect(await refusal(zipOf(parts))).toContain('bomb.xml packed');
  });

  it('by one part, by all parts, by their number', async () => {
    const noise = (length: number) =>
      Array.from({ length }, (_, i) => String.fromCharCode(33 + ((i * i * 31 + (i >> 3)) % 90))).join('');
    expect(await refusal(zipOf({ ...foreignParts(EMPTY), big: noise((1 << 20) + 1) }))).toContain('bytes in big');
    const many = Object.fromEntries(Array.from({ length: 4 }, (_, i) => [`p${i}`, noise(1 << 20)]));
    expect(await refusal(zipOf({ ...foreignParts(EMPTY), ...many }))).toContain('unpacks to more');
    const crowd = Object.fromEntries(Array.from({ length: 60 }, (_, i) => [`p${i}`, 'x']));
    expect(await refusal(zipOf({ ...foreignParts(EMPTY), ...crowd }))).toContain('at most 50 parts');
  });

  it('when a part holds more than its stated size', async () => {
    const bytes = zipOf(foreignParts(worksheet(`<sheetData>${'<row r="1"/>'.repeat(200)}</sheetData>`)));
    const view = new DataView(bytes.buffer, bytes.byteOffset);
    for (let at = 0; at + 46 < bytes.length; at++) {
      if (view.getUint32(at, true) === 0x02014b50 && view.getUint32(at + 24, true) > 2000)
        view.setUint32(at + 24, 100, true);
    }
    expect(await refusal(bytes)).toMatch(/allowed 100 bytes as stated; received more/);
  });

  it('when parts share bytes', async () => {
    const bytes = zipOf(foreignParts(EMPTY));
    const view = new DataView(bytes.buffer, bytes.byteOffset);
    const central: number[] = [];
    for (let at = 0; at + 46 < bytes.length; at++) if (view.getUint32(at, true) === 0x02014b50) central.push(at);
    view.setUint32(central[1]! + 42, view.getUint32(central[0]! + 42, true), true);
    expect(await refusal(bytes)).toContain('overlap');
  });

  it('by its cells, its arrays, its shared formulas', async () => {
    const rows = Array.from({ length: 1001 }, (_, i) => `<row r="${i + 1}"><c r="A${i + 1}"><v>1</v></c></row>`).join(
      '',
    );
    expect(await refusal(zipOf(foreignParts(worksheet(`<sheetData>${rows}</sheetData>`))))).toContain('more cells');
    const array = '<row r="1"><c r="A1"><f t="array" ref="A1:XFD1048576">1</f></c></row>';
    expect(await refusal(zipOf(foreignParts(worksheet(`<sheetData>${array}</sheetData>`))))).toContain('an array over');
    const long = `A1+${'1+'.repeat(100)}1`;
    const shared = Array.from(
      { length: 99 },
      (_, i) => `<row r="${i + 2}"><c r="A${i + 2}"><f t="shared" si="0"/></c></row>`,
    ).join('');
    const sheet = worksheet(
      `<sheetData><row r="1"><c r="B1"><f t="shared" ref="B1:B100" si="0">${long}</f></c></row>${shared}</sheetData>`,
    );
    expect(await refusal(zipOf(foreignParts(sheet)))).toContain('more formula text');
  });
});

describe('the check sum', () => {
  it('of "123456789" is cbf43926 (check value of the CRC-32 of ISO 3309, common practice)', () => {
    expect(crc32(strToU8('123456789'))).toBe(0xcbf43926);
  });
});
