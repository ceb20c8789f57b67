import fc from "fast-check";
import { describe, expect, it } from "vitest";
import type { Outcome } from "../outcome";
import { degrees, toRadians } from "../units/angle";
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
import {
  archSteps,
  eyeLineSlope,
  leafPosition,
  leafStations,
  leafTravel,
  pinAt,
  sidePoint,
} from "./leaf-travel";
import { leafOf, type MainLeaf, mainLeaf, turnedLeaf } from "./main-leaf";
import { pinPath } from "./pin-path";

const value = <T>(outcome: Outcome<T>): T => {
  if (!outcome.ok) throw new Error(outcome.problem);
  return outcome.value;
};
const fault = (outcome: Outcome<unknown>) => (outcome.ok ? JSON.stringify(outcome.value) : outcome.problem);
const near = (...values: number[]) => values.map((n) => expect.closeTo(n, 9));
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

describe("mainLeaf", () => {
  it("takes a spring either way round", () => {
    const spring = { id: 1, rackNumber: 7, length: inches(52), frontHalf: inches(24) };
    const [as, turned] = [value(leafOf(spring)), value(leafOf(spring, { turned: true }))];
    expect([as.front, as.rear, as.clamped].map((length) => length / 25.4)).toEqual(near(24, 28, 0));
    expect([turned.front, turned.rear].map(toInches)).toEqual(near(28, 24));
    const moved = value(leafOf(spring, { pinAhead: inches(1) }));
    expect([toInches(moved.front), toInches(moved.rear)]).toEqual(near(23, 29));
    const eyes = { front: mm(20), rear: mm(0) };
    expect(value(leafOf(spring, { turned: true, eyeOffset: eyes })).eyeOffset).toEqual({
      front: 0,
      rear: 20,
    });
    expect(turnedLeaf(value(leafOf(spring, { eyeOffset: eyes })))).toEqual(
      value(leafOf(spring, { turned: true, eyeOffset: eyes })),
    );
  });
  it.each([
    [{ front: mm(0), rear: mm(600) }, /Both halves/],
    [{ front: mm(600), rear: mm(600), clamped: mm(-1) }, /negative/],
    [{ front: mm(60), rear: mm(600), clamped: mm(120) }, /nothing is left/],
    [{ front: mm(100), rear: mm(600), eyeOffset: { rear: mm(26) } }, /too far off/],
  ])("says what is wrong with %j", (input, words) => expect(fault(mainLeaf(input))).toMatch(words));
});

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
    expect([eyes.frontUp, eyes.rearUp]).toEqual([expect.closeTo(61.2087, 4), expect.closeTo(61.2087, 4)]);
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

describe("stations", () => {
  const hole = sidePoint(inches(71.5), 0);
  it.each([
    [26, 26, 45.5],
    [24, 28, 47.5],
  ])("puts the axle of halves %d and %d at %d in, flat", (front, rear, station) => {
    const setting = { leaf: plain(front, rear), fixedEye: "ahead" as const, eye: hole };
    const { flat, ride, droop } = value(leafStations(setting, { droop: inches(6), ride: inches(4) }));
    expect(toInches(flat.axle.station)).toBeCloseTo(station, 9);
    expect(ride.axle.station).toBeGreaterThan(flat.axle.station);
    expect(droop.axle.station).toBeGreaterThan(ride.axle.station);
    expect(droop.axle.height).toBeCloseTo(-inches(6), 9);
  });
  it("mirrors front and rear", () => {
    fc.assert(
      fc.property(anyLeaf, anyArch, fc.double({ min: -5, max: 5, noNaN: true }), (leaf, arch, slope) => {
        const eye = sidePoint(0, 0);
        const ahead = value(leafPosition({ leaf, fixedEye: "ahead", eye, eyeLine: degrees(slope) }, arch));
        const behind = value(
          leafPosition({ leaf: turnedLeaf(leaf), fixedEye: "behind", eye, eyeLine: degrees(-slope) }, arch),
        );
        expect(behind.axle.station).toBeCloseTo(-ahead.axle.station, 6);
        expect(behind.axle.height).toBeCloseTo(ahead.axle.height, 6);
        expect(behind.seatLean).toBeCloseTo(-ahead.seatLean, 6);
      }),
    );
  });
  it("tilts with the line of the eyes: a plain turn about the fixed eye", () => {
    const leaf = plain(26, 26);
    expect(value(eyeLineSlope("ahead", inches(50), inches(2)))).toBeCloseTo(-2.2924, 4);
    expect(value(eyeLineSlope("behind", inches(50), inches(2)))).toBeCloseTo(2.2924, 4);
    expect(fault(eyeLineSlope("ahead", inches(50), inches(50)))).toMatch(/height/);
    const shape = value(leafAtArch(leaf, inches(4)));
    const level = pinAt(shape, "ahead", hole, degrees(0));
    const tilted = pinAt(shape, "ahead", hole, degrees(3));
    const [c, s] = [Math.cos(toRadians(degrees(3))), Math.sin(toRadians(degrees(3)))];
    const [x, z] = [level.station - hole.station, level.height];
    expect(tilted.station - hole.station).toBeCloseTo(c * x - s * z, 9);
    expect(tilted.height).toBeCloseTo(s * x + c * z, 9);
    expect(
      pinAt({ ...shape, arch: mm(0), fromFront: inches(26) }, "ahead", hole, degrees(0)).station,
    ).toBeCloseTo(inches(45.5), 9);
  });
  it("steps evenly, ends included", () => {
    expect(archSteps(mm(100), mm(-20), 3)).toEqual([100, 60, 20, -20]);
    expect(() => archSteps(mm(1), mm(0), 0)).toThrow(RangeError);
    const setting = { leaf: plain(26, 26), fixedEye: "ahead" as const, eye: hole };
    expect(value(leafTravel(setting, { from: inches(6), to: inches(0), steps: 12 }))).toHaveLength(13);
    expect(fault(leafTravel(setting, { from: inches(40), to: inches(0), steps: 12 }))).toMatch(/too short/);
  });
});

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
