/** Exponent of Rackett's equation. */
const POWER = 2 / 7;

/** Volume of a saturated liquid and its derivatives with the reduced temperature, all divided by R·Tc/pc. */
export interface LiquidVolume {
  volume: number;
  first: number;
  second: number;
}

export function emptyLiquidVolume(): LiquidVolume {
  return { volume: NaN, first: NaN, second: NaN };
}

/**
 * Rackett's equation in the form of Spencer and Danner, with the compressibility of Yamada and Gunn.
 *
 * v·pc/(R·Tc) = Z^(1 + τ^(2/7)), Z = 0.29056 − 0.08775·ω
 *
 * @source Spencer & Danner, J. Chem. Eng. Data 17 (1972) 236; Yamada & Gunn, J. Chem. Eng. Data 18 (1973) 234
 */
export function liquidVolume(acentric: number, t: number, out: LiquidVolume): LiquidVolume {
  const log = Math.log(0.29056 - 0.08775 * acentric);
  const x = 1 - t;
  const power = Math.pow(x, POWER);
  const volume = Math.exp(log * (1 + power));
  const g = (-log * POWER * power) / x;
  const gSlope = (-g * (POWER - 1)) / x;
  out.volume = volume;
  out.first = volume * g;
  out.second = volume * (g * g + gSlope);
  return out;
}
