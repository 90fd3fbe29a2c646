import { useEffect, useRef } from 'react';
import type { ChartSpec } from '../../../taskpane/port';
import type { ChartPoint } from './chartPoints';

export interface ChartFrameProps {
  readonly spec: ChartSpec;
  readonly read: () => (readonly ChartPoint[])[];
  /** Calls back whenever the cells may hold other numbers. */
  readonly subscribe: (changed: () => void) => () => void;
}

/** A chart over the grid that follows its cells. */
export function ChartFrame({ spec, read, subscribe }: ChartFrameProps) {
  const frame = useRef<HTMLDivElement>(null);
  useEffect(() => {
    let gone = false;
    const draw = async () => {
      const { drawChart } = await import('./drawChart');
      if (!gone) frame.current?.replaceChildren(drawChart(spec, read()));
    };
    const redraw = () => {
      draw().catch((error: unknown) => {
        const text = error instanceof Error ? error.message : String(error);
        frame.current?.replaceChildren(`The chart can't be drawn: ${text}`);
      });
    };
    redraw();
    const stop = subscribe(redraw);
    return () => {
      gone = true;
      stop();
    };
  }, [spec, read, subscribe]);
  return (
    <figure className="chart">
      <figcaption>{spec.title}</figcaption>
      <div ref={frame} />
    </figure>
  );
}
