import { fisherFAbove } from '../statistics/fisherFAbove';
import type { Curvature } from './fitTypes';
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
  for (let i = 0; i < n; i++) {
    const d = (x[i] as number) - centre;
    cubes += d * d * d;
  }
  const tilt = cubes / spread;
  const level = spread / n;
  const slope = line.slope + line.slopeRest;
  let norm = 0;
  let product = 0;
  let squares = 0;
  let fourths = 0;
  for (let i = 0; i < n; i++) {
    const d = (x[i] as number) - centre;
    const residual = (y[i] as number) - line.centreLatent - slope * d;
    const q = d * d - tilt * d - level;
    norm += q * q;
    product += q * residual;
    squares += residual * residual;
    fourths += d * d * d * d;
  }
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
