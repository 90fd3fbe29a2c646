import { dot, line, plot } from '@observablehq/plot';
import type { ChartSpec } from '../../../taskpane/port';
import type { ChartPoint } from './chartPoints';
import { CHART_HEIGHT_PX, CHART_WIDTH_PX } from './chartSize';

const INKS = ['#205546', '#b25a14', '#33454a', '#7a3d8f'];
const style = { background: 'transparent', color: '#33454a', fontFamily: 'inherit', fontSize: '12px' };

/** Draws a chart's series as points and lines over one pair of axes. */
export function drawChart(spec: ChartSpec, series: readonly (readonly ChartPoint[])[]): SVGSVGElement | HTMLElement {
  const marks = spec.series.map(({ draw, label }, i) => {
    const data = [...(series[i] ?? [])];
    const ink = INKS[i % INKS.length] ?? '#205546';
    const title = ({ x, y }: ChartPoint) => `${label}: ${x}, ${y}`;
    return draw === 'points'
      ? dot(data, { x: 'x', y: 'y', r: 3, fill: ink, title })
      : line(
          data.sort((a, b) => a.x - b.x),
          { x: 'x', y: 'y', stroke: ink, strokeWidth: 2 },
        );
  });
  const picture = plot({
    width: CHART_WIDTH_PX - 24,
    height: CHART_HEIGHT_PX - 56,
    marginLeft: 56,
    marginBottom: 40,
    marginTop: 24,
    style,
    x: { label: spec.xLabel, labelArrow: 'none', labelAnchor: 'center', inset: 6 },
    y: { label: spec.yLabel, labelArrow: 'none', grid: true, inset: 6 },
    marks,
  });
  picture.setAttribute('role', 'img');
  picture.setAttribute('aria-label', `${spec.title}: ${spec.yLabel} against ${spec.xLabel}`);
  return picture;
}
