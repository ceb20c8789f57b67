import fc from "fast-check";
import { describe, expect, it } from "vitest";
import type { Outcome } from "../outcome";
import { inches, mm } from "../units/length";
import {
  effectiveSpan,
  type LeafPack,
  leafCounts,
  packDeflection,
  packNip,
  packRate,
  packStress,
} from "./leaf-pack";
import { packTravel } from "./leaf-pack-travel";
import { leafLengths, mainLeafBlank, thicknessFor } from "./leaf-sizing";
import { rideFrequency, rideFrequencyOf } from "./ride-frequency";

const value = <T>(outcome: Outcome<T>): T => {
  if (!outcome.ok) throw new Error(outcome.problem);
  return outcome.value;
};
const fault = (outcome: Outcome<unknown>) => (outcome.ok ? JSON.stringify(outcome.value) : outcome.problem);

const car: LeafPack = {
  leaves: 7,
  fullLength: 2,
  mainLeafCountsAs: "full-length",
  width: mm(65),
  thickness: mm(9),
  span: mm(1100),
  seat: { kind: "band", length: mm(80) },
  modulus: 210_000,
};
const heavy: LeafPack = {
  leaves: 18,
  fullLength: 4,
  mainLeafCountsAs: "graduated",
  width: mm(108),
  thickness: mm(12),
  span: mm(1000),
  seat: { kind: "none" },
  modulus: 207_000,
};
const anyPack: fc.Arbitrary<LeafPack> = fc
  .record({
    leaves: fc.integer({ min: 2, max: 14 }),
    full: fc.integer({ min: 1, max: 14 }),
    mainLeafCountsAs: fc.constantFrom("full-length" as const, "graduated" as const),
    width: fc.double({ min: 30, max: 120, noNaN: true }),
    thickness: fc.double({ min: 4, max: 16, noNaN: true }),
    span: fc.double({ min: 600, max: 2000, noNaN: true }),
    seat: fc.double({ min: 0, max: 200, noNaN: true }),
  })
  .map(({ full, leaves, width, thickness, span, seat, mainLeafCountsAs }) => ({
    leaves,
    fullLength: Math.min(full, leaves),
    mainLeafCountsAs,
    width: mm(width),
    thickness: mm(thickness),
    span: mm(span),
    seat: { kind: "u-bolts", length: mm(seat) },
    modulus: 206_000,
  }));

describe("leaf pack", () => {
  it("does the examples", () => {
    expect(value(effectiveSpan(mm(1100), car.seat))).toBe(1020);
    expect(value(effectiveSpan(mm(1100), { kind: "u-bolts", length: mm(90) }))).toBeCloseTo(1040, 9);
    expect(value(packRate(car))).toBeCloseTo(200.041, 3);
    expect(value(packDeflection(car, 6000))).toBeCloseTo(29.9939, 4);
    const { fullLength, graduated, largest } = value(packStress(car, 6000));
    expect([fullLength, graduated, largest].map(Number)).toEqual([
      expect.closeTo(326.923, 3),
      expect.closeTo(217.949, 3),
      expect.closeTo(326.923, 3),
    ]);
    expect(value(leafCounts(heavy))).toEqual({ full: 3, graduated: 15 });
    const nip = value(packNip(heavy, 75_000));
    expect(nip.gap).toBeCloseTo(13.4822, 4);
    expect(nip.boltLoad).toBeCloseTo(4807.692, 3);
    const { seat, span, modulus, leaves, fullLength: full, mainLeafCountsAs } = heavy;
    const unsized = { seat, span, modulus, leaves, fullLength: full, mainLeafCountsAs };
    expect(
      value(thicknessFor({ ...unsized, nipped: true, width: { thicknesses: 9 } }, 75_000, 450)),
    ).toBeCloseTo(11.556, 4);
    expect(value(leafLengths(car))).toEqual([250, 420, 590, 760, 930, 1100, 1100]);
    expect(mainLeafBlank(mm(1100), mm(20), mm(9))).toBeCloseTo(1282.2124, 4);
  });
  it("counts the main leaf as it is told, and says when counts cannot be", () => {
    expect(value(leafCounts({ leaves: 7, fullLength: 2, mainLeafCountsAs: "full-length" })).full).toBe(2);
    expect(value(leafCounts({ leaves: 7, fullLength: 2, mainLeafCountsAs: "graduated" })).full).toBe(1);
    for (const [leaves, fullLength] of [
      [7, 0],
      [2, 3],
      [6.5, 2],
    ] as const)
      expect(fault(leafCounts({ ...car, leaves, fullLength }))).toMatch(/whole ones/);
    expect(fault(packRate({ ...car, seat: { kind: "band", length: mm(1100) } }))).toMatch(/whole span/);
    expect(fault(packRate({ ...car, seat: { kind: "band", length: mm(-1) } }))).toMatch(/negative/);
    expect(fault(packRate({ ...car, thickness: mm(0) }))).toMatch(/more than nothing/);
    expect(fault(packNip({ ...car, leaves: 2 }, 6000))).toMatch(/only one kind/);
    expect(fault(thicknessFor({ ...car, nipped: false, width: { thicknesses: 0 } }, 1, 1))).toMatch(
      /more than/,
    );
  });
  it("carries one stress in all leaves at the load that the nip was made for", () => {
    fc.assert(
      fc.property(anyPack, fc.double({ min: 100, max: 90_000, noNaN: true }), (pack, load) => {
        const { full, graduated } = value(leafCounts(pack));
        fc.pre(full > 0 && graduated > 0);
        const { fullLength, graduated: others } = value(packStress({ ...pack, nippedFor: load }, load));
        expect((fullLength ?? 0) / (others ?? 1)).toBeCloseTo(1, 9);
        const half = value(effectiveSpan(pack.span, pack.seat)) / 2;
        const even = (6 * (load / 2) * half) / (pack.leaves * pack.width * pack.thickness ** 2);
        expect((fullLength ?? 0) / even).toBeCloseTo(1, 9);
        // Without load the bolt has drawn the full-length leaves the other way.
        expect(value(packStress({ ...pack, nippedFor: load }, 0)).fullLength).toBeLessThan(0);
      }),
    );
  });
  it("sizes a leaf to the very stress that the sized pack then carries", () => {
    fc.assert(
      fc.property(
        anyPack,
        fc.boolean(),
        fc.double({ min: 100, max: 900, noNaN: true }),
        (pack, nipped, stress) => {
          const load = 20_000;
          const thickness = value(thicknessFor({ ...pack, nipped, width: { thicknesses: 8 } }, load, stress));
          const sized = { ...pack, thickness, width: mm(8 * thickness), nippedFor: nipped ? load : null };
          expect(value(packStress(sized, load)).largest / stress).toBeCloseTo(1, 9);
        },
      ),
    );
  });
  it("never asks for a longer leaf above a shorter", () => {
    fc.assert(
      fc.property(anyPack, (pack) => {
        const lengths = value(leafLengths(pack));
        expect(lengths).toHaveLength(pack.leaves);
        expect([...lengths].sort((a, b) => a - b)).toEqual(lengths);
        expect(lengths.filter((length) => length === pack.span)).toHaveLength(pack.fullLength);
      }),
    );
  });
});

describe("pack travel and ride frequency", () => {
  it("do the examples", () => {
    const travel = value(packTravel(car, { freeArch: mm(90), rideLoad: 6000, bumpTravel: mm(70) }));
    expect(travel.flat.load).toBeCloseTo(18_003.66, 1);
    expect(travel.frequency).toBeCloseTo(2.8778, 4);
    expect(value(rideFrequency(inches(10)))).toBeCloseTo(0.98892, 4);
    expect(value(rideFrequencyOf(20, 2000))).toBeCloseTo(1.57613, 4);
    expect(fault(rideFrequency(mm(0)))).toMatch(/more than nothing/);
    expect(fault(rideFrequencyOf(0, 10))).toMatch(/more than nothing/);
    expect(fault(packTravel(car, { freeArch: mm(90), rideLoad: 0, bumpTravel: mm(70) }))).toMatch(
      /more than nothing/,
    );
    expect(fault(packTravel(car, { freeArch: mm(90), rideLoad: 1, bumpTravel: mm(-1) }))).toMatch(
      /not below/,
    );
  });
  it("add up: loads grow with travel, arch and deflection make the free arch", () => {
    fc.assert(
      fc.property(anyPack, fc.double({ min: 1, max: 200, noNaN: true }), (pack, bumpTravel) => {
        const rate = value(packRate(pack));
        const { ride, flat, bump } = value(
          packTravel(pack, { freeArch: mm(120), rideLoad: 60 * rate, bumpTravel: mm(bumpTravel) }),
        );
        expect(ride.arch).toBeCloseTo(60, 9);
        expect(flat.arch).toBe(0);
        expect(flat.load / ride.load).toBeCloseTo(2, 9);
        expect(bump.arch + bump.deflection).toBeCloseTo(120, 9);
        expect(bump.stress.largest / ride.stress.largest).toBeCloseTo(bump.load / ride.load, 9);
      }),
    );
  });
});
