/** Vapour-pressure terms of Ambrose and Walton for an acentric factor. */
export function ambroseWalton(w) {
  return [
    -5.97616 - 5.03365 * w - 0.64771 * w * w,
    1.29874 + 1.11505 * w + 2.41539 * w * w,
    -0.60394 - 5.41217 * w - 4.26979 * w * w,
    -1.06841 - 7.46628 * w + 3.25259 * w * w,
    0,
  ];
}

/** Latent heat of corresponding states after Lee and Kesler with Ambrose and Walton's line, divided by R·Tc. */
export function latentOfCorrespondingStates(models, w, t) {
  const p = Math.exp(models.lnReducedPressure(ambroseWalton(w), t));
  const out = models.emptyDeparture();
  if (!models.vapourDeparture(t, p, w, 0, 0, out)) return undefined;
  const liquid = models.liquidVolume(w, t, models.emptyLiquidVolume());
  const gap = out.compressibility - (p * liquid.volume) / t;
  return gap * models.lnPressureSlope(ambroseWalton(w), t) * t * t;
}
