import { and, eq, isNull } from "drizzle-orm";
import { beforeAll, describe, expect, it } from "vitest";
import { contextFor, makeTestShop, type TestShop } from "#tests/factories";
import { testDatabase } from "#tests/setup/database";
import { type Db, schema } from "~/db/client.server";
import { readYard } from "~/db/queries/board.server";
import { readBuild, readBuildsHere, readStages, readStory } from "~/db/queries/builds.server";
import { lookUpTag } from "~/db/queries/tags.server";
import { BUILD_TEMPLATES } from "~/domain/builds/stages";
import { readForm } from "~/http/form.server";
import { bookIn, momentInShop } from "~/services/book-in.server";
import { Refusal } from "~/services/errors";
import { replaceTag } from "~/services/replace-tag.server";
import { type BookIn, bookInForm } from "~/validation/book-in";

let db: Db;
let shop: TestShop;
let other: TestShop;

beforeAll(async () => {
  db = await testDatabase();
  shop = await makeTestShop(db, { timeZone: "America/Boise" });
  other = await makeTestShop(db);
});

let serial = 0;
const form = (over: Record<string, string> = {}): FormData => {
  const data = new FormData();
  const fields: Record<string, string> = {
    customerId: "",
    customerName: "Rosa Lind",
    customerPhone: "555 0142",
    customerEmail: "",
    kind: "short-bed-pickup",
    nickname: `Mule ${++serial}`,
    length: "15' 9",
    width: "75",
    wanted: "Front axle an inch and a half forward",
    tyre: "35 x 12.5",
    loadedRadius: "16 1/2",
    tyreRadius: "17.5",
    tyreWidth: "",
    wheelbase: "",
    approach: "40",
    promiseDate: "",
    promiseTime: "",
    template: "front-leaf",
    ...Object.fromEntries(BUILD_TEMPLATES["front-leaf"].stages.map((_, index) => [`stage-${index}`, "on"])),
    ...over,
  };
  for (const [name, value] of Object.entries(fields)) data.set(name, value);
  return data;
};
const entry = (over: Record<string, string> = {}): BookIn => readForm(form(over), bookInForm("in"));
const refusal = async (work: Promise<unknown>): Promise<Refusal> => {
  const error = await work.then(
    () => null,
    (thrown: unknown) => thrown,
  );
  if (!(error instanceof Refusal)) throw error ?? new Error("It was not refused");
  return error;
};

describe("booking in", () => {
  it("writes customer, vehicle, tag, build and stages, and stands the vehicle in the yard", async () => {
    const published: number[] = [];
    const ctx = contextFor(db, shop.people.counter, { publish: (id) => published.push(id) });
    const booked = await bookIn(ctx, entry({ nickname: "Old Mule", "stage-0": "on", "hours-0": "2.5" }));

    const build = await readBuild(db, shop.shopId, booked.buildId);
    expect(build).toMatchObject({
      nickname: "Old Mule",
      code: booked.code,
      kind: "short-bed-pickup",
      lengthMm: 4800.6,
      lengthTyped: "15' 9",
      wanted: "Front axle an inch and a half forward",
      asked: {
        tyre: "35 x 12.5",
        loadedRadius: "16 1/2",
        tyreRadius: "17.5",
        tyreWidth: null,
        wheelbase: null,
        approachDeg: 40,
      },
      customer: { name: "Rosa Lind", phone: "555 0142", email: "" },
      bookedInBy: "Cora Counter",
    });
    const stages = await readStages(db, booked.buildId);
    expect(stages.map((stage) => stage.kind)).toEqual(
      BUILD_TEMPLATES["front-leaf"].stages.map((line) => line.kind),
    );
    expect(stages[0]?.hours).toBe(2.5);
    expect(stages.map((stage) => stage.stay)).toEqual(
      BUILD_TEMPLATES["front-leaf"].stages.map((line) => line.stay),
    );

    const yard = await readYard(db, shop.shopId);
    const standing = yard.find((vehicle) => vehicle.buildId === booked.buildId);
    expect(standing).toMatchObject({ code: booked.code, movedBy: "Cora Counter", level: { state: "none" } });
    expect(standing?.stage?.kind).toBe("strip");
    expect(await lookUpTag(db, shop.shopId, booked.code)).toEqual({
      state: "here",
      nickname: "Old Mule",
      buildId: booked.buildId,
      layoutId: null,
    });
    expect(published).toEqual([shop.shopId]);
  });

  it("leaves one line in the journal that tells the yard and the build", async () => {
    const booked = await bookIn(contextFor(db, shop.people.foreman), entry({ nickname: "Storied" }));
    const rows = await db
      .select()
      .from(schema.journal)
      .where(and(eq(schema.journal.shopId, shop.shopId), eq(schema.journal.subjectId, booked.buildId)));
    expect(rows).toHaveLength(1);
    expect(rows[0]).toMatchObject({
      verb: "book-in",
      words: "Storied booked in",
      personId: shop.people.foreman.personId,
    });
    expect(rows[0]?.touches).toEqual([{ kind: "yard" }, { kind: "build", id: booked.buildId }]);
    expect((await readStory(db, shop.shopId, booked.buildId))[0]).toMatchObject({
      by: "Fay Foreman",
      words: "Storied booked in",
    });
  });

  it("keeps which bays a stage may be done in", async () => {
    const booked = await bookIn(contextFor(db, shop.people.counter), entry());
    const level = (await readStages(db, booked.buildId)).find((stage) => stage.kind === "level");
    const kinds = await db
      .select()
      .from(schema.stageBayKinds)
      .where(eq(schema.stageBayKinds.stageId, level?.id ?? 0));
    expect(kinds.map((row) => row.kind)).toEqual(["level-pad"]);
  });

  it("opens only the stages that were left ticked", async () => {
    const fields = form({ nickname: "Partly" });
    fields.delete("stage-3");
    fields.delete("stage-9");
    const booked = await bookIn(contextFor(db, shop.people.counter), readForm(fields, bookInForm("in")));
    const kinds = (await readStages(db, booked.buildId)).map((stage) => stage.kind);
    expect(kinds).not.toContain("approval");
    expect(kinds).not.toContain("road-test");
    expect(kinds).toHaveLength(BUILD_TEMPLATES["front-leaf"].stages.length - 2);
  });

  it("reads the promise on the shop's own clock, summer and winter", async () => {
    expect(momentInShop("2026-01-20", "17:00", "America/Boise").toISOString()).toBe(
      "2026-01-21T00:00:00.000Z",
    );
    expect(momentInShop("2026-07-20", "17:00", "America/Boise").toISOString()).toBe(
      "2026-07-20T23:00:00.000Z",
    );
    const now = () => new Date("2026-07-01T12:00:00.000Z");
    const booked = await bookIn(
      contextFor(db, shop.people.counter, { now }),
      entry({ promiseDate: "2026-07-20", promiseTime: "09:30" }),
    );
    expect((await readBuild(db, shop.shopId, booked.buildId))?.promisedAt).toBe("2026-07-20T15:30:00.000Z");
  });

  it("refuses a promise in the past beside its field", async () => {
    const error = await refusal(
      bookIn(contextFor(db, shop.people.counter), entry({ promiseDate: "2020-01-01" })),
    );
    expect(error.kind).toBe("invalid");
    expect(error.fields.promiseDate).toMatch(/in the past/);
  });
});

describe("the customer", () => {
  it("is taken from the shop's own", async () => {
    const first = await bookIn(contextFor(db, shop.people.counter), entry({ customerName: "Abel Quist" }));
    const [customer] = await db
      .select()
      .from(schema.customers)
      .where(and(eq(schema.customers.shopId, shop.shopId), eq(schema.customers.name, "Abel Quist")));
    const second = await bookIn(
      contextFor(db, shop.people.counter),
      entry({ customerId: String(customer?.id), customerName: "" }),
    );
    expect(second.buildId).not.toBe(first.buildId);
    expect((await readBuild(db, shop.shopId, second.buildId))?.customer.name).toBe("Abel Quist");
    const all = await db.select().from(schema.customers).where(eq(schema.customers.name, "Abel Quist"));
    expect(all.filter((row) => row.shopId === shop.shopId)).toHaveLength(1);
  });

  it("of another shop is refused, and nothing is written", async () => {
    const [theirs] = await db
      .insert(schema.customers)
      .values({ shopId: other.shopId, name: "Their Customer", createdAt: new Date() })
      .$returningId();
    const before = await readBuildsHere(db, shop.shopId);
    const error = await refusal(
      bookIn(
        contextFor(db, shop.people.counter),
        entry({ customerId: String(theirs?.id), customerName: "" }),
      ),
    );
    expect(error.kind).toBe("not-found");
    expect(error.fields.customerId).toBeTruthy();
    expect(error.message).not.toContain("Their Customer");
    expect(await readBuildsHere(db, shop.shopId)).toEqual(before);
  });
});

describe("a second press of the button", () => {
  it("does not book the vehicle in twice, even at the same moment", async () => {
    const ctx = contextFor(db, shop.people.counter);
    const what = entry({ nickname: "Twice", customerName: "Pat Double" });
    const results = await Promise.allSettled([bookIn(ctx, what), bookIn(ctx, what), bookIn(ctx, what)]);
    expect(results.filter((result) => result.status === "fulfilled")).toHaveLength(1);
    const refused = results.flatMap((result) =>
      result.status === "rejected" ? [result.reason as Refusal] : [],
    );
    for (const error of refused) {
      expect(error.status).toBe(409);
      expect(error.message).toMatch(/^Twice was booked in a moment ago/);
    }
    const twins = (await readBuildsHere(db, shop.shopId)).filter((row) => row.nickname === "Twice");
    expect(twins).toHaveLength(1);
  });

  it("a minute later is a visit of its own", async () => {
    const what = entry({ nickname: "Again", customerName: "Pat Double" });
    const at = (iso: string) => contextFor(db, shop.people.counter, { now: () => new Date(iso) });
    await bookIn(at("2026-03-02T10:00:00.000Z"), what);
    await expect(bookIn(at("2026-03-02T10:00:40.000Z"), what)).rejects.toThrow(/a moment ago/);
    await expect(bookIn(at("2026-03-02T10:01:01.000Z"), what)).resolves.toMatchObject({
      words: "Again booked in",
    });
  });
});

describe("the tag", () => {
  const codes = (...list: (string | null)[]) => {
    let at = 0;
    return () => list[at++] ?? null;
  };

  it("gets another code when the first is in use, an old tag's included", async () => {
    const mine = contextFor(db, other.people.counter);
    const first = await bookIn(mine, entry(), codes("M3XF"));
    const second = await bookIn(mine, entry(), codes("M3XF", null, "M3XF", "K7RD"));
    expect(second.code).toBe("K7RD");
    const replaced = await replaceTag(mine, { buildId: first.buildId, code: "M3XF" }, codes("K7RD", "H4KE"));
    expect(replaced.code).toBe("H4KE");
    expect((await bookIn(mine, entry(), codes("M3XF", "T6XY"))).code).toBe("T6XY");
  });

  it("of one shop may be that of another, and leads only within its own", async () => {
    const fresh = await makeTestShop(db);
    const booked = await bookIn(
      contextFor(db, fresh.people.counter),
      entry({ nickname: "Namesake" }),
      codes("K7RD"),
    );
    expect(await lookUpTag(db, fresh.shopId, "K7RD")).toMatchObject({ state: "here", nickname: "Namesake" });
    expect(await lookUpTag(db, other.shopId, "K7RD")).not.toMatchObject({ nickname: "Namesake" });
    expect(await readBuild(db, other.shopId, booked.buildId)).toBeNull();
  });

  it("that was replaced says so, and is not replaced twice", async () => {
    const fresh = await makeTestShop(db);
    const ctx = contextFor(db, fresh.people.tech);
    const booked = await bookIn(
      contextFor(db, fresh.people.counter),
      entry({ nickname: "Torn" }),
      codes("M3XF"),
    );
    const race = await Promise.allSettled([
      replaceTag(ctx, { buildId: booked.buildId, code: "M3XF" }, codes("K7RD")),
      replaceTag(ctx, { buildId: booked.buildId, code: "M3XF" }, codes("H4KE")),
    ]);
    expect(race.map((result) => result.status).sort()).toEqual(["fulfilled", "rejected"]);
    expect(await lookUpTag(db, fresh.shopId, "M3XF")).toMatchObject({ state: "replaced", nickname: "Torn" });
    const hanging = await db
      .select()
      .from(schema.tags)
      .where(and(eq(schema.tags.shopId, fresh.shopId), isNull(schema.tags.replacedAt)));
    expect(hanging).toHaveLength(1);
  });
});

describe("who may", () => {
  it.each(["tech", "welder"] as const)("a technician (%s) does not book in", async (who) => {
    expect((await refusal(bookIn(contextFor(db, shop.people[who]), entry()))).kind).toBe("forbidden");
  });
});

describe("a form with faults", () => {
  it("names every field at once", () => {
    const bad = form({
      customerName: "",
      kind: "boat",
      nickname: "",
      length: "long",
      width: "",
      wanted: "",
      approach: "95",
      template: "none",
    });
    try {
      readForm(bad, bookInForm("in"));
      expect.unreachable();
    } catch (error) {
      if (!(error instanceof Refusal)) throw error;
      expect(error.status).toBe(400);
      expect(Object.keys(error.fields).sort()).toEqual(
        ["approach", "customerName", "kind", "length", "nickname", "template", "wanted", "width"].sort(),
      );
    }
  });
});
