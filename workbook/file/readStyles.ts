import type { BookStyle } from '../book';
import { BUILTIN_FORMATS } from './builtinFormats';
import { unescapeText } from './escapeXml';
import { sameLook } from './sameLook';
import { colorOf } from './themeColors';
import { type XmlNode, child, childrenOf } from './xmlTree';

/** Named cell styles of ours start so. */
export const STYLE_PREFIX = 'Latentry ';

/** How a cell points at a look. */
export interface StyleKey {
  readonly style?: string;
  readonly format?: string;
}

export interface FileStyles {
  /** What each `s="n"` means. */
  readonly keys: readonly StyleKey[];
  readonly styles: Readonly<Record<string, BookStyle>>;
}

/**
 * Reads the looks of a workbook. A look that belongs to one of our named styles keeps that name as its key, with the
 * number format apart; any other is `x` and its index in the file.
 *
 * @param root - root of the styles part
 * @param theme - colours from `themeColors`
 */
export function readStyles(root: XmlNode, theme: readonly string[]): FileStyles {
  const formats = new Map(
    childrenOf(child(root, 'numFmts'), 'numFmt').map((node) => [
      Number(node.attributes['numFmtId']),
      unescapeText(node.attributes['formatCode'] ?? 'General'),
    ]),
  );
  const fonts = childrenOf(child(root, 'fonts'), 'font');
  const fills = childrenOf(child(root, 'fills'), 'fill');
  const borders = childrenOf(child(root, 'borders'), 'border');
  const read = (xf: XmlNode): BookStyle => {
    const of = (list: readonly XmlNode[], key: string) => list[Number(xf.attributes[key] ?? 0)];
    const id = Number(xf.attributes['numFmtId'] ?? 0);
    const format = formats.get(id) ?? BUILTIN_FORMATS[id] ?? 'General';
    return {
      ...(format === 'General' ? {} : { format }),
      ...readFont(of(fonts, 'fontId'), fonts[0], theme),
      ...readFill(of(fills, 'fillId'), theme),
      ...readBorder(of(borders, 'borderId'), theme),
      ...readAlignment(child(xf, 'alignment')),
    };
  };
  const named = new Map<number, { key: string; look: BookStyle }>();
  const baseLooks = childrenOf(child(root, 'cellStyleXfs'), 'xf');
  for (const node of childrenOf(child(root, 'cellStyles'), 'cellStyle')) {
    const name = unescapeText(node.attributes['name'] ?? '');
    const base = baseLooks[Number(node.attributes['xfId'])];
    if (name.startsWith(STYLE_PREFIX) && base !== undefined) {
      named.set(Number(node.attributes['xfId']), { key: name.slice(STYLE_PREFIX.length), look: read(base) });
    }
  }
  const styles: Record<string, BookStyle> = {};
  for (const { key, look } of named.values()) styles[key] = look;
  const keys = childrenOf(child(root, 'cellXfs'), 'xf').map((xf, index): StyleKey => {
    const look = read(xf);
    const { format, ...bare } = look;
    const known = named.get(Number(xf.attributes['xfId'] ?? 0));
    if (known !== undefined && sameLook(bare, withoutFormat(known.look))) {
      return format === known.look.format ? { style: known.key } : { style: known.key, format: format ?? 'General' };
    }
    if (Object.keys(bare).length === 0) return format === undefined ? {} : { format };
    styles[`x${index}`] = look;
    return { style: `x${index}` };
  });
  return { keys, styles };
}

const withoutFormat = ({ format: _format, ...look }: BookStyle): BookStyle => look;

/** Only what differs from the book's standard font counts as a look. */
function readFont(font: XmlNode | undefined, standard: XmlNode | undefined, theme: readonly string[]): BookStyle {
  const on = (name: string) =>
    font !== undefined && child(font, name) !== undefined && child(font, name)?.attributes['val'] !== '0';
  const sizeOf = (node: XmlNode | undefined) => Number(child(node, 'sz')?.attributes['val'] ?? 11);
  const color = colorOf(child(font, 'color'), theme);
  return {
    ...(on('b') ? { bold: true } : {}),
    ...(on('i') ? { italic: true } : {}),
    ...(sizeOf(font) === sizeOf(standard) ? {} : { size: sizeOf(font) }),
    ...(color === undefined || color === colorOf(child(standard, 'color'), theme) ? {} : { color }),
  };
}

function readFill(fill: XmlNode | undefined, theme: readonly string[]): BookStyle {
  const pattern = child(fill, 'patternFill');
  if (pattern?.attributes['patternType'] !== 'solid') return {};
  const color = colorOf(child(pattern, 'fgColor'), theme);
  return color === undefined ? {} : { fill: color };
}

function readBorder(border: XmlNode | undefined, theme: readonly string[]): BookStyle {
  const line = (side: string) => {
    const node = child(border, side);
    return node?.attributes['style'] === undefined ? undefined : (colorOf(child(node, 'color'), theme) ?? '000000');
  };
  const bottom = line('bottom');
  if (bottom === undefined) return {};
  const rest = ['left', 'right', 'top'].map(line);
  if (rest.every((color) => color === bottom)) return { box: bottom };
  return rest.every((color) => color === undefined) ? { under: bottom } : {};
}

function readAlignment(node: XmlNode | undefined): BookStyle {
  const { horizontal, vertical, wrapText } = node?.attributes ?? {};
  return {
    ...(horizontal === 'left' || horizontal === 'center' || horizontal === 'right' ? { align: horizontal } : {}),
    ...(vertical === 'top' || vertical === 'center' ? { valign: vertical } : {}),
    ...(wrapText === '1' || wrapText === 'true' ? { wrap: true } : {}),
  };
}
