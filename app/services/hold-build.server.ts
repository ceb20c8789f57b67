import { and, eq, isNull } from "drizzle-orm";
import { schema } from "../db/client.server";
import { readStanding } from "../db/queries/board.server";
import type { HoldKind } from "../domain/builds/stages";
import { type Context, change, requirePerson } from "./change.server";
import { Refusal } from "./errors";

const { builds, holds } = schema;

/** Puts a build on hold with a reason, or lifts the hold that stands. @throws Refusal not-found, conflict */
export async function holdBuild(
  ctx: Context,
  what: { buildId: number; place: { kind: HoldKind; words: string; dueAt: Date | null } | null },
): Promise<{ words: string }> {
  const actor = requirePerson(ctx, "holds:set");
  const { shopId } = ctx.actor;
  return change(ctx, async (tx, note) => {
    // Two who hold or lift at once follow one another.
    await tx
      .select({ id: builds.id })
      .from(builds)
      .where(and(eq(builds.id, what.buildId), eq(builds.shopId, shopId)))
      .for("update");
    const standing = await readStanding(tx, shopId, what.buildId);
    if (!standing) throw new Refusal("not-found", "That vehicle does not stand in this shop.");
    const { vehicle, bayId } = standing;
    const touches = [
      bayId === null ? ({ kind: "yard" } as const) : ({ kind: "bay", id: bayId } as const),
      { kind: "build", id: what.buildId } as const,
    ];
    if (what.place) {
      if (vehicle.hold)
        throw new Refusal("conflict", `${vehicle.nickname} is on hold already: ${vehicle.hold.words}`);
      await tx.insert(holds).values({
        shopId,
        buildId: what.buildId,
        ...what.place,
        placedBy: actor.personId,
        placedAt: ctx.now(),
      });
    } else {
      if (!vehicle.hold) throw new Refusal("conflict", `${vehicle.nickname} is not on hold.`);
      await tx
        .update(holds)
        .set({ liftedAt: ctx.now(), liftedBy: actor.personId })
        .where(and(eq(holds.buildId, what.buildId), isNull(holds.liftedAt)));
    }
    const words = what.place
      ? `${vehicle.nickname} on hold: ${what.place.words}`
      : `${vehicle.nickname}: hold lifted`;
    note({
      verb: what.place ? "place-hold" : "lift-hold",
      subject: { kind: "build", id: what.buildId },
      words,
      before: vehicle.hold ? { ...vehicle.hold } : null,
      after: what.place ? { kind: what.place.kind, words: what.place.words } : null,
      touches,
    });
    return { words };
  });
}
