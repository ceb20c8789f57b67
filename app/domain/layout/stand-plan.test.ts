import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { degrees } from "../units/angle";
import { formatInches, inches, mm } from "../units/length";
import { type StandHeight, standCorrections } from "./level";
import { standPlan } from "./stand-plan";

const SHIM = inches(1 / 16);
const PLACES = [
  ["left front", 70, 15],
  ["right front", 70, -15],
  ["left rear", -40, 15],
  ["right rear", -40, -15],
] as const;
const stands = (...sixteenths: number[]): StandHeight[] =>
  PLACES.map(([id, x, y], i) => ({
    id,
    x: inches(x),
    y: inches(y),
    height: inches(24 + (sixteenths[i] ?? 0) / 16),
  }));
const plan = (heights: StandHeight[], mode: "raise" | "either" = "raise", allowed = 0.1) => {
  const result = standPlan(heights, { mode, shim: SHIM, allowed: degrees(allowed) });
  if (!result.ok) throw new Error(result.problem);
  return result.value;
};

describe("standPlan", () => {
  it("raises the low side only, and leaves the high one alone", () => {
    const { moves, untouched, isTrue, words } = plan(stands(0, 5, 0, 5));
    expect(moves.map((move) => formatInches(move.raise))).toEqual(["5/16", "0", "5/16", "0"]);
    expect(untouched).toEqual(["right front", "right rear"]);
    expect(words).toEqual(["Raise left front 5/16 in.", "Raise left rear 5/16 in."]);
    expect(isTrue).toBe(true);
  });
  it("leaves a move out that the slope allowed does not need, and says what twist is left", () => {
    // A long frame: 1/16 in over 110 in is 0.03°.
    const tight = plan(stands(0, 8, -1, 7), "raise", 0.001);
    const loose = plan(stands(0, 8, -1, 7), "raise", 0.1);
    expect(tight.untouched.length).toBe(1);
    expect(loose.untouched).toEqual(["right front", "right rear"]);
    expect(Math.abs(loose.after.noseHigh)).toBeGreaterThan(0);
    expect(loose.after.twist ?? 99).toBeLessThanOrEqual(SHIM / 2);
  });
  it("does nothing where the frame is true already", () =>
    expect(plan(stands(0, 0, 0, 0))).toMatchObject({ words: [], isTrue: true }));
  it("lowers as well when it may, moving no more stands than when it may not", () => {
    const heights = stands(0, 0, 0, 6);
    expect(plan(heights, "either").words.length).toBeLessThanOrEqual(plan(heights).words.length);
  });
  it("says when no plan comes within what is allowed", () =>
    expect(plan(stands(0, 0.4, 0.1, 0.3), "raise", 0.0001).isTrue).toBe(false));
  it("never lowers with raise, comes true within half a shim, and never moves more stands than the plain way", () => {
    const sixteenth = fc.integer({ min: -16, max: 16 });
    fc.assert(
      fc.property(sixteenth, sixteenth, sixteenth, sixteenth, (a, b, c, d) => {
        const heights = stands(a, b, c, d);
        const { moves, words, isTrue, after } = plan(heights, "raise", 0.15);
        const plain = standCorrections(heights, { mode: "raise", shim: SHIM });
        const plainMoved = plain.ok ? plain.value.moves.filter((move) => move.raise !== 0).length : 0;
        const plainTrue =
          plain.ok &&
          Math.max(Math.abs(plain.value.after.noseHigh), Math.abs(plain.value.after.rightHigh)) <= 0.15;
        const twist = after.twist ?? 0;
        return (
          moves.every((move) => move.raise >= 0) &&
          isTrue &&
          (!plainTrue || words.length <= plainMoved) &&
          twist <= Math.abs(a - b - c + d) * (inches(1 / 64) as number) + SHIM / 2 + 1e-6
        );
      }),
      { numRuns: 40 },
    );
  });
  it("says why it cannot", () => {
    expect(standPlan([], { mode: "raise", shim: SHIM, allowed: degrees(0.1) }).ok).toBe(false);
    const many = Array.from({ length: 25 }, (_, i) => ({
      id: `${i}`,
      x: mm(i * 100),
      y: mm((i % 5) * 100),
      height: mm(500),
    }));
    expect(standPlan(many, { mode: "raise", shim: SHIM, allowed: degrees(0.1) })).toMatchObject({
      ok: false,
      problem: "At most 24 stands can be planned for.",
    });
  });
});
