import { and, desc, eq, gt, inArray } from "drizzle-orm";
import { type Reader, schema } from "../client.server";

const { journal } = schema;

/** The floor changes that their maker can take back. */
const UNDOABLE = ["move-vehicle", "assign-person"] as const;
/** How far back: older changes have been built on. */
const BACK_MS = 12 * 60 * 60_000;
const LOOK_AT = 60;

export type UndoableRow = typeof journal.$inferSelect;

/** A person's newest floor change that was not taken back yet; null when there is none. */
export async function readUndoable(
  tx: Reader,
  shopId: number,
  personId: number,
  now: Date,
): Promise<UndoableRow | null> {
  const rows = await tx
    .select()
    .from(journal)
    .where(
      and(
        eq(journal.shopId, shopId),
        eq(journal.personId, personId),
        inArray(journal.verb, [...UNDOABLE, "undo"]),
        gt(journal.at, new Date(now.getTime() - BACK_MS)),
      ),
    )
    .orderBy(desc(journal.id))
    .limit(LOOK_AT);
  const undone = new Set(rows.filter((row) => row.verb === "undo").map((row) => Number(row.after?.undoes)));
  return rows.find((row) => row.verb !== "undo" && !undone.has(row.id)) ?? null;
}

/** The newest change of one subject, whoever made it; null when it has none. */
export async function readLastChange(
  tx: Reader,
  shopId: number,
  subject: { kind: string; id: number },
): Promise<UndoableRow | null> {
  const [row] = await tx
    .select()
    .from(journal)
    .where(
      and(
        eq(journal.shopId, shopId),
        eq(journal.subjectKind, subject.kind),
        eq(journal.subjectId, subject.id),
        inArray(journal.verb, [...UNDOABLE, "undo"]),
      ),
    )
    .orderBy(desc(journal.id))
    .limit(1);
  return row ?? null;
}
