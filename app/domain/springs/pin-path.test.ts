import fc from "fast-check";
import { describe, expect, it } from "vitest";
import type { Outcome } from "../outcome";
import { inches, mm } from "../units/length";
import { leafAtArch } from "./leaf-shape";
import { type MainLeaf, mainLeaf } from "./main-leaf";
import { pinPath } from "./pin-path";

const value = <T>(outcome: Outcome<T>): T => {
  if (!outcome.ok) throw new Error(outcome.problem);
  return outcome.value;
};
const fault = (outcome: Outcome<unknown>) => (outcome.ok ? JSON.stringify(outcome.value) : outcome.problem);
const plain = (front: number, rear: number) => value(mainLeaf({ front: inches(front), rear: inches(rear) }));

const half = fc.double({ min: 400, max: 1000, noNaN: true });
const offset = fc.double({ min: -60, max: 60, noNaN: true });
const anyLeaf: fc.Arbitrary<MainLeaf> = fc
  .record({
    front: half,
    rear: half,
    clamped: fc.double({ min: 0, max: 100, noNaN: true }),
    up: offset,
    upRear: offset,
  })
  .map(({ front, rear, clamped, up, upRear }) =>
    value(
      mainLeaf({
        front: mm(front),
        rear: mm(rear),
        clamped: mm(clamped),
        eyeOffset: { front: mm(up), rear: mm(upRear) },
      }),
    ),
  );
const anyArch = fc.double({ min: -80, max: 120, noNaN: true }).map(mm);

describe("pinPath", () => {
  it("does the example", () => {
    const [flat, arched] = value(pinPath(plain(26, 26), "ahead", [0, 127]));
    expect(flat).toBeCloseTo(-660.4, 9);
    expect(arched).toBeCloseTo(-643.827, 3);
  });
  it("is leafAtArch, whichever way and in whatever order", () => {
    fc.assert(
      fc.property(anyLeaf, fc.array(anyArch, { maxLength: 12 }), fc.boolean(), (leaf, arches, ahead) => {
        const path = value(pinPath(leaf, ahead ? "ahead" : "behind", arches));
        arches.forEach((arch, i) => {
          const shape = value(leafAtArch(leaf, arch));
          expect(path[i]).toBeCloseTo(ahead ? -shape.fromFront : shape.fromRear, 5);
        });
      }),
    );
  });
  it("says when an arch is out of reach", () => {
    expect(fault(pinPath(plain(26, 26), "ahead", [0, 700]))).toMatch(/too short/);
  });
  it("does 1200 leaves of 60 steps in a moment", () => {
    const arches = Float64Array.from({ length: 60 }, (_, i) => 150 - 3 * i);
    const leaves = Array.from({ length: 1200 }, (_, i) =>
      value(mainLeaf({ front: mm(600 + i / 8), rear: mm(700) })),
    );
    const run = () => {
      const start = performance.now();
      for (const leaf of leaves) pinPath(leaf, "ahead", arches);
      return performance.now() - start;
    };
    run();
    // About 20 ms on two slow cores; the bound leaves room for a busy machine.
    expect(Math.min(run(), run(), run())).toBeLessThan(100);
  });
});
