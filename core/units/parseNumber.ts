/** Decimal separators that a workbook can use. */
export type Decimal = '.' | ',';

/** A number at the head of a text and what follows it, or the likely spellings of one that has two readings. */
export type ReadNumber =
  | { readonly value: number; readonly rest: string }
  | { readonly value?: undefined; readonly likely: readonly string[] };

const HEAD = /^([+-]? ?)((?:\d{1,3}(?: \d{3})+(?!\d)|\d*)(?:[.,]\d*)*)(?:e([+-]?\d+)|\*10\^?([+-]?\d+))? ?/i;

/**
 * Reads the number that a plain text starts with. Digits may be grouped by spaces; a comma or a point that is not the
 * workbook's decimal separator has two readings and is refused.
 *
 * @param plain a text as `plainText` leaves it
 * @param decimal the decimal separator in force
 * @returns `undefined` where the text does not start with a number
 */
export function parseNumber(plain: string, decimal: Decimal): ReadNumber | undefined {
  const head = HEAD.exec(plain);
  const [all = '', sign = '', digits = '', exponent, tens] = head ?? [];
  if (head === null || !/\d/.test(digits)) return undefined;
  const rest = plain.slice(all.length);
  const marks = digits.replace(/[\d ]/g, '');
  if (marks.length > 1 || (marks !== '' && marks !== decimal)) return { likely: likely(plain, digits, marks, decimal) };
  const power = exponent ?? tens;
  const text = `${sign.trim()}${digits.replace(/ /g, '').replace(',', '.')}${power === undefined ? '' : `e${power}`}`;
  const value = Number(text);
  return Number.isFinite(value) ? { value, rest } : undefined;
}

/** Without the marks where they can be parting thousands, and with the last of them as the decimal separator. */
function likely(plain: string, digits: string, marks: string, decimal: Decimal): readonly string[] {
  const write = (number: string): string => plain.replace(digits, number);
  const last = Math.max(digits.lastIndexOf('.'), digits.lastIndexOf(','));
  const whole = digits.slice(0, last).replace(/[., ]/g, '');
  const decimals = digits.slice(last + 1);
  const one = new Set(marks).size === 1;
  const grouped = one && digits.split(/[.,]/).every((part, i) => (i === 0 ? /^\d{1,3}$/ : /^\d{3}$/).test(part));
  const spellings = grouped ? [write(digits.replace(/[.,]/g, ''))] : [];
  if (marks.length === 1 || !one) spellings.push(write(`${whole}${decimal}${decimals}`));
  return spellings;
}
