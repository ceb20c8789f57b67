import { describe, expect, it } from "vitest";
import {
  lengthsOf,
  pickSprings,
  pinWords,
  readSpringQuery,
  type SpringRow,
  springAddress,
} from "./spring-facts";

const spring = (
  rackNumber: number,
  lengthIn: number,
  frontIn: number,
  over: Partial<SpringRow> = {},
): SpringRow => ({
  rackNumber,
  lengthMm: lengthIn * 25.4,
  frontHalfMm: frontIn * 25.4,
  leaves: 5,
  leafWidthMm: 63.5,
  note: "",
  ...over,
});
const rack = [spring(22, 52, 24), spring(14, 52, 26), spring(9, 48, 25, { note: "one eye re-bushed" })];
const numbers = (search: string) =>
  pickSprings(rack, readSpringQuery(new URLSearchParams(search)), "in").map((found) => found.rackNumber);

describe("pinWords", () => {
  it("says on which side of the centre the pin sits, and how far", () => {
    expect(pinWords(52 * 25.4, 26 * 25.4, "in")).toBe("pin centred");
    expect(pinWords(52 * 25.4, 24 * 25.4, "in")).toBe("pin 2 in ahead of centre");
    expect(pinWords(48 * 25.4, 25.5 * 25.4, "in")).toBe("pin 1 1/2 in behind centre");
    expect(pinWords(1320, 620, "mm")).toBe("pin 40.0 mm ahead of centre");
  });
});

describe("the rack's list", () => {
  it("stands by rack number and sorts both ways", () => {
    expect(numbers("")).toEqual([9, 14, 22]);
    expect(numbers("sort=-length")).toEqual([14, 22, 9]);
    expect(numbers("sort=pin")).toEqual([22, 14, 9]);
  });

  it("finds by length, number, note and the place of the pin", () => {
    expect(numbers(`length=${52 * 25.4}`)).toEqual([14, 22]);
    expect(numbers("q=bush")).toEqual([9]);
    expect(numbers("q=ahead")).toEqual([22]);
    expect(numbers("q=rack 14")).toEqual([14]);
  });

  it("writes an address that reads back as the same list", () => {
    const query = { q: "ahead", length: 1320.8, sort: "pin", down: true } as const;
    expect(readSpringQuery(new URL(springAddress(query), "http://shop").searchParams)).toEqual(query);
  });

  it("offers each length once", () => {
    expect(lengthsOf(rack)).toHaveLength(2);
  });
});
