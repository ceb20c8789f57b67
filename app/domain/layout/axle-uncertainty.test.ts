import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { type FloorPoint, floorPoint, turned } from "../geometry/point";
import { degrees } from "../units/angle";
import { inches, mm } from "../units/length";
import { axlePoint } from "./axle-line";
import {
  type AxleDrop,
  type AxleDrops,
  axleUncertainty,
  contributorWords,
  eachDrop,
} from "./axle-uncertainty";
import { bobShifts, type Shift } from "./drop-shifts";

const at = (x: number, y: number) => floorPoint(inches(x), inches(y));
const POINTS: Record<AxleDrop, FloorPoint> = {
  datumFrontLeft: at(100, 16),
  datumFrontRight: at(100, -16.25),
  datumRearLeft: at(20, 16.25),
  datumRearRight: at(20, -16),
  openingFrontLeft: at(82.375, 30.25),
  openingFrontRight: at(82.125, -30.375),
  openingRearLeft: at(46.625, 30.125),
  openingRearRight: at(46.5, -30.1875),
};
const drops = (
  shifts: (drop: AxleDrop) => Shift[],
  move: (point: FloorPoint) => FloorPoint = (point) => point,
): AxleDrops => eachDrop((drop) => ({ name: drop, point: move(POINTS[drop]), shifts: shifts(drop) }));
const must = (input: AxleDrops, method: "square" | "through-centres" | "asked" = "square") => {
  const result = axleUncertainty(input, method, mm(0));
  if (!result.ok) throw new Error(result.problem);
  return result.value;
};
const bobs = (drop: AxleDrop) => bobShifts(drop, mm(1));

describe("axleUncertainty", () => {
  it("has eight drops", () => {
    const lengths = eachDrop((drop) => drop.length);
    expect(Object.keys(lengths)).toHaveLength(8);
    expect(lengths.datumFrontLeft).toBe(14);
  });
  it("is about σ√(1/4 + 1/4): the openings' mean of four, the rear datums' of two", () => {
    // Station of the mean of four opening edges against the origin in the middle of two: √(1/4 + 1/2) σ.
    const unsure = must(drops(bobs));
    expect(unsure.station).toBeCloseTo(Math.sqrt(0.75), 2);
    expect(unsure.stationExpanded).toBeCloseTo(2 * unsure.station, 12);
    expect(unsure.turn).toBe(0);
    expect(unsure.sources.reduce((sum, one) => sum + one.share, 0)).toBeCloseTo(1, 9);
    expect(unsure.words).toBe("Mostly the bob (100 %).");
  });
  it("gives none where the same source moves all drops alike, along the line or across it", () => {
    const together = (): Shift[] => [
      { source: "where mark A lies (along)", group: "where mark A lies", x: mm(3), y: mm(0) },
      { source: "where mark A lies (across)", group: "where mark A lies", x: mm(0), y: mm(3) },
    ];
    expect(must(drops(together)).station).toBeLessThan(1e-6);
  });
  it("names the largest group", () => {
    const unsure = must(
      drops((drop) => [
        ...bobShifts(drop, mm(0.2)),
        { source: `the tape from mark B to ${drop}`, group: "the tapes from mark B", x: mm(1), y: mm(0) },
      ]),
    );
    expect(unsure.words).toBe("Mostly the tapes from mark B (96 %), then the bob (4 %).");
    expect(contributorWords([])).toBe("Nothing is unsure.");
    expect(contributorWords([0.4, 0.35, 0.25].map((share, i) => ({ name: `source ${i}`, share })))).toBe(
      "The most comes from source 0 (40 %), then source 1 (35 %).",
    );
  });
  it("turns only where the line goes through both centres: σ√(2/2)/width", () => {
    const unsure = must(drops(bobs), "through-centres");
    // Each centre is the mean of two drops; the frame's own turn is in it as well.
    const width = inches(30.1875 + 30.28125);
    const frame = Math.hypot(1 / Math.SQRT2, 1 / Math.SQRT2) / inches(80);
    expect((unsure.turn * Math.PI) / 180).toBeCloseTo(Math.hypot(1 / width, frame), 5);
  });
  it("moves nothing when the whole floor is turned and shifted", () =>
    fc.assert(
      fc.property(
        fc.integer({ min: -180, max: 180 }),
        fc.integer({ min: -4000, max: 4000 }),
        fc.constantFrom("square" as const, "through-centres" as const, "asked" as const),
        (angle, shift, method) => {
          const move = (point: FloorPoint) => {
            const v = turned(point, degrees(angle));
            return floorPoint(v.x + shift, v.y - shift / 3);
          };
          const [one, two] = [must(drops(bobs), method), must(drops(bobs, move), method)];
          return (
            Math.abs(one.line.station - two.line.station) < 1e-6 &&
            Math.abs(one.line.turn - two.line.turn) < 1e-6 &&
            Math.abs(one.station - two.station) < 1e-4
          );
        },
      ),
    ));
  it("mirrors when left and right are swapped", () => {
    const mirror = eachDrop((drop) => {
      const other = drop.replace(/Left|Right/, (side) => (side === "Left" ? "Right" : "Left")) as AxleDrop;
      const point = POINTS[other];
      return { name: drop, point: floorPoint(point.x, -point.y), shifts: bobs(drop) };
    });
    const [one, two] = [must(drops(bobs), "through-centres"), must(mirror, "through-centres")];
    expect(two.line.turn).toBeCloseTo(-one.line.turn, 9);
    expect(two.line.station).toBeCloseTo(one.line.station, 6);
    expect(axlePoint(two.line, mm(800)).station).toBeCloseTo(axlePoint(one.line, mm(-800)).station, 6);
    expect(two.station).toBeCloseTo(one.station, 6);
  });
  it("passes on what is wrong with the drops", () => {
    const wrong = { ...drops(bobs), datumFrontLeft: { name: "", point: at(100, -30), shifts: [] } };
    expect(axleUncertainty(wrong, "square")).toMatchObject({
      ok: false,
      problem: expect.stringContaining("swapped"),
    });
  });
});
