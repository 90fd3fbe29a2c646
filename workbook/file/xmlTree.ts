import { scanXml } from './scanXml';

/** An element with its place in the text that it was read from. */
export interface XmlNode {
  readonly name: string;
  readonly attributes: Readonly<Record<string, string>>;
  readonly start: number;
  /** After the `>` of the opening tag. */
  readonly openEnd: number;
  /** After the whole element. */
  end: number;
  readonly children: XmlNode[];
  text: string;
}

/**
 * Reads a small XML part as a tree that remembers its places, so that a change can be cut into the original text.
 *
 * @param xml - the text of the part
 * @param part - its name, for refusals
 * @returns the root element; for an empty text, an empty root
 * @throws Problem for XML that is not well formed or declares a document type
 */
export function xmlTree(xml: string, part: string): XmlNode {
  const top: XmlNode = { name: '', attributes: {}, start: 0, openEnd: 0, end: xml.length, children: [], text: '' };
  if (xml === '') return top;
  const stack = [top];
  const last = () => stack[stack.length - 1] ?? top;
  scanXml(xml, part, {
    open(name, attributes, start, openEnd) {
      const node: XmlNode = { name, attributes, start, openEnd, end: openEnd, children: [], text: '' };
      last().children.push(node);
      stack.push(node);
    },
    close(_name, end) {
      const node = stack.pop();
      if (node !== undefined) node.end = end;
    },
    text(text) {
      last().text += text;
    },
  });
  return top.children[0] ?? top;
}

/** The first child of that name. */
export const child = (node: XmlNode | undefined, name: string): XmlNode | undefined =>
  node?.children.find((each) => each.name === name);

/** All children of that name. */
export const childrenOf = (node: XmlNode | undefined, name: string): readonly XmlNode[] =>
  node?.children.filter((each) => each.name === name) ?? [];

/** An attribute by its name without prefix, as in `r:id`. */
export function attribute(node: XmlNode, name: string): string | undefined {
  const own = node.attributes[name];
  if (own !== undefined) return own;
  const key = Object.keys(node.attributes).find((each) => each.endsWith(`:${name}`));
  return key === undefined ? undefined : node.attributes[key];
}
