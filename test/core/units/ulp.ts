/** How many doubles apart two numbers of the same sign are. */
export function ulpsBetween(a: number, b: number): number {
  return Number(ordinal(a) > ordinal(b) ? ordinal(a) - ordinal(b) : ordinal(b) - ordinal(a));
}

function ordinal(value: number): bigint {
  const view = new DataView(new ArrayBuffer(8));
  view.setFloat64(0, value);
  const bits = view.getBigInt64(0);
  return bits < 0n ? -(bits & 0x7fffffffffffffffn) : bits;
}

/** A fraction or decimal text as an exact fraction. */
export function exactOfText(text: string): { n: bigint; d: bigint } {
  const [top = '', bottom] = text.split('/');
  if (bottom !== undefined) return { n: BigInt(top), d: BigInt(bottom) };
  const [whole = '', decimals = ''] = top.split('.');
  return { n: BigInt(whole + decimals), d: 10n ** BigInt(decimals.length) };
}
