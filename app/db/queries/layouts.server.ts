import { and, asc, desc, eq, inArray, isNull } from "drizzle-orm";
import { alias } from "drizzle-orm/mysql-core";
import { type Reader, schema } from "../client.server";
import { OPEN_END } from "../schema";

const {
  approvals,
  bays,
  builds,
  choices,
  controlMarks,
  dropReadings,
  drops,
  hangerHoles,
  hangers,
  layouts,
  levelChecks,
  levelReadings,
  people,
  placements,
  secondLooks,
  secondLookWaivers,
  springs,
  tags,
  tieReadings,
  vehicles,
} = schema;

/** The layout row alone, of this shop; null when there is none. Locked when asked, so that changes to it queue up. */
export async function readLayoutRow(tx: Reader, shopId: number, layoutId: number, lock = false) {
  const query = tx
    .select()
    .from(layouts)
    .where(and(eq(layouts.id, layoutId), eq(layouts.shopId, shopId)));
  const [row] = await (lock ? query.for("update") : query);
  return row ?? null;
}
export type LayoutRow = NonNullable<Awaited<ReturnType<typeof readLayoutRow>>>;

/** The newest layout of a build; null when it has none. */
export async function readLayoutOfBuild(
  tx: Reader,
  shopId: number,
  buildId: number,
): Promise<LayoutRow | null> {
  const [row] = await tx
    .select()
    .from(layouts)
    .where(and(eq(layouts.buildId, buildId), eq(layouts.shopId, shopId)))
    .orderBy(desc(layouts.id))
    .limit(1);
  return row ?? null;
}

/** The bay in which a build stands now; null for the yard or nowhere. */
export async function readBayOfBuild(tx: Reader, buildId: number) {
  const [row] = await tx
    .select({ bay: bays })
    .from(placements)
    .innerJoin(bays, eq(bays.id, placements.bayId))
    .where(and(eq(placements.buildId, buildId), eq(placements.untilAt, OPEN_END)));
  return row?.bay ?? null;
}

export const readMarks = (tx: Reader, bayId: number) =>
  tx.select().from(controlMarks).where(eq(controlMarks.bayId, bayId)).orderBy(asc(controlMarks.label));

/** All rounds of levelling of a layout, oldest first. */
export const readLevelChecks = (tx: Reader, layoutId: number) =>
  tx.select().from(levelChecks).where(eq(levelChecks.layoutId, layoutId)).orderBy(asc(levelChecks.id));
export type LevelCheckRow = Awaited<ReturnType<typeof readLevelChecks>>[number];

/** Every reading of every drop of a layout, oldest first, with the tapes. */
export async function readDrops(tx: Reader, layoutId: number) {
  const rows = await tx
    .select({ drop: drops, reading: dropReadings, name: people.name, initials: people.initials })
    .from(drops)
    .innerJoin(dropReadings, eq(dropReadings.dropId, drops.id))
    .innerJoin(people, eq(people.id, dropReadings.takenBy))
    .where(eq(drops.layoutId, layoutId))
    .orderBy(asc(dropReadings.id));
  const ids = rows.map((row) => row.reading.id);
  const ties = ids.length
    ? await tx
        .select()
        .from(tieReadings)
        .where(inArray(tieReadings.readingId, ids))
        .orderBy(asc(tieReadings.mark))
    : [];
  return rows.map((row) => ({ ...row, ties: ties.filter((tie) => tie.readingId === row.reading.id) }));
}
export type DropRow = Awaited<ReturnType<typeof readDrops>>[number];

/** Springs in the rack. */
export const readRack = (tx: Reader, shopId: number) =>
  tx
    .select()
    .from(springs)
    .where(and(eq(springs.shopId, shopId), isNull(springs.takenOutAt)))
    .orderBy(asc(springs.rackNumber));

export const readHoles = (tx: Reader, hangerId: number) =>
  tx.select().from(hangerHoles).where(eq(hangerHoles.hangerId, hangerId)).orderBy(asc(hangerHoles.number));

/** The choice in hand with who made it; null when none is. */
export async function readChoice(tx: Reader, layoutId: number) {
  const [row] = await tx
    .select({ choice: choices, name: people.name, initials: people.initials })
    .from(choices)
    .innerJoin(people, eq(people.id, choices.chosenBy))
    .where(and(eq(choices.layoutId, layoutId), isNull(choices.droppedAt)))
    .orderBy(desc(choices.id))
    .limit(1);
  return row ?? null;
}

/** The newest approval of a layout, standing or void, with the choice it signs; null when there was none. */
export async function readApproval(tx: Reader, layoutId: number) {
  const [row] = await tx
    .select({ approval: approvals, choice: choices, name: people.name, initials: people.initials })
    .from(approvals)
    .innerJoin(choices, eq(choices.id, approvals.choiceId))
    .innerJoin(people, eq(people.id, approvals.approvedBy))
    .where(eq(choices.layoutId, layoutId))
    .orderBy(desc(approvals.id))
    .limit(1);
  return row ?? null;
}

/** Every second look of a layout, oldest first, with who took it. */
export const readSecondLooks = (tx: Reader, layoutId: number) =>
  tx
    .select({ look: secondLooks, name: people.name, initials: people.initials })
    .from(secondLooks)
    .innerJoin(people, eq(people.id, secondLooks.takenBy))
    .where(eq(secondLooks.layoutId, layoutId))
    .orderBy(asc(secondLooks.id));
export type SecondLookRow = Awaited<ReturnType<typeof readSecondLooks>>[number];

/** Why a choice goes without a second look; null when nobody said that it does. */
export async function readWaiver(tx: Reader, choiceId: number) {
  const [row] = await tx
    .select({ waiver: secondLookWaivers, name: people.name, initials: people.initials })
    .from(secondLookWaivers)
    .innerJoin(people, eq(people.id, secondLookWaivers.waivedBy))
    .where(eq(secondLookWaivers.choiceId, choiceId));
  return row ?? null;
}

const starter = alias(people, "starter");
const stander = alias(people, "stander");
const marker = alias(people, "marker");
const axler = alias(people, "axler");

/** A layout with its vehicle, bay, hanger and the people behind its steps; null when this shop has no such layout. */
export async function readLayoutHead(tx: Reader, shopId: number, layoutId: number) {
  const [row] = await tx
    .select({
      layout: layouts,
      build: builds,
      vehicle: vehicles,
      code: tags.code,
      bay: bays,
      hanger: hangers,
      starter: { name: starter.name, initials: starter.initials },
      stander: { name: stander.name, initials: stander.initials },
      marker: { name: marker.name, initials: marker.initials },
      axler: { name: axler.name, initials: axler.initials },
    })
    .from(layouts)
    .innerJoin(builds, eq(builds.id, layouts.buildId))
    .innerJoin(vehicles, eq(vehicles.id, builds.vehicleId))
    .innerJoin(bays, eq(bays.id, layouts.bayId))
    .innerJoin(hangers, eq(hangers.id, layouts.hangerId))
    .innerJoin(starter, eq(starter.id, layouts.startedBy))
    .leftJoin(stander, eq(stander.id, layouts.standsBy))
    .leftJoin(marker, eq(marker.id, layouts.marksBy))
    .leftJoin(axler, eq(axler.id, layouts.axleBy))
    .leftJoin(tags, and(eq(tags.vehicleId, vehicles.id), isNull(tags.replacedAt)))
    .where(and(eq(layouts.id, layoutId), eq(layouts.shopId, shopId)));
  return row ?? null;
}
export type LayoutHead = NonNullable<Awaited<ReturnType<typeof readLayoutHead>>>;

/** A level check's own readings with who made the check. */
export async function readLevelReadings(tx: Reader, levelCheckId: number) {
  return tx
    .select()
    .from(levelReadings)
    .where(eq(levelReadings.levelCheckId, levelCheckId))
    .orderBy(asc(levelReadings.id));
}

export async function readPerson(tx: Reader, personId: number) {
  const [row] = await tx
    .select({ name: people.name, initials: people.initials })
    .from(people)
    .where(eq(people.id, personId));
  return row ?? { name: "", initials: "" };
}
