import { describe, expect, it } from "vitest";
import { checkAssign, checkMove } from "../../domain/floor/move-check";
import { aBay, aPerson, aVehicle, minutesAgo, NOW } from "./board.fixture";
import { assignQuestion, levelWords, mouthWord, moveQuestion, personName, vehicleName } from "./words";

const level = {
  state: "true",
  noseHighDeg: 0.04,
  rightHighDeg: 0.01,
  checkedAt: minutesAgo(41),
  drops: 6,
} as const;
const mule = aVehicle(1, { nickname: "Old Mule", level });
const home = aBay(5);

describe("moveQuestion", () => {
  it("names the loss with the level's state and age, and keeps the safe answer first", () => {
    const question = moveQuestion(mule, home, null, checkMove(mule, home, "yard"), NOW);
    expect(question).toEqual({
      title: "Move Old Mule to the yard?",
      loss: ["The level (true, 41 min) and 6 drops are void once it moves."],
      keep: "Keep it in Bay 5",
      go: "Move and void",
    });
  });
  it("speaks of one level in the singular", () => {
    const bare = aVehicle(1, { level: { ...level, drops: 0 } });
    const question = moveQuestion(bare, home, null, checkMove(bare, home, "yard"), NOW);
    expect(question.loss).toEqual(["The level (true, 41 min) is void once it moves."]);
  });
  it("lists the other reasons when nothing is lost", () => {
    const stage = {
      id: 1,
      kind: "weld",
      state: "open",
      bayKinds: ["weld"],
      skill: null,
      heads: 1,
      pieces: null,
    } as const;
    const hatchet = aVehicle(2, { nickname: "Hatchet", stage: { ...stage, bayKinds: ["weld"] } });
    const to = { bay: aBay(3), vehicle: null };
    const check = checkMove(hatchet, null, to);
    const question = moveQuestion(hatchet, null, to.bay, check, NOW);
    expect(question.loss).toEqual(check.reasons.map((reason) => reason.words));
    expect(question.loss).toHaveLength(1);
    expect(question.keep).toBe("Keep it in the yard");
    expect(question.go).toBe("Move it anyway");
  });
});

describe("words at a place", () => {
  it("says in a word why a bay refuses", () => {
    const to = { bay: aBay(4, { lengthMm: 18 * 304.8 }), vehicle: null };
    expect(mouthWord(checkMove(mule, home, to))).toBe("too short");
    expect(mouthWord(checkMove(mule, home, { bay: aBay(2), vehicle: aVehicle(9) }))).toBe("taken");
    expect(mouthWord(checkMove(mule, home, "yard"))).toBe("asks first");
    expect(mouthWord(checkMove(aVehicle(3), null, { bay: aBay(2), vehicle: null }))).toBe("takes it");
  });

  it("names the person's other work before they are taken from it", () => {
    const otis = aPerson(1, { on: { buildId: 9, nickname: "Hatchet", bayNumber: 6, since: NOW } });
    const check = checkAssign(otis, { bay: home, vehicle: mule }, new Date(NOW));
    expect(assignQuestion(otis, mule, check)).toEqual({
      title: "Put Otis on Old Mule?",
      loss: ["Otis Lindqvist is on Hatchet in Bay 6."],
      keep: "Leave Otis on Hatchet",
      go: "Put Otis on it",
    });
  });
});

describe("names", () => {
  it("tells a listener all that the drawing shows", () => {
    const stage = {
      id: 1,
      kind: "layout",
      state: "under-way",
      bayKinds: [],
      skill: null,
      heads: 1,
      pieces: null,
    } as const;
    expect(vehicleName({ ...mule, stage: { ...stage, bayKinds: [] } }, home)).toBe(
      "Old Mule, M3XF, Bay 5, Layout, level true",
    );
    const hold = { id: 1, kind: "parts", words: "4 U-bolts short", placedAt: NOW, dueAt: null } as const;
    expect(vehicleName(aVehicle(2, { hold }), null)).toBe(
      "Vehicle 2, M3XF, Yard, All stages done, on hold: 4 U-bolts short",
    );
  });
  it("says where a person is", () => {
    expect(personName(aPerson(1), NOW)).toBe("Otis Lindqvist, free");
    expect(personName(aPerson(1, { awayUntil: "2026-12-03T14:00:00.000Z" }), NOW)).toBe(
      "Otis Lindqvist, away",
    );
    const on = { buildId: 1, nickname: "Old Mule", bayNumber: 5, since: NOW };
    expect(personName(aPerson(1, { on }), NOW)).toBe("Otis Lindqvist, on Old Mule, Bay 5");
  });
});

describe("levelWords", () => {
  it("gives the larger slope and the age", () => {
    expect(levelWords(level, NOW)).toBe("Level true, 0.04° nose high, checked 41 min ago");
    expect(levelWords({ ...level, noseHighDeg: 0, rightHighDeg: -0.3, state: "not-true" }, NOW)).toBe(
      "Not level, 0.30° left high, checked 41 min ago",
    );
    expect(levelWords({ ...level, noseHighDeg: 0, rightHighDeg: 0.001 }, NOW)).toBe(
      "Level true, checked 41 min ago",
    );
  });
  it("never shows a void level as anything else", () => {
    expect(
      levelWords({ state: "void", reason: "stand 3 touched", voidedAt: minutesAgo(44), drops: 6 }, NOW),
    ).toBe("Level void 44 min: stand 3 touched");
    expect(levelWords({ state: "none" }, NOW)).toBeNull();
  });
});
