import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { degrees } from "../units/angle";
import { inches, mm, toInches } from "../units/length";
import { arcByHuygens, arcByParabola, type CircularSegment, type SegmentGiven, segmentFrom } from "./arc";

const value = (given: SegmentGiven): CircularSegment => {
  const answer = segmentFrom(given);
  if (!answer.ok) throw new Error(answer.problem);
  return answer.value;
};
const fault = (given: SegmentGiven) => {
  const answer = segmentFrom(given);
  return answer.ok ? JSON.stringify(answer.value) : answer.problem;
};
/** Up to a half circle, where every pair has one answer. */
const leaf = fc.record({
  arc: fc.double({ min: 100, max: 3000, noNaN: true }),
  angle: fc.double({ min: 0.01, max: 179.9, noNaN: true }),
});

describe("segmentFrom", () => {
  it("does the example", () => {
    const { radius, angle, arc } = value({ chord: inches(48), rise: inches(6) });
    expect(toInches(radius ?? mm(0))).toBeCloseTo(51, 10);
    expect(angle).toBeCloseTo(56.145, 3);
    expect(toInches(arc)).toBeCloseTo(49.97565, 5);
  });
  it("gives the same arc from whichever two are known", () => {
    fc.assert(
      fc.property(leaf, fc.boolean(), (given, reverse) => {
        const sign = reverse ? -1 : 1;
        const whole = value({ arc: mm(given.arc), angle: degrees(sign * given.angle) });
        const { arc, chord, rise, angle } = whole;
        const radius = whole.radius ?? undefined;
        const pairs: SegmentGiven[] = [
          { arc, rise },
          { arc, radius },
          { chord, rise },
          { chord, radius },
          { chord, angle },
          { rise, radius },
          { rise, angle },
          { radius, angle },
        ];
        for (const pair of pairs) {
          const again = value(pair);
          expect(again.arc / arc).toBeCloseTo(1, 8);
          expect(again.rise / rise).toBeCloseTo(1, 8);
          expect(again.chord / chord).toBeCloseTo(1, 8);
        }
      }),
    );
  });
  it("finds the rise from arc and chord as well as the two allow", () => {
    fc.assert(
      fc.property(leaf, (given) => {
        const { arc, chord, rise } = value({ arc: mm(given.arc), angle: degrees(given.angle) });
        // Near flat a chord says little of the rise: an ulp of the chord is about √(arc·ulp) of rise.
        expect(Math.abs(value({ arc, chord }).rise - rise)).toBeLessThan(1e-4);
      }),
    );
  });
  it("goes to flat without a jump", () => {
    const flat = value({ arc: inches(52), rise: mm(0) });
    expect(flat).toMatchObject({ chord: inches(52), rise: 0, radius: null, angle: 0, area: 0 });
    for (let rise = 10; rise > 1e-7; rise /= 10) {
      const { chord, arc, angle, area } = value({ arc: inches(52), rise: mm(rise) });
      // Leading terms of the series: chord s − 8h²/(3s), angle 8h/s, area ⅔hs.
      expect(Math.abs(arc - chord - (8 * rise * rise) / (3 * arc))).toBeLessThan(
        1e-12 * arc + rise ** 4 / arc ** 2,
      );
      expect((angle * Math.PI) / 180 / ((8 * rise) / arc)).toBeCloseTo(1, 3);
      expect(area / ((2 / 3) * rise * arc)).toBeCloseTo(1, 3);
    }
    expect(value({ chord: mm(1000), angle: degrees(0) }).arc).toBe(1000);
    expect(value({ arc: mm(1000), chord: mm(1000) }).radius).toBeNull();
  });
  it("turns over with the sign of the rise", () => {
    const [up, down] = [value({ chord: mm(900), rise: mm(80) }), value({ chord: mm(900), rise: mm(-80) })];
    expect(down.arc).toBe(up.arc);
    expect([down.angle, down.radius, down.area]).toEqual([-up.angle, -(up.radius ?? 0), -up.area]);
  });
  it.each<[string, SegmentGiven, RegExp]>([
    ["one", { arc: mm(10) }, /two of/],
    ["three", { arc: mm(10), chord: mm(9), rise: mm(1) }, /two of/],
    ["chord over arc", { arc: mm(10), chord: mm(11) }, /longer than the arc/],
    ["too much rise", { arc: mm(100), rise: mm(40) }, /No circle/],
    ["more than a circle", { arc: mm(100), radius: mm(10) }, /full circle/],
    ["chord over the circle", { chord: mm(30), radius: mm(10) }, /wide/],
    ["rise over the circle", { rise: mm(21), radius: mm(10) }, /high/],
    ["signs", { rise: mm(-1), radius: mm(10) }, /opposite/],
    ["signs", { rise: mm(-1), angle: degrees(10) }, /opposite/],
    ["signs", { radius: mm(-1), angle: degrees(10) }, /opposite/],
    ["nothing", { rise: mm(0), angle: degrees(0) }, /length/],
    ["no radius", { arc: mm(10), radius: mm(0) }, /radius/],
    ["no arc", { arc: mm(0), rise: mm(0) }, /nothing/],
    ["far too large", { chord: mm(1e300), rise: mm(1e300) }, /large/],
  ])("says what is wrong: %s", (_, given, words) => expect(fault(given)).toMatch(words));
  it("never gives what is not a number, whatever two are typed", () => {
    const figure = fc.option(fc.double({ min: -1e6, max: 1e6, noNaN: true }), { nil: undefined });
    fc.assert(
      fc.property(
        fc.record({ arc: figure, chord: figure, rise: figure, radius: figure, angle: figure }),
        (given) => {
          const answer = segmentFrom(given as SegmentGiven);
          if (!answer.ok) return answer.problem.endsWith(".");
          const { radius, ...rest } = answer.value;
          return Object.values(rest).every(Number.isFinite) && (radius === null || Number.isFinite(radius));
        },
      ),
      { numRuns: 500 },
    );
  });
});

describe("approximations", () => {
  it("do the examples", () => {
    expect(toInches(arcByHuygens(inches(48), inches(6)))).toBeCloseTo(49.96969, 5);
    expect(toInches(arcByParabola(inches(48), inches(6)))).toBeCloseTo(50, 10);
  });
  it("lie on either side of the arc, Huygens's nearer", () => {
    fc.assert(
      fc.property(fc.double({ min: 0.01, max: 0.4, noNaN: true }), (share) => {
        const [chord, rise] = [mm(1000), mm(1000 * share)];
        const { arc } = value({ chord, rise });
        const [huygens, parabola] = [arcByHuygens(chord, rise), arcByParabola(chord, rise)];
        expect(huygens).toBeLessThanOrEqual(arc + 1e-9);
        expect(parabola).toBeGreaterThanOrEqual(arc - 1e-9);
        expect(arc - huygens).toBeLessThanOrEqual(parabola - arc + 1e-9);
      }),
    );
  });
});
