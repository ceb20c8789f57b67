import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { degrees } from "../units/angle";
import { inches, mm, toInches } from "../units/length";
import { innerAngle, outerAngle } from "./ackermann";
import { bumpSteer, steerPerInch, swingBack } from "./bump-steer";
import { dragLink, dragLinkChange, vehiclePoint } from "./drag-link";
import { fourBar } from "./four-bar";

const value = <T>(came: { ok: true; value: T } | { ok: false; problem: string }): T => {
  if (!came.ok) throw new Error(came.problem);
  return came.value;
};
const at = (x: number, y: number, z: number) => vehiclePoint(inches(x), inches(y), inches(z));
const anywhere = fc.tuple(
  fc.integer({ min: -900, max: 900 }),
  fc.integer({ min: -900, max: 900 }),
  fc.integer({ min: -300, max: 300 }),
);

describe("drag link", () => {
  it("has length and angles in space", () => {
    const link = value(dragLink(vehiclePoint(0, 0, 0), vehiclePoint(300, 400, -100)));
    expect(link.length).toBeCloseTo(Math.hypot(300, 400, 100), 9);
    expect(link.planAngle).toBeCloseTo(53.1301, 4);
    expect(link.sideAngle).toBeCloseTo(-11.3099, 4);
    expect(dragLink(at(1, 1, 1), at(1, 1, 1)).ok).toBe(false);
  });
  it("keeps its length however the vehicle stands", () => {
    fc.assert(
      fc.property(anywhere, anywhere, anywhere, ([a, b, c], [d, e, f], [p, q, r]) => {
        fc.pre(Math.hypot(d - a, e - b, f - c) > 2);
        const there = value(dragLink(vehiclePoint(a, b, c), vehiclePoint(d, e, f)));
        const moved = value(dragLink(vehiclePoint(a + p, b + q, c + r), vehiclePoint(d + p, e + q, f + r)));
        expect(moved.length).toBeCloseTo(there.length, 9);
      }),
    );
  });
  it("gets longer by as much as the axle moves away along it", () =>
    expect(value(dragLinkChange(at(0, 0, 0), at(-16, 0, 0), inches(-4)))).toBeCloseTo(inches(4), 9));
});

/** A fore-and-aft link of 30 in to an arm of 6 in that points across; the axle swings on 24 in about a point behind. */
const box = at(30, 6, 20);
const arm = at(0, 6, 20);
const kingpin = at(0, 0, 20);
const swing = (rise: number, radius: number) => ({
  rise: inches(rise),
  ahead: mm(-(swingBack(inches(radius), inches(rise)) ?? 0)),
});

describe("bump steer", () => {
  it("is nothing when the axle swings as the link does", () => {
    // The axle's circle about the box ball, of the link's length.
    const path = [-3, -1, 0, 1, 3].map((rise) => ({
      rise: inches(rise),
      ahead: swingBack(inches(30), inches(rise)) ?? mm(0),
    }));
    for (const { turn } of value(bumpSteer({ box, arm, kingpin, path }))) expect(turn).toBeCloseTo(0, 9);
  });
  it("follows the difference of the two arcs over the arm's length", () => {
    const path = [0, 3].map((rise) => ({
      rise: inches(rise),
      ahead: swingBack(inches(24), inches(rise)) ?? mm(0),
    }));
    const steered = value(bumpSteer({ box, arm, kingpin, path }));
    // 0.18824 − 0.15038 = 0.03786 in over 6 in; see tests/published.
    expect(Math.abs(steered[1]?.turn ?? 0)).toBeCloseTo(0.3616, 3);
  });
  it("says so when the link cannot reach", () => {
    expect(bumpSteer({ box, arm, kingpin, path: [swing(40, 60)] })).toMatchObject({
      ok: false,
      problem: "The link is too short for this travel: it would pull the arm straight.",
    });
    expect(bumpSteer({ box, arm, kingpin: arm, path: [] }).ok).toBe(false);
  });
  it("is told for each inch about ride height", () => {
    const steered = value(bumpSteer({ box, arm, kingpin, path: [-1, 0, 1].map((rise) => swing(rise, 24)) }));
    expect(steerPerInch(steered)).not.toBeNull();
    expect(steerPerInch(steered.slice(0, 1))).toBeNull();
  });
});

describe("wheels that roll about one point", () => {
  it("inner and outer undo each other", () => {
    fc.assert(
      fc.property(fc.double({ min: 0.1, max: 50, noNaN: true }), (angle) => {
        const outer = outerAngle(degrees(angle), mm(1500), mm(2600));
        expect(innerAngle(outer, mm(1500), mm(2600))).toBeCloseTo(angle, 9);
        expect(outer).toBeLessThan(angle);
      }),
    );
    expect(outerAngle(degrees(0), mm(1500), mm(2600))).toBe(0);
    expect(() => outerAngle(degrees(90), mm(1500), mm(2600))).toThrow(RangeError);
  });
});

describe("four-bar linkage", () => {
  it("closes: crank and coupler end where the rocker does", () => {
    fc.assert(
      fc.property(fc.integer({ min: 0, max: 359 }), (angle) => {
        const bars = { ground: 100, crank: 40, coupler: 120, rocker: 80 };
        const { open, crossed } = value(fourBar(bars, degrees(angle)));
        const rad = (d: number) => (d * Math.PI) / 180;
        for (const { coupler, rocker } of [open, crossed]) {
          expect(40 * Math.cos(rad(angle)) + 120 * Math.cos(rad(coupler))).toBeCloseTo(
            100 + 80 * Math.cos(rad(rocker)),
            9,
          );
          expect(40 * Math.sin(rad(angle)) + 120 * Math.sin(rad(coupler))).toBeCloseTo(
            80 * Math.sin(rad(rocker)),
            9,
          );
        }
      }),
    );
  });
  it("says so when it cannot", () => {
    expect(fourBar({ ground: 500, crank: 40, coupler: 120, rocker: 80 }, degrees(0)).ok).toBe(false);
    expect(fourBar({ ground: 0, crank: 40, coupler: 120, rocker: 80 }, degrees(0)).ok).toBe(false);
  });
});

it("a link's end swings back by its arc", () => {
  expect(toInches(swingBack(inches(30), inches(3)) ?? mm(0))).toBeCloseTo(0.15038, 5);
  expect(swingBack(inches(3), inches(4))).toBeNull();
});
