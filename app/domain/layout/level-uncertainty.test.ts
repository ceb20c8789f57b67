import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { degrees } from "../units/angle";
import { inches, mm, toInches } from "../units/length";
import type { StandHeight } from "./level";
import { combineLevels, gaugeUncertainty } from "./level-combined";
import { shiftBySlope, slopeTolerance, steepestSlope } from "./level-shift";
import { levelUncertainty } from "./level-uncertainty";

const stand = (x: number, y: number, height: number): StandHeight => ({
  id: `${x}/${y}`,
  x: mm(x),
  y: mm(y),
  height: mm(height),
});
const FOUR = [stand(1000, 400, 600), stand(1000, -400, 600), stand(-1000, 400, 600), stand(-1000, -400, 600)];
const must = (stands: StandHeight[], sigma = 0.8) => {
  const unsure = levelUncertainty(stands, mm(sigma));
  if (!unsure.ok) throw new Error(unsure.problem);
  return unsure.value;
};

describe("levelUncertainty", () => {
  it("is ±0.0229° nose to tail and ±0.0573° side to side on stands 2000 by 800 mm", () => {
    // σ/√Σx² = 0.8/2000 and 0.8/800 by hand.
    const unsure = must(FOUR);
    expect(unsure.noseHigh).toBeCloseTo(0.022918, 6);
    expect(unsure.rightHigh).toBeCloseTo(0.057296, 6);
    expect(unsure).toMatchObject({ redundancy: 1, residualDeviation: expect.closeTo(0, 9) });
    expect(unsure.correlation).toBeCloseTo(0, 12);
  });
  it("says that nothing checks three heights", () => {
    const unsure = must(FOUR.slice(0, 3));
    expect(unsure).toMatchObject({ redundancy: 0, residualDeviation: null });
    expect(unsure.words).toContain("nothing checks them");
  });
  it("covers what wrong heights do to the slope, at the stated rate", () => {
    let state = 12345;
    const uniform = () => {
      state = (state * 1664525 + 1013904223) % 4294967296;
      return (state + 0.5) / 4294967296;
    };
    const normal = () => Math.sqrt(-2 * Math.log(uniform())) * Math.cos(2 * Math.PI * uniform());
    const { noseHigh } = must(FOUR);
    let within = 0;
    const tries = 4000;
    for (let i = 0; i < tries; i++) {
      const heights = FOUR.map(() => 0.8 * normal());
      const slope = ((heights[0] ?? 0) + (heights[1] ?? 0) - (heights[2] ?? 0) - (heights[3] ?? 0)) / 4000;
      if (Math.abs((Math.atan(slope) * 180) / Math.PI) <= 1.96 * noseHigh) within++;
    }
    // 95 % of 4000, four standard deviations either way.
    expect(Math.abs(within / tries - 0.95)).toBeLessThan(0.014);
  });
});

describe("combineLevels", () => {
  const flat = (noseHigh: number, rightHigh = 0) => ({
    noseHigh: degrees(noseHigh),
    rightHigh: degrees(rightHigh),
  });
  it("takes half of each where both are equally sure", () => {
    const level = combineLevels(flat(0.1), flat(0.02, 0.02), flat(0.18), degrees(0.02));
    expect(level.noseHigh).toBeCloseTo(0.14, 12);
    expect(level.uncertainty.noseHigh).toBeCloseTo(0.02 / Math.SQRT2, 12);
    expect(level).toMatchObject({ agree: true, words: "Gauge and heights agree." });
  });
  it("says so where they cannot both be right", () => {
    const level = combineLevels(flat(0.1), flat(0.02, 0.02), flat(0.4), degrees(0.02));
    expect(level.agree).toBe(false);
    expect(level.words).toBe(
      "Gauge and heights differ by 0.30° nose to tail, more than both can be out by chance: measure both again before using either.",
    );
  });
  it("takes a gauge of 0.1° as 0.0144° sure", () => expect(gaugeUncertainty()).toBeCloseTo(0.01443, 5));
  it("lies between the two and is surer than either", () => {
    const slope = fc.double({ min: -1, max: 1, noNaN: true });
    const sure = fc.double({ min: 0.001, max: 0.2, noNaN: true });
    fc.assert(
      fc.property(slope, slope, sure, sure, (a, b, u, v) => {
        const level = combineLevels(flat(a), flat(u, u), flat(b), degrees(v));
        return (
          level.noseHigh >= Math.min(a, b) - 1e-12 &&
          level.noseHigh <= Math.max(a, b) + 1e-12 &&
          level.uncertainty.noseHigh <= Math.min(u, v) + 1e-12
        );
      }),
    );
  });
});

describe("shiftBySlope", () => {
  const shift = (h: number, nose: number, right: number) =>
    shiftBySlope(inches(h), { noseHigh: degrees(nose), rightHigh: degrees(right) });
  it("lands a point 30 in up 0.524 in back with the nose 1° high, and to the left with the right side high", () => {
    expect(toInches(shift(30, 1, 0).x)).toBeCloseTo(-0.5236, 4);
    expect(shift(30, 1, 0).y).toBe(0);
    expect(toInches(shift(30, 0, 1).y)).toBeCloseTo(0.5236, 4);
  });
  it("is as long as h times the sine of the steepest slope, whatever the two are", () => {
    const slope = fc.double({ min: -5, max: 5, noNaN: true });
    fc.assert(
      fc.property(slope, slope, (nose, right) => {
        const { x, y } = shift(30, nose, right);
        const steepest = steepestSlope({ noseHigh: degrees(nose), rightHigh: degrees(right) });
        return Math.abs(Math.hypot(x, y) - inches(30) * Math.sin((steepest * Math.PI) / 180)) < 1e-9;
      }),
    );
  });
  it("mirrors when left and right are swapped", () => {
    const [a, b] = [shift(20, 0.4, 0.7), shift(20, 0.4, -0.7)];
    expect(a.x).toBe(b.x);
    expect(a.y).toBe(-b.y);
  });
});

describe("slopeTolerance", () => {
  it("takes the point furthest from the datum: 1/16 in at 30 in allows 0.1194°", () => {
    const tolerance = slopeTolerance(
      [
        { id: "hub", height: inches(-6) },
        { id: "lip", height: inches(30) },
      ],
      inches(1 / 16),
    );
    expect(tolerance).toMatchObject({ ok: true, value: { point: "lip" } });
    expect(tolerance.ok && tolerance.value.allowed).toBeCloseTo(0.11937, 5);
    expect(tolerance.ok && tolerance.value.words).toBe(
      "1/16 in at lip, 30 in from the datum, allows 0.119°.",
    );
  });
  it("says why there is none", () => {
    expect(slopeTolerance([], mm(1)).ok).toBe(false);
    expect(slopeTolerance([{ id: "p", height: mm(0) }], mm(1)).ok).toBe(false);
    expect(slopeTolerance([{ id: "p", height: mm(10) }], mm(0)).ok).toBe(false);
    expect(slopeTolerance([{ id: "p", height: mm(10) }], mm(10)).ok).toBe(false);
  });
});
