/** What a linear least-squares fit came to. */
export type Fit = {
  /** One value for each column. */
  solution: number[];
  /** Observed minus fitted, one for each row. */
  residuals: number[];
  /** Inverse of the normal matrix: times the variance of an observation it is the covariance of the solution. */
  cofactor: number[][];
  /** Rows more than columns. */
  redundancy: number;
};

/**
 * Solves rows · x ≈ observed in the least-squares sense by normal equations with Cholesky's decomposition. Columns are
 * scaled first, so that lengths of very different size do no harm. Fit for the handful of unknowns of a layout.
 * @returns null when the rows do not determine the unknowns (too few, or they say the same)
 * Source: any text on adjustment, e.g. Ghilani, Adjustment Computations, ch. 11 (from memory).
 */
export function leastSquares(rows: readonly (readonly number[])[], observed: readonly number[]): Fit | null {
  const n = rows[0]?.length ?? 0;
  if (n === 0 || rows.length < n || rows.length !== observed.length) return null;
  const scale = Array.from({ length: n }, (_, j) => Math.hypot(...rows.map((row) => row[j] ?? 0)));
  if (scale.some((s) => !(s > 0))) return null;
  const scaled = rows.map((row) => row.map((value, j) => value / (scale[j] ?? 1)));
  const normal = square(n, (i, j) => scaled.reduce((sum, row) => sum + (row[i] ?? 0) * (row[j] ?? 0), 0));
  const right = Array.from({ length: n }, (_, i) =>
    scaled.reduce((sum, row, k) => sum + (row[i] ?? 0) * (observed[k] ?? 0), 0),
  );
  const inverse = invert(normal);
  if (!inverse) return null;
  const solution = inverse.map(
    (row, i) => row.reduce((sum, value, j) => sum + value * (right[j] ?? 0), 0) / (scale[i] ?? 1),
  );
  return {
    solution,
    residuals: rows.map(
      (row, k) => (observed[k] ?? 0) - row.reduce((sum, value, j) => sum + value * (solution[j] ?? 0), 0),
    ),
    cofactor: square(n, (i, j) => (inverse[i]?.[j] ?? 0) / ((scale[i] ?? 1) * (scale[j] ?? 1))),
    redundancy: rows.length - n,
  };
}

const square = (n: number, at: (i: number, j: number) => number): number[][] =>
  Array.from({ length: n }, (_, i) => Array.from({ length: n }, (_, j) => at(i, j)));

/** Inverse of a small symmetric positive definite matrix with a unit diagonal; null when it is (nearly) singular. */
function invert(matrix: number[][]): number[][] | null {
  const n = matrix.length;
  const lower = square(n, () => 0);
  for (let i = 0; i < n; i++) {
    for (let j = 0; j <= i; j++) {
      let sum = matrix[i]?.[j] ?? 0;
      for (let k = 0; k < j; k++) sum -= (lower[i]?.[k] ?? 0) * (lower[j]?.[k] ?? 0);
      const row = lower[i];
      if (!row) return null;
      if (i !== j) row[j] = sum / (lower[j]?.[j] ?? 1);
      else if (sum < 1e-12) return null;
      else row[i] = Math.sqrt(sum);
    }
  }
  const columns = Array.from({ length: n }, (_, c) => {
    const y: number[] = [];
    for (let i = 0; i < n; i++) {
      let sum = i === c ? 1 : 0;
      for (let k = 0; k < i; k++) sum -= (lower[i]?.[k] ?? 0) * (y[k] ?? 0);
      y[i] = sum / (lower[i]?.[i] ?? 1);
    }
    const x: number[] = new Array(n).fill(0);
    for (let i = n - 1; i >= 0; i--) {
      let sum = y[i] ?? 0;
      for (let k = i + 1; k < n; k++) sum -= (lower[k]?.[i] ?? 0) * (x[k] ?? 0);
      x[i] = sum / (lower[i]?.[i] ?? 1);
    }
    return x;
  });
  return square(n, (i, j) => columns[j]?.[i] ?? 0);
}
