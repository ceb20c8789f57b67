import { describe, expect, it } from "vitest";
import { bayCard, board, boardVehicle } from "#tests/factories/board";
import { applyPatch, vehiclesOn } from "./board";

describe("applyPatch", () => {
  const before = board({
    revision: 7,
    bays: [bayCard({ id: 1 }), bayCard({ id: 2, number: 2 })],
    yard: [boardVehicle()],
  });
  it("lays the changed bays over the old ones and keeps what was left out", () => {
    const after = applyPatch(before, {
      from: 7,
      revision: 8,
      bays: [bayCard({ id: 2, number: 2 }, boardVehicle())],
      yard: [],
    });
    expect(after).toMatchObject({ revision: 8, yard: [] });
    expect(after?.bays[0]).toBe(before.bays[0]);
    expect(after?.bays[1]?.vehicle?.nickname).toBe("Old Mule");
    expect(after?.crew).toBe(before.crew);
  });
  it("takes a patch that begins before what is shown", () => {
    expect(applyPatch(before, { from: 3, revision: 9, bays: [] })?.revision).toBe(9);
  });
  it("changes nothing for a patch that is already shown", () => {
    expect(applyPatch(before, { from: 5, revision: 7, bays: [] })).toBe(before);
  });
  it("says that changes are missing when the patch begins later", () => {
    expect(applyPatch(before, { from: 8, revision: 9, bays: [] })).toBeNull();
  });
});

it("vehiclesOn lists bays, then the yard", () => {
  const list = vehiclesOn(
    board({ bays: [bayCard({ number: 3 }, boardVehicle())], yard: [boardVehicle({ nickname: "Moth" })] }),
  );
  expect(list.map(({ vehicle, bay }) => [vehicle.nickname, bay?.number ?? null])).toEqual([
    ["Old Mule", 3],
    ["Moth", null],
  ]);
});
