import { and, eq } from "drizzle-orm";
import type { TestPerson } from "#tests/factories";
import { type Db, schema } from "~/db/client.server";
import type { Role } from "~/domain/people/roles";
import { makeDemoShop } from "../../server/seed/demo-shop";

export type Demo = {
  shopId: number;
  person: (role: Role) => Promise<TestPerson>;
  display: TestPerson;
  /** A build's id by nickname. */
  build: (nickname: string) => Promise<number>;
  /** Its newest layout's id. */
  layout: (nickname: string) => Promise<number>;
};

/** The demo shop, made when the database has none. */
export async function demoShop(db: Db): Promise<Demo> {
  const find = async () => (await db.select().from(schema.shops).where(eq(schema.shops.isDemo, true)))[0];
  if (!(await find())) await makeDemoShop(db, "a password that nobody uses here");
  const shop = await find();
  if (!shop) throw new Error("There is no demo shop");
  const shopId = shop.id;
  const build = async (nickname: string) => {
    const [row] = await db
      .select({ id: schema.builds.id })
      .from(schema.builds)
      .innerJoin(schema.vehicles, eq(schema.vehicles.id, schema.builds.vehicleId))
      .where(and(eq(schema.builds.shopId, shopId), eq(schema.vehicles.nickname, nickname)));
    if (!row) throw new Error(`The demo shop has no ${nickname}`);
    return row.id;
  };
  return {
    shopId,
    build,
    display: { shopId, role: "display", name: "Wall", email: "", personId: null },
    person: async (role) => {
      const [row] = await db
        .select()
        .from(schema.people)
        .where(and(eq(schema.people.shopId, shopId), eq(schema.people.role, role)))
        .limit(1);
      if (!row) throw new Error(`The demo shop has no ${role}`);
      return { shopId, role, name: row.name, email: row.email ?? "", personId: row.id };
    },
    layout: async (nickname) => {
      const [row] = await db
        .select({ id: schema.layouts.id })
        .from(schema.layouts)
        .where(eq(schema.layouts.buildId, await build(nickname)));
      if (!row) throw new Error(`${nickname} has no layout`);
      return row.id;
    },
  };
}
