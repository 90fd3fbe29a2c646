import {
  BooleanNumber,
  BorderStyleTypes,
  HorizontalAlign,
  type IStyleData,
  type Nullable,
  VerticalAlign,
  WrapStrategy,
} from '@univerjs/core';
import type { BookStyle } from '../../book';

const across = { left: HorizontalAlign.LEFT, center: HorizontalAlign.CENTER, right: HorizontalAlign.RIGHT };
const down = { top: VerticalAlign.TOP, center: VerticalAlign.MIDDLE, bottom: VerticalAlign.BOTTOM };

const line = (color: string) => ({ s: BorderStyleTypes.THIN, cl: { rgb: `#${color}` } });

/** A look of the book as the grid writes it. */
export function gridStyle(style: BookStyle): IStyleData {
  const { format, bold, italic, size, color, fill, box, under, align, valign, wrap } = style;
  const data: IStyleData = {};
  if (format !== undefined) data.n = { pattern: format };
  if (bold === true) data.bl = BooleanNumber.TRUE;
  if (italic === true) data.it = BooleanNumber.TRUE;
  if (size !== undefined) data.fs = size;
  if (color !== undefined) data.cl = { rgb: `#${color}` };
  if (fill !== undefined) data.bg = { rgb: `#${fill}` };
  if (box !== undefined) data.bd = { t: line(box), r: line(box), b: line(box), l: line(box) };
  if (under !== undefined) data.bd = { ...data.bd, b: line(under) };
  if (align !== undefined) data.ht = across[align];
  if (valign !== undefined) data.vt = down[valign];
  if (wrap === true) data.tb = WrapStrategy.WRAP;
  return data;
}

const nameOf = <K extends string>(names: Readonly<Record<K, number>>, value: Nullable<number>): K | undefined =>
  (Object.keys(names) as K[]).find((name) => names[name] === value);

/** Six hex digits, or undefined for colours of another kind. */
function hex(color: Nullable<{ rgb?: Nullable<string> }>): string | undefined {
  const text = color?.rgb ?? '';
  const long = /^#([0-9a-f]{6})$/i.exec(text)?.[1];
  if (long !== undefined) return long.toUpperCase();
  const parts = /^rgba?\((\d+), *(\d+), *(\d+)/i.exec(text);
  if (parts === null) return undefined;
  return parts
    .slice(1)
    .map((part) => Number(part).toString(16).padStart(2, '0'))
    .join('')
    .toUpperCase();
}

/** What the book can keep of a look on the grid. */
export function bookStyle(data: IStyleData): BookStyle {
  const { b, t } = data.bd ?? {};
  const box = hex(t?.cl);
  const under = hex(b?.cl);
  const found = {
    format: data.n?.pattern,
    bold: data.bl === BooleanNumber.TRUE || undefined,
    italic: data.it === BooleanNumber.TRUE || undefined,
    size: data.fs,
    color: hex(data.cl),
    fill: hex(data.bg),
    box,
    under: under === box ? undefined : under,
    align: nameOf(across, data.ht),
    valign: nameOf(down, data.vt),
    wrap: data.tb === WrapStrategy.WRAP || undefined,
  };
  return Object.fromEntries(Object.entries(found).filter(([, value]) => value !== undefined));
}
