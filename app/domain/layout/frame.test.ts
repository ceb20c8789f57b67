import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { floorPoint, framePoint, turned } from "../geometry/point";
import { degrees } from "../units/angle";
import { mm } from "../units/length";
import { axleLine, axlePoint, compareOpenings, openingCentre } from "./axle-line";
import { pointFromOffset } from "./drops";
import { type DatumPairs, frameFromDatums, toFloor, toFrame } from "./frame";
import { frameSquare } from "./frame-square";
import { crossing, ellipseOf, meetings } from "./tie-fit";

const FRAME = { origin: floorPoint(500, 0), angle: degrees(90) };
const RECT: DatumPairs = {
  frontLeft: floorPoint(2500, 400),
  frontRight: floorPoint(2500, -400),
  rearLeft: floorPoint(500, 400),
  rearRight: floorPoint(500, -400),
};
/** The left rail moved ahead against the right one. */
const racked = (by: number): DatumPairs => ({
  ...RECT,
  frontLeft: floorPoint(2500 + by, 400),
  rearLeft: floorPoint(500 + by, 400),
});

describe("the frame's axes", () => {
  it("carry a point there and back", () => {
    const there = toFrame(FRAME, floorPoint(500, 1000));
    expect([there.station, there.offset]).toEqual([expect.closeTo(1000, 9), expect.closeTo(0, 9)]);
    const back = toFloor(FRAME, framePoint(1000, 0));
    expect([back.x, back.y]).toEqual([expect.closeTo(500, 9), expect.closeTo(1000, 9)]);
  });
  it("see the same frame wherever the vehicle stands on the floor", () =>
    fc.assert(
      fc.property(
        fc.integer({ min: -180, max: 180 }),
        fc.integer({ min: -9000, max: 9000 }),
        (angle, shift) => {
          const move = (x: number, y: number) => {
            const v = turned(floorPoint(x, y), degrees(angle));
            return floorPoint(v.x + shift, v.y - shift);
          };
          const pairs = Object.fromEntries(
            Object.entries(RECT).map(([name, { x, y }]) => [name, move(x, y)]),
          ) as DatumPairs;
          const frame = frameFromDatums(pairs);
          if (!frame.ok) return false;
          const point = toFrame(frame.value, move(1700, 250));
          return Math.abs(point.station - 1200) < 1e-6 && Math.abs(point.offset - 250) < 1e-6;
        },
      ),
    ));
});

describe("frameSquare", () => {
  it("finds a rectangle's diagonals alike", () => {
    const square = frameSquare(RECT);
    expect(square).toMatchObject({
      ok: true,
      value: { isSquare: true, difference: 0, leftLength: 2000, frontWidth: 800 },
    });
    expect(square.ok && square.value.words).toBe("The diagonals are alike within 1/8 in.");
    expect(square.ok && square.value.leftDiagonal).toBeCloseTo(Math.hypot(2000, 800), 9);
  });
  it("says which rail stands ahead, and mirrors", () => {
    const [one, other] = [frameSquare(racked(20)), frameSquare(racked(-20))];
    expect(one.ok && one.value.words).toContain("the left rail stands ahead");
    expect(other.ok && other.value.words).toContain("the right rail stands ahead");
    expect(one.ok && other.ok && one.value.difference + other.value.difference).toBeCloseTo(0, 9);
  });
  it("passes on what is wrong with the datums", () =>
    expect(frameSquare({ ...RECT, frontLeft: RECT.frontRight, frontRight: RECT.frontLeft }).ok).toBe(false));
});

describe("openings and lines", () => {
  it("take the middle of an opening, and the middle of both centres", () => {
    expect(openingCentre(floorPoint(2000, 760), floorPoint(1200, 764))).toEqual({ x: 1600, y: 762 });
    const centres = { left: framePoint(1010, 760), right: framePoint(990, -760) };
    expect(axleLine(centres, "square")).toMatchObject({
      station: 1000,
      residualLeft: 10,
      residualRight: -10,
    });
    const through = axleLine(centres, "through-centres");
    expect(axlePoint(through, mm(760)).station).toBeCloseTo(1010, 9);
    expect(axlePoint(through, mm(-760)).station).toBeCloseTo(990, 9);
    expect(axlePoint({ ...through, station: mm(1000), turn: degrees(0.7162) }, mm(800)).station).toBeCloseTo(
      990,
      2,
    );
  });
  it("know openings that were swapped", () => {
    const opening = (y: number) => ({ front: floorPoint(2000, y), rear: floorPoint(1200, y) });
    const frame = { origin: floorPoint(0, 0), angle: degrees(0) };
    expect(compareOpenings(frame, { left: opening(-760), right: opening(760) })).toEqual({
      ok: false,
      problem: "The openings look swapped: the left one lies right of the other.",
    });
    expect(compareOpenings(frame, { left: opening(0), right: opening(0) }).ok).toBe(false);
  });
  it("take an offset to the side that is named", () => {
    const at = (side: "left" | "right") => pointFromOffset({ station: mm(1000), offset: mm(300), side });
    expect(at("right")).toEqual({ ok: true, value: { x: 1000, y: -300 } });
    expect(at("left")).toEqual({ ok: true, value: { x: 1000, y: 300 } });
    expect(pointFromOffset({ station: mm(0), offset: mm(-1), side: "left" }).ok).toBe(false);
  });
});

describe("two tapes", () => {
  const a = { mark: "A", at: floorPoint(0, 0), distance: mm(720) };
  const b = { mark: "B", at: floorPoint(1200, 0), distance: mm(960) };
  it("meet twice, squarely", () => {
    const [one, two] = meetings(a, b);
    expect([one?.x, one?.y, two?.y]).toEqual([432, 576, -576].map((n) => expect.closeTo(n, 9)));
    expect(one && crossing(a, b, one)).toBeCloseTo(1, 12);
    expect(meetings(a, { ...b, distance: mm(1) })).toEqual([]);
  });
  it("have an ellipse along the surer axis", () =>
    expect(ellipseOf({ xx: 4, xy: 0, yy: 1 })).toEqual({ major: 4, minor: 2, angle: 0 }));
});
