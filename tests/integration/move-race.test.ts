import { and, eq, sql } from "drizzle-orm";
import { beforeAll, describe, expect, it } from "vitest";
import { contextFor, type MadeBuild, makeBuild, makeTestShop, type TestShop } from "#tests/factories";
import { testDatabase } from "#tests/setup/database";
import { type Db, schema } from "~/db/client.server";
import { readBoard } from "~/db/queries/board.server";
import { OPEN_END } from "~/db/schema";
import { Refusal } from "~/services/errors";
import { moveVehicle } from "~/services/move-vehicle.server";

let db: Db;
let shop: TestShop;
let serial = 0;
const code = () => `T${(++serial).toString(36).padStart(3, "0")}`;
const build = (over: Partial<Parameters<typeof makeBuild>[2]> = {}) =>
  makeBuild(db, shop.shopId, {
    nickname: `Racer ${serial}`,
    code: code(),
    kind: "two-door-utility",
    by: shop.people.foreman.personId ?? 0,
    ...over,
  });

/** What each attempt came to: "moved", or the kind of its refusal. Anything else fails the test. */
const outcomes = async (attempts: Promise<unknown>[]) =>
  (await Promise.allSettled(attempts)).map((result) => {
    if (result.status === "fulfilled") return "moved";
    if (result.reason instanceof Refusal) return result.reason.kind;
    throw result.reason;
  });

const overlaps = async (table: "placements" | "spells", key: "bay_id" | "build_id" | "person_id") => {
  const [rows] = (await db.execute(
    sql.raw(
      `select count(*) as n from ${table} a join ${table} b on a.id < b.id and a.${key} = b.${key}
       and a.from_at < b.until_at and b.from_at < a.until_at where a.shop_id = ${shop.shopId}`,
    ),
  )) as unknown as [{ n: number }[]];
  return Number(rows[0]?.n);
};

describe("many moves at once", () => {
  beforeAll(async () => {
    db = await testDatabase();
    shop = await makeTestShop(db);
  });

  it("lets exactly one vehicle into a bay", async () => {
    const ROUNDS = 12;
    for (let round = 0; round < ROUNDS; round++) {
      const racers: MadeBuild[] = [];
      for (let i = 0; i < 8; i++) racers.push(await build());
      const results = await outcomes(
        racers.map((racer, i) =>
          moveVehicle(contextFor(db, i % 2 ? shop.people.foreman : shop.people.foreman2), {
            buildId: racer.buildId,
            placementId: racer.placementId,
            toBayId: shop.bays[4],
            confirmed: true,
          }),
        ),
      );
      expect(results.filter((result) => result === "moved")).toHaveLength(1);
      expect(results.filter((result) => result === "conflict")).toHaveLength(7);
      const board = await readBoard(db, shop.shopId, new Date());
      const standing = board.bays.find((card) => card.bay.id === shop.bays[4])?.vehicle;
      expect(standing).toBeTruthy();
      await moveVehicle(contextFor(db, shop.people.foreman), {
        buildId: standing?.buildId ?? 0,
        placementId: standing?.placementId ?? 0,
        toBayId: null,
        confirmed: true,
      });
    }
    expect(await overlaps("placements", "bay_id")).toBe(0);
    expect(await overlaps("placements", "build_id")).toBe(0);
  });

  it("lets one of two foremen move a vehicle and tells the other who did", async () => {
    const racer = await build({ nickname: "Tug" });
    const move = (person: "foreman" | "foreman2", toBayId: number) =>
      moveVehicle(contextFor(db, shop.people[person]), {
        buildId: racer.buildId,
        placementId: racer.placementId,
        toBayId,
        confirmed: true,
      });
    const results = await Promise.allSettled([move("foreman", shop.bays[1]), move("foreman2", shop.bays[2])]);
    const lost = results.find((result) => result.status === "rejected") as PromiseRejectedResult;
    expect(results.filter((result) => result.status === "fulfilled")).toHaveLength(1);
    expect(lost.reason).toBeInstanceOf(Refusal);
    expect((lost.reason as Refusal).message).toMatch(/^F(ay|inn) Foreman has just moved Tug to Bay [12]\.$/);
    expect((lost.reason as Refusal).detail).toEqual({ moved: true });
  });

  it("keeps one journal row and one revision for each move that happened", async () => {
    const before = await readBoard(db, shop.shopId, new Date());
    const racers = await Promise.all([build(), build(), build()]);
    await outcomes(
      racers.map((racer) =>
        moveVehicle(contextFor(db, shop.people.foreman), {
          buildId: racer.buildId,
          placementId: racer.placementId,
          toBayId: shop.bays[5],
          confirmed: true,
        }),
      ),
    );
    const after = await readBoard(db, shop.shopId, new Date());
    expect(after.revision).toBe(before.revision + 1);
    const rows = await db
      .select()
      .from(schema.journal)
      .where(and(eq(schema.journal.shopId, shop.shopId), eq(schema.journal.revision, after.revision)));
    expect(rows).toHaveLength(1);
    expect(rows[0]).toMatchObject({ verb: "move-vehicle", personId: shop.people.foreman.personId });
  });

  it("is refused by the database itself, whatever the code does", async () => {
    const first = await build({ bayId: null });
    const second = await build({ bayId: null });
    const bay = shop.bays[3];
    const values = (made: MadeBuild) => ({
      shopId: shop.shopId,
      buildId: made.buildId,
      bayId: bay,
      fromAt: new Date("2030-01-01T08:00:00Z"),
      untilAt: new Date("2030-01-01T10:00:00Z"),
      movedBy: shop.people.foreman.personId ?? 0,
    });
    await db.delete(schema.placements).where(eq(schema.placements.id, first.placementId));
    await db.delete(schema.placements).where(eq(schema.placements.id, second.placementId));
    await db.insert(schema.placements).values(values(first));
    await expect(db.insert(schema.placements).values(values(second))).rejects.toMatchObject({
      cause: { errno: 1062 },
    });
    // Half open: one ends as the other begins.
    await db
      .insert(schema.placements)
      .values({ ...values(second), fromAt: new Date("2030-01-01T10:00:00Z"), untilAt: OPEN_END });
    await expect(
      db.insert(schema.placements).values({ ...values(first), untilAt: new Date("2030-01-01T08:00:00Z") }),
    ).rejects.toMatchObject({ cause: { errno: 4025 } });
  });

  it("never changes or deletes a journal row", async () => {
    await expect(
      db
        .update(schema.journal)
        .set({ words: "nothing happened" })
        .where(eq(schema.journal.shopId, shop.shopId)),
    ).rejects.toMatchObject({ cause: { sqlMessage: "The journal is never changed" } });
    await expect(
      db.delete(schema.journal).where(eq(schema.journal.shopId, shop.shopId)),
    ).rejects.toMatchObject({
      cause: { sqlMessage: "The journal is never deleted from" },
    });
  });
});
