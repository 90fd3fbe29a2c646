/** "CO" is carbon monoxide, which only its case parts from cobalt's symbol. */
const CARBON_MONOXIDE = 'carbonmonoxide';

/**
 * Case, spaces, hyphens and underscores do not matter in a name, nor whether figures stand below the line and with which
 * dot water of crystallization is joined on. One formula is told from a symbol by its case: "Co" is cobalt, "CO" is not.
 */
export function plainName(text: string): string {
  const ascii = /^[\x00-\x7f]*$/.test(text)
    ? text
    : text
        .normalize('NFKC')
        .replace(/[·•∙⋅]/g, '.')
        .replace(/[‐-―−]/g, '-');
  const plain = ascii.toLowerCase().replace(/[\s\-_]+/g, '');
  return plain === 'co' && ascii.trim() !== 'Co' ? CARBON_MONOXIDE : plain;
}
