import { formatArea } from '../../../taskpane/hosts/address';

/** The letters of a zero-based column. */
export function columnLetters(column: number): string {
  return formatArea({ top: 0, left: column, rows: 1, columns: 1 }).slice(0, -1);
}
