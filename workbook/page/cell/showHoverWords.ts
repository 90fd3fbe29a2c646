import { CellAlertManagerService, CellAlertType, HoverManagerService } from '@univerjs/sheets-ui';
import { createElement } from 'react';
import { debounceTime } from 'rxjs';
import type { FunctionList } from '../../grid/functionList';
import type { Grid } from '../grid/openGrid';
import { cellInfo } from './cellInfo';

/** The grid's own key for its bare words about an error: ours replace them, and go when they would. */
const KEY = 'SHEET_FORMULA_ALERT';
/** The grid shows its words after 100 ms. */
const AFTER_THE_GRID_MS = 140;

/** Shows the words behind an error cell, or a note, while the pointer rests on the cell. */
export function showHoverWords(grid: Grid, list: FunctionList): void {
  const alerts = grid.injector.get(CellAlertManagerService);
  grid.injector
    .get(HoverManagerService)
    .currentCell$.pipe(debounceTime(AFTER_THE_GRID_MS))
    .subscribe((hovered) => {
      if (!hovered || hovered.location.unitId !== grid.workbook().getId()) return;
      const { unitId, subUnitId, row, col } = hovered.location;
      const { tone, text, title } = cellInfo(grid, list, subUnitId, row, col);
      if (tone === 'plain') return;
      alerts.showAlert({
        type: tone === 'error' ? CellAlertType.ERROR : CellAlertType.INFO,
        title: title ?? (tone === 'error' ? 'No value here' : 'Note'),
        message: createElement('span', { className: 'cell-words' }, text),
        location: { unitId, subUnitId, row, col },
        width: 300,
        height: 74,
        key: KEY,
      });
    });
}
