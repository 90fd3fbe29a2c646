import { number } from '../../look/number';
import type { UnitWriter } from '../facts/unitWriter';
import type { Diagram, DiagramLine } from './diagramOf';
import { drawnPixels, pixelOf, type Pixel } from './drawnPixels';
import type { Frame } from './frame';
import { placeLabels, type LabelArea, type LabelPlace, type PlacedLabel, type WantedLabel } from './placeLabels';

/** Pixels between a label and what it names. */
const OFF = 9;

/** The names in the picture: transitions with their latent heats, phases with their mean slopes, dashed continuations. */
export function labelsOf(diagram: Diagram, frame: Frame, writer: UnitWriter): PlacedLabel[] {
  const { heat, heatCapacity, decimal } = writer;
  const at = (temperatureK: number, enthalpy: number): Pixel => pixelOf(frame, writer, temperatureK, enthalpy);
  const pixels = (line: DiagramLine) => line.points.map((point) => at(point.temperatureK, point.enthalpy));
  const gaps = diagram.gaps.map(({ change, temperatureK, below, above }): WantedLabel => {
    const middle = at(temperatureK, (below + above) / 2);
    return {
      texts: gapTexts(change, (above - below) * heat.scale, decimal),
      role: 'transition',
      places: besideGap(middle, Math.abs(at(temperatureK, above).y - at(temperatureK, below).y) / 2),
    };
  });
  const phase = (line: DiagramLine): WantedLabel => {
    const slope = meanSlope(line);
    const digits =
      slope === undefined ? '' : `, ${number(Number((slope * heatCapacity.scale).toPrecision(3)), decimal)}`;
    return {
      texts: digits === '' ? [line.name] : [`${line.name}${digits}`, line.name],
      role: 'phase',
      places: alongLine(pixels(line)),
    };
  };
  const stable = diagram.lines.filter((line) => line.stable);
  const dashed = diagram.lines.filter((line) => !line.stable);
  const beyond = [...new Set(dashed.map(({ name }) => name))].map((name): WantedLabel => {
    const own = dashed.filter((line) => line.name === name).sort((a, b) => spanOf(b) - spanOf(a));
    return { texts: [name], role: 'beyond', places: own.flatMap((line) => alongLine(pixels(line))) };
  });
  return placeLabels([...gaps, ...stable.map(phase), ...beyond], labelArea(frame), drawnPixels(diagram, frame, writer));
}

/** A change without a gap, where only the slope changes, says no number. */
function gapTexts(change: string, latent: number, decimal: '.' | ','): string[] {
  const digits = Number(latent.toPrecision(4));
  return Math.abs(digits) < 1e-6 ? [change] : [`${change} ${number(digits, decimal)}`, change];
}

/** Where names may stand: inside the frame, and a little over its right edge. */
export function labelArea({ left, width, top, height, bottom }: Frame): LabelArea {
  return { left: left + 2, right: width - 2, top, bottom: height - bottom };
}

function spanOf({ points }: DiagramLine): number {
  return (points.at(-1)?.temperatureK ?? 0) - (points[0]?.temperatureK ?? 0);
}

/** Mean slope over what is shown, J/(mol K). */
function meanSlope({ points }: DiagramLine): number | undefined {
  const [first, last] = [points[0], points.at(-1)];
  if (first === undefined || last === undefined || last.temperatureK === first.temperatureK) return undefined;
  return (last.enthalpy - first.enthalpy) / (last.temperatureK - first.temperatureK);
}

function besideGap({ x, y }: Pixel, half: number): LabelPlace[] {
  const heights = [0, 0.5 * half, -0.5 * half, half + OFF, -half - OFF, 0.8 * half, -0.8 * half];
  return heights.flatMap((up) => [
    { x: x + OFF, y: y - up, anchor: 'start' as const },
    { x: x - OFF, y: y - up, anchor: 'end' as const },
  ]);
}

/** Above and below the line, at its middle, its quarters and its ends. */
function alongLine(points: readonly Pixel[]): LabelPlace[] {
  return [0.5, 0.3, 0.7, 0.1, 0.9, 0, 1].flatMap((share) => {
    const point = points[Math.round(share * (points.length - 1))];
    if (point === undefined) return [];
    return [1.3, -1.3, 1.8, -1.8, 2.3, -2.3].flatMap((off) => [
      { x: point.x, y: point.y + off * OFF, anchor: 'middle' as const },
      { x: point.x - 4, y: point.y + off * OFF, anchor: 'end' as const },
      { x: point.x + 4, y: point.y + off * OFF, anchor: 'start' as const },
    ]);
  });
}
