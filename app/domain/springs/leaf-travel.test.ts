import fc from "fast-check";
import { describe, expect, it } from "vitest";
import type { Outcome } from "../outcome";
import { degrees, toRadians } from "../units/angle";
import { inches, mm, toInches } from "../units/length";
import { leafAtArch } from "./leaf-shape";
import {
  archSteps,
  eyeLineSlope,
  leafPosition,
  leafStations,
  leafTravel,
  pinAt,
  sidePoint,
} from "./leaf-travel";
import { type MainLeaf, mainLeaf, turnedLeaf } from "./main-leaf";

const value = <T>(outcome: Outcome<T>): T => {
  if (!outcome.ok) throw new Error(outcome.problem);
  return outcome.value;
};
const fault = (outcome: Outcome<unknown>) => (outcome.ok ? JSON.stringify(outcome.value) : outcome.problem);
const plain = (front: number, rear: number) => value(mainLeaf({ front: inches(front), rear: inches(rear) }));

const half = fc.double({ min: 400, max: 1000, noNaN: true });
const offset = fc.double({ min: -60, max: 60, noNaN: true });
const anyLeaf: fc.Arbitrary<MainLeaf> = fc
  .record({
    front: half,
    rear: half,
    clamped: fc.double({ min: 0, max: 100, noNaN: true }),
    up: offset,
    upRear: offset,
  })
  .map(({ front, rear, clamped, up, upRear }) =>
    value(
      mainLeaf({
        front: mm(front),
        rear: mm(rear),
        clamped: mm(clamped),
        eyeOffset: { front: mm(up), rear: mm(upRear) },
      }),
    ),
  );
const anyArch = fc.double({ min: -80, max: 120, noNaN: true }).map(mm);

describe("stations", () => {
  const hole = sidePoint(inches(71.5), 0);
  it.each([
    [26, 26, 45.5],
    [24, 28, 47.5],
  ])("puts the axle of halves %d and %d at %d in, flat", (front, rear, station) => {
    const setting = { leaf: plain(front, rear), fixedEye: "ahead" as const, eye: hole };
    const { flat, ride, droop } = value(leafStations(setting, { droop: inches(6), ride: inches(4) }));
    expect(toInches(flat.axle.station)).toBeCloseTo(station, 9);
    expect(ride.axle.station).toBeGreaterThan(flat.axle.station);
    expect(droop.axle.station).toBeGreaterThan(ride.axle.station);
    expect(droop.axle.height).toBeCloseTo(-inches(6), 9);
  });
  it("mirrors front and rear", () => {
    fc.assert(
      fc.property(anyLeaf, anyArch, fc.double({ min: -5, max: 5, noNaN: true }), (leaf, arch, slope) => {
        const eye = sidePoint(0, 0);
        const ahead = value(leafPosition({ leaf, fixedEye: "ahead", eye, eyeLine: degrees(slope) }, arch));
        const behind = value(
          leafPosition({ leaf: turnedLeaf(leaf), fixedEye: "behind", eye, eyeLine: degrees(-slope) }, arch),
        );
        expect(behind.axle.station).toBeCloseTo(-ahead.axle.station, 6);
        expect(behind.axle.height).toBeCloseTo(ahead.axle.height, 6);
        expect(behind.seatLean).toBeCloseTo(-ahead.seatLean, 6);
      }),
    );
  });
  it("tilts with the line of the eyes: a plain turn about the fixed eye", () => {
    const leaf = plain(26, 26);
    expect(value(eyeLineSlope("ahead", inches(50), inches(2)))).toBeCloseTo(-2.2924, 4);
    expect(value(eyeLineSlope("behind", inches(50), inches(2)))).toBeCloseTo(2.2924, 4);
    expect(fault(eyeLineSlope("ahead", inches(50), inches(50)))).toMatch(/height/);
    const shape = value(leafAtArch(leaf, inches(4)));
    const level = pinAt(shape, "ahead", hole, degrees(0));
    const tilted = pinAt(shape, "ahead", hole, degrees(3));
    const [c, s] = [Math.cos(toRadians(degrees(3))), Math.sin(toRadians(degrees(3)))];
    const [x, z] = [level.station - hole.station, level.height];
    expect(tilted.station - hole.station).toBeCloseTo(c * x - s * z, 9);
    expect(tilted.height).toBeCloseTo(s * x + c * z, 9);
    expect(
      pinAt({ ...shape, arch: mm(0), fromFront: inches(26) }, "ahead", hole, degrees(0)).station,
    ).toBeCloseTo(inches(45.5), 9);
  });
  it("steps evenly, ends included", () => {
    expect(archSteps(mm(100), mm(-20), 3)).toEqual([100, 60, 20, -20]);
    expect(() => archSteps(mm(1), mm(0), 0)).toThrow(RangeError);
    const setting = { leaf: plain(26, 26), fixedEye: "ahead" as const, eye: hole };
    expect(value(leafTravel(setting, { from: inches(6), to: inches(0), steps: 12 }))).toHaveLength(13);
    expect(fault(leafTravel(setting, { from: inches(40), to: inches(0), steps: 12 }))).toMatch(/too short/);
  });
});
