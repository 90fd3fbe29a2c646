import { formatArea, parseArea, parseReference, type Area } from '../../taskpane/hosts/address';
import type { Cell } from '../../taskpane/port';
import type { Book } from '../book';

/** A block of cells that a name of workbook scope leads to; without an area where the name leads to none. */
export type NamedBlock =
  | { readonly name: string; readonly area: Area; readonly values: readonly (readonly Cell[])[] }
  | { readonly name: string; readonly area?: undefined; readonly text: string };

/** Finds a named block in a book; `undefined` where there is no such name. */
export function namedBlock(book: Book, wanted: string): NamedBlock | undefined {
  const name = book.names.find((each) => each.sheet === undefined && each.name.toLowerCase() === wanted);
  if (name === undefined) return undefined;
  const ref = parseReference(name.formula);
  const area = parseArea(ref?.address ?? '');
  const sheet = book.sheets.find((each) => each.name.toLowerCase() === ref?.sheet.toLowerCase());
  if (area === null || sheet === undefined) return { name: name.name, text: name.formula };
  const values = Array.from({ length: area.rows }, (_row, r) =>
    Array.from({ length: area.columns }, (_column, c) => {
      const at = formatArea({ top: area.top + r, left: area.left + c, rows: 1, columns: 1 });
      return sheet.cells[at]?.value ?? null;
    }),
  );
  return { name: name.name, area, values };
}

/** A cell as the functions bundle takes it. */
export function handedOver(value: Cell): unknown {
  return typeof value === 'object' && value !== null ? { code: value.error } : value;
}
