/** Writes a number for reading: six significant digits, a true minus sign, the workbook's decimal separator. */
export function number(value: number, decimal: '.' | ',' = '.'): string {
  const text = Number(value.toPrecision(6)).toString();
  return (decimal === ',' ? text.replace('.', ',') : text).replace(/-/g, '−');
}

/** A unit as a person reads it: `°C` for `degC`, `Δ°F` for `degF difference`; all others as they are. */
export function prettyUnit(symbol: string): string {
  return symbol
    .replace(/^deg([CF]) difference$/, 'Δ°$1')
    .replace(/\bdeg([CFR])\b/g, '°$1')
    .replace(/\b([a-z]+)2\b/g, '$1²')
    .replace(/\b([a-z]+)3\b/g, '$1³');
}
