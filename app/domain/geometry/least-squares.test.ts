import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { leastSquares, residualDeviation } from "./least-squares";

/** As measured things are: to a thousandth, none of them next to nothing. */
const number = fc.integer({ min: -1_000_000, max: 1_000_000 }).map((thousandths) => thousandths / 1000);
const rowsOf = (columns: number, least: number) =>
  fc.array(fc.array(number, { minLength: columns, maxLength: columns }), {
    minLength: least,
    maxLength: least + 12,
  });

describe("leastSquares", () => {
  it("fits three points by a line through the origin", () => {
    const fit = leastSquares([[4], [5], [6]], [3, 4, 4]);
    expect(fit?.solution[0]).toBeCloseTo(56 / 77, 12);
    expect(fit?.cofactor[0]?.[0]).toBeCloseTo(1 / 77, 12);
    expect(fit?.redundancy).toBe(2);
  });
  it("leaves residuals that no column can make smaller", () => {
    fc.assert(
      fc.property(rowsOf(3, 4), fc.array(number, { minLength: 16, maxLength: 16 }), (rows, values) => {
        const fit = leastSquares(rows, values.slice(0, rows.length));
        if (!fit) return true;
        const columns = [0, 1, 2].map((j) => rows.map((row) => row[j] ?? 0));
        // What the residuals are a difference of: their last digits are lost in it.
        const size = columns.reduce(
          (sum, column, j) => sum + Math.hypot(...column) * Math.abs(fit.solution[j] ?? 0),
          Math.hypot(...values),
        );
        return columns.every((column) => {
          const along = column.reduce((sum, value, k) => sum + value * (fit.residuals[k] ?? 0), 0);
          return Math.abs(along) <= 1e-9 * Math.hypot(...column) * size;
        });
      }),
    );
  });
  it("gives back what was put in when nothing disagrees", () => {
    fc.assert(
      fc.property(number, number, fc.double({ min: 1, max: 5000, noNaN: true }), (a, b, span) => {
        const rows = [0, 1, 2, 3, 4].map((i) => [1, (i * span) / 4]);
        const fit = leastSquares(
          rows,
          rows.map(([one = 0, x = 0]) => a * one + b * x),
        );
        const size = Math.abs(a) + Math.abs(b) * span + 1e-9;
        return (
          fit !== null &&
          Math.abs((fit.solution[0] ?? 0) - a) < 1e-12 * size &&
          Math.abs((fit.solution[1] ?? 0) - b) * span < 1e-11 * size
        );
      }),
    );
  });
  it("does not mind in what unit a column comes, or in what order the rows", () => {
    const rows = [
      [1, 2, 7],
      [1, 3, -4],
      [1, 5, 1],
      [1, 8, 2],
      [1, 9, -6],
    ];
    const observed = [3, 1, 4, 1, 5];
    const plain = leastSquares(rows, observed);
    const mixed = leastSquares(
      rows.map(([one = 0, x = 0, y = 0]) => [one, x * 1e9, y * 1e-9]).reverse(),
      [...observed].reverse(),
    );
    expect((mixed?.solution[1] ?? 0) * 1e9).toBeCloseTo(plain?.solution[1] ?? 0, 12);
    expect((mixed?.solution[2] ?? 0) * 1e-9).toBeCloseTo(plain?.solution[2] ?? 0, 12);
    expect(mixed?.residuals.reverse()[3]).toBeCloseTo(plain?.residuals[3] ?? 0, 12);
  });
  it.each([
    ["too few rows", [[1, 2]], [1]],
    ["no rows", [], []],
    ["no columns", [[]], [1]],
    ["columns that say the same", [0, 1, 2, 3].map((x) => [x, 2 * x]), [1, 2, 3, 4]],
    ["three columns of which one is the sum", [1, 4, 9, 16].map((x, i) => [x, i, x + i]), [1, 2, 3, 4]],
    ["an empty column", [0, 1, 2].map((x) => [x, 0]), [1, 2, 3]],
    ["rows and readings that differ in number", [[1], [2]], [1]],
    ["a reading that is no number", [[1], [2]], [1, Number.NaN]],
    ["a row that is no number", [[1], [Number.NaN]], [1, 2]],
    ["a row without end", [[1], [Number.POSITIVE_INFINITY]], [1, 2]],
  ])("answers null for %s", (_what, rows, observed) => expect(leastSquares(rows, observed)).toBeNull());
  it("does not pass off a polynomial of the tenth degree as solved", () => {
    // The shape of NIST's Filip: its columns are one another's shadows to ten figures.
    const xs = Array.from({ length: 82 }, (_, i) => -3.1 - i * 0.07);
    const rows = xs.map((x) => Array.from({ length: 11 }, (_, p) => x ** p));
    expect(leastSquares(rows, xs)).toBeNull();
  });
});

describe("residualDeviation", () => {
  it("is the root of the squares over what is left over", () =>
    expect(residualDeviation({ residuals: [1, -2, 2], redundancy: 1 })).toBe(3));
  it("is not known when nothing is left over", () =>
    expect(residualDeviation({ residuals: [0, 0], redundancy: 0 })).toBeNull());
  it("survives very large and very small residuals", () => {
    expect(residualDeviation({ residuals: [3e200, 4e200], redundancy: 1 })).toBeCloseTo(5e200, -190);
    expect((residualDeviation({ residuals: [3e-200, 4e-200], redundancy: 1 }) ?? 0) * 1e200).toBeCloseTo(
      5,
      9,
    );
  });
});
