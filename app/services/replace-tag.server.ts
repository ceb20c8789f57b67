import { and, eq, isNull } from "drizzle-orm";
import { schema } from "../db/client.server";
import { readStanding } from "../db/queries/board.server";
import { readBuildTag } from "../db/queries/tags.server";
import { insertTag, type NewCode, randomCode } from "./book-in.server";
import { type Context, change, requirePerson } from "./change.server";
import { Refusal } from "./errors";

const { tags, vehicles } = schema;

/**
 * Replaces a lost or torn tag: the old code stops leading anywhere and is never given out again.
 * @param what.code the tag that the person saw on the screen
 * @throws Refusal not-found, conflict (somebody replaced it a moment ago)
 */
export async function replaceTag(
  ctx: Context,
  what: { buildId: number; code: string },
  newCode: NewCode = randomCode,
): Promise<{ code: string; words: string }> {
  const actor = requirePerson(ctx, "tags:print");
  const { shopId } = actor;
  return change(ctx, async (tx, note) => {
    const seen = await readBuildTag(tx, shopId, what.buildId);
    if (!seen) throw new Refusal("not-found", "There is no such build.");
    await tx.select({ id: vehicles.id }).from(vehicles).where(eq(vehicles.id, seen.vehicleId)).for("update");
    const now = ctx.now();
    const [ended] = await tx
      .update(tags)
      .set({ replacedAt: now })
      .where(and(eq(tags.vehicleId, seen.vehicleId), eq(tags.code, what.code), isNull(tags.replacedAt)));
    if (ended.affectedRows !== 1)
      throw new Refusal("conflict", `Another tag hangs on ${seen.nickname} already. Look at the page again.`);
    const code = await insertTag(tx, shopId, seen.vehicleId, now, newCode);
    const standing = await readStanding(tx, shopId, what.buildId);
    const words = `New tag for ${seen.nickname}: ${code}`;
    note({
      verb: "replace-tag",
      subject: { kind: "build", id: what.buildId },
      words,
      before: { code: what.code },
      after: { code },
      touches: [
        standing?.bayId ? { kind: "bay", id: standing.bayId } : { kind: "yard" },
        { kind: "build", id: what.buildId },
      ],
    });
    return { code, words };
  });
}
