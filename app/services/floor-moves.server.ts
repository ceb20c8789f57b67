import { and, asc, eq, inArray, sql } from "drizzle-orm";
import { isDuplicate, schema, type Tx } from "../db/client.server";
import { readBayCards, readLevels, readStanding } from "../db/queries/board.server";
import { OPEN_END, type Touch } from "../db/schema";
import type { BayCard, BoardVehicle } from "../domain/floor/board";
import { checkMove } from "../domain/floor/move-check";
import type { Context, JournalEntry } from "./change.server";
import { Refusal } from "./errors";
import { voidLevel } from "./void-level.server";

const { bays, placements, spells } = schema;

/** Locks bay rows in id order, so that two moves wait for each other instead of deadlocking. */
export async function lockBays(tx: Tx, ids: (number | null)[]): Promise<void> {
  const wanted = ids.filter((id): id is number => id !== null);
  if (wanted.length > 0)
    await tx
      .select({ id: bays.id })
      .from(bays)
      .where(inArray(bays.id, wanted))
      .orderBy(asc(bays.id))
      .for("update");
}

/** A moment not before `now` at which both a standing can end and the next can begin in that bay. */
async function momentFor(tx: Tx, now: Date, from: Date, toBayId: number | null): Promise<Date> {
  let at = Math.max(now.getTime(), from.getTime() + 1);
  if (toBayId !== null) {
    const [last] = await tx
      .select({ until: sql<string | null>`max(${placements.untilAt})`.mapWith(placements.untilAt) })
      .from(placements)
      .where(and(eq(placements.bayId, toBayId), sql`${placements.untilAt} < ${OPEN_END}`));
    const until = last?.until as unknown as Date | null;
    if (until) at = Math.max(at, until.getTime());
  }
  return new Date(at);
}

export type Move = {
  buildId: number;
  /** The standing that the person saw. */
  placementId: number;
  /** Null: the yard. */
  toBayId: number | null;
  /** What the move costs was asked and answered. */
  confirmed: boolean;
};
export type Moved = {
  vehicle: BoardVehicle;
  fromBay: BayCard["bay"] | null;
  toBay: BayCard["bay"] | null;
  voided: boolean;
};

/**
 * Moves a vehicle within a running change: checks the rules, ends its standing, begins the next, voids a level that
 * stood, and lets the crew go when it leaves for the yard. Writes no journal row: the caller words it.
 * @throws Refusal not-found, conflict (moved meanwhile, taken, does not fit), ask-first (costs something)
 */
export async function moveInside(
  tx: Tx,
  ctx: Context,
  personId: number,
  move: Move,
  note: (entry: JournalEntry) => void,
): Promise<Moved> {
  const { shopId } = ctx.actor;
  const [open] = await tx
    .select()
    .from(placements)
    .where(
      and(
        eq(placements.shopId, shopId),
        eq(placements.buildId, move.buildId),
        eq(placements.untilAt, OPEN_END),
      ),
    );
  if (!open) throw new Refusal("not-found", "That vehicle does not stand in this shop.");
  await lockBays(tx, [open.bayId, move.toBayId]);
  const [locked] = await tx
    .select({ id: placements.id })
    .from(placements)
    .where(and(eq(placements.buildId, move.buildId), eq(placements.untilAt, OPEN_END)))
    .for("update");
  const standing = await readStanding(tx, shopId, move.buildId);
  if (!locked || !standing) throw new Refusal("not-found", "That vehicle does not stand in this shop.");
  const { vehicle } = standing;
  const fromBay =
    standing.bayId === null ? null : ((await readBayCards(tx, shopId, [standing.bayId]))[0]?.bay ?? null);
  if (locked.id !== move.placementId || vehicle.placementId !== move.placementId) {
    const where = fromBay ? `to Bay ${fromBay.number}` : "to the yard";
    throw new Refusal(
      "conflict",
      `${vehicle.movedBy} has just moved ${vehicle.nickname} ${where}.`,
      {},
      { moved: true },
    );
  }
  const target = move.toBayId === null ? "yard" : (await readBayCards(tx, shopId, [move.toBayId]))[0];
  if (!target) throw new Refusal("not-found", "There is no such bay.");
  const check = checkMove(vehicle, fromBay, target);
  if (check.verdict === "refuses")
    throw new Refusal("conflict", check.reasons.map((reason) => reason.words).join(" "), {}, { check });
  if (check.verdict === "asks" && !move.confirmed)
    throw new Refusal("ask-first", check.reasons.map((reason) => reason.words).join(" "), {}, { check });

  const at = await momentFor(tx, ctx.now(), new Date(vehicle.since), move.toBayId);
  await tx.update(placements).set({ untilAt: at }).where(eq(placements.id, open.id));
  try {
    await tx.insert(placements).values({
      shopId,
      buildId: move.buildId,
      bayId: move.toBayId,
      fromAt: at,
      untilAt: OPEN_END,
      movedBy: personId,
    });
  } catch (error) {
    // The lock on the bay makes this rare; the key is what makes it impossible.
    if (isDuplicate(error)) throw new Refusal("conflict", "That bay was taken a moment ago.");
    throw error;
  }
  // Whatever the board shows of it: a level that stands goes with the move.
  const level = (await readLevels(tx, [move.buildId])).get(move.buildId);
  if (level?.levelCheckId && (level.level.state === "true" || level.level.state === "not-true"))
    await voidLevel(tx, ctx, personId, {
      layoutId: level.layoutId,
      levelCheckId: level.levelCheckId,
      reason: target === "yard" ? "rolled out to the yard" : `moved to Bay ${target.bay.number}`,
      note,
    });
  if (target === "yard") await releaseCrew(tx, move.buildId, at);
  return { vehicle, fromBay, toBay: target === "yard" ? null : target.bay, voided: check.voidsLevel };
}

/** Ends the spells of everyone who is on a vehicle. A spell that began this very moment lasts one millisecond. */
export async function releaseCrew(tx: Tx, buildId: number, at: Date, personId?: number): Promise<void> {
  await tx
    .update(spells)
    .set({ untilAt: sql`greatest(${at}, ${spells.fromAt} + interval 1000 microsecond)` })
    .where(
      and(
        eq(spells.buildId, buildId),
        eq(spells.untilAt, OPEN_END),
        personId === undefined ? undefined : eq(spells.personId, personId),
      ),
    );
}

/** What a move touched, for the journal. */
export function touchedByMove(moved: Moved, layoutId: number | null): Touch[] {
  const touches: Touch[] = [{ kind: "crew" }, { kind: "build", id: moved.vehicle.buildId }];
  for (const bay of [moved.fromBay, moved.toBay])
    touches.push(bay ? { kind: "bay", id: bay.id } : { kind: "yard" });
  if (layoutId !== null) touches.push({ kind: "layout", id: layoutId });
  return touches;
}

export const placeWords = (bay: BayCard["bay"] | null) => (bay ? `Bay ${bay.number}` : "the yard");
