/** Figures that a number keeps at least, however narrow its cell. */
const LEAST_FIGURES = 3;

/**
 * A number in the general format as it fits into a cell: rounded to the figures that have room.
 *
 * @param value - the number
 * @param characters - how many characters have room
 * @returns the text; the number itself stays as it is
 * @example
 * fitNumber(2357.6545202949833, 9) // => '2357.6545'
 */
export function fitNumber(value: number, characters: number): string {
  const whole = String(value);
  if (whole.length <= characters) return whole;
  for (let figures = Math.min(15, characters); figures > LEAST_FIGURES; figures--) {
    const text = String(Number(value.toPrecision(figures)));
    if (text.length <= characters) return text;
  }
  return String(Number(value.toPrecision(LEAST_FIGURES)));
}
