/** A value as it is shown, and all its digits. */
export interface Shown {
  readonly text: string;
  readonly full: string;
}

/** A true minus sign, and none before a zero. */
const minus = (text: string) =>
  text
    .replace(/^-(?=.*[1-9])/, '−')
    .replace(/^-/, '')
    .replace('e-', 'e−');

/** Smaller numbers are written with a power of ten: nobody counts eight zeros. */
const SMALL = 1e-4;

/** Place of the last digit kept, as a power of ten: two significant digits of the uncertainty. */
function lastPlace(uncertainty: number): number {
  return Math.floor(Math.log10(Number(uncertainty.toPrecision(2)))) - 1;
}

function atPlace(value: number, place: number): string {
  if (place <= -6 && value !== 0 && Math.abs(value) < SMALL) {
    const digits = Math.floor(Math.log10(Math.abs(value))) - place;
    return value.toExponential(Math.min(12, Math.max(0, digits)));
  }
  if (place < -12 || place > 6) return Number(value.toPrecision(6)).toString();
  if (place <= 0) return value.toFixed(-place);
  const step = 10 ** place;
  return String(Math.round(value / step) * step);
}

/**
 * Writes a value with the digits that its standard uncertainty leaves, two of the uncertainty's own.
 * Without an uncertainty: six significant digits. Every digit stays in `full`.
 * @example roundToUncertainty(-44.12345, 0.1234).text // => "−44.12"
 */
export function roundToUncertainty(value: number, uncertainty?: number): Shown {
  const usable = uncertainty !== undefined && Number.isFinite(uncertainty) && uncertainty > 0;
  const text = usable ? atPlace(value, lastPlace(uncertainty)) : Number(value.toPrecision(6)).toString();
  return { text: minus(text), full: minus(String(value)) };
}
