import { describe, expect, it } from "vitest";
import type { Board } from "../../domain/floor/board";
import { aBay, aBoard, aPerson, aVehicle, minutesAgo, NOW } from "./board.fixture";
import { changesBetween } from "./changes";
import { checkPlace, lettingGo, thingInHand, verdictsFor, wherePossible } from "./hand";
import { needsOn } from "./needs";
import { isShown, type Pending, withPending } from "./pending";

const ZONE = "America/Boise";
const otis = aPerson(7);
const mule = aVehicle(1, {
  nickname: "Old Mule",
  level: { state: "true", noseHighDeg: 0, rightHighDeg: 0, checkedAt: minutesAgo(41), drops: 6 },
  crew: [{ personId: 8, name: "Wes Tolliver", initials: "WT", since: minutesAgo(116) }],
});
const moth = aVehicle(2, { nickname: "Moth" });
const board: Board = aBoard({
  bays: [
    { bay: aBay(1), vehicle: mule },
    { bay: aBay(2), vehicle: null },
    { bay: aBay(4, { lengthMm: 18 * 304.8 }), vehicle: null },
  ],
  yard: [moth],
  crew: [
    otis,
    aPerson(8, { name: "Wes Tolliver", on: { buildId: 1, nickname: "Old Mule", bayNumber: 1, since: NOW } }),
  ],
});

describe("changes on their way", () => {
  const move: Pending = { key: "vehicle-1", kind: "vehicle", buildId: 1, placementId: 10, toBayId: null };
  const put: Pending = { key: "person-7", kind: "person", personId: 7, toBuildId: 1 };

  it("draws a move before it is kept: no level is claimed and the crew is let go in the yard", () => {
    const shown = withPending(board, [move]);
    expect(shown.bays[0]?.vehicle).toBeNull();
    expect(shown.yard.map((vehicle) => vehicle.nickname)).toEqual(["Moth", "Old Mule"]);
    expect(shown.yard[1]).toMatchObject({ level: { state: "none" }, crew: [] });
  });
  it("draws a person on the vehicle and off the other", () => {
    const shown = withPending(board, [
      put,
      { key: "person-8", kind: "person", personId: 8, toBuildId: null },
    ]);
    expect(shown.bays[0]?.vehicle?.crew.map((one) => one.personId)).toEqual([7]);
    expect(shown.crew.map((person) => person.on?.nickname ?? null)).toEqual(["Old Mule", null]);
  });
  it("is done with a move once the board shows another standing, whoever made it", () => {
    expect(isShown(board, move)).toBe(false);
    const later = aBoard({
      ...board,
      bays: [{ bay: aBay(2), vehicle: { ...mule, placementId: 11 } }],
      yard: [],
    });
    expect(isShown(later, move)).toBe(true);
    expect(withPending(later, [move])).toBe(later);
  });
  it("leaves the board alone when what was moved has left", () => {
    expect(withPending(aBoard(), [move, put])).toEqual(aBoard());
  });
});

describe("in hand", () => {
  const vehicle = thingInHand(board, { kind: "vehicle", buildId: 1, by: "drag" })!;
  const person = thingInHand(board, { kind: "person", personId: 7, by: "tap" })!;

  it("asks every place of its kind", () => {
    const said = [...verdictsFor(board, vehicle, NOW)].map(([place, check]) => [place, check.verdict]);
    expect(said).toEqual([
      ["yard", "asks"],
      [101, "refuses"],
      [102, "asks"],
      [104, "refuses"],
    ]);
    expect([...verdictsFor(board, person, NOW).keys()]).toEqual(["free", 101, 102, 104]);
    expect(checkPlace(board, vehicle, "free", NOW)).toBeNull();
    expect(checkPlace(board, person, "yard", NOW)).toBeNull();
  });
  it("says what letting go does and where it would go", () => {
    const verdicts = verdictsFor(board, vehicle, NOW);
    expect(lettingGo(board, vehicle, 104, verdicts.get(104)!)).toBe("Let go and it stays in Bay 1.");
    expect(lettingGo(board, vehicle, "yard", verdicts.get("yard")!)).toBe("Let go and you are asked first.");
    expect(wherePossible(board, verdicts)).toBe("It would go: the yard or Bay 2.");
  });
  it("is nothing once it has left", () => {
    expect(thingInHand(board, { kind: "vehicle", buildId: 99, by: "drag" })).toBeNull();
  });
});

describe("what changed", () => {
  const moved = (movedBy: string): Board => ({
    ...board,
    revision: 2,
    bays: [{ bay: aBay(2), vehicle: { ...mule, placementId: 11, movedBy } }],
  });
  it("names who moved it, but not to that person", () => {
    expect(changesBetween(board, moved("Ida Kestrel"), "Nell Varga")).toEqual([
      { buildId: 1, words: "Moved by Ida, now" },
    ]);
    expect(changesBetween(board, moved("Ida Kestrel"), "Ida Kestrel")).toEqual([]);
  });
  it("tells of holds, levels and newcomers", () => {
    const hold = { id: 5, kind: "parts", words: "Bolts", placedAt: NOW, dueAt: null } as const;
    const later: Board = { ...board, revision: 2, yard: [{ ...moth, hold }, aVehicle(3)] };
    expect(changesBetween(board, later, "me")).toEqual([
      { buildId: 2, words: "Put on hold, now" },
      { buildId: 3, words: "Booked in, now" },
    ]);
  });
});

describe("what needs the foreman", () => {
  it("puts the hardest first and names a void level once, though it is on hold for it", () => {
    const voided = aVehicle(4, {
      nickname: "Biscuit",
      level: { state: "void", reason: "stand 3 touched", voidedAt: minutesAgo(44), drops: 6 },
      hold: {
        id: 1,
        kind: "level-void",
        words: "Stand 3 was touched",
        placedAt: minutesAgo(44),
        dueAt: null,
      },
    });
    const asked = aVehicle(5, {
      hold: { id: 2, kind: "customer", words: "No answer", placedAt: minutesAgo(142), dueAt: null },
    });
    const parts = aVehicle(6, {
      hold: {
        id: 3,
        kind: "parts",
        words: "4 U-bolts short",
        placedAt: minutesAgo(9),
        dueAt: "2026-12-02T15:00:00.000Z",
      },
    });
    const late = aVehicle(8, { promisedAt: minutesAgo(60) });
    const needs = needsOn(aBoard({ yard: [asked, late, voided, parts] }), NOW, ZONE);
    expect(needs.map((need) => need.buildId)).toEqual([6, 4, 8, 5]);
    expect(needs[0]?.words).toBe("Yard: 4 U-bolts short, due Wed 08:00");
    expect(needs[1]?.title).toBe("Biscuit, level void");
  });
});
