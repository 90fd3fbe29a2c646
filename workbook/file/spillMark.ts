import { MAIN, XML } from './baseParts';
import { type PackageEdits, insertLast } from './packageEdits';
import { readMetadata } from './readMetadata';
import { child, childrenOf, xmlTree } from './xmlTree';

const SPILL = 'http://schemas.microsoft.com/office/spreadsheetml/2017/dynamicarray';

const TYPE =
  '<metadataType name="XLDAPR" minSupportedVersion="120000" copy="1" pasteAll="1" pasteValues="1" merge="1" splitFirst="1" ' +
  'rowColShift="1" clearFormats="1" clearComments="1" assign="1" coerce="1" cellMeta="1"/>';
const FUTURE =
  `<futureMetadata name="XLDAPR" count="1"><bk><extLst><ext uri="{bdbb8cdc-fa1e-496e-a857-3c3f30c029c3}">` +
  `<xda:dynamicArrayProperties xmlns:xda="${SPILL}" fDynamic="1" fCollapsed="0"/></ext></extLst></bk></futureMetadata>`;
const record = (type: number) => `<bk><rc t="${type}" v="0"/></bk>`;

const FRESH =
  `${XML}<metadata xmlns="${MAIN}"><metadataTypes count="1">${TYPE}</metadataTypes>${FUTURE}` +
  `<cellMetadata count="1">${record(1)}</cellMetadata></metadata>`;

/**
 * The `cm` number that marks a formula as one that spills, so that no reader truncates it or adds `@`. The workbook's
 * metadata gets the record when it is first asked for.
 *
 * @param edits - the package
 * @param main - its workbook part
 * @param part - its metadata part, where it has one
 * @see MS-XLSX 2.4 (dynamic array properties), ECMA-376 part 1, 18.9
 */
export function spillMark(edits: PackageEdits, main: string, part: string | undefined): () => string {
  let mark: number | undefined;
  return () => {
    mark ??= findOrAdd(edits, main, part);
    return String(mark);
  };
}

function findOrAdd(edits: PackageEdits, main: string, part: string | undefined): number {
  if (part === undefined) {
    const name = edits.freeName((n) => `xl/metadata${n === 1 ? '' : n}.xml`);
    edits.add(name, FRESH, { type: 'sheetMetadata', content: '.sheetMetadata+xml' }, main);
    return 1;
  }
  const xml = edits.text(part);
  const known = Math.min(...readMetadata(xml, part));
  if (Number.isFinite(known)) return known;
  const root = xmlTree(xml, part);
  const types = childrenOf(child(root, 'metadataTypes'), 'metadataType').length;
  const cells = childrenOf(child(root, 'cellMetadata'), 'bk').length;
  let text =
    child(root, 'metadataTypes') === undefined
      ? insertFirst(xml, root.openEnd, '<metadataTypes></metadataTypes>')
      : xml;
  text = insertLast(text, part, TYPE, 'metadataTypes');
  text = insertAfterLast(text, part, FUTURE, ['metadataTypes', 'metadataStrings', 'mdxMetadata', 'futureMetadata']);
  if (cells === 0) {
    const holders = ['metadataTypes', 'metadataStrings', 'mdxMetadata', 'futureMetadata'];
    text = insertAfterLast(text, part, '<cellMetadata count="0"></cellMetadata>', holders);
  }
  text = insertLast(text, part, record(types + 1), 'cellMetadata');
  edits.set(part, recount(recount(text, 'metadataTypes', types + 1), 'cellMetadata', cells + 1));
  return cells + 1;
}

const insertFirst = (xml: string, at: number, text: string) => xml.slice(0, at) + text + xml.slice(at);

function insertAfterLast(xml: string, part: string, text: string, names: readonly string[]): string {
  const before = xmlTree(xml, part).children.filter((node) => names.includes(node.name));
  const at = Math.max(...before.map((node) => node.end));
  return insertFirst(xml, at, text);
}

const recount = (xml: string, name: string, count: number) =>
  xml.replace(new RegExp(`(<(?:\\w+:)?${name}\\b[^>]*?\\bcount=")\\d+`), (_, head: string) => head + String(count));
