/**
 * A step of 1, 2 or 5 times a power of ten that divides a span into about `parts` parts.
 * @example niceStep(180, 200) // => 1
 */
export function niceStep(span: number, parts: number): number {
  const rough = span / parts;
  if (!(rough > 0) || !Number.isFinite(rough)) return 1;
  const power = 10 ** Math.floor(Math.log10(rough));
  const digit = rough / power;
  if (digit < 1.5) return power;
  if (digit < 3.5) return 2 * power;
  return digit < 7.5 ? 5 * power : 10 * power;
}

/** The multiple of a step that is nearest, without the digits that binary fractions leave behind. */
export function onStep(value: number, step: number): number {
  return Number((Math.round(value / step) * step).toPrecision(12));
}
