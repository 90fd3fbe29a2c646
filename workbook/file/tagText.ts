import { escapeXml } from './escapeXml';

/** Text for an attribute: line breaks and tabs survive there only as character references. */
export const attributeText = (text: string): string =>
  escapeXml(text).replace(/[\n\t]/g, (c) => (c === '\n' ? '&#10;' : '&#9;'));

/**
 * Changes attributes of an opening tag and leaves the rest of it as it stands.
 *
 * @param tag - from `<` to `>`
 * @param changes - new values by full attribute name; null takes the attribute away
 * @example
 * tagText('<col min="1" max="1"/>', { width: '12' }) // => '<col min="1" max="1" width="12"/>'
 */
export function tagText(tag: string, changes: Readonly<Record<string, string | null>>): string {
  let text = tag;
  for (const [name, value] of Object.entries(changes)) {
    const pattern = new RegExp(`\\s+${name}\\s*=\\s*(?:"[^"]*"|'[^']*')`);
    const written = value === null ? '' : ` ${name}="${attributeText(value)}"`;
    if (pattern.test(text)) text = text.replace(pattern, () => written);
    else text = text.replace(/\s*\/?>$/, (end) => written + end.trimStart());
  }
  return text;
}

/** The same tag, open instead of closed in itself. */
export const openTag = (tag: string): string => tag.replace(/\s*\/>$/, '>');

/** The name of a tag with its prefix. */
export const tagName = (tag: string): string => /^<([^\s/>]+)/.exec(tag)?.[1] ?? '';
