import type { IStyleData, Nullable } from '@univerjs/core';
import type { Book, BookStyle } from '../../book';
import { bookStyle, gridStyle } from './gridStyle';

/** Finds the book's keys for looks of the grid, and makes new ones where a person changed a look. */
export interface StyleKeys {
  of(data: Nullable<IStyleData>): { readonly style?: string; readonly format?: string };
  /** Every look that has a key, new ones among them. */
  styles(): Record<string, BookStyle>;
}

/** Starts with the keys of the book that was opened. */
export function styleKeys(book: Pick<Book, 'styles'>): StyleKeys {
  const styles: Record<string, BookStyle> = { ...book.styles };
  const known = new Map<string, string>();
  for (const [key, style] of Object.entries(book.styles)) {
    const text = canonical(bookStyle(gridStyle(style)));
    if (!known.has(text)) known.set(text, key);
  }
  let made = 0;
  return {
    of: (data) => {
      if (!data) return {};
      const look = bookStyle(data);
      const text = canonical(look);
      if (text === '{}') return {};
      const same = known.get(text);
      if (same !== undefined) return { style: same };
      const { format, ...rest } = look;
      const bare = canonical(rest);
      if (format !== undefined && bare === '{}') return { format };
      const base = known.get(bare);
      if (base !== undefined && format !== undefined) return { style: base, format };
      do made += 1;
      while (`look${made}` in styles);
      const key = `look${made}`;
      styles[key] = look;
      known.set(text, key);
      return { style: key };
    },
    styles: () => styles,
  };
}

function canonical(style: BookStyle): string {
  return JSON.stringify(Object.fromEntries(Object.entries(style).sort(([a], [b]) => (a < b ? -1 : 1))));
}
