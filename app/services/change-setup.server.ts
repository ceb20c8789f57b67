import { eq } from "drizzle-orm";
import { schema } from "../db/client.server";
import { readShop } from "../db/queries/shop.server";
import { type Context, change, requirePerson } from "./change.server";

const { shops, shopSettings } = schema;

export type Setup = {
  name: string;
  timeZone: string;
  unit: "in" | "mm";
  allowedSlopeDeg: number;
  shimMm: number;
  redropToleranceMm: number;
  markToleranceMm: number;
  tapeSigmaMm: number;
  dropSigmaMm: number;
  springSigmaMm: number;
};

/** Changes what the shop has set for itself; the whole form at once, the old values kept in the journal. */
export async function changeSetup(ctx: Context, setup: Setup): Promise<{ words: string }> {
  const actor = requirePerson(ctx, "setup:edit");
  return change(ctx, async (tx, note) => {
    const before = await readShop(tx, actor.shopId);
    const { name, ...settings } = setup;
    await tx.update(shops).set({ name }).where(eq(shops.id, actor.shopId));
    await tx.update(shopSettings).set(settings).where(eq(shopSettings.shopId, actor.shopId));
    note({
      verb: "change-setup",
      subject: { kind: "shop", id: actor.shopId },
      words: "Setup changed",
      before: { ...before },
      after: { ...setup },
      touches: [{ kind: "setup" }],
    });
    return { words: "Kept." };
  });
}
