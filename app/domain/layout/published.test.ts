import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { leastSquares } from "../geometry/least-squares";
import { distance, floorPoint } from "../geometry/point";
import { degrees } from "../units/angle";
import { inches, mm, toInches } from "../units/length";
import { approachAngle } from "./approach";
import { pointFromTies } from "./drops";
import { allowedSlope, gaugeSlope, landsOut, levelFromAngles, levelFromHeights } from "./level";
import { CRITICAL_W } from "./tie-fit";

/* Checks against work that others published, named beside each, and against general laws. */

describe("least squares", () => {
  it("agrees with NIST StRD NoInt1 and NoInt2 (certified values)", () => {
    const xs = Array.from({ length: 11 }, (_, i) => 60 + i);
    const fit = leastSquares(
      xs.map((x) => [x]),
      xs.map((x) => x + 70),
    );
    expect(fit?.solution[0]).toBeCloseTo(2.07438016528926, 12);
    const s = Math.sqrt((fit?.residuals ?? []).reduce((sum, v) => sum + v * v, 0) / 10);
    expect(s).toBeCloseTo(3.56753034006338, 10);
    expect(s * Math.sqrt(fit?.cofactor[0]?.[0] ?? 0)).toBeCloseTo(0.0165289256198347, 12);
    expect(leastSquares([[4], [5], [6]], [3, 4, 4])?.solution[0]).toBeCloseTo(0.727272727272727, 12);
  });
  it("agrees with JCGM 100 H.3 (thermometer calibration, 11 points; data as printed there, from memory)", () => {
    const t = [21.521, 22.012, 22.512, 23.003, 23.507, 23.999, 24.513, 25.002, 25.503, 26.01, 26.511];
    const b = [-0.171, -0.169, -0.166, -0.159, -0.164, -0.165, -0.156, -0.157, -0.159, -0.161, -0.16];
    const fit = leastSquares(
      t.map((x) => [1, x - 20]),
      b,
    );
    expect(fit?.solution[0]).toBeCloseTo(-0.1712, 4);
    expect(fit?.solution[1]).toBeCloseTo(0.00218, 5);
    const s = Math.sqrt((fit?.residuals ?? []).reduce((sum, v) => sum + v * v, 0) / 9);
    expect(s).toBeCloseTo(0.0035, 4);
    expect(s * Math.sqrt(fit?.cofactor[0]?.[0] ?? 0)).toBeCloseTo(0.0029, 4);
  });
  it("answers null when the rows do not determine the unknowns", () => {
    expect(
      leastSquares(
        [
          [1, 2],
          [2, 4],
          [3, 6],
        ],
        [1, 2, 3],
      ),
    ).toBeNull();
    expect(leastSquares([[1, 2]], [1])).toBeNull();
  });
});

describe("tapes from marks", () => {
  it("agrees with Strang and Borre 1997, example 10.1, p. 345 (as transcribed by Krumm, Geodetic Network Adjustment Examples, 2020)", () => {
    const fit = pointFromTies(
      [
        { mark: "1", at: floorPoint(170.71, 270.71), distance: mm(100.01) },
        { mark: "2", at: floorPoint(100, 100), distance: mm(100.02) },
        { mark: "3", at: floorPoint(241.42, 100), distance: mm(100.03) },
      ],
      "left",
      mm(0.01),
    );
    if (!fit.ok) throw new Error(fit.problem);
    const { point, residuals, covariance } = fit.value;
    expect(point.x).toBeCloseTo(170.7029, 4);
    expect(point.y).toBeCloseTo(170.7234, 4);
    const s0 = Math.sqrt(residuals.reduce((sum, r) => sum + r.residual ** 2, 0)) / 0.01;
    expect(Math.sqrt(covariance.xx) * s0).toBeCloseTo(0.03303, 5);
    expect(Math.sqrt(covariance.yy) * s0).toBeCloseTo(0.02335, 5);
    expect(residuals.map((r) => Number(r.redundancyNumber.toFixed(2)))).toEqual([0.5, 0.25, 0.25]);
  });
  it("uses the 0.1 % two-sided limit of the normal law (3.2905; Baarda 1968, from memory)", () =>
    expect(CRITICAL_W).toBeCloseTo(3.2905, 2));
  it("finds any point again from four marks, and its redundancy numbers add up to the redundancy", () => {
    const marks = { A: [0, 0], B: [3048, 0], C: [3048, -1219.2], D: [0, -1219.2] } as const;
    fc.assert(
      fc.property(fc.integer({ min: -500, max: 3500 }), fc.integer({ min: 50, max: 1500 }), (x, y) => {
        const ties = Object.entries(marks).map(([mark, [mx, my]]) => ({
          mark,
          at: floorPoint(mx, my),
          distance: distance(floorPoint(x, y), floorPoint(mx, my)),
        }));
        const fit = pointFromTies(ties, "left", mm(0.8));
        if (!fit.ok) return false;
        const r = fit.value.residuals.reduce((sum, one) => sum + one.redundancyNumber, 0);
        return (
          distance(fit.value.point, floorPoint(x, y)) < 1e-4 && Math.abs(r - 2) < 1e-6 && !fit.value.suspect
        );
      }),
    );
  });
  it("suggests an inch burnt wherever it was burnt, and never without a disagreement", () => {
    const marks = { A: [0, 0], B: [3048, 0], D: [0, -1219.2] } as const;
    fc.assert(
      fc.property(
        fc.integer({ min: 600, max: 2400 }),
        fc.integer({ min: 300, max: 1200 }),
        fc.constantFrom("A", "B", "D"),
        (x, y, burnt) => {
          const ties = Object.entries(marks).map(([mark, [mx, my]]) => ({
            mark,
            at: floorPoint(mx, my),
            distance: mm(distance(floorPoint(x, y), floorPoint(mx, my)) + (mark === burnt ? 25.4 : 0)),
          }));
          const fit = pointFromTies(ties, "left", mm(0.8));
          return (
            fit.ok &&
            fit.value.suspect &&
            fit.value.suggestions.some((s) => s.kind === "inch-burnt" && s.mark === burnt)
          );
        },
      ),
    );
  });
  it("names two tapes that do not reach each other, and two that nothing checks", () => {
    const two = (a: number, b: number) =>
      pointFromTies(
        [
          { mark: "A", at: floorPoint(0, 0), distance: inches(a) },
          { mark: "B", at: floorPoint(inches(120), 0), distance: inches(b) },
        ],
        "right",
        mm(0.8),
      );
    expect(two(20, 30)).toEqual({
      ok: false,
      problem: "The tapes from A and B do not reach each other: 20 in and 30 in between marks 120 in apart.",
    });
    const fit = two(72, 96);
    if (!fit.ok) throw new Error(fit.problem);
    // 72, 96, 120 is a right triangle: the foot lies 43.2 in from A, the point 57.6 in off the line.
    expect(toInches(fit.value.point.x)).toBeCloseTo(43.2, 9);
    expect(toInches(fit.value.point.y)).toBeCloseTo(-57.6, 9);
    expect(fit.value).toMatchObject({
      checked: false,
      advice: "Two tapes: nothing checks this point. A third would.",
    });
  });
});

describe("level", () => {
  // Slopes per foot: plain trigonometry, 1/8 in a foot is 0.5968°, 1/16 is 0.2984°.
  it.each([
    [1 / 16, 0.2984],
    [1 / 8, 0.5968],
    [1 / 4, 1.1935],
    [1 / 2, 2.3859],
  ])("reads a fall of %d in a foot as %d°", (fall, slope) => {
    const h = (x: number, y: number) => ({
      id: `${x},${y}`,
      x: inches(x),
      y: inches(y),
      height: inches(20 + (x / 12) * fall),
    });
    const level = levelFromHeights([h(0, 15), h(0, -15), h(96, 15), h(96, -15)]);
    expect(level.ok && level.value.noseHigh).toBeCloseTo(slope, 4);
  });
  it("lands a point 30 in up 0.524 in out at 1°, one 24 in up 0.41886", () => {
    expect(toInches(landsOut(inches(30), degrees(1)))).toBeCloseTo(0.524, 3);
    expect(toInches(landsOut(inches(24), degrees(1)))).toBeCloseTo(0.41886, 5);
  });
  it("derives the slope allowed from the error allowed", () => {
    expect(allowedSlope(inches(0.524), inches(30))).toBeCloseTo(1.0008, 3);
    expect(() => allowedSlope(inches(2), inches(1))).toThrow(RangeError);
  });
  it("finds any plane again", () => {
    const small = fc.double({ min: -0.02, max: 0.02, noNaN: true });
    fc.assert(
      fc.property(small, small, (a, b) => {
        const h = (x: number, y: number) => ({
          id: `${x},${y}`,
          x: mm(x),
          y: mm(y),
          height: mm(600 + a * x + b * y),
        });
        const level = levelFromHeights([
          h(1800, 380),
          h(1750, -370),
          h(-1000, 400),
          h(-1010, -390),
          h(300, 0),
        ]);
        return (
          level.ok &&
          Math.abs(level.value.noseHigh - (Math.atan(a) * 180) / Math.PI) < 1e-7 &&
          Math.abs(level.value.rightHigh + (Math.atan(b) * 180) / Math.PI) < 1e-7
        );
      }),
    );
  });
  it("wants three stands that are not in a line", () => {
    const h = (x: number) => ({ id: `${x}`, x: inches(x), y: inches(0), height: inches(24) });
    expect(levelFromHeights([h(0), h(10)]).ok).toBe(false);
    expect(levelFromHeights([h(0), h(10), h(20)])).toMatchObject({
      ok: false,
      problem: expect.stringContaining("one line"),
    });
  });
  it("takes a gauge's own error out by turning it, and doubts a gauge whose error wanders", () => {
    expect(gaugeSlope(degrees(0.4), degrees(0.2))).toEqual({
      slope: expect.closeTo(0.1, 9),
      gaugeOffset: expect.closeTo(0.3, 9),
    });
    const good = { first: degrees(0.4), turned: degrees(0.2) };
    const readings = { leftRail: good, rightRail: good, frontCross: good, rearCross: good };
    expect(levelFromAngles(readings)).toMatchObject({
      noseHigh: expect.closeTo(0.1, 9),
      gaugeDoubt: false,
      twistDegrees: 0,
    });
    expect(
      levelFromAngles({ ...readings, rearCross: { first: degrees(0.7), turned: degrees(0.2) } }).gaugeDoubt,
    ).toBe(true);
  });
});

describe("approach angle", () => {
  // Own recomputation of the tangent formula; no published value for these.
  it.each([
    [16, 30, 14, 28.3369],
    [15.5, 36, 20, 32.417],
  ])("radius %d, %d ahead, %d high: %d°", (r, d, z, angle) =>
    expect(approachAngle(inches(r), inches(d), inches(z))).toBeCloseTo(angle, 4),
  );
  it("is the same in any unit", () =>
    expect(approachAngle(mm(375), mm(800), mm(420))).toBeCloseTo(31.1247, 4));
  it("is not bounded by what lies behind the axle or within the tyre", () => {
    expect(approachAngle(inches(16), inches(-3), inches(14))).toBeNull();
    expect(approachAngle(inches(16), inches(5), inches(14))).toBeNull();
  });
});
