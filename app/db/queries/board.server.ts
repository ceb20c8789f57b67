import { and, asc, desc, eq, gt, inArray, isNull, ne, sql } from "drizzle-orm";
import { leansOnLevel } from "../../domain/builds/stages";
import type {
  BayCard,
  Board,
  BoardHold,
  BoardLevel,
  BoardStage,
  BoardVehicle,
  CrewCard,
  NextCard,
} from "../../domain/floor/board";
import { type Db, type Reader, schema } from "../client.server";
import { OPEN_END, type Touch } from "../schema";

const {
  bays,
  buildings,
  builds,
  controlMarks,
  drops,
  dropReadings,
  holds,
  journal,
  layouts,
  levelChecks,
  people,
  personSkills,
  placements,
  shopRevisions,
  spells,
  stageBayKinds,
  stages,

  stints,
  tags,
  vehicles,
} = schema;

const iso = (at: Date) => at.toISOString();
const groupBy = <T, K>(items: readonly T[], key: (item: T) => K): Map<K, T[]> => {
  const groups = new Map<K, T[]>();
  for (const item of items) {
    const group = groups.get(key(item));
    if (group) group.push(item);
    else groups.set(key(item), [item]);
  }
  return groups;
};

/** Runs reads that must agree with each other: one consistent snapshot. (`read only` beside it is written in a way that MariaDB does not parse.) */
export function snapshot<T>(db: Db, read: (tx: Reader) => Promise<T>): Promise<T> {
  return db.transaction(read, {
    isolationLevel: "repeatable read",
    withConsistentSnapshot: true,
  });
}

/** The shop's revision; 0 before its first change. */
export async function readRevision(tx: Reader, shopId: number): Promise<number> {
  const [row] = await tx
    .select({ revision: shopRevisions.revision })
    .from(shopRevisions)
    .where(eq(shopRevisions.shopId, shopId));
  return row?.revision ?? 0;
}

/** Everything touched after a revision, up to what the reader sees. */
export async function readTouchesSince(tx: Reader, shopId: number, revision: number): Promise<Touch[]> {
  const rows = await tx
    .select({ touches: journal.touches })
    .from(journal)
    .where(and(eq(journal.shopId, shopId), gt(journal.revision, revision)));
  return rows.flatMap((row) => row.touches);
}

type Standing = { vehicle: BoardVehicle; bayId: number | null };

/** The vehicles that stand somewhere now: all, those in some bays (the list is not empty), the yard, or one. */
async function readStandings(
  tx: Reader,
  shopId: number,
  where: { bayIds: number[] } | { yard: true } | { buildId: number } | "everywhere",
): Promise<Standing[]> {
  const place =
    where === "everywhere"
      ? undefined
      : "yard" in where
        ? isNull(placements.bayId)
        : "buildId" in where
          ? eq(placements.buildId, where.buildId)
          : inArray(placements.bayId, where.bayIds);
  const standing = await tx
    .select({
      placement: placements,
      build: builds,
      vehicle: vehicles,
      code: tags.code,
      movedBy: people.name,
    })
    .from(placements)
    .innerJoin(builds, eq(builds.id, placements.buildId))
    .innerJoin(vehicles, eq(vehicles.id, builds.vehicleId))
    .innerJoin(people, eq(people.id, placements.movedBy))
    .leftJoin(tags, and(eq(tags.vehicleId, vehicles.id), isNull(tags.replacedAt)))
    .where(and(eq(placements.shopId, shopId), eq(placements.untilAt, OPEN_END), place))
    .orderBy(asc(builds.promisedAt), asc(builds.id));
  const buildIds = standing.map((row) => row.build.id);
  if (buildIds.length === 0) return [];

  const stageRows = await tx
    .select()
    .from(stages)
    .where(and(inArray(stages.buildId, buildIds), ne(stages.state, "done")))
    .orderBy(asc(stages.position));
  const stageOf = new Map<number, (typeof stageRows)[number]>();
  for (const row of stageRows) {
    const known = stageOf.get(row.buildId);
    if (!known || (known.state !== "under-way" && row.state === "under-way")) stageOf.set(row.buildId, row);
  }
  const stageIds = [...stageOf.values()].map((row) => row.id);
  const kinds = stageIds.length
    ? groupBy(
        await tx.select().from(stageBayKinds).where(inArray(stageBayKinds.stageId, stageIds)),
        (k) => k.stageId,
      )
    : new Map<number, { kind: BoardStage["bayKinds"][number] }[]>();
  const planned = stageIds.length
    ? await tx
        .select({ stageId: stints.stageId, endsAt: sql<Date>`max(${stints.endsAt})`.mapWith(stints.endsAt) })
        .from(stints)
        .where(and(inArray(stints.stageId, stageIds), eq(stints.state, "planned")))
        .groupBy(stints.stageId)
    : [];
  const endsAt = new Map(planned.map((row) => [row.stageId, row.endsAt]));

  const crew = groupBy(
    await tx
      .select({ spell: spells, name: people.name, initials: people.initials })
      .from(spells)
      .innerJoin(people, eq(people.id, spells.personId))
      .where(and(inArray(spells.buildId, buildIds), eq(spells.untilAt, OPEN_END)))
      .orderBy(asc(spells.fromAt)),
    (row) => row.spell.buildId,
  );
  const held = groupBy(
    await tx
      .select()
      .from(holds)
      .where(and(inArray(holds.buildId, buildIds), isNull(holds.liftedAt)))
      .orderBy(desc(holds.placedAt)),
    (row) => row.buildId,
  );
  const levels = await readLevels(tx, buildIds);

  return standing.map(({ placement, build, vehicle, code, movedBy }) => {
    const stage = stageOf.get(build.id);
    const hold = held.get(build.id)?.[0];
    const level = levels.get(build.id);
    const ends = stage && endsAt.get(stage.id);
    return {
      bayId: placement.bayId,
      vehicle: {
        buildId: build.id,
        placementId: placement.id,
        nickname: vehicle.nickname,
        code: code ?? "",
        kind: vehicle.kind,
        lengthMm: vehicle.lengthMm,
        widthMm: vehicle.widthMm,
        since: iso(placement.fromAt),
        movedBy,
        stage: stage
          ? {
              id: stage.id,
              kind: stage.kind,
              state: stage.state,
              bayKinds: (kinds.get(stage.id) ?? []).map((row) => row.kind),
              skill: stage.skill,
              heads: stage.heads,
              pieces:
                stage.piecesDone !== null && stage.piecesOf !== null
                  ? { done: stage.piecesDone, of: stage.piecesOf, word: stage.piecesWord ?? "" }
                  : null,
            }
          : null,
        crew: (crew.get(build.id) ?? []).map((row) => ({
          personId: row.spell.personId,
          name: row.name,
          initials: row.initials,
          since: iso(row.spell.fromAt),
        })),
        level: level && stage && leansOnLevel(stage.kind) ? level.level : { state: "none" },
        hold: hold ? boardHold(hold) : null,
        endsAt: ends ? iso(ends) : null,
        promisedAt: build.promisedAt ? iso(build.promisedAt) : null,
        layoutId: level?.layoutId ?? null,
      },
    };
  });
}

const boardHold = (hold: typeof holds.$inferSelect): BoardHold => ({
  id: hold.id,
  kind: hold.kind,
  words: hold.words,
  placedAt: iso(hold.placedAt),
  dueAt: hold.dueAt ? iso(hold.dueAt) : null,
});

/** The newest layout of each build and the state of its level. */
export async function readLevels(
  tx: Reader,
  buildIds: number[],
): Promise<Map<number, { layoutId: number; level: BoardLevel; levelCheckId: number | null }>> {
  const result = new Map<number, { layoutId: number; level: BoardLevel; levelCheckId: number | null }>();
  if (buildIds.length === 0) return result;
  const layoutRows = await tx
    .select({ id: layouts.id, buildId: layouts.buildId })
    .from(layouts)
    .where(inArray(layouts.buildId, buildIds))
    .orderBy(asc(layouts.id));
  const newest = new Map(layoutRows.map((row) => [row.buildId, row.id]));
  const layoutIds = [...newest.values()];
  if (layoutIds.length === 0) return result;
  const checks = await tx
    .select()
    .from(levelChecks)
    .where(inArray(levelChecks.layoutId, layoutIds))
    .orderBy(asc(levelChecks.id));
  const lastCheck = new Map(checks.map((row) => [row.layoutId, row]));
  const kept = await tx
    .select({ layoutId: drops.layoutId, n: sql<number>`count(*)`.mapWith(Number) })
    .from(dropReadings)
    .innerJoin(drops, eq(drops.id, dropReadings.dropId))
    .where(and(inArray(drops.layoutId, layoutIds), isNull(dropReadings.supersededAt)))
    .groupBy(drops.layoutId);
  const dropCount = new Map(kept.map((row) => [row.layoutId, row.n]));
  for (const [buildId, layoutId] of newest) {
    const check = lastCheck.get(layoutId);
    const count = dropCount.get(layoutId) ?? 0;
    const level: BoardLevel = !check
      ? { state: "none" }
      : check.voidedAt
        ? { state: "void", reason: check.voidReason ?? "", voidedAt: iso(check.voidedAt), drops: count }
        : {
            state: check.isTrue ? "true" : "not-true",
            noseHighDeg: check.noseHighDeg,
            rightHighDeg: check.rightHighDeg,
            checkedAt: iso(check.madeAt),
            drops: count,
          };
    result.set(buildId, { layoutId, level, levelCheckId: check?.id ?? null });
  }
  return result;
}

/** The bays with what stands in them, all or some, in number order. */
export async function readBayCards(tx: Reader, shopId: number, bayIds: number[] | "all"): Promise<BayCard[]> {
  if (bayIds !== "all" && bayIds.length === 0) return [];
  const bayRows = await tx
    .select()
    .from(bays)
    .where(and(eq(bays.shopId, shopId), bayIds === "all" ? undefined : inArray(bays.id, bayIds)))
    .orderBy(asc(bays.number));
  const marks = groupBy(
    await tx
      .select()
      .from(controlMarks)
      .where(eq(controlMarks.shopId, shopId))
      .orderBy(asc(controlMarks.label)),
    (mark) => mark.bayId,
  );
  const standings = await readStandings(tx, shopId, bayIds === "all" ? "everywhere" : { bayIds });
  const byBay = new Map(standings.map((standing) => [standing.bayId, standing.vehicle]));
  return bayRows.map((bay) => ({
    bay: {
      id: bay.id,
      number: bay.number,
      kind: bay.kind,
      xMm: bay.xMm,
      yMm: bay.yMm,
      lengthMm: bay.lengthMm,
      widthMm: bay.widthMm,
      mouth: bay.mouth,
      ratedForLayout: bay.ratedForLayout,
      outside: bay.outside,
      marks: (marks.get(bay.id) ?? []).map((mark) => ({ label: mark.label, xMm: mark.xMm, yMm: mark.yMm })),
    },
    vehicle: byBay.get(bay.id) ?? null,
  }));
}

export async function readYard(tx: Reader, shopId: number): Promise<BoardVehicle[]> {
  return (await readStandings(tx, shopId, { yard: true })).map((standing) => standing.vehicle);
}

/** One vehicle as it stands, with its bay; null when it stands nowhere in this shop. */
export async function readStanding(tx: Reader, shopId: number, buildId: number): Promise<Standing | null> {
  return (await readStandings(tx, shopId, { buildId }))[0] ?? null;
}

/** Technicians and foremen, who they are on, and who is away. */
export async function readCrew(tx: Reader, shopId: number): Promise<CrewCard[]> {
  const rows = await tx
    .select({ person: people, spell: spells, nickname: vehicles.nickname, bayNumber: bays.number })
    .from(people)
    .leftJoin(spells, and(eq(spells.personId, people.id), eq(spells.untilAt, OPEN_END)))
    .leftJoin(builds, eq(builds.id, spells.buildId))
    .leftJoin(vehicles, eq(vehicles.id, builds.vehicleId))
    .leftJoin(placements, and(eq(placements.buildId, spells.buildId), eq(placements.untilAt, OPEN_END)))
    .leftJoin(bays, eq(bays.id, placements.bayId))
    .where(and(eq(people.shopId, shopId), eq(people.role, "tech"), isNull(people.leftAt)))
    .orderBy(asc(people.name));
  const skills = groupBy(
    await tx.select().from(personSkills).where(eq(personSkills.shopId, shopId)),
    (s) => s.personId,
  );
  return rows.map(({ person, spell, nickname, bayNumber }) => ({
    personId: person.id,
    name: person.name,
    initials: person.initials,
    skills: (skills.get(person.id) ?? []).map((row) => row.skill),
    on: spell
      ? {
          buildId: spell.buildId,
          nickname: nickname ?? "",
          bayNumber: bayNumber ?? null,
          since: iso(spell.fromAt),
        }
      : null,
    awayUntil: person.awayUntil ? iso(person.awayUntil) : null,
  }));
}

/** The stints that start next. */
export async function readNext(tx: Reader, shopId: number, now: Date, limit = 8): Promise<NextCard[]> {
  const rows = await tx
    .select({ stint: stints, stage: stages.kind, nickname: vehicles.nickname, bayNumber: bays.number })
    .from(stints)
    .innerJoin(stages, eq(stages.id, stints.stageId))
    .innerJoin(builds, eq(builds.id, stages.buildId))
    .innerJoin(vehicles, eq(vehicles.id, builds.vehicleId))
    .innerJoin(bays, eq(bays.id, stints.bayId))
    .where(
      and(
        eq(stints.shopId, shopId),
        eq(stints.state, "planned"),
        gt(stints.startsAt, now),
        ne(stages.state, "done"),
        eq(builds.state, "here"),
      ),
    )
    .orderBy(asc(stints.startsAt))
    .limit(limit);
  return rows.map((row) => ({
    stintId: row.stint.id,
    at: iso(row.stint.startsAt),
    nickname: row.nickname,
    stage: row.stage,
    bayNumber: row.bayNumber,
  }));
}

/** The whole board in one consistent snapshot. */
export function readBoard(db: Db, shopId: number, now: Date): Promise<Board> {
  return snapshot(db, async (tx) => {
    const [building] = await tx.select().from(buildings).where(eq(buildings.shopId, shopId));
    return {
      revision: await readRevision(tx, shopId),
      building: { lengthMm: building?.lengthMm ?? 0, widthMm: building?.widthMm ?? 0 },
      bays: await readBayCards(tx, shopId, "all"),
      yard: await readYard(tx, shopId),
      crew: await readCrew(tx, shopId),
      next: await readNext(tx, shopId, now),
    };
  });
}
