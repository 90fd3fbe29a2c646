const NUMBER = /-?\d*\.?\d+(?:e[+-]?\d+)?/g;

/** Another machine's rounding may turn the last digit, and a coefficient by this part of itself. */
const ROUNDING = 1e-5;

/** Whether two generated texts have the same words and, to rounding, the same numbers. */
export function sameNumbers(a, b) {
  if (a.replace(NUMBER, '#').replace(/\s+/g, '') !== b.replace(NUMBER, '#').replace(/\s+/g, '')) return false;
  const right = b.match(NUMBER) ?? [];
  return (a.match(NUMBER) ?? []).every((text, i) => {
    const [x, y] = [Number(text), Number(right[i])];
    return Math.abs(x - y) <= Math.max(lastDigit(text), lastDigit(right[i]), ROUNDING * Math.abs(x));
  });
}

function lastDigit(text) {
  const [mantissa, exponent = '0'] = text.split('e');
  const decimals = mantissa.split('.')[1]?.length ?? 0;
  return decimals === 0 && exponent === '0' ? 0 : 1.001 * 10 ** (Number(exponent) - decimals);
}
