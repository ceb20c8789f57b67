import { eq } from "drizzle-orm";
import { type Reader, schema } from "../client.server";

/** The made-up shop of this database by name; null when it has none. For the door, where nobody is signed in yet. */
export async function readDemoShop(tx: Reader): Promise<string | null> {
  const [row] = await tx
    .select({ name: schema.shops.name })
    .from(schema.shops)
    .where(eq(schema.shops.isDemo, true))
    .limit(1);
  return row?.name ?? null;
}
