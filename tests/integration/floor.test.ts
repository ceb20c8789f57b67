import { and, eq } from "drizzle-orm";
import { beforeEach, describe, expect, it } from "vitest";
import {
  contextFor,
  type MadeBuild,
  makeBuild,
  makeTestShop,
  putOn,
  type TestPerson,
  type TestShop,
} from "#tests/factories";
import { testDatabase } from "#tests/setup/database";
import { type Db, schema } from "~/db/client.server";
import { readBoard } from "~/db/queries/board.server";
import { assignPerson } from "~/services/assign-person.server";
import { holdBuild } from "~/services/hold-build.server";
import { moveVehicle } from "~/services/move-vehicle.server";
import { undoFloor } from "~/services/undo-floor.server";

let db: Db;
let shop: TestShop;
let mule: MadeBuild;
let serial = 0;

const build = (over: Partial<Parameters<typeof makeBuild>[2]> = {}) =>
  makeBuild(db, shop.shopId, {
    nickname: "Old Mule",
    code: `F${(++serial).toString(36).padStart(3, "0")}`,
    by: shop.people.foreman.personId ?? 0,
    ...over,
  });
const as = (person: TestPerson) => contextFor(db, person);
const standing = async (buildId: number) => {
  const board = await readBoard(db, shop.shopId, new Date());
  for (const card of board.bays)
    if (card.vehicle?.buildId === buildId) return { bay: card.bay.number, vehicle: card.vehicle };
  const inYard = board.yard.find((vehicle) => vehicle.buildId === buildId);
  if (!inYard) throw new Error("It stands nowhere");
  return { bay: null, vehicle: inYard };
};
const move = async (who: TestPerson, buildId: number, toBayId: number | null, confirmed = false) =>
  moveVehicle(as(who), {
    buildId,
    placementId: (await standing(buildId)).vehicle.placementId,
    toBayId,
    confirmed,
  });
/** Rows straight into the tables: a level that stands, with so many drops. */
async function level(buildId: number, bayId: number, drops: number) {
  const by = shop.people.tech.personId ?? 0;
  const at = new Date();
  const base = { shopId: shop.shopId };
  const [layout] = await db
    .insert(schema.layouts)
    .values({
      ...base,
      buildId,
      kind: "front-leaf",
      fixedEye: "ahead",
      bayId,
      hangerId: shop.hangerId,
      startedBy: by,
      startedAt: at,
    })
    .$returningId();
  const layoutId = layout?.id ?? 0;
  const [check] = await db
    .insert(schema.levelChecks)
    .values({
      ...base,
      layoutId,
      bayId,
      method: "heights",
      noseHighDeg: 0.02,
      rightHighDeg: 0,
      allowedDeg: 0.1,
      isTrue: true,
      madeBy: by,
      madeAt: at,
    })
    .$returningId();
  for (let i = 0; i < drops; i++) {
    const [drop] = await db
      .insert(schema.drops)
      .values({ ...base, layoutId, point: `p${i}`, side: "left" })
      .$returningId();
    await db.insert(schema.dropReadings).values({
      ...base,
      dropId: drop?.id ?? 0,
      levelCheckId: check?.id ?? 0,
      clientKey: crypto.randomUUID(),
      method: "offset",
      xMm: i,
      yMm: i,
      takenBy: by,
      takenAt: at,
    });
  }
  return { layoutId, levelCheckId: check?.id ?? 0 };
}

beforeEach(async () => {
  db = await testDatabase();
  shop = await makeTestShop(db);
  mule = await build({ at: "layout", atState: "open" });
});

describe("moving a vehicle", () => {
  it("puts it in the bay and tells who moved it", async () => {
    expect(await move(shop.people.foreman, mule.buildId, shop.bays[1])).toEqual({
      words: "Old Mule to Bay 1",
      voided: false,
    });
    expect(await standing(mule.buildId)).toMatchObject({ bay: 1, vehicle: { movedBy: "Fay Foreman" } });
  });
  it.each([["a bay that is too short", 3 as const, /^Bay 3 is 12 ft: vehicle is 19 ft 2 in\./]])(
    "refuses %s",
    async (_, bay, words) => {
      await expect(move(shop.people.foreman, mule.buildId, shop.bays[bay], true)).rejects.toMatchObject({
        kind: "conflict",
        message: expect.stringMatching(words),
      });
    },
  );
  it("refuses a taken bay", async () => {
    await build({ nickname: "Sunday", kind: "open-top", bayId: shop.bays[1] });
    await expect(move(shop.people.foreman, mule.buildId, shop.bays[1], true)).rejects.toMatchObject({
      kind: "conflict",
      message: "Bay 1 is taken by Sunday.",
    });
  });
  it("asks before a bay that its stage cannot use, and goes when told to", async () => {
    await expect(move(shop.people.foreman, mule.buildId, shop.bays[4])).rejects.toMatchObject({
      kind: "ask-first",
      message: "Layout needs a level pad; Bay 4 is a lift.",
      detail: { check: { verdict: "asks" } },
    });
    expect((await standing(mule.buildId)).bay).toBeNull();
    await move(shop.people.foreman, mule.buildId, shop.bays[4], true);
    expect((await standing(mule.buildId)).bay).toBe(4);
  });
  it("asks before it voids a level, names what goes, and voids it then", async () => {
    await move(shop.people.foreman, mule.buildId, shop.bays[1]);
    const { levelCheckId } = await level(mule.buildId, shop.bays[1], 6);
    await expect(move(shop.people.foreman, mule.buildId, null)).rejects.toMatchObject({
      kind: "ask-first",
      message: "Voids the level and 6 drops.",
    });
    expect((await standing(mule.buildId)).vehicle.level.state).toBe("true");
    expect(await move(shop.people.foreman, mule.buildId, null, true)).toMatchObject({ voided: true });
    expect((await standing(mule.buildId)).vehicle.level).toMatchObject({
      state: "void",
      reason: "rolled out to the yard",
      drops: 6,
    });
    const [check] = await db.select().from(schema.levelChecks).where(eq(schema.levelChecks.id, levelCheckId));
    expect(check).toMatchObject({ voidedBy: shop.people.foreman.personId });
    // The readings stay in the record as they were.
    expect(
      await db.select().from(schema.dropReadings).where(eq(schema.dropReadings.levelCheckId, levelCheckId)),
    ).toHaveLength(6);
  });
  it("lets its crew go when it leaves for the yard, and keeps them from bay to bay", async () => {
    await move(shop.people.foreman, mule.buildId, shop.bays[1]);
    await putOn(db, shop.shopId, shop.people.tech.personId ?? 0, mule.buildId, new Date(Date.now() - 60_000));
    await move(shop.people.foreman, mule.buildId, shop.bays[2]);
    expect((await standing(mule.buildId)).vehicle.crew).toHaveLength(1);
    await move(shop.people.foreman, mule.buildId, null);
    expect((await standing(mule.buildId)).vehicle.crew).toEqual([]);
  });
  it.each(["tech", "counter"] as const)("is not for a %s", async (role) => {
    await expect(move(shop.people[role], mule.buildId, shop.bays[1])).rejects.toMatchObject({
      kind: "forbidden",
    });
  });
  it("does not reach into another shop", async () => {
    const other = await makeTestShop(db);
    await expect(
      moveVehicle(as(other.people.foreman), {
        buildId: mule.buildId,
        placementId: mule.placementId,
        toBayId: other.bays[1],
        confirmed: true,
      }),
    ).rejects.toMatchObject({ kind: "not-found" });
    await expect(move(shop.people.foreman, mule.buildId, other.bays[1], true)).rejects.toMatchObject({
      kind: "not-found",
    });
  });
});

describe("assigning a person", () => {
  const assign = (who: TestPerson, person: TestPerson, toBuildId: number | null, confirmed = false) =>
    assignPerson(as(who), { personId: person.personId ?? 0, toBuildId, confirmed });

  beforeEach(() => move(shop.people.foreman, mule.buildId, shop.bays[1]));

  it("puts a person on a vehicle and takes them off again", async () => {
    await assign(shop.people.foreman, shop.people.tech, mule.buildId);
    expect((await standing(mule.buildId)).vehicle.crew).toMatchObject([{ name: "Tess Tech" }]);
    await assign(shop.people.foreman, shop.people.tech, null);
    expect((await standing(mule.buildId)).vehicle.crew).toEqual([]);
  });
  it("asks before taking somebody from another vehicle, and never has them on two", async () => {
    const other = await build({ nickname: "Sunday", kind: "open-top", bayId: shop.bays[4], at: "layout" });
    await assign(shop.people.foreman, shop.people.tech, mule.buildId);
    await expect(assign(shop.people.foreman, shop.people.tech, other.buildId)).rejects.toMatchObject({
      kind: "ask-first",
      message: "Tess Tech is on Old Mule in Bay 1.",
    });
    await assign(shop.people.foreman, shop.people.tech, other.buildId, true);
    expect((await standing(mule.buildId)).vehicle.crew).toEqual([]);
    expect((await standing(other.buildId)).vehicle.crew).toHaveLength(1);
  });
  it("asks when the skill is missing", async () => {
    await expect(assign(shop.people.foreman, shop.people.tech2, mule.buildId)).rejects.toMatchObject({
      kind: "ask-first",
      message: "Tom Tech has no layout skill, and nobody else is on it.",
    });
  });
  it("refuses somebody without the weld skill on a weld, even when told to", async () => {
    const weld = await build({ nickname: "Hatchet", kind: "bare-chassis", bayId: shop.bays[5], at: "weld" });
    await expect(assign(shop.people.foreman, shop.people.tech, weld.buildId, true)).rejects.toMatchObject({
      kind: "conflict",
    });
    await assign(shop.people.foreman, shop.people.welder, weld.buildId);
  });
  it("puts one person in one place, however many foremen try at once", async () => {
    const others = [
      mule,
      await build({ nickname: "B", kind: "open-top", bayId: shop.bays[4] }),
      await build({ nickname: "C", bayId: shop.bays[5] }),
    ];
    await Promise.allSettled(
      others.flatMap((target) => [
        assign(shop.people.foreman, shop.people.tech, target.buildId, true),
        assign(shop.people.foreman2, shop.people.tech, target.buildId, true),
      ]),
    );
    const board = await readBoard(db, shop.shopId, new Date());
    expect(
      board.bays.flatMap((card) => card.vehicle?.crew ?? []).filter((c) => c.name === "Tess Tech"),
    ).toHaveLength(1);
  });
});

describe("undo", () => {
  it("takes back one's own last change, one after the other", async () => {
    await move(shop.people.foreman, mule.buildId, shop.bays[1]);
    await assignPerson(as(shop.people.foreman), {
      personId: shop.people.tech.personId ?? 0,
      toBuildId: mule.buildId,
      confirmed: true,
    });
    expect(await undoFloor(as(shop.people.foreman))).toEqual({ words: "Undone: Tess Tech to Bay 1." });
    expect((await standing(mule.buildId)).vehicle.crew).toEqual([]);
    expect(await undoFloor(as(shop.people.foreman))).toEqual({ words: "Old Mule is back in the yard." });
    expect((await standing(mule.buildId)).bay).toBeNull();
    await expect(undoFloor(as(shop.people.foreman))).rejects.toMatchObject({
      message: "You have nothing to undo.",
    });
  });
  it("leaves other people's changes alone", async () => {
    await move(shop.people.foreman, mule.buildId, shop.bays[1]);
    await expect(undoFloor(as(shop.people.foreman2))).rejects.toMatchObject({
      message: "You have nothing to undo.",
    });
  });
  it("refuses when somebody built on it, in words", async () => {
    await move(shop.people.foreman, mule.buildId, shop.bays[1]);
    await move(shop.people.foreman2, mule.buildId, shop.bays[2]);
    await expect(undoFloor(as(shop.people.foreman))).rejects.toMatchObject({
      kind: "conflict",
      message: "Not undone: Old Mule to Bay 2 came after it.",
    });
  });
  it("brings the vehicle back but not its level", async () => {
    await move(shop.people.foreman, mule.buildId, shop.bays[1]);
    await level(mule.buildId, shop.bays[1], 2);
    await move(shop.people.foreman, mule.buildId, null, true);
    expect(await undoFloor(as(shop.people.foreman))).toEqual({
      words: "Old Mule is back in Bay 1. Its level stays void: level again.",
    });
    expect(await standing(mule.buildId)).toMatchObject({ bay: 1, vehicle: { level: { state: "void" } } });
  });
  it("does not undo a move when the vehicle was levelled since", async () => {
    await move(shop.people.foreman, mule.buildId, shop.bays[1]);
    await level(mule.buildId, shop.bays[1], 0);
    await expect(undoFloor(as(shop.people.foreman))).rejects.toMatchObject({
      message: expect.stringContaining("was levelled since"),
    });
  });
});

describe("holds", () => {
  it("place and lift, once each", async () => {
    const place = { kind: "parts", words: "4 U-bolts short", dueAt: null } as const;
    await holdBuild(as(shop.people.tech), { buildId: mule.buildId, place });
    expect((await standing(mule.buildId)).vehicle.hold).toMatchObject({ words: "4 U-bolts short" });
    await expect(holdBuild(as(shop.people.tech), { buildId: mule.buildId, place })).rejects.toMatchObject({
      kind: "conflict",
    });
    await holdBuild(as(shop.people.foreman), { buildId: mule.buildId, place: null });
    await expect(
      holdBuild(as(shop.people.foreman), { buildId: mule.buildId, place: null }),
    ).rejects.toMatchObject({ kind: "conflict" });
  });
  it("are journalled with who and what", async () => {
    await holdBuild(as(shop.people.tech), {
      buildId: mule.buildId,
      place: { kind: "safety", words: "Stand cracked", dueAt: null },
    });
    const [row] = await db
      .select()
      .from(schema.journal)
      .where(and(eq(schema.journal.shopId, shop.shopId), eq(schema.journal.verb, "place-hold")));
    expect(row).toMatchObject({
      personId: shop.people.tech.personId,
      before: null,
      after: { words: "Stand cracked" },
    });
  });
});
