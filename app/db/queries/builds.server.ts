import { and, asc, desc, eq, inArray, isNull, ne, or } from "drizzle-orm";
import type { HoldKind, StageKind, StageState } from "../../domain/builds/stages";
import type { VehicleKind } from "../../domain/builds/vehicle-kinds";
import { type Reader, schema } from "../client.server";
import { OPEN_END } from "../schema";

const { bays, builds, customers, holds, journal, layouts, people, placements, stages, tags, vehicles } =
  schema;

const iso = (at: Date) => at.toISOString();

export type BuildRow = {
  buildId: number;
  nickname: string;
  code: string;
  kind: VehicleKind;
  lengthMm: number;
  widthMm: number;
  customer: string;
  /** The stage in hand, or the next open one; null when all are done. */
  stage: { kind: StageKind; state: StageState } | null;
  /** Null: in the yard. */
  bayNumber: number | null;
  hold: { kind: HoldKind; words: string } | null;
  promisedAt: string | null;
  bookedInAt: string;
};

/** Every build that is here, the nearest promise first; those without a promise come last. */
export async function readBuildsHere(tx: Reader, shopId: number): Promise<BuildRow[]> {
  const rows = await tx
    .select({ build: builds, vehicle: vehicles, customer: customers.name, code: tags.code, bay: bays.number })
    .from(builds)
    .innerJoin(vehicles, eq(vehicles.id, builds.vehicleId))
    .innerJoin(customers, eq(customers.id, vehicles.customerId))
    .leftJoin(tags, and(eq(tags.vehicleId, vehicles.id), isNull(tags.replacedAt)))
    .leftJoin(placements, and(eq(placements.buildId, builds.id), eq(placements.untilAt, OPEN_END)))
    .leftJoin(bays, eq(bays.id, placements.bayId))
    .where(and(eq(builds.shopId, shopId), eq(builds.state, "here")))
    .orderBy(isNull(builds.promisedAt), asc(builds.promisedAt), asc(builds.id));
  const ids = rows.map((row) => row.build.id);
  if (ids.length === 0) return [];
  const open = await tx
    .select({ buildId: stages.buildId, kind: stages.kind, state: stages.state })
    .from(stages)
    .where(and(inArray(stages.buildId, ids), ne(stages.state, "done")))
    .orderBy(asc(stages.position));
  const stageOf = new Map<number, (typeof open)[number]>();
  for (const row of open) {
    const known = stageOf.get(row.buildId);
    if (!known || (known.state !== "under-way" && row.state === "under-way")) stageOf.set(row.buildId, row);
  }
  const held = await tx
    .select({ buildId: holds.buildId, kind: holds.kind, words: holds.words })
    .from(holds)
    .where(and(inArray(holds.buildId, ids), isNull(holds.liftedAt)))
    .orderBy(asc(holds.placedAt));
  const holdOf = new Map(held.map((row) => [row.buildId, row]));
  return rows.map(({ build, vehicle, customer, code, bay }) => {
    const stage = stageOf.get(build.id);
    const hold = holdOf.get(build.id);
    return {
      buildId: build.id,
      nickname: vehicle.nickname,
      code: code ?? "",
      kind: vehicle.kind,
      lengthMm: vehicle.lengthMm,
      widthMm: vehicle.widthMm,
      customer,
      stage: stage ? { kind: stage.kind, state: stage.state } : null,
      bayNumber: bay,
      hold: hold ? { kind: hold.kind, words: hold.words } : null,
      promisedAt: build.promisedAt ? iso(build.promisedAt) : null,
      bookedInAt: iso(build.bookedInAt),
    };
  });
}

export type CustomerCard = { id: number; name: string; phone: string; email: string };

/** The shop's customers by name. */
export async function readCustomers(tx: Reader, shopId: number): Promise<CustomerCard[]> {
  return tx
    .select({ id: customers.id, name: customers.name, phone: customers.phone, email: customers.email })
    .from(customers)
    .where(eq(customers.shopId, shopId))
    .orderBy(asc(customers.name), asc(customers.id));
}

export type BuildStageRow = {
  id: number;
  kind: StageKind;
  state: StageState;
  hours: number;
  heads: number;
  stay: string | null;
  pieces: { done: number; of: number; word: string } | null;
  startedAt: string | null;
  finishedAt: string | null;
};

/** One build with its vehicle and its customer, before anybody's permissions; null when the shop has no such build. */
export async function readBuild(tx: Reader, shopId: number, buildId: number) {
  const [row] = await tx
    .select({
      build: builds,
      vehicle: vehicles,
      customer: customers,
      code: tags.code,
      bookedInBy: people.name,
    })
    .from(builds)
    .innerJoin(vehicles, eq(vehicles.id, builds.vehicleId))
    .innerJoin(customers, eq(customers.id, vehicles.customerId))
    .innerJoin(people, eq(people.id, builds.bookedInBy))
    .leftJoin(tags, and(eq(tags.vehicleId, vehicles.id), isNull(tags.replacedAt)))
    .where(and(eq(builds.id, buildId), eq(builds.shopId, shopId)));
  if (!row) return null;
  const { build, vehicle, customer, code, bookedInBy } = row;
  return {
    id: build.id,
    state: build.state,
    wanted: build.wanted,
    nickname: vehicle.nickname,
    code: code ?? "",
    kind: vehicle.kind,
    lengthMm: vehicle.lengthMm,
    lengthTyped: vehicle.lengthTyped,
    widthMm: vehicle.widthMm,
    widthTyped: vehicle.widthTyped,
    asked: {
      tyre: build.tyreTyped,
      loadedRadius: build.loadedRadiusTyped,
      tyreRadius: build.tyreRadiusTyped,
      tyreWidth: build.tyreWidthTyped,
      wheelbase: build.wheelbaseTyped,
      approachDeg: build.approachAskedDeg,
    },
    promisedAt: build.promisedAt ? iso(build.promisedAt) : null,
    bookedInAt: iso(build.bookedInAt),
    bookedInBy,
    leftAt: build.leftAt ? iso(build.leftAt) : null,
    customer: { name: customer.name, phone: customer.phone, email: customer.email },
  };
}

/** A build's stages in their order. Fetched by a build that was found in the shop. */
export async function readStages(tx: Reader, buildId: number): Promise<BuildStageRow[]> {
  const rows = await tx
    .select()
    .from(stages)
    .where(eq(stages.buildId, buildId))
    .orderBy(asc(stages.position));
  return rows.map((row) => ({
    id: row.id,
    kind: row.kind,
    state: row.state,
    hours: row.hours,
    heads: row.heads,
    stay: row.stay,
    pieces:
      row.piecesDone !== null && row.piecesOf !== null
        ? { done: row.piecesDone, of: row.piecesOf, word: row.piecesWord ?? "" }
        : null,
    startedAt: row.startedAt ? iso(row.startedAt) : null,
    finishedAt: row.finishedAt ? iso(row.finishedAt) : null,
  }));
}

export type BuildHoldRow = {
  id: number;
  kind: HoldKind;
  words: string;
  placedBy: string;
  placedAt: string;
  dueAt: string | null;
};

/** The holds that stand on a build, newest first. Fetched by a build that was found in the shop. */
export async function readStandingHolds(tx: Reader, buildId: number): Promise<BuildHoldRow[]> {
  const rows = await tx
    .select({ hold: holds, placedBy: people.name })
    .from(holds)
    .innerJoin(people, eq(people.id, holds.placedBy))
    .where(and(eq(holds.buildId, buildId), isNull(holds.liftedAt)))
    .orderBy(desc(holds.placedAt));
  return rows.map(({ hold, placedBy }) => ({
    id: hold.id,
    kind: hold.kind,
    words: hold.words,
    placedBy,
    placedAt: iso(hold.placedAt),
    dueAt: hold.dueAt ? iso(hold.dueAt) : null,
  }));
}

/** `by` null: the shop's own doing. */
export type StoryRow = { id: number; at: string; by: string | null; words: string };

const STORY_LENGTH = 60;

/** What happened to a build and to its layouts, newest first: the journal of the build and of each layout of it. */
export async function readStory(tx: Reader, shopId: number, buildId: number): Promise<StoryRow[]> {
  const own = await tx
    .select({ id: layouts.id })
    .from(layouts)
    .where(and(eq(layouts.shopId, shopId), eq(layouts.buildId, buildId)));
  const ofBuild = and(eq(journal.subjectKind, "build"), eq(journal.subjectId, buildId));
  const ofLayouts = and(
    eq(journal.subjectKind, "layout"),
    inArray(
      journal.subjectId,
      own.map((row) => row.id),
    ),
  );
  const rows = await tx
    .select({ id: journal.id, at: journal.at, by: people.name, words: journal.words })
    .from(journal)
    .leftJoin(people, eq(people.id, journal.personId))
    .where(and(eq(journal.shopId, shopId), own.length > 0 ? or(ofBuild, ofLayouts) : ofBuild))
    .orderBy(desc(journal.at), desc(journal.id))
    .limit(STORY_LENGTH);
  return rows.map((row) => ({ id: row.id, at: iso(row.at), by: row.by, words: row.words }));
}

/** What was measured and asked for, as typed, for the form that puts it right; null when this shop has no such build. */
export async function readAsked(tx: Reader, shopId: number, buildId: number) {
  const [row] = await tx
    .select({ build: builds, nickname: vehicles.nickname, code: tags.code })
    .from(builds)
    .innerJoin(vehicles, eq(vehicles.id, builds.vehicleId))
    .leftJoin(tags, and(eq(tags.vehicleId, vehicles.id), isNull(tags.replacedAt)))
    .where(and(eq(builds.id, buildId), eq(builds.shopId, shopId)));
  if (!row) return null;
  const { build } = row;
  return {
    buildId: build.id,
    nickname: row.nickname,
    code: row.code ?? "",
    fields: {
      wanted: build.wanted,
      tyre: build.tyreTyped ?? "",
      loadedRadius: build.loadedRadiusTyped ?? "",
      tyreRadius: build.tyreRadiusTyped ?? "",
      tyreWidth: build.tyreWidthTyped ?? "",
      wheelbase: build.wheelbaseTyped ?? "",
      approach: build.approachAskedDeg === null ? "" : String(build.approachAskedDeg),
    },
  };
}
