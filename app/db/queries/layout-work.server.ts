import { and, asc, eq, min } from "drizzle-orm";
import { type Reader, schema } from "../client.server";

const { approvals, people, personSkills, tackChecks, workItems } = schema;

/** Every check of the tacked axle of a layout, oldest first, with who made it. */
export const readTackChecks = (tx: Reader, layoutId: number) =>
  tx
    .select({ check: tackChecks, name: people.name, initials: people.initials })
    .from(tackChecks)
    .innerJoin(people, eq(people.id, tackChecks.madeBy))
    .where(eq(tackChecks.layoutId, layoutId))
    .orderBy(asc(tackChecks.id));
export type TackCheckRow = Awaited<ReturnType<typeof readTackChecks>>[number];

/** Every signature under the lists of a layout, oldest first, with whose it is. */
export const readWorkItems = (tx: Reader, layoutId: number) =>
  tx
    .select({ item: workItems, name: people.name, initials: people.initials })
    .from(workItems)
    .innerJoin(people, eq(people.id, workItems.signedBy))
    .where(eq(workItems.layoutId, layoutId))
    .orderBy(asc(workItems.id));
export type WorkItemRow = Awaited<ReturnType<typeof readWorkItems>>[number];

/** When a choice was signed for the first time; null when it never was. */
export async function readFirstApproval(tx: Reader, choiceId: number): Promise<Date | null> {
  const [row] = await tx
    .select({ at: min(approvals.approvedAt) })
    .from(approvals)
    .where(eq(approvals.choiceId, choiceId));
  return row?.at ?? null;
}

/** A person's weld skill as the shop's list has it; null when they have none. */
export async function readWeldSkill(tx: Reader, shopId: number, personId: number) {
  const [row] = await tx
    .select({ expiresAt: personSkills.expiresAt })
    .from(personSkills)
    .where(
      and(
        eq(personSkills.shopId, shopId),
        eq(personSkills.personId, personId),
        eq(personSkills.skill, "weld"),
      ),
    );
  return row ?? null;
}
