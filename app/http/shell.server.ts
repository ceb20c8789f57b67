import type { RouterContextProvider } from "react-router";
import type { Actor } from "../auth/actor";
import { may } from "../auth/permissions";
import { AREAS, type ShellData } from "../components/frame/areas";
import { appContext } from "../context";
import { readShop } from "../db/queries/shop.server";

/** What the frame of a signed-in page shows. */
export async function readShell(context: Readonly<RouterContextProvider>, actor: Actor): Promise<ShellData> {
  const { db, now } = context.get(appContext);
  const shop = await readShop(db, actor.shopId);
  return {
    shopName: shop.name,
    isDemo: shop.isDemo,
    timeZone: shop.timeZone,
    unit: shop.unit,
    person: { name: actor.name, role: actor.role, initials: actor.initials },
    areas: AREAS.filter((area) => may(actor.role, area.needs)).map(({ to, label }) => ({ to, label })),
    now: now().toISOString(),
  };
}
