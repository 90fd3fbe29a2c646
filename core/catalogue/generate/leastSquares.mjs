/**
 * Linear least squares by Householder reflections.
 *
 * @param rows `{ row, value, sigma }`: row·x = value with that standard deviation
 * @param size number of unknowns
 * @returns x and its covariance
 */
export function leastSquares(rows, size) {
  const a = rows.map(({ row, value, sigma }) => [...row, value].map((element) => element / sigma));
  for (let k = 0; k < size; k++) reflect(a, k);
  const x = new Array(size).fill(0);
  for (let k = size - 1; k >= 0; k--) {
    let sum = a[k][size];
    for (let j = k + 1; j < size; j++) sum -= a[k][j] * x[j];
    x[k] = sum / a[k][k];
  }
  return { x, covariance: covarianceOf(a, size) };
}

/** Clears column k below the diagonal in all later columns. */
function reflect(a, k) {
  let norm = 0;
  for (let i = k; i < a.length; i++) norm += a[i][k] * a[i][k];
  norm = Math.sqrt(norm);
  if (norm === 0) throw new Error(`unknown ${k} is in no row`);
  const head = a[k][k] > 0 ? -norm : norm;
  const v = [];
  for (let i = k; i < a.length; i++) v.push(a[i][k] - (i === k ? head : 0));
  const scale = 2 / v.reduce((sum, element) => sum + element * element, 0);
  for (let j = k; j < a[k].length; j++) {
    let dot = 0;
    for (let i = k; i < a.length; i++) dot += v[i - k] * a[i][j];
    for (let i = k; i < a.length; i++) a[i][j] -= scale * dot * v[i - k];
  }
}

/** (RᵀR)⁻¹ of the triangle that the reflections leave. */
function covarianceOf(a, size) {
  const inverse = Array.from({ length: size }, () => new Array(size).fill(0));
  for (let j = 0; j < size; j++) {
    for (let i = j; i >= 0; i--) {
      let sum = i === j ? 1 : 0;
      for (let k = i + 1; k <= j; k++) sum -= a[i][k] * inverse[k][j];
      inverse[i][j] = sum / a[i][i];
    }
  }
  return inverse.map((left) => inverse.map((right) => left.reduce((sum, element, k) => sum + element * right[k], 0)));
}
