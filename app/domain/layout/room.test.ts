import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { degrees } from "../units/angle";
import { inches, mm, toInches } from "../units/length";
import { planReach, roomInOpening, roomToLip, type Tyre, worstReach } from "./room";

const tyre: Tyre = { freeRadius: inches(17.5), width: inches(12.5), lock: degrees(32) };

describe("room in the opening", () => {
  it("takes the tyre's chord at the lip's height", () => {
    const room = roomToLip(mm(0), { station: inches(17), lip: inches(9) }, 1, tyre);
    expect(toInches(room?.straight ?? mm(0))).toBeCloseTo(17 - Math.sqrt(17.5 ** 2 - 81), 9);
    expect(room?.lipMeasured).toBe(true);
  });
  it("takes the whole radius where the lip was not measured, as in plan", () => {
    const plan = roomInOpening(mm(0), { front: inches(20), rear: inches(-20) }, tyre);
    for (const [side, edge] of [
      [1, "front"],
      [-1, "rear"],
    ] as const)
      expect(roomToLip(mm(0), { station: inches(20 * side), lip: null }, side, tyre)).toEqual({
        ...plan[edge],
        lipMeasured: false,
      });
  });
  it("knows no rub where the tyre stays below the lip", () =>
    expect(roomToLip(mm(0), { station: mm(0), lip: inches(18) }, 1, tyre)).toBeNull());
  it("finds the worst of the whole sweep, which no single angle beats", () => {
    fc.assert(
      fc.property(fc.integer({ min: 0, max: 45 }), fc.integer({ min: 8, max: 25 }), (lock, radius) => {
        const some: Tyre = { freeRadius: inches(radius), width: inches(12), lock: degrees(lock) };
        const sweep = Array.from({ length: lock * 4 + 1 }, (_, i) => planReach(some, degrees(i / 4)));
        expect(worstReach(some)).toBeGreaterThanOrEqual(Math.max(...sweep) - 1e-9);
        expect(worstReach(some)).toBeLessThan(Math.max(...sweep) + 0.02);
      }),
    );
  });
});
