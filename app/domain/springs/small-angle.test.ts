import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { sinc, solveBetween, versinc } from "./small-angle";

describe("sinc and versinc", () => {
  it("do the examples", () => {
    expect(sinc(Math.PI / 2)).toBeCloseTo(2 / Math.PI, 12);
    expect(versinc(Math.PI)).toBeCloseTo(2 / Math.PI, 12);
    expect([sinc(0), versinc(0)]).toEqual([1, 0]);
  });
  it("join their series without a step", () => {
    for (const x of [0.99e-4, 1.01e-4]) expect(sinc(x)).toBeCloseTo(1 - x ** 2 / 6 + x ** 4 / 120, 15);
    expect(versinc(1e-9) / 5e-10).toBeCloseTo(1, 12);
  });
});

describe("solveBetween", () => {
  it("does the example", () => {
    expect(solveBetween((x) => x * x, 2, 0, 2, 1, 1e-12)).toBeCloseTo(Math.SQRT2, 10);
  });
  it("finds what is between, falling or growing, and nothing else", () => {
    fc.assert(
      fc.property(fc.double({ min: 0, max: 3, noNaN: true }), fc.boolean(), (root, falls) => {
        const cube = (x: number) => (falls ? -1 : 1) * x ** 3;
        expect(solveBetween(cube, cube(root), 0, 3, 0.1, 1e-12)).toBeCloseTo(root, 3);
        expect(solveBetween(cube, cube(4), 0, 3, 0.1, 1e-12)).toBeNull();
      }),
    );
  });
});
