import { CONTENT, EMPTY_RELATIONS, RELATIONS } from './baseParts';
import type { Parts } from './parts';
import { readRelations, relationsPart } from './relations';
import { type TextEdit, applyEdits } from './textEdits';
import { attributeText } from './tagText';
import { packPart, writeZip } from './writeZip';
import { child, childrenOf, xmlTree } from './xmlTree';

const TYPES = '[Content_Types].xml';

/** What changes in a package; every part that nobody mentions keeps its packed bytes. */
export interface PackageEdits {
  text(name: string): string;
  set(name: string, text: string): void;
  /** Takes the part away with its own relations, its content type, and the relation `from` that led to it. */
  remove(name: string, from: string): void;
  /** Adds a part with its content type and the relation `from` another part to it; gives back the relation's id. */
  add(name: string, text: string, kind: { readonly type: string; readonly content: string }, from: string): string;
  /** A name that no part has yet, as in `xl/worksheets/sheet4.xml`. */
  freeName(pattern: (n: number) => string): string;
  bytes(): Uint8Array;
}

/** Collects changes to a package. */
export function packageEdits(parts: Parts): PackageEdits {
  const changed = new Map<string, string>();
  const removed = new Set<string>();
  const text = (name: string) => changed.get(name) ?? (removed.has(name.toLowerCase()) ? '' : parts.text(name));
  const edit = (name: string, xml: string, edits: readonly TextEdit[]) => {
    if (edits.length > 0) changed.set(name, applyEdits(xml, edits));
  };

  const addRelation = (type: string, target: string, from: string): string => {
    const place = relationsPart(from);
    const xml = text(place) || EMPTY_RELATIONS;
    const used = new Set(childrenOf(xmlTree(xml, place), 'Relationship').map((node) => node.attributes['Id']));
    let n = used.size + 1;
    while (used.has(`rId${n}`)) n++;
    const full = type.startsWith('http') ? type : `${RELATIONS}/${type}`;
    changed.set(
      place,
      insertLast(xml, place, `<Relationship Id="rId${n}" Type="${full}" Target="/${attributeText(target)}"/>`),
    );
    return `rId${n}`;
  };

  return {
    text,
    set(name, value) {
      changed.set(name, value);
    },
    remove(name, from) {
      for (const gone of [name, relationsPart(name)]) {
        changed.delete(gone);
        removed.add(gone.toLowerCase());
      }
      const types = text(TYPES);
      const overrides = childrenOf(xmlTree(types, TYPES), 'Override').filter(
        (node) => node.attributes['PartName']?.toLowerCase() === `/${name}`.toLowerCase(),
      );
      edit(TYPES, types, overrides.map(cut));
      const place = relationsPart(from);
      const xml = text(place);
      const ids = new Set(readRelations({ text }, from).flatMap(({ id, target }) => (target === name ? [id] : [])));
      edit(
        place,
        xml,
        childrenOf(xmlTree(xml, place), 'Relationship')
          .filter((node) => ids.has(node.attributes['Id'] ?? ''))
          .map(cut),
      );
    },
    add(name, value, kind, from) {
      changed.set(name, value);
      removed.delete(name.toLowerCase());
      const content = kind.content.startsWith('.') ? CONTENT + kind.content : kind.content;
      changed.set(
        TYPES,
        insertLast(text(TYPES), TYPES, `<Override PartName="/${attributeText(name)}" ContentType="${content}"/>`),
      );
      return addRelation(kind.type, name, from);
    },
    freeName(pattern) {
      let n = 1;
      while (parts.has(pattern(n)) || changed.has(pattern(n))) n++;
      return pattern(n);
    },
    bytes() {
      const encoder = new TextEncoder();
      const rest = new Map([...changed].map(([name, value]) => [name.toLowerCase(), { name, value }]));
      const kept = parts.entries
        .filter((entry) => !removed.has(entry.name.toLowerCase()))
        .map((entry) => {
          const change = rest.get(entry.name.toLowerCase());
          rest.delete(entry.name.toLowerCase());
          return change === undefined ? entry : packPart(entry.name, encoder.encode(change.value));
        });
      return writeZip([...kept, ...[...rest.values()].map(({ name, value }) => packPart(name, encoder.encode(value)))]);
    },
  };
}

const cut = (node: { readonly start: number; readonly end: number }): TextEdit => ({
  start: node.start,
  end: node.end,
  text: '',
});

/** Puts text before the end tag of the root, or of its child `into`; one closed in itself is opened. */
export function insertLast(xml: string, part: string, text: string, into?: string): string {
  const root = xmlTree(xml, part);
  const node = into === undefined ? root : child(root, into);
  if (node === undefined) return xml;
  const tag = xml.slice(node.start, node.openEnd);
  if (node.openEnd === node.end) {
    const name = /^<([^\s/>]+)/.exec(tag)?.[1] ?? '';
    return applyEdits(xml, [
      { start: node.start, end: node.end, text: `${tag.replace(/\s*\/>$/, '>')}${text}</${name}>` },
    ]);
  }
  const close = xml.lastIndexOf('</', node.end - 1);
  return applyEdits(xml, [{ start: close, end: close, text }]);
}
