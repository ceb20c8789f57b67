import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { leafTravel, sidePoint } from "../springs/leaf-travel";
import { leafOf } from "../springs/main-leaf";
import { degrees, toRadians } from "../units/angle";
import { inches, mm, toInches } from "../units/length";
import { jointsOf, shackleOf } from "./option-detail";
import { Rejection, reasonsAgainst } from "./option-limits";
import { alikeTo } from "./option-order";
import { optionSearch } from "./option-search";
import type { OptionSearch } from "./option-types";

/** The measured case: holes, springs and tyre as in measured-case.test.ts; figures worked out independently. */
const measured: OptionSearch = {
  springs: [
    { id: 1, rackNumber: 14, length: inches(52), frontHalf: inches(26), arch: null },
    { id: 2, rackNumber: 22, length: inches(52), frontHalf: inches(24), arch: null },
  ],
  holes: [70.5, 71.5, 72.5].map((station, i) => ({ id: i + 1, number: i + 1, station: inches(station) })),
  fixedEye: "ahead",
  axle: "front",
  openingCentre: inches(44.4066),
  loadedRadius: inches(16.5),
  lowPoints: [{ station: inches(76), height: inches(22) }],
  sigma: { hole: inches(1 / 32), half: inches(1 / 32) },
};
const table = (over: Partial<OptionSearch> = {}) => optionSearch({ ...measured, ...over });
const inInches = (column: Float64Array) => [...column].map((value) => Number(toInches(mm(value)).toFixed(4)));

describe("the option table", () => {
  it("hangs each spring both ways in each hole, an even spring one way", () => {
    const { count, flat, hangs } = table();
    expect(count).toBe(9);
    expect(hangs.map(({ turned }) => turned)).toEqual([false, false, true]);
    expect(inInches(flat)).toEqual([44.5, 45.5, 46.5, 46.5, 47.5, 48.5, 42.5, 43.5, 44.5]);
  });
  it("gives the approach angles of the measured case", () => {
    const { approach } = table();
    expect([...approach.slice(0, 6)].map((angle) => Number(angle.toFixed(2)))).toEqual([
      40.97, 42.39, 43.92, 43.92, 45.57, 47.35,
    ]);
  });
  it("moves the axle with another hole in the perch", () => {
    const { flat } = table({ pinOffsets: [inches(-1), mm(0), inches(1)] });
    expect(inInches(flat).slice(0, 9)).toEqual([43.5, 44.5, 45.5, 44.5, 45.5, 46.5, 45.5, 46.5, 47.5]);
  });
  it("puts those that stand first, nearest to the centre first, and says why the others do not", () => {
    const search = { ...measured, limits: { approachAtLeast: degrees(43), shiftWithin: inches(4) } };
    const columns = optionSearch(search);
    const stands = [...columns.order].map((i) => columns.rejected[i] === 0);
    expect(stands).toEqual([true, true, true, false, false, false, false, false, false]);
    expect(inInches(columns.shift.filter((_, i) => columns.rejected[i] === 0))).toEqual([
      2.0934, 2.0934, 3.0934,
    ]);
    expect(reasonsAgainst(search, columns, 5)).toEqual(["4 1/16 in ahead of the centre, asked within 4 in."]);
    expect(reasonsAgainst(search, columns, 0)).toEqual(["Approach 40.97°, asked at least 43.00°."]);
    expect(reasonsAgainst(search, columns, 2)).toEqual([]);
  });
  it("tells which cannot be told apart", () => {
    const columns = table();
    // Uncertainty of each: 2·√2/32 in. Options 2 and 3 put the axle at the same station.
    expect(columns.plusMinus[0]).toBeCloseTo(inches((2 * Math.SQRT2) / 32), 9);
    expect(alikeTo(columns, 2)).toEqual([3]);
    expect(alikeTo(columns, 0)).toEqual([8]);
    expect(alikeTo(columns, 5)).toEqual([]);
  });
  it("keeps a spring that cannot be reckoned with in the table, with the reason", () => {
    const search = {
      ...measured,
      springs: [
        {
          id: 9,
          rackNumber: 9,
          length: inches(40),
          frontHalf: inches(20),
          arch: { droop: inches(30), ride: inches(4) },
        },
      ],
    };
    const columns = optionSearch(search);
    expect([...columns.rejected]).toEqual([Rejection.spring, Rejection.spring, Rejection.spring]);
    expect(reasonsAgainst(search, columns, 0)).toEqual(["The leaf is too short for so much arch."]);
  });
});

const travelling: OptionSearch = {
  ...measured,
  springs: [
    {
      id: 1,
      rackNumber: 1,
      length: inches(52),
      frontHalf: inches(24),
      arch: { droop: inches(7), ride: inches(4) },
      clamped: inches(4),
    },
  ],
  tyre: { freeRadius: inches(17.5), width: inches(12.5), lock: degrees(32) },
  opening: {
    front: { station: inches(66), lip: inches(9) },
    rear: { station: inches(27), lip: null },
  },
  stock: { axleStation: inches(43), wheelbase: inches(93.5) },
  otherAxle: { station: inches(-50.5), loadedRadius: inches(16.5) },
};

describe("through the travel", () => {
  it("agrees with each place reckoned by itself", () => {
    const { fixedEye, holes, tyre, opening } = travelling;
    const columns = optionSearch(travelling);
    const [spring] = travelling.springs;
    const hole = holes[1];
    if (!spring?.arch || !hole || !tyre || !opening) throw new Error("The case is not whole");
    const leaf = leafOf(spring, { clamped: inches(4) });
    if (!leaf.ok) throw new Error(leaf.problem);
    const path = leafTravel(
      { leaf: leaf.value, fixedEye, eye: sidePoint(hole.station, 0) },
      { from: spring.arch.droop, to: mm(0), steps: 60 },
    );
    if (!path.ok) throw new Error(path.problem);
    const stations = path.value.map((place) => place.axle.station);
    expect(columns.droop[1]).toBeCloseTo(stations[0] ?? 0, 6);
    expect(columns.flat[1]).toBeCloseTo(stations[60] ?? 0, 6);
    // The lip is 9 in above the hub at full compression and as much higher above it as the wheel hangs lower.
    const chord = (arch: number) =>
      Math.sqrt(
        Math.max(
          0,
          tyre.freeRadius ** 2 -
            (opening.front.lip ?? 0) ** 2 -
            2 * (opening.front.lip ?? 0) * arch -
            arch ** 2,
        ),
      );
    const room = Math.min(
      ...path.value
        .filter((place) => (opening.front.lip ?? 0) + place.arch < tyre.freeRadius)
        .map((place) => opening.front.station - place.axle.station - chord(place.arch)),
    );
    expect(columns.frontRoom[1]).toBeCloseTo(room, 6);
    // Over the whole sweep, a degree at a time.
    const reach = (place: number, steer: number) =>
      tyre.freeRadius * Math.cos(toRadians(degrees(steer))) +
      (tyre.width / 2) * Math.sin(toRadians(degrees(steer))) -
      place;
    const behind = Math.min(
      ...stations.map(
        (place) =>
          -opening.rear.station - Math.max(...Array.from({ length: 33 }, (_, steer) => reach(place, steer))),
      ),
    );
    expect(columns.rearRoomAtLock[1]).toBeGreaterThan(behind - 0.05);
    expect(columns.rearRoomAtLock[1]).toBeLessThanOrEqual(behind + 1e-9);
  });
  it("never finds more room at lock than straight, nor less where the lip was measured", () => {
    fc.assert(
      fc.property(fc.integer({ min: 2, max: 16 }), fc.integer({ min: 0, max: 40 }), (lip, lock) => {
        const tyre = { freeRadius: inches(17.5), width: inches(12.5), lock: degrees(lock) };
        const edges = (front: number | null) => ({
          front: { station: inches(66), lip: front === null ? null : inches(front) },
          rear: { station: inches(27), lip: null },
        });
        const measuredLip = optionSearch({ ...travelling, tyre, opening: edges(lip) });
        const plan = optionSearch({ ...travelling, tyre, opening: edges(null) });
        for (let i = 0; i < plan.count; i++) {
          expect(measuredLip.frontRoom[i]).toBeGreaterThanOrEqual((plan.frontRoom[i] ?? 0) - 1e-9);
          expect(plan.frontRoomAtLock[i]).toBeLessThanOrEqual((plan.frontRoom[i] ?? 0) + 1e-9);
          expect(plan.rearRoomAtLock[i]).toBeLessThanOrEqual((plan.rearRoom[i] ?? 0) + 1e-9);
        }
      }),
      { numRuns: 40 },
    );
  });
  it("settles as the steps get finer", () => {
    const room = (travelSteps: number) => optionSearch({ ...travelling, travelSteps }).frontRoom[0] ?? 0;
    const fine = room(3840);
    expect(Math.abs(room(60) - fine)).toBeLessThan(0.2);
    expect(Math.abs(room(240) - fine)).toBeLessThanOrEqual(Math.abs(room(15) - fine));
  });
  it("seen from behind, a rear axle with its eye behind is the front axle's mirror image", () => {
    const back = (station: number) => mm(-station);
    const mirrored = optionSearch({
      ...travelling,
      axle: "rear",
      fixedEye: "behind",
      springs: travelling.springs.map((spring) => ({
        ...spring,
        frontHalf: mm(spring.length - spring.frontHalf),
      })),
      holes: travelling.holes.map((hole) => ({ ...hole, station: back(hole.station) })),
      openingCentre: back(travelling.openingCentre),
      opening: {
        front: { station: inches(-27), lip: null },
        rear: { station: inches(-66), lip: inches(9) },
      },
      stock: { axleStation: inches(-43), wheelbase: inches(93.5) },
      otherAxle: { station: inches(50.5), loadedRadius: inches(16.5) },
      lowPoints: [{ station: inches(-76), height: inches(22) }],
    });
    const columns = optionSearch(travelling);
    for (let i = 0; i < columns.count; i++) {
      expect(mirrored.flat[i]).toBeCloseTo(-(columns.flat[i] ?? 0), 6);
      expect(mirrored.ride[i]).toBeCloseTo(-(columns.ride[i] ?? 0), 6);
      expect(mirrored.rearRoom[i]).toBeCloseTo(columns.frontRoom[i] ?? 0, 6);
      expect(mirrored.departure[i]).toBeCloseTo(columns.approach[i] ?? 0, 9);
      expect(mirrored.wheelbase[i]).toBeCloseTo(columns.wheelbase[i] ?? 0, 6);
    }
  });
});

describe("what hangs on the axle", () => {
  it("gives the ramp angle as the sum of both tangents (49 CFR 523.2 sense; figures derived: wheelbase 100, radius 16, point at 50 ahead, 10 high: 23.3647°)", () => {
    const columns = optionSearch({
      ...measured,
      springs: [{ id: 1, rackNumber: 1, length: inches(52), frontHalf: inches(26), arch: null }],
      holes: [{ id: 1, number: 1, station: inches(126) }],
      loadedRadius: inches(16),
      otherAxle: { station: mm(0), loadedRadius: inches(16) },
      lowPoints: [{ station: inches(50), height: inches(10) }],
    });
    expect(columns.ramp[0]).toBeCloseTo(23.3647, 4);
    expect(columns.approach[0]).toBeNaN();
  });
  it("keeps a drag link and a propshaft that square up with Pythagoras", () => {
    const at = (station: number, offset: number, height: number) => ({
      station: inches(station),
      offset: inches(offset),
      height: inches(height),
    });
    const columns = optionSearch({
      ...travelling,
      dragLink: { box: at(70, 12, 30), axle: at(43, 18, 24) },
      propshaft: { box: at(0, 0, 22), axle: at(40, 0, 18) },
    });
    const moved = toInches(mm(columns.ride[0] ?? 0)) - 43;
    expect(toInches(mm(columns.dragLinkChange[0] ?? 0))).toBeCloseTo(
      Math.hypot(27 - moved, 6, 6) - Math.hypot(27, 6, 6),
      9,
    );
    expect(toInches(mm(columns.propshaftRide[0] ?? 0))).toBeCloseTo(Math.hypot(40 + moved, 4), 9);
    expect(columns.propshaftSlip[0]).toBeGreaterThan(0);
  });
});

describe("what an option asks of shackle and joints", () => {
  const search: OptionSearch = {
    ...travelling,
    shackle: { length: inches(4), load: "compression" },
    propshaft: {
      box: { station: inches(0), offset: inches(0), height: inches(20) },
      axle: { station: inches(40), offset: inches(0), height: inches(20) },
      output: { plan: degrees(0), side: degrees(3) },
      pinion: { plan: degrees(0), side: degrees(-2) },
    },
  };
  it("places the second hanger so that the shackle is square at ride height, in every hole alike", () => {
    const columns = optionSearch(search);
    const [first, second] = [0, 1].map((i) => shackleOf(search, columns, i));
    expect(first?.ride).toBeCloseTo(90, 9);
    expect(first?.droop).not.toBeNull();
    const apart = (second?.hanger.station ?? 0) - (first?.hanger.station ?? 0);
    expect(apart).toBeCloseTo(inches(1), 6);
    expect(second?.ride).toBeCloseTo(first?.ride ?? 0, 9);
  });
  it("gives both joints' angles where the shafts' directions are known", () => {
    const columns = optionSearch(search);
    // The shaft lies level: each joint works at its own shaft's slope.
    expect(jointsOf(search, columns, 0)?.first).toBeCloseTo(3, 9);
    expect(jointsOf(search, columns, 0)?.second).toBeCloseTo(2, 9);
    expect(jointsOf(travelling, columns, 0)).toBeNull();
  });
  it("says nothing of a shackle where the arch is not known", () =>
    expect(shackleOf({ ...measured, shackle: search.shackle }, table(), 0)).toBeNull());
});
