import { SaxesParser, type SaxesTagPlain } from 'saxes';
import { fileProblem } from './fileProblem';

export interface XmlHandlers {
  /** `start` is the place of the tag's `<`, `end` the place after its `>`. */
  open(name: string, attributes: Record<string, string>, start: number, end: number): void;
  close?(name: string, end: number): void;
  text?(text: string): void;
}

/** Name without prefix: some writers put one on every element. */
export const localName = (name: string): string => name.slice(name.indexOf(':') + 1);

/**
 * Walks through an XML part once.
 *
 * @param xml - the text of the part
 * @param part - its name, for refusals
 * @param handlers - called in document order; names come without prefix
 * @throws Problem for XML that is not well formed, or that declares a document type (and with it entities)
 */
export function scanXml(xml: string, part: string, handlers: XmlHandlers): void {
  const parser = new SaxesParser();
  const fail = (received: string) => {
    throw fileProblem('well-formed XML without document types', received, part);
  };
  parser.on('error', () => fail('XML that breaks off or does not nest'));
  parser.on('doctype', () => fail('a document type declaration'));
  parser.on('opentag', (tag: SaxesTagPlain) => {
    const end = parser.position;
    // A tag's own text holds no second "<": well-formed attribute values can't.
    handlers.open(localName(tag.name), tag.attributes, xml.lastIndexOf('<', end - 1), end);
  });
  parser.on('closetag', (tag) => handlers.close?.(localName(tag.name), parser.position));
  if (handlers.text !== undefined) {
    parser.on('text', (value) => handlers.text?.(value));
    parser.on('cdata', (value) => handlers.text?.(value));
  }
  parser.write(xml).close();
}
