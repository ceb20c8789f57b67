import { describe, expect, it } from "vitest";
import { angleIn, GAUGE_PLACES, gaugeNow, postedGauge, slopeAt } from "./gauge";

const read = {
  "first.leftRail": "0.3",
  "turned.leftRail": "-0.1",
  "first.rightRail": "0.3",
  "turned.rightRail": "-0.1",
  "first.frontCross": "0.1",
  "turned.frontCross": "0.1",
  "first.rearCross": "0.1°",
  "turned.rearCross": "0,1",
};

describe("an angle off the gauge", () => {
  it.each([
    ["0.4", 0.4],
    [" −1,2 ", -1.2],
    ["+.5°", 0.5],
    ["", null],
    ["4 1/2", null],
    ["90", null],
  ])("%j is %s", (typed, value) => expect(angleIn(typed)).toBe(value));
});

describe("a level by the gauge", () => {
  it("cancels the gauge's own error by turning it", () => {
    expect(slopeAt("leftRail", read)).toBeCloseTo(0.2, 10);
    expect(gaugeNow(read)).toMatchObject({ gaugeDoubt: false });
    expect(gaugeNow(read)?.noseHigh).toBeCloseTo(0.2, 10);
    expect(gaugeNow(read)?.rightHigh).toBeCloseTo(0, 10);
  });

  it("is not told before every place was read both ways", () => {
    expect(gaugeNow({ ...read, "turned.rearCross": "" })).toBeNull();
  });

  it("posts both ways round of all four places", () => {
    expect(Object.keys(postedGauge(read))).toHaveLength(1 + GAUGE_PLACES.length * 2);
  });
});
