import type { Book } from '../book';
import type { XlsxFile } from '../file/readXlsx';

/** The file that the open workbook came from. */
export interface Original {
  readonly bytes: Uint8Array;
  readonly file: XlsxFile;
}

/**
 * Reads a file; the code for it is loaded when it is first needed.
 * @throws Problem for a file that is no workbook or a dangerous one
 */
export async function readWorkbook(bytes: Uint8Array): Promise<Original> {
  const { readXlsx } = await import('../file/readXlsx');
  return { bytes, file: await readXlsx(bytes) };
}

/** The open workbook as a file, cut into the one that it came from. */
export async function writeWorkbook(book: Book, original: Original | undefined): Promise<Uint8Array> {
  const { writeXlsx } = await import('../file/writeXlsx');
  return writeXlsx(book, original?.file);
}
