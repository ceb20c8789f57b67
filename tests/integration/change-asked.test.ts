import { and, desc, eq } from "drizzle-orm";
import { beforeAll, describe, expect, it } from "vitest";
import { contextFor, makeBuild, makeTestShop, type TestShop } from "#tests/factories";
import { testDatabase } from "#tests/setup/database";
import { type Db, schema } from "~/db/client.server";
import { changeAsked } from "~/services/change-asked.server";
import { askedForm } from "~/validation/book-in";

let db: Db;
let shop: TestShop;
let buildId: number;

beforeAll(async () => {
  db = await testDatabase();
  shop = await makeTestShop(db);
  ({ buildId } = await makeBuild(db, shop.shopId, {
    nickname: "Undersized",
    code: "UXDS",
    by: shop.people.foreman.personId ?? 0,
  }));
});

const typed = (over: Record<string, string> = {}) =>
  askedForm("in").safeParse({
    wanted: "Axle ahead",
    tyre: "35 × 12.5",
    loadedRadius: "16 1/2",
    tyreRadius: "17.5",
    tyreWidth: "12 1/2",
    wheelbase: "",
    approach: "40",
    ...over,
  });
const asked = (over: Record<string, string> = {}) => {
  const read = typed(over);
  if (!read.success) throw new Error(read.error.message);
  return read.data;
};

describe("what was asked for, put right", () => {
  it("is kept as typed, with what it was before in the journal", async () => {
    await changeAsked(contextFor(db, shop.people.counter), buildId, asked());
    const [build] = await db.select().from(schema.builds).where(eq(schema.builds.id, buildId));
    expect(build).toMatchObject({
      loadedRadiusMm: 419.1,
      loadedRadiusTyped: "16 1/2",
      wheelbaseMm: null,
      approachAskedDeg: 40,
    });
    await changeAsked(contextFor(db, shop.people.foreman), buildId, asked({ approach: "" }));
    const [line] = await db
      .select()
      .from(schema.journal)
      .where(and(eq(schema.journal.verb, "change-asked"), eq(schema.journal.subjectId, buildId)))
      .orderBy(desc(schema.journal.id))
      .limit(1);
    expect(line).toMatchObject({ before: { approachAskedDeg: 40 }, after: { approachAskedDeg: null } });
  });
  it("says beside the field what cannot be", () => {
    const faults = (over: Record<string, string>) => {
      const read = typed(over);
      return read.success
        ? []
        : read.error.issues.map((issue) => `${issue.path.join(".")}: ${issue.message}`);
    };
    expect(faults({ loadedRadius: "1/0" })).toEqual(["loadedRadius: 1/0 is not a fraction."]);
    expect(faults({ loadedRadius: "18" })).toEqual([expect.stringMatching(/^loadedRadius: Under load/)]);
    expect(faults({ wanted: " " })).toEqual(["wanted: Write down what the customer wants."]);
    expect(faults({ approach: "steep" })).toEqual(["approach: Whole degrees, from 1 to 89."]);
  });
  it("is not for a technician, nor for another shop", async () => {
    await expect(changeAsked(contextFor(db, shop.people.tech), buildId, asked())).rejects.toMatchObject({
      kind: "forbidden",
    });
    const other = await makeTestShop(db);
    await expect(changeAsked(contextFor(db, other.people.counter), buildId, asked())).rejects.toMatchObject({
      kind: "not-found",
    });
  });
});
