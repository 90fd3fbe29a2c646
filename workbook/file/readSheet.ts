import { formatArea, parseArea } from '../../taskpane/hosts/address';
import type { BookCell, BookList, BookSheet } from '../book';
import { emptySheet } from '../emptySheet';
import { cellFromFile } from './cellFromFile';
import { unescapeText } from './escapeXml';
import { fileProblem } from './fileProblem';
import { fromFileFormula, maySpill } from './formulaText';
import { readList } from './readList';
import type { StyleKey } from './readStyles';
import { scanXml } from './scanXml';
import { shiftFormula } from './shiftFormula';

/** What all sheets of a workbook share while they are read. */
export interface SheetContext {
  readonly strings: readonly string[];
  readonly keys: readonly StyleKey[];
  /** The `cm` numbers that mark spilling formulas. */
  readonly spilling: ReadonlySet<number>;
  /** Counts down over all sheets. */
  readonly budget: { cells: number; formulaCharacters: number };
}

/** A run of columns to the sheet's edge is read so far; nobody sets widths by hand beyond. */
const COLUMN_RUN = 256;

/**
 * Reads one sheet.
 *
 * @param xml - the part
 * @param part - its name, kept as the sheet's id
 * @param name - the sheet's name
 * @param context - shared texts, looks and limits
 * @throws Problem for damaged XML, an address that is none, or more cells or formula text than the limits allow
 */
export function readSheet(xml: string, part: string, name: string, context: SheetContext): BookSheet {
  const cells: Record<string, BookCell> = {};
  const columnWidths: Record<string, number> = {};
  const rowHeights: Record<string, number> = {};
  const merges: string[] = [];
  const lists: BookList[] = [];
  const shared = new Map<string, { text: string; row: number; column: number }>();
  let sheet: BookSheet = { ...emptySheet(name), id: part };
  let row = -1;
  let column = -1;
  let cell: Record<string, string> = {};
  let formula: Record<string, string> | null = null;
  let formulaText = '';
  let value = '';
  let into: 'f' | 'v' | 't' | 'formula1' | null = null;
  let list: Record<string, string> = {};
  let listText = '';
  let extension = 0;
  let phonetic = false;

  const finishCell = () => {
    const place = cell['r'] === undefined ? null : parseArea(cell['r']);
    if (cell['r'] !== undefined && place?.rows !== 1) throw fileProblem('cell addresses', `"${cell['r']}"`, part);
    column = place?.left ?? column + 1;
    const address = formatArea({ top: place?.top ?? row, left: column, rows: 1, columns: 1 });
    const key = context.keys[Number(cell['s'] ?? 0)] ?? {};
    const read = cellFromFile(cell['t'] ?? 'n', value, context.strings);
    const typed = formula === null ? {} : readFormula(formula, address, place?.top ?? row);
    if (read === null && !('formula' in typed) && key.style === undefined && key.format === undefined) return;
    if (--context.budget.cells < 0) throw fileProblem('fewer cells', 'more cells than can be held', part);
    cells[address] = { value: read, ...typed, ...key };
  };

  const readFormula = (f: Record<string, string>, address: string, top: number): Partial<BookCell> => {
    let text = unescapeText(formulaText);
    if (f['t'] === 'shared' && f['si'] !== undefined) {
      const master = shared.get(f['si']);
      if (text !== '') shared.set(f['si'], { text, row: top, column });
      else if (master !== undefined) text = shiftFormula(master.text, top - master.row, column - master.column);
    }
    if (text === '' || f['t'] === 'dataTable') return {};
    context.budget.formulaCharacters -= text.length;
    if (context.budget.formulaCharacters < 0)
      throw fileProblem('shorter formulas', 'more formula text than can be held', part);
    const typed = /_xl|LATENTRY/i.test(text) ? fromFileFormula(text) : `=${text}`;
    if (f['t'] !== 'array') return { formula: typed };
    const area = parseArea(f['ref'] ?? address);
    context.budget.cells -= (area?.rows ?? 1) * (area?.columns ?? 1) - 1;
    if (area === null || context.budget.cells < 0)
      throw fileProblem('smaller arrays', `an array over ${f['ref'] ?? ''}`, part);
    const range = formatArea(area);
    if (!context.spilling.has(Number(cell['cm']))) return { formula: typed, array: range };
    return range === address && maySpill(typed) ? { formula: typed } : { formula: typed, spill: range };
  };

  const open = (tag: string, attributes: Record<string, string>) => {
    if (extension > 0 || tag === 'extLst') {
      extension++;
      return;
    }
    switch (tag) {
      case 'row':
        row = attributes['r'] === undefined ? row + 1 : Number(attributes['r']) - 1;
        column = -1;
        if (attributes['ht'] !== undefined && isOn(attributes['customHeight']))
          rowHeights[String(row + 1)] = Number(attributes['ht']);
        break;
      case 'c':
        cell = attributes;
        formula = null;
        formulaText = '';
        value = '';
        break;
      case 'f':
        formula = attributes;
        into = 'f';
        break;
      case 'v':
        into = 'v';
        break;
      case 'rPh':
        phonetic = true;
        break;
      case 't':
        into = phonetic ? null : 't';
        break;
      case 'col':
        readColumns(attributes, columnWidths);
        break;
      case 'mergeCell':
        if (attributes['ref'] !== undefined) merges.push(attributes['ref']);
        break;
      case 'dataValidation':
        list = attributes;
        listText = '';
        break;
      case 'formula1':
        into = 'formula1';
        break;
      default:
        sheet = readFrame(sheet, tag, attributes);
    }
  };
  scanXml(xml, part, {
    open,
    close(tag) {
      if (extension > 0) extension--;
      else if (tag === 'c') finishCell();
      else if (tag === 'rPh') phonetic = false;
      else if (tag === 'dataValidation') lists.push(...readList(list, listText));
      into = null;
    },
    text(text) {
      if (extension > 0 || into === null) return;
      if (into === 'f') formulaText += text;
      else if (into === 'formula1') listText += text;
      else value += text;
    },
  });
  return { ...sheet, cells, columnWidths, rowHeights, merges, lists };
}

const isOn = (flag: string | undefined) => flag === '1' || flag === 'true';

function readFrame(sheet: BookSheet, tag: string, attributes: Record<string, string>): BookSheet {
  switch (tag) {
    case 'sheetView':
      return { ...sheet, gridLines: attributes['showGridLines'] !== '0' && attributes['showGridLines'] !== 'false' };
    case 'pane':
      if (!/^frozen/.test(attributes['state'] ?? '')) return sheet;
      return {
        ...sheet,
        freeze: { rows: Number(attributes['ySplit'] ?? 0), columns: Number(attributes['xSplit'] ?? 0) },
      };
    case 'pageSetUpPr':
      return { ...sheet, print: { ...sheet.print, fitWidth: isOn(attributes['fitToPage']) } };
    case 'pageSetup':
      return { ...sheet, print: { ...sheet.print, landscape: attributes['orientation'] === 'landscape' } };
    default:
      return sheet;
  }
}

function readColumns(attributes: Record<string, string>, widths: Record<string, number>): void {
  const first = Number(attributes['min']);
  const last = Math.min(Number(attributes['max']), first + COLUMN_RUN - 1);
  const width = Number(attributes['width']);
  if (!Number.isFinite(width) || attributes['width'] === undefined) return;
  for (let each = first; each <= last; each++) {
    widths[formatArea({ top: 0, left: each - 1, rows: 1, columns: 1 }).slice(0, -1)] = width;
  }
}
