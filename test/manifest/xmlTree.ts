import { SaxesParser } from 'saxes';

export interface XmlNode {
  readonly name: string;
  readonly attributes: Readonly<Record<string, string>>;
  readonly children: XmlNode[];
  text: string;
}

/** Reads well-formed XML into a tree; names keep their prefix. */
export function xmlTree(xml: string): XmlNode {
  const top: XmlNode = { name: '', attributes: {}, children: [], text: '' };
  const open = [top];
  const parser = new SaxesParser();
  parser.on('error', (error) => {
    throw error;
  });
  parser.on('opentag', ({ name, attributes }) => {
    const node: XmlNode = { name, attributes, children: [], text: '' };
    open.at(-1)?.children.push(node);
    open.push(node);
  });
  parser.on('text', (text) => {
    const node = open.at(-1);
    if (node !== undefined) node.text += text;
  });
  parser.on('closetag', () => {
    open.pop();
  });
  parser.write(xml).close();
  const [root] = top.children;
  if (root === undefined) throw new Error('no root element');
  return root;
}

/** Every node at a path of element names, as `Hosts/Host`; `**` in front finds them at any depth. */
export function nodesAt(root: XmlNode, path: string): XmlNode[] {
  if (path.startsWith('**/')) {
    const rest = path.slice(3);
    return [...nodesAt(root, rest), ...root.children.flatMap((child) => nodesAt(child, path))];
  }
  return path
    .split('/')
    .reduce((nodes, name) => nodes.flatMap((node) => node.children.filter((child) => child.name === name)), [root]);
}
