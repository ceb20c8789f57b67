import fc from "fast-check";
import { describe, expect, it } from "vitest";
import {
  formatCentimetres,
  formatDecimalInches,
  formatFeet,
  formatInches,
  formatMillimetres,
  inches,
  type Millimetres,
  mm,
  nearestWhole,
  parseLength,
  roundToStep,
  type Ties,
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

describe("roundToStep", () => {
  it("goes to the nearest mark, on either side of nothing", () => {
    expect(roundToStep(inches(12.53125), inches(1 / 16))).toBeCloseTo(inches(12.5625), 9);
    expect(roundToStep(inches(-12.53125), inches(1 / 16), "to-even")).toBeCloseTo(inches(-12.5), 9);
    expect(Object.is(roundToStep(mm(-0.4), mm(1)), 0)).toBe(true);
    expect(() => roundToStep(mm(1), mm(0))).toThrow(RangeError);
  });
  it("is never further off than half a step, and stays where it is the second time", () => {
    fc.assert(
      fc.property(
        fc.double({ min: -9000, max: 9000, noNaN: true }),
        fc.constantFrom(25.4 / 64, 25.4 / 16, 0.1, 1, 5),
        fc.constantFrom<Ties>("away-from-zero", "to-even"),
        (length, step, ties) => {
          const once = roundToStep(mm(length), mm(step), ties);
          expect(Math.abs(once - length)).toBeLessThanOrEqual(step * (0.5 + 1e-5));
          expect(roundToStep(once, mm(step), ties)).toBeCloseTo(once, 9);
        },
      ),
    );
  });
});

describe("halves to even", () => {
  it("leave no drift in a long row of halves; away from zero does", () => {
    const drift = (ties: Ties) =>
      Array.from({ length: 1000 }, (_, i) => nearestWhole(i + 0.5, ties) - (i + 0.5)).reduce(
        (sum, one) => sum + one,
        0,
      );
    expect(drift("to-even")).toBe(0);
    expect(drift("away-from-zero")).toBe(500);
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
  it("every half sixteenth in feet and inches", () => {
    fc.assert(
      fc.property(fc.integer({ min: -32 * 3000, max: 32 * 3000 }), (steps) => {
        const length = inches(steps / 32);
        expect(back(formatFeet(length, 32), "in")).toBeCloseTo(length, 9);
      }),
    );
  });
  it("every millimetre in centimetres, every hundredth of an inch, whatever the person's unit", () => {
    const unit = fc.constantFrom("in" as const, "mm" as const);
    fc.assert(
      fc.property(fc.integer({ min: -99_000, max: 99_000 }), unit, (steps, own) => {
        expect(back(formatCentimetres(mm(steps)), own)).toBeCloseTo(steps, 9);
        expect(back(`${formatDecimalInches(inches(steps / 100))} in`, own)).toBeCloseTo(
          inches(steps / 100),
          9,
        );
      }),
    );
  });
  it("a typed length of any kind never throws, is finite and within 100 m", () => {
    const sign = fc.constantFrom(..."0123456789.,/'\"- ftincmm½⅛−e");
    fc.assert(
      fc.property(fc.string({ unit: sign, maxLength: 16 }), fc.constantFrom("in", "mm"), (text, own) => {
        const read = parseLength(text, own);
        return read.ok ? Math.abs(read.value) <= 100_000 : read.problem.endsWith(".");
      }),
      { numRuns: 2000 },
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
