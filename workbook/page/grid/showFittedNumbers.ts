import { CellValueType, InterceptorEffectEnum } from '@univerjs/core';
import { INTERCEPTOR_POINT, SheetInterceptorService } from '@univerjs/sheets';
import { fitNumber } from './fitNumber';
import type { Grid } from './openGrid';

const DIGIT_PX = 8.2;
const MARGIN_PX = 6;

/**
 * Answers without a number format are shown rounded to the width of their column, where the grid would cut them off.
 * Typed numbers are left as they are: their cell is edited as it is shown.
 */
export function showFittedNumbers(grid: Grid): void {
  grid.injector.get(SheetInterceptorService).intercept(INTERCEPTOR_POINT.CELL_CONTENT, {
    id: 'latentry-fitted-numbers',
    effect: InterceptorEffectEnum.Value,
    // Rules run from high to low: after that which fills in spilled values (100), before the number formats (10).
    priority: 50,
    handler: (cell, location, next) => {
      const shown = next(cell);
      if (!shown || typeof shown.v !== 'number' || shown.t !== CellValueType.NUMBER) return shown;
      const kept = location.worksheet.getCellRaw(location.row, location.col);
      // A cell that shows a number and keeps none is filled by the formula of another.
      const calculated = Boolean(shown.f ?? shown.si) || kept?.v === undefined || kept.v === null;
      const pattern = location.workbook.getStyles().getStyleByCell(shown)?.n?.pattern;
      if (!calculated || (pattern !== undefined && pattern !== 'General')) return shown;
      const width = location.worksheet.getColumnWidth(location.col);
      const text = fitNumber(shown.v, Math.floor((width - MARGIN_PX) / DIGIT_PX));
      return text.length < String(shown.v).length ? { ...shown, v: text } : shown;
    },
  });
}
