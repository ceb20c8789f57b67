import fc from "fast-check";
import { describe, expect, it } from "vitest";
import type { Outcome } from "../outcome";
import { type SidePoint, sidePoint } from "../springs/leaf-travel";
import { degrees } from "../units/angle";
import { mm } from "../units/length";
import { antiSquat, thrustSlope } from "./anti-squat";
import { type FourLink, fourLinkAtRise, fourLinkAtSwing } from "./four-link";
import { instantCentre } from "./instant-centre";
import { ladderBarAtRise } from "./ladder-bar";
import { type LinkedAxle, linkPosition, linkTravel } from "./link-travel";
import { linkLength, linkSlope, type SideLink, sideLink } from "./side-link";

const value = <T>(outcome: Outcome<T>): T => {
  if (!outcome.ok) throw new Error(outcome.problem);
  return outcome.value;
};
const fault = (outcome: Outcome<unknown>) => (outcome.ok ? JSON.stringify(outcome.value) : outcome.problem);
const link = (axle: [number, number], frame: [number, number]): SideLink => ({
  axle: sidePoint(...axle),
  frame: sidePoint(...frame),
});
const four: FourLink = {
  lower: link([0, 203], [610, 254]),
  upper: link([0, 406], [508, 381]),
  axle: sidePoint(0, 305),
};
const setting = { tyreRadius: mm(350), cgHeight: mm(600), wheelbase: mm(2800), pinionAngle: degrees(3) };
const near = (got: SidePoint, station: number, height: number, places = 4) => {
  expect(got.station).toBeCloseTo(station, places);
  expect(got.height).toBeCloseTo(height, places);
};
const at = (centre: ReturnType<typeof instantCentre>) => {
  const found = value(centre);
  if (found.kind !== "point") throw new Error("parallel");
  return found.point;
};

/** Four-links as they are built: links 400 to 900 long ahead of the axle, within 10° of level, brackets 200 to 400 apart. */
const fourLinks = fc
  .record({
    lowerLength: fc.double({ min: 400, max: 900, noNaN: true }),
    upperLength: fc.double({ min: 400, max: 900, noNaN: true }),
    lowerSlope: fc.double({ min: -10, max: 10, noNaN: true }),
    upperSlope: fc.double({ min: -10, max: 10, noNaN: true }),
    bracket: fc.double({ min: 200, max: 400, noNaN: true }),
    setBack: fc.double({ min: -80, max: 80, noNaN: true }),
  })
  .map((of): FourLink => {
    const out = (from: [number, number], length: number, slope: number) =>
      link(from, [
        from[0] + length * Math.cos((slope * Math.PI) / 180),
        from[1] + length * Math.sin((slope * Math.PI) / 180),
      ]);
    return {
      lower: out([0, 200], of.lowerLength, of.lowerSlope),
      upper: out([of.setBack, 200 + of.bracket], of.upperLength, of.upperSlope),
      axle: sidePoint(0, 320),
    };
  });
const scaled = (p: SidePoint, by: number) => sidePoint(p.station * by, p.height * by);
const scaledLink = (l: SideLink, by: number): SideLink => ({
  frame: scaled(l.frame, by),
  axle: scaled(l.axle, by),
});

describe("instantCentre and antiSquat", () => {
  it("do the examples", () => {
    const centre = instantCentre(link([0, 8], [24, 10]), link([0, 16], [20, 15]));
    near(at(centre), 60, 13, 9);
    expect(value(thrustSlope(value(centre), sidePoint(0, 0)))).toBeCloseTo(0.216667, 6);
    const vehicle = { contact: sidePoint(0, 0), cgHeight: mm(24), wheelbase: mm(108) };
    expect(value(antiSquat(value(centre), vehicle))).toBeCloseTo(97.5, 9);
    expect(linkSlope(link([0, 8], [24, 10]))).toBeCloseTo(4.7636, 4);
    expect(linkLength(link([3, 4], [0, 0]))).toBe(5);
    expect(
      linkLength(value(sideLink({ station: 609.6, height: 254 }, { station: 0, height: 203.2 }))),
    ).toBeCloseTo(611.713, 3);
  });
  it("takes parallel links as a centre infinitely far off, which nearly parallel links come near to", () => {
    const lower = link([0, 200], [600, 230]);
    const parallel = value(instantCentre(lower, link([0, 400], [600, 430])));
    expect(parallel).toEqual({ kind: "parallel", slope: linkSlope(lower) });
    const vehicle = { contact: sidePoint(0, 0), cgHeight: mm(600), wheelbase: mm(2800) };
    const nearly = value(instantCentre(lower, link([0, 400], [600, 430 - 1e-4])));
    expect(nearly.kind).toBe("point");
    expect(value(antiSquat(nearly, vehicle))).toBeCloseTo(value(antiSquat(parallel, vehicle)), 2);
    expect(value(instantCentre(link([0, 0], [-10, 1]), link([0, 9], [10, 8])))).toEqual({
      kind: "parallel",
      slope: expect.closeTo(-5.7106, 4),
    });
  });
  it("say what has none", () => {
    expect(fault(instantCentre(link([0, 0], [10, 1]), link([20, 2], [30, 3])))).toMatch(/in one line/);
    expect(fault(sideLink({ station: 1, height: 1 }, { station: 1, height: 1.5 }))).toMatch(/same place/);
    const vehicle = { contact: sidePoint(0, 0), cgHeight: mm(600), wheelbase: mm(2800) };
    const upright = { kind: "point", point: sidePoint(0, 500) } as const;
    expect(fault(antiSquat(upright, vehicle))).toMatch(/straight above/);
    expect(fault(antiSquat({ kind: "parallel", slope: degrees(90) }, vehicle))).toMatch(/upright/);
    expect(fault(antiSquat(upright, { ...vehicle, cgHeight: mm(0) }))).toMatch(/centre of gravity/);
    expect(fault(antiSquat(upright, { ...vehicle, wheelbase: mm(-1) }))).toMatch(/wheelbase/);
  });
});

describe("fourLinkAtRise", () => {
  it("does the examples", () => {
    const raised = value(fourLinkAtRise(four, mm(50)));
    expect(raised.turn).toBeCloseTo(-1.9941, 4);
    expect(raised.axle.height).toBeCloseTo(355, 9);
    near(value(fourLinkAtSwing(four, degrees(0))).axle, 0, 305, 9);
  });
  it("says when the links cannot reach", () => {
    expect(fault(fourLinkAtRise(four, mm(900)))).toMatch(/cannot reach/);
    expect(fault(fourLinkAtRise(four, mm(-900)))).toMatch(/cannot reach/);
    expect(fault(fourLinkAtSwing(four, degrees(170)))).toMatch(/cannot reach/);
    const oneLine = { ...four, upper: link([305, 228.5], [610, 254]) };
    expect(fault(fourLinkAtRise(oneLine, mm(10)))).toMatch(/cannot reach/);
  });
  it("keeps both links and the axle's brackets at their lengths, and the height asked for", () => {
    fc.assert(
      fc.property(fourLinks, fc.double({ min: -80, max: 80, noNaN: true }), (fourLink, rise) => {
        const got = value(fourLinkAtRise(fourLink, mm(rise)));
        const bracket = (p: { lower: SideLink; upper: SideLink; axle: SidePoint }) => [
          linkLength({ frame: p.lower.axle, axle: p.upper.axle }),
          linkLength({ frame: p.lower.axle, axle: p.axle }),
          linkLength({ frame: p.upper.axle, axle: p.axle }),
        ];
        expect(linkLength(got.lower)).toBeCloseTo(linkLength(fourLink.lower), 7);
        expect(linkLength(got.upper)).toBeCloseTo(linkLength(fourLink.upper), 7);
        bracket(got).forEach((length, i) => {
          expect(length).toBeCloseTo(bracket(fourLink)[i] ?? Number.NaN, 7);
        });
        expect(got.axle.height).toBeCloseTo(320 + rise, 7);
      }),
    );
  });
  it("comes from ride height without a jump", () => {
    fc.assert(
      fc.property(fourLinks, (fourLink) => {
        const stations = [-80, -40, -1, 0, 1, 40, 80].map(
          (rise) => value(fourLinkAtRise(fourLink, mm(rise))).axle.station,
        );
        expect(stations[3]).toBeCloseTo(0, 9);
        expect(Math.abs(stations[2] ?? 9)).toBeLessThan(2);
        expect(Math.abs(stations[4] ?? 9)).toBeLessThan(2);
      }),
    );
  });
  it("moves an equal parallel four-link without turning it", () => {
    const parallel = { ...four, upper: link([0, 406], [610, 457]) };
    for (const rise of [-90, 70]) {
      const got = value(fourLinkAtRise(parallel, mm(rise)));
      expect(got.turn).toBeCloseTo(0, 9);
      expect(value(instantCentre(got.lower, got.upper)).kind).toBe("parallel");
    }
  });
});

describe("ladderBarAtRise", () => {
  const bar = { pivot: sidePoint(900, 350), axle: sidePoint(0, 350) };
  it("does the example", () => {
    const got = value(ladderBarAtRise(bar, mm(100)));
    near(got.axle, 5.5728, 450);
    expect(got.turn).toBeCloseTo(-6.3794, 4);
  });
  it("says what no bar can do", () => {
    expect(fault(ladderBarAtRise(bar, mm(900)))).toMatch(/too short/);
    expect(fault(ladderBarAtRise({ ...bar, pivot: bar.axle }, mm(0)))).toMatch(/on the axle's centre/);
    expect(fault(ladderBarAtRise({ ...bar, pivot: sidePoint(0, 900) }, mm(0)))).toMatch(/upright/);
  });
  it("is what a four-link becomes when its frame pivots run together", () => {
    fc.assert(
      fc.property(fc.double({ min: -100, max: 100, noNaN: true }), (rise) => {
        const pivoted: FourLink = {
          lower: link([0, 250], [900, 350]),
          upper: link([0, 450], [900, 350.0001]),
          axle: bar.axle,
        };
        const [a, b] = [value(fourLinkAtRise(pivoted, mm(rise))), value(ladderBarAtRise(bar, mm(rise)))];
        expect(a.axle.station).toBeCloseTo(b.axle.station, 2);
        expect(a.turn).toBeCloseTo(b.turn, 2);
      }),
    );
  });
});

describe("linkTravel", () => {
  const axle: LinkedAxle = { kind: "fourLink", ...four };
  it("does the examples", () => {
    const rows = value(linkTravel(axle, setting, { droop: mm(100), bump: mm(80), steps: 2 }));
    expect(rows.map((row) => row.rise)).toEqual([-100, -50, 0, 40, 80]);
    expect(rows[2]).toMatchObject({ forward: 0, pinionAngle: 3, centreRise: 0 });
    const bar: LinkedAxle = { kind: "ladderBar", pivot: sidePoint(900, 350), axle: sidePoint(0, 350) };
    const ride = value(linkPosition(bar, setting, mm(0)));
    expect(ride.forward).toBe(0);
    expect(ride.antiSquat).toBeCloseTo((100 * (350 / 900)) / (600 / 2800), 9);
  });
  it("has the pinion of a ladder bar nose up in droop, and its centre stay", () => {
    const bar: LinkedAxle = { kind: "ladderBar", pivot: sidePoint(900, 350), axle: sidePoint(0, 350) };
    const rows = value(linkTravel(bar, setting, { droop: mm(100), bump: mm(80), steps: 4 }));
    for (const [i, row] of rows.entries()) {
      expect(row.centreRise).toBe(0);
      if (i > 0) expect(row.pinionAngle).toBeLessThan(rows[i - 1]?.pinionAngle ?? Number.NaN);
    }
  });
  it("takes anti-squat in bump from the raised ground, the lowered centre of gravity and the new wheelbase", () => {
    const bar: LinkedAxle = { kind: "ladderBar", pivot: sidePoint(900, 350), axle: sidePoint(0, 350) };
    const row = value(linkPosition(bar, setting, mm(100)));
    const ahead = 900 - Math.sqrt(900 ** 2 - 100 ** 2);
    expect(row.forward).toBeCloseTo(ahead, 9);
    expect(row.centreAboveGround).toBeCloseTo(250, 9);
    expect(row.antiSquat).toBeCloseTo((100 * (250 / (900 - ahead)) * (2800 - ahead)) / 500, 9);
  });
  it("says what cannot be", () => {
    expect(fault(linkTravel(axle, setting, { droop: mm(-1), bump: mm(80), steps: 2 }))).toMatch(/positive/);
    expect(fault(linkTravel(axle, setting, { droop: mm(0), bump: mm(900), steps: 2 }))).toMatch(
      /reach|ground/,
    );
    expect(fault(linkPosition(axle, { ...setting, cgHeight: mm(30) }, mm(40)))).toMatch(/under the ground/);
    expect(() => linkTravel(axle, setting, { droop: mm(0), bump: mm(0), steps: 0 })).toThrow(RangeError);
  });
  it("keeps angles and anti-squat when every length is scaled", () => {
    fc.assert(
      fc.property(fourLinks, fc.double({ min: 0.1, max: 10, noNaN: true }), (fourLink, by) => {
        const row = (scale: number) =>
          value(
            linkPosition(
              {
                kind: "fourLink",
                lower: scaledLink(fourLink.lower, scale),
                upper: scaledLink(fourLink.upper, scale),
                axle: scaled(fourLink.axle, scale),
              },
              {
                tyreRadius: mm(320 * scale),
                cgHeight: mm(600 * scale),
                wheelbase: mm(2800 * scale),
                pinionAngle: degrees(2),
              },
              mm(60 * scale),
            ),
          );
        const [one, other] = [row(1), row(by)];
        expect(other.pinionAngle).toBeCloseTo(one.pinionAngle, 6);
        fc.pre(one.antiSquat !== null && Math.abs(one.antiSquat) < 1e4);
        expect(other.antiSquat).toBeCloseTo(one.antiSquat ?? Number.NaN, 4);
      }),
    );
  });
});
