import { fisherFAbove } from '../statistics/fisherFAbove';
import type { Curvature } from './fitTypes';
import { BLOCK } from './lineSums';
import type { LineSolution } from './solveLine';

/**
 * Tests a straight line for curvature: the second orthogonal polynomial of the data's own temperatures,
 * q = d² − (Σd³/Σd²) d − Σd²/n with d = T − T̄, is fitted to the residuals.
 *
 * c = Σqr/Σq², u(c)² = (Σr² − c²Σq²)/((n − 3) Σq²), F = (c/u(c))² on 1 and n − 3 degrees of freedom.
 *
 * @source G. E. Forsythe, J. Soc. Indust. Appl. Math. 5 (1957) 74
 */
export function bendOf(x: Float64Array, y: Float64Array, line: LineSolution): Curvature | undefined {
  const n = x.length;
  if (n < 4) return undefined;
  const { centre, spread } = line;
  let cubes = 0;
  for (let start = 0; start < n; start += BLOCK) cubes += cubesOf(x, start, Math.min(n, start + BLOCK), centre);
  const shape: Shape = {
    centre,
    tilt: cubes / spread,
    level: spread / n,
    latent: line.centreLatent,
    slope: line.slope + line.slopeRest,
  };
  const sums: BendSums = { norm: 0, product: 0, squares: 0, fourths: 0 };
  for (let start = 0; start < n; start += BLOCK) addBend(x, y, start, Math.min(n, start + BLOCK), shape, sums);
  const { norm, product, squares, fourths } = sums;
  // Two different temperatures (or two tight groups) make q zero but for rounding, which goes with d².
  if (!(norm > n * 1e-20 * fourths)) return undefined;
  const coefficient = product / norm;
  const degreesOfFreedom = n - 3;
  const left = Math.max(0, squares - coefficient * product);
  const uncertainty = Math.sqrt(left / (degreesOfFreedom * norm));
  const explained = coefficient * product;
  const probability = explained === 0 ? 1 : fisherFAbove((explained * degreesOfFreedom) / left, 1, degreesOfFreedom);
  return { coefficient, uncertainty, degreesOfFreedom, probability };
}

function cubesOf(x: Float64Array, start: number, end: number, centre: number): number {
  let sum = 0;
  for (let i = start; i < end; i++) {
    const d = (x[i] as number) - centre;
    sum += d * d * d;
  }
  return sum;
}

/** The line, and the polynomial that is fitted to what it leaves. */
interface Shape {
  readonly centre: number;
  readonly tilt: number;
  readonly level: number;
  readonly latent: number;
  readonly slope: number;
}

interface BendSums {
  norm: number;
  product: number;
  squares: number;
  fourths: number;
}

function addBend(x: Float64Array, y: Float64Array, start: number, end: number, shape: Shape, sums: BendSums): void {
  const { centre, tilt, level, latent, slope } = shape;
  let norm = 0;
  let product = 0;
  let squares = 0;
  let fourths = 0;
  for (let i = start; i < end; i++) {
    const d = (x[i] as number) - centre;
    const residual = (y[i] as number) - latent - slope * d;
    const dd = d * d;
    const q = dd - tilt * d - level;
    norm += q * q;
    product += q * residual;
    squares += residual * residual;
    fourths += dd * dd;
  }
  sums.norm += norm;
  sums.product += product;
  sums.squares += squares;
  sums.fourths += fourths;
}
