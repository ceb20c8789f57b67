import { eq } from "drizzle-orm";
import { schema } from "../../db/client.server";
import { readBayOfBuild } from "../../db/queries/layouts.server";
import { type Context, change } from "../change.server";
import { Refusal } from "../errors";
import { layoutTouches, measurer, openStep } from "./step-guard.server";

/** The vehicle is on stands and chocked, and the cautions were read. Saying it again changes nothing. */
export async function acknowledgeStands(ctx: Context, layoutId: number): Promise<{ words: string }> {
  const actor = measurer(ctx);
  return change(ctx, async (tx, note) => {
    const { head } = await openStep(tx, ctx, layoutId, "stands");
    if (head.layout.standsAt) return { words: "Set on stands already." };
    if (!(await readBayOfBuild(tx, head.build.id)))
      throw new Refusal("conflict", `${head.vehicle.nickname} stands in the yard: put it in a bay first.`);
    await tx
      .update(schema.layouts)
      .set({ standsAt: ctx.now(), standsBy: actor.personId })
      .where(eq(schema.layouts.id, layoutId));
    note({
      verb: "acknowledge-stands",
      subject: { kind: "layout", id: layoutId },
      words: "Set on stands, cautions read",
      touches: await layoutTouches(tx, layoutId, head.build.id),
    });
    return { words: "On stands." };
  });
}
