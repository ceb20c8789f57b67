import fc from "fast-check";
import { describe, expect, it } from "vitest";
import {
  formatDecimalInches,
  formatFeet,
  formatInches,
  formatLength,
  inches,
  inchParts,
  mm,
  parseLength,
  toInches,
} from "./length";

const value = (text: string, unit: "in" | "mm" = "in") => {
  const parsed = parseLength(text, unit);
  if (!parsed.ok) throw new Error(parsed.problem);
  return parsed.value;
};
const fault = (text: string, unit: "in" | "mm" = "in") => {
  const parsed = parseLength(text, unit);
  return parsed.ok ? `read as ${parsed.value}` : parsed.problem;
};

describe("parseLength", () => {
  it.each([
    ["26 1/2", 26.5],
    ["26-1/2", 26.5],
    ["26.5", 26.5],
    ["26,5", 26.5],
    [".5", 0.5],
    ["1/2", 0.5],
    ["26 1/2 in", 26.5],
    ['26"', 26],
    ["2' 2 1/2\"", 26.5],
    ["2' 2.5", 26.5],
    ["2'-2 1/2\"", 26.5],
    ["2ft 2.5in", 26.5],
    ["2 ft", 24],
    ["2.5 ft", 30],
    ["26½", 26.5],
    ["26 ⅜", 26.375],
    ["13⁄16", 0.8125],
    ["2′ 2 ½″", 26.5],
    ["  24   1/16 ", 24.0625],
    ["-3/8", -0.375],
    ["−3/8", -0.375],
  ])("reads %s in inches", (text, expected) => expect(toInches(value(text))).toBeCloseTo(expected, 9));
  it.each([
    ["673 mm", 673],
    ["67.3 cm", 673],
    ["67,3cm", 673],
    ["0.5 m", 500],
  ])("reads %s", (text, expected) => expect(value(text)).toBeCloseTo(expected, 9));
  it("takes a bare number in the person's own unit", () => {
    expect(value("26", "in")).toBeCloseTo(660.4, 9);
    expect(value("26", "mm")).toBe(26);
    expect(value("26 1/2", "mm")).toBeCloseTo(673.1, 9);
  });
  it.each([
    ["", /^Type the length as on the tape/],
    ["abc", /^“abc” is not a length/],
    ["1/0", /^1\/0 is not a fraction\.$/],
    ["26 1/2 1/4", /two fractions/],
    ["26 17/16", /17\/16 is an inch or more/],
    ["2' 14", /12 in or more/],
    ["2.5' 3", /one or the other/],
    ["26 1", /is not a length/],
    ["1/2/3", /fraction too many/],
    ["6 7.5 mm", /is not a number of mm/],
    ["101 m", /longer than 100 m/],
    ["1e5", /is not a length/],
    ["9".repeat(40), /too long/],
    ["NaN", /is not a length/],
  ])("says what is wrong with %j", (text, words) => expect(fault(text)).toMatch(words));
  it("never throws, whatever is typed", () => {
    fc.assert(
      fc.property(
        fc.string(),
        fc.constantFrom("in" as const, "mm" as const),
        (text, unit) => typeof parseLength(text, unit).ok === "boolean",
      ),
    );
  });
  it.each([16, 32, 64] as const)("reads back what formatInches writes, to 1/%i", (denominator) => {
    fc.assert(
      fc.property(fc.integer({ min: -200 * denominator, max: 200 * denominator }), (steps) => {
        const length = inches(steps / denominator);
        return Math.abs(value(formatInches(length, { denominator })) - length) < 1e-9;
      }),
    );
  });
  it("survives being stored with six decimals of a millimetre", () => {
    fc.assert(
      fc.property(fc.integer({ min: 1, max: 64 * 300 }), (steps) => {
        const stored = mm(Number(inches(steps / 64).toFixed(6)));
        return (
          formatInches(stored, { denominator: 64 }) === formatInches(inches(steps / 64), { denominator: 64 })
        );
      }),
    );
  });
});

describe("formatting", () => {
  it("rounds halves away from zero", () => {
    expect(formatInches(inches(1 / 32))).toBe("1/16");
    expect(formatInches(inches(-1 / 32))).toBe("−1/16");
    expect(formatInches(inches(25.97))).toBe("26");
  });
  it("writes no sign on a zero", () => {
    expect(formatInches(inches(-0.001))).toBe("0");
    expect(formatDecimalInches(inches(-0.001))).toBe("0.00");
    expect(formatInches(inches(0), { sign: true })).toBe("0");
  });
  it("reduces fractions", () => {
    expect(inchParts(inches(23.75))).toEqual({ sign: "", whole: 23, numerator: 3, denominator: 4 });
    expect(formatInches(inches(0.375), { sign: true })).toBe("+3/8");
  });
  it("writes feet", () => {
    expect(formatFeet(inches(230))).toBe("19 ft 2 in");
    expect(formatFeet(inches(216))).toBe("18 ft");
    expect(formatFeet(inches(11.5), 2)).toBe("11 1/2 in");
    expect(formatFeet(inches(14.5), 2)).toBe("1 ft 2 1/2 in");
  });
  it("follows the person's unit", () => {
    expect(formatLength(inches(26.5), "in")).toBe("26 1/2 in");
    expect(formatLength(inches(26.5), "mm")).toBe("673.1 mm");
  });
});
