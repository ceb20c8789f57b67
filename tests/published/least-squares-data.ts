/* Small data sets for least squares that every textbook of statistics has. The observed value first. */

const XS = [10, 8, 13, 9, 11, 14, 6, 4, 12, 7, 5];
const X4 = [8, 8, 8, 8, 8, 8, 8, 19, 8, 8, 8];
const together = (ys: readonly number[], xs: readonly number[]) => ys.map((y, i) => [y, xs[i] ?? 0] as const);

/** Anscombe's four sets: the same line to every figure printed, and four quite different pictures. */
export const ANSCOMBE = [
  together([8.04, 6.95, 7.58, 8.81, 8.33, 9.96, 7.24, 4.26, 10.84, 4.82, 5.68], XS),
  together([9.14, 8.14, 8.74, 8.77, 9.26, 8.1, 6.13, 3.1, 9.13, 7.26, 4.74], XS),
  together([7.46, 6.77, 12.74, 7.11, 7.81, 8.84, 6.08, 5.39, 8.15, 6.42, 5.73], XS),
  together([6.58, 5.76, 7.71, 8.84, 8.47, 7.04, 5.25, 12.5, 5.56, 7.91, 6.89], X4),
];

/** Weights (pounds) of women of 58 to 72 in. */
export const WOMEN = together(
  [115, 117, 120, 123, 126, 129, 132, 135, 139, 142, 146, 150, 154, 159, 164],
  Array.from({ length: 15 }, (_, i) => 58 + i),
);

/** Loss of ammonia, air flow, cooling water and acid on 21 days. */
export const STACK_LOSS: readonly (readonly number[])[] = [
  [42, 80, 27, 89],
  [37, 80, 27, 88],
  [37, 75, 25, 90],
  [28, 62, 24, 87],
  [18, 62, 22, 87],
  [18, 62, 23, 87],
  [19, 62, 24, 93],
  [20, 62, 24, 93],
  [15, 58, 23, 87],
  [14, 58, 18, 80],
  [14, 58, 18, 89],
  [13, 58, 17, 88],
  [11, 58, 18, 82],
  [12, 58, 19, 93],
  [8, 50, 18, 89],
  [7, 50, 18, 86],
  [8, 50, 19, 72],
  [8, 50, 19, 79],
  [9, 50, 20, 80],
  [15, 56, 20, 82],
  [15, 70, 20, 91],
];
