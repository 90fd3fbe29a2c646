/** Partial sums are closed after so many rows, which keeps the rounding of long sums at that of short ones. */
export const BLOCK = 1024;

/** 2²⁷ + 1: splits a double into two halves whose products are exact. */
const SPLITTER = 134217729;

/** The leading half of a double's digits. */
export function firstHalf(value: number): number {
  const large = SPLITTER * value;
  return large - (large - value);
}

interface Means {
  readonly meanX: number;
  readonly meanY: number;
  readonly lowest: number;
  readonly highest: number;
}

/**
 * Each pass adds up one block of rows in a function of its own: called a thousand times for a million rows, it is
 * compiled at its best within the first call of the fit. Two partial sums keep the adder busy.
 */
export function means(x: Float64Array, y: Float64Array): Means {
  const n = x.length;
  const first = x[0] as number;
  const sums: MeanSums = { x: 0, y: 0, lowest: first, highest: first };
  for (let start = 0; start < n; start += BLOCK) addMeans(x, y, start, Math.min(n, start + BLOCK), sums);
  return { meanX: sums.x / n, meanY: sums.y / n, lowest: sums.lowest, highest: sums.highest };
}

interface MeanSums {
  x: number;
  y: number;
  lowest: number;
  highest: number;
}

function addMeans(x: Float64Array, y: Float64Array, start: number, end: number, sums: MeanSums): void {
  let evenX = 0;
  let evenY = 0;
  let oddX = 0;
  let oddY = 0;
  let { lowest, highest } = sums;
  for (let i = start; i < end - 1; i += 2) {
    const one = x[i] as number;
    const two = x[i + 1] as number;
    evenX += one;
    oddX += two;
    evenY += y[i] as number;
    oddY += y[i + 1] as number;
    if (one < lowest) lowest = one;
    else if (one > highest) highest = one;
    if (two < lowest) lowest = two;
    else if (two > highest) highest = two;
  }
  if ((end - start) % 2 === 1) {
    const last = x[end - 1] as number;
    evenX += last;
    evenY += y[end - 1] as number;
    lowest = Math.min(lowest, last);
    highest = Math.max(highest, last);
  }
  sums.x += evenX + oddX;
  sums.y += evenY + oddY;
  sums.lowest = lowest;
  sums.highest = highest;
}

interface CentredSums {
  spread: number;
  product: number;
}

export function centredSums(x: Float64Array, y: Float64Array, meanX: number, meanY: number): CentredSums {
  const n = x.length;
  const sums = { spread: 0, product: 0 };
  for (let start = 0; start < n; start += BLOCK)
    addCentred(x, y, start, Math.min(n, start + BLOCK), meanX, meanY, sums);
  return sums;
}

function addCentred(
  x: Float64Array,
  y: Float64Array,
  start: number,
  end: number,
  meanX: number,
  meanY: number,
  sums: CentredSums,
): void {
  let evenSpread = 0;
  let evenProduct = 0;
  let oddSpread = 0;
  let oddProduct = 0;
  for (let i = start; i < end - 1; i += 2) {
    const one = (x[i] as number) - meanX;
    const two = (x[i + 1] as number) - meanX;
    evenSpread += one * one;
    oddSpread += two * two;
    evenProduct += one * ((y[i] as number) - meanY);
    oddProduct += two * ((y[i + 1] as number) - meanY);
  }
  if ((end - start) % 2 === 1) {
    const last = (x[end - 1] as number) - meanX;
    evenSpread += last * last;
    evenProduct += last * ((y[end - 1] as number) - meanY);
  }
  sums.spread += evenSpread + oddSpread;
  sums.product += evenProduct + oddProduct;
}

interface ResidualSums {
  sum: number;
  product: number;
  squares: number;
}

/** Sums over r = (y − ȳ) − slope·(x − x̄); `slope` must have no more than half of a double's digits. */
export function residualSums(
  x: Float64Array,
  y: Float64Array,
  meanX: number,
  meanY: number,
  slope: number,
): ResidualSums {
  const n = x.length;
  const sums = { sum: 0, product: 0, squares: 0 };
  for (let start = 0; start < n; start += BLOCK) {
    addResiduals(x, y, start, Math.min(n, start + BLOCK), meanX, meanY, slope, sums);
  }
  return sums;
}

function addResiduals(
  x: Float64Array,
  y: Float64Array,
  start: number,
  end: number,
  meanX: number,
  meanY: number,
  slope: number,
  sums: ResidualSums,
): void {
  let sum = 0;
  let product = 0;
  let squares = 0;
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
    sum += residual;
    product += dx * residual;
    squares += residual * residual;
  }
  sums.sum += sum;
  sums.product += product;
  sums.squares += squares;
}
