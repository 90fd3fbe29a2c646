/**
 * The text of an XML part in UTF-8 or UTF-16. Whoever writes it back writes UTF-8, so the declaration says so.
 *
 * @param bytes - the part
 * @returns its text without byte order mark
 */
export function decodeXml(bytes: Uint8Array): string {
  const mark = ((bytes[0] ?? 0) << 8) | (bytes[1] ?? 0);
  if (mark !== 0xfffe && mark !== 0xfeff) return new TextDecoder().decode(bytes);
  const text = new TextDecoder(mark === 0xfffe ? 'utf-16le' : 'utf-16be').decode(bytes);
  return text.replace(/^(<\?xml[^>]*?encoding=["'])[^"']*/i, '$1UTF-8');
}
