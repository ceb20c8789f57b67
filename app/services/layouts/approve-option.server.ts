import { and, eq, isNull } from "drizzle-orm";
import { schema, type Tx } from "../../db/client.server";
import { formatDecimalInches, mm } from "../../domain/units/length";
import { type Context, change } from "../change.server";
import { Refusal } from "../errors";
import { advanceStages } from "./advance-stages.server";
import { layoutTouches, measurer, openStep } from "./step-guard.server";

const { approvals, holds, layouts } = schema;

async function waitsForCustomer(tx: Tx, buildId: number): Promise<boolean> {
  const [hold] = await tx
    .select({ id: holds.id })
    .from(holds)
    .where(and(eq(holds.buildId, buildId), eq(holds.kind, "customer"), isNull(holds.liftedAt)))
    .limit(1);
  return hold !== undefined;
}

/**
 * A foreman signs the option in hand: from here on it may be marked. Makes the next revision of the layout sheet.
 * @param expectedKey the option that the foreman saw; null when the screen did not say
 * @throws Refusal conflict when the level, the drops or the choice do not stand, or it is signed already
 */
export async function approveOption(
  ctx: Context,
  layoutId: number,
  expectedKey: string | null,
): Promise<{ words: string; sheetRevision: number }> {
  const actor = measurer(ctx, "options:approve");
  return change(ctx, async (tx, note) => {
    const { head, facts, choice, changed, approvalRow } = await openStep(tx, ctx, layoutId, "approval");
    if (!choice) throw new Refusal("conflict", "No option is in hand.");
    if (changed)
      throw new Refusal(
        "conflict",
        "The numbers under this option have changed since it was put in hand: choose again.",
      );
    if (expectedKey !== null && expectedKey !== choice.key)
      throw new Refusal("conflict", "Another option was put in hand meanwhile: look again before you sign.");
    if (facts.dropsSuspect > 0)
      throw new Refusal("conflict", "Tapes that do not meet have to be measured again first.");
    if (approvalRow && !approvalRow.approval.voidedAt)
      throw new Refusal("conflict", `${approvalRow.name} has signed this already.`);
    const sheetRevision = head.layout.sheetRevision + 1;
    await tx.update(layouts).set({ sheetRevision }).where(eq(layouts.id, layoutId));
    await tx.insert(approvals).values({
      shopId: actor.shopId,
      choiceId: choice.choice.id,
      sheetRevision,
      approvedBy: actor.personId,
      approvedAt: ctx.now(),
    });
    await advanceStages(tx, head.build.id, ctx.now(), {
      // While the customer has not answered, the Approval stage waits for them.
      done: (await waitsForCustomer(tx, head.build.id))
        ? ["level", "layout"]
        : ["level", "layout", "approval"],
      begun: null,
    });
    const station = formatDecimalInches(mm(choice.choice.axleStationMm));
    note({
      verb: "approve-option",
      subject: { kind: "layout", id: layoutId },
      words: `Approved: axle line at ${station}, sheet ${sheetRevision}`,
      after: { choiceId: choice.choice.id, key: choice.key, sheetRevision },
      touches: await layoutTouches(tx, layoutId, head.build.id),
    });
    return { words: `Approved: ${station}. Mark from sheet ${sheetRevision}.`, sheetRevision };
  });
}
