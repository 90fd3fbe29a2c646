import type { Book, BookStyle } from '../book';
import { BUILTIN_FORMATS } from './builtinFormats';
import { STYLE_PREFIX, type StyleKey } from './readStyles';
import { isNamed, sameLook } from './sameLook';
import { type StandardFont, borderXml, fillXml, fontXml, lookXml } from './styleXml';
import { attributeText, openTag, tagName, tagText } from './tagText';
import { type TextEdit, applyEdits } from './textEdits';
import { type XmlNode, child, childrenOf, xmlTree } from './xmlTree';

export interface StyleTable {
  /** The `s` number of a look; a new one is added to the workbook's table. */
  index(key: StyleKey): number;
  /** The styles part with what was added, or null when nothing was. */
  result(): string | null;
}

/** A list of the styles part that can grow: new items by their text. */
interface Growing {
  readonly node: XmlNode | undefined;
  readonly items: string[];
  readonly count: number;
}

const LISTS = ['numFmts', 'fonts', 'fills', 'borders', 'cellStyleXfs', 'cellXfs', 'cellStyles'] as const;
/** The first number that a file may give to a number format of its own. */
const FIRST_OWN_FORMAT = 164;

/**
 * The looks of a workbook, open for new ones.
 *
 * @param xml - the styles part
 * @param part - its name
 * @param keys - what its looks mean, from `readStyles`
 * @param before - the looks as they were read; a key that means something else now becomes a new look
 * @param after - the looks that the book to be written points at
 */
export function styleTable(
  xml: string,
  part: string,
  keys: readonly StyleKey[],
  before: Book['styles'],
  after: Book['styles'],
): StyleTable {
  const root = xmlTree(xml, part);
  const lists = Object.fromEntries(
    LISTS.map((name) => [name, { node: child(root, name), items: [], count: child(root, name)?.children.length ?? 0 }]),
  ) as unknown as Record<(typeof LISTS)[number], Growing>;
  const add = (name: (typeof LISTS)[number], item: string) => {
    const list = lists[name];
    const known = list.items.indexOf(item);
    if (known >= 0 && name !== 'cellXfs') return list.count + known;
    list.items.push(item);
    return list.count + list.items.length - 1;
  };
  const textOf = ({ style, format }: StyleKey) => JSON.stringify([style ?? '', format ?? '']);
  const known = new Map<string, number>();
  keys.forEach((key, index) => {
    if (!known.has(textOf(key)) && sameStyle(before, after, key.style)) known.set(textOf(key), index);
  });
  const formats = new Map(
    childrenOf(lists.numFmts.node, 'numFmt').map((node) => [
      node.attributes['formatCode'] ?? '',
      Number(node.attributes['numFmtId']),
    ]),
  );

  const formatId = (format: string): number => {
    const builtin = Object.entries(BUILTIN_FORMATS).find(([, code]) => code === format)?.[0];
    if (builtin !== undefined) return Number(builtin);
    const id = formats.get(format) ?? Math.max(FIRST_OWN_FORMAT - 1, ...formats.values()) + 1;
    if (!formats.has(format)) {
      formats.set(format, id);
      add('numFmts', `<numFmt numFmtId="${id}" formatCode="${attributeText(format)}"/>`);
    }
    return id;
  };

  const looks = new Map<string, { numbers: string; inside: string; xfId: number; format: string }>();
  const lookOf = (style: string) => {
    const found = looks.get(style);
    if (found !== undefined) return found;
    const look: BookStyle = after[style] ?? {};
    const format = look.format ?? 'General';
    const inside = lookXml(look);
    const named = childrenOf(lists.cellStyles.node, 'cellStyle').find(
      (node) => node.attributes['name'] === attributeText(STYLE_PREFIX + style),
    );
    const base = lists.cellStyleXfs.node?.children[Number(named?.attributes['xfId'])];
    if (base !== undefined && sameStyle(before, after, style)) {
      const { fontId = '0', fillId = '0', borderId = '0' } = base.attributes;
      const numbers = `fontId="${fontId}" fillId="${fillId}" borderId="${borderId}"`;
      const made = { numbers, inside, xfId: Number(named?.attributes['xfId']), format };
      looks.set(style, made);
      return made;
    }
    const numbers =
      `fontId="${fontXml(look) === '' ? 0 : add('fonts', fontXml(look, standardFont(xml, lists.fonts.node)))}" ` +
      `fillId="${look.fill === undefined ? 0 : add('fills', fillXml(look.fill))}" ` +
      `borderId="${borderXml(look) === '' ? 0 : add('borders', borderXml(look))}"`;
    let xfId = 0;
    if (named === undefined && isNamed(style)) {
      xfId = add('cellStyleXfs', `<xf numFmtId="${formatId(format)}" ${numbers}${inside}`);
      add('cellStyles', `<cellStyle name="${attributeText(STYLE_PREFIX + style)}" xfId="${xfId}"/>`);
    }
    const made = { numbers, inside, xfId, format };
    looks.set(style, made);
    return made;
  };

  const create = ({ style, format }: StyleKey): number => {
    const original = style === undefined ? undefined : known.get(textOf({ style }));
    const node = original === undefined ? undefined : lists.cellXfs.node?.children[original];
    if (node !== undefined && format !== undefined) {
      const tag = xml.slice(node.start, node.openEnd);
      const numbered = tagText(tag, { numFmtId: String(formatId(format)), applyNumberFormat: '1' });
      return add('cellXfs', numbered + xml.slice(node.openEnd, node.end));
    }
    const look = lookOf(style ?? '');
    const id = formatId(format ?? look.format);
    return add(
      'cellXfs',
      `<xf numFmtId="${id}" ${look.numbers} xfId="${look.xfId}" applyNumberFormat="1"${look.inside}`,
    );
  };

  return {
    index(key) {
      const text = textOf(key);
      const found = known.get(text) ?? (key.style === undefined && key.format === undefined ? 0 : create(key));
      known.set(text, found);
      return found;
    },
    result() {
      for (const style of Object.keys(after)) if (isNamed(style)) lookOf(style);
      const edits: TextEdit[] = [];
      for (const name of LISTS) edits.push(...grow(xml, root, name, lists[name]));
      return edits.length === 0 ? null : applyEdits(xml, edits);
    },
  };
}

const sameStyle = (before: Book['styles'], after: Book['styles'], style: string | undefined) =>
  style === undefined || after[style] === undefined || sameLook(before[style], after[style]);

function standardFont(xml: string, fonts: XmlNode | undefined): StandardFont {
  const name = child(fonts?.children[0], 'name');
  const size = Number(child(fonts?.children[0], 'sz')?.attributes['val'] ?? 11);
  return { name: name === undefined ? '' : xml.slice(name.start, name.end), size };
}

function grow(xml: string, root: XmlNode, name: string, list: Growing): TextEdit[] {
  if (list.items.length === 0) return [];
  const text = list.items.join('');
  if (list.node === undefined) {
    // Only the number formats and the named styles may be absent; both have a fixed place.
    const next = root.children.find((each) => LISTS.indexOf(each.name as never) > LISTS.indexOf(name as never));
    const at = name === 'numFmts' ? root.openEnd : (next?.start ?? child(root, 'cellXfs')?.end ?? root.openEnd);
    const prefix = tagName(xml.slice(root.start, root.openEnd)).replace(/[^:]*$/, '');
    const placed = name === 'cellStyles' ? (child(root, 'cellXfs')?.end ?? at) : at;
    return [
      {
        start: placed,
        end: placed,
        text: `<${prefix}${name} count="${list.items.length}">${prefixed(text, prefix)}</${prefix}${name}>`,
      },
    ];
  }
  const { start, openEnd, end } = list.node;
  const tag = xml.slice(start, openEnd);
  const full = tagName(tag);
  const added = prefixed(text, full.slice(0, full.length - name.length));
  const counted = tagText(tag, { count: String(list.count + list.items.length) });
  if (openEnd === end) return [{ start, end, text: `${openTag(counted)}${added}</${full}>` }];
  const close = xml.lastIndexOf('</', end - 1);
  return [
    { start, end: openEnd, text: counted },
    { start: close, end: close, text: added },
  ];
}

/** Elements of ours in the style of a file that puts a prefix on each; what was copied from it has it already. */
export const prefixed = (xml: string, prefix: string): string =>
  prefix === '' ? xml : xml.replace(/<(\/?)(?=[A-Za-z]+[\s/>])/g, `<$1${prefix}`);
