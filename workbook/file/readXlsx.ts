import type { Book, BookName, BookSheet } from '../book';
import { unescapeText } from './escapeXml';
import { fileProblem } from './fileProblem';
import { fromFileFormula } from './formulaText';
import { DEFAULT_LIMITS, type FileLimits } from './limits';
import { type Parts, openParts } from './parts';
import { readMetadata } from './readMetadata';
import { readProperties } from './readProperties';
import { readSheet } from './readSheet';
import { readStrings } from './readStrings';
import { type FileStyles, readStyles } from './readStyles';
import { readRelations } from './relations';
import { resolveLists } from './resolveLists';
import { isNamed } from './sameLook';
import { themeColors } from './themeColors';
import { type XmlNode, attribute, child, childrenOf, xmlTree } from './xmlTree';

/** A file that was read: what we understand of it, and all of it. `writeXlsx` needs both to save it again. */
export interface XlsxFile {
  readonly book: Book;
  readonly parts: Parts;
}

/**
 * Reads an .xlsx workbook: values, formulas as a person types them, names, looks, widths, merges, lists.
 *
 * @param bytes - the file
 * @param limits - what it may cost; the defaults bound memory to a few hundred megabytes
 * @returns the book, and the original parts of the package for saving
 * @throws Problem for a file that is no workbook, encrypted, cut short, with macros, packed beyond the limits, or with
 * document types in its XML
 * @see ECMA-376 part 1 (SpreadsheetML) and part 2 (Open Packaging Conventions)
 */
export async function readXlsx(bytes: Uint8Array, limits: FileLimits = DEFAULT_LIMITS): Promise<XlsxFile> {
  const parts = openParts(bytes, limits);
  const main = workbookPart(parts);
  const root = xmlTree(parts.text(main), main);
  const relations = readRelations(parts, main);
  const partOf = (type: string) => relations.find((relation) => relation.type === type)?.target ?? '';
  const entries = childrenOf(child(root, 'sheets'), 'sheet');
  const names = readNames(root, entries);
  const { keys, styles } = stylesOf(parts, partOf('styles'), partOf('theme'));
  const context = {
    strings: readStrings(parts.text(partOf('sharedStrings')), partOf('sharedStrings')),
    keys,
    spilling: readMetadata(parts.text(partOf('sheetMetadata')), partOf('sheetMetadata')),
    budget: { cells: limits.cells, formulaCharacters: limits.formulaCharacters },
  };
  const sheets: BookSheet[] = [];
  for (const entry of entries) {
    const relation = relations.find(({ id }) => id === attribute(entry, 'id'));
    if (relation?.type !== 'worksheet') continue;
    if (!parts.has(relation.target)) throw fileProblem('a whole .xlsx workbook', 'a missing sheet', relation.target);
    await breath();
    const sheet = readSheet(parts.text(relation.target), relation.target, sheetName(entry), context);
    const hidden = entry.attributes['state'] === 'hidden' || entry.attributes['state'] === 'veryHidden';
    sheets.push(hidden ? { ...sheet, hidden } : sheet);
  }
  if (sheets.length === 0) throw fileProblem('a workbook with a sheet', 'one without');
  return {
    book: {
      sheets: resolveLists(sheets, names),
      names,
      styles: usedStyles(styles, sheets),
      properties: readProperties(parts),
    },
    parts,
  };
}

/** Between sheets the page gets to draw. */
const breath = () => new Promise((resolve) => setTimeout(resolve, 0));

const sheetName = (entry: XmlNode | undefined) => unescapeText(entry?.attributes['name'] ?? '');

function workbookPart(parts: Parts): string {
  if (!parts.has('[Content_Types].xml')) throw fileProblem('an .xlsx workbook', 'a zip file of another kind');
  const types = parts.text('[Content_Types].xml');
  if (/macroEnabled/i.test(types) || parts.entries.some(({ name }) => /vbaProject\.bin$/i.test(name))) {
    throw fileProblem('an .xlsx workbook without macros', 'a workbook with macros');
  }
  const main = readRelations(parts, '').find(({ type }) => type === 'officeDocument')?.target;
  if (main === undefined || !parts.has(main))
    throw fileProblem('an .xlsx workbook', 'a package without a workbook part');
  if (!/spreadsheetml\.(?:sheet|template)\.main\+xml/i.test(types)) {
    throw fileProblem('an .xlsx workbook', 'an office document of another kind');
  }
  return main;
}

function readNames(root: XmlNode, sheets: readonly XmlNode[]): BookName[] {
  return childrenOf(child(root, 'definedNames'), 'definedName').map((node) => {
    const local = node.attributes['localSheetId'];
    return {
      name: unescapeText(node.attributes['name'] ?? ''),
      formula: fromFileFormula(unescapeText(node.text)).slice(1),
      ...(local === undefined ? {} : { sheet: sheetName(sheets[Number(local)]) }),
      ...(node.attributes['hidden'] === '1' || node.attributes['hidden'] === 'true' ? { hidden: true } : {}),
    };
  });
}

function stylesOf(parts: Parts, part: string, theme: string): FileStyles {
  if (!parts.has(part)) return { keys: [], styles: {} };
  return readStyles(xmlTree(parts.text(part), part), parts.has(theme) ? themeColors(parts.text(theme), theme) : []);
}

function usedStyles(styles: Book['styles'], sheets: readonly BookSheet[]): Book['styles'] {
  const used = new Set(sheets.flatMap((sheet) => Object.values(sheet.cells).map((cell) => cell.style)));
  return Object.fromEntries(Object.entries(styles).filter(([key]) => isNamed(key) || used.has(key)));
}
