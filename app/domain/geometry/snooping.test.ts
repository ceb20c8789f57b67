import fc from "fast-check";
import { describe, expect, it } from "vitest";
import {
  criticalResidual,
  minimalDetectableBias,
  nonCentrality,
  normalDistribution,
  normalQuantile,
  standardisedResidual,
} from "./snooping";

describe("the normal law", () => {
  it("has 97.5 % below 1.959964, and 80 % below 0.841621", () => {
    expect(normalDistribution(1.959964)).toBeCloseTo(0.975, 7);
    expect(normalQuantile(0.8)).toBeCloseTo(0.841621, 6);
    expect([normalDistribution(-20), normalDistribution(20)]).toEqual([0, 1]);
  });
  it("comes back from its quantile, and is the same on both sides", () =>
    fc.assert(
      fc.property(fc.double({ min: 1e-6, max: 1 - 1e-6, noNaN: true }), (p) => {
        const x = normalQuantile(p);
        return (
          Math.abs(normalDistribution(x) - p) < 1e-11 && Math.abs(normalDistribution(-x) - (1 - p)) < 1e-11
        );
      }),
    ));
  it("has no quantile of 0 or 1", () => {
    expect(() => normalQuantile(0)).toThrow(RangeError);
    expect(() => normalQuantile(1)).toThrow(RangeError);
  });
});

describe("data snooping", () => {
  it("takes 3.2905 as critical at 0.1 %, and 4.1321 as the non-centrality at 80 % power", () => {
    expect(criticalResidual(0.001)).toBeCloseTo(3.2905, 4);
    expect(nonCentrality(0.001, 0.8)).toBeCloseTo(4.1321, 4);
  });
  it("finds 8.2642 σ at a redundancy number of a quarter, and nothing where nothing checks", () => {
    expect(minimalDetectableBias(1, 0.25)).toBeCloseTo(8.2642, 3);
    expect(minimalDetectableBias(1, 0)).toBeNull();
  });
  it("standardizes a residual of half a σ at a quarter to 1", () => {
    expect(standardisedResidual(0.5, 0.25, 1)).toBe(1);
    expect(standardisedResidual(0.5, 0, 1)).toBeNull();
  });
});
