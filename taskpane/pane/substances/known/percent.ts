/**
 * A share in per cent, two significant digits.
 * @example percent(0.00412) // => "0.41 %"
 */
export function percent(share: number, decimal: '.' | ',' = '.'): string {
  const text = Number((100 * share).toPrecision(2)).toString();
  return `${decimal === ',' ? text.replace('.', ',') : text} %`.replace('-', '−');
}
