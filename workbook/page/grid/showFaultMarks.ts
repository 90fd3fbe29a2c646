import { InterceptorEffectEnum } from '@univerjs/core';
import { INTERCEPTOR_POINT, SheetInterceptorService } from '@univerjs/sheets';
import { houseStore } from '../../../functions/house/store';
import { houseFaults } from '../cell/houseFaults';
import type { Grid } from './openGrid';

const MARK = { color: '#c0392b', size: 7 };

/** Marks the cells for which a row of the team's own substances can't be read, so that a slip is seen where it was typed. */
export function showFaultMarks(grid: Grid): void {
  const kept = new Map<string, ReadonlySet<string>>();
  const marked = (sheetId: string): ReadonlySet<string> => {
    const before = kept.get(sheetId);
    if (before !== undefined) return before;
    const places = [...houseFaults(grid, sheetId)].flatMap(([row, faults]) =>
      faults.map(({ column }) => `${row} ${column}`),
    );
    const now = new Set(places);
    kept.set(sheetId, now);
    return now;
  };
  houseStore.subscribe((state) => {
    kept.clear();
    if (state.state === 'ready') grid.workbook().getActiveSheet().refreshCanvas();
  });
  grid.injector.get(SheetInterceptorService).intercept(INTERCEPTOR_POINT.CELL_CONTENT, {
    id: 'latentry-house-faults',
    effect: InterceptorEffectEnum.Style,
    handler: (cell, { subUnitId, row, col }, next) => {
      const places = marked(subUnitId);
      if (places.size === 0 || !places.has(`${row} ${col}`)) return next(cell);
      return next({ ...cell, markers: { ...cell?.markers, tr: MARK } });
    },
  });
}
