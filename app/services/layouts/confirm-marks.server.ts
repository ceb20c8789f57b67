import { eq } from "drizzle-orm";
import { schema } from "../../db/client.server";
import { readMarks } from "../../db/queries/layouts.server";
import type { TypedLength } from "../../domain/layout/view";
import { formatLength, mm } from "../../domain/units/length";
import { type Context, change } from "../change.server";
import { Refusal } from "../errors";
import { markDistance } from "./read-layout.server";
import { layoutTouches, measurer, openStep } from "./step-guard.server";

/**
 * The control marks were found and A to B was taped.
 * @throws Refusal invalid beside the field when the tape does not agree with what Setup says, with the difference
 */
export async function confirmMarks(
  ctx: Context,
  layoutId: number,
  taped: TypedLength,
): Promise<{ words: string }> {
  const actor = measurer(ctx);
  return change(ctx, async (tx, note) => {
    const { head, shop } = await openStep(tx, ctx, layoutId, "marks");
    const marks = (await readMarks(tx, head.layout.bayId)).map((mark) => ({
      label: mark.label,
      x: mm(mark.xMm),
      y: mm(mark.yMm),
    }));
    const set = markDistance(marks);
    if (set === 0) throw new Refusal("conflict", `Bay ${head.bay.number} has no control marks A and B.`);
    const off = taped.mm - set;
    if (Math.abs(off) > shop.markToleranceMm) {
      const size = (value: number) => formatLength(mm(Math.abs(value)), shop.unit, { denominator: 32 });
      const words = `A to B is set as ${size(set)}; the tape reads ${size(off)} ${off > 0 ? "more" : "less"}. Tape again from the middle of each mark, without burning an inch.`;
      throw new Refusal("invalid", words, { taped: words });
    }
    await tx
      .update(schema.layouts)
      .set({
        marksAt: ctx.now(),
        marksBy: actor.personId,
        marksTapedMm: taped.mm,
        marksTapedTyped: taped.typed,
      })
      .where(eq(schema.layouts.id, layoutId));
    note({
      verb: "confirm-marks",
      subject: { kind: "layout", id: layoutId },
      words: `Control marks checked: A to B ${taped.typed}`,
      after: { tapedMm: taped.mm, offMm: off },
      touches: await layoutTouches(tx, layoutId, head.build.id),
    });
    return { words: "The marks agree." };
  });
}
