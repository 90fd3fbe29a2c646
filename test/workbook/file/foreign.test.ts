import { unzipSync } from 'fflate';
import { describe, expect, it } from 'vitest';
import type { Book, BookCell } from '../../../workbook/book';
import { emptySheet } from '../../../workbook/emptySheet';
import { type XlsxFile, readXlsx } from '../../../workbook/file/readXlsx';
import { writeXlsx } from '../../../workbook/file/writeXlsx';
import { foreignParts, worksheet, zipOf } from './packages';

const SHEET = worksheet(
  '<sheetPr><tabColor rgb="FF00FF00"/></sheetPr><dimension ref="A1:C5"/><sheetViews><sheetView tabSelected="1" workbookViewId="0"/></sheetViews>' +
    '<cols><col min="1" max="3" width="11" style="2" customWidth="1"/></cols>' +
    '<sheetData><row r="1" spans="1:3" x14ac:dyDescent="0.3" xmlns:x14ac="urn:x"><c r="A1" t="s"><v>1</v></c><c r="B1" s="2"><f>A2*2</f><v>84</v></c></row>\r\n' +
    '<row r="2"><c r="A2" s="1"><v>42</v></c><c r="B2"><f t="shared" ref="B2:B4" si="0">A2+$A$2</f><v>84</v></c><c r="C2" t="b"><v>1</v></c></row>' +
    '<row r="3"><c r="A3" t="e"><v>#DIV/0!</v></c><c r="B3"><f t="shared" si="0"/><v>42</v></c></row>' +
    '<row><c><v>7</v></c><c><f t="shared" si="0"/><v>49</v></c></row>' +
    '<row r="5"><c r="A5" t="str"><f>"a"&amp;"b"</f><v>ab</v></c></row></sheetData>' +
    '<conditionalFormatting sqref="A1"><cfRule type="expression" dxfId="0" priority="1"><formula>A1&gt;1</formula></cfRule></conditionalFormatting>' +
    '<dataValidations count="2"><dataValidation type="whole" sqref="C1"><formula1>1</formula1></dataValidation>' +
    '<dataValidation type="list" sqref="D1" showErrorMessage="1"><formula1>"a,b"</formula1></dataValidation></dataValidations>' +
    '<drawing r:id="rId1"/><legacyDrawing r:id="rId2"/><extLst><ext uri="{x}"><c r="A1"><v>99</v></c></ext></extLst>',
);

const MORE = {
  'xl/charts/chart1.xml': '<c:chartSpace xmlns:c="urn:c"><!-- a chart --></c:chartSpace>',
  'xl/drawings/drawing1.xml': '<wsDr/>',
  'xl/comments1.xml': '<comments/>',
  'xl/worksheets/_rels/sheet1.xml.rels':
    '<Relationships xmlns="http://schemas.openxmlformats.org/package/2006/relationships"><Relationship Id="rId1" Type="x/drawing" Target="../drawings/drawing1.xml"/></Relationships>',
  'xl/webextensions/taskpanes.xml': '<wetp:taskpanes xmlns:wetp="urn:w"/>',
};

const open = () => readXlsx(zipOf(foreignParts(SHEET, MORE)));

const withCells = (file: XlsxFile, cells: Record<string, BookCell | undefined>): Book => {
  const [first, ...rest] = file.book.sheets;
  const merged = Object.entries({ ...first!.cells, ...cells }).filter(([, cell]) => cell !== undefined);
  return {
    ...file.book,
    sheets: [{ ...first!, cells: Object.fromEntries(merged) as Record<string, BookCell> }, ...rest],
  };
};

const sheetText = (bytes: Uint8Array, part = 'xl/worksheets/sheet1.xml') =>
  new TextDecoder().decode(unzipSync(bytes)[part]);

describe('a workbook that another program wrote', () => {
  it('is read: texts, rich text, shared formulas, cells without address, errors, formats', async () => {
    const { book } = await open();
    const sheet = book.sheets[0]!;
    expect(sheet.name).toBe('Plant');
    expect(sheet.cells).toEqual({
      A1: { value: 'kelp extract' },
      B1: { value: 84, formula: '=A2*2', style: 'x2' },
      A2: { value: 42, format: 'mm-dd-yy' },
      B2: { value: 84, formula: '=A2+$A$2' },
      C2: { value: true },
      A3: { value: { error: '#DIV/0!' } },
      B3: { value: 42, formula: '=A3+$A$2' },
      A4: { value: 7 },
      B4: { value: 49, formula: '=A4+$A$2' },
      A5: { value: 'ab', formula: '="a"&"b"' },
    });
    expect(book.styles).toEqual({ x2: { bold: true, format: '0.0" °C"' } });
    expect(sheet.columnWidths).toEqual({ A: 11, B: 11, C: 11 });
    expect(sheet.lists).toEqual([{ range: 'D1', values: ['a', 'b'] }]);
    expect(book.names).toEqual([{ name: 'Area', formula: 'Plant!$A$1:$A$3' }]);
  });

  it('is saved byte for byte when nothing changed', async () => {
    const file = await open();
    const saved = unzipSync(writeXlsx(file.book, file));
    const before = unzipSync(zipOf(foreignParts(SHEET, MORE)));
    expect(Object.keys(saved)).toEqual(Object.keys(before));
    for (const [name, bytes] of Object.entries(before)) expect(saved[name], name).toEqual(bytes);
  });

  it('keeps every part and every other byte of the sheet when one value changes', async () => {
    const file = await open();
    const saved = writeXlsx(withCells(file, { C2: { value: false } }), file);
    const parts = unzipSync(saved);
    for (const [name, bytes] of Object.entries(unzipSync(zipOf(foreignParts(SHEET, MORE))))) {
      if (name !== 'xl/worksheets/sheet1.xml') expect(parts[name], name).toEqual(bytes);
    }
    expect(sheetText(saved)).toBe(SHEET.replace('<c r="C2" t="b"><v>1</v></c>', '<c r="C2" t="b"><v>0</v></c>'));
  });

  it('takes new cells between, before and after the rows that are there', async () => {
    const file = await open();
    const book = withCells(file, {
      C1: { value: 'new' },
      A2: undefined,
      D4: { value: 1.5 },
      B5: { value: 2, formula: '=1+1' },
      A9: { value: 9 },
      AA2: { value: 'far' },
    });
    const read = (await readXlsx(writeXlsx(book, file))).book;
    expect(read).toEqual(book);
  });

  it('gives each cell of a shared formula its own when the first of them changes', async () => {
    const file = await open();
    const book = withCells(file, { B2: { value: 1 } });
    const saved = writeXlsx(book, file);
    expect((await readXlsx(saved)).book).toEqual(book);
    expect(sheetText(saved)).not.toContain('t="shared"');
  });

  it('forgets the order of calculation when formulas change, and keeps it when only values do', async () => {
    const file = await open();
    const changed = unzipSync(writeXlsx(withCells(file, { B1: { value: 1 } }), file));
    expect(Object.keys(changed)).not.toContain('xl/calcChain.xml');
    expect(new TextDecoder().decode(changed['[Content_Types].xml'])).not.toContain('calcChain');
    expect(new TextDecoder().decode(changed['xl/_rels/workbook.xml.rels'])).not.toContain('calcChain');
    expect(Object.keys(unzipSync(writeXlsx(withCells(file, { A4: { value: 8 } }), file)))).toContain(
      'xl/calcChain.xml',
    );
  });

  it('takes one of our functions with its metadata, and looks beside its own', async () => {
    const file = await open();
    const styles = { ...file.book.styles, input: { fill: 'FFF5E0' } };
    const book: Book = {
      ...withCells(file, {
        E1: {
          value: 1,
          formula: '=LATENTRY.LATENT("water","fusion",A1:A2)',
          spill: 'E1:E2',
          style: 'input',
          format: '0.00',
        },
        E2: { value: 2, style: 'x2', format: '0.000' },
      }),
      styles,
    };
    const saved = writeXlsx(book, file);
    const read = (await readXlsx(saved)).book;
    expect(read.sheets[0]!.cells['E1']).toEqual(book.sheets[0]!.cells['E1']);
    // The clone of a look of the file is a look of its own in the file: bold with another number format.
    expect(read.styles[read.sheets[0]!.cells['E2']!.style!]).toEqual({ bold: true, format: '0.000' });
    expect(sheetText(saved, 'xl/styles.xml')).toContain('<xf numFmtId="170" fontId="1" quotePrefix="1"/>');
    expect(sheetText(saved, 'xl/metadata.xml')).toContain('XLDAPR');
  });

  it('gets and loses sheets, names and widths, and keeps what is said about the others', async () => {
    const file = await open();
    const plant = file.book.sheets[0]!;
    const book: Book = {
      ...file.book,
      sheets: [
        { ...emptySheet('Kelp & ethanol'), cells: { A1: { value: 1 } }, hidden: true },
        {
          ...plant,
          name: 'Pilot plant',
          columnWidths: { ...plant.columnWidths, B: 30 },
          merges: ['A1:B1'],
          freeze: { rows: 1, columns: 0 },
        },
      ],
      names: [
        { name: 'Area', formula: "'Pilot plant'!$A$1:$A$3" },
        { name: 'Latentry_units', formula: "'Kelp & ethanol'!$A$1", sheet: 'Kelp & ethanol' },
      ],
      properties: { stamp: '1' },
    };
    const saved = writeXlsx(book, file);
    const { book: read, parts } = await readXlsx(saved);
    expect({ ...read, sheets: read.sheets.map((sheet) => ({ ...sheet, id: undefined })) }).toEqual({
      ...book,
      sheets: book.sheets.map((sheet) => ({ ...sheet, id: undefined })),
    });
    const xml = sheetText(saved);
    expect(xml).toContain('<tabColor rgb="FF00FF00"/>');
    expect(xml).toContain('<conditionalFormatting sqref="A1">');
    expect(xml).toContain('<col min="2" max="2" style="2" width="30" customWidth="1"/>');
    expect(xml.indexOf('<mergeCells')).toBeLessThan(xml.indexOf('<conditionalFormatting'));
    expect(sheetText(saved, 'xl/workbook.xml')).toContain('comment="kept"');
    const without = writeXlsx({ ...read, sheets: [read.sheets[1]!], names: [] }, { book: read, parts });
    expect(Object.keys(unzipSync(without))).not.toContain('xl/worksheets/sheet2.xml');
    expect((await readXlsx(without)).book.sheets.map(({ name }) => name)).toEqual(['Pilot plant']);
  });

  it('keeps rules of other kinds when a list is added', async () => {
    const file = await open();
    const [sheet] = file.book.sheets;
    const lists = [...sheet!.lists, { range: 'E1', values: ['kPa', 'bar'], open: true }];
    const saved = writeXlsx({ ...file.book, sheets: [{ ...sheet!, lists }] }, file);
    expect(sheetText(saved)).toContain(
      '<dataValidation type="whole" sqref="C1"><formula1>1</formula1></dataValidation>',
    );
    expect((await readXlsx(saved)).book.sheets[0]!.lists).toEqual(lists);
  });

  it('is patched with its own prefix where it puts one on every element', async () => {
    const sheet = worksheet('<x:sheetData><x:row r="1"><x:c r="A1"><x:v>1</x:v></x:c></x:row></x:sheetData>', 'x:');
    const file = await readXlsx(zipOf(foreignParts(sheet)));
    const book = withCells(file, { A1: { value: 'a < b' }, A2: { value: true } });
    const saved = writeXlsx(book, file);
    expect((await readXlsx(saved)).book).toEqual(book);
    expect(sheetText(saved)).toContain('<x:is><x:t xml:space="preserve">a &lt; b</x:t></x:is>');
    expect(sheetText(saved)).toContain('<x:row r="2">');
  });

  it('keeps metadata of other kinds when the first spill comes', async () => {
    const main = 'http://schemas.openxmlformats.org/spreadsheetml/2006/main';
    const rel = 'http://schemas.openxmlformats.org/officeDocument/2006/relationships';
    const parts = foreignParts(SHEET, {
      'xl/metadata.xml': `<metadata xmlns="${main}"><metadataTypes count="1"><metadataType name="XLRICHVALUE"/></metadataTypes><futureMetadata name="XLRICHVALUE" count="1"><bk/></futureMetadata><valueMetadata count="1"><bk><rc t="1" v="0"/></bk></valueMetadata></metadata>`,
    });
    const rels = parts['xl/_rels/workbook.xml.rels']!;
    parts['xl/_rels/workbook.xml.rels'] = rels.replace(
      '</Relationships>',
      `<Relationship Id="rId5" Type="${rel}/sheetMetadata" Target="metadata.xml"/></Relationships>`,
    );
    const file = await readXlsx(zipOf(parts));
    const book = withCells(file, { F1: { value: 1, formula: '=SEQUENCE(2)', spill: 'F1:F2' }, F2: { value: 2 } });
    const saved = writeXlsx(book, file);
    expect((await readXlsx(saved)).book).toEqual(book);
    expect(sheetText(saved, 'xl/metadata.xml')).toMatch(
      /<metadataTypes count="2">.*XLRICHVALUE.*XLDAPR.*<\/metadataTypes><futureMetadata name="XLRICHVALUE".*<futureMetadata name="XLDAPR".*<cellMetadata count="1"><bk><rc t="2" v="0"\/><\/bk><\/cellMetadata><valueMetadata/s,
    );
  });
});
