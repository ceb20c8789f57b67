import { and, eq } from "drizzle-orm";
import { schema } from "../db/client.server";
import { readStanding } from "../db/queries/board.server";
import { readLayoutOfBuild } from "../db/queries/layouts.server";
import type { Asked } from "../validation/book-in";
import { type Context, change, requirePerson } from "./change.server";
import { Refusal } from "./errors";

const { builds, vehicles } = schema;

/**
 * Puts right what was measured and asked for at booking in. A layout that is under way reckons with the new figures at
 * once; an option that no longer stands has to be chosen again.
 * @throws Refusal not-found, or conflict when the vehicle has left
 */
export async function changeAsked(ctx: Context, buildId: number, asked: Asked): Promise<{ words: string }> {
  const { shopId } = requirePerson(ctx, "builds:book-in");
  return change(ctx, async (tx, note) => {
    const [row] = await tx
      .select({ build: builds, nickname: vehicles.nickname })
      .from(builds)
      .innerJoin(vehicles, eq(vehicles.id, builds.vehicleId))
      .where(and(eq(builds.id, buildId), eq(builds.shopId, shopId)))
      .for("update");
    if (!row) throw new Refusal("not-found", "There is no such build in this shop.");
    if (row.build.state !== "here") throw new Refusal("conflict", `${row.nickname} has left the shop.`);
    const after = {
      wanted: asked.wanted,
      tyreTyped: asked.tyre === "" ? null : asked.tyre,
      loadedRadiusMm: asked.loadedRadius?.mm ?? null,
      loadedRadiusTyped: asked.loadedRadius?.typed ?? null,
      tyreRadiusMm: asked.tyreRadius?.mm ?? null,
      tyreRadiusTyped: asked.tyreRadius?.typed ?? null,
      tyreWidthMm: asked.tyreWidth?.mm ?? null,
      tyreWidthTyped: asked.tyreWidth?.typed ?? null,
      wheelbaseMm: asked.wheelbase?.mm ?? null,
      wheelbaseTyped: asked.wheelbase?.typed ?? null,
      approachAskedDeg: asked.approach,
    };
    const before = Object.fromEntries(
      Object.keys(after).map((name) => [name, row.build[name as keyof typeof after]]),
    );
    await tx.update(builds).set(after).where(eq(builds.id, buildId));
    const layout = await readLayoutOfBuild(tx, shopId, buildId);
    const standing = await readStanding(tx, shopId, buildId);
    const words = `${row.nickname}: what was measured and asked for put right`;
    note({
      verb: "change-asked",
      subject: { kind: "build", id: buildId },
      words,
      before,
      after,
      touches: [
        { kind: "build", id: buildId },
        ...(layout ? [{ kind: "layout" as const, id: layout.id }] : []),
        standing?.bayId ? { kind: "bay" as const, id: standing.bayId } : { kind: "yard" as const },
      ],
    });
    return { words };
  });
}
