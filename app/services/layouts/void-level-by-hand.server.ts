import { type Context, change } from "../change.server";
import { Refusal } from "../errors";
import { voidLevel } from "../void-level.server";
import { layoutTouches, measurer, openStep } from "./step-guard.server";

/** Somebody says that the level is gone: a stand was touched, a heavy part went on or off. @throws Refusal conflict when none stands */
export async function voidLevelByHand(
  ctx: Context,
  layoutId: number,
  reason: string,
): Promise<{ words: string }> {
  const actor = measurer(ctx);
  return change(ctx, async (tx, note) => {
    const { ground, head } = await openStep(tx, ctx, layoutId, "level");
    if (!ground.newest || ground.state === "void" || ground.state === "none")
      throw new Refusal("conflict", "No level stands that could be void.");
    const touches = await layoutTouches(tx, layoutId, head.build.id);
    await voidLevel(tx, ctx, actor.personId, {
      layoutId,
      levelCheckId: ground.newest.id,
      reason,
      note: (entry) => note({ ...entry, touches }),
    });
    return { words: `Level void: ${reason}.` };
  });
}
