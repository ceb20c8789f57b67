import fc from "fast-check";
import { describe, expect, it } from "vitest";
import type { Outcome } from "../outcome";
import { inches, mm, toInches } from "../units/length";
import { segmentFrom } from "./arc";
import {
  archOf,
  bending,
  curvatureAt,
  eyesOfArc,
  flatArch,
  fromFrontOf,
  leafAtArch,
  shapeOf,
} from "./leaf-shape";
import { type MainLeaf, mainLeaf, turnedLeaf } from "./main-leaf";

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

/** The leaf walked along in small straight steps from its front end to its rear one: no formula of an arc in it. */
function walked(leaf: MainLeaf, curvature: number, steps: number) {
  const at = (bends: number, up: number) => {
    let [x, z, slope] = [leaf.clamped / 2, 0, 0];
    const step = bends / steps;
    for (let i = 0; i < steps; i++) {
      const middle = slope + (curvature * step) / 2;
      x += step * Math.cos(middle);
      z += step * Math.sin(middle);
      slope += curvature * step;
    }
    return { x: x - up * Math.sin(slope), z: z + up * Math.cos(slope) };
  };
  const front = at(leaf.front - leaf.clamped / 2, leaf.eyeOffset.front);
  const rear = at(leaf.rear - leaf.clamped / 2, leaf.eyeOffset.rear);
  const [along, up] = [front.x + rear.x, front.z - rear.z];
  const distance = Math.hypot(along, up);
  return {
    eyeDistance: distance,
    fromFront: (front.x * along + front.z * up) / distance,
    arch: (front.z * rear.x + rear.z * front.x) / distance,
  };
}

describe("leaf shape", () => {
  it("does the examples", () => {
    const clamped = value(mainLeaf({ front: mm(650), rear: mm(700), clamped: mm(100) }));
    expect(bending(clamped)).toEqual({ front: 600, rear: 650 });
    const even = value(mainLeaf({ front: mm(500), rear: mm(500) }));
    const eyes = eyesOfArc(even, 0.001);
    expect([eyes.frontAlong, eyes.rearAlong]).toEqual([
      expect.closeTo(479.4255, 4),
      expect.closeTo(479.4255, 4),
    ]);
    expect([eyes.frontUp, eyes.rearUp]).toEqual([expect.closeTo(122.4174, 4), expect.closeTo(122.4174, 4)]);
    const seen = { frontAlong: 600, frontUp: 50, rearAlong: 700, rearUp: 50 };
    expect([archOf(seen), fromFrontOf(seen)]).toEqual([50, 600]);
    expect(shapeOf(seen)).toMatchObject({ eyeDistance: 1300, arch: 50, fromRear: 700 });
    expect(shapeOf(seen).seatAngle).toBeCloseTo(0, 12);
    expect(curvatureAt(even, archOf(eyes))).toBeCloseTo(0.001, 10);
  });
});

describe("leafAtArch", () => {
  it("does the example, which is the circular segment", () => {
    const { eyeDistance, fromFront, seatAngle } = value(leafAtArch(plain(26, 26), inches(5)));
    expect(toInches(eyeDistance)).toBeCloseTo(50.69501, 5);
    expect(toInches(fromFront)).toBeCloseTo(25.34751, 5);
    expect(seatAngle).toBeCloseTo(0, 9);
    expect(eyeDistance).toBeCloseTo(value(segmentFrom({ arc: inches(52), rise: inches(5) })).chord, 6);
  });
  it("stands where the formula with R does", () => {
    fc.assert(
      fc.property(half, half, fc.double({ min: 5, max: 120, noNaN: true }), (front, rear, arch) => {
        const leaf = value(mainLeaf({ front: mm(front), rear: mm(rear) }));
        const { fromFront, eyeDistance } = value(leafAtArch(leaf, mm(arch)));
        const radius = 1 / (curvatureAt(leaf, arch) ?? 0);
        const phi = (front + rear) / (2 * radius);
        expect(fromFront).toBeCloseTo(radius * (Math.sin(phi) - Math.sin(phi - front / radius)), 6);
        expect(eyeDistance).toBeCloseTo(2 * radius * Math.sin(phi), 6);
      }),
    );
  });
  it("takes e·sin φ off either end with upturned eyes", () => {
    const bare = plain(26, 26);
    const eyes = { ...bare, eyeOffset: { front: mm(30), rear: mm(30) } };
    for (const curvature of [-3e-4, 0, 3e-4]) {
      const [without, withEyes] = [eyesOfArc(bare, curvature), eyesOfArc(eyes, curvature)];
      const slope = curvature * bare.front;
      expect(without.frontAlong - withEyes.frontAlong).toBeCloseTo(30 * Math.sin(slope), 9);
    }
    expect(flatArch(eyes)).toBeCloseTo(30, 12);
  });
  it("is the leaf walked along, and finer steps come nearer", () => {
    fc.assert(
      fc.property(anyLeaf, anyArch, (leaf, arch) => {
        const shape = value(leafAtArch(leaf, arch));
        const curvature = curvatureAt(leaf, arch) ?? Number.NaN;
        const away = (steps: number) =>
          Math.abs(walked(leaf, curvature, steps).eyeDistance - shape.eyeDistance);
        const fine = walked(leaf, curvature, 400);
        expect(Math.abs(fine.eyeDistance - shape.eyeDistance)).toBeLessThan(1e-3);
        expect(Math.abs(fine.fromFront - shape.fromFront)).toBeLessThan(1e-3);
        expect(Math.abs(fine.arch - arch)).toBeLessThan(1e-3);
        // Midpoint steps: four times as near with twice as many.
        if (away(4) > 1e-6) expect(away(4) / away(8)).toBeCloseTo(4, 0);
      }),
    );
  });
  it("keeps its length through the travel", () => {
    fc.assert(
      fc.property(anyLeaf, anyArch, (leaf, arch) => {
        // Polyline through points of the shape itself: leaf without clamp and eyes, by curvature from the found shape.
        const bare = { ...leaf, clamped: mm(0), eyeOffset: { front: mm(0), rear: mm(0) } };
        const bend = curvatureAt(bare, arch) ?? Number.NaN;
        let [length, x, z] = [0, 0, 0];
        for (let i = 1; i <= 2000; i++) {
          const part = { ...bare, front: mm((bare.front * i) / 2000) };
          const { frontAlong, frontUp } = eyesOfArc(part, bend);
          length += Math.hypot(frontAlong - x, frontUp - z);
          [x, z] = [frontAlong, frontUp];
        }
        expect(Math.abs(length - bare.front)).toBeLessThan(1e-4);
      }),
      { numRuns: 20 },
    );
  });
  it("swaps its halves when turned end for end", () => {
    fc.assert(
      fc.property(anyLeaf, anyArch, (leaf, arch) => {
        const [as, turned] = [value(leafAtArch(leaf, arch)), value(leafAtArch(turnedLeaf(leaf), arch))];
        expect(turned.fromFront).toBeCloseTo(as.fromRear, 6);
        expect(turned.eyeDistance).toBeCloseTo(as.eyeDistance, 6);
        expect(turned.seatAngle).toBeCloseTo(-as.seatAngle, 6);
      }),
    );
  });
  it("goes to flat without a jump", () => {
    fc.assert(
      fc.property(anyLeaf, fc.double({ min: -1, max: 1, noNaN: true }), (leaf, part) => {
        const flat = flatArch(leaf);
        const shape = value(leafAtArch(leaf, mm(flat + part * 1e-6)));
        const still = value(leafAtArch(leaf, flat));
        expect(Math.abs(shape.fromFront - still.fromFront)).toBeLessThan(1e-5);
        expect(still.eyeDistance).toBeCloseTo(
          Math.hypot(leaf.front + leaf.rear, leaf.eyeOffset.front - leaf.eyeOffset.rear),
          6,
        );
      }),
    );
  });
  it("is as long bent either way, with the eyes in line", () => {
    const leaf = plain(24, 28);
    const [bow, reverse] = [value(leafAtArch(leaf, mm(80))), value(leafAtArch(leaf, mm(-80)))];
    expect(reverse.eyeDistance).toBeCloseTo(bow.eyeDistance, 6);
    expect(reverse.fromFront).toBeCloseTo(bow.fromFront, 6);
    expect(reverse.seatAngle).toBeCloseTo(-bow.seatAngle, 6);
  });
  it("has more arch the more it bends, as far as it may", () => {
    fc.assert(
      fc.property(anyLeaf, fc.double({ min: -1, max: 0.99, noNaN: true }), (leaf, share) => {
        const most = Math.PI / 3 / (Math.max(leaf.front, leaf.rear) - leaf.clamped / 2);
        const arch = (part: number) => walked(leaf, part * most, 200).arch;
        expect(arch(share + 0.01)).toBeGreaterThan(arch(share));
      }),
    );
  });
  it("leans the seat nose down when the front half is the longer", () => {
    expect(value(leafAtArch(plain(28, 24), inches(5))).seatAngle).toBeLessThan(-1);
  });
  it("says when there is no such leaf", () => {
    expect(fault(leafAtArch(plain(26, 26), inches(26)))).toMatch(/too short/);
  });
});
