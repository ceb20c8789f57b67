import fc from "fast-check";
import { describe, expect, it } from "vitest";
import type { Outcome } from "../outcome";
import { mm } from "../units/length";
import {
  lateralBarRollAxis,
  pairConvergence,
  type SpaceLink,
  spacePoint,
  triangulatedRollAxis,
} from "./roll-axis";

const value = <T>(outcome: Outcome<T>): T => {
  if (!outcome.ok) throw new Error(outcome.problem);
  return outcome.value;
};
const fault = (outcome: Outcome<unknown>) => (outcome.ok ? JSON.stringify(outcome.value) : outcome.problem);
type Triple = [number, number, number];
const link = (axle: Triple, frame: Triple): SpaceLink => ({
  axle: spacePoint(...axle),
  frame: spacePoint(...frame),
});
const mirrored = ({ axle, frame }: SpaceLink): SpaceLink => ({
  axle: spacePoint(axle.station, -axle.offset, axle.height),
  frame: spacePoint(frame.station, -frame.offset, frame.height),
});
const level = link([0, 500, 200], [600, 500, 200]);
const bar = link([-50, -500, 380], [-50, 500, 360]);
const triple = (s: [number, number], o: [number, number], h: [number, number]) =>
  fc.tuple(
    fc.double({ min: s[0], max: s[1], noNaN: true }),
    fc.double({ min: o[0], max: o[1], noNaN: true }),
    fc.double({ min: h[0], max: h[1], noNaN: true }),
  );

describe("pairConvergence", () => {
  it("does the example", () => {
    const pair = value(pairConvergence(link([0, 600, 400], [600, 300, 430])));
    expect(pair.meet?.station).toBeCloseTo(1200, 9);
    expect(pair.meet?.height).toBeCloseTo(460, 9);
    expect(pair.planAngle).toBeCloseTo(53.1301, 4);
    expect(pair.slope).toBeCloseTo(0.05, 12);
  });
  it("counts links that come together going back as negative", () => {
    expect(value(pairConvergence(link([0, 300, 400], [600, 600, 400]))).planAngle).toBeCloseTo(-53.1301, 4);
    expect(value(pairConvergence(link([0, 300, 400], [-600, 600, 400]))).planAngle).toBeCloseTo(53.1301, 4);
  });
  it("knows links side by side, across, and none", () => {
    expect(value(pairConvergence(level))).toEqual({ planAngle: 0, meet: null, slope: 0 });
    expect(value(pairConvergence(link([0, 500, 200], [0, 100, 200]))).slope).toBeNull();
    expect(fault(pairConvergence(link([0, 5, 2], [0, 5, 2])))).toMatch(/same place/);
  });
});

describe("triangulatedRollAxis", () => {
  it("does the example", () => {
    const upper = link([0, 100, 500], [450, 400, 500]);
    expect(value(pairConvergence(upper)).meet).toEqual({ station: -150, height: 500 });
    expect(value(triangulatedRollAxis(level, upper, mm(0)))).toEqual({
      rollCentre: 500,
      slope: 0,
      steerPerDegree: 0,
    });
  });
  it("goes through both points where the pairs meet", () => {
    const lower = link([0, 550, 200], [700, 400, 230]);
    const upper = link([0, 120, 480], [450, 420, 450]);
    const [p, q] = [value(pairConvergence(lower)).meet, value(pairConvergence(upper)).meet];
    for (const point of [p, q])
      expect(value(triangulatedRollAxis(lower, upper, point?.station ?? mm(0))).rollCentre).toBeCloseTo(
        point?.height ?? Number.NaN,
        9,
      );
  });
  it("says what holds nothing", () => {
    expect(fault(triangulatedRollAxis(level, link([0, 400, 400], [500, 400, 410]), mm(0)))).toMatch(
      /lateral bar/,
    );
    const meeting = link([0, 600, 400], [600, 300, 430]);
    expect(fault(triangulatedRollAxis(meeting, link([0, 600, 500], [600, 300, 500]), mm(0)))).toMatch(
      /same station/,
    );
    expect(fault(triangulatedRollAxis(link([0, 500, 200], [0, 500, 400]), meeting, mm(0)))).toMatch(
      /upright/,
    );
  });
  it("is the same whichever side of a pair is given, and whatever the scale", () => {
    fc.assert(
      fc.property(
        triple([-50, 50], [450, 600], [150, 250]),
        triple([500, 800], [250, 400], [150, 300]),
        triple([-50, 50], [80, 150], [400, 550]),
        triple([400, 600], [300, 500], [400, 550]),
        fc.double({ min: 0.2, max: 5, noNaN: true }),
        (a, b, c, d, by) => {
          const [lower, upper] = [link(a, b), link(c, d)];
          const one = value(triangulatedRollAxis(lower, upper, mm(0)));
          const other = value(triangulatedRollAxis(mirrored(lower), mirrored(upper), mm(0)));
          expect(other).toEqual(one);
          const times = (t: Triple): Triple => [t[0] * by, t[1] * by, t[2] * by];
          const scaled = value(
            triangulatedRollAxis(link(times(a), times(b)), link(times(c), times(d)), mm(0)),
          );
          expect(scaled.slope).toBeCloseTo(one.slope, 9);
          expect(scaled.rollCentre / by).toBeCloseTo(one.rollCentre, 6);
        },
      ),
    );
  });
});

describe("lateralBarRollAxis", () => {
  it("does the example", () => {
    const got = value(lateralBarRollAxis({ lower: level, bar }, mm(0)));
    expect(got).toEqual({
      rollCentre: 370,
      slope: 0,
      steerPerDegree: 0,
      bar: { station: -50, height: 370 },
      steerApart: null,
    });
  });
  it("runs parallel to the lower links and says how the upper ones differ", () => {
    const lower = link([0, 500, 200], [600, 500, 230]);
    const got = value(lateralBarRollAxis({ lower, upper: link([0, 300, 400], [500, 300, 395]), bar }, mm(0)));
    expect(got.slope).toBeCloseTo(0.05, 12);
    expect(got.rollCentre).toBeCloseTo(372.5, 9);
    expect(got.steerApart).toBeCloseTo(-0.06, 12);
  });
  it("says what holds nothing", () => {
    const across = link([0, 400, 300], [500, 400, 300]);
    expect(fault(lateralBarRollAxis({ lower: level, bar: across }, mm(0)))).toMatch(/does not run across/);
    const meeting = link([0, 600, 400], [600, 300, 430]);
    expect(fault(lateralBarRollAxis({ lower: meeting, bar }, mm(0)))).toMatch(/come together/);
    expect(fault(lateralBarRollAxis({ lower: level, upper: meeting, bar }, mm(0)))).toMatch(/come together/);
  });
  it("is the same for the mirrored vehicle", () => {
    fc.assert(
      fc.property(
        triple([-80, 80], [-600, -300], [300, 450]),
        triple([-80, 80], [300, 600], [300, 450]),
        (a, b) => {
          const one = value(lateralBarRollAxis({ lower: level, bar: link(a, b) }, mm(0)));
          const other = value(
            lateralBarRollAxis({ lower: mirrored(level), bar: mirrored(link(a, b)) }, mm(0)),
          );
          expect(other.rollCentre).toBeCloseTo(one.rollCentre, 9);
        },
      ),
    );
  });
});
