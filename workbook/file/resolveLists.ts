import { formatArea, parseArea, parseReference } from '../../taskpane/hosts/address';
import type { BookName, BookSheet } from '../book';

/** More choices than anyone scrolls through; also bounds the work for a hostile rule. */
const MOST_CHOICES = 10_000;

/**
 * Fills in the choices of lists whose rule points at cells, from what those cells show.
 *
 * @param sheets - all sheets of a book
 * @param names - its names, which a rule may use
 */
export function resolveLists(sheets: readonly BookSheet[], names: readonly BookName[]): BookSheet[] {
  const values = (source: string, own: BookSheet): string[] => {
    const named = names.find((name) => name.name.toLowerCase() === source.toLowerCase());
    const ref = parseReference(named?.formula ?? source);
    const sheet = ref === null ? own : sheets.find((each) => each.name.toLowerCase() === ref.sheet.toLowerCase());
    const area = parseArea(ref?.address ?? source);
    if (sheet === undefined || area === null || area.rows * area.columns > MOST_CHOICES) return [];
    const found: string[] = [];
    for (let at = 0; at < area.rows * area.columns; at++) {
      const top = area.top + Math.floor(at / area.columns);
      const left = area.left + (at % area.columns);
      const value = sheet.cells[formatArea({ top, left, rows: 1, columns: 1 })]?.value;
      if (value !== null && value !== undefined && typeof value !== 'object') found.push(String(value));
    }
    return found;
  };
  return sheets.map((sheet) =>
    sheet.lists.every((list) => list.source === undefined)
      ? sheet
      : {
          ...sheet,
          lists: sheet.lists.map((list) =>
            list.source === undefined ? list : { ...list, values: values(list.source.replace(/^=/, ''), sheet) },
          ),
        },
  );
}
