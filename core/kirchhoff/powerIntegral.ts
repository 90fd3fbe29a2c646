/**
 * ∫ T^power dT from one temperature to another, for whole powers, without cancellation between close temperatures.
 *
 * The difference of the two antiderivatives is written with T₂ − T₁ as a factor:
 * (T₂ᵐ − T₁ᵐ)/m = (T₂ − T₁)/m · Σ T₁ⁱ T₂ᵐ⁻¹⁻ⁱ, and ln(T₂/T₁) = log1p((T₂ − T₁)/T₁).
 *
 * @param power whole number
 * @param fromK above 0 K
 * @param toK above 0 K
 * @returns integral in K^(power + 1); turning the ends round turns the sign
 */
export function powerIntegral(power: number, fromK: number, toK: number): number {
  if (toK < fromK) return -powerIntegral(power, toK, fromK);
  const step = toK - fromK;
  if (power === -1) return Math.log1p(step / fromK);
  const order = power + 1;
  const size = Math.abs(order);
  let sum = 0;
  // Positive orders: exponents i and m − 1 − i. Negative ones: −1 − i and i − m.
  for (let i = 0; i < size; i++) {
    sum += order > 0 ? fromK ** i * toK ** (size - 1 - i) : fromK ** (-1 - i) * toK ** (i - size);
  }
  return (step * sum) / size;
}
