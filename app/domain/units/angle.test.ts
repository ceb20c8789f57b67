import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { degrees, formatDegrees, formatDegreesAndMinutes, toDegrees, toRadians } from "./angle";
import { parseAngle } from "./parse-angle";

const read = (text: string) => {
  const came = parseAngle(text);
  return came.ok ? came.value : came.problem;
};

describe("parseAngle", () => {
  it.each([
    ["12.5", 12.5],
    ["12.5°", 12.5],
    ["12,5 deg", 12.5],
    ["12 degrees", 12],
    [".5°", 0.5],
    ["12° 30'", 12.5],
    ["12 30'", 12.5],
    ["12°30′", 12.5],
    ["12 deg 30 min", 12.5],
    ["12° 30' 18\"", 12.505],
    ["12° 30′ 18″", 12.505],
    ['12° 18"', 12.005],
    ["30'", 0.5],
    ["90'", 1.5],
    ["30.6'", 0.51],
    ["-3", -3],
    ["−0° 30′", -0.5],
    ["- 0.2°", -0.2],
    ["-0", 0],
    ["360", 360],
    [" 7 º ", 7],
  ])("reads %s", (text, want) => expect(read(text)).toBeCloseTo(want, 12));
  it.each([
    ["", /^Type the angle in degrees/],
    ["-", /is not an angle/],
    ["°", /is not an angle/],
    ["abc", /^“abc” is not an angle/],
    ["12 30", /is not an angle/],
    ["1e1", /is not an angle/],
    ["1/2", /is not an angle/],
    ["--3", /is not an angle/],
    ["12' 3°", /is not an angle/],
    ["12.5° 30'", /one or the other/],
    ["12° 30.5' 10\"", /one or the other/],
    ["12° 60'", /^60' is a degree or more/],
    ["12' 75\"", /^75" is a minute or more/],
    ["361", /whole turn/],
    ["9".repeat(31), /too long/],
    ["9".repeat(30), /whole turn/],
  ])("says what is wrong with %j", (text, words) => expect(read(text)).toMatch(words));
  it("never throws and never answers with anything but a finite angle", () => {
    const sign = fc.constantFrom(..."0123456789.,°'\"- degmins/e");
    fc.assert(
      fc.property(fc.oneof(fc.string(), fc.string({ unit: sign, maxLength: 14 })), (text) => {
        const came = parseAngle(text);
        return came.ok ? Math.abs(came.value) <= 360 : came.problem.endsWith(".");
      }),
    );
  });
});

describe("what is shown can be typed back", () => {
  it("every minute of arc", () => {
    fc.assert(
      fc.property(fc.integer({ min: -360 * 60, max: 360 * 60 }), (minutes) => {
        expect(read(formatDegreesAndMinutes(degrees(minutes / 60)))).toBeCloseTo(minutes / 60, 9);
      }),
    );
  });
  it("every hundredth of a degree", () => {
    fc.assert(
      fc.property(fc.integer({ min: -36_000, max: 36_000 }), (hundredths) => {
        expect(read(formatDegrees(degrees(hundredths / 100)))).toBeCloseTo(hundredths / 100, 9);
      }),
    );
  });
});

describe("formatting", () => {
  it("rounds halves away from zero, with a true minus sign", () => {
    expect(formatDegrees(degrees(-0.175))).toBe("−0.18°");
    expect(formatDegrees(degrees(1.005))).toBe("1.01°");
    expect(formatDegrees(degrees(-0.001))).toBe("0.00°");
    expect(formatDegreesAndMinutes(degrees(-0.5))).toBe("−0° 30′");
    expect(formatDegreesAndMinutes(degrees(11.9999))).toBe("12° 00′");
    expect(formatDegreesAndMinutes(degrees(-0.001))).toBe("0° 00′");
  });
});

describe("radians", () => {
  it("and back are the same angle", () => {
    fc.assert(
      fc.property(fc.double({ min: -360, max: 360, noNaN: true }), (angle) => {
        expect(toDegrees(toRadians(degrees(angle)))).toBeCloseTo(angle, 10);
      }),
    );
  });
  it("refuse what is no angle", () => expect(() => degrees(Number.NaN)).toThrow(RangeError));
});
