import fc from 'fast-check';
import { unzipSync } from 'fflate';
import { describe, expect, it } from 'vitest';
import type { CellErrorCode } from '../../../taskpane/port';
import type { Book, BookCell, BookSheet } from '../../../workbook/book';
import { emptySheet } from '../../../workbook/emptySheet';
import { readXlsx } from '../../../workbook/file/readXlsx';
import { writeXlsx } from '../../../workbook/file/writeXlsx';

const textOf = (bytes: Uint8Array, part: string) => new TextDecoder().decode(unzipSync(bytes)[part]);

const sheet = (name: string, cells: Record<string, BookCell>, rest: Partial<BookSheet> = {}): BookSheet => ({
  ...emptySheet(name),
  ...rest,
  cells,
});

const bookOf = (sheets: BookSheet[], rest: Partial<Book> = {}): Book => ({
  sheets,
  names: [],
  styles: {},
  properties: {},
  ...rest,
});

/** The part that a sheet stands in is the file's business, not the book's. */
const withoutIds = (book: Book): Book => ({ ...book, sheets: book.sheets.map(({ id: _id, ...rest }) => rest) });

const again = async (book: Book) => withoutIds((await readXlsx(writeXlsx(book))).book);

const styles: Book['styles'] = {
  title: { bold: true, size: 20, color: '17463F' },
  input: { fill: 'FFF3DC', box: 'D9B98A', color: '5A3A0A' },
  answer: { format: '0.00', align: 'right', valign: 'top' },
  note: { italic: true, wrap: true, color: '5C6B70', under: 'C9D3D1' },
};

const full = bookOf(
  [
    sheet(
      'Evaporator',
      {
        A1: { value: 'Kelp extract, first effect', style: 'title' },
        A3: { value: 40, style: 'input' },
        A4: { value: 60, style: 'input', format: '0.0' },
        B3: {
          value: 2406.0,
          formula: '=LATENTRY.LATENT("water","vaporization",A3:A4,Latentry_units)',
          spill: 'B3:B4',
          style: 'answer',
        },
        B4: { value: 2357.65, style: 'answer', format: '0.0' },
        C3: { value: 'Heat, kJ/kg', formula: '="Heat, "&INDEX(Latentry_units,4,2)' },
        C4: { value: 2357.65, formula: '=LATENTRY.LATENT("water","vaporization",A4)' },
        D3: { value: true, formula: '=A3<A4' },
        D4: { value: { error: '#DIV/0!' }, formula: '=1/0' },
        E3: { value: '=not a formula' },
        E4: { value: { error: '#N/A' } },
        F3: { value: 3, formula: '=SUM(A3:A4*B3:B4)', array: 'F3' },
        F4: { value: 45992.5, format: 'yyyy-mm-dd' },
      },
      {
        columnWidths: { A: 24, B: 12.5, D: 9 },
        rowHeights: { '1': 32 },
        merges: ['A1:C1'],
        lists: [
          { range: 'A3', values: ['40', '60'], prompt: 'A temperature of the "first" effect' },
          { range: 'A4', values: ['degC', 'K'], source: 'Lists!$A$1:$A$2' },
        ],
        freeze: { rows: 2, columns: 1 },
        gridLines: false,
        print: { landscape: true, fitWidth: true },
      },
    ),
    sheet('Lists', { A1: { value: 'degC' }, A2: { value: 'K' } }, { hidden: true }),
  ],
  {
    styles,
    names: [
      { name: 'Latentry_units', formula: 'Units!$A$4:$B$14' },
      { name: 'own', formula: 'Lists!$A$1', sheet: 'Lists', hidden: true },
    ],
    properties: { 'Latentry stamp': 'a<b & "c"' },
  },
);

describe('a book written and read again', () => {
  it('is the same book', async () => {
    expect(await again(full)).toEqual(full);
  });

  it('is the same after a second saving through its own file', async () => {
    const first = await readXlsx(writeXlsx(full));
    const second = await readXlsx(writeXlsx(first.book, first));
    expect(second.book).toEqual(first.book);
  });

  it('gives the same bytes each time', () => {
    expect(writeXlsx(full)).toEqual(writeXlsx(full));
  });

  it('survives JSON on the way', async () => {
    expect(await again(JSON.parse(JSON.stringify(full)) as Book)).toEqual(full);
  });
});

describe('formulas in the file', () => {
  const xml = textOf(writeXlsx(full), 'xl/worksheets/sheet1.xml');

  it('store a spill as a dynamic array with its range, its mark and the values of all its cells', () => {
    expect(xml).toMatch(
      /<c r="B3" s="\d+" cm="1"><f t="array" ref="B3:B4">_xldudf_LATENTRY_LATENT\(&quot;water&quot;,&quot;vaporization&quot;,A3:A4,Latentry_units\)<\/f><v>2406<\/v><\/c>/,
    );
    expect(xml).toMatch(/<c r="B4" s="\d+"><v>2357.65<\/v><\/c>/);
  });

  it('store one of our functions over one cell in the same way, so that no @ is put before it', () => {
    expect(xml).toContain('cm="1"><f t="array" ref="C4">_xldudf_LATENTRY_LATENT(');
  });

  it('leave plain formulas plain', () => {
    expect(xml).toContain('<c r="D3" t="b"><f>A3&lt;A4</f><v>1</v></c>');
  });

  it('carry the metadata that makes cm="1" a dynamic array', () => {
    const files = unzipSync(writeXlsx(full));
    const metadata = new TextDecoder().decode(files['xl/metadata.xml']);
    expect(metadata).toContain('<metadataType name="XLDAPR"');
    expect(metadata).toContain('fDynamic="1"');
    expect(metadata).toContain('<cellMetadata count="1"><bk><rc t="1" v="0"/></bk></cellMetadata>');
    expect(textOf(writeXlsx(full), '[Content_Types].xml')).toContain('sheetMetadata+xml');
    expect(textOf(writeXlsx(full), 'xl/_rels/workbook.xml.rels')).toContain('relationships/sheetMetadata"');
  });

  it('need no metadata where nothing spills', () => {
    const plain = unzipSync(writeXlsx(bookOf([sheet('A', { A1: { value: 2, formula: '=1+1' } })])));
    expect(Object.keys(plain)).not.toContain('xl/metadata.xml');
  });
});

describe('what the format stores in another way', () => {
  it('keeps newer errors as #VALUE!, without their words', async () => {
    const read = await again(bookOf([sheet('A', { A1: { value: { error: '#SPILL!', message: 'in the way' } } })]));
    expect(read.sheets[0]?.cells['A1']).toEqual({ value: { error: '#VALUE!' } });
  });

  it('writes a cell style by name, and a format of its own beside it', () => {
    const xml = textOf(writeXlsx(full), 'xl/styles.xml');
    expect(xml).toContain('name="Latentry input"');
    expect(xml).toContain('formatCode="yyyy-mm-dd"');
  });

  it('names no person in the file', () => {
    for (const part of Object.values(unzipSync(writeXlsx(full)))) {
      expect(new TextDecoder().decode(part)).not.toMatch(/creator|lastModifiedBy|Manager|Company/);
    }
  });
});

const errors: CellErrorCode[] = ['#VALUE!', '#N/A', '#REF!', '#NAME?', '#NUM!', '#DIV/0!', '#NULL!'];
const value = fc.oneof(
  fc.double({ noNaN: true, noDefaultInfinity: true }).map((x) => (Object.is(x, -0) ? 0 : x)),
  fc.string({ unit: 'grapheme' }).map((text) => text.normalize('NFC')),
  fc.string({ unit: 'binary' }),
  fc.boolean(),
  fc.constantFrom(...errors).map((error) => ({ error })),
  fc.constantFrom('=1+1', '_x0041_', ' both ends ', 'line\r\nbreak', ']]>', '<v>', '\u0000', '_x000D_'),
);
const formula = fc.constantFrom(
  '=A1+1',
  '="LATENTRY.LATENT("&"x"',
  '=LATENTRY.SATPRESSURE("water",A1:A3,Latentry_units)',
  '=FILTER(A1:A3,A1:A3>0)',
  '=\'My sheet\'!A1&"<&>"',
);
const cell = fc
  .record({
    value,
    formula: fc.option(formula, { nil: undefined }),
    style: fc.option(fc.constantFrom('title', 'input', 'answer', 'note'), { nil: undefined }),
    format: fc.option(fc.constantFrom('0.000', '#,##0', '0.0"°"'), { nil: undefined }),
  })
  .map((raw) => JSON.parse(JSON.stringify(raw)) as BookCell);
const address = fc
  .tuple(fc.constantFrom('A', 'B', 'C', 'Z', 'AA', 'XFD'), fc.integer({ min: 1, max: 1_048_576 }))
  .map(([letters, row]) => `${letters}${row}`);
const cells = fc.dictionary(address, cell, { maxKeys: 12 });
describe('any book', () => {
  it('comes back as it went', async () => {
    await fc.assert(
      fc.asyncProperty(fc.array(cells, { minLength: 1, maxLength: 3 }), async (all) => {
        const sheets = all.map((each, i) => sheet(`Sheet ${i}`, each));
        const book = bookOf(sheets, { styles });
        expect(await again(book)).toEqual(book);
      }),
      { seed: 20_250_701, numRuns: 60 },
    );
  });

  it('comes back as it was changed, when cut into the file of another', async () => {
    await fc.assert(
      fc.asyncProperty(cells, cells, async (first, second) => {
        const original = await readXlsx(writeXlsx(bookOf([sheet('Duty', first)], { styles })));
        const kept = original.book.sheets[0] ?? emptySheet('Duty');
        const changed = bookOf([{ ...kept, cells: second }], { styles });
        const read = (await readXlsx(writeXlsx(changed, original))).book;
        expect(read).toEqual(changed);
      }),
      { seed: 20_250_702, numRuns: 60 },
    );
  });
});
