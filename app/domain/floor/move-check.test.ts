import { describe, expect, it } from "vitest";
import { bayCard, boardBay, boardVehicle, crewCard, levelTrue } from "#tests/factories/board";
import { checkAssign, checkMove, wouldVoid } from "./move-check";

const NOW = new Date("2026-12-01T10:00:00Z");
const words = (check: { reasons: { words: string }[] }) => check.reasons.map((reason) => reason.words);

describe("checkMove", () => {
  it("takes a vehicle that fits an empty bay fit for its stage", () => {
    expect(checkMove(boardVehicle(), null, bayCard())).toMatchObject({
      verdict: "takes",
      reasons: [],
      overMm: 0,
    });
  });
  it("refuses a taken bay and names who stands there", () => {
    const check = checkMove(
      boardVehicle(),
      null,
      bayCard({ number: 7 }, boardVehicle({ buildId: 11, nickname: "Sunday" })),
    );
    expect(check.verdict).toBe("refuses");
    expect(words(check)).toEqual(["Bay 7 is taken by Sunday."]);
  });
  it("refuses a bay that is too short, says by which lengths, and how far it would stand out", () => {
    const check = checkMove(boardVehicle(), null, bayCard({ number: 4, lengthMm: 18 * 304.8 }));
    expect(check.verdict).toBe("refuses");
    expect(words(check)).toEqual(["Bay 4 is 18 ft: vehicle is 19 ft 2 in."]);
    expect(check.overMm).toBeCloseTo(14 * 25.4, 6);
  });
  it("takes a vehicle exactly as long as the bay", () => {
    expect(checkMove(boardVehicle(), null, bayCard({ lengthMm: 230 * 25.4 })).verdict).toBe("takes");
  });
  it("refuses a bay that is too narrow", () => {
    expect(words(checkMove(boardVehicle(), null, bayCard({ widthMm: 6 * 304.8 })))).toEqual([
      "Bay 1 is 6 ft wide: vehicle is 6 ft 4 in.",
    ]);
  });
  it("asks before a bay of a kind that the stage cannot use", () => {
    const check = checkMove(
      boardVehicle(),
      null,
      bayCard({ number: 2, kind: "lift", ratedForLayout: false }),
    );
    expect(check.verdict).toBe("asks");
    expect(words(check)).toEqual(["Layout needs a level pad; Bay 2 is a lift."]);
  });
  it("asks before a level pad whose floor is not rated", () => {
    const check = checkMove(boardVehicle(), null, bayCard({ ratedForLayout: false }));
    expect(check).toMatchObject({ verdict: "asks" });
    expect(words(check)).toEqual(["The floor of Bay 1 is not rated for layout."]);
  });
  it("asks before a move that voids a standing level, naming the drops, wherever it goes", () => {
    const levelled = boardVehicle({ level: levelTrue(6) });
    for (const to of ["yard", bayCard({ id: 2, number: 2 })] as const) {
      const check = checkMove(levelled, boardBay(), to);
      expect(check).toMatchObject({ verdict: "asks", voidsLevel: true });
      expect(words(check)).toContain("Voids the level and 6 drops.");
    }
  });
  it("gives every reason at once, what refuses first", () => {
    const check = checkMove(
      boardVehicle({ level: levelTrue(1) }),
      boardBay(),
      bayCard({ id: 4, number: 4, kind: "lift", lengthMm: 18 * 304.8, ratedForLayout: false }),
    );
    expect(check.reasons.map((reason) => reason.rule)).toEqual(["too-long", "bay-kind", "voids-level"]);
    expect(words(check)).toContain("Voids the level and 1 drop.");
  });
  it("does not count a void level as standing", () => {
    const level = {
      state: "void",
      reason: "stand 3 touched",
      voidedAt: NOW.toISOString(),
      drops: 4,
    } as const;
    expect(wouldVoid(boardVehicle({ level }))).toBeNull();
    expect(checkMove(boardVehicle({ level }), boardBay(), "yard").verdict).toBe("takes");
  });
  it("asks before moving a vehicle that is held for safety", () => {
    const hold = {
      id: 1,
      kind: "safety",
      words: "Jack under it",
      placedAt: NOW.toISOString(),
      dueAt: null,
    } as const;
    expect(words(checkMove(boardVehicle({ hold }), boardBay(), "yard"))).toEqual([
      "On hold for safety: Jack under it",
    ]);
  });
  it("refuses the place where it stands", () => {
    expect(checkMove(boardVehicle(), boardBay(), bayCard()).reasons[0]).toMatchObject({
      rule: "same",
      verdict: "refuses",
    });
    expect(words(checkMove(boardVehicle(), null, "yard"))).toEqual(["It stands in the yard already."]);
  });
});

describe("checkAssign", () => {
  const target = bayCard({ number: 5 }, boardVehicle());
  it("takes a free person with the skill", () => {
    expect(checkAssign(crewCard(), target, NOW).verdict).toBe("takes");
  });
  it("refuses an empty bay", () => {
    expect(words(checkAssign(crewCard(), bayCard({ number: 4 }), NOW))).toEqual(["Nothing stands in Bay 4."]);
  });
  it("refuses somebody who is away, until they are back", () => {
    expect(checkAssign(crewCard({ awayUntil: "2026-12-01T10:00:01Z" }), target, NOW).verdict).toBe("refuses");
    expect(checkAssign(crewCard({ awayUntil: "2026-12-01T10:00:00Z" }), target, NOW).verdict).toBe("takes");
  });
  it("asks before taking a person from another vehicle", () => {
    const on = { buildId: 99, nickname: "Hatchet", bayNumber: 6, since: NOW.toISOString() };
    const check = checkAssign(crewCard({ on }), target, NOW);
    expect(check.verdict).toBe("asks");
    expect(words(check)).toEqual(["Wes Tolliver is on Hatchet in Bay 6."]);
  });
  it("asks when the skill is missing, and says whether anybody else has the work in hand", () => {
    expect(words(checkAssign(crewCard({ skills: [] }), target, NOW))).toEqual([
      "Wes Tolliver has no layout skill, and nobody else is on it.",
    ]);
  });
  it("refuses to put somebody without the weld skill on a weld", () => {
    const weld = boardVehicle({
      stage: {
        id: 2,
        kind: "weld",
        state: "open",
        bayKinds: ["weld"],
        skill: "weld",
        heads: 1,
        pieces: null,
      },
    });
    expect(checkAssign(crewCard(), bayCard({ kind: "weld" }, weld), NOW).verdict).toBe("refuses");
  });
});
