import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { vehiclePoint } from "../steering/drag-link";
import { degrees } from "../units/angle";
import { jointAngle, jointWords, limitAt, residualAngle, velocityRatio } from "./joint";
import { propshaft } from "./propshaft";

const angles = (plan: number, side: number) => ({ plan: degrees(plan), side: degrees(side) });

describe("a universal joint", () => {
  it("works at the angle in space, whichever way round", () => {
    fc.assert(
      fc.property(
        fc.double({ min: -40, max: 40, noNaN: true }),
        fc.double({ min: -40, max: 40, noNaN: true }),
        fc.double({ min: -40, max: 40, noNaN: true }),
        fc.double({ min: -40, max: 40, noNaN: true }),
        (p, s, q, t) => {
          const [a, b] = [angles(p, s), angles(q, t)];
          expect(jointAngle(a, b)).toBeCloseTo(jointAngle(b, a), 9);
          expect(jointAngle(a, a)).toBeCloseTo(0, 5);
          expect(jointAngle(angles(-p, s), angles(-q, t))).toBeCloseTo(jointAngle(a, b), 9);
        },
      ),
    );
    expect(() => jointAngle(angles(90, 0), angles(0, 0))).toThrow(RangeError);
  });
  it("turns the driven shaft once for each turn of the driving one", () => {
    for (const joint of [3, 20, 45]) {
      const steps = 3600;
      let time = 0;
      // The driven shaft turns a full turn when the ratio, driven per driving angle, averages one.
      for (let i = 0; i < steps; i++)
        time += velocityRatio(degrees(joint), degrees((i + 0.5) * (360 / steps)));
      expect(time / steps).toBeCloseTo(1, 9);
    }
  });
});

describe("two joints", () => {
  it("cancel when equal and in phase, add by squares a quarter turn apart", () => {
    expect(residualAngle(degrees(3), degrees(3), degrees(0))).toBe(0);
    expect(residualAngle(degrees(3), degrees(3), degrees(90))).toBeCloseTo(3 * Math.SQRT2, 9);
    expect(residualAngle(degrees(3), degrees(4), degrees(180))).toBeCloseTo(Math.sqrt(7), 9);
  });
  it("are spoken of when outside the usual", () => {
    expect(jointWords(degrees(2), degrees(2.5))).toEqual([]);
    expect(jointWords(degrees(0.2), degrees(2))).toHaveLength(2);
    expect(jointWords(degrees(4), degrees(4.5), 4000)[0]).toBe(
      "The first joint works at 4.00°: over 3° it is felt.",
    );
    expect(jointWords(degrees(4.5), degrees(4.5), 4000)[0]).toMatch(/makers advise at most 4.2° at 4000 rpm/);
    expect(limitAt(2800)?.rpm).toBe(3000);
    expect(limitAt(6000)).toBeNull();
  });
});

describe("a propshaft through the travel", () => {
  const box = vehiclePoint(0, 0, 500);
  const at = (name: string, x: number, z: number) => ({
    name,
    joint: vehiclePoint(x, 0, z),
    pinion: angles(0, 3),
  });
  it("gives length, slip and both angles", () => {
    const came = propshaft(box, angles(0, 3), [at("ride", -1200, 420), at("droop", -1190, 320)]);
    if (!came.ok) throw new Error(came.problem);
    const [ride, droop] = came.value.places;
    expect(ride?.length).toBeCloseTo(Math.hypot(1200, 80), 9);
    expect(ride?.first).toBeCloseTo(Math.abs((Math.atan(80 / 1200) * 180) / Math.PI - 3), 6);
    expect(ride?.first).toBeCloseTo(ride?.second ?? 0, 9);
    expect(ride?.residual).toBeCloseTo(0, 5);
    expect(came.value.slip).toBeCloseTo(Math.abs((ride?.length ?? 0) - (droop?.length ?? 0)), 9);
  });
  it("says what is no propshaft", () => {
    expect(propshaft(box, angles(0, 0), [at("x", 0, 500)]).ok).toBe(false);
    expect(propshaft(box, angles(0, 0), [{ ...at("x", 0, 500), joint: vehiclePoint(0, 900, 500) }]).ok).toBe(
      false,
    );
    expect(propshaft(box, angles(0, 0), []).ok).toBe(false);
  });
});
