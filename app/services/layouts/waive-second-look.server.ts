import { schema } from "../../db/client.server";
import { type Context, change } from "../change.server";
import { Refusal } from "../errors";
import { layoutTouches, measurer, openStep } from "./step-guard.server";

/**
 * A foreman lets the option in hand go on without a second look, and says why; the sheet prints it.
 * @throws Refusal conflict when there is nothing to waive; forbidden when it is not theirs to say
 */
export async function waiveSecondLook(
  ctx: Context,
  layoutId: number,
  reason: string,
): Promise<{ words: string }> {
  const actor = measurer(ctx, "options:approve");
  return change(ctx, async (tx, note) => {
    const { head, choice, facts } = await openStep(tx, ctx, layoutId, "second-look");
    if (!choice) throw new Refusal("conflict", "Put an option in hand first.");
    if (facts.secondLook === "waived") throw new Refusal("conflict", "It was waived already.");
    if (facts.secondLook === "agrees") throw new Refusal("conflict", "A second person has looked already.");
    await tx.insert(schema.secondLookWaivers).values({
      shopId: actor.shopId,
      layoutId,
      choiceId: choice.choice.id,
      reason,
      waivedBy: actor.personId,
      waivedAt: ctx.now(),
    });
    const words = `Second look waived: ${reason}`;
    note({
      verb: "waive-second-look",
      subject: { kind: "layout", id: layoutId },
      words,
      after: { choiceId: choice.choice.id, reason },
      touches: await layoutTouches(tx, layoutId, head.build.id),
    });
    return { words };
  });
}
