import type { ChartSeries } from '../../../taskpane/port';
import type { Grid } from '../grid/openGrid';
import { placeOf } from './place';
import { readBlock } from './readBlock';

export interface ChartPoint {
  readonly x: number;
  readonly y: number;
}

/** The pairs of numbers that a series points at now; cells that hold no number are left out. */
export function chartPoints(grid: Grid, { x, y }: ChartSeries): ChartPoint[] {
  const [xs, ys] = [x, y].map((ref) => readBlock(grid, placeOf(grid, ref)).values.flat());
  return (xs ?? []).flatMap((value, i) => {
    const other = ys?.[i];
    return typeof value === 'number' && typeof other === 'number' ? [{ x: value, y: other }] : [];
  });
}
