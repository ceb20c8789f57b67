import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { framePoint } from "../geometry/point";
import { degrees } from "../units/angle";
import { inches, mm } from "../units/length";
import type { AxleLine } from "./axle-line";
import { type AxleEnds, axleFromEnds, compareAsBuilt, thrustFromToe, toeAngle, wheelbases } from "./square";
import { squareVerdict } from "./square-words";

const LINE: AxleLine = {
  method: "square",
  station: inches(44),
  turn: degrees(0),
  residualLeft: mm(0),
  residualRight: mm(0),
};
/** Ends so many inches ahead of the line, the middle so many to the left. */
const ends = (left: number, right: number, aside = 0): AxleEnds => ({
  left: framePoint(inches(44 + left), inches(30 + aside)),
  right: framePoint(inches(44 + right), inches(-30 + aside)),
});
const built = (left: number, right: number, aside = 0) => {
  const result = compareAsBuilt(ends(left, right, aside), LINE);
  if (!result.ok) throw new Error(result.problem);
  return result.value;
};
const verdict = (left: number, right: number, aside = 0) => squareVerdict(built(left, right, aside));
const words = (left: number, right: number, aside = 0) =>
  verdict(left, right, aside).moves.map((move) => move.words);

describe("axleFromEnds", () => {
  it("crosses the centre line half way, and turns with the left end back", () => {
    const axle = axleFromEnds({ left: framePoint(990, 800), right: framePoint(1010, -800) });
    expect(axle).toMatchObject({ ok: true, value: { station: expect.closeTo(1000, 9), offset: 0 } });
    expect(axle.ok && axle.value.turn).toBeCloseTo(0.7162, 4);
  });
  it("knows swapped ends, and ends that are none", () => {
    expect(axleFromEnds({ left: framePoint(0, -800), right: framePoint(0, 800) }).ok).toBe(false);
    expect(axleFromEnds({ left: framePoint(0, 80), right: framePoint(0, -80) }).ok).toBe(false);
  });
});

describe("after tacking", () => {
  it("is true within an eighth, the eighth included", () => {
    expect(verdict(1 / 8, 0)).toEqual({
      isTrue: true,
      headline: "True within 1/8 in: left end 1/8 in ahead, right end on the line.",
      moves: [],
    });
  });
  it("says which end to move, which way, how far", () => {
    expect(words(-3 / 16, 0)).toEqual(["Move the left end ahead 3/16 in."]);
    expect(words(0, 1 / 4)).toEqual(["Move the right end back 1/4 in."]);
    expect(words(1 / 4, 1 / 4)).toEqual([
      "Move the left end back 1/4 in.",
      "Move the right end back 1/4 in.",
    ]);
    expect(words(0, 0, 1 / 4)).toEqual(["Move the axle 1/4 in to the right."]);
  });
  it("moves the worse end where only the two together are out", () => {
    expect(words(1 / 8, -1 / 16)).toEqual(["Move the left end back 1/8 in."]);
    expect(verdict(1 / 8, -1 / 16).headline).toBe(
      "Out of square by 3/16 in: left end 1/8 in ahead, right end 1/16 in back.",
    );
  });
  it("is true once the moves are made", () => {
    const off = fc.double({ min: -1, max: 1, noNaN: true });
    fc.assert(
      fc.property(off, off, off, (left, right, aside) => {
        let [l, r, s] = [left, right, aside];
        for (const { what, way, distance } of verdict(left, right, aside).moves) {
          const by = (distance / 25.4) * (way === "ahead" || way === "to the left" ? 1 : -1);
          if (what === "left end") l += by;
          else if (what === "right end") r += by;
          else s += by;
        }
        return verdict(l, r, s).isTrue;
      }),
    );
  });
  it("mirrors when left and right are swapped", () => {
    const off = fc.double({ min: -1, max: 1, noNaN: true });
    fc.assert(
      fc.property(off, off, off, (left, right, aside) => {
        fc.pre(Math.abs(Math.abs(left) - Math.abs(right)) > 1e-6);
        const mirrored = (text: string) =>
          text.replace(/left|right/g, (side) => (side === "left" ? "right" : "left"));
        const [one, two] = [words(left, right, aside), words(right, left, -aside)];
        return JSON.stringify(one.map(mirrored).sort()) === JSON.stringify([...two].sort());
      }),
    );
  });
  it("measures against a turned line too", () => {
    const turned = compareAsBuilt(
      { left: framePoint(990, 800), right: framePoint(1010, -800) },
      { ...LINE, station: mm(1000), turn: degrees((Math.atan(20 / 1600) * 180) / Math.PI) },
    );
    expect(turned).toMatchObject({
      ok: true,
      value: { isTrue: true, leftAhead: expect.closeTo(0, 9), outOfSquare: expect.closeTo(0, 9) },
    });
  });
});

describe("wheelbases", () => {
  const rect = (station: number, left = 0, right = 0): AxleEnds => ({
    left: framePoint(station + left, 800),
    right: framePoint(station + right, -800),
  });
  it("is the same both sides of a rectangle, diagonals 2968.16", () => {
    const both = wheelbases(rect(2500), rect(0));
    expect(both).toMatchObject({
      ok: true,
      value: { left: 2500, difference: 0, diagonalDifference: 0, thrust: 0 },
    });
    expect(both.ok && both.value.leftDiagonal).toBeCloseTo(2968.16, 2);
  });
  it("thrusts to the right where the rear axle's right end stands back", () => {
    const turned = wheelbases(rect(2500), rect(0, 10, -10));
    expect(turned.ok && turned.value.thrust).toBeCloseTo((Math.atan(20 / 1600) * 180) / Math.PI, 9);
    expect(turned.ok && turned.value.difference).toBeCloseTo(-20, 9);
  });
  it("takes the front axle for the front one", () => {
    expect(wheelbases(rect(0), rect(2500)).ok).toBe(false);
    expect(wheelbases({ left: framePoint(0, -1), right: framePoint(0, 1) }, rect(0)).ok).toBe(false);
  });
});

describe("toe", () => {
  it("of 1/8 in over 28 in is 0.25578°, and thrust is half the difference", () => {
    const toe = toeAngle(inches(1 / 8), inches(28));
    expect(toe.ok && toe.value).toBeCloseTo(0.25578, 5);
    expect(thrustFromToe(degrees(0.2), degrees(-0.1))).toBeCloseTo(0.15, 12);
    expect(toeAngle(mm(1), mm(0)).ok).toBe(false);
  });
});
