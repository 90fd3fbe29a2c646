import type { Diagram } from './diagramOf';

/** Where the drawing stands in its picture, in pixels, and which values its edges have, in the units shown. */
export interface Frame {
  readonly width: number;
  readonly height: number;
  readonly left: number;
  readonly right: number;
  readonly top: number;
  readonly bottom: number;
  readonly xFrom: number;
  readonly xTo: number;
  readonly yFrom: number;
  readonly yTo: number;
}

const MARGIN = { left: 54, right: 10, top: 26, bottom: 40 };
/** Air above and below, as a share of the span: room for one name. */
const AIR = 0.09;
export const DIAGRAM_HEIGHT = 300;

/** Turns SI into the units shown. */
export interface DiagramScales {
  readonly x: (temperatureK: number) => number;
  readonly y: (enthalpy: number) => number;
}

/** The frame that holds every point of a diagram, with a little air above and below. */
export function frameOf({ lines, gaps, window }: Diagram, width: number, { x, y }: DiagramScales): Frame {
  const heights = [
    ...lines.flatMap(({ points }) => points.map(({ enthalpy }) => y(enthalpy))),
    ...gaps.flatMap(({ below, above }) => [y(below), y(above)]),
  ];
  const low = Math.min(...heights);
  const high = Math.max(...heights);
  const air = high > low ? AIR * (high - low) : Math.max(1, Math.abs(high) * AIR);
  return {
    ...MARGIN,
    width,
    height: DIAGRAM_HEIGHT,
    xFrom: x(window.fromK),
    xTo: x(window.toK),
    yFrom: low - air,
    yTo: high + air,
  };
}

/** Horizontal place of a value, pixels. */
export function pixelX({ width, left, right, xFrom, xTo }: Frame, value: number): number {
  return left + ((value - xFrom) / (xTo - xFrom)) * (width - left - right);
}

/** Vertical place of a value, pixels from the top. */
export function pixelY({ height, top, bottom, yFrom, yTo }: Frame, value: number): number {
  return height - bottom - ((value - yFrom) / (yTo - yFrom)) * (height - top - bottom);
}

/** The value at a horizontal place, held inside the frame. */
export function valueAtX({ width, left, right, xFrom, xTo }: Frame, pixel: number): number {
  const share = (pixel - left) / (width - left - right);
  return xFrom + Math.min(1, Math.max(0, share)) * (xTo - xFrom);
}
