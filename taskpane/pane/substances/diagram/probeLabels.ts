import { number } from '../../look/number';
import { onScale, type UnitWriter } from '../facts/unitWriter';
import type { Crossing } from './crossings';
import type { Pixel } from './drawnPixels';
import { pixelX, pixelY, type Frame } from './frame';
import { labelArea } from './labelsOf';
import { placeLabels, type LabelPlace, type PlacedLabel } from './placeLabels';

/** The shortest bracket that has room for its number, and the distance of the number, pixels. */
const LEAST_BRACKET = 11;
const OFF = 8;

/** The heats between neighbouring curves at one temperature, each beside its bracket where no name stands. */
export function probeLabels(
  frame: Frame,
  crossings: readonly Crossing[],
  temperatureK: number,
  { temperature, heat, decimal }: UnitWriter,
  names: readonly PlacedLabel[],
  drawn: readonly Pixel[],
): PlacedLabel[] {
  const x = pixelX(frame, onScale(temperatureK, temperature));
  const wanted = crossings.slice(1).flatMap((upper, i) => {
    const lower = crossings[i] ?? upper;
    const [low, high] = [lower, upper].map(({ enthalpy }) => pixelY(frame, onScale(enthalpy, heat)));
    if (low === undefined || high === undefined || low - high < LEAST_BRACKET) return [];
    const between = number(Number(((upper.enthalpy - lower.enthalpy) * heat.scale).toPrecision(5)), decimal);
    return [{ texts: [between], role: 'probe' as const, places: beside(x, low, high) }];
  });
  return wanted.reduce<PlacedLabel[]>((placed, one) => {
    const clear = placeLabels([one], labelArea(frame), drawn, [...names, ...placed]);
    // A number that has to cross a curve is better than none.
    const found = clear.length > 0 ? clear : placeLabels([one], labelArea(frame), [], [...names, ...placed]);
    return [...placed, ...found];
  }, []);
}

function beside(x: number, low: number, high: number): LabelPlace[] {
  return [0.5, 0.35, 0.65, 0.25, 0.75, 0.15, 0.85].flatMap((share) => {
    const y = low + (high - low) * share;
    return [
      { x: x + OFF, y, anchor: 'start' as const },
      { x: x - OFF, y, anchor: 'end' as const },
    ];
  });
}
