import { type Outcome, ok, problem } from "../outcome";

/** Correlation of two inputs by their names; what is not named is independent. */
export type Correlation = { a: string; b: string; r: number };

/** Correlations are often printed to two places: so much may they contradict each other. Set here, no source. */
const ROUNDED = 0.01;

/**
 * The correlations as a matrix, ones on its diagonal.
 * Source: a matrix of correlations has no negative eigenvalue; JCGM 102:2011, 3.21 (from memory). Seen by Cholesky's
 * decomposition, which fails on others.
 * @param names of the inputs, each once
 * @returns a problem when one names no input or a pair is named twice, when it is beyond ±1, and when they cannot all be
 * @example correlationMatrix(["a", "b"], [{ a: "a", b: "b", r: 0.5 }]).value // [[1, 0.5], [0.5, 1]]
 */
export function correlationMatrix(
  names: readonly string[],
  correlations: readonly Correlation[],
): Outcome<number[][]> {
  const matrix: number[][] = names.map((_, i) => names.map((__, j) => (i === j ? 1 : 0)));
  const told = new Set<string>();
  for (const { a, b, r } of correlations) {
    const [i, j] = [names.indexOf(a), names.indexOf(b)];
    if (i < 0 || j < 0 || i === j)
      return problem(`A correlation is between two different inputs: ${a} and ${b} are not.`);
    if (!(Math.abs(r) <= 1)) return problem("A correlation is from −1 to 1.");
    const pair = `${Math.min(i, j)}/${Math.max(i, j)}`;
    if (told.has(pair)) return problem(`The correlation of ${a} and ${b} is given twice.`);
    told.add(pair);
    for (const [k, l] of [
      [i, j],
      [j, i],
    ] as const) {
      const row = matrix[k];
      if (row) row[l] = r;
    }
  }
  return possible(matrix) ? ok(matrix) : problem("These correlations contradict each other.");
}

function possible(matrix: readonly (readonly number[])[]): boolean {
  const lower: number[][] = [];
  for (const [i, given] of matrix.entries()) {
    const row: number[] = [];
    for (let j = 0; j <= i; j++) {
      const other = j === i ? row : (lower[j] ?? []);
      let sum = (given[j] ?? 0) + (j === i ? ROUNDED : 0);
      for (let k = 0; k < j; k++) sum -= (row[k] ?? 0) * (other[k] ?? 0);
      if (j === i && !(sum > 0)) return false;
      row.push(j === i ? Math.sqrt(sum) : sum / (other[j] ?? 1));
    }
    lower.push(row);
  }
  return true;
}

/**
 * Inputs that hang together by correlation, directly or through others.
 * @returns lists of their places in the matrix; what is independent of all stands alone
 * @example correlatedGroups([[1, 0.5, 0], [0.5, 1, 0], [0, 0, 1]]) // [[0, 1], [2]]
 */
export function correlatedGroups(matrix: readonly (readonly number[])[]): number[][] {
  const groups: number[][] = [];
  const seen = new Set<number>();
  for (const [start] of matrix.entries()) {
    if (seen.has(start)) continue;
    const group = [start];
    seen.add(start);
    for (const i of group)
      for (const [j, r] of (matrix[i] ?? []).entries())
        if (r !== 0 && !seen.has(j)) {
          seen.add(j);
          group.push(j);
        }
    groups.push(group.sort((a, b) => a - b));
  }
  return groups;
}
