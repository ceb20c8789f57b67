import fc from "fast-check";
import { describe, expect, it } from "vitest";
import type { Outcome } from "../outcome";
import { degrees, toDegrees } from "../units/angle";
import { mm } from "../units/length";
import { type SidePoint, sidePoint } from "./leaf-travel";
import { fromStraight, movingEye, placeHanger, type ShackleMounting, shackleAngle } from "./shackle";

const value = <T>(outcome: Outcome<T>): T => {
  if (!outcome.ok) throw new Error(outcome.problem);
  return outcome.value;
};
const fault = (outcome: Outcome<unknown>) => (outcome.ok ? JSON.stringify(outcome.value) : outcome.problem);
const apart = (a: SidePoint, b: SidePoint) => Math.hypot(a.station - b.station, a.height - b.height);
const origin = sidePoint(0, 0);

const anyPlace = fc.record({
  fixedEye: fc.constantFrom("ahead" as const, "behind" as const),
  load: fc.constantFrom("compression" as const, "tension" as const),
  eye: fc.record({
    station: fc.integer({ min: -3000, max: 3000 }),
    height: fc.integer({ min: 0, max: 900 }),
  }),
  eyeDistance: fc.double({ min: 800, max: 1600, noNaN: true }).map(mm),
  movingEyeHigher: fc.double({ min: -200, max: 200, noNaN: true }).map(mm),
  shackle: fc.double({ min: 40, max: 200, noNaN: true }).map(mm),
  angle: fc.double({ min: 10, max: 170, noNaN: true }).map(degrees),
});

describe("placeHanger", () => {
  it("does the example, and its three like", () => {
    const wanted = { eye: origin, eyeDistance: mm(1300), movingEyeHigher: mm(0), shackle: mm(100) };
    for (const [fixedEye, load, station, height] of [
      ["ahead", "compression", -1300, 100],
      ["ahead", "tension", -1300, -100],
      ["behind", "compression", 1300, 100],
      ["behind", "tension", 1300, -100],
    ] as const) {
      const { hanger, movingEye: moving } = value(placeHanger({ ...wanted, fixedEye, load }));
      expect([hanger.station, hanger.height]).toEqual([
        expect.closeTo(station, 9),
        expect.closeTo(height, 9),
      ]);
      expect(moving).toEqual({ station, height: 0 });
    }
  });
  it("puts the hanger where the moving eye then is, at the angle asked for", () => {
    fc.assert(
      fc.property(anyPlace, ({ eye, ...rest }) => {
        const wanted = { ...rest, eye: sidePoint(eye.station, eye.height) };
        const place = value(placeHanger(wanted));
        expect(apart(place.hanger, place.movingEye)).toBeCloseTo(wanted.shackle, 6);
        expect(place.movingEye.height - eye.height).toBeCloseTo(wanted.movingEyeHigher, 6);
        expect(shackleAngle(wanted.eye, place.movingEye, place.hanger)).toBeCloseTo(wanted.angle, 6);
        // The hanger over the line of the eyes in compression, under it in tension.
        const slope = wanted.movingEyeHigher / (place.movingEye.station - eye.station);
        const line = eye.height + slope * (place.hanger.station - eye.station);
        expect(place.hanger.height > line).toBe(wanted.load === "compression");
        const again = value(movingEye({ ...wanted, hanger: place.hanger }, wanted.eyeDistance));
        expect(apart(again, place.movingEye)).toBeLessThan(1e-4);
      }),
    );
  });
  it("leans the shackle away from the fixed eye beyond 90°", () => {
    const { hanger, movingEye: moving } = value(
      placeHanger({
        fixedEye: "ahead",
        eye: origin,
        eyeDistance: mm(1300),
        movingEyeHigher: mm(0),
        shackle: mm(100),
        load: "compression",
        angle: degrees(100),
      }),
    );
    expect(hanger.station).toBeLessThan(moving.station);
  });
  it("says what cannot be", () => {
    const wanted = {
      fixedEye: "ahead" as const,
      load: "tension" as const,
      eye: origin,
      eyeDistance: mm(1300),
      movingEyeHigher: mm(0),
      shackle: mm(100),
    };
    expect(fault(placeHanger({ ...wanted, shackle: mm(0) }))).toMatch(/more than nothing/);
    expect(fault(placeHanger({ ...wanted, movingEyeHigher: mm(1300) }))).toMatch(/height/);
    expect(fault(placeHanger({ ...wanted, angle: degrees(180) }))).toMatch(/between/);
  });
});

describe("movingEye", () => {
  it("does the example and says why it binds", () => {
    const mounting: ShackleMounting = {
      fixedEye: "ahead",
      eye: origin,
      hanger: sidePoint(-1300, 100),
      shackle: mm(100),
      load: "compression",
    };
    const moving = value(movingEye(mounting, mm(1300)));
    expect([moving.station, moving.height]).toEqual([expect.closeTo(-1300, 6), expect.closeTo(0, 6)]);
    expect(fault(movingEye(mounting, mm(1404)))).toMatch(/too long/);
    expect(fault(movingEye(mounting, mm(1203)))).toMatch(/too near/);
    expect(fault(movingEye({ ...mounting, shackle: mm(3000) }, mm(1300)))).toMatch(/so near to each other/);
    expect(fault(movingEye({ ...mounting, hanger: origin }, mm(1300)))).toMatch(/more than nothing/);
    expect(fromStraight(degrees(172))).toBe(8);
  });
  it("keeps both lengths, obeys the law of cosines and never jumps", () => {
    fc.assert(
      fc.property(anyPlace, fc.double({ min: 0.001, max: 0.999, noNaN: true }), ({ eye, ...rest }, share) => {
        const wanted = { ...rest, eye: sidePoint(eye.station, eye.height) };
        const mounting = { ...wanted, hanger: value(placeHanger(wanted)).hanger };
        const base = apart(wanted.eye, mounting.hanger);
        const distance = mm(base - wanted.shackle + 2 * wanted.shackle * share);
        const moving = value(movingEye(mounting, distance));
        expect(apart(moving, wanted.eye)).toBeCloseTo(distance, 6);
        expect(apart(moving, mounting.hanger)).toBeCloseTo(wanted.shackle, 6);
        const cosine = (distance ** 2 + wanted.shackle ** 2 - base ** 2) / (2 * distance * wanted.shackle);
        expect(shackleAngle(wanted.eye, moving, mounting.hanger)).toBeCloseTo(
          toDegrees(Math.acos(cosine)),
          4,
        );
        const near = value(movingEye(mounting, mm(distance + 1e-6)));
        expect(apart(near, moving)).toBeLessThan(1e-3);
      }),
    );
  });
  it("mirrors front and rear, up and down", () => {
    fc.assert(
      fc.property(anyPlace, ({ eye: _, ...rest }) => {
        const wanted = { ...rest, eye: origin };
        const { hanger } = value(placeHanger(wanted));
        const [fixedEye, load] = [
          wanted.fixedEye === "ahead" ? ("behind" as const) : ("ahead" as const),
          wanted.load === "tension" ? ("compression" as const) : ("tension" as const),
        ];
        const front = value(placeHanger({ ...wanted, fixedEye })).hanger;
        expect([front.station, front.height]).toEqual([
          expect.closeTo(-hanger.station, 6),
          expect.closeTo(hanger.height, 6),
        ]);
        const under = value(
          placeHanger({ ...wanted, load, movingEyeHigher: mm(-wanted.movingEyeHigher) }),
        ).hanger;
        expect([under.station, under.height]).toEqual([
          expect.closeTo(hanger.station, 6),
          expect.closeTo(-hanger.height, 6),
        ]);
      }),
    );
  });
});
