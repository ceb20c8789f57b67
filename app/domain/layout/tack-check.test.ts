import { describe, expect, it } from "vitest";
import { floorPoint, framePoint } from "../geometry/point";
import { degrees } from "../units/angle";
import { inches, type Millimetres, mm } from "../units/length";
import type { AxleLine } from "./axle-line";
import { type Frame, toFloor } from "./frame";
import { burntInch, checkTack, signedLine, type TackReading } from "./tack-check";

const LINE: AxleLine = {
  method: "square",
  station: inches(44.4),
  turn: degrees(0),
  residualLeft: mm(0),
  residualRight: mm(0),
};
/** A frame that stands askew on the floor: what is read off the floor has to be turned into its axes first. */
const FRAME: Frame = { origin: floorPoint(508, 3), angle: degrees(-0.179) };
const SIGNED = signedLine(LINE, inches(46.5));

/** Ends so many inches ahead of the signed line, as they lie on the floor. */
function reading(left: number, right: number, aside = 0): TackReading {
  const end = (ahead: number, offset: number) => {
    const p = toFloor(FRAME, framePoint(inches(46.5 + ahead), inches(offset + aside)));
    return { station: p.x, offset: mm(Math.abs(p.y)) };
  };
  return { left: end(left, 30), right: end(right, -30) };
}
const check = (left: number, right: number, aside = 0) => {
  const result = checkTack(FRAME, SIGNED, reading(left, right, aside));
  if (!result.ok) throw new Error(result.problem);
  return result.value;
};
const inchesOf = (length: Millimetres) => length / 25.4;

describe("the tacked axle against the line that was signed", () => {
  it("is measured in the frame's axes, from the option's station", () => {
    const { built, verdict } = check(-3 / 16, 0);
    expect(inchesOf(built.leftAhead)).toBeCloseTo(-3 / 16, 9);
    expect(built.rightAhead).toBeCloseTo(0, 9);
    expect(verdict).toMatchObject({ isTrue: false, moves: [{ words: "Move the left end ahead 3/16 in." }] });
  });

  it("passes at the tolerance and fails beyond it", () => {
    expect(check(1 / 8, 0).built.isTrue).toBe(true);
    expect(check(1 / 8 + 0.001, 0).built.isTrue).toBe(false);
    expect(check(0, 0, 1 / 4).verdict.moves.map((move) => move.words)).toEqual([
      "Move the axle 1/4 in to the right.",
    ]);
  });

  it("speaks the shop's unit", () => {
    const metric = checkTack(FRAME, SIGNED, reading(-3 / 16, 0), { unit: "mm" });
    expect(metric.ok && metric.value.verdict.moves[0]?.words).toBe("Move the left end ahead 4.8 mm.");
  });

  it("takes no sign, no swapped ends, and nothing that is nowhere near", () => {
    const good = reading(0, 0);
    const signedOffset = { ...good, left: { ...good.left, offset: mm(-good.left.offset) } };
    expect(checkTack(FRAME, SIGNED, signedOffset)).toMatchObject({ ok: false });
    const narrow = { left: { ...good.left, offset: mm(10) }, right: { ...good.right, offset: mm(10) } };
    expect(checkTack(FRAME, SIGNED, narrow)).toMatchObject({ ok: false });
    const far = checkTack(FRAME, SIGNED, reading(-30, 0));
    expect(far).toMatchObject({ ok: false, problem: expect.stringContaining("read from mark A?") });
  });

  it("knows a tape hooked at the inch mark", () => {
    expect(burntInch(check(1, 0).built)).toContain("left end is out by an inch");
    expect(burntInch(check(0, -1).built)).toContain("right end is out by an inch");
    expect(burntInch(check(1, 1).built)).toBeNull();
    expect(burntInch(check(0.5, 0).built)).toBeNull();
  });
});
