import type { BookSheet } from '../book';
import { columnsXml } from './columnsXml';
import { listsXml } from './listsXml';
import { prefixed } from './styleTable';
import { openTag, tagName, tagText } from './tagText';
import type { TextEdit } from './textEdits';
import { applyEdits } from './textEdits';
import { child, childrenOf, xmlTree } from './xmlTree';

/** A child of the sheet's root with its place; the name `''` marks the root's end. */
export interface Span {
  readonly name: string;
  readonly start: number;
  readonly openEnd: number;
  readonly end: number;
}

/** The order of a sheet's elements. Source: ECMA-376 part 1, CT_Worksheet (18.3.1.99). */
export const FRAME_ORDER: readonly string[] = (
  'sheetPr dimension sheetViews sheetFormatPr cols sheetData sheetCalcPr sheetProtection protectedRanges scenarios ' +
  'autoFilter sortState dataConsolidate customSheetViews mergeCells phoneticPr conditionalFormatting dataValidations ' +
  'hyperlinks printOptions pageMargins pageSetup headerFooter rowBreaks colBreaks customProperties cellWatches ' +
  'ignoredErrors smartTags drawing drawingHF legacyDrawing legacyDrawingHF picture oleObjects controls webPublishItems ' +
  'tableParts extLst'
).split(' ');

/**
 * The edits for everything around the cells: widths, merges, lists, frozen panes, grid lines, print. An element that
 * is the same before and after is not touched.
 */
export function frameEdits(
  xml: string,
  part: string,
  spans: readonly Span[],
  before: BookSheet,
  after: BookSheet,
  prefix: string,
): TextEdit[] {
  const edits: TextEdit[] = [];
  const same = (a: unknown, b: unknown) => a === b || JSON.stringify(a) === JSON.stringify(b);
  const replace = (name: string, make: (old: string) => string) => {
    const span = spans.find((each) => each.name === name);
    const rank = FRAME_ORDER.indexOf(name);
    const later = spans.find((each) => each.name === '' || FRAME_ORDER.indexOf(each.name) > rank);
    const start = span?.start ?? later?.start ?? xml.length;
    const old = span === undefined ? '' : xml.slice(span.start, span.end);
    const text = prefixed(make(old), prefix);
    if (text !== old) edits.push({ start, end: span?.end ?? start, text });
  };
  if (!same(before.columnWidths, after.columnWidths)) {
    replace('cols', (old) => columnsXml(old, part, before.columnWidths, after.columnWidths));
  }
  if (!same(before.merges, after.merges)) {
    const cells = after.merges.map((ref) => `<mergeCell ref="${ref}"/>`).join('');
    replace('mergeCells', () =>
      cells === '' ? '' : `<mergeCells count="${after.merges.length}">${cells}</mergeCells>`,
    );
  }
  if (!same(before.lists, after.lists)) replace('dataValidations', (old) => listsXml(old, part, after.lists));
  if (!same(before.freeze, after.freeze) || before.gridLines !== after.gridLines) {
    replace('sheetViews', (old) => viewsXml(old, part, after, !same(before.freeze, after.freeze)));
  }
  if (before.print.fitWidth !== after.print.fitWidth) {
    replace('sheetPr', (old) => fitXml(old, part, after.print.fitWidth));
  }
  if (!same(before.print, after.print)) {
    replace('pageSetup', (old) =>
      tagText(old === '' ? '<pageSetup/>' : old, {
        orientation: after.print.landscape ? 'landscape' : 'portrait',
        ...(after.print.fitWidth ? { fitToHeight: '0' } : {}),
      }),
    );
  }
  return edits;
}

function viewsXml(old: string, part: string, sheet: BookSheet, refreeze: boolean): string {
  const xml = old === '' ? '<sheetViews><sheetView workbookViewId="0"/></sheetViews>' : old;
  const view = child(xmlTree(xml, part), 'sheetView');
  if (view === undefined) return xml;
  const tag = tagText(xml.slice(view.start, view.openEnd), { showGridLines: sheet.gridLines ? null : '0' });
  const inside = view.children
    .filter(
      (node) =>
        !refreeze || (node.name !== 'pane' && (node.name !== 'selection' || node.attributes['pane'] === undefined)),
    )
    .map((node) => xml.slice(node.start, node.end))
    .join('');
  const pane = refreeze ? paneXml(sheet) : '';
  const name = tagName(tag);
  return applyEdits(xml, [{ start: view.start, end: view.end, text: `${openTag(tag)}${pane}${inside}</${name}>` }]);
}

function paneXml({ freeze: { rows, columns } }: BookSheet): string {
  if (rows === 0 && columns === 0) return '';
  const pane = rows === 0 ? 'topRight' : columns === 0 ? 'bottomLeft' : 'bottomRight';
  const corner = `${columnName(columns)}${rows + 1}`;
  const split = `${columns > 0 ? ` xSplit="${columns}"` : ''}${rows > 0 ? ` ySplit="${rows}"` : ''}`;
  return `<pane${split} topLeftCell="${corner}" activePane="${pane}" state="frozen"/><selection pane="${pane}"/>`;
}

/** Frozen columns are few: two letters are enough for any screen, and the sum holds for three. */
const columnName = (column: number): string =>
  (column >= 26 ? columnName(Math.floor(column / 26) - 1) : '') + String.fromCharCode(65 + (column % 26));

function fitXml(old: string, part: string, fit: boolean): string {
  const xml = old === '' ? '<sheetPr></sheetPr>' : old;
  const root = xmlTree(xml, part);
  const setup = childrenOf(root, 'pageSetUpPr')[0];
  const flag = { fitToPage: fit ? '1' : null };
  if (setup !== undefined) {
    return applyEdits(xml, [
      { start: setup.start, end: setup.openEnd, text: tagText(xml.slice(setup.start, setup.openEnd), flag) },
    ]);
  }
  const tag = openTag(xml.slice(root.start, root.openEnd));
  const inside = root.openEnd === root.end ? '' : xml.slice(root.openEnd, xml.lastIndexOf('</'));
  return `${tag}${inside}${tagText('<pageSetUpPr/>', flag)}</${tagName(tag)}>`;
}
