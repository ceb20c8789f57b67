import { describe, expect, it } from "vitest";
import { floorPoint } from "../geometry/point";
import { inches, mm } from "../units/length";
import type { DropPointId, DropSide } from "./drops";
import { agreeWithin, lookLabel, pointsToLookAt, thirdDecides, type Weight, weightsOf } from "./second-look";

/** The measured case, holes at 70.5 in. */
const PLACES: Record<string, [number, number]> = {
  "opening-front left": [82.375, 30.25],
  "opening-front right": [82.125, -30.375],
  "opening-rear left": [46.625, 30.125],
  "opening-rear right": [46.5, -30.1875],
  "datum-front left": [100, 16],
  "datum-front right": [100, -16.25],
  "datum-rear left": [20, 16.25],
  "datum-rear right": [20, -16],
  "hanger-hole left": [90.5, 15.4],
  "hanger-hole right": [90.5, -15.6],
};
const at = (point: DropPointId, side: DropSide) => {
  const place = PLACES[`${point} ${side}`];
  return place ? floorPoint(inches(place[0]), inches(place[1])) : null;
};

describe("which readings weigh", () => {
  it("finds the hanger holes heaviest: each moves the result by half, an opening's edge by a quarter", () => {
    const weights = weightsOf(at, "square");
    expect(weights.map(lookLabel).slice(0, 2)).toEqual(["Hanger hole 1, left", "Hanger hole 1, right"]);
    // Half squared twice, a quarter squared four times: 2/4 to 4/16.
    expect(weights[0]?.share).toBeCloseTo(1 / 3, 2);
    expect(weights[2]?.share).toBeCloseTo(1 / 12, 2);
    expect(weights.reduce((sum, weight) => sum + weight.share, 0)).toBeCloseTo(1, 9);
  });
  it("asks for two to four, until more than half of what is unsure is looked at again", () => {
    expect(pointsToLookAt(weightsOf(at, "square")).map(lookLabel)).toEqual([
      "Hanger hole 1, left",
      "Hanger hole 1, right",
    ]);
    const even: Weight[] = Array.from({ length: 10 }, () => ({
      point: "datum-front",
      side: "left",
      share: 0.1,
    }));
    expect(pointsToLookAt(even)).toHaveLength(4);
    expect(pointsToLookAt([{ point: "datum-front", side: "left", share: 1 }])).toHaveLength(1);
  });
  it("finds none while a drop is missing", () => {
    expect(weightsOf((point, side) => (point === "datum-rear" ? null : at(point, side)), "square")).toEqual(
      [],
    );
  });
});

describe("two people's readings", () => {
  it("may be apart by both uncertainties together, twice", () =>
    expect(agreeWithin({ tape: mm(0.6), drop: mm(0.8) })).toBeCloseTo(2 * Math.SQRT2, 9));
  it("are settled by a third that lies near one of them", () => {
    const third = (fromFirst: number, fromSecond: number) =>
      thirdDecides({ fromFirst: mm(fromFirst), fromSecond: mm(fromSecond) }, mm(3));
    expect(third(1, 25)).toBe("first-stands");
    expect(third(25, 3)).toBe("second-stands");
    expect(third(12, 13)).toBe("neither");
  });
});
