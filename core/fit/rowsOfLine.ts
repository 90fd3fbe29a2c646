import type { LineDiagnostics } from './fitTypes';
import type { LineSolution } from './solveLine';

/** Residual, leverage h = 1/n + (x − x̄)²/Σ(x − x̄)² and internally studentized residual r/(s √(1 − h)) of each row. */
export function rowsOfLine(x: Float64Array, y: Float64Array, line: LineSolution): LineDiagnostics {
  const n = x.length;
  const slope = line.slope + line.slopeRest;
  const residuals = new Float64Array(n);
  const leverages = new Float64Array(n);
  const deviation = n > 2 ? Math.sqrt(line.residualSquares / (n - 2)) : 0;
  const studentized = deviation > 0 ? new Float64Array(n) : undefined;
  for (let i = 0; i < n; i++) {
    const d = (x[i] as number) - line.centre;
    const residual = (y[i] as number) - line.centreLatent - slope * d - line.centreRest;
    const leverage = Math.min(1, 1 / n + (d * d) / line.spread);
    residuals[i] = residual;
    leverages[i] = leverage;
    // A leverage within rounding of 1 leaves no scatter of its own to compare with.
    if (studentized !== undefined && 1 - leverage > 1e-12) {
      studentized[i] = residual / (deviation * Math.sqrt(1 - leverage));
    }
  }
  return { residuals, leverages, studentized };
}
