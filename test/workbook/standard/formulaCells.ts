import type { Book } from '../../../workbook/book';

export { callsOurs } from '../../../workbook/file/formulaText';

/** Every cell of a book that holds a formula. */
export const formulaCells = (book: Book) =>
  book.sheets.flatMap((sheet) =>
    Object.entries(sheet.cells).flatMap(([address, { formula, value, spill }]) =>
      formula === undefined ? [] : [{ sheet: sheet.name, address, formula, value, spill }],
    ),
  );
