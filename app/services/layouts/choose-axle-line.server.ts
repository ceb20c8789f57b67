import { and, eq, isNull } from "drizzle-orm";
import { schema } from "../../db/client.server";
import { AXLE_METHODS, type AxleMethod } from "../../domain/layout/axle-line";
import type { TypedLength } from "../../domain/layout/view";
import { type Context, change } from "../change.server";
import { Refusal } from "../errors";
import { voidApprovals } from "../void-level.server";
import { layoutTouches, measurer, openStep } from "./step-guard.server";

const { choices, layouts } = schema;

const WORDS: Record<AxleMethod, string> = {
  square: "square to the frame",
  "through-centres": "through both opening centres",
  asked: "at the offset asked for",
};

/** Chooses how the axle line is laid. A choice and an approval made on another line go. @throws Refusal conflict, invalid */
export async function chooseAxleLine(
  ctx: Context,
  layoutId: number,
  what: { method: AxleMethod; asked: TypedLength | null },
): Promise<{ words: string }> {
  const actor = measurer(ctx);
  return change(ctx, async (tx, note) => {
    const { head, geometry } = await openStep(tx, ctx, layoutId, "axle-line");
    if (!geometry.openings)
      throw new Refusal("conflict", geometry.missing[0] ?? "The openings are not known yet.");
    if (!AXLE_METHODS.includes(what.method))
      throw new Refusal("invalid", "Choose one of the three ways.", {
        method: "Choose one of the three ways.",
      });
    if (what.method === "asked" && !what.asked)
      throw new Refusal("invalid", "Type how far ahead of the centre was asked for.", {
        asked: "Type how far ahead of the centre was asked for.",
      });
    const asked = what.method === "asked" ? what.asked : null;
    await tx
      .update(layouts)
      .set({
        axleMethod: what.method,
        axleAskedMm: asked?.mm ?? null,
        axleAskedTyped: asked?.typed ?? null,
        axleAt: ctx.now(),
        axleBy: actor.personId,
      })
      .where(eq(layouts.id, layoutId));
    const { axleMethod, axleAskedMm } = head.layout;
    if (axleMethod !== null && (axleMethod !== what.method || axleAskedMm !== (asked?.mm ?? null))) {
      await voidApprovals(tx, ctx, layoutId, "The axle line was laid another way");
      await tx
        .update(choices)
        .set({ droppedAt: ctx.now() })
        .where(and(eq(choices.layoutId, layoutId), isNull(choices.droppedAt)));
    }
    note({
      verb: "choose-axle-line",
      subject: { kind: "layout", id: layoutId },
      words: `Axle line ${WORDS[what.method]}${asked ? `: ${asked.typed} ahead` : ""}`,
      before: { method: axleMethod, askedMm: axleAskedMm },
      after: { method: what.method, askedMm: asked?.mm ?? null },
      touches: await layoutTouches(tx, layoutId, head.build.id),
    });
    return { words: "Axle line chosen." };
  });
}
