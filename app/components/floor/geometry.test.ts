import { describe, expect, it } from "vitest";
import { aBay, aBoard } from "./board.fixture";
import { aisleOf, bayBox, markPoint, nextStop, noseInset, paintPath, planExtent } from "./geometry";

const FT = 304.8;

describe("bays on the plan", () => {
  it("lays the length along x when the mouth is east or west, along y otherwise", () => {
    expect(bayBox(aBay(1))).toEqual({ x: 0, y: 0, w: 28, h: 14 });
    expect(bayBox(aBay(1, { mouth: "south" }))).toEqual({ x: 0, y: 0, w: 14, h: 28 });
  });

  it("paints three sides and leaves the mouth open", () => {
    const box = { x: 0, y: 0, w: 4, h: 2 };
    expect(paintPath(box, "east")).toBe("M4 0H0V2H4");
    expect(paintPath(box, "west")).toBe("M0 0H4V2H0");
    expect(paintPath(box, "north")).toBe("M0 0V2H4V0");
    expect(paintPath(box, "south")).toBe("M0 2V0H4V2");
  });

  it("stands a vehicle that is too long against the closed end", () => {
    expect(noseInset(-1.17)).toBe(0);
    expect(noseInset(0.6)).toBeCloseTo(0.3);
    expect(noseInset(5)).toBe(0.5);
    expect(noseInset(6)).toBeCloseTo(1.2);
    expect(noseInset(20)).toBe(2.2);
  });

  it("draws B deeper in the bay than A, whichever way the bay opens", () => {
    const marks = [
      { label: "A", xMm: 0, yMm: 0 },
      { label: "B", xMm: 3048, yMm: 0 },
      { label: "C", xMm: 3048, yMm: -1219.2 },
    ];
    const east = aBay(1, { marks });
    expect(markPoint(east, marks[0]!)).toEqual({ x: 19, y: 7 });
    expect(markPoint(east, marks[1]!)).toEqual({ x: 9, y: 7 });
    // Facing into an east-mouthed bay is facing left: right of the line is up.
    expect(markPoint(east, marks[2]!).y).toBeCloseTo(3);
    const west = aBay(1, { marks, mouth: "west" });
    expect(markPoint(west, marks[1]!).x).toBe(19);
    expect(markPoint(west, marks[2]!).y).toBeCloseTo(11);
  });
});

describe("the ground around", () => {
  const inside = aBay(1);
  const opposite = aBay(5, { xMm: 60 * FT, yMm: 0, mouth: "west" });
  const apron = aBay(8, { xMm: 0, yMm: 54.5 * FT, lengthMm: 22.5 * FT, widthMm: 9.2 * FT, outside: true });
  const board = aBoard({ bays: [inside, opposite, apron].map((bay) => ({ bay, vehicle: null })) });

  it("puts the yard below the building, right of the apron", () => {
    const extent = planExtent(board);
    expect(extent.yard.x).toBeCloseTo(23.5);
    expect(extent.yard.y).toBeCloseTo(54.4);
    expect(extent.h).toBeCloseTo(64);
    expect(extent.w).toBeCloseTo(90);
  });

  it("finds the aisle between bays that open to each other", () => {
    expect(aisleOf(board)).toEqual({ x: 28, w: 32 });
    expect(aisleOf(aBoard({ bays: [{ bay: aBay(1, { lengthMm: 86 * FT }), vehicle: null }] }))).toBeNull();
  });
});

describe("nextStop", () => {
  const stops = [
    { key: "yard", x: 500, y: 900 },
    { key: "1", x: 100, y: 100 },
    { key: "2", x: 100, y: 300 },
    { key: "5", x: 900, y: 120 },
  ];
  it("goes round in order", () => {
    expect(nextStop(stops, "1", "next")?.key).toBe("2");
    expect(nextStop(stops, "5", "next")?.key).toBe("yard");
    expect(nextStop(stops, "yard", "before")?.key).toBe("5");
  });
  it("crosses to the nearest on that side, and stays where there is none", () => {
    expect(nextStop(stops, "2", "right")?.key).toBe("5");
    expect(nextStop(stops, "5", "left")?.key).toBe("1");
    expect(nextStop(stops, "1", "left")?.key).toBe("1");
  });
  it("starts at the first place when it does not know where it is", () => {
    expect(nextStop(stops, null, "next")?.key).toBe("yard");
    expect(nextStop([], null, "next")).toBeNull();
  });
});
