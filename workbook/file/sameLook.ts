import type { BookStyle } from '../book';

/**
 * Whether two looks are equal, whatever the order of their keys.
 *
 * @param a - a look
 * @param b - another
 */
export function sameLook(a: BookStyle | undefined, b: BookStyle | undefined): boolean {
  return text(a) === text(b);
}

const text = (look: BookStyle | undefined): string =>
  look === undefined
    ? ''
    : JSON.stringify(
        Object.entries(look)
          .filter(([, value]) => value !== undefined)
          .sort(([x], [y]) => (x < y ? -1 : 1)),
      );

/** Looks that a file names only by number are not ours to name. */
export const isNamed = (style: string): boolean => style !== '' && !/^x\d+$/.test(style);
