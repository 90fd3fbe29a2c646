import { onScale, type UnitWriter } from '../facts/unitWriter';
import type { Diagram } from './diagramOf';
import { pixelX, pixelY, type Frame } from './frame';

export interface Pixel {
  readonly x: number;
  readonly y: number;
}

/** Where a state stands in the picture. */
export function pixelOf(frame: Frame, writer: UnitWriter, temperatureK: number, enthalpy: number): Pixel {
  return {
    x: pixelX(frame, onScale(temperatureK, writer.temperature)),
    y: pixelY(frame, onScale(enthalpy, writer.heat)),
  };
}

/** Points along everything drawn, so close that no label slips between two of them. */
export function drawnPixels({ lines, gaps }: Diagram, frame: Frame, writer: UnitWriter): Pixel[] {
  const at = (temperatureK: number, enthalpy: number) => pixelOf(frame, writer, temperatureK, enthalpy);
  return [
    ...lines.flatMap(({ points }) => between(points.map((point) => at(point.temperatureK, point.enthalpy)))),
    ...gaps.flatMap(({ temperatureK, below, above }) => between([at(temperatureK, below), at(temperatureK, above)])),
  ];
}

/** No two points are further apart than this, pixels. */
const CLOSE = 5;

function between(points: readonly Pixel[]): Pixel[] {
  return points.flatMap((point, i) => {
    const next = points[i + 1];
    if (next === undefined) return [point];
    const steps = Math.max(1, Math.ceil(Math.hypot(next.x - point.x, next.y - point.y) / CLOSE));
    return Array.from({ length: steps }, (_, k) => ({
      x: point.x + ((next.x - point.x) * k) / steps,
      y: point.y + ((next.y - point.y) * k) / steps,
    }));
  });
}
