import { formatArea, parseArea } from '../../taskpane/hosts/address';
import type { BookCell, BookSheet } from '../book';
import { cellXml, sameCell } from './cellXml';
import { FRAME_ORDER, type Span, frameEdits } from './frameEdits';
import { scanXml } from './scanXml';
import { prefixed } from './styleTable';
import { openTag, tagName, tagText } from './tagText';
import { type TextEdit, applyEdits } from './textEdits';

export interface CellWriter {
  style(cell: BookCell): number;
  spill(): string;
}

interface Pending {
  readonly row: number;
  readonly column: number;
  readonly address: string;
}

/**
 * Writes what changed on a sheet into its part: cells that are equal before and after keep every byte, and so does
 * everything that the book doesn't know of.
 *
 * @param xml - the part
 * @param part - its name, for refusals
 * @param before - the sheet as it was read from that part
 * @param after - the sheet to be written
 * @param writer - numbers for looks and spilling formulas
 */
export function patchSheet(xml: string, part: string, before: BookSheet, after: BookSheet, writer: CellWriter): string {
  const changed = changedCells(before, after);
  const spans: Span[] = [];
  const edits: TextEdit[] = [];
  const prefix = tagName(/<[A-Za-z][^>]*>/.exec(xml)?.[0] ?? '').replace(/[^:]*$/, '');
  const write = (address: string) => {
    const cell = after.cells[address];
    return prefixed(
      cellXml(address, cell, cell === undefined ? 0 : writer.style(cell), () => writer.spill()),
      prefix,
    );
  };
  const group = sharedGroups(xml, part, changed);
  const present = new Set<string>();
  const waiting = (): Pending[] =>
    [...changed]
      .filter((address) => !present.has(address) && after.cells[address] !== undefined)
      .map((address) => {
        const area = parseArea(address);
        return { row: area?.top ?? 0, column: area?.left ?? 0, address };
      })
      .sort((a, b) => a.row - b.row || a.column - b.column);

  // First pass: which of the changed cells have a place already.
  walkCells(xml, part, (address) => void present.add(address));
  const pending = waiting();
  let next = 0;
  const newRows = (limit: number): string => {
    let text = '';
    while (next < pending.length && (pending[next]?.row ?? 0) < limit) {
      const row = pending[next]?.row ?? 0;
      text += `<${prefix}row r="${row + 1}"${heightText(after, row)}>${takeCells(row, Infinity)}</${prefix}row>`;
    }
    return text;
  };
  const takeCells = (row: number, limit: number): string => {
    let text = '';
    for (let each = pending[next]; each?.row === row && each.column < limit; each = pending[next]) {
      text += write(each.address);
      next++;
    }
    return text;
  };
  const insert = (at: number, text: string) => {
    if (text !== '') edits.push({ start: at, end: at, text });
  };

  walkSheet(xml, part, {
    row(row, start, openEnd, selfClosed) {
      insert(start, newRows(row));
      const tag = xml.slice(start, openEnd);
      const grows = pending[next]?.row === row;
      const height = after.rowHeights[String(row + 1)];
      const resized = before.rowHeights[String(row + 1)] !== height;
      if (!grows && !resized) return;
      let text = grows ? tagText(tag, { spans: null }) : tag;
      if (resized)
        text = tagText(
          text,
          height === undefined ? { ht: null, customHeight: null } : { ht: String(height), customHeight: '1' },
        );
      if (grows && selfClosed) text = `${openTag(text)}${takeCells(row, Infinity)}</${prefix}row>`;
      edits.push({ start, end: openEnd, text });
    },
    cell(address, row, column, start, end) {
      insert(start, takeCells(row, column));
      if (changed.has(address) || group.has(address)) edits.push({ start, end, text: write(address) });
    },
    rowEnd(row, closeStart) {
      insert(closeStart, takeCells(row, Infinity));
    },
    data(start, openEnd, end) {
      const rows = newRows(Infinity);
      if (rows === '') return;
      if (openEnd !== end) insert(xml.lastIndexOf('</', end - 1), rows);
      else edits.push({ start, end, text: `${openTag(xml.slice(start, end))}${rows}</${prefix}sheetData>` });
    },
    frame: (span) => void spans.push(span),
  });
  // The stated extent of the sheet is optional, and wrong once a cell stands outside it.
  const extent = pending.length === 0 ? undefined : spans.find(({ name }) => name === 'dimension');
  if (extent !== undefined) edits.push({ start: extent.start, end: extent.end, text: '' });
  return applyEdits(xml, [...edits, ...frameEdits(xml, part, spans, before, after, prefix)]);
}

const heightText = (sheet: BookSheet, row: number) => {
  const height = sheet.rowHeights[String(row + 1)];
  return height === undefined ? '' : ` ht="${height}" customHeight="1"`;
};

function changedCells(before: BookSheet, after: BookSheet): Set<string> {
  const changed = new Set<string>();
  if (before.cells === after.cells) return changed;
  for (const [address, cell] of Object.entries(after.cells))
    if (!sameCell(before.cells[address], cell)) changed.add(address);
  for (const address of Object.keys(before.cells)) if (after.cells[address] === undefined) changed.add(address);
  return changed;
}

interface SheetWalk {
  row?(row: number, start: number, openEnd: number, selfClosed: boolean): void;
  cell?(address: string, row: number, column: number, start: number, end: number): void;
  formula?(attributes: Readonly<Record<string, string>>): void;
  rowEnd?(row: number, closeStart: number): void;
  data?(start: number, openEnd: number, end: number): void;
  frame?(span: Span): void;
}

/** Rows and cells with their places; a row or cell without an address follows the one before it. */
function walkSheet(xml: string, part: string, walk: SheetWalk): void {
  let depth = 0;
  let row = -1;
  let column = -1;
  let rowOpenEnd = 0;
  let cell = { address: '', start: 0 };
  let top = { name: '', start: 0, openEnd: 0 };
  scanXml(xml, part, {
    open(name, attributes, start, openEnd) {
      depth++;
      if (depth === 2) top = { name, start, openEnd };
      if (top.name !== 'sheetData') return;
      if (depth === 3 && name === 'row') {
        row = attributes['r'] === undefined ? row + 1 : Number(attributes['r']) - 1;
        column = -1;
        rowOpenEnd = openEnd;
        walk.row?.(row, start, openEnd, xml[openEnd - 2] === '/');
      } else if (depth === 4 && name === 'c') {
        const area = parseArea(attributes['r'] ?? '');
        column = area?.left ?? column + 1;
        cell = { address: formatArea({ top: area?.top ?? row, left: column, rows: 1, columns: 1 }), start };
      } else if (depth === 5 && name === 'f') walk.formula?.({ ...attributes, address: cell.address });
    },
    close(name, end) {
      if (top.name === 'sheetData' && depth === 4 && name === 'c')
        walk.cell?.(cell.address, row, column, cell.start, end);
      else if (top.name === 'sheetData' && depth === 3 && end !== rowOpenEnd)
        walk.rowEnd?.(row, xml.lastIndexOf('</', end - 1));
      else if (depth === 2) {
        if (name === 'sheetData') walk.data?.(top.start, top.openEnd, end);
        if (FRAME_ORDER.includes(name)) walk.frame?.({ ...top, end });
      } else if (depth === 1) walk.frame?.({ name: '', start: xml.lastIndexOf('</', end - 1), openEnd: end, end });
      depth--;
    },
  });
}

function walkCells(xml: string, part: string, visit: (address: string) => void): void {
  walkSheet(xml, part, { cell: visit });
}

/** All cells of a shared formula whose first cell changed: each has to be written with a formula of its own. */
function sharedGroups(xml: string, part: string, changed: ReadonlySet<string>): ReadonlySet<string> {
  const members = new Map<string, string[]>();
  const broken = new Set<string>();
  if (changed.size === 0 || !xml.includes('shared')) return broken;
  walkSheet(xml, part, {
    formula(attributes) {
      const index = attributes['si'];
      const address = attributes['address'] ?? '';
      if (attributes['t'] !== 'shared' || index === undefined) return;
      members.set(index, [...(members.get(index) ?? []), address]);
      if (attributes['ref'] !== undefined && changed.has(address)) broken.add(index);
    },
  });
  return new Set([...broken].flatMap((index) => members.get(index) ?? []));
}
