import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { mm } from "../units/length";
import { searchBlunders } from "./blunder-search";
import { adjustDistances, type DistanceNetwork, type NamedPoint } from "./lateration";

const at = (name: string, ...coordinates: number[]): NamedPoint => ({
  name,
  at: coordinates.map((value) => mm(value)),
});
const lengthOf = (a: NamedPoint, b: NamedPoint) =>
  Math.hypot(...a.at.map((value, i) => value - (b.at[i] ?? 0)));
const SPACE = [at("A", 0, 0, 0), at("B", 3000, 0, 0), at("C", 0, 2500, 0), at("D", 0, 0, 2000)];
const FLOOR = [at("A", 0, 0), at("B", 3000, 0), at("C", 3000, -1200), at("D", 0, -1200), at("E", 1500, 2500)];

/** Exact distances from every fixed point to P, each a little wrong as told. */
const network = (fixed: NamedPoint[], point: NamedPoint, errors: number[] = []): DistanceNetwork => ({
  fixed,
  unknown: [{ ...point, at: point.at.map((value) => mm(value + 150)) }],
  distances: fixed.map((mark, i) => ({
    from: mark.name,
    to: point.name,
    distance: mm(lengthOf(mark, point) + (errors[i] ?? 0)),
    sigma: mm(0.8),
  })),
});
const must = (input: DistanceNetwork) => {
  const fit = adjustDistances(input);
  if (!fit.ok) throw new Error(fit.problem);
  return fit.value;
};

describe("adjustDistances", () => {
  it("finds (432, 576) from 720 and 960 to marks 1200 apart, with nothing to check it", () => {
    const fit = must({
      fixed: [at("A", 0, 0), at("B", 1200, 0)],
      unknown: [at("P", 400, 400)],
      distances: [
        { from: "A", to: "P", distance: mm(720), sigma: mm(1) },
        { from: "B", to: "P", distance: mm(960), sigma: mm(1) },
      ],
    });
    expect(fit.points[0]?.at[0]).toBeCloseTo(432, 6);
    expect(fit.points[0]?.at[1]).toBeCloseTo(576, 6);
    expect(fit).toMatchObject({ redundancy: 0, varianceFactorRoot: null });
    expect(fit.distances[0]).toMatchObject({ standardised: null, minimalDetectableBias: null });
    // The two tapes cross squarely: each coordinate is as sure as one tape.
    expect(fit.points[0]?.sigmas[0]).toBeCloseTo(1, 9);
  });
  it("finds any point in space again", () =>
    fc.assert(
      fc.property(fc.tuple(...[0, 0, 0].map(() => fc.integer({ min: 300, max: 1900 }))), (xyz) => {
        const point = at("P", ...xyz);
        const found = must(network(SPACE, point)).points[0];
        return found !== undefined && lengthOf(found, point) < 1e-4;
      }),
    ));
  it("settles where the last digits make the fit look worse", () => {
    const base = network(FLOOR, at("P", 1400, 900), [0, 0, 0, 0, -0.1862328320288498]);
    const shifted = ({ name, at: [x = mm(0), y = mm(0)] }: NamedPoint) => at(name, x + 700, y - 90);
    const input = { ...base, fixed: base.fixed.map(shifted), unknown: base.unknown.map(shifted) };
    const found = must(input).points[0];
    expect(found && lengthOf(found, at("P", 2100, 810))).toBeLessThan(0.2);
  });
  it("gives redundancy numbers that add up, and moves with the marks", () =>
    fc.assert(
      fc.property(
        fc.array(fc.double({ min: -2, max: 2, noNaN: true }), { minLength: 5, maxLength: 5 }),
        fc.double({ min: -3, max: 3, noNaN: true }),
        (errors, angle) => {
          const base = network(FLOOR, at("P", 1400, 900), errors);
          const turn = ({ name, at: [x = mm(0), y = mm(0)] }: NamedPoint) =>
            at(
              name,
              x * Math.cos(angle) - y * Math.sin(angle) + 700,
              x * Math.sin(angle) + y * Math.cos(angle) - 90,
            );
          const fit = must(base);
          const moved = must({ ...base, fixed: base.fixed.map(turn), unknown: base.unknown.map(turn) });
          const [p, q] = [fit.points[0], moved.points[0]];
          const sum = fit.distances.reduce((total, one) => total + one.redundancyNumber, 0);
          return (
            p !== undefined && q !== undefined && lengthOf(turn(p), q) < 1e-5 && Math.abs(sum - 3) < 1e-9
          );
        },
      ),
    ));
  it("says in words why it cannot", () => {
    const words = (change: Partial<DistanceNetwork>) => {
      const fit = adjustDistances({ ...network(FLOOR, at("P", 1400, 900)), ...change });
      return fit.ok ? "ok" : fit.problem;
    };
    expect(words({ unknown: [] })).toBe("There is no point to find.");
    expect(words({ distances: [] })).toBe("2 distances at least are needed; there are 0.");
    expect(words({ fixed: [at("A", 0, 0), at("A", 1, 1)] })).toBe("Two points have the same name.");
    expect(words({ fixed: [at("A", 0, 0, 0)] })).toBe("All points need two coordinates, or all three.");
    expect(words({ fixed: FLOOR.slice(1) })).toBe("A is no point of this network.");
    const line = [at("A", 0, 0), at("B", 1000, 0)];
    expect(adjustDistances(network(line, at("P", 500, -150)))).toMatchObject({
      ok: false,
      problem: expect.stringContaining("free to move"),
    });
  });
});

describe("searchBlunders", () => {
  const search = (input: DistanceNetwork) => {
    const found = searchBlunders(input);
    if (!found.ok) throw new Error(found.problem);
    return found.value;
  };
  it("leaves nothing out when all agree", () =>
    expect(search(network(FLOOR, at("P", 1400, 900), [0.5, -0.6, 0.2]))).toMatchObject({
      leftOut: [],
      unresolved: false,
    }));
  it.each(FLOOR.map((mark, i) => [mark.name, i] as const))("leaves out the burnt inch from %s", (name, i) => {
    const errors = FLOOR.map((_, j) => (j === i ? 25.4 : 0.3 * (j - 2)));
    const found = search(network(FLOOR, at("P", 1400, 900), errors));
    expect(found.leftOut.map((one) => one.from)).toEqual([name]);
    expect(found.unresolved).toBe(false);
  });
  it("does not guess with one spare distance", () => {
    const found = search(network(FLOOR.slice(0, 3), at("P", 1400, 900), [25.4]));
    expect(found).toMatchObject({ leftOut: [], unresolved: true });
  });
});
