import { plainName } from '../../core/catalogue/plainName';

/**
 * True for the block of substances among the settings of a formula, known by its header: it makes the formula depend on
 * those cells, and sets nothing.
 */
export function isHouseBlock(part: unknown): boolean {
  const head: unknown = Array.isArray(part) ? part[0] : undefined;
  if (!Array.isArray(head) || head.length < 4) return false;
  const words = head.map((cell) => (typeof cell === 'string' ? plainName(cell) : ''));
  return (words.includes('substance') || words.includes('material')) && words.includes('property');
}
