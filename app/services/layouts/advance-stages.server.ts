import { and, eq, inArray, ne } from "drizzle-orm";
import { schema, type Tx } from "../../db/client.server";
import type { StageKind } from "../../domain/builds/stages";

const { stages } = schema;

/**
 * Keeps a build's stages in step with its layout: what the layout has finished is done, what it has begun is under way.
 * A stage that somebody finished by hand stays finished.
 */
export async function advanceStages(
  tx: Tx,
  buildId: number,
  now: Date,
  to: { done: StageKind[]; begun: StageKind | null },
): Promise<void> {
  if (to.done.length > 0)
    await tx
      .update(stages)
      .set({ state: "done", finishedAt: now })
      .where(and(eq(stages.buildId, buildId), inArray(stages.kind, to.done), ne(stages.state, "done")));
  if (to.begun)
    await tx
      .update(stages)
      .set({ state: "under-way", startedAt: now })
      .where(and(eq(stages.buildId, buildId), eq(stages.kind, to.begun), eq(stages.state, "open")));
}
