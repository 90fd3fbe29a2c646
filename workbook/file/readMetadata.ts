import { child, childrenOf, xmlTree } from './xmlTree';

/**
 * Which `cm="n"` of a workbook mark a formula that spills: those whose metadata type is `XLDAPR`.
 *
 * @param xml - the part `metadata.xml`, or `''`
 * @param part - its name, for refusals
 * @see MS-XLSX 2.4 (dynamic array properties), ECMA-376 part 1, 18.9
 */
export function readMetadata(xml: string, part: string): ReadonlySet<number> {
  const root = xmlTree(xml, part);
  const types = childrenOf(child(root, 'metadataTypes'), 'metadataType').map((node) => node.attributes['name']);
  const found = new Set<number>();
  childrenOf(child(root, 'cellMetadata'), 'bk').forEach((block, index) => {
    if (childrenOf(block, 'rc').some((rc) => types[Number(rc.attributes['t']) - 1] === 'XLDAPR')) found.add(index + 1);
  });
  return found;
}
