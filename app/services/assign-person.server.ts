import { and, eq } from "drizzle-orm";
import { isDuplicate, schema, type Tx } from "../db/client.server";
import { readBayCards, readCrew, readStanding } from "../db/queries/board.server";
import { OPEN_END, type Touch } from "../db/schema";
import { checkAssign } from "../domain/floor/move-check";
import { type Context, change, requirePerson } from "./change.server";
import { Refusal } from "./errors";
import { releaseCrew } from "./floor-moves.server";

const { people, placements, spells } = schema;

export type Assignment = {
  personId: number;
  /** Null: off the vehicle, free. */
  toBuildId: number | null;
  confirmed: boolean;
};

async function bayTouch(tx: Tx, buildId: number | null): Promise<Touch[]> {
  if (buildId === null) return [];
  const [row] = await tx
    .select({ bayId: placements.bayId })
    .from(placements)
    .where(and(eq(placements.buildId, buildId), eq(placements.untilAt, OPEN_END)));
  if (!row) return [];
  return [row.bayId === null ? { kind: "yard" } : { kind: "bay", id: row.bayId }];
}

/**
 * Puts a person on a vehicle in a bay, or takes them off.
 * @throws Refusal conflict or ask-first with `detail.check`
 */
export async function assignPerson(ctx: Context, what: Assignment): Promise<{ words: string }> {
  requirePerson(ctx, "crew:assign");
  const { shopId } = ctx.actor;
  return change(ctx, async (tx, note) => {
    // One lock a person: two assignments of the same person follow one another.
    await tx.select({ id: people.id }).from(people).where(eq(people.id, what.personId)).for("update");
    const person = (await readCrew(tx, shopId)).find((card) => card.personId === what.personId);
    if (!person) throw new Refusal("not-found", "There is no such person on the crew.");
    const fromBuildId = person.on?.buildId ?? null;
    const at = new Date(
      Math.max(ctx.now().getTime(), person.on ? new Date(person.on.since).getTime() + 1 : 0),
    );
    let words = `${person.name} off ${person.on?.nickname ?? "the floor"}`;
    let place = "free";
    if (what.toBuildId === null) {
      if (fromBuildId === null) throw new Refusal("conflict", `${person.name} is free already.`);
    } else {
      const standing = await readStanding(tx, shopId, what.toBuildId);
      if (!standing) throw new Refusal("not-found", "That vehicle does not stand in this shop.");
      if (standing.bayId === null)
        throw new Refusal(
          "conflict",
          `${standing.vehicle.nickname} stands in the yard: put it in a bay first.`,
        );
      const [target] = await readBayCards(tx, shopId, [standing.bayId]);
      if (!target) throw new Refusal("not-found", "There is no such bay.");
      const check = checkAssign(person, target, ctx.now());
      const reasons = check.reasons.map((reason) => reason.words).join(" ");
      if (check.verdict === "refuses") throw new Refusal("conflict", reasons, {}, { check });
      if (check.verdict === "asks" && !what.confirmed) throw new Refusal("ask-first", reasons, {}, { check });
      words = `${person.name} to Bay ${target.bay.number}`;
      place = `Bay ${target.bay.number}`;
    }
    if (fromBuildId !== null) await releaseCrew(tx, fromBuildId, at, what.personId);
    if (what.toBuildId !== null) {
      try {
        await tx.insert(spells).values({
          shopId,
          personId: what.personId,
          buildId: what.toBuildId,
          fromAt: at,
          untilAt: OPEN_END,
        });
      } catch (error) {
        if (isDuplicate(error))
          throw new Refusal("conflict", `${person.name} was put elsewhere a moment ago.`);
        throw error;
      }
    }
    note({
      verb: "assign-person",
      subject: { kind: "person", id: what.personId },
      words,
      before: { buildId: fromBuildId, place: person.on?.nickname ?? "free" },
      after: { buildId: what.toBuildId, place },
      touches: [
        { kind: "crew" },
        ...(await bayTouch(tx, fromBuildId)),
        ...(await bayTouch(tx, what.toBuildId)),
      ],
    });
    return { words };
  });
}
