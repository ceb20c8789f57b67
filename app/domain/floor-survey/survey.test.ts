import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { degrees } from "../units/angle";
import { inches, type Millimetres, mm } from "../units/length";
import { curvatures, elevationDifferences, fNumbers, meanAndDeviation } from "./f-numbers";
import { floorClass, localMinimum } from "./floor-classes";
import { BAY_LIMITS, rateBay } from "./rating";
import { floorHeightAt, standShims } from "./stand-shims";
import { directionWords, type FloorHeight, perMetre, surveyFloor } from "./survey";

const GRID = [0, 1000, 2000, 3000].flatMap((x) => [-1000, 0, 1000].map((y) => [x, y] as const));
const floor = (rise: (x: number, y: number) => number): FloorHeight[] =>
  GRID.map(([x, y]) => ({ x: mm(x), y: mm(y), height: mm(rise(x, y)) }));
const must = (heights: FloorHeight[]) => {
  const survey = surveyFloor(heights);
  if (!survey.ok) throw new Error(survey.problem);
  return survey.value;
};

describe("surveyFloor", () => {
  it("finds a plane of 3 and 4 mm/m: 5 mm/m, 0.2865°, rising ahead and to the left", () => {
    const survey = must(floor((x, y) => 20 + 0.003 * x + 0.004 * y));
    expect([survey.riseAlong, survey.riseAcross, survey.steepest]).toEqual(
      [3, 4, 5].map((n) => expect.closeTo(n, 9)),
    );
    expect(survey.slope).toBeCloseTo(0.286477, 6);
    expect(survey.rises).toBeCloseTo(53.1301, 4);
    expect(survey.words).toBe("The floor rises 5.0 mm/m ahead and to the left.");
    expect(survey.flatness).toBeCloseTo(0, 9);
  });
  it("names the bump", () => {
    const survey = must(floor((x, y) => (x === 2000 && y === 0 ? 6 : 0)));
    expect(survey.bump).toMatchObject({ x: 2000, y: 0 });
    expect(survey.bump.deviation).toBeGreaterThan(5);
    expect(survey.flatness).toBeLessThan(7);
  });
  it("deviates the same when the whole floor is raised and tilted", () => {
    const small = fc.double({ min: -0.01, max: 0.01, noNaN: true });
    fc.assert(
      fc.property(small, small, fc.double({ min: -500, max: 500, noNaN: true }), (a, b, c) => {
        const bumps = (x: number, y: number) => Math.sin(x) * 3 + Math.cos(y / 7) * 2;
        const [plain, tilted] = [must(floor(bumps)), must(floor((x, y) => bumps(x, y) + a * x + b * y + c))];
        return plain.deviations.every(
          (one, i) => Math.abs(one.deviation - (tilted.deviations[i]?.deviation ?? 99)) < 1e-6,
        );
      }),
    );
  });
  it("wants three heights that are not in a line", () => {
    expect(surveyFloor(floor(() => 0).slice(0, 2)).ok).toBe(false);
    expect(surveyFloor(floor(() => 0).filter((one) => one.y === 0)).ok).toBe(false);
    expect(surveyFloor(Array(2001).fill({ x: mm(0), y: mm(0), height: mm(0) })).ok).toBe(false);
  });
  it("says a direction to the nearest of eight", () => {
    expect([0, 45, 91, 180, -90, -170].map((angle) => directionWords(degrees(angle)))).toEqual([
      "ahead",
      "ahead and to the left",
      "to the left",
      "back",
      "to the right",
      "back",
    ]);
    expect(perMetre(1)).toBeCloseTo(0.0572958, 7);
  });
});

describe("rateBay", () => {
  const rate = (steepest: number, flatness: number) => rateBay({ steepest, flatness: inches(flatness) });
  it("calls a floor good, usable or unfit, and says why", () => {
    expect(rate(0.4, 1 / 16).words).toBe("Good for layout: 0.4 mm/m and 1/16 in from bump to hollow.");
    expect(rate(5, 1 / 16).rating).toBe("usable");
    expect(rate(5, 3 / 4).words).toBe(
      "Not fit for layout, too uneven: 5.0 mm/m and 3/4 in from bump to hollow.",
    );
    expect(rate(20, 1).words).toContain("too steep and too uneven");
  });
  it("counts a floor at the limit in", () =>
    expect(rateBay({ steepest: BAY_LIMITS.goodSlope, flatness: BAY_LIMITS.goodFlatness }).rating).toBe(
      "good",
    ));
});

describe("shims on a floor", () => {
  const slope = floor((x) => x * 0.004);
  it("reads the floor between two heights of 0 and 4 as 2, and at a height as it was read", () => {
    const at = (x: number, y: number) => {
      const height = floorHeightAt(slope, { x: mm(x), y: mm(y) });
      return height.ok ? height.value : Number.NaN;
    };
    expect(at(500, 0)).toBeCloseTo(2, 9);
    expect(at(1000, 1000)).toBe(4);
    expect(at(3200, 0)).toBeCloseTo(12.8, 9);
  });
  it("shims the low stands up to the highest floor", () => {
    const stands = [
      { id: "front", x: mm(3000), y: mm(0) },
      { id: "rear", x: mm(0), y: mm(0) },
    ];
    const shims = standShims(slope, stands, mm(1));
    expect(shims.ok && shims.value.map((one) => one.shim)).toEqual([0, 12]);
  });
  it("knows nothing outside what was surveyed", () => {
    expect(standShims(slope, [{ id: "far", x: mm(9000), y: mm(0) }], mm(1))).toEqual({
      ok: false,
      problem: "far: That place lies outside what was surveyed: take heights around it.",
    });
    expect(standShims(slope, [], mm(1)).ok).toBe(false);
  });
});

describe("F-numbers", () => {
  const wave = Array.from({ length: 30 }, (_, i) => mm(2 * Math.sin(i) + 0.3 * Math.cos(3 * i)));
  it("takes curvatures of three and differences of eleven", () => {
    expect(curvatures([mm(418.617), mm(419.938), mm(421.894)])[0]).toBeCloseTo(0.635, 9);
    expect(elevationDifferences(wave)[0]).toBeCloseTo((wave[10] ?? 0) - (wave[0] ?? 0), 12);
    expect(meanAndDeviation([1, 2, 3])).toEqual({ mean: 2, deviation: 1 });
  });
  it("keeps FF when the line is raised or tilted, and halves it when the bumps are twice as high", () => {
    const ff = (heights: Millimetres[]) => {
      const numbers = fNumbers([heights]);
      return numbers.ok ? numbers.value.flatness : Number.NaN;
    };
    expect(ff(wave.map((h, i) => mm(h + 7 * i + 100)))).toBeCloseTo(ff(wave), 6);
    expect(ff(wave.map((h) => mm(2 * h)))).toBeCloseTo(ff(wave) / 2, 9);
  });
  it("has none for too few heights or a perfect line, and no levelness under twelve", () => {
    expect(fNumbers([[mm(0), mm(1), mm(0)]]).ok).toBe(false);
    expect(fNumbers([Array.from({ length: 20 }, (_, i) => mm(i))]).ok).toBe(false);
    expect(fNumbers([wave.slice(0, 11)])).toMatchObject({ ok: true, value: { levelness: null } });
  });
  it("names the strictest class that both numbers reach", () => {
    expect(floorClass(36, 24)?.name).toBe("moderately flat");
    expect(floorClass(36, null)?.name).toBe("flat");
    expect(floorClass(10, 50)).toBeNull();
    expect(localMinimum({ name: "flat", flatness: 35, levelness: 25 })).toEqual({
      flatness: 21,
      levelness: 15,
    });
  });
});
