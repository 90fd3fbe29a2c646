import type { Book, BookSheet } from '../book';
import { emptySheet } from '../emptySheet';
import { EMPTY_SHEET, EMPTY_STYLES, baseParts } from './baseParts';
import { sameCell } from './cellXml';
import { packageEdits } from './packageEdits';
import { patchSheet } from './patchSheet';
import { type SheetEntry, patchWorkbook, workbookFace } from './patchWorkbook';
import { readStyles } from './readStyles';
import type { XlsxFile } from './readXlsx';
import { type Relation, readRelations } from './relations';
import { spillMark } from './spillMark';
import { styleTable } from './styleTable';
import { themeColors } from './themeColors';
import { writeProperties } from './writeProperties';
import { xmlTree } from './xmlTree';

const NOTHING: Book = { sheets: [], names: [], styles: {}, properties: {} };

/**
 * Writes a book as an .xlsx file. A book that came from a file is cut into that file: parts that the book doesn't know
 * or that didn't change keep their bytes. Formulas are stored as Excel stores them, with the values they last had.
 *
 * @param book - the book
 * @param original - the file that it came from, as `readXlsx` gave it; without it a new package is made
 * @returns the file; the same book and original give the same bytes
 * @see ECMA-376 part 1 (SpreadsheetML), MS-XLSX 2.4 (dynamic arrays)
 */
export function writeXlsx(book: Book, original?: XlsxFile): Uint8Array {
  const parts = original?.parts ?? baseParts();
  const before = original?.book ?? NOTHING;
  const edits = packageEdits(parts);
  const main = readRelations(parts, '').find(({ type }) => type === 'officeDocument')?.target ?? 'xl/workbook.xml';
  const relations = readRelations(parts, main);
  const partOf = (type: string) => relations.find((relation) => relation.type === type)?.target;

  const stylesPart = partOf('styles') ?? 'xl/styles.xml';
  const stylesXml = parts.text(stylesPart) || EMPTY_STYLES;
  const themePart = partOf('theme') ?? '';
  const root = xmlTree(stylesXml, stylesPart);
  const file = readStyles(root, parts.has(themePart) ? themeColors(parts.text(themePart), themePart) : []);
  const table = styleTable(stylesXml, stylesPart, file.keys, file.styles, book.styles);
  const spill = spillMark(edits, main, partOf('sheetMetadata'));
  const writer = { style: (cell: Parameters<typeof table.index>[0]) => table.index(cell), spill };

  let formulasChanged = false;
  const entries = book.sheets.map((sheet): SheetEntry => {
    const old = sameSheet(before.sheets, sheet);
    const place = relations.find(({ target }) => target === old?.id);
    if (old === undefined || place === undefined) {
      const part = edits.freeName((n) => `xl/worksheets/sheet${n}.xml`);
      const xml = patchSheet(EMPTY_SHEET, part, emptySheet(sheet.name), sheet, writer);
      const relation = edits.add(part, xml, { type: 'worksheet', content: '.worksheet+xml' }, main);
      return { name: sheet.name, hidden: sheet.hidden, relation };
    }
    if (old !== sheet) {
      const xml = parts.text(place.target);
      const patched = patchSheet(xml, place.target, old, sheet, writer);
      if (patched !== xml) edits.set(place.target, patched);
      formulasChanged ||= formulasDiffer(old, sheet);
    }
    return { name: sheet.name, hidden: sheet.hidden, relation: place.id };
  });

  const kept = new Set(entries.map(({ relation }) => relation));
  for (const { id, target, type } of relations) {
    const gone = type === 'worksheet' && !kept.has(id) && before.sheets.some((sheet) => sheet.id === target);
    if (gone) edits.remove(target, main);
    formulasChanged ||= gone;
  }
  if (formulasChanged) for (const { target } of relations.filter(isCalcChain)) edits.remove(target, main);

  const isWorksheet = (relation: string) =>
    kept.has(relation) || relations.some(({ id, type }) => id === relation && type === 'worksheet');
  if (workbookFace(before) !== workbookFace(book)) {
    edits.set(main, patchWorkbook(edits.text(main), main, entries, isWorksheet, book.names));
  }
  const styles = table.result() ?? (partOf('styles') === undefined ? stylesXml : null);
  if (styles !== null && partOf('styles') !== undefined) edits.set(stylesPart, styles);
  else if (styles !== null) edits.add(stylesPart, styles, { type: 'styles', content: '.styles+xml' }, main);
  writeProperties(edits, before.properties, book.properties);
  return edits.bytes();
}

/** The order of calculation lists cells with formulas; once those change it is wrong, and is made anew on opening. */
const isCalcChain = ({ type }: Relation) => type === 'calcChain';

/** The sheet it was: by its part, else by its name. */
function sameSheet(sheets: readonly BookSheet[], sheet: BookSheet): BookSheet | undefined {
  return (
    sheets.find(({ id }) => id !== undefined && id === sheet.id) ??
    (sheet.id === undefined ? sheets.find(({ name }) => name === sheet.name) : undefined)
  );
}

function formulasDiffer(before: BookSheet, after: BookSheet): boolean {
  const addresses = new Set([...Object.keys(before.cells), ...Object.keys(after.cells)]);
  for (const address of addresses) {
    const [a, b] = [before.cells[address], after.cells[address]];
    if ((a?.formula !== undefined || b?.formula !== undefined) && !sameCell(a, b)) return true;
  }
  return false;
}
