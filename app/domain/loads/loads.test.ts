import fc from "fast-check";
import { describe, expect, it } from "vitest";
import type { Outcome } from "../outcome";
import { inches, mm, toInches } from "../units/length";
import { axleLoadsAfterMove } from "./axle-move";
import { type AxleLift, cgHeightByLifting } from "./cg-height";
import { weightPlace } from "./corner-weights";
import { loadTransfer } from "./load-transfer";
import { springLoad, wheelRate } from "./spring-load";

const value = <T>(outcome: Outcome<T>): T => {
  if (!outcome.ok) throw new Error(outcome.problem);
  return outcome.value;
};
const fault = (outcome: Outcome<unknown>) => (outcome.ok ? JSON.stringify(outcome.value) : outcome.problem);
const plan = { wheelbase: mm(2800), frontTrack: mm(1500), rearTrack: mm(1400) };
const newtons = fc.double({ min: 500, max: 9000, noNaN: true });

describe("weightPlace", () => {
  it("does the example", () => {
    const even = { leftFront: 3000, rightFront: 3000, leftRear: 2000, rightRear: 2000 };
    const got = value(weightPlace(even, plan));
    expect(got).toMatchObject({ weight: 10_000, frontShare: 0.6, leftShare: 0.5, crossShare: 0.5 });
    expect(got.behindFront).toBeCloseTo(1120, 9);
    expect(got.leftOfCentre).toBe(0);
  });
  it("goes to the other side when left and right change places", () => {
    fc.assert(
      fc.property(newtons, newtons, newtons, newtons, (a, b, c, d) => {
        const one = value(weightPlace({ leftFront: a, rightFront: b, leftRear: c, rightRear: d }, plan));
        const other = value(weightPlace({ leftFront: b, rightFront: a, leftRear: d, rightRear: c }, plan));
        expect(other.leftOfCentre).toBeCloseTo(-one.leftOfCentre, 9);
        expect(other.behindFront).toBeCloseTo(one.behindFront, 9);
        expect(other.crossShare).toBeCloseTo(1 - one.crossShare, 12);
      }),
    );
  });
  it("says what cannot be", () => {
    const none = { leftFront: 0, rightFront: 0, leftRear: 0, rightRear: 0 };
    expect(fault(weightPlace(none, plan))).toMatch(/any weight/);
    expect(fault(weightPlace({ ...none, leftFront: -1 }, plan))).toMatch(/less than nothing/);
    expect(fault(weightPlace({ ...none, leftFront: 1 }, { ...plan, rearTrack: mm(0) }))).toMatch(/tracks/);
  });
});

describe("cgHeightByLifting", () => {
  const lifted: AxleLift = {
    weight: 4000,
    wheelbase: inches(110),
    levelLoad: 2200,
    liftedLoad: 2290,
    lift: inches(20),
    downRadius: inches(15),
    liftedRadius: inches(15),
  };
  it("does the example", () => {
    const got = value(cgHeightByLifting(lifted));
    expect(toInches(got.height)).toBeCloseTo(28.3856, 4);
    expect(got.tilt).toBeCloseTo(10.47568, 5);
    const one = value(cgHeightByLifting({ ...lifted, liftedLoad: 2291 }));
    expect(one.height - got.height).toBeCloseTo(got.heightPerNewton, 9);
  });
  it("finds the height again from the loads that a known one makes, with unequal tyres", () => {
    fc.assert(
      fc.property(
        fc.double({ min: 300, max: 1100, noNaN: true }),
        fc.double({ min: 0.3, max: 0.7, noNaN: true }),
        fc.double({ min: -60, max: 60, noNaN: true }),
        fc.double({ min: 3, max: 20, noNaN: true }),
        (height, share, step, degreesUp) => {
          const [length, down, tilt] = [2800, 350, (degreesUp * Math.PI) / 180];
          const turned = (x: number, z: number) => ({
            x: x * Math.cos(tilt) - z * Math.sin(tilt),
            z: x * Math.sin(tilt) + z * Math.cos(tilt),
          });
          const [other, centre] = [turned(length, step), turned(share * length, height - down)];
          const got = value(
            cgHeightByLifting({
              weight: 15_000,
              wheelbase: mm(length),
              levelLoad: 15_000 * (1 - share),
              liftedLoad: 15_000 * (1 - centre.x / other.x),
              lift: mm(other.z - step),
              downRadius: mm(down),
              liftedRadius: mm(down + step),
            }),
          );
          expect(got.height).toBeCloseTo(height, 6);
          expect(got.tilt).toBeCloseTo(degreesUp, 8);
        },
      ),
    );
  });
  it("says what cannot be", () => {
    expect(fault(cgHeightByLifting({ ...lifted, lift: mm(0) }))).toMatch(/more than nothing/);
    expect(fault(cgHeightByLifting({ ...lifted, lift: inches(111) }))).toMatch(/more than the wheelbase/);
    expect(fault(cgHeightByLifting({ ...lifted, liftedLoad: 4000 }))).toMatch(/not all/);
    expect(fault(cgHeightByLifting({ ...lifted, liftedLoad: 1900 }))).toMatch(/under the floor/);
    expect(fault(cgHeightByLifting({ ...lifted, downRadius: mm(0) }))).toMatch(/radius/);
    expect(fault(cgHeightByLifting({ ...lifted, weight: 0 }))).toMatch(/Weight/);
  });
});

describe("loadTransfer", () => {
  it("does the example, and braking the other way", () => {
    const got = value(loadTransfer({ front: 2400, rear: 1600 }, mm(24), mm(108), 0.5));
    expect(got.toRear).toBeCloseTo(444.44, 2);
    expect([got.front, got.rear]).toEqual([expect.closeTo(1955.56, 2), expect.closeTo(2044.44, 2)]);
    expect(got.liftsAt).toBeCloseTo(2.7, 9);
    const braking = value(loadTransfer({ front: 2400, rear: 1600 }, mm(24), mm(108), -0.5));
    expect(braking.toRear).toBeCloseTo(-444.44, 2);
    expect(braking.liftsAt).toBeCloseTo(-1.8, 9);
    expect(value(loadTransfer({ front: 1, rear: 1 }, mm(1), mm(2), 0)).liftsAt).toBeNull();
  });
  it("keeps the weight", () => {
    fc.assert(
      fc.property(newtons, newtons, fc.double({ min: -0.4, max: 0.4, noNaN: true }), (front, rear, g) => {
        const got = loadTransfer({ front, rear }, mm(500), mm(10_000), g);
        if (got.ok) expect(got.value.front + got.value.rear).toBeCloseTo(front + rear, 8);
      }),
    );
  });
  it("says when an axle leaves the ground", () => {
    expect(fault(loadTransfer({ front: 2400, rear: 1600 }, mm(24), mm(108), 3))).toMatch(
      /front axle.*2\.70 g/,
    );
    expect(fault(loadTransfer({ front: 2400, rear: 1600 }, mm(24), mm(108), -2))).toMatch(
      /rear axle.*1\.80 g/,
    );
    expect(fault(loadTransfer({ front: -1, rear: 1600 }, mm(24), mm(108), 0))).toMatch(/no less/);
    expect(fault(loadTransfer({ front: 1, rear: 1 }, mm(0), mm(108), 0))).toMatch(/Height/);
  });
});

describe("axleLoadsAfterMove", () => {
  const move = {
    loads: { front: 2400, rear: 1600 },
    wheelbase: mm(100),
    frontForward: mm(5),
    rearForward: mm(0),
  };
  it("does the example", () => {
    const got = value(axleLoadsAfterMove(move));
    expect(got).toEqual({
      front: expect.closeTo(2285.71, 2),
      rear: expect.closeTo(1714.29, 2),
      wheelbase: 105,
    });
  });
  it("moves less load when the axle takes its own weight along, and nothing when nothing moves", () => {
    const own = value(axleLoadsAfterMove({ ...move, frontUnsprung: 500 }));
    expect(own.front).toBeGreaterThan(2285.71);
    expect(own.front + own.rear).toBeCloseTo(4000, 9);
    const still = value(axleLoadsAfterMove({ ...move, frontForward: mm(0), rearUnsprung: 300 }));
    expect([still.front, still.rear]).toEqual([expect.closeTo(2400, 9), expect.closeTo(1600, 9)]);
  });
  it("comes back when the axle is moved back", () => {
    fc.assert(
      fc.property(newtons, newtons, fc.double({ min: -100, max: 100, noNaN: true }), (front, rear, by) => {
        const there = value(
          axleLoadsAfterMove({
            loads: { front, rear },
            wheelbase: mm(2800),
            frontForward: mm(by),
            rearForward: mm(0),
          }),
        );
        const back = value(
          axleLoadsAfterMove({
            loads: there,
            wheelbase: there.wheelbase,
            frontForward: mm(-by),
            rearForward: mm(0),
          }),
        );
        expect(back.front).toBeCloseTo(front, 6);
      }),
    );
  });
  it("says what cannot be", () => {
    expect(fault(axleLoadsAfterMove({ ...move, rearForward: mm(106) }))).toMatch(/change places/);
    expect(fault(axleLoadsAfterMove({ ...move, rearForward: mm(70) }))).toMatch(/front axle would be lifted/);
    expect(fault(axleLoadsAfterMove({ ...move, frontForward: mm(-50) }))).toMatch(
      /rear axle would be lifted/,
    );
    expect(fault(axleLoadsAfterMove({ ...move, frontUnsprung: 2500 }))).toMatch(/no more than/);
    expect(fault(axleLoadsAfterMove({ ...move, wheelbase: mm(0) }))).toMatch(/wheelbase/);
    const bare = { ...move, loads: { front: 5, rear: 5 }, frontUnsprung: 5, rearUnsprung: 5 };
    expect(fault(axleLoadsAfterMove(bare))).toMatch(/frame carries/);
  });
});

describe("springLoad and wheelRate", () => {
  it("do the examples", () => {
    expect(value(springLoad(4000, 600))).toEqual({ load: 3400, sprung: 3400 });
    expect(value(springLoad(4000, 600, 0.8)).load).toBeCloseTo(4250, 9);
    expect(value(wheelRate(40, 0.8))).toBeCloseTo(25.6, 9);
  });
  it("say what cannot be", () => {
    expect(fault(springLoad(500, 600))).toMatch(/outside the spring/);
    expect(fault(springLoad(500, -1))).toMatch(/unsprung/);
    expect(fault(springLoad(500, 1, 0))).toMatch(/ratio/);
    expect(fault(wheelRate(0, 1))).toMatch(/more than nothing/);
  });
});
