/** Powers of τ = 1 − T/Tc in the heat of vaporization: thirds near the critical point, whole ones below. */
export const LATENT_POWERS = [1 / 3, 2 / 3, 1, 2, 4, 8] as const;

export type LatentTerms = readonly [number, number, number, number, number, number];

/** Heat of vaporization along the saturation line, divided by R·Tc. */
export function reducedLatent(a: LatentTerms, t: number): number {
  const x = 1 - t;
  const third = Math.cbrt(x);
  const x2 = x * x;
  const x4 = x2 * x2;
  return third * (a[0] + third * (a[1] + third * a[2])) + x2 * a[3] + x4 * (a[4] + x4 * a[5]);
}

/** Its derivative with the reduced temperature. */
export function reducedLatentSlope(a: LatentTerms, t: number): number {
  const x = 1 - t;
  const third = Math.cbrt(x);
  const x3 = x * x * x;
  return -((a[0] / third + 2 * a[1]) / third / 3 + a[2] + 2 * x * a[3] + x3 * (4 * a[4] + 8 * x3 * x * a[5]));
}
