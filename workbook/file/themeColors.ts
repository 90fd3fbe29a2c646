import { type XmlNode, child, xmlTree } from './xmlTree';

/** The order in which `theme="n"` counts: the first two pairs are swapped against the part's own order. */
const ORDER = [
  'lt1',
  'dk1',
  'lt2',
  'dk2',
  'accent1',
  'accent2',
  'accent3',
  'accent4',
  'accent5',
  'accent6',
  'hlink',
  'folHlink',
];

/**
 * The twelve colours of a theme part.
 *
 * @param xml - the part, or `''`
 * @param part - its name, for refusals
 * @returns six hex digits each, in the order that `theme="n"` counts
 */
export function themeColors(xml: string, part: string): string[] {
  const scheme = child(child(xmlTree(xml, part), 'themeElements'), 'clrScheme');
  return ORDER.map((name) => {
    const color = child(scheme, name)?.children[0];
    return (color?.attributes['lastClr'] ?? color?.attributes['val'] ?? '000000').toUpperCase();
  });
}

/**
 * A colour element as six hex digits: `rgb`, or `theme` with `tint`. Indexed and automatic colours give undefined.
 *
 * @see ECMA-376 part 1, 18.8.19 (tint: lightness L becomes L·(1 + tint), or L·(1 − tint) + tint)
 */
export function colorOf(node: XmlNode | undefined, theme: readonly string[]): string | undefined {
  const rgb = node?.attributes['rgb'];
  if (rgb !== undefined) return rgb.slice(-6).toUpperCase();
  const base = theme[Number(node?.attributes['theme'] ?? -1)];
  if (base === undefined) return undefined;
  return tinted(base, Number(node?.attributes['tint'] ?? 0));
}

/** Moves each channel with the lightness: hue and saturation stay near enough for a screen. */
function tinted(color: string, tint: number): string {
  const channel = (at: number) => {
    const value = parseInt(color.slice(at, at + 2), 16);
    const moved = tint < 0 ? value * (1 + tint) : value * (1 - tint) + 255 * tint;
    return Math.round(Math.min(255, Math.max(0, moved)))
      .toString(16)
      .padStart(2, '0');
  };
  return (channel(0) + channel(2) + channel(4)).toUpperCase();
}
