import { and, eq } from "drizzle-orm";
import { schema } from "../../db/client.server";
import { SQUARE_TOLERANCE } from "../../domain/layout/square";
import { isWelded } from "../../domain/layout/steps";
import { checkTack, signedLine, type TackCheck } from "../../domain/layout/tack-check";
import { mm } from "../../domain/units/length";
import type { TackFigures, TackForm } from "../../validation/layout-work";
import { type Context, change } from "../change.server";
import { Refusal } from "../errors";
import { advanceStages } from "./advance-stages.server";
import { showPieces } from "./show-pieces.server";
import { layoutTouches, measurer, openStep } from "./step-guard.server";

const { tackChecks } = schema;

export type TackAnswer = { passes: boolean; words: string };

/**
 * Keeps a reading of both ends of the tacked axle, held against the line that was signed. One that passes opens Weld;
 * one that does not says what to move and shuts it. Every check stays; the same reading sent twice counts once.
 * @throws Refusal conflict when the step is shut, the brackets are welded or another sheet was signed meanwhile; invalid
 *   with words
 */
export async function keepTackCheck(ctx: Context, layoutId: number, entry: TackForm): Promise<TackAnswer> {
  const actor = measurer(ctx);
  const known = await keptBefore(ctx, layoutId, entry.clientKey);
  if (known) return known;
  try {
    return await change(ctx, async (tx, note) => {
      const { head, facts, shop, geometry, approvalRow } = await openStep(tx, ctx, layoutId, "tack");
      if (isWelded(facts))
        throw new Refusal("conflict", "Everything is welded and signed: there is nothing left to move.");
      if (!approvalRow || !geometry.frame || !geometry.line)
        throw new Refusal("conflict", "The axle line is not known: look at the Approval step.");
      const { approval, choice } = approvalRow;
      if (entry.sheet !== null && entry.sheet !== approval.sheetRevision)
        throw new Refusal(
          "conflict",
          `Sheet ${approval.sheetRevision} was signed meanwhile: look at it before you check.`,
        );
      const wanted = signedLine(geometry.line, mm(choice.axleStationMm));
      const reading = {
        left: { station: entry.left.station.mm, offset: entry.left.offset.mm },
        right: { station: entry.right.station.mm, offset: entry.right.offset.mm },
      };
      const checked = checkTack(geometry.frame, wanted, reading, { unit: shop.unit });
      if (!checked.ok) throw new Refusal("invalid", checked.problem, { form: checked.problem });
      const { floor, built, verdict } = checked.value;
      await tx.insert(tackChecks).values({
        shopId: actor.shopId,
        layoutId,
        approvalId: approval.id,
        leftStationTyped: entry.left.station.typed,
        leftOffsetTyped: entry.left.offset.typed,
        rightStationTyped: entry.right.station.typed,
        rightOffsetTyped: entry.right.offset.typed,
        leftXMm: floor.left.x,
        leftYMm: floor.left.y,
        rightXMm: floor.right.x,
        rightYMm: floor.right.y,
        withinMm: SQUARE_TOLERANCE,
        passes: built.isTrue,
        figures: figuresOf(checked.value, choice.axleStationMm),
        madeBy: actor.personId,
        deviceId: actor.deviceId,
        madeAt: ctx.now(),
        clientKey: entry.clientKey,
      });
      if (built.isTrue) {
        await advanceStages(tx, head.build.id, ctx.now(), { done: ["mock-up", "tack"], begun: null });
        await showPieces(tx, head.build.id, facts.work.weld);
      }
      note({
        verb: "check-tack",
        subject: { kind: "layout", id: layoutId },
        words: `Tacked axle checked: ${verdict.headline}`,
        after: { approvalId: approval.id, passes: built.isTrue },
        touches: await layoutTouches(tx, layoutId, head.build.id),
      });
      return { passes: built.isTrue, words: verdict.headline };
    });
  } catch (error) {
    // The same reading arrived twice at once: the other one was kept, and this is its answer.
    const twin = await keptBefore(ctx, layoutId, entry.clientKey);
    if (twin) return twin;
    throw error;
  }
}

const figuresOf = ({ built, verdict }: TackCheck, wantedStationMm: number): TackFigures => ({
  wantedStationMm,
  leftAheadMm: built.leftAhead,
  rightAheadMm: built.rightAhead,
  outOfSquareMm: built.outOfSquare,
  sidewaysMm: built.sideways,
  headline: verdict.headline,
  moves: verdict.moves.map((move) => move.words),
});

/** What a reading sent before under this key came to; null when there is none. */
async function keptBefore(ctx: Context, layoutId: number, clientKey: string): Promise<TackAnswer | null> {
  const [row] = await ctx.db
    .select({ passes: tackChecks.passes, layoutId: tackChecks.layoutId })
    .from(tackChecks)
    .where(and(eq(tackChecks.shopId, ctx.actor.shopId), eq(tackChecks.clientKey, clientKey)));
  if (!row) return null;
  if (row.layoutId !== layoutId)
    throw new Refusal("conflict", "This reading was kept in another layout already.");
  return { passes: row.passes, words: "Kept already." };
}
