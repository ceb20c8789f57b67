import { and, eq, isNull } from "drizzle-orm";
import { isDuplicate, schema, type Tx } from "../db/client.server";
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
    const id = await insertSpring(tx, ctx, shopId, what);
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

async function insertSpring(tx: Tx, ctx: Context, shopId: number, what: SpringEntry): Promise<number> {
  const { rackNumber, length, frontHalf, leaves, leafWidth, note } = what;
  try {
    const [row] = await tx
      .insert(springs)
      .values({
        shopId,
        rackNumber,
        lengthMm: length.mm,
        lengthTyped: length.typed,
        frontHalfMm: frontHalf.mm,
        frontHalfTyped: frontHalf.typed,
        leaves,
        leafWidthMm: leafWidth.mm,
        leafWidthTyped: leafWidth.typed,
        note,
        addedAt: ctx.now(),
      })
      .$returningId();
    if (!row) throw new Error("The spring was not inserted");
    return row.id;
  } catch (error) {
    if (!isDuplicate(error)) throw error;
    const words = await takenWords(ctx, shopId, rackNumber);
    throw new Refusal("invalid", words, { rackNumber: words });
  }
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
