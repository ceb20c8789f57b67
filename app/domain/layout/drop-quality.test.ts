import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { distance, type FloorPoint, floorPoint, turned } from "../geometry/point";
import { degrees } from "../units/angle";
import { inches, mm, toInches } from "../units/length";
import { dropQuality } from "./drop-quality";
import { bobShifts, covarianceOf, levelShifts, offsetShifts, tieShifts } from "./drop-shifts";
import { pointFromTies } from "./drops";
import { repeatedReadings } from "./repeated-readings";
import { adjustTies, ellipseCoverage, ellipseFactor, type Tie, tieSigma } from "./tie-fit";

const MARKS = { A: [0, 0], B: [3048, 0], C: [3048, -1219.2], D: [0, -1219.2] } as const;
type Mark = keyof typeof MARKS;
const SIGMA = mm(0.8);
const tiesTo = (point: FloorPoint, marks: readonly Mark[], error: (mark: Mark) => number = () => 0): Tie[] =>
  marks.map((mark) => {
    const at = floorPoint(MARKS[mark][0], MARKS[mark][1]);
    return { mark, at, distance: mm(distance(point, at) + error(mark)) };
  });
const must = (ties: Tie[], side: "left" | "right" = "left") => {
  const fit = pointFromTies(ties, side, SIGMA);
  if (!fit.ok) throw new Error(fit.problem);
  return fit.value;
};
const quality = (ties: Tie[], side: "left" | "right" = "left") =>
  dropQuality(ties, must(ties, side), side, SIGMA);
const ALL = ["A", "B", "C", "D"] as const;
const X = fc.integer({ min: 500, max: 2500 });
const Y = fc.integer({ min: 300, max: 1300 });

/** Numbers that look random and are the same in every run. */
function seeded(seed: number) {
  let state = seed;
  const uniform = () => {
    state = (Math.imul(state, 1664525) + 1013904223) >>> 0;
    return (state + 0.5) / 4294967296;
  };
  return () => Math.sqrt(-2 * Math.log(uniform())) * Math.cos(2 * Math.PI * uniform());
}

describe("tape ties, whatever the point", () => {
  it("does not change by an exact tie more", () =>
    fc.assert(
      fc.property(X, Y, fc.integer({ min: -3, max: 3 }), (x, y, off) => {
        const before = must(
          tiesTo(floorPoint(x, y), ["A", "B", "D"], (mark) => (mark === "B" ? off / 4 : 0)),
        );
        const extra = { mark: "E", at: floorPoint(1500, 2600) };
        const after = must([
          ...tiesTo(floorPoint(x, y), ["A", "B", "D"], (mark) => (mark === "B" ? off / 4 : 0)),
          { ...extra, distance: distance(before.point, extra.at) },
        ]);
        return distance(before.point, after.point) < 1e-5;
      }),
    ));
  it("moves with the floor when all marks are turned and shifted", () =>
    fc.assert(
      fc.property(X, Y, fc.integer({ min: -20, max: 20 }), (x, y, angle) => {
        const ties = tiesTo(floorPoint(x, y), ALL, (mark) => (mark === "C" ? 0.7 : -0.2));
        const turn = (p: FloorPoint) => {
          const v = turned(p, degrees(angle));
          return floorPoint(v.x + 90, v.y + 2000);
        };
        const [one, two] = [must(ties), must(ties.map((tie) => ({ ...tie, at: turn(tie.at) })))];
        return distance(turn(one.point), two.point) < 1e-5;
      }),
    ));
  it("mirrors when left and right are swapped", () =>
    fc.assert(
      fc.property(X, Y, (x, y) => {
        const ties = tiesTo(floorPoint(x, y), ALL, (mark) => (mark === "A" ? 1.1 : 0));
        const mirrored = ties.map((tie) => ({ ...tie, at: floorPoint(tie.at.x, -tie.at.y) }));
        const [one, two] = [must(ties, "left"), must(mirrored, "right")];
        return Math.abs(one.point.x - two.point.x) < 1e-6 && Math.abs(one.point.y + two.point.y) < 1e-6;
      }),
    ));
  it("finds an inch burnt on any of four tapes: that tape stands out, and the inch is the best explanation", () =>
    fc.assert(
      fc.property(X, Y, fc.constantFrom(...ALL), (x, y, burnt) => {
        const ties = tiesTo(floorPoint(x, y), ALL, (mark) => (mark === burnt ? 25.4 : 0));
        const fit = must(ties);
        const worst = fit.residuals.reduce((a, b) =>
          Math.abs(b.standardised ?? 0) > Math.abs(a.standardised ?? 0) ? b : a,
        );
        const [best] = fit.suggestions;
        return fit.suspect && worst.mark === burnt && best?.kind === "inch-burnt" && best.mark === burnt;
      }),
      { numRuns: 40 },
    ));
  it.each([
    ["36 typed for 63", 63, 36, "digits-swapped"],
    ["69 typed for 66", 66, 69, "six-for-nine"],
    ["60 in read as cm", 60, 60 / 2.54, "centimetres"],
    ["an inch taken off twice", 60, 59, "inch-lost"],
  ] as const)("suggests %s", (_, right, wrong, kind) => {
    // A point as far from A as the tape should have read.
    const point = floorPoint(inches(right * 0.8), inches(right * 0.6));
    const ties = tiesTo(point, ALL).map((tie) =>
      tie.mark === "A" ? { ...tie, distance: inches(wrong) } : tie,
    );
    expect(must(ties).suggestions[0]).toMatchObject({ kind, mark: "A" });
  });
  it("suggests two marks swapped, and left for right", () => {
    const ties = tiesTo(floorPoint(800, 600), ALL);
    const [a, b] = [ties[0]?.distance ?? mm(0), ties[1]?.distance ?? mm(0)];
    const swapped = ties.map((tie, i) => ({ ...tie, distance: i === 0 ? b : i === 1 ? a : tie.distance }));
    expect(must(swapped).suggestions.map((one) => one.kind)).toContain("marks-swapped");
    const sides = must(ties, "right");
    expect(sides.suggestions.map((one) => one.kind)).toContain("sides-swapped");
  });
  it("swaps digits of millimetres where millimetres are read", () => {
    const ties = tiesTo(floorPoint(1000, 750), ALL).map((tie) =>
      tie.mark === "A" ? { ...tie, distance: mm(1520) } : tie,
    );
    const suggested = (unit: "in" | "mm") => {
      const tied = pointFromTies(ties, "left", SIGMA, unit);
      return tied.ok ? tied.value.suggestions : [];
    };
    // The right length is 1250 mm.
    expect(suggested("mm")).toMatchObject([{ kind: "digits-swapped", mark: "A", reading: 1250 }]);
    expect(suggested("in")).toEqual([]);
  });
});

describe("marks and tapes with an uncertainty of their own", () => {
  it("adds the mark's to the tape's: 3 and 4 make 5", () =>
    expect(tieSigma({ mark: "A", at: floorPoint(0, 0), distance: mm(1), markSigma: mm(3) }, mm(4))).toBe(5));
  it("trusts a mark that is unsure less", () => {
    const ties = tiesTo(floorPoint(1500, 900), ["A", "B", "D"], (mark) => (mark === "B" ? 3 : 0));
    const unsure = ties.map((tie) => (tie.mark === "B" ? { ...tie, markSigma: mm(50) } : tie));
    const right = floorPoint(1500, 900);
    expect(distance(must(unsure).point, right)).toBeLessThan(distance(must(ties).point, right) / 10);
  });
});

describe("dropQuality", () => {
  it("is one tape's uncertainty each way where two tapes cross squarely", () => {
    const ties = [
      { mark: "A", at: floorPoint(0, 0), distance: mm(720) },
      { mark: "B", at: floorPoint(1200, 0), distance: mm(960) },
    ];
    const good = quality(ties);
    expect(good.along).toBeCloseTo(0.8, 9);
    expect(good.across).toBeCloseTo(0.8, 9);
    expect(good.ellipse).toMatchObject({ coverage: 0.95, major: expect.closeTo(0.8 * 2.4477, 4) });
    expect(good.notes).toEqual(["Nothing checks this point: a blunder in either tape would not show."]);
    expect(good.detectable.map((one) => one.bias)).toEqual([null, null]);
  });
  it("holds the drop in the stated ellipse at the stated rate", () => {
    const normal = seeded(20260111);
    const point = floorPoint(1700, 800);
    const { covariance } = must(tiesTo(point, ALL));
    const det = covariance.xx * covariance.yy - covariance.xy ** 2;
    const limit = ellipseFactor(0.95) ** 2;
    const tries = 3000;
    let within = 0;
    for (let i = 0; i < tries; i++) {
      const fit = adjustTies(
        tiesTo(point, ALL, () => SIGMA * normal()),
        1,
        SIGMA,
      );
      if (!fit.ok) continue;
      const [dx, dy] = [fit.value.point.x - point.x, fit.value.point.y - point.y];
      const d2 = (covariance.yy * dx * dx - 2 * covariance.xy * dx * dy + covariance.xx * dy * dy) / det;
      if (d2 <= limit) within++;
    }
    // 95 % of 3000, four standard deviations either way.
    expect(Math.abs(within / tries - 0.95)).toBeLessThan(0.016);
  });
  it("goes from k to coverage and back", () => {
    expect(ellipseCoverage(2)).toBeCloseTo(0.8647, 4);
    expect(ellipseFactor(ellipseCoverage(1.7))).toBeCloseTo(1.7, 12);
    expect(() => ellipseFactor(1)).toThrow(RangeError);
  });
  it("warns of tapes that cross flatly, marks in one line, and two meetings on one side", () => {
    expect(quality(tiesTo(floorPoint(1500, 60), ["A", "B"])).notes[0]).toContain(
      "The tapes cross at 5° at most",
    );
    const line = [0, 1500, 3048].map((x, i) => ({
      mark: `${i}`,
      at: floorPoint(x, 0),
      distance: distance(floorPoint(x, 0), floorPoint(1400, 900)),
    }));
    expect(quality(line).notes).toContain(
      "The marks lie in one line, so the tapes check the lengths but not the side: only that the left was named does.",
    );
    expect(quality(tiesTo(floorPoint(1500, 900), ["A", "D"])).notes).toContain(
      "The tapes from A and D meet in two places on the left: a third tape would tell which.",
    );
  });
  it("says of a tape what blunder it would let pass", () => {
    const ties = tiesTo(floorPoint(1500, 900), ALL);
    for (const { bias, mark } of quality(ties).detectable) {
      const size = (bias ?? 0) * 1.6;
      const fit = must(tiesTo(floorPoint(1500, 900), ALL, (one) => (one === mark ? size : 0)));
      expect(fit.suspect, `${mark} out by ${size}`).toBe(true);
    }
  });
  it("says in words that marks lie on each other, or that one tape swallows the other", () => {
    const two = (a: number, b: number, base: number) =>
      pointFromTies(
        [
          { mark: "A", at: floorPoint(0, 0), distance: inches(a) },
          { mark: "B", at: floorPoint(inches(base), 0), distance: inches(b) },
        ],
        "left",
        SIGMA,
      );
    expect(two(10, 10, 0)).toEqual({
      ok: false,
      problem: "Marks A and B lie on each other: they make no point.",
    });
    expect(two(200, 20, 100)).toEqual({
      ok: false,
      problem:
        "The tapes from A and B differ by more than the marks are apart, so they do not meet: 200 in and 20 in between marks 100 in apart.",
    });
  });
});

describe("shifts of a drop", () => {
  it("make the adjustment's covariance again", () => {
    const ties = tiesTo(floorPoint(1500, 900), ALL).map((tie, i) => ({ ...tie, markSigma: mm(i / 2) }));
    const fit = must(ties);
    const again = covarianceOf(tieShifts("the drop", ties, fit, SIGMA));
    expect(again.xx).toBeCloseTo(fit.covariance.xx, 9);
    expect(again.xy).toBeCloseTo(fit.covariance.xy, 9);
    expect(again.yy).toBeCloseTo(fit.covariance.yy, 9);
  });
  it("are what a longer tape does", () => {
    const point = floorPoint(1500, 900);
    const ties = tiesTo(point, ALL);
    const shift = tieShifts("the drop", ties, must(ties), SIGMA)[1];
    const longer = must(tiesTo(point, ALL, (mark) => (mark === "B" ? SIGMA : 0))).point;
    expect(longer.x - point.x).toBeCloseTo(shift?.x ?? 99, 3);
    expect(longer.y - point.y).toBeCloseTo(shift?.y ?? 99, 3);
  });
  it("come from offsets, the bob and the level as well", () => {
    expect(covarianceOf(offsetShifts("it", mm(1), mm(2)))).toEqual({ xx: 1, xy: 0, yy: 4 });
    expect(covarianceOf(bobShifts("it", mm(0.4))).xx).toBeCloseTo(0.16, 12);
    expect(levelShifts(mm(1000), degrees(0.1), degrees(0))[0]?.x).toBeCloseTo(-1.7453, 4);
    expect(covarianceOf([{ source: "s", group: "g", x: mm(3), y: mm(4) }])).toEqual({
      xx: 9,
      xy: 12,
      yy: 16,
    });
  });
});

describe("repeatedReadings", () => {
  const read = (...readings: number[]) => {
    const result = repeatedReadings(
      readings.map((one) => inches(one)),
      SIGMA,
    );
    if (!result.ok) throw new Error(result.problem);
    return result.value;
  };
  it("means three that agree, surer by √3", () => {
    const readings = read(60, 60 + 1 / 32, 60 - 1 / 32);
    expect(toInches(readings.mean)).toBeCloseTo(60, 9);
    expect(readings.meanSigma).toBeCloseTo(0.8 / Math.sqrt(3), 9);
    expect(readings).toMatchObject({
      agree: true,
      standsOut: null,
      words: "Read 3 times, all within 1/16 in.",
    });
  });
  it("names the one that stands out", () =>
    expect(read(60, 61, 60 + 1 / 16)).toMatchObject({
      agree: false,
      standsOut: { index: 1 },
      words: "Reading 2 (61 in) is 31/32 in more than the others: read it again.",
    }));
  it("asks for a third where two differ", () =>
    expect(read(60, 61)).toMatchObject({
      standsOut: null,
      words: "The two readings differ by 1 in: read it a third time.",
    }));
  it("says of one reading that it is one, and that none is none", () => {
    expect(read(60)).toMatchObject({ deviation: null, agree: true, words: "Read once." });
    expect(repeatedReadings([], SIGMA).ok).toBe(false);
  });
});
