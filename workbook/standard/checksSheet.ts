import { checks } from '../../functions/checks/checks';
import type { BookCell, BookSheet } from '../book';
import { emptySheet } from '../emptySheet';
import { put, putSpill } from './place';

const HEAD = 4;
/** Many digits where the number is small, four decimals where it is large: nothing clips. */
const VALUE = '[>=100]#,##0.0000;[<=-100]-#,##0.0000;0.000000';
const FORMATS: readonly string[] = ['General', VALUE, VALUE, '0.0E+00', '0.0E+00', 'General', 'General'];

/** Every built-in check value against its published source, in one spilled table with its heading. */
export function checksSheet(): BookSheet {
  const cells: Record<string, BookCell> = {};
  put(cells, 'A1', 'Checks', 'title');
  put(
    cells,
    'A2',
    'The functions against published figures, each with the document it stands in. A FAIL means: do not use this workbook until it is understood.',
    'subtitle',
  );
  const range = `A${HEAD}:${String.fromCharCode(64 + FORMATS.length)}${HEAD + checks.length}`;
  putSpill(cells, range, '=LATENTRY.SELFCHECK()', 'label', 'General');
  FORMATS.forEach((format, i) => {
    const letter = String.fromCharCode(65 + i);
    for (let row = HEAD; row <= HEAD + checks.length; row++) {
      const address = `${letter}${row}`;
      const { value = null, formula, spill } = cells[address] ?? {};
      const style = row === HEAD ? (i > 0 && i < 5 ? 'columnHead' : 'heading') : i === 0 || i > 4 ? 'label' : 'data';
      cells[address] = {
        value,
        ...(formula === undefined || spill === undefined ? {} : { formula, spill }),
        style,
        ...(row === HEAD || format === 'General' ? {} : { format }),
      };
    }
  });
  return {
    ...emptySheet('Checks'),
    cells,
    columnWidths: { A: 16, B: 18, C: 18, D: 12, E: 12, F: 84, G: 84 },
    rowHeights: { '1': 34, '2': 34, [String(HEAD)]: 24 },
    merges: ['A2:G2'],
    freeze: { rows: HEAD, columns: 0 },
    gridLines: false,
    print: { landscape: true, fitWidth: true },
  };
}
