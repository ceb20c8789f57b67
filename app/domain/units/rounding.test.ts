import fc from "fast-check";
import { describe, expect, it } from "vitest";
import {
  formatInches,
  formatMillimetres,
  inches,
  type Millimetres,
  mm,
  nearestWhole,
  parseLength,
} from "./length";

const back = (text: string, unit: "in" | "mm") => {
  const read = parseLength(text, unit);
  if (!read.ok) throw new Error(read.problem);
  return read.value;
};

describe("what lies half way", () => {
  it("goes away from zero unless told, or to the even one", () => {
    expect([0.5, 1.5, 2.5, 2.4999].map((value) => nearestWhole(value))).toEqual([1, 2, 3, 2]);
    expect([0.5, 1.5, 2.5, 2.5001].map((value) => nearestWhole(value, "to-even"))).toEqual([0, 2, 2, 3]);
    expect(formatInches(inches(-3.03125))).toBe("−3 1/16");
    expect(formatInches(inches(-3.03125), { ties: "to-even" })).toBe("−3");
  });
});

describe("what is shown can be typed back without loss", () => {
  it("every sixty-fourth of an inch", () => {
    fc.assert(
      fc.property(fc.integer({ min: -64 * 400, max: 64 * 400 }), (steps) => {
        const length = inches(steps / 64);
        expect(back(formatInches(length, { denominator: 64 }), "in")).toBeCloseTo(length, 9);
      }),
    );
  });
  it("every tenth of a millimetre", () => {
    fc.assert(
      fc.property(fc.integer({ min: -99_000, max: 99_000 }), (tenths) => {
        const length: Millimetres = mm(tenths / 10);
        expect(back(formatMillimetres(length, 1), "mm")).toBeCloseTo(length, 9);
      }),
    );
  });
  it("nothing shown is further from the truth than half a mark, by either rule", () => {
    fc.assert(
      fc.property(
        fc.double({ min: -400, max: 400, noNaN: true }),
        fc.constantFrom(16, 32, 64) as fc.Arbitrary<16 | 32 | 64>,
        fc.constantFrom("away-from-zero", "to-even") as fc.Arbitrary<"away-from-zero" | "to-even">,
        (value, denominator, ties) => {
          const shown = back(formatInches(inches(value), { denominator, ties }), "in");
          expect(Math.abs(shown - inches(value))).toBeLessThanOrEqual((25.4 / denominator) * (0.5 + 1e-4));
        },
      ),
    );
  });
});
