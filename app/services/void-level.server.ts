import { and, eq, inArray, isNull } from "drizzle-orm";
import { schema, type Tx } from "../db/client.server";
import type { Context, JournalEntry } from "./change.server";

const { approvals, choices, levelChecks } = schema;

/** Voids every approval of a layout that still stands. @returns how many */
export async function voidApprovals(tx: Tx, ctx: Context, layoutId: number, reason: string): Promise<number> {
  const standing = await tx
    .select({ id: approvals.id })
    .from(approvals)
    .innerJoin(choices, eq(choices.id, approvals.choiceId))
    .where(and(eq(choices.layoutId, layoutId), isNull(approvals.voidedAt)))
    .for("update");
  if (standing.length === 0) return 0;
  await tx
    .update(approvals)
    .set({ voidedAt: ctx.now(), voidReason: reason.slice(0, 160) })
    .where(
      inArray(
        approvals.id,
        standing.map((row) => row.id),
      ),
    );
  return standing.length;
}

/**
 * Voids a level within a running change, and every approval that stood on it. The drops stay in the record; they wait
 * for a new level. Journalled as its own line.
 */
export async function voidLevel(
  tx: Tx,
  ctx: Context,
  personId: number,
  what: { layoutId: number; levelCheckId: number; reason: string; note: (entry: JournalEntry) => void },
): Promise<void> {
  const { layoutId, levelCheckId, reason, note } = what;
  await tx
    .update(levelChecks)
    .set({ voidedAt: ctx.now(), voidedBy: personId, voidReason: reason.slice(0, 160) })
    .where(and(eq(levelChecks.id, levelCheckId), isNull(levelChecks.voidedAt)));
  const approvalsVoided = await voidApprovals(
    tx,
    ctx,
    layoutId,
    `the level is void, ${reason.charAt(0).toLowerCase()}${reason.slice(1)}`,
  );
  note({
    verb: "void-level",
    subject: { kind: "layout", id: layoutId },
    words: `Level void: ${reason}`,
    before: { levelCheckId, state: "standing" },
    after: { levelCheckId, state: "void", reason, approvalsVoided },
    touches: [{ kind: "layout", id: layoutId }],
  });
}
