import { describe, expect, it } from "vitest";
import { AssignPersonForm, HoldForm, MoveVehicleForm, SetStageForm } from "./floor";

describe("moves", () => {
  it("reads an empty bay as the yard", () => {
    expect(MoveVehicleForm.parse({ buildId: "4", placementId: "9", toBayId: "" })).toEqual({
      buildId: 4,
      placementId: 9,
      toBayId: null,
      confirmed: false,
    });
  });
  it("reads only 1 as confirmed", () => {
    const form = { personId: "2", toBuildId: "7" };
    expect(AssignPersonForm.parse({ ...form, confirmed: "1" }).confirmed).toBe(true);
    expect(AssignPersonForm.parse({ ...form, confirmed: "yes" }).confirmed).toBe(false);
  });
  it.each(["0", "-3", "1.5", "two"])("refuses %s as an id", (buildId) =>
    expect(MoveVehicleForm.safeParse({ buildId, placementId: "1", toBayId: "" }).success).toBe(false),
  );
});

describe("holds and stages", () => {
  it("asks for words when a hold is placed, not when it is lifted", () => {
    expect(HoldForm.safeParse({ action: "lift", buildId: "1" }).success).toBe(true);
    const bare = HoldForm.safeParse({ action: "place", buildId: "1", kind: "parts", words: "  " });
    expect(bare.error?.issues[0]?.path).toEqual(["words"]);
  });
  it("knows no way back to open", () => {
    expect(SetStageForm.safeParse({ stageId: "1", state: "open" }).success).toBe(false);
  });
});
