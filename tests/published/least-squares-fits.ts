import { type Fit, leastSquares, residualDeviation } from "../../app/domain/geometry/least-squares";

/* Fits as the checks of least squares ask for them. */

export function must<T>(came: T | null): T {
  if (came === null) throw new Error("The rows do not determine the unknowns.");
  return came;
}
/** Fit of rows that begin with what was observed, by a constant and the rest. */
export const byRest = (rows: readonly (readonly number[])[]): Fit =>
  must(
    leastSquares(
      rows.map(([, ...rest]) => [1, ...rest]),
      rows.map(([y = 0]) => y),
    ),
  );
export const byPowers = (rows: readonly (readonly [number, number])[], degree: number): Fit =>
  must(
    leastSquares(
      rows.map(([, x]) => Array.from({ length: degree + 1 }, (_, p) => x ** p)),
      rows.map(([y]) => y),
    ),
  );
export const throughOrigin = (xs: readonly number[], ys: readonly number[]): Fit =>
  must(
    leastSquares(
      xs.map((x) => [x]),
      ys,
    ),
  );
export const spread = (fit: Fit): number => residualDeviation(fit) ?? Number.NaN;
export const errors = (fit: Fit): number[] =>
  fit.cofactor.map((row, i) => spread(fit) * Math.sqrt(row[i] ?? 0));
export const over = (values: readonly number[], certified: readonly number[]): number[] =>
  values.map((value, i) => value / (certified[i] ?? Number.NaN));
export const ones = (n: number): number[] => new Array<number>(n).fill(1);
