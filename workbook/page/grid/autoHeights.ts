import { IUndoRedoService, WrapStrategy } from '@univerjs/core';
import type { Grid } from './openGrid';

/** Rows with wrapped text and no height of their own become as high as their text; nothing that a person undoes. */
export function autoHeights(grid: Grid): void {
  const workbook = grid.workbook();
  let steps = 0;
  grid.injector
    .get(IUndoRedoService)
    .undoRedoStatus$.subscribe(({ undos }) => (steps = undos))
    .unsubscribe();
  // The grid counts this as a step of the person's; only where there is none yet can it be forgotten.
  if (steps > 0) return;
  const styles = workbook.getWorkbook().getStyles();
  for (const sheet of workbook.getSheets()) {
    const worksheet = sheet.getSheet();
    const rows = new Set<number>();
    worksheet.getCellMatrix().forValue((row, _column, cell) => {
      if (worksheet.getConfig().rowData[row]?.h !== undefined) return;
      if (styles.getStyleByCell(cell)?.tb === WrapStrategy.WRAP) rows.add(row);
    });
    if (rows.size === 0) continue;
    const endColumn = worksheet.getColumnCount() - 1;
    sheet.setRangesAutoHeight([...rows].map((row) => ({ startRow: row, endRow: row, startColumn: 0, endColumn })));
  }
  grid.injector.get(IUndoRedoService).clearUndoRedo(workbook.getId());
}
