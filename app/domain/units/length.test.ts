import fc from "fast-check";
import { describe, expect, it } from "vitest";
import {
  formatCentimetres,
  formatDecimalInches,
  formatFeet,
  formatInches,
  formatLength,
  formatMillimetres,
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
    ["5/4", 1.25],
    ["26⅖", 26.4],
    ["0,125", 0.125],
    ["12 13/32 in", 12.40625],
    ["1'", 12],
    ["1 foot 6 inches", 18],
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
    ["3/0", /^3\/0 is not a fraction\.$/],
    ["26 1/0", /^1\/0 is not a fraction\.$/],
    ["5/4/2", /fraction too many/],
    ["12 13 in", /“12 13” is not a length: two numbers/],
    ["2' 3 4", /two numbers/],
    ["1/-2", /minus goes in front/],
    ["1/", /not a fraction as on the tape/],
    ["/2", /not a fraction as on the tape/],
    ["1/2 ft", /fraction of a foot/],
    ["2 1/2'", /fraction of a foot/],
    ["1e9", /is not a length/],
    ["Infinity", /is not a length/],
    ["99999999", /longer than 100 m/],
    ["999999999999999 mm", /longer than 100 m/],
    ["1,500 mm", /^“1,500” could be 1500 or 1.500/],
    ["2' 1,125", /could be 1125 or 1.125/],
    ["1,500", /leave the comma out/],
    ["1.2.3", /is not a length/],
    ["--2", /is not a length/],
    ["26 1/2 mm", /is not a number of mm/],
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
  it("writes centimetres", () => {
    expect(formatCentimetres(inches(26.5))).toBe("67.3 cm");
    expect(formatCentimetres(mm(-0.4))).toBe("0.0 cm");
    expect(formatCentimetres(mm(12.25), 2, "to-even")).toBe("1.22 cm");
  });
  it("rounds halves of decimals by the rule, whatever the machine makes of them", () => {
    expect(formatDecimalInches(inches(0.375))).toBe("0.38");
    expect(formatDecimalInches(inches(26.125))).toBe("26.13");
    expect(formatDecimalInches(inches(26.125), 2, "to-even")).toBe("26.12");
    expect(formatDecimalInches(inches(-26.125), 2, "to-even")).toBe("−26.12");
    expect(formatMillimetres(mm(12.65), 1)).toBe("12.7 mm");
    expect(formatMillimetres(mm(12.65), 1, "to-even")).toBe("12.6 mm");
    expect(formatFeet(inches(30.5), 1)).toBe("2 ft 7 in");
    expect(formatFeet(inches(30.5), 1, "to-even")).toBe("2 ft 6 in");
  });
  it("follows the person's unit", () => {
    expect(formatLength(inches(26.5), "in")).toBe("26 1/2 in");
    expect(formatLength(inches(26.5), "mm")).toBe("673.1 mm");
  });
});
