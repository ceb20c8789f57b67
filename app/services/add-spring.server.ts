import { and, eq, isNull } from "drizzle-orm";
import { isDuplicate, schema } from "../db/client.server";
import type { SpringEntry } from "../validation/spring";
import { type Context, change, requirePerson } from "./change.server";
import { Refusal } from "./errors";

const { springs } = schema;

/**
 * Puts a spring into the rack, measured flat on the bench.
 * @throws Refusal invalid when the rack number was given to another spring, one that has left the rack included: old
 * records name springs by it
 */
export async function addSpring(
  ctx: Context,
  what: SpringEntry,
): Promise<{ springId: number; words: string }> {
  const { shopId } = requirePerson(ctx, "springs:edit");
  return change(ctx, async (tx, note) => {
    const id = await (async () => {
      try {
        const [row] = await tx
          .insert(springs)
          .values({
            shopId,
            rackNumber: what.rackNumber,
            lengthMm: what.length.mm,
            lengthTyped: what.length.typed,
            frontHalfMm: what.frontHalf.mm,
            frontHalfTyped: what.frontHalf.typed,
            leaves: what.leaves,
            leafWidthMm: what.leafWidth.mm,
            leafWidthTyped: what.leafWidth.typed,
            note: what.note,
            addedAt: ctx.now(),
          })
          .$returningId();
        return row?.id;
      } catch (error) {
        if (!isDuplicate(error)) throw error;
        const words = await takenWords(ctx, shopId, what.rackNumber);
        throw new Refusal("invalid", words, { rackNumber: words });
      }
    })();
    if (id === undefined) throw new Error("The spring was not inserted");
    const words = `Spring into rack ${what.rackNumber}: ${what.length.typed}, front half ${what.frontHalf.typed}`;
    note({
      verb: "add-spring",
      subject: { kind: "spring", id },
      words,
      after: { rackNumber: what.rackNumber, length: what.length.typed, frontHalf: what.frontHalf.typed },
      touches: [{ kind: "springs" }],
    });
    return { springId: id, words };
  });
}

async function takenWords(ctx: Context, shopId: number, rackNumber: number): Promise<string> {
  const [holder] = await ctx.db
    .select({ takenOutAt: springs.takenOutAt })
    .from(springs)
    .where(and(eq(springs.shopId, shopId), eq(springs.rackNumber, rackNumber)));
  return holder?.takenOutAt
    ? `Rack ${rackNumber} was a spring that has left; old sheets still name it. Use a new number.`
    : `Rack ${rackNumber} holds a spring already.`;
}

/** Takes a spring out of the rack: it is no longer offered, and old records keep it. @throws Refusal not-found, conflict */
export async function takeOutSpring(ctx: Context, springId: number): Promise<{ words: string }> {
  const { shopId } = requirePerson(ctx, "springs:edit");
  return change(ctx, async (tx, note) => {
    const [spring] = await tx
      .select()
      .from(springs)
      .where(and(eq(springs.id, springId), eq(springs.shopId, shopId)))
      .for("update");
    if (!spring) throw new Refusal("not-found", "There is no such spring.");
    if (spring.takenOutAt) throw new Refusal("conflict", `Rack ${spring.rackNumber} was taken out already.`);
    await tx
      .update(springs)
      .set({ takenOutAt: ctx.now() })
      .where(and(eq(springs.id, springId), isNull(springs.takenOutAt)));
    const words = `Rack ${spring.rackNumber} out of the rack`;
    note({
      verb: "take-out-spring",
      subject: { kind: "spring", id: springId },
      words,
      before: { rackNumber: spring.rackNumber },
      touches: [{ kind: "springs" }],
    });
    return { words };
  });
}
