import { and, eq } from "drizzle-orm";
import { schema, type Tx } from "../db/client.server";
import { readStanding } from "../db/queries/board.server";
import type { Touch } from "../db/schema";
import { STAGE_LABEL, type StageKind } from "../domain/builds/stages";
import { type Context, change, requirePerson } from "./change.server";
import { Refusal } from "./errors";

const { builds, stages, vehicles } = schema;

export type StageChange = { buildId: number; stageId: number; state: "under-way" | "done" };

const said = (kind: StageKind) => (kind === "hand-over" ? "Hand-over" : STAGE_LABEL[kind]);

/** The build's row is the lock: two people who start and finish stages of one vehicle follow one another. */
async function lockBuild(tx: Tx, shopId: number, buildId: number): Promise<{ nickname: string }> {
  const [build] = await tx
    .select({ nickname: vehicles.nickname, state: builds.state })
    .from(builds)
    .innerJoin(vehicles, eq(vehicles.id, builds.vehicleId))
    .where(and(eq(builds.id, buildId), eq(builds.shopId, shopId)))
    .for("update");
  if (!build) throw new Refusal("not-found", "There is no such build in this shop.");
  if (build.state !== "here") throw new Refusal("conflict", `${build.nickname} has left the shop.`);
  return build;
}

/**
 * Starts a stage of a build or finishes it, at this moment. Starting what was finished opens it again: its first start
 * is kept, its finish is taken off. One stage of a build is under way at a time.
 * @throws Refusal not-found, conflict (in that state already, another stage is under way, the build is on hold)
 */
export async function setStage(ctx: Context, what: StageChange): Promise<{ words: string }> {
  requirePerson(ctx, "layouts:measure");
  const { shopId } = ctx.actor;
  return change(ctx, async (tx, note) => {
    const { nickname } = await lockBuild(tx, shopId, what.buildId);
    const all = await tx.select().from(stages).where(eq(stages.buildId, what.buildId));
    const stage = all.find((row) => row.id === what.stageId);
    if (!stage) throw new Refusal("not-found", "There is no such stage on this build.");
    const label = said(stage.kind);
    const standing = await readStanding(tx, shopId, what.buildId);
    if (stage.state === what.state)
      throw new Refusal(
        "conflict",
        `${label} is ${what.state === "done" ? "finished" : "under way"} already.`,
      );
    if (what.state === "under-way") {
      const other = all.find((row) => row.state === "under-way");
      if (other) throw new Refusal("conflict", `Finish ${said(other.kind)} first: it is under way.`);
      const hold = standing?.vehicle.hold;
      if (hold) throw new Refusal("conflict", `${nickname} is on hold: ${hold.words}. Lift the hold first.`);
    }
    const now = ctx.now();
    const startedAt = stage.startedAt ?? now;
    const finishedAt = what.state === "done" ? now : null;
    await tx.update(stages).set({ state: what.state, startedAt, finishedAt }).where(eq(stages.id, stage.id));
    const verb = what.state === "done" ? "finish-stage" : "start-stage";
    const words = `${nickname}: ${label} ${what.state === "done" ? "finished" : "started"}`;
    const place: Touch[] = standing
      ? [standing.bayId === null ? { kind: "yard" } : { kind: "bay", id: standing.bayId }]
      : [];
    note({
      verb,
      subject: { kind: "build", id: what.buildId },
      words,
      before: { stageId: stage.id, state: stage.state },
      after: { stageId: stage.id, state: what.state },
      touches: [{ kind: "build", id: what.buildId }, ...place],
    });
    return { words };
  });
}
