import { monotoneTable } from './monotoneTable';
import type { Shape } from './shape';

/** A two-phase line: pressure in Pa against temperature in K, both ways. */
export interface PressureShape {
  at(temperatureK: number): number;
  inverse(pressurePa: number): number;
}

/**
 * Antoine's equation log₁₀(p/u) = A − B/(C + t), t the temperature on the scale that C belongs to.
 *
 * @param a A
 * @param b B, above zero
 * @param c C
 * @param pascalPerUnit u in Pa
 * @param scale T = factor · t + offset, in K
 * @source C. Antoine, Comptes Rendus 107 (1888) 681
 */
export function antoineShape(
  a: number,
  b: number,
  c: number,
  pascalPerUnit: number,
  scale: { readonly factor: number; readonly offset: number },
): PressureShape {
  const { factor, offset } = scale;
  const shift = a + Math.log10(pascalPerUnit);
  return {
    at: (t) => 10 ** (shift - b / (c + (t - offset) / factor)),
    inverse: (p) => (b / (shift - Math.log10(p)) - c) * factor + offset,
  };
}

/** Points of a two-phase line, interpolated monotonically as ln p against −1/T, in which such a line is nearly straight. */
export function pressureTable(temperaturesK: readonly number[], pressuresPa: readonly number[]): PressureShape {
  const table = monotoneTable(
    temperaturesK.map((t) => -1 / t),
    pressuresPa.map((p) => Math.log(p)),
  );
  const first = -1 / (temperaturesK[0] as number);
  const last = -1 / (temperaturesK[temperaturesK.length - 1] as number);
  return {
    at: (t) => Math.exp(table.at(-1 / t)),
    inverse: (p) => -1 / rootOf(table, Math.log(p), first, last),
  };
}

const MOST_STEPS = 60;

/** Newton's steps, halving the bracket wherever one would leave it. */
function rootOf(line: Shape, wanted: number, first: number, last: number): number {
  let low = first;
  let high = last;
  if (wanted <= line.at(low)) return low + (wanted - line.at(low)) / line.slope(low);
  if (wanted >= line.at(high)) return high + (wanted - line.at(high)) / line.slope(high);
  let x = (low + high) / 2;
  for (let step = 0; step < MOST_STEPS; step++) {
    const miss = line.at(x) - wanted;
    if (miss > 0) high = x;
    else low = x;
    const newton = x - miss / line.slope(x);
    const next = newton > low && newton < high ? newton : (low + high) / 2;
    if (Math.abs(next - x) <= 2e-16 * Math.abs(x)) return next;
    x = next;
  }
  return x;
}
