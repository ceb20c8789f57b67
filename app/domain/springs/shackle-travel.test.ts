import fc from "fast-check";
import { describe, expect, it } from "vitest";
import type { Outcome } from "../outcome";
import { degrees, toDegrees } from "../units/angle";
import { inches, mm, toInches } from "../units/length";
import { leafAtArch } from "./leaf-shape";
import { sidePoint } from "./leaf-travel";
import { mainLeaf, turnedLeaf } from "./main-leaf";
import { fromStraight, placeHanger, type ShackleLoad, type ShackleMounting } from "./shackle";
import { shacklePosition } from "./shackle-position";
import { shackleTravel } from "./shackle-travel";
import { placeWarnings, wayWarnings } from "./shackle-warnings";

const value = <T>(outcome: Outcome<T>): T => {
  if (!outcome.ok) throw new Error(outcome.problem);
  return outcome.value;
};
const fault = (outcome: Outcome<unknown>) => (outcome.ok ? JSON.stringify(outcome.value) : outcome.problem);
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
    const leaning = (nearStraight: number) =>
      value(
        shackleTravel({
          leaf,
          mounting: mounted({ angle: 160 }),
          droop: inches(4.3),
          ride: inches(4),
          steps: 4,
          nearStraight: degrees(nearStraight),
        }),
      );
    const { droop, warnings } = leaning(15);
    const left = fromStraight(droop?.shackleAngle ?? degrees(0));
    expect(left).toBeGreaterThan(5);
    expect(left).toBeLessThan(15);
    expect(warnings).toEqual([
      { at: "droop", words: expect.stringContaining(`${left.toFixed(1)}° from straight, laid away`) },
    ]);
    expect(leaning(5).warnings).toEqual([]);
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
