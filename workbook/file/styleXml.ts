import type { BookStyle } from '../book';

export interface StandardFont {
  /** The `name` element. */
  readonly name: string;
  readonly size: number;
}

/** A font that differs from the standard one, or `''`. */
export function fontXml(look: BookStyle, standard: StandardFont = { name: '', size: 11 }): string {
  if (look.bold === undefined && look.italic === undefined && look.size === undefined && look.color === undefined)
    return '';
  const color = look.color === undefined ? '' : `<color rgb="FF${look.color}"/>`;
  return `<font>${look.bold ? '<b/>' : ''}${look.italic ? '<i/>' : ''}<sz val="${look.size ?? standard.size}"/>${color}${standard.name}</font>`;
}

export const fillXml = (color: string): string =>
  `<fill><patternFill patternType="solid"><fgColor rgb="FF${color}"/><bgColor indexed="64"/></patternFill></fill>`;

/** Thin lines all round or below, or `''`. */
export function borderXml(look: BookStyle): string {
  const line = (side: string, color: string | undefined) =>
    color === undefined ? `<${side}/>` : `<${side} style="thin"><color rgb="FF${color}"/></${side}>`;
  if (look.box === undefined && look.under === undefined) return '';
  const sides = ['left', 'right', 'top'].map((side) => line(side, look.box)).join('');
  return `<border>${sides}${line('bottom', look.box ?? look.under)}<diagonal/></border>`;
}

/** What follows the numbers in an `xf`: the flags that apply them, the alignment, the end of the element. */
export function lookXml(look: BookStyle): string {
  const flags =
    (fontXml(look) === '' ? '' : ' applyFont="1"') +
    (look.fill === undefined ? '' : ' applyFill="1"') +
    (borderXml(look) === '' ? '' : ' applyBorder="1"');
  const alignment =
    (look.align === undefined ? '' : ` horizontal="${look.align}"`) +
    (look.valign === undefined ? '' : ` vertical="${look.valign}"`) +
    (look.wrap === true ? ' wrapText="1"' : '');
  return alignment === '' ? `${flags}/>` : `${flags} applyAlignment="1"><alignment${alignment}/></xf>`;
}
