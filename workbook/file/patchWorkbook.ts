import type { Book, BookName } from '../book';
import { escapeXml, unescapeText } from './escapeXml';
import { fromFileFormula, toFileFormula } from './formulaText';
import { prefixed } from './styleTable';
import { attributeText, tagName, tagText } from './tagText';
import { applyEdits, type TextEdit } from './textEdits';
import { type XmlNode, attribute, child, childrenOf, xmlTree } from './xmlTree';

/** One line of the workbook's list of sheets. */
export interface SheetEntry {
  readonly name: string;
  readonly hidden: boolean;
  readonly relation: string;
}

/**
 * Writes the list of sheets and the names into the workbook part. Entries that stay keep their text.
 *
 * @param xml - the workbook part
 * @param part - its name
 * @param entries - the worksheets in their new order
 * @param isWorksheet - tells worksheets from chart sheets by their relation
 * @param names - all names of the book
 */
export function patchWorkbook(
  xml: string,
  part: string,
  entries: readonly SheetEntry[],
  isWorksheet: (relation: string) => boolean,
  names: readonly BookName[],
): string {
  const root = xmlTree(xml, part);
  const prefix = tagName(xml.slice(root.start, root.openEnd)).replace(/[^:]*$/, '');
  const list = child(root, 'sheets');
  const old = childrenOf(list, 'sheet');
  const order = newOrder(old, entries, isWorksheet);
  const edits: TextEdit[] = [];
  const replace = (name: string, before: readonly string[], text: string) => {
    const node = child(root, name);
    const follower = root.children.find((each) => before.includes(each.name));
    const start = node?.start ?? follower?.start ?? xml.lastIndexOf('</');
    const end = node?.end ?? start;
    if (xml.slice(start, end) !== text) edits.push({ start, end, text });
  };

  let freeId = Math.max(0, ...old.map((node) => Number(node.attributes['sheetId']))) + 1;
  const written = order.map(({ node, entry }) => {
    if (node === undefined) {
      const { name = '', relation = '', hidden = false } = entry ?? {};
      const state = hidden ? ' state="hidden"' : '';
      return `<${prefix}sheet name="${attributeText(name)}" sheetId="${freeId++}"${state} ${relationKey(root)}="${relation}"/>`;
    }
    const tag = xml.slice(node.start, node.end);
    if (entry === undefined) return tag;
    const wasHidden = (node.attributes['state'] ?? 'visible') !== 'visible';
    return tagText(tag, {
      ...(unescapeText(node.attributes['name'] ?? '') === entry.name ? {} : { name: entry.name }),
      ...(wasHidden === entry.hidden ? {} : { state: entry.hidden ? 'hidden' : null }),
    });
  });
  replace('sheets', [], `<${prefix}sheets>${written.join('')}</${prefix}sheets>`);

  const places = order.map(({ node, entry }) => entry?.name ?? unescapeText(node?.attributes['name'] ?? ''));
  const unchanged = order.length === old.length && order.every(({ node }, i) => node === old[i]);
  const named = namesText(
    xml,
    childrenOf(child(root, 'definedNames'), 'definedName'),
    names,
    order,
    old,
    places,
    unchanged,
  );
  const inside = named.map((each) => prefixed(each, prefix)).join('');
  const after =
    'calcPr oleSize customWorkbookViews pivotCaches smartTagPr smartTagTypes webPublishing fileRecoveryPr webPublishObjects extLst';
  const all = inside === '' ? '' : `<${prefix}definedNames>${inside}</${prefix}definedNames>`;
  const had = child(root, 'definedNames');
  if (had === undefined || !sameText(xml, had, inside)) replace('definedNames', after.split(' '), all);

  for (const view of childrenOf(child(root, 'bookViews'), 'workbookView')) {
    if (Number(view.attributes['activeTab'] ?? 0) < order.length) continue;
    edits.push({
      start: view.start,
      end: view.openEnd,
      text: tagText(xml.slice(view.start, view.openEnd), { activeTab: null, firstSheet: null }),
    });
  }
  return applyEdits(xml, edits);
}

interface Placed {
  readonly node?: XmlNode;
  readonly entry?: SheetEntry;
}

/** Worksheets as the book orders them; a chart sheet stays behind the worksheet that it followed. */
function newOrder(
  old: readonly XmlNode[],
  entries: readonly SheetEntry[],
  isWorksheet: (relation: string) => boolean,
): Placed[] {
  const relationOf = (node: XmlNode) => attribute(node, 'id') ?? '';
  const followers = new Map<string, XmlNode[]>();
  let leader = '';
  for (const node of old) {
    if (isWorksheet(relationOf(node))) leader = relationOf(node);
    else followers.set(leader, [...(followers.get(leader) ?? []), node]);
  }
  const placed: Placed[] = [];
  const takeFollowers = (relation: string) => {
    for (const node of followers.get(relation) ?? []) placed.push({ node });
    followers.delete(relation);
  };
  takeFollowers('');
  for (const entry of entries) {
    const node = old.find((each) => relationOf(each) === entry.relation);
    placed.push(node === undefined ? { entry } : { node, entry });
    takeFollowers(entry.relation);
  }
  for (const relation of [...followers.keys()]) takeFollowers(relation);
  return placed;
}

function namesText(
  xml: string,
  nodes: readonly XmlNode[],
  names: readonly BookName[],
  order: readonly Placed[],
  old: readonly XmlNode[],
  places: readonly string[],
  unchanged: boolean,
): string[] {
  const left = new Set(names);
  const kept = nodes.flatMap((node) => {
    const local = node.attributes['localSheetId'];
    const place = local === undefined ? undefined : order.findIndex((each) => each.node === old[Number(local)]);
    if (place === -1) return [];
    const sheet = place === undefined ? undefined : places[place];
    const name = [...left].find(
      (each) => each.name === unescapeText(node.attributes['name'] ?? '') && each.sheet === sheet,
    );
    if (name === undefined) return [];
    left.delete(name);
    const wasHidden = node.attributes['hidden'] === '1' || node.attributes['hidden'] === 'true';
    const tag = tagText(xml.slice(node.start, node.openEnd), {
      ...(place === undefined || unchanged ? {} : { localSheetId: String(place) }),
      ...(wasHidden === (name.hidden === true) ? {} : { hidden: name.hidden === true ? '1' : null }),
    });
    const same = fromFileFormula(unescapeText(node.text)) === `=${name.formula}`;
    const body = same
      ? xml.slice(node.openEnd, node.end)
      : `${escapeXml(toFileFormula(name.formula))}</${tagName(tag)}>`;
    return [tag + body];
  });
  const added = [...left].map(({ name, formula, sheet, hidden }) => {
    const local = sheet === undefined ? '' : ` localSheetId="${places.indexOf(sheet)}"`;
    const flag = hidden === true ? ' hidden="1"' : '';
    return `<definedName name="${attributeText(name)}"${local}${flag}>${escapeXml(toFileFormula(formula))}</definedName>`;
  });
  return [...kept, ...added];
}

function sameText(xml: string, node: XmlNode, inside: string): boolean {
  return node.children.map((each) => xml.slice(each.start, each.end)).join('') === inside;
}

/** `r:id`, under whatever prefix this file gives to relations. */
function relationKey(root: XmlNode): string {
  const found = Object.entries(root.attributes).find(
    ([name, value]) => name.startsWith('xmlns:') && /\/relationships$/.test(value),
  );
  return `${found?.[0].slice(6) ?? 'r'}:id`;
}

/** What the book holds, for whoever compares: sheets and names only. */
export const workbookFace = (book: Book): string =>
  JSON.stringify([book.sheets.map(({ name, id, hidden }) => [name, id, hidden]), book.names]);
