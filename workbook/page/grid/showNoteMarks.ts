import { INTERCEPTOR_POINT, SheetInterceptorService } from '@univerjs/sheets';
import { InterceptorEffectEnum } from '@univerjs/core';
import type { Grid } from './openGrid';

const MARK = { color: '#b25a14', size: 6 };

/** Marks cells that carry a note in their upper right corner. */
export function showNoteMarks(grid: Grid): void {
  grid.injector.get(SheetInterceptorService).intercept(INTERCEPTOR_POINT.CELL_CONTENT, {
    id: 'latentry-notes',
    effect: InterceptorEffectEnum.Style,
    handler: (cell, location, next) => {
      const note: unknown = location.rawData?.custom?.['note'];
      if (typeof note !== 'string' || !cell) return next(cell);
      return next({ ...cell, markers: { ...cell.markers, tr: MARK } });
    },
  });
}
