import type { Book, BookCell } from './book';

/**
 * The number format in force for a cell.
 *
 * @param book - the book whose styles count
 * @param cell - one of its cells
 * @returns the cell's own format, else its style's, else `General`
 * @example
 * numberFormatOf(book, { value: 2357.65, format: '0.0' }) // => '0.0'
 */
export function numberFormatOf(book: Pick<Book, 'styles'>, cell: BookCell): string {
  const style = cell.style === undefined ? undefined : book.styles[cell.style];
  return cell.format ?? style?.format ?? 'General';
}
