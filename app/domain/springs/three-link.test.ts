import fc from "fast-check";
import { describe, expect, it } from "vitest";
import type { Outcome } from "../outcome";
import { inches, mm, toInches } from "../units/length";
import { mainLeaf, turnedLeaf } from "./main-leaf";
import { ARC_LINK, CANTILEVER_LINK, compareLinks, linksAtArch, threeLinks } from "./three-link";

const value = <T>(outcome: Outcome<T>): T => {
  if (!outcome.ok) throw new Error(outcome.problem);
  return outcome.value;
};
const fault = (outcome: Outcome<unknown>) => (outcome.ok ? JSON.stringify(outcome.value) : outcome.problem);
const even = value(mainLeaf({ front: inches(26), rear: inches(26) }));
const clamped = value(mainLeaf({ front: inches(26), rear: inches(26), clamped: inches(4) }));

describe("threeLinks", () => {
  it("does the examples", () => {
    const { frontLink, middle, rearLink } = value(threeLinks(clamped));
    expect(toInches(frontLink)).toBeCloseTo(18, 9);
    expect(toInches(middle)).toBeCloseTo(16, 9);
    expect(toInches(rearLink)).toBeCloseTo(18, 9);
    expect(toInches(value(threeLinks(clamped, CANTILEVER_LINK)).frontLink)).toBeCloseTo(20, 9);
    expect(toInches(value(linksAtArch(even, inches(5))).eyeDistance)).toBeCloseTo(50.69615, 5);
    const comparison = value(compareLinks(even, { from: inches(5), to: inches(-2), steps: 14 }));
    expect(toInches(comparison.pinApart)).toBeCloseTo(0.00057, 5);
    expect(comparison.rows).toHaveLength(15);
  });
  it("says what is no link", () => {
    expect(fault(threeLinks(even, { radiusShare: 0, endSlope: 2 }))).toMatch(/share/);
    expect(fault(threeLinks(even, { radiusShare: 1.1, endSlope: 2 }))).toMatch(/share/);
    expect(fault(threeLinks(even, { radiusShare: 0.75, endSlope: 0 }))).toMatch(/slope/);
    expect(fault(linksAtArch(even, inches(30)))).toMatch(/too short/);
  });
  it("parts from the arc only by the fourth power of the arch", () => {
    fc.assert(
      fc.property(fc.double({ min: 600, max: 800, noNaN: true }), (front) => {
        const leaf = value(mainLeaf({ front: mm(front), rear: mm(1400 - front) }));
        const apart = (arch: number) =>
          value(compareLinks(leaf, { from: mm(arch), to: mm(arch), steps: 1 })).eyesApart;
        expect(apart(160) / apart(80)).toBeCloseTo(16, -1);
        expect(apart(80)).toBeLessThan(0.02);
      }),
    );
  });
  it("needs three quarters: any other share is out by the square of the arch", () => {
    const out = (share: number, arch: number) =>
      value(
        compareLinks(even, { from: mm(arch), to: mm(arch), steps: 1 }, { ...ARC_LINK, radiusShare: share }),
      ).eyesApart;
    for (const share of [0.65, 5 / 6, 1]) expect(out(share, 40) / out(share, 20)).toBeCloseTo(4, 1);
    expect(out(0.75, 40)).toBeLessThan(out(0.74, 40) / 20);
  });
  it("follows upturned eyes by pivots half as far below the leaf", () => {
    const eyes = (share: number) => {
      const leaf = value(
        mainLeaf({ front: mm(650), rear: mm(650), eyeOffset: { front: mm(25), rear: mm(25) } }),
      );
      const model = { radiusShare: 0.75, endSlope: (1 + share) / 0.75 };
      return value(compareLinks(leaf, { from: mm(65), to: mm(-15), steps: 10 }, model)).pinApart;
    };
    expect(eyes(0.5)).toBeLessThan(0.01);
    expect(eyes(0)).toBeGreaterThan(20 * eyes(0.5));
    expect(eyes(1)).toBeGreaterThan(20 * eyes(0.5));
  });
  it("swaps its halves when turned end for end", () => {
    const leaf = value(mainLeaf({ front: mm(600), rear: mm(720), eyeOffset: { front: mm(20) } }));
    const [as, turned] = [value(linksAtArch(leaf, mm(90))), value(linksAtArch(turnedLeaf(leaf), mm(90)))];
    expect(turned.fromFront).toBeCloseTo(as.fromRear, 6);
  });
});
