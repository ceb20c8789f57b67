import type { RouterContextProvider } from "react-router";
import { appContext } from "../context";
import { readShop } from "../db/queries/shop.server";
import type { LengthUnit } from "../domain/units/length";
import type { Context } from "../services/change.server";
import { Refusal } from "../services/errors";
import type { FormRead } from "../validation/layout";
import { serviceContext } from "./request.server";

/** A service's context with the unit in which the shop types lengths. */
export async function measuringContext(
  context: Readonly<RouterContextProvider>,
): Promise<{ ctx: Context; unit: LengthUnit }> {
  const ctx = serviceContext(context);
  const { unit } = await readShop(context.get(appContext).db, ctx.actor.shopId);
  return { ctx, unit };
}

/** What a form read came to. @throws Refusal invalid with the words beside each field */
export function readOr<T>(read: FormRead<T>): T {
  if (read.ok) return read.value;
  throw new Refusal(
    "invalid",
    Object.values(read.fields)[0] ?? "Something typed here cannot be used.",
    read.fields,
  );
}
