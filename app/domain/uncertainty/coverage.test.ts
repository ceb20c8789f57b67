import { describe, expect, it } from "vitest";
import { type Input, propagate } from "./propagate";
import { fromHalfWidth, repeated } from "./readings";

/*
 * What the stated coverage is worth, by drawing: cases are drawn from what is known, and it is counted how many lie
 * within the stated ±. The seed is fixed, so that the count is the same every time; its own spread (one standard
 * deviation) is √(p(1 − p)/n).
 */

function drawing(seed: number) {
  let state = seed;
  /** Mulberry32: above 0 and below 1. */
  const uniform = () => {
    state = (state + 0x6d2b79f5) | 0;
    let t = Math.imul(state ^ (state >>> 15), 1 | state);
    t = (t + Math.imul(t ^ (t >>> 7), 61 | t)) ^ t;
    return (((t ^ (t >>> 14)) >>> 0) + 0.5) / 4_294_967_296;
  };
  const normal = () => Math.sqrt(-2 * Math.log(uniform())) * Math.cos(2 * Math.PI * uniform());
  return { uniform, normal };
}
const stated = (of: (values: readonly number[]) => number, inputs: Input[]) => {
  const came = propagate(of, { inputs });
  if (!came.ok) throw new Error(came.problem);
  return came.value;
};
const shareWithin = (drawn: number[], middle: number, width: number) =>
  drawn.filter((value) => Math.abs(value - middle) <= width).length / drawn.length;
const many = <T>(n: number, draw: () => T): T[] => Array.from({ length: n }, draw);
const N = 100_000;
/** Four standard deviations of the count. */
const NEAR = 4 * Math.sqrt((0.95 * 0.05) / N);

describe("the stated coverage is reached", () => {
  it("by the place of a hole: tape, bob and a half length, each normal", () => {
    const { normal } = drawing(1);
    const sum = ([a = 0, b = 0, c = 0]: readonly number[]) => a + b - c;
    const { value, expanded } = stated(sum, [
      { name: "tape", value: 1816, uncertainty: 0.8 },
      { name: "bob", value: 0, uncertainty: 0.4 },
      { name: "half", value: 660, uncertainty: 0.9 },
    ]);
    const drawn = many(N, () => sum([1816 + 0.8 * normal(), 0.4 * normal(), 660 + 0.9 * normal()]));
    expect(Math.abs(shareWithin(drawn, value, expanded) - 0.95)).toBeLessThan(NEAR);
  });
  it("by the height of a triangle from three tapes, which is far from linear", () => {
    const { normal } = drawing(2);
    const foot = ([a = 0, b = 0, c = 0]: readonly number[]) => (a * a - b * b + c * c) / (2 * c);
    const height = (tapes: readonly number[]) => Math.sqrt((tapes[0] ?? 0) ** 2 - foot(tapes) ** 2);
    const { value, expanded } = stated(height, [
      { name: "from A", value: 1829, uncertainty: 0.8 },
      { name: "from B", value: 2438, uncertainty: 0.8 },
      { name: "A to B", value: 3048, uncertainty: 0.8 },
    ]);
    const drawn = many(N, () =>
      height([1829 + 0.8 * normal(), 2438 + 0.8 * normal(), 3048 + 0.8 * normal()]),
    );
    expect(Math.abs(shareWithin(drawn, value, expanded) - 0.95)).toBeLessThan(NEAR);
  });
  it("by the mean of five readings, thanks to Student's factor; with 1.96 it would not be", () => {
    const { normal } = drawing(3);
    const cases = many(N / 5, () => {
      const own = repeated(many(5, normal));
      if (!own) throw new Error("Five readings have a mean.");
      const { expanded } = stated(
        ([x = 0]) => x,
        [{ name: "x", value: own.mean, uncertainty: own.ofMean, freedom: own.freedom }],
      );
      return { off: Math.abs(own.mean), expanded, normal: 1.96 * own.ofMean };
    });
    const share = (width: (one: (typeof cases)[number]) => number) =>
      cases.filter((one) => one.off <= width(one)).length / cases.length;
    expect(Math.abs(share((one) => one.expanded) - 0.95)).toBeLessThan(NEAR * Math.sqrt(5));
    expect(share((one) => one.normal)).toBeLessThan(0.9);
  });
});

describe("where first order says too much or too little", () => {
  it("four evenly spread parts, one of them large: ±19.9 stated, ±17.0 would do (JCGM 101, 9.2.4)", () => {
    const { uniform } = drawing(4);
    const inputs = [1, 1, 1, 10].map((uncertainty, i) => ({ name: `x${i}`, value: 0, uncertainty }));
    const { expanded } = stated((x) => x.reduce((sum, one) => sum + one, 0), inputs);
    const drawn = many(N, () =>
      inputs.reduce((sum, one) => sum + one.uncertainty * Math.sqrt(3) * (2 * uniform() - 1), 0),
    );
    expect(expanded).toBeCloseTo(19.9, 1);
    expect(shareWithin(drawn, 0, expanded)).toBeGreaterThan(0.99);
    expect(Math.abs(shareWithin(drawn, 0, 17) - 0.95)).toBeLessThan(NEAR + 0.002);
  });
  it("ln x of an x between 0.1 and 1.1: the mean is off by a third of u, and u too small (NPL DEM-ES-011)", () => {
    const { uniform } = drawing(5);
    const { value, uncertainty } = stated(
      ([x = 0]) => Math.log(x),
      [{ name: "x", value: 0.6, uncertainty: fromHalfWidth(0.5, "rectangular") }],
    );
    const drawn = repeated(many(N, () => Math.log(0.1 + uniform())));
    expect(drawn?.mean).toBeCloseTo(-0.665, 2);
    expect(drawn?.standardDeviation).toBeCloseTo(0.606, 2);
    expect(value - (drawn?.mean ?? 0)).toBeGreaterThan(0.15);
    expect(uncertainty).toBeLessThan(0.8 * (drawn?.standardDeviation ?? 0));
  });
  it("a square about nothing: first order says that it is sure, and it is not", () => {
    const { normal } = drawing(6);
    const square = ([x = 0]: readonly number[]) => x * x;
    const { value, uncertainty } = stated(square, [{ name: "x", value: 0, uncertainty: 1 }]);
    const drawn = repeated(many(N, () => square([normal()])));
    expect([value, uncertainty]).toEqual([0, 0]);
    expect(drawn?.mean).toBeCloseTo(1, 1);
  });
});
