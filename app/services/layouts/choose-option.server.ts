import { and, eq, isNull } from "drizzle-orm";
import { schema } from "../../db/client.server";
import { describeSpring } from "../../domain/springs/leaf-spring";
import { formatDecimalInches } from "../../domain/units/length";
import { type Context, change } from "../change.server";
import { Refusal } from "../errors";
import { voidApprovals } from "../void-level.server";
import { layoutTouches, measurer, openStep } from "./step-guard.server";

const { choices } = schema;

/**
 * Puts an option in hand. It is worked out again here; its figures are kept whole with the choice.
 * @throws Refusal conflict with the reasons when it does not meet what was asked for
 */
export async function chooseOption(ctx: Context, layoutId: number, key: string): Promise<{ words: string }> {
  const actor = measurer(ctx);
  return change(ctx, async (tx, note) => {
    const { head, geometry, ground, choice, changed } = await openStep(tx, ctx, layoutId, "options");
    if (!geometry.options || !ground.newest)
      throw new Refusal("conflict", geometry.missing[0] ?? "There are no options yet.");
    const option = geometry.options.find((one) => one.key === key);
    if (!option)
      throw new Refusal(
        "not-found",
        "That spring is not in the rack any more, or the hole is another hanger's.",
      );
    if (!option.stands) throw new Refusal("conflict", option.reasons.join(" "));
    if (choice?.key === key && !changed) return { words: "It is in hand already." };
    await voidApprovals(tx, ctx, layoutId, "Another option was put in hand");
    await tx
      .update(choices)
      .set({ droppedAt: ctx.now() })
      .where(and(eq(choices.layoutId, layoutId), isNull(choices.droppedAt)));
    await tx.insert(choices).values({
      shopId: actor.shopId,
      layoutId,
      springId: option.spring.id,
      holeId: option.hole.id,
      turned: option.turned,
      levelCheckId: ground.newest.id,
      axleStationMm: option.axleStation,
      figures: { ...option, line: geometry.line, frame: geometry.frame, openings: geometry.openings },
      chosenBy: actor.personId,
      chosenAt: ctx.now(),
    });
    const words = `${describeSpring(option.spring, option.turned)}, hole ${option.hole.number}: axle at ${formatDecimalInches(option.axleStation)}`;
    note({
      verb: "choose-option",
      subject: { kind: "layout", id: layoutId },
      words: `In hand: ${words}`,
      before: choice ? { key: choice.key } : null,
      after: { key, axleStationMm: option.axleStation },
      touches: await layoutTouches(tx, layoutId, head.build.id),
    });
    return { words: `In hand: ${words}.` };
  });
}
