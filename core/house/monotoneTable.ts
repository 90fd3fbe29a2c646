import type { AreaShape } from './shape';

/**
 * Monotone interpolation between points: a cubic for each interval, once continuously differentiable, that rises and
 * falls only where the points do. Beyond its ends it goes on as a straight line.
 *
 * @param x strictly rising, at least two
 * @param y as many values
 * @source F. N. Fritsch and R. E. Carlson, SIAM J. Numer. Anal. 17 (1980) 238; slopes as weighted harmonic means:
 * F. N. Fritsch and J. Butland, SIAM J. Sci. Stat. Comput. 5 (1984) 300
 * @example
 * monotoneTable([0, 1, 2], [0, 1, 4]).at(1) // => 1
 */
export function monotoneTable(x: readonly number[], y: readonly number[]): AreaShape {
  const last = x.length - 1;
  const X = Float64Array.from(x);
  const Y = Float64Array.from(y);
  const m = slopesAt(X, Y);
  const sums = new Float64Array(x.length);
  for (let i = 0; i < last; i++) sums[i + 1] = (sums[i] as number) + part(i, X[i + 1] as number);

  /** The interval a place lies in, −1 below the first point, `last` above the last one. */
  function intervalOf(at: number): number {
    if (at < (X[0] as number)) return -1;
    if (at > (X[last] as number)) return last;
    let low = 0;
    let high = last;
    while (high - low > 1) {
      const middle = (low + high) >> 1;
      if ((X[middle] as number) <= at) low = middle;
      else high = middle;
    }
    return low;
  }

  /** Integral from the start of an interval to a place in it. */
  function part(i: number, to: number): number {
    const h = (X[i + 1] as number) - (X[i] as number);
    const s = (to - (X[i] as number)) / h;
    const y0 = Y[i] as number;
    const dy = (Y[i + 1] as number) - y0;
    const a = h * (m[i] as number);
    const b = h * (m[i + 1] as number);
    return h * s * (y0 + s * (a / 2 + s * ((3 * dy - 2 * a - b) / 3 + (s * (a + b - 2 * dy)) / 4)));
  }

  function areaTo(at: number): number {
    const i = intervalOf(at);
    if (i >= 0 && i < last) return (sums[i] as number) + part(i, at);
    const end = i < 0 ? 0 : last;
    const d = at - (X[end] as number);
    return (sums[end] as number) + d * ((Y[end] as number) + (d * (m[end] as number)) / 2);
  }

  return {
    at(place) {
      const i = intervalOf(place);
      if (i < 0 || i === last) {
        const end = i < 0 ? 0 : last;
        return (Y[end] as number) + (place - (X[end] as number)) * (m[end] as number);
      }
      const h = (X[i + 1] as number) - (X[i] as number);
      const s = (place - (X[i] as number)) / h;
      const y0 = Y[i] as number;
      const dy = (Y[i + 1] as number) - y0;
      const a = h * (m[i] as number);
      const b = h * (m[i + 1] as number);
      return s === 1 ? y0 + dy : y0 + s * (a + s * (3 * dy - 2 * a - b + s * (a + b - 2 * dy)));
    },
    slope(place) {
      const i = intervalOf(place);
      if (i < 0 || i === last) return m[i < 0 ? 0 : last] as number;
      const h = (X[i + 1] as number) - (X[i] as number);
      const s = (place - (X[i] as number)) / h;
      const dy = (Y[i + 1] as number) - (Y[i] as number);
      const a = h * (m[i] as number);
      const b = h * (m[i + 1] as number);
      return (a + s * (2 * (3 * dy - 2 * a - b) + 3 * s * (a + b - 2 * dy))) / h;
    },
    area: (from, to) => areaTo(to) - areaTo(from),
  };
}

function slopesAt(x: Float64Array, y: Float64Array): Float64Array {
  const last = x.length - 1;
  const m = new Float64Array(x.length);
  const h = (i: number): number => (x[i + 1] as number) - (x[i] as number);
  const d = (i: number): number => ((y[i + 1] as number) - (y[i] as number)) / h(i);
  if (last === 1) return m.fill(d(0));
  for (let i = 1; i < last; i++) {
    const before = d(i - 1);
    const after = d(i);
    if (before * after <= 0) continue;
    const w1 = 2 * h(i) + h(i - 1);
    const w2 = h(i) + 2 * h(i - 1);
    m[i] = (w1 + w2) / (w1 / before + w2 / after);
  }
  m[0] = endSlope(h(0), h(1), d(0), d(1));
  m[last] = endSlope(h(last - 1), h(last - 2), d(last - 1), d(last - 2));
  return m;
}

/** One-sided three-point slope, held back where it would overshoot the first interval. */
function endSlope(h0: number, h1: number, d0: number, d1: number): number {
  const m = ((2 * h0 + h1) * d0 - h0 * d1) / (h0 + h1);
  if (m * d0 <= 0) return 0;
  return d0 * d1 <= 0 && Math.abs(m) > 3 * Math.abs(d0) ? 3 * d0 : m;
}
