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

/** A column of length 1 that lies this near the others says nothing of its own. Set here, no source. */
const LEAST_PIVOT = 1e-6;

/**
 * Solves rows · x ≈ observed in the least-squares sense by Householder's reflections (QR), which keeps twice the figures
 * that normal equations do. Columns are scaled to length 1 first, so that lengths of very different size do no harm.
 * Source: Golub and Van Loan, Matrix Computations, ch. 5 (from memory).
 * @returns null when the rows do not determine the unknowns (too few, or they say the same), or a figure is no number
 * @example leastSquares([[4], [5], [6]], [3, 4, 4])?.solution // [0.7272727]
 */
export function leastSquares(rows: readonly (readonly number[])[], observed: readonly number[]): Fit | null {
  const n = rows[0]?.length ?? 0;
  if (n === 0 || rows.length < n || rows.length !== observed.length || !observed.every(Number.isFinite))
    return null;
  const scale = Array.from({ length: n }, (_, j) => lengthOf(rows.map((row) => row[j] ?? 0)));
  if (scale.some((s) => !(s > 0 && Number.isFinite(s)))) return null;
  const columns = scale.map((s, j) => rows.map((row) => (row[j] ?? 0) / s));
  const triangle = reduce(columns, [...observed]);
  if (!triangle) return null;
  const inverse = invert(triangle.upper);
  const solution = inverse.map((row, i) => dot(row, triangle.right) / (scale[i] ?? 1));
  return {
    solution,
    residuals: rows.map((row, k) => (observed[k] ?? 0) - dot(row, solution)),
    cofactor: inverse.map((a, i) => inverse.map((b, j) => dot(a, b) / ((scale[i] ?? 1) * (scale[j] ?? 1)))),
    redundancy: rows.length - n,
  };
}

/**
 * Standard deviation of an observation from the residuals of a fit: √(Σv²/redundancy).
 * Source: Ghilani, Adjustment Computations, ch. 11 (from memory).
 * @returns in the unit of the observations; null when nothing is left over to tell by
 * @example residualDeviation({ residuals: [1, -2, 2], redundancy: 1 }) // 3
 */
export const residualDeviation = ({
  residuals,
  redundancy,
}: Pick<Fit, "residuals" | "redundancy">): number | null =>
  redundancy > 0 ? lengthOf(residuals) / Math.sqrt(redundancy) : null;

const dot = (a: readonly number[], b: readonly number[]): number =>
  a.reduce((sum, value, i) => sum + value * (b[i] ?? 0), 0);

/** The length of a vector; by its largest part, so that no square overflows or vanishes. */
function lengthOf(vector: readonly number[]): number {
  const largest = vector.reduce((so, value) => Math.max(so, Math.abs(value)), 0);
  return largest > 0
    ? largest * Math.sqrt(vector.reduce((sum, value) => sum + (value / largest) ** 2, 0))
    : largest;
}

/**
 * Reflects column after column onto its axis and the right side along with them (both are used up).
 * @returns the rows of the triangle and the right side that belongs to them; null when a column is spent
 */
function reduce(columns: number[][], right: number[]): { upper: number[][]; right: number[] } | null {
  const n = columns.length;
  const upper = columns.map(() => new Array<number>(n).fill(0));
  for (const [k, column] of columns.entries()) {
    const tail = column.slice(k);
    const size = lengthOf(tail);
    if (!(size >= LEAST_PIVOT)) return null;
    const head = tail[0] ?? 0;
    const pivot = head > 0 ? -size : size;
    tail[0] = head - pivot;
    const half = -pivot * (head - pivot);
    for (const vector of [...columns.slice(k + 1), right]) {
      const share = dot(tail, vector.slice(k)) / -half;
      tail.forEach((value, i) => {
        vector[k + i] = (vector[k + i] ?? 0) + share * value;
      });
    }
    const row = upper[k] ?? [];
    row[k] = pivot;
    for (let j = k + 1; j < n; j++) row[j] = columns[j]?.[k] ?? 0;
  }
  return { upper, right: right.slice(0, n) };
}

/** Inverse of an upper triangle without a zero on its diagonal. */
function invert(upper: readonly (readonly number[])[]): number[][] {
  const n = upper.length;
  const inverse = upper.map(() => new Array<number>(n).fill(0));
  for (let c = 0; c < n; c++)
    for (let i = c; i >= 0; i--) {
      let sum = i === c ? 1 : 0;
      for (let k = i + 1; k <= c; k++) sum -= (upper[i]?.[k] ?? 0) * (inverse[k]?.[c] ?? 0);
      const row = inverse[i];
      if (row) row[c] = sum / (upper[i]?.[i] ?? 1);
    }
  return inverse;
}
