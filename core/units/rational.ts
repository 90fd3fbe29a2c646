/** An exact fraction; `d` is positive. */
export interface Rational {
  readonly n: bigint;
  readonly d: bigint;
}

export const ONE: Rational = { n: 1n, d: 1n };
export const ZERO: Rational = { n: 0n, d: 1n };

/** Reads `3`, `-5/9`. */
export function rationalOf(text: string): Rational {
  const [n = '0', d = '1'] = text.split('/');
  return { n: BigInt(n), d: BigInt(d) };
}

export function times(a: Rational, b: Rational): Rational {
  return { n: a.n * b.n, d: a.d * b.d };
}

export function minus(a: Rational, b: Rational): Rational {
  return { n: a.n * b.d - b.n * a.d, d: a.d * b.d };
}

/** `a` to a whole power; `a` is positive. */
export function power(a: Rational, exponent: number): Rational {
  const times = BigInt(Math.abs(exponent));
  return exponent < 0 ? { n: a.d ** times, d: a.n ** times } : { n: a.n ** times, d: a.d ** times };
}

/** The double nearest to a fraction. */
export function doubleOf({ n, d }: Rational): number {
  const size = n < 0n ? -n : n;
  if (size <= EXACT && d <= EXACT) return Number(n) / Number(d);
  const shift = 64 + bits(d) - bits(size);
  const [top, bottom] = shift >= 0 ? [size << BigInt(shift), d] : [size, d << BigInt(-shift)];
  // 64 or 65 bits; the last one keeps what was cut off, so that the conversion rounds once.
  const quotient = (top / bottom) | (top % bottom === 0n ? 0n : 1n);
  return (n < 0n ? -1 : 1) * Number(quotient) * 2 ** -shift;
}

const EXACT = BigInt(Number.MAX_SAFE_INTEGER);

function bits(value: bigint): number {
  return value.toString(2).length;
}
