import { describe, expect, it } from "vitest";
import { floorPoint } from "../geometry/point";
import { degrees } from "../units/angle";
import { formatInches, inches, toInches } from "../units/length";
import { approachAngle } from "./approach";
import { axleLine, compareOpenings } from "./axle-line";
import { pointFromTies } from "./drops";
import { frameFromDatums, toFloor, toFrame } from "./frame";
import { levelFromHeights, levelVerdict, standCorrections } from "./level";
import { optionTable } from "./options";

/*
 * One front end as it was measured on a pad. The expected figures were worked out independently of this code (plane
 * fit, plane trigonometry and the approach formula on paper); they are no published values.
 */

const at = (x: number, y: number) => floorPoint(inches(x), inches(y));
function must<T>(outcome: { ok: true; value: T } | { ok: false; problem: string }): T {
  if (!outcome.ok) throw new Error(outcome.problem);
  return outcome.value;
}

const STANDS = [
  { id: "left-front", x: 70, y: 15, height: 24 + 1 / 16 },
  { id: "right-front", x: 70, y: -15, height: 24 + 5 / 16 },
  { id: "left-rear", x: -40, y: 15, height: 23 + 13 / 16 },
  { id: "right-rear", x: -40, y: -15, height: 24 + 3 / 16 },
].map(({ id, x, y, height }) => ({ id, x: inches(x), y: inches(y), height: inches(height) }));

describe("level", () => {
  const level = must(levelFromHeights(STANDS));
  it("stands nose high 0.0977° and right high 0.5968°, twisted 1/32 in", () => {
    expect(level.noseHigh).toBeCloseTo(0.0977, 4);
    expect(level.rightHigh).toBeCloseTo(0.5968, 4);
    const left = level.residuals.map((r) => toInches(r.residual) * 32);
    expect(left.map((n) => Math.round(n * 1e6) / 1e6)).toEqual([1, -1, -1, 1]);
  });
  it("is not true at 0.1°, in words", () => {
    expect(levelVerdict(level, degrees(0.1))).toMatchObject({
      isTrue: false,
      noseTrue: true,
      sideTrue: false,
      headline: "Right side high 0.60°, nose high 0.10°.",
    });
  });
  it("comes true by raising three stands in sixteenths", () => {
    const { moves, after } = must(standCorrections(STANDS, { mode: "raise", shim: inches(1 / 16) }));
    expect(moves.map((move) => formatInches(move.raise))).toEqual(["5/16", "0", "1/2", "3/16"]);
    expect(after.noseHigh).toBeCloseTo(0, 9);
    expect(after.rightHigh).toBeCloseTo(0, 9);
    expect(toInches(after.twist ?? inches(9))).toBeCloseTo(1 / 32, 9);
  });
});

const frame = must(
  frameFromDatums({
    frontLeft: at(100, 16),
    frontRight: at(100, -16.25),
    rearLeft: at(20, 16.25),
    rearRight: at(20, -16),
  }),
);
const openings = must(
  compareOpenings(frame, {
    left: { front: at(82.375, 30.25), rear: at(46.625, 30.125) },
    right: { front: at(82.125, -30.375), rear: at(46.5, -30.1875) },
  }),
);

describe("frame, openings, axle line", () => {
  it("turns the frame centre line −0.1790° from A to B", () => expect(frame.angle).toBeCloseTo(-0.179, 4));
  it("finds the opening centres at 44.4058 and 44.4073", () => {
    expect(toInches(openings.left.centre.station)).toBeCloseTo(44.4058, 4);
    expect(toInches(openings.right.centre.station)).toBeCloseTo(44.4073, 4);
  });
  it("compares them in words", () => {
    expect(openings.words).toBe(
      "Left opening 1/8 in longer. The left one's centre is 3/16 in ahead of the right on the floor, level with the right on the frame.",
    );
  });
  it("lays the axle line at 44.4066, square", () => {
    const line = axleLine({ left: openings.left.centre, right: openings.right.centre }, "square");
    expect(toInches(line.station)).toBeCloseTo(44.4066, 4);
    expect(line.turn).toBe(0);
    expect(toInches(line.residualLeft)).toBeCloseTo(-0.0007, 4);
    expect(toInches(line.residualRight)).toBeCloseTo(0.0007, 4);
  });
  it("goes through both centres when asked, and to an offset when asked", () => {
    const centres = { left: openings.left.centre, right: openings.right.centre };
    const through = axleLine(centres, "through-centres");
    expect(Math.abs(through.turn)).toBeLessThan(0.002);
    expect(toInches(axleLine(centres, "asked", inches(2)).station)).toBeCloseTo(46.4066, 4);
  });
  it("carries points to the frame and back", () => {
    const back = toFloor(frame, toFrame(frame, at(63.9, -12.3)));
    expect(toInches(back.x)).toBeCloseTo(63.9, 9);
    expect(toInches(back.y)).toBeCloseTo(-12.3, 9);
  });
});

describe("options", () => {
  const table = optionTable({
    springs: [
      { id: 1, rackNumber: 14, length: inches(52), frontHalf: inches(26) },
      { id: 2, rackNumber: 22, length: inches(52), frontHalf: inches(24) },
    ],
    holes: [70.5, 71.5, 72.5].map((station, i) => ({ id: i + 1, number: i + 1, station: inches(station) })),
    fixedEye: "ahead",
    openingCentre: inches(44.4066),
    loadedRadius: inches(16.5),
    lowPoints: [{ station: inches(76), height: inches(22) }],
    constraints: { approachAtLeast: degrees(40) },
    sigma: { hole: inches(1 / 32), half: inches(1 / 32) },
  });
  const row = (key: string) => table.find((option) => option.key === key);

  // A 52 in spring with its pin centred has a front half of 26, with its pin 2 in ahead 24: common practice, no source.
  it.each([
    ["1:0:1", 44.5, 40.97],
    ["1:0:2", 45.5, 42.39],
    ["1:0:3", 46.5, 43.92],
    ["2:0:1", 46.5, 43.92],
    ["2:0:3", 48.5, 47.35],
  ])("%s puts the axle at %d with %d° of approach", (key, station, approach) => {
    expect(toInches(row(key)?.axleStation ?? inches(0))).toBeCloseTo(station, 9);
    expect(row(key)?.approach).toBeCloseTo(approach, 2);
  });
  it("puts the pin-ahead spring in hole 2 at 47.5", () =>
    expect(toInches(row("2:0:2")?.axleStation ?? inches(0))).toBeCloseTo(47.5, 9));
  it("offers a spring turned end for end only where that changes something", () => {
    expect(row("1:1:1")).toBeUndefined();
    expect(toInches(row("2:1:1")?.axleStation ?? inches(0))).toBeCloseTo(42.5, 9);
  });
  it("keeps what is rejected, with its reason", () => {
    expect(row("2:1:1")).toMatchObject({ stands: false, reasons: ["Approach 38.40°, asked at least 40°."] });
    expect(row("1:0:1")).toMatchObject({ stands: true, reasons: [] });
  });
  it("gives the approach of the formula by hand", () => {
    // asin(16.5/√(31.5² + 5.5²)) + atan(5.5/31.5)
    expect(approachAngle(inches(16.5), inches(31.5), inches(22))).toBeCloseTo(40.9687, 4);
  });
});

describe("an axle end taped from three marks", () => {
  const taped = (b: number) =>
    must(
      pointFromTies(
        [
          { mark: "A", at: at(0, 0), distance: inches(68 + 5 / 8) },
          { mark: "B", at: at(120, 0), distance: inches(b) },
          { mark: "D", at: at(0, -48), distance: inches(98 + 1 / 8) },
        ],
        "left",
        inches(1 / 32),
      ),
    );
  it("says that the tapes do not meet, what each alone would have to read, and which slip explains it", () => {
    const fit = taped(64 + 3 / 16);
    expect(fit).toMatchObject({ suspect: true, checked: true, redundancy: 1 });
    expect(fit.residuals.map((r) => formatInches(r.wouldFit ?? inches(0)))).toEqual([
      "68 3/16",
      "63 3/16",
      "98 11/16",
    ]);
    expect(fit.suggestions).toMatchObject([
      {
        kind: "inch-burnt",
        mark: "B",
        words: "Looks like an inch burnt on the tape from mark B: 63 3/16 fits within 1/32.",
      },
    ]);
    // With one spare tape every standardized residual is the same size: seen, not located.
    const sizes = fit.residuals.map((r) => Math.abs(r.standardised ?? 0));
    expect(Math.max(...sizes) - Math.min(...sizes)).toBeLessThan(1e-6);
  });
  it("is content once the inch is taken off", () => {
    expect(taped(63 + 3 / 16)).toMatchObject({ suspect: false, suggestions: [], advice: null });
  });
});
