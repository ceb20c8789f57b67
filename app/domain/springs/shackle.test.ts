import fc from "fast-check";
import { describe, expect, it } from "vitest";
import type { Outcome } from "../outcome";
import { degrees, toDegrees } from "../units/angle";
import { inches, mm, toInches } from "../units/length";
import { leafAtArch } from "./leaf-shape";
import { type SidePoint, sidePoint } from "./leaf-travel";
import { mainLeaf, turnedLeaf } from "./main-leaf";
import {
  fromStraight,
  movingEye,
  placeHanger,
  type ShackleLoad,
  type ShackleMounting,
  shackleAngle,
} from "./shackle";
import { shacklePosition } from "./shackle-position";
import { shackleTravel } from "./shackle-travel";
import { placeWarnings, wayWarnings } from "./shackle-warnings";

const value = <T>(outcome: Outcome<T>): T => {
  if (!outcome.ok) throw new Error(outcome.problem);
  return outcome.value;
};
const fault = (outcome: Outcome<unknown>) => (outcome.ok ? JSON.stringify(outcome.value) : outcome.problem);
const apart = (a: SidePoint, b: SidePoint) => Math.hypot(a.station - b.station, a.height - b.height);
const leaf = value(mainLeaf({ front: inches(26), rear: inches(26) }));
const origin = sidePoint(0, 0);

/** The 52 in spring, fixed eye ahead at station 71.5 in, shackle square (or so) at 4 in of arch. */
function mounted(options: { angle?: number; load?: ShackleLoad; shackle?: number } = {}): ShackleMounting {
  const { angle = 90, load = "compression", shackle = 4 } = options;
  const eye = sidePoint(inches(71.5), 0);
  const { eyeDistance } = value(leafAtArch(leaf, inches(4)));
  const { hanger } = value(
    placeHanger({
      fixedEye: "ahead",
      eye,
      eyeDistance,
      movingEyeHigher: mm(0),
      shackle: inches(shackle),
      load,
      angle: degrees(angle),
    }),
  );
  return { fixedEye: "ahead", eye, hanger, shackle: inches(shackle), load };
}

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

describe("shackleTravel", () => {
  const travel = (mounting: ShackleMounting, droop = 6, bump?: number) =>
    value(
      shackleTravel({
        leaf,
        mounting,
        droop: inches(droop),
        ride: inches(4),
        bump: bump === undefined ? undefined : inches(bump),
        steps: 12,
      }),
    );
  it("does the example", () => {
    const { droop, ride, flat, warnings, path, longest } = travel(mounted());
    expect(ride?.shackleAngle).toBeCloseTo(90, 6);
    // Law of cosines: the hangers stand √(c² + 4²) apart, c the eye distance at ride.
    const c = toInches(ride?.eyeDistance ?? mm(0));
    expect(flat?.shackleAngle).toBeCloseTo(toDegrees(Math.acos((52 ** 2 - c ** 2) / (2 * 52 * 4))), 6);
    expect(flat?.shackleAngle).toBeCloseTo(78.1, 1);
    expect(droop?.shackleAngle ?? 0).toBeGreaterThan(90);
    expect(toInches(longest)).toBeCloseTo(52, 9);
    expect(warnings).toEqual([]);
    expect(path.length).toBeGreaterThanOrEqual(13);
    expect(value(shacklePosition(leaf, mounted(), inches(4))).shackleAngle).toBeCloseTo(90, 6);
  });
  it("puts the axle where the leaf alone does at ride, eyes level there", () => {
    const { ride } = travel(mounted());
    const { fromFront } = value(leafAtArch(leaf, inches(4)));
    expect(ride?.axle.station).toBeCloseTo(inches(71.5) - fromFront, 6);
    expect(ride?.axle.height).toBeCloseTo(-inches(4), 6);
    expect(ride?.eyeLine).toBeCloseTo(0, 9);
  });
  it("warns of a shackle near straight at droop, and when it binds", () => {
    const near = travel(mounted({ angle: 150 }), 5.1);
    expect(near.droop === null || fromStraight(near.droop.shackleAngle) < 30).toBe(true);
    const bound = travel(mounted({ angle: 150, shackle: 2 }), 7);
    expect(bound.droop).toBeNull();
    expect(bound.warnings[0]).toMatchObject({
      at: "droop",
      words: expect.stringMatching(/^At droop: .*pulled straight/),
    });
    const flat = travel(mounted({ angle: 30, shackle: 2 }), 4.2);
    expect(flat.flat).toBeNull();
    expect(flat.lengthLeft).toBeLessThan(0);
    expect(flat.warnings.map((warning) => warning.at)).toEqual(["flat"]);
    expect(travel(mounted({ angle: 30, shackle: 2 }), 4.2, 3.95).warnings).toEqual([]);
  });
  it("words a shackle that may go over centre", () => {
    const position = { ...value(shacklePosition(leaf, mounted(), inches(4))), shackleAngle: degrees(176) };
    const place = { ok: true as const, value: position };
    expect(placeWarnings({ droop: place, ride: null, flat: null, bump: null }, degrees(5))).toEqual([
      {
        at: "droop",
        words:
          "At droop: the shackle is 4.0° from straight, laid away from the fixed eye: it may go over centre.",
      },
    ]);
    expect(placeWarnings({ droop: place, ride: null, flat: null, bump: null }, degrees(4))).toEqual([]);
    expect(wayWarnings([position], [], [position.arch], degrees(5))).toEqual([]);
    expect(wayWarnings([position], [], [], degrees(5))[0]?.words).toMatch(/^On the way: .*away/);
    expect(wayWarnings([], [mm(50)], [], degrees(5))[0]?.words).toMatch(/binds on the way/);
  });
  it("keeps room to the frame", () => {
    const mounting = mounted();
    const at = (underside: number) =>
      value(
        shackleTravel({
          leaf,
          mounting,
          droop: inches(6),
          ride: inches(4),
          steps: 6,
          frame: { underside: mm(underside), eyeRadius: mm(25) },
        }),
      );
    expect(at(80).frameRoom).toBeLessThan(55);
    expect(at(80).warnings).toEqual([]);
    expect(at(20).warnings.at(-1)?.words).toMatch(/fouls/);
    expect(at(80).eyeGoesOut).toBeCloseTo(inches(52) - value(leafAtArch(leaf, inches(4))).eyeDistance, 0);
  });
  it("says when arches are out of order", () => {
    const input = { leaf, mounting: mounted(), droop: inches(3), ride: inches(4), steps: 4 };
    expect(fault(shackleTravel(input))).toMatch(/more arch at droop/);
    expect(fault(shackleTravel({ ...input, droop: inches(30) }))).toMatch(/too short/);
  });
  it("mirrors front and rear, axle and all", () => {
    fc.assert(
      fc.property(
        fc.double({ min: 500, max: 800, noNaN: true }),
        fc.double({ min: 70, max: 110, noNaN: true }),
        fc.constantFrom("compression" as const, "tension" as const),
        (front, angle, load) => {
          const one = value(mainLeaf({ front: mm(front), rear: mm(660), eyeOffset: { front: mm(20) } }));
          const run = (turned: boolean) => {
            const [ours, fixedEye] = turned ? [turnedLeaf(one), "behind" as const] : [one, "ahead" as const];
            const { eyeDistance } = value(leafAtArch(ours, mm(100)));
            const common = { fixedEye, eye: origin, shackle: mm(110), load };
            const { hanger } = value(
              placeHanger({ ...common, eyeDistance, movingEyeHigher: mm(30), angle: degrees(angle) }),
            );
            return value(
              shackleTravel({
                leaf: ours,
                mounting: { ...common, hanger },
                droop: mm(140),
                ride: mm(100),
                steps: 5,
              }),
            );
          };
          const [ahead, behind] = [run(false), run(true)];
          ahead.path.forEach((position, i) => {
            expect(behind.path[i]?.axle.station).toBeCloseTo(-position.axle.station, 4);
            expect(behind.path[i]?.axle.height).toBeCloseTo(position.axle.height, 4);
            expect(behind.path[i]?.shackleAngle).toBeCloseTo(position.shackleAngle, 4);
          });
        },
      ),
    );
  });
  it("ends at the same axle however many steps it took", () => {
    const run = (steps: number) =>
      value(
        shackleTravel({
          leaf,
          mounting: mounted({ load: "tension" }),
          droop: inches(6),
          ride: inches(4),
          steps,
        }),
      );
    expect(run(40).path.at(-1)).toEqual(run(3).path.at(-1));
    expect(run(40).path.length).toBeGreaterThan(run(3).path.length);
  });
});
