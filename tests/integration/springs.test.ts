import { beforeAll, describe, expect, it } from "vitest";
import { contextFor, makeTestShop, type TestShop } from "#tests/factories";
import { testDatabase } from "#tests/setup/database";
import type { Db } from "~/db/client.server";
import { readHangers, readNextRackNumber, readRack } from "~/db/queries/springs.server";
import { readForm } from "~/http/form.server";
import { addSpring, takeOutSpring } from "~/services/add-spring.server";
import { Refusal } from "~/services/errors";
import { springForm } from "~/validation/spring";

let db: Db;
let shop: TestShop;

beforeAll(async () => {
  db = await testDatabase();
  shop = await makeTestShop(db);
});

const entry = (over: Record<string, string> = {}) => {
  const form = new FormData();
  const fields = {
    rackNumber: "31",
    length: "52",
    frontHalf: "24 1/2",
    leaves: "5",
    leafWidth: "2 1/2",
    note: "",
    ...over,
  };
  for (const [name, value] of Object.entries(fields)) form.set(name, value);
  return readForm(form, springForm("in"));
};
const refused = async (work: Promise<unknown>) => {
  const error = await work.then(
    () => null,
    (thrown: unknown) => thrown,
  );
  if (!(error instanceof Refusal)) throw error ?? new Error("It was not refused");
  return error;
};

describe("the spring rack", () => {
  it("takes a spring with what was typed beside what it comes to", async () => {
    const published: number[] = [];
    const { springId } = await addSpring(
      contextFor(db, shop.people.foreman, { publish: (id) => published.push(id) }),
      entry({ note: "from the blue one" }),
    );
    const spring = (await readRack(db, shop.shopId)).find((row) => row.id === springId);
    expect(spring).toMatchObject({
      rackNumber: 31,
      lengthMm: 1320.8,
      frontHalfMm: 622.3,
      frontHalfTyped: "24 1/2",
      leaves: 5,
      note: "from the blue one",
    });
    expect(published).toEqual([shop.shopId]);
  });

  it("does not give one number to two springs, even at the same moment", async () => {
    const ctx = contextFor(db, shop.people.owner);
    const results = await Promise.allSettled([
      addSpring(ctx, entry({ rackNumber: "40" })),
      addSpring(ctx, entry({ rackNumber: "40" })),
    ]);
    expect(results.map((result) => result.status).sort()).toEqual(["fulfilled", "rejected"]);
    const error = await refused(addSpring(ctx, entry({ rackNumber: "40" })));
    expect(error.fields.rackNumber).toBe("Rack 40 holds a spring already.");
  });

  it("keeps the number of a spring that has left", async () => {
    const ctx = contextFor(db, shop.people.foreman);
    const { springId } = await addSpring(ctx, entry({ rackNumber: "41" }));
    await takeOutSpring(ctx, springId);
    expect((await readRack(db, shop.shopId)).map((row) => row.rackNumber)).not.toContain(41);
    expect((await refused(takeOutSpring(ctx, springId))).kind).toBe("conflict");
    expect((await refused(addSpring(ctx, entry({ rackNumber: "41" })))).fields.rackNumber).toMatch(
      /has left/,
    );
    expect(await readNextRackNumber(db, shop.shopId)).toBe(42);
  });

  it("is the shop's own", async () => {
    const other = await makeTestShop(db);
    const error = await refused(takeOutSpring(contextFor(db, other.people.foreman), shop.springs.centred));
    expect(error.kind).toBe("not-found");
    await expect(
      addSpring(contextFor(db, other.people.foreman), entry({ rackNumber: "31" })),
    ).resolves.toBeTruthy();
  });

  it.each(["tech", "counter"] as const)("is not changed by a %s", async (who) => {
    expect(
      (await refused(addSpring(contextFor(db, shop.people[who]), entry({ rackNumber: "50" })))).kind,
    ).toBe("forbidden");
    expect((await refused(takeOutSpring(contextFor(db, shop.people[who]), shop.springs.centred))).kind).toBe(
      "forbidden",
    );
  });

  it("shows the hangers with their holes in order", async () => {
    const [hanger] = await readHangers(db, shop.shopId);
    expect(hanger?.holes.map((hole) => [hole.number, hole.aheadMm])).toEqual([
      [1, 0],
      [2, 25.4],
      [3, 50.8],
    ]);
  });
});
