import type { Book, BookCell, BookSheet } from '../book';
import { scanFormula } from './scanFormula';

/**
 * The book without the formulas that the engine can't follow (`E1#`, `@`): these stand in it as their saved values,
 * so that what depends on them is right; where nothing was saved, as `#REF!`.
 */
export function followedBook(book: Book): Book {
  return mapCells(book, (cell) => {
    if (!isUnfollowed(cell)) return cell;
    return { value: cell.value ?? { error: '#REF!' } };
  });
}

/** Puts the formulas back that `followedBook` took out. */
export function withKeptFormulas(calculated: Book, original: Book): Book {
  return {
    ...calculated,
    sheets: calculated.sheets.map((sheet, i): BookSheet => {
      const kept = Object.entries(original.sheets[i]?.cells ?? {}).filter(([, cell]) => isUnfollowed(cell));
      return kept.length === 0 ? sheet : { ...sheet, cells: { ...sheet.cells, ...Object.fromEntries(kept) } };
    }),
  };
}

function isUnfollowed({ formula }: BookCell): boolean {
  if (formula === undefined || !/[#@]/.test(formula)) return false;
  const { spills, intersects } = scanFormula(formula);
  return spills.length > 0 || intersects;
}

function mapCells(book: Book, change: (cell: BookCell) => BookCell): Book {
  return {
    ...book,
    sheets: book.sheets.map((sheet) => ({
      ...sheet,
      cells: Object.fromEntries(Object.entries(sheet.cells).map(([address, cell]) => [address, change(cell)])),
    })),
  };
}
