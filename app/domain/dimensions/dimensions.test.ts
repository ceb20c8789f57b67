import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { degrees } from "../units/angle";
import { mm } from "../units/length";
import { clearanceAngles } from "./clearance-angles";
import { OFF_ROAD_RULES, type OffRoadFigures, offRoadVerdict } from "./off-road";

const wheel = (station: number, loadedRadius: number) => ({
  station: mm(station),
  loadedRadius: mm(loadedRadius),
});
const point = (station: number, height: number) => ({ station: mm(station), height: mm(height) });

describe("clearance angles", () => {
  it("takes the lowest point of each part of the vehicle", () => {
    const angles = clearanceAngles(wheel(2540, 406.4), wheel(0, 406.4), [
      point(3302, 355.6),
      point(3400, 700),
      point(-800, 500),
      point(1270, 254),
    ]);
    expect(angles.approach?.angle).toBeCloseTo(28.3369, 4);
    expect(angles.approach?.point).toEqual(point(3302, 355.6));
    expect(angles.departure?.point).toEqual(point(-800, 500));
    expect(angles.ramp?.angle).toBeCloseTo(23.3647, 4);
  });
  it("is null where no point bounds it", () =>
    expect(clearanceAngles(wheel(2540, 406), wheel(0, 406), [])).toEqual({
      approach: null,
      departure: null,
      ramp: null,
    }));
  it("refuses axles in the wrong order", () =>
    expect(() => clearanceAngles(wheel(0, 406), wheel(2540, 406), [])).toThrow(RangeError));
  it("turned end for end, approach and departure change places and the ramp stays", () => {
    fc.assert(
      fc.property(
        fc.array(fc.tuple(fc.integer({ min: -2000, max: 4500 }), fc.integer({ min: 200, max: 900 })), {
          maxLength: 8,
        }),
        (rows) => {
          const points = rows.map(([station, height]) => point(station, height));
          const there = clearanceAngles(wheel(2600, 380), wheel(0, 410), points);
          const back = clearanceAngles(
            wheel(0, 410),
            wheel(-2600, 380),
            points.map((one) => point(-one.station, one.height)),
          );
          expect(back.departure?.angle ?? null).toEqual(there.approach?.angle ?? null);
          expect(back.approach?.angle ?? null).toEqual(there.departure?.angle ?? null);
          if (there.ramp) expect(back.ramp?.angle).toBeCloseTo(there.ramp.angle, 9);
          else expect(back.ramp).toBeNull();
        },
      ),
    );
  });
});

describe("off-road rules", () => {
  const whole: OffRoadFigures = {
    approach: degrees(26),
    departure: degrees(20),
    ramp: degrees(21),
    frontAxleClearance: mm(181),
    rearAxleClearance: mm(180),
    runningClearance: mm(150),
  };
  const [directive] = OFF_ROAD_RULES;
  if (!directive) throw new Error("There is no rule");
  it("needs so many of the criteria; equal is met", () => {
    expect(offRoadVerdict(directive, whole)).toMatchObject({ isMet: true, missed: ["runningClearance"] });
    expect(offRoadVerdict(directive, { ...whole, ramp: degrees(10) }).isMet).toBe(false);
  });
  it("does not decide on what was not measured", () => {
    expect(offRoadVerdict(directive, { ...whole, rearAxleClearance: null }).isMet).toBeNull();
    expect(offRoadVerdict(directive, { ...whole, rearAxleClearance: null, ramp: degrees(1) }).isMet).toBe(
      false,
    );
  });
});
