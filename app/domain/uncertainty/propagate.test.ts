import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { combine, covarianceOf, type Input, propagate } from "./propagate";
import { correlation, fromHalfWidth, repeated } from "./readings";
import { coverageFactor, coverageOf, incompleteBeta } from "./student";

const input = (name: string, value: number, uncertainty: number, freedom?: number): Input => ({
  name,
  value,
  uncertainty,
  freedom,
});
const value = <T>(came: { ok: true; value: T } | { ok: false; problem: string }): T => {
  if (!came.ok) throw new Error(came.problem);
  return came.value;
};

describe("to first order", () => {
  it("adds independent parts by squares, and says which weighs most", () => {
    const sum = value(
      propagate(([a = 0, b = 0]) => a + b, {
        inputs: [input("the bob", 10, 3), input("the tape tie to mark B", 20, 4)],
      }),
    );
    expect(sum.value).toBe(30);
    expect(sum.uncertainty).toBeCloseTo(5, 9);
    expect(sum.words).toBe("Mostly the tape tie to mark B (64 %), then the bob (36 %).");
    expect(sum.freedom).toBe(Number.POSITIVE_INFINITY);
    expect(sum.expanded).toBeCloseTo(5 * 1.959964, 5);
  });
  it("counts correlation: wholly correlated parts add, opposed ones cancel", () => {
    const inputs = [input("a", 1, 3), input("b", 1, 4)];
    const u = (r: number) =>
      value(propagate(([a = 0, b = 0]) => a + b, { inputs, correlations: [{ a: "a", b: "b", r }] }))
        .uncertainty;
    expect(u(1)).toBeCloseTo(7, 9);
    expect(u(-1)).toBeCloseTo(1, 9);
    expect(u(0)).toBeCloseTo(5, 9);
  });
  it("agrees with the derivatives worked out by hand, whatever the numbers", () => {
    fc.assert(
      fc.property(
        fc.double({ min: 1, max: 3000, noNaN: true }),
        fc.double({ min: 1, max: 3000, noNaN: true }),
        fc.double({ min: 1e-3, max: 5, noNaN: true }),
        (a, b, u) => {
          const product = value(
            propagate(([x = 0, y = 0]) => x * y, { inputs: [input("x", a, u), input("y", b, 2 * u)] }),
          );
          expect(product.uncertainty / Math.hypot(b * u, a * 2 * u)).toBeCloseTo(1, 6);
        },
      ),
    );
  });
  it("is the same with the sensitivities given", () => {
    const inputs = [input("a", 2, 0.1, 4), input("b", 3, 0.2, 9)];
    const one = value(propagate(([a = 0, b = 0]) => 5 * a - 2 * b, { inputs }));
    const other = value(combine(4, [5, -2], { inputs }));
    expect(one.uncertainty).toBeCloseTo(other.uncertainty, 9);
    expect(one.freedom).toBeCloseTo(other.freedom, 6);
  });
  it("gives two results of the same inputs their correlation", () => {
    const inputs = [input("a", 2, 0.1), input("b", 3, 0.1)];
    const sum = value(combine(5, [1, 1], { inputs }));
    const difference = value(combine(-1, [1, -1], { inputs }));
    expect(covarianceOf(sum, difference).correlation).toBeCloseTo(0, 12);
    expect(covarianceOf(sum, sum).correlation).toBeCloseTo(1, 12);
  });
  it("says what is wrong instead of NaN", () => {
    const problem = (came: { ok: boolean; problem?: string }) => came.problem;
    const inputs = [input("a", 0, 1), input("b", 1, 1)];
    expect(problem(propagate(([a = 0]) => 1 / (a * 0), { inputs }))).toBe(
      "The result is no number with these values.",
    );
    expect(problem(combine(1, [1, 1], { inputs, correlations: [{ a: "a", b: "c", r: 0 }] }))).toMatch(
      /different inputs/,
    );
    expect(problem(combine(1, [1, 1], { inputs, correlations: [{ a: "a", b: "b", r: 2 }] }))).toMatch(
      /from −1 to 1/,
    );
    expect(problem(combine(1, [1], { inputs: [input("a", 1, -1)] }))).toMatch(/nothing or more/);
    const three = ["a", "b", "c"].map((name) => input(name, 1, 1));
    const opposed = [
      { a: "a", b: "b", r: -1 },
      { a: "a", b: "c", r: -1 },
      { a: "b", b: "c", r: -1 },
    ];
    expect(problem(combine(3, [1, 1, 1], { inputs: three, correlations: opposed }))).toMatch(/contradict/);
  });
});

describe("readings and coverage", () => {
  it("takes the mean and its standard deviation", () => {
    expect(repeated([2, 4, 6])).toEqual({
      mean: 4,
      standardDeviation: 2,
      ofMean: 2 / Math.sqrt(3),
      freedom: 2,
    });
    expect(repeated([1])).toBeNull();
    expect(correlation([1, 2, 3], [3, 2, 1])).toBeCloseTo(-1, 12);
    expect(correlation([1, 1], [1, 2])).toBeNull();
  });
  it("turns half-widths into standard uncertainties", () => {
    expect(fromHalfWidth(Math.sqrt(3), "rectangular")).toBeCloseTo(1, 12);
    expect(fromHalfWidth(Math.sqrt(6), "triangular")).toBeCloseTo(1, 12);
    expect(fromHalfWidth(Math.SQRT2, "arcsine")).toBeCloseTo(1, 12);
    expect(() => fromHalfWidth(-1, "arcsine")).toThrow(RangeError);
  });
  it("undoes what it does: the coverage of a coverage factor is the coverage", () => {
    fc.assert(
      fc.property(
        fc.double({ min: 0.5, max: 0.9999, noNaN: true }),
        fc.double({ min: 1, max: 500, noNaN: true }),
        (coverage, freedom) => {
          expect(coverageOf(coverageFactor(coverage, freedom), freedom)).toBeCloseTo(coverage, 9);
        },
      ),
    );
  });
  it("knows the ends of the incomplete beta function", () => {
    expect(incompleteBeta(0, 2, 3)).toBe(0);
    expect(incompleteBeta(1, 2, 3)).toBe(1);
    expect(incompleteBeta(0.5, 2, 2)).toBeCloseTo(0.5, 12);
    expect(incompleteBeta(0.3, 1, 1)).toBeCloseTo(0.3, 12);
  });
});
