const NAMED: Readonly<Record<string, string>> = { '&': '&amp;', '<': '&lt;', '>': '&gt;', '"': '&quot;' };

/**
 * Writes text for XML, in an element or in an attribute. Characters that XML can't hold become `_xHHHH_`, as the
 * workbook format writes them (ECMA-376 part 1, 22.4.2.4), and so does an underscore that would read as one of those.
 *
 * @param text - any text
 * @returns text to stand between tags or double quotes
 * @example
 * escapeXml('a < b') // => 'a &lt; b'
 */
export function escapeXml(text: string): string {
  return text
    .replace(/_(?=x[0-9A-Fa-f]{4}_)/g, '_x005F_')
    .replace(
      /[\u0000-\u0008\u000b-\u001f\ufffe\uffff]|[\ud800-\udbff](?![\udc00-\udfff])|(?<![\ud800-\udbff])[\udc00-\udfff]/g,
      hex,
    )
    .replace(/[&<>"]/g, (c) => NAMED[c] ?? c);
}

const hex = (c: string) => `_x${c.charCodeAt(0).toString(16).toUpperCase().padStart(4, '0')}_`;

/** Reads `_xHHHH_` back. */
export function unescapeText(text: string): string {
  return text.includes('_x')
    ? text.replace(/_x([0-9A-Fa-f]{4})_/g, (_, code: string) => String.fromCharCode(parseInt(code, 16)))
    : text;
}
