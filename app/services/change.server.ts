import { eq, sql } from "drizzle-orm";
import type { Actor, PersonActor } from "../auth/actor";
import { may, type Permission } from "../auth/permissions";
import { type Db, isLockConflict, schema, type Tx } from "../db/client.server";
import type { Touch } from "../db/schema";
import { Refusal } from "./errors";

/** What every service is handed. */
export type Context = {
  db: Db;
  /** Tells the watchers of a shop that it changed. Called after commit; never throws. */
  publish: (shopId: number) => void;
  actor: Actor;
  now: () => Date;
};

export type JournalEntry = {
  verb: string;
  subject: { kind: string; id: number };
  words: string;
  before?: Record<string, unknown> | null;
  after?: Record<string, unknown> | null;
  touches: Touch[];
};

/**
 * The person behind a context, once they are found to have the permission.
 * @throws Refusal forbidden
 */
export function requirePerson(ctx: Context, permission: Permission): PersonActor {
  const { actor } = ctx;
  if (!may(actor.role, permission))
    throw new Refusal("forbidden", "This is not for your role. Ask the foreman.");
  if (actor.personId === null) throw new Refusal("forbidden", "A person has to sign in for this.");
  return { ...actor, personId: actor.personId };
}

const TRIES = 5;

/**
 * Runs a change: the work, its journal rows and the shop's next revision are one transaction; the watchers are told
 * after it is committed. A deadlock is tried again from the start, so the work must touch nothing but the database.
 * The revision row is the last lock taken: commits happen in the order of their revisions.
 * Work that journals nothing changed nothing: no revision, nobody told.
 */
export async function change<T>(
  ctx: Context,
  work: (tx: Tx, note: (entry: JournalEntry) => void) => Promise<T>,
): Promise<T> {
  const { shopId, personId, deviceId } = ctx.actor;
  for (let attempt = 1; ; attempt++) {
    const entries: JournalEntry[] = [];
    try {
      const result = await ctx.db.transaction(
        async (tx) => {
          const value = await work(tx, (entry) => entries.push(entry));
          if (entries.length === 0) return value;
          await tx
            .update(schema.shopRevisions)
            .set({ revision: sql`${schema.shopRevisions.revision} + 1` })
            .where(eq(schema.shopRevisions.shopId, shopId));
          const [row] = await tx
            .select({ revision: schema.shopRevisions.revision })
            .from(schema.shopRevisions)
            .where(eq(schema.shopRevisions.shopId, shopId));
          if (!row) throw new Error(`Shop ${shopId} has no revision row`);
          const at = ctx.now();
          await tx.insert(schema.journal).values(
            entries.map((entry) => ({
              shopId,
              revision: row.revision,
              at,
              personId,
              deviceId,
              verb: entry.verb,
              subjectKind: entry.subject.kind,
              subjectId: entry.subject.id,
              words: entry.words.slice(0, 240),
              before: entry.before ?? null,
              after: entry.after ?? null,
              touches: entry.touches,
            })),
          );
          return value;
        },
        { isolationLevel: "read committed" },
      );
      if (entries.length > 0) ctx.publish(shopId);
      return result;
    } catch (error) {
      if (!isLockConflict(error) || attempt === TRIES) throw error;
      // Two changes stood in each other's way; a short uneven wait lets one of them through.
      await new Promise((resolve) => setTimeout(resolve, attempt * 15 + Math.random() * 25));
    }
  }
}
