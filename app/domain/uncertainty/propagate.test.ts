import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { combine, type Input, propagate } from "./propagate";
import { correlation, fromExpanded, fromHalfWidth, repeated } from "./readings";
import { covarianceOf, propagateSeveral } from "./several";
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
  it("gives several results with their covariance matrix", () => {
    const inputs = [input("a", 2, 0.1, 7), input("b", 3, 0.2, 7), input("c", 1, 0)];
    const correlations = [{ a: "a", b: "b", r: 0.5 }];
    const came = value(
      propagateSeveral(([a = 0, b = 0, c = 0]) => [a + b, a - b, c], { inputs, correlations }),
    );
    // u² of the sum 0.01 + 0.04 + 2·0.5·0.02, of the difference less that; covariance 0.01 − 0.04.
    expect(came.results.map((one) => one.value)).toEqual([5, -1, 1]);
    [0.07, -0.03, -0.03, 0.03].forEach((want, i) => {
      expect(came.covariance[Math.floor(i / 2)]?.[i % 2]).toBeCloseTo(want, 12);
    });
    expect(came.correlation[0]?.[1]).toBeCloseTo(-0.03 / Math.sqrt(0.07 * 0.03), 10);
    expect(came.correlation[2]).toEqual([null, null, null]);
    expect(propagateSeveral(([a = 0]) => [a, Number.NaN], { inputs }).ok).toBe(false);
  });
  it("counts what was read together as one part with its own degrees of freedom", () => {
    const inputs = [input("a", 1, 3, 4), input("b", 1, 4, 4), input("c", 1, 0.1)];
    const freedom = (r: number) =>
      value(combine(3, [1, 1, 0], { inputs, correlations: [{ a: "b", b: "a", r }] })).freedom;
    expect(freedom(0.3)).toBeCloseTo(4, 9);
    expect(freedom(0)).toBeCloseTo(5 ** 4 / (3 ** 4 / 4 + 4 ** 4 / 4), 9);
  });
  it("never has more degrees of freedom than all inputs together, nor fewer than the least", () => {
    const one = fc.record({
      u: fc.double({ min: 0.01, max: 10, noNaN: true }),
      freedom: fc.integer({ min: 1, max: 60 }),
    });
    fc.assert(
      fc.property(
        fc.array(one, { minLength: 2, maxLength: 6 }),
        fc.double({ min: -0.9, max: 0.9, noNaN: true }),
        (list, r) => {
          const inputs = list.map(({ u, freedom }, i) => input(`x${i}`, 1, u, freedom));
          const { freedom } = value(
            combine(
              0,
              inputs.map(() => 1),
              { inputs, correlations: [{ a: "x0", b: "x1", r }] },
            ),
          );
          const all = list.map((own) => own.freedom);
          return (
            freedom <= all.reduce((sum, own) => sum + own, 0) + 1e-9 && freedom >= Math.min(...all) - 1e-9
          );
        },
      ),
    );
  });
  it("takes a factor that was agreed on, and says what it covers", () => {
    const inputs = [input("a", 1, 3)];
    const came = value(combine(1, [1], { inputs, coverageFactor: 2 }));
    expect(came.expanded).toBe(6);
    expect(came.coverage).toBeCloseTo(0.9544997, 7);
    const few = value(combine(1, [1], { inputs: [input("a", 1, 3, 4)], coverageFactor: 2 }));
    expect(few.coverage).toBeCloseTo(0.8838835, 7);
  });
  it("needs nothing of an input that is sure, even at the edge of where the function is", () => {
    const inputs = [input("x", 0, 0), input("y", 4, 0.1)];
    const came = value(propagate(([x = 0, y = 0]) => Math.sqrt(x) + Math.sqrt(y), { inputs }));
    expect(came.uncertainty).toBeCloseTo(0.025, 7);
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
    for (const signs of [
      [1, 1, 1],
      [1, -1, 1],
      [0, 0, 1],
    ])
      expect(problem(combine(3, signs, { inputs: three, correlations: opposed }))).toMatch(/contradict/);
    const twice = [
      { a: "a", b: "b", r: 0.1 },
      { a: "b", b: "a", r: 0.1 },
    ];
    expect(problem(combine(1, [1, 1], { inputs, correlations: twice }))).toMatch(/given twice/);
    expect(problem(combine(1, [1], { inputs: [input("a", 1, 1, 0)] }))).toMatch(/freedom/);
    expect(problem(combine(1, [1], { inputs: [input("a", 1, Number.POSITIVE_INFINITY)] }))).toMatch(
      /nothing or more/,
    );
    expect(problem(combine(1, [1, 1], { inputs: [input("a", 1, 1), input("a", 1, 1)] }))).toMatch(
      /same name/,
    );
    expect(problem(combine(1, [1], { inputs: [input("a", 1, 1)], coverage: 1 }))).toMatch(/coverage/);
    expect(problem(combine(1, [1], { inputs: [input("a", 1, 1)], coverageFactor: 0 }))).toMatch(/factor/);
  });
  it("bears with correlations that were rounded to two places", () => {
    // Of three readings of four things: the true matrix is singular, so that rounding makes it impossible by a little.
    const readings = [
      [1, 2, 4],
      [2, 1, 7],
      [5, 5, 1],
      [3, 9, 2],
    ];
    const inputs = readings.map((list, i) => input(`x${i}`, repeated(list)?.mean ?? 0, 1));
    const correlations = readings.flatMap((a, i) =>
      readings
        .slice(i + 1)
        .map((b, k) => ({ a: `x${i}`, b: `x${i + 1 + k}`, r: Number((correlation(a, b) ?? 0).toFixed(2)) })),
    );
    expect(combine(0, [1, 1, 1, 1], { inputs, correlations }).ok).toBe(true);
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
    expect(fromExpanded(240, 3)).toBe(80);
    expect(() => fromExpanded(-1, 2)).toThrow(RangeError);
    expect(() => fromExpanded(1, 0)).toThrow(RangeError);
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
