import { parseReference } from '../../../taskpane/hosts/address';
import type { Book, BookName } from '../../book';

/** The grid's word for a name that belongs to the workbook. */
const WHOLE_WORKBOOK = 'AllDefaultWorkbook';

/** What the grid keeps of a name. */
export interface GridName {
  readonly id: string;
  readonly name: string;
  readonly formulaOrRefString: string;
  readonly localSheetId?: string;
  readonly hidden?: boolean;
}

/** The names of a book as the grid keeps them, by their key there. */
export function gridNames(book: Book, sheetIds: readonly string[]): Record<string, GridName> {
  return Object.fromEntries(
    book.names.map(({ name, formula, sheet, hidden }, i) => {
      const at = book.sheets.findIndex((each) => each.name === sheet);
      const id = `name-${i}`;
      const local = sheet === undefined ? WHOLE_WORKBOOK : (sheetIds[at] ?? WHOLE_WORKBOOK);
      return [id, { id, name, formulaOrRefString: nameFormula(formula), localSheetId: local, hidden: hidden ?? false }];
    }),
  );
}

/** References stand bare in the grid, other formulas with their equals sign. */
function nameFormula(formula: string): string {
  return parseReference(formula) === null ? `=${formula}` : formula;
}

/** A name of the grid as the book keeps it. */
export function bookName(entry: GridName, sheetName: (id: string) => string | undefined): BookName {
  const local = entry.localSheetId;
  const sheet = local === undefined || local === WHOLE_WORKBOOK ? undefined : sheetName(local);
  return {
    name: entry.name,
    formula: entry.formulaOrRefString.replace(/^=/, ''),
    ...(sheet === undefined ? {} : { sheet }),
    ...(entry.hidden === true ? { hidden: true } : {}),
  };
}
