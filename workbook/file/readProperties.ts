import { unescapeText } from './escapeXml';
import type { Parts } from './parts';
import { readRelations } from './relations';
import { childrenOf, xmlTree } from './xmlTree';

/**
 * The small texts that a file keeps as custom properties; properties of other kinds are left out.
 *
 * @param parts - the package
 * @see ECMA-376 part 1, 22.3 (custom properties)
 */
export function readProperties(parts: Parts): Record<string, string> {
  const part = readRelations(parts, '').find(({ type }) => type === 'custom-properties')?.target;
  if (part === undefined || !parts.has(part)) return {};
  const found: Record<string, string> = {};
  for (const node of childrenOf(xmlTree(parts.text(part), part), 'property')) {
    const text = childrenOf(node, 'lpwstr')[0];
    if (text !== undefined) found[node.attributes['name'] ?? ''] = unescapeText(text.text);
  }
  return found;
}
