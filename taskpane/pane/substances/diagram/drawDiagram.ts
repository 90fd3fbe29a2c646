import { line, link, plot } from '@observablehq/plot';
import { number } from '../../look/number';
import { onScale, type UnitWriter } from '../facts/unitWriter';
import type { Diagram } from './diagramOf';
import type { Frame } from './frame';

export interface DiagramPicture {
  readonly diagram: Diagram;
  readonly frame: Frame;
  readonly writer: UnitWriter;
  /** What a person who cannot see the picture is told. */
  readonly words: string;
}

const style = {
  background: 'transparent',
  color: 'var(--plotAxis)',
  fontFamily: 'inherit',
  fontSize: '12px',
  overflow: 'visible',
  display: 'block',
  maxWidth: 'none',
};

/** Draws axes, curves and transitions; names and the movable temperature are laid over it. */
export function drawDiagram({ diagram, frame, writer, words }: DiagramPicture): SVGSVGElement | HTMLElement {
  const { temperature, heat, decimal } = writer;
  const tickFormat = (value: number) => number(value, decimal);
  const rows = diagram.lines.map((drawn) => ({
    ...drawn,
    rows: drawn.points.map((point) => ({
      x: onScale(point.temperatureK, temperature),
      y: onScale(point.enthalpy, heat),
    })),
  }));
  const gaps = diagram.gaps.map((gap) => ({
    x: onScale(gap.temperatureK, temperature),
    below: onScale(gap.below, heat),
    above: onScale(gap.above, heat),
  }));
  const svg = plot({
    width: frame.width,
    height: frame.height,
    marginLeft: frame.left,
    marginRight: frame.right,
    marginTop: frame.top,
    marginBottom: frame.bottom,
    style,
    x: {
      domain: [frame.xFrom, frame.xTo],
      label: `T / ${temperature.unit}`,
      labelArrow: 'none',
      labelAnchor: 'center',
      tickFormat,
      ticks: Math.max(3, Math.floor(frame.width / 75)),
    },
    y: {
      domain: [frame.yFrom, frame.yTo],
      label: `h / ${heat.unit}`,
      labelArrow: 'none',
      labelAnchor: 'top',
      tickFormat,
      grid: true,
      ticks: 5,
    },
    marks: [
      ...rows
        .filter(({ stable }) => !stable)
        .map((one) =>
          line(one.rows, { x: 'x', y: 'y', stroke: 'var(--plotPoint)', strokeWidth: 1.4, strokeDasharray: '5 4' }),
        ),
      link(gaps, { x: 'x', y1: 'below', y2: 'above', stroke: 'var(--plotLine)', strokeWidth: 3 }),
      ...rows
        .filter(({ stable }) => stable)
        .map((one) =>
          line(one.rows, { x: 'x', y: 'y', stroke: 'var(--plotPoint)', strokeWidth: 3, strokeLinecap: 'round' }),
        ),
    ],
  });
  for (const group of svg.querySelectorAll('[aria-label]')) group.removeAttribute('aria-label');
  svg.setAttribute('role', 'img');
  svg.setAttribute('aria-label', words);
  return svg;
}
