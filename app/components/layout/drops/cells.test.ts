import { describe, expect, it } from "vitest";
import { floorPoint } from "../../../domain/geometry/point";
import type { DropReadingView, DropView } from "../../../domain/layout/view";
import type { Unsent } from "../unsent";
import { cellOf, nextSpot, rowsOf, spotLabel } from "./cells";

const IN = 25.4;
const reading = (over: Partial<DropReadingView> = {}): DropReadingView => ({
  id: 1,
  method: "ties",
  stationTyped: null,
  offsetTyped: null,
  ties: [],
  at: floorPoint(82.375 * IN, 30.25 * IN),
  height: null,
  suspect: false,
  checked: true,
  fit: null,
  stands: true,
  reason: null,
  made: { name: "Pilar Echeverri", initials: "PE", at: "2026-06-01T10:00:00.000Z" },
  ...over,
});
const drop = (
  point: DropView["point"],
  side: DropView["side"],
  read: DropReadingView | null,
  needed = true,
): DropView => ({
  point,
  side,
  label: point,
  needed,
  reading: read,
  superseded: [],
});
const kept = (point: string, side: string, refused: string | null = null): Unsent => ({
  clientKey: `${point}${side}`,
  to: "/layouts/1/drop",
  fields: {},
  what: "",
  subject: `${point}.${side}`,
  by: "Pilar Echeverri",
  keptAt: "2026-06-01T10:00:00.000Z",
  refused,
});

describe("a cell of the drops", () => {
  it.each([
    ["to drop", drop("opening-front", "left", null), [], "to-drop", ""],
    ["to drop", drop("axle-end", "left", null, false), [], "to-drop", "if wanted"],
    ["82 3/8", drop("opening-front", "left", reading()), [], "kept", "30 1/4 left"],
    [
      "82 3/8",
      drop("opening-front", "left", reading({ checked: false })),
      [],
      "kept",
      "30 1/4 left, unchecked",
    ],
    [
      "82 3/8",
      drop("opening-front", "left", reading({ suspect: true })),
      [],
      "not-meeting",
      "tapes do not meet",
    ],
    [
      "82 3/8",
      drop("opening-front", "left", reading({ stands: false, suspect: true })),
      [],
      "waiting",
      "waits for the level",
    ],
    [
      "kept here",
      drop("opening-front", "left", reading()),
      [kept("opening-front", "left")],
      "kept-here",
      "not sent",
    ],
    [
      "not taken",
      drop("opening-front", "left", null),
      [kept("opening-front", "left", "Level void")],
      "not-taken",
      "Level void",
    ],
  ] as const)("says %s", (words, one, unsent, state, detail) => {
    expect(cellOf(one, unsent, "in")).toMatchObject({ words, state, detail });
  });
});

describe("the drop to take in hand", () => {
  const list = [
    drop("opening-front", "left", reading()),
    drop("opening-front", "right", null),
    drop("datum-front", "left", null),
    drop("axle-end", "left", null, false),
  ];

  it("is the first needed one that is missing, then the rest", () => {
    expect(nextSpot(list, [], false)).toEqual({ point: "opening-front", side: "right" });
    expect(nextSpot(list, [], false, { point: "opening-front", side: "right" })).toEqual({
      point: "datum-front",
      side: "left",
    });
    const unsent = [kept("opening-front", "right"), kept("datum-front", "left")];
    expect(nextSpot(list, unsent, false)).toEqual({ point: "axle-end", side: "left" });
  });

  it("is first one whose tapes do not meet", () => {
    const odd = [...list, drop("axle-end", "right", reading({ suspect: true }), false)];
    expect(nextSpot(odd, [], false)).toEqual({ point: "axle-end", side: "right" });
  });

  it("is an old one while a new level waits for it", () => {
    const old = [
      drop("opening-front", "left", null),
      drop("opening-rear", "left", reading({ stands: false })),
    ];
    expect(nextSpot(old, [], true)).toEqual({ point: "opening-rear", side: "left" });
  });

  it("is none when all are taken", () => {
    expect(nextSpot([drop("opening-front", "left", reading())], [], false)).toBeNull();
  });
});

it("puts the two sides of a point beside each other, in the order of dropping", () => {
  const rows = rowsOf([
    drop("datum-front", "left", null),
    drop("opening-front", "left", null),
    drop("opening-front", "right", null),
  ]);
  expect(rows.map((row) => [row.point.id, row.drops.length])).toEqual([
    ["opening-front", 2],
    ["datum-front", 1],
  ]);
});

it("names a point with its side, but for the middle", () => {
  expect(spotLabel({ point: "opening-front", side: "left" })).toBe("Opening, front edge, left");
  expect(spotLabel({ point: "low-front", side: "centre" })).toBe("Lowest point in front");
});
