/**
 * The bare least-squares line: everything that a description of the fit is made from, in the units of the data.
 * `slope + slopeRest` and `centreLatent + centreRest` carry the digits that one number cannot hold.
 */
export interface LineSolution {
  readonly count: number;
  /** Mean of the temperatures, where slope and value of the line are uncorrelated. */
  readonly centre: number;
  /** Value of the line at the centre. */
  readonly centreLatent: number;
  readonly centreRest: number;
  readonly slope: number;
  readonly slopeRest: number;
  /** Σ(x − x̄)² */
  readonly spread: number;
  /** Σ(residual)² */
  readonly residualSquares: number;
  readonly lowest: number;
  readonly highest: number;
}

/** Partial sums are closed after so many rows, which keeps the rounding of long sums at that of short ones. */
const BLOCK = 1024;

/** 2²⁷ + 1: splits a double into two halves whose products are exact. */
const SPLITTER = 134217729;

/**
 * Straight line by centred least squares with one step of refinement.
 *
 * b₀ = Σ(x − x̄)(y − ȳ)/Σ(x − x̄)², cut to half of its digits; then the residuals from b₀, taken in twice the working
 * precision, are fitted by the same line, and the correction is kept apart from b₀. What is left is the rounding of the
 * residuals, not of the data.
 *
 * @source T. J. Dekker, Numer. Math. 18 (1971) 224 for exact differences and products
 */
export function solveLine(x: Float64Array, y: Float64Array): LineSolution {
  const { meanX, meanY, lowest, highest } = means(x, y);
  const { spread, product } = centredSums(x, y, meanX, meanY);
  const slope = firstHalf(product / spread);
  const rest = residualSums(x, y, meanX, meanY, slope);
  const slopeRest = rest.product / spread;
  const centreRest = rest.sum / x.length;
  const squares = rest.squares - slopeRest * rest.product - centreRest * rest.sum;
  return {
    count: x.length,
    centre: meanX,
    centreLatent: meanY,
    centreRest,
    slope,
    slopeRest,
    spread,
    residualSquares: Math.max(0, squares),
    lowest,
    highest,
  };
}

export function firstHalf(value: number): number {
  const large = SPLITTER * value;
  return large - (large - value);
}

function means(x: Float64Array, y: Float64Array): { meanX: number; meanY: number; lowest: number; highest: number } {
  const n = x.length;
  let sumX = 0;
  let sumY = 0;
  let lowest = x[0] as number;
  let highest = lowest;
  for (let start = 0; start < n; start += BLOCK) {
    const end = Math.min(n, start + BLOCK);
    let blockX = 0;
    let blockY = 0;
    for (let i = start; i < end; i++) {
      const xi = x[i] as number;
      blockX += xi;
      blockY += y[i] as number;
      if (xi < lowest) lowest = xi;
      else if (xi > highest) highest = xi;
    }
    sumX += blockX;
    sumY += blockY;
  }
  return { meanX: sumX / n, meanY: sumY / n, lowest, highest };
}

function centredSums(
  x: Float64Array,
  y: Float64Array,
  meanX: number,
  meanY: number,
): { spread: number; product: number } {
  const n = x.length;
  let spread = 0;
  let product = 0;
  for (let start = 0; start < n; start += BLOCK) {
    const end = Math.min(n, start + BLOCK);
    let blockSpread = 0;
    let blockProduct = 0;
    for (let i = start; i < end; i++) {
      const dx = (x[i] as number) - meanX;
      blockSpread += dx * dx;
      blockProduct += dx * ((y[i] as number) - meanY);
    }
    spread += blockSpread;
    product += blockProduct;
  }
  return { spread, product };
}

/** Sums over r = (y − ȳ) − slope·(x − x̄); `slope` must have no more than half of a double's digits. */
function residualSums(
  x: Float64Array,
  y: Float64Array,
  meanX: number,
  meanY: number,
  slope: number,
): { sum: number; product: number; squares: number } {
  const n = x.length;
  let sum = 0;
  let product = 0;
  let squares = 0;
  for (let start = 0; start < n; start += BLOCK) {
    const end = Math.min(n, start + BLOCK);
    let blockSum = 0;
    let blockProduct = 0;
    let blockSquares = 0;
    for (let i = start; i < end; i++) {
      const xi = x[i] as number;
      const yi = y[i] as number;
      const dx = xi - meanX;
      const backX = dx - xi;
      const lostX = xi - (dx - backX) - (meanX + backX);
      const dy = yi - meanY;
      const backY = dy - yi;
      const lostY = yi - (dy - backY) - (meanY + backY);
      const large = SPLITTER * dx;
      const head = large - (large - dx);
      const tail = dx - head;
      const residual = dy - slope * head - slope * tail + (lostY - slope * lostX);
      blockSum += residual;
      blockProduct += dx * residual;
      blockSquares += residual * residual;
    }
    sum += blockSum;
    product += blockProduct;
    squares += blockSquares;
  }
  return { sum, product, squares };
}
