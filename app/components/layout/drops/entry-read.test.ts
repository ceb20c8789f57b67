import { describe, expect, it } from "vitest";
import type { LayoutView } from "../../../domain/layout/view";
import { inches, toInches } from "../../../domain/units/length";
import { methodOf, postedDrop, readEntry } from "./entry-read";

const marks = [
  { label: "A", x: inches(0), y: inches(0) },
  { label: "B", x: inches(120), y: inches(0) },
  { label: "C", x: inches(120), y: inches(-48) },
  { label: "D", x: inches(0), y: inches(-48) },
];
const view = {
  unit: "in",
  vehicle: { lengthMm: inches(230), widthMm: inches(76) },
  settings: { tapeSigma: inches(1 / 32) },
  bay: { id: 5, number: 5, marks },
} as unknown as LayoutView;

describe("an entry of a drop while it is typed", () => {
  it("falls ahead of A and off the line, on the side of its name", () => {
    const read = readEntry(view, "right", "offset", { station: "82 1/8", offset: "30 3/8" }, false);
    expect([toInches(read.at?.x ?? inches(0)), toInches(read.at?.y ?? inches(0))]).toEqual([82.125, -30.375]);
    expect(read.problem).toBeNull();
    expect(read.warning).toBeNull();
  });

  it("is nothing before two lengths can be read", () => {
    expect(readEntry(view, "left", "offset", { station: "82", offset: "" }, false).at).toBeNull();
    expect(readEntry(view, "left", "ties", { "tape.A": "68 5/8" }, false).at).toBeNull();
  });

  it("says that two tapes have nothing to check them", () => {
    const read = readEntry(view, "left", "ties", { "tape.A": "68 5/8", "tape.B": "63 3/16" }, false);
    expect(read.fit?.checked).toBe(false);
  });

  it("sees a burnt inch by the third tape, and names it", () => {
    const tapes = { "tape.A": "68 5/8", "tape.B": "64 3/16", "tape.D": "98 1/8" };
    const read = readEntry(view, "left", "ties", tapes, false);
    expect(read.fit?.suspect).toBe(true);
    expect(read.fit?.suggestions[0]).toMatchObject({ kind: "inch-burnt", mark: "B" });
    const right = readEntry(view, "left", "ties", { ...tapes, "tape.B": "63 3/16" }, false);
    expect(right.fit?.suspect).toBe(false);
  });

  it("asks for the height where one is wanted, and takes it in", () => {
    const place = { station: "120", offset: "-2" };
    expect(readEntry(view, "centre", "offset", place, true).problem).toMatch(/height/);
    const read = readEntry(view, "centre", "offset", { ...place, height: "21 1/2" }, true);
    expect(read.problem).toBeNull();
    expect(read.height).toBe(inches(21.5));
  });

  it.each([
    [{ station: "600", offset: "30" }, /off this vehicle/],
    [{ station: "82", offset: "90" }, /further out/],
  ])("doubts a place off the vehicle: %j", (draft, words) => {
    expect(readEntry(view, "left", "offset", draft, false).warning).toMatch(words);
  });
});

describe("how a drop is measured", () => {
  it("is as typed, else as usual; on the middle by offset", () => {
    expect(methodOf({}, "ties", "left")).toBe("ties");
    expect(methodOf({ method: "offset" }, "ties", "left")).toBe("offset");
    expect(methodOf({ method: "ties" }, "ties", "centre")).toBe("offset");
  });
});

it("posts only what its way of measuring asks for, and no empty tape", () => {
  const draft = {
    station: "1",
    offset: "2",
    "tape.A": " 68 5/8 ",
    "tape.B": "63",
    "tape.C": "",
    height: "9",
    reason: "Taped again",
  };
  expect(postedDrop(view, { point: "axle-end", side: "left" }, "ties", draft, false)).toEqual({
    point: "axle-end",
    side: "left",
    method: "ties",
    "tape.A": "68 5/8",
    "tape.B": "63",
    reason: "Taped again",
  });
  expect(postedDrop(view, { point: "low-front", side: "centre" }, "offset", draft, true)).toEqual({
    point: "low-front",
    side: "centre",
    method: "offset",
    station: "1",
    offset: "2",
    height: "9",
    reason: "Taped again",
  });
});
