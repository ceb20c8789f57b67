import { and, asc, eq } from "drizzle-orm";
import { type Db, schema } from "../../app/db/client.server";
import { STAGE_LABEL } from "../../app/domain/builds/stages";

/*
 * The demo's builds are written as they stand; this tells the journal how they came to stand so. Revision 0: no screen
 * has to catch up on it.
 */

type Told = { at: Date; buildId: number; personId: number; verb: string; words: string };

/** @param who the people who book in and who move */
export async function demoHistory(
  db: Db,
  shopId: number,
  who: { booked: number; moved: number },
): Promise<void> {
  const { builds, vehicles, stages, placements, bays, holds, journal } = schema;
  const told: Told[] = [];
  const rows = await db
    .select({ buildId: builds.id, nickname: vehicles.nickname, bookedInAt: builds.bookedInAt })
    .from(builds)
    .innerJoin(vehicles, eq(vehicles.id, builds.vehicleId))
    .where(eq(builds.shopId, shopId));
  for (const { buildId, nickname, bookedInAt } of rows) {
    const tell = (at: Date, personId: number, verb: string, words: string) =>
      told.push({ at, buildId, personId, verb, words });
    tell(bookedInAt, who.booked, "book-in", `${nickname} booked in`);
    const stood = await db
      .select({ fromAt: placements.fromAt, number: bays.number })
      .from(placements)
      .innerJoin(bays, eq(bays.id, placements.bayId))
      .where(and(eq(placements.shopId, shopId), eq(placements.buildId, buildId)));
    for (const { fromAt, number } of stood)
      tell(fromAt, who.moved, "move-vehicle", `${nickname} to Bay ${number}`);
    const steps = await db
      .select({ kind: stages.kind, startedAt: stages.startedAt, finishedAt: stages.finishedAt })
      .from(stages)
      .where(and(eq(stages.shopId, shopId), eq(stages.buildId, buildId)))
      .orderBy(asc(stages.position));
    for (const { kind, startedAt, finishedAt } of steps) {
      if (finishedAt)
        tell(finishedAt, who.moved, "finish-stage", `${nickname}: ${STAGE_LABEL[kind]} finished`);
      else if (startedAt)
        tell(startedAt, who.moved, "start-stage", `${nickname}: ${STAGE_LABEL[kind]} started`);
    }
    const held = await db
      .select({ placedAt: holds.placedAt, placedBy: holds.placedBy, words: holds.words })
      .from(holds)
      .where(and(eq(holds.shopId, shopId), eq(holds.buildId, buildId)));
    for (const { placedAt, placedBy, words } of held)
      tell(placedAt, placedBy ?? who.moved, "place-hold", `${nickname} on hold: ${words}`);
  }
  told.sort((a, b) => a.at.getTime() - b.at.getTime());
  await db.insert(journal).values(
    told.map(({ at, buildId, personId, verb, words }) => ({
      shopId,
      revision: 0,
      at,
      personId,
      verb,
      subjectKind: "build",
      subjectId: buildId,
      words,
      before: null,
      after: null,
      touches: [],
    })),
  );
}
