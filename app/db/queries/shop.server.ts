import { eq } from "drizzle-orm";
import { type Reader, schema } from "../client.server";

const { shops, shopSettings } = schema;

/** A shop with its settings. @throws when the shop does not exist: an actor always belongs to one */
export async function readShop(tx: Reader, shopId: number) {
  const [row] = await tx
    .select({ shop: shops, settings: shopSettings })
    .from(shops)
    .innerJoin(shopSettings, eq(shopSettings.shopId, shops.id))
    .where(eq(shops.id, shopId));
  if (!row) throw new Error(`Shop ${shopId} has no settings`);
  return { ...row.settings, name: row.shop.name, isDemo: row.shop.isDemo };
}
export type ShopSettings = Awaited<ReturnType<typeof readShop>>;
