import type { Ref } from '../port';

/** A rectangle of cells, counted from zero. */
export interface Area {
  readonly top: number;
  readonly left: number;
  readonly rows: number;
  readonly columns: number;
}

/** The grid that every current workbook has. */
export const SHEET_ROWS = 1_048_576;
export const SHEET_COLUMNS = 16_384;

const CELL = /^\$?([A-Za-z]{1,3})\$?([1-9][0-9]{0,6})$/;

function columnNumber(letters: string): number {
  let n = 0;
  for (const letter of letters.toUpperCase()) n = n * 26 + letter.charCodeAt(0) - 64;
  return n - 1;
}

function columnLetters(column: number): string {
  let letters = '';
  for (let n = column + 1; n > 0; n = Math.floor((n - 1) / 26)) {
    letters = String.fromCharCode(65 + ((n - 1) % 26)) + letters;
  }
  return letters;
}

function parseCell(text: string): { row: number; column: number } | null {
  const match = CELL.exec(text);
  if (match === null) return null;
  const row = Number(match[2]) - 1;
  const column = columnNumber(match[1] ?? '');
  return row < SHEET_ROWS && column < SHEET_COLUMNS ? { row, column } : null;
}

/** Reads `B2`, `$B$2:D9` or `D9:B2`; anything else, whole rows and columns too, is null. */
export function parseArea(address: string): Area | null {
  const parts = address.trim().split(':');
  const first = parseCell(parts[0] ?? '');
  const last = parts.length === 1 ? first : parts.length === 2 ? parseCell(parts[1] ?? '') : null;
  if (first === null || last === null) return null;
  const top = Math.min(first.row, last.row);
  const left = Math.min(first.column, last.column);
  return {
    top,
    left,
    rows: Math.abs(first.row - last.row) + 1,
    columns: Math.abs(first.column - last.column) + 1,
  };
}

/** Writes an area as `B2` or `B2:D9`. */
export function formatArea({ top, left, rows, columns }: Area): string {
  const first = columnLetters(left) + String(top + 1);
  if (rows === 1 && columns === 1) return first;
  return `${first}:${columnLetters(left + columns - 1)}${String(top + rows)}`;
}

/**
 * Reads `'My sheet'!$B$2:$D$9`, with or without the equals sign of a name's formula.
 * Null for anything else: broken references, other workbooks, several areas.
 */
export function parseReference(text: string): Ref | null {
  const match = /^=?(?:'((?:[^'[\]]|'')+)'|([^'!#[\]]+))!([^!]+)$/.exec(text.trim());
  if (match === null) return null;
  const area = parseArea(match[3] ?? '');
  if (area === null) return null;
  return { sheet: (match[1] ?? match[2] ?? '').replace(/''/g, "'"), address: formatArea(area) };
}

/** Writes `Data!B2`, with quotes where the sheet's name needs them. */
export function formatReference({ sheet, address }: Ref): string {
  const plain = /^[\p{L}_][\p{L}\p{N}_]*$/u.test(sheet) && !CELL.test(sheet) && !/^r\d*c\d*$/i.test(sheet);
  return `${plain ? sheet : `'${sheet.replace(/'/g, "''")}'`}!${address}`;
}
