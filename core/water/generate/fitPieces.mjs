/** Points a piece: many more than coefficients, so that the rounding of the full solution is averaged out. */
const POINTS = 48;

/**
 * Fits Chebyshev series to a function on neighbouring pieces and makes them meet at the borders.
 *
 * The series is the truncated discrete Chebyshev transform at the roots of T_48; at each border both neighbours are
 * moved to the mean of their ends by their first two coefficients. Coefficients are rounded to whole steps.
 */
export function fitPieces(of, bounds, terms) {
  const series = bounds.map(([from, to]) => truncatedSeries(of, from, to, terms));
  const end = (s, x) => evaluate(s, x);
  const left = series.map((s) => end(s, -1));
  const right = series.map((s) => end(s, 1));
  for (let i = 0; i < series.length; i++) {
    const atLeft = i === 0 ? 0 : 0.5 * (right[i - 1] - left[i]);
    const atRight = i + 1 === series.length ? 0 : 0.5 * (left[i + 1] - right[i]);
    series[i][0] += 0.5 * (atLeft + atRight);
    series[i][1] += 0.5 * (atRight - atLeft);
  }
  const largest = Math.max(...series.flat().map(Math.abs));
  const step = 10 ** (Math.floor(Math.log10(largest)) - 13);
  const counts = series.flat().map((c) => Math.round(c / step));
  return { step, counts, worst: worstDeviation(of, bounds, terms, counts, step) };
}

function truncatedSeries(of, from, to, terms) {
  const angles = Array.from({ length: POINTS }, (_, k) => (Math.PI * (k + 0.5)) / POINTS);
  const values = angles.map((angle) => of(0.5 * (from + to) + 0.5 * (to - from) * Math.cos(angle)));
  return Array.from({ length: terms }, (_, n) => {
    const sum = values.reduce((total, value, k) => total + value * Math.cos(n * angles[k]), 0);
    return ((n === 0 ? 1 : 2) / POINTS) * sum;
  });
}

function evaluate(series, x) {
  return series.reduce((sum, c, n) => sum + c * Math.cos(n * Math.acos(x)), 0);
}

function worstDeviation(of, bounds, terms, counts, step) {
  let worst = 0;
  bounds.forEach(([from, to], i) => {
    const series = counts.slice(i * terms, (i + 1) * terms).map((count) => count * step);
    for (let x = -0.95; x < 1; x += 0.1) {
      const value = of(0.5 * (from + to) + 0.5 * (to - from) * x);
      worst = Math.max(worst, Math.abs(evaluate(series, x) / value - 1));
    }
  });
  return worst;
}
