import { and, eq } from "drizzle-orm";
import { schema } from "../db/client.server";
import { readCrew, readStanding } from "../db/queries/board.server";
import { readLastChange, readUndoable } from "../db/queries/undo.server";
import { OPEN_END, type Touch } from "../db/schema";
import { type Context, change, requirePerson } from "./change.server";
import { Refusal } from "./errors";
import { moveInside, placeWords, releaseCrew, touchedByMove } from "./floor-moves.server";

const { people, placements, spells } = schema;

/**
 * Takes back the person's own newest change on the Floor.
 * A level that the change voided stays void: nobody can know whether the wheels turned.
 * @throws Refusal conflict in words when somebody built on it since, or there is nothing to take back
 */
export async function undoFloor(ctx: Context): Promise<{ words: string }> {
  const actor = requirePerson(ctx, "floor:move");
  const { shopId } = ctx.actor;
  return change(ctx, async (tx, note) => {
    const entry = await readUndoable(tx, shopId, actor.personId, ctx.now());
    if (!entry) throw new Refusal("conflict", "You have nothing to undo.");
    const subject = { kind: entry.subjectKind, id: entry.subjectId };
    const last = await readLastChange(tx, shopId, subject);
    if (last && last.id !== entry.id)
      throw new Refusal("conflict", `Not undone: ${last.words} came after it.`);

    let touches: Touch[];
    let words = `Undone: ${entry.words}.`;
    if (entry.verb === "move-vehicle") {
      const standing = await readStanding(tx, shopId, subject.id);
      if (!standing) throw new Refusal("conflict", "Not undone: the vehicle has left.");
      const { level } = standing.vehicle;
      if (level.state === "true" || level.state === "not-true")
        throw new Refusal(
          "conflict",
          `Not undone: ${standing.vehicle.nickname} was levelled since. Move it if you must.`,
        );
      const moved = await moveInside(
        tx,
        ctx,
        actor.personId,
        {
          buildId: subject.id,
          placementId: standing.vehicle.placementId,
          toBayId: (entry.before?.bayId as number | null) ?? null,
          confirmed: true,
        },
        note,
      );
      touches = touchedByMove(moved, moved.vehicle.layoutId);
      words = `${moved.vehicle.nickname} is back in ${placeWords(moved.toBay)}.`;
      if (entry.after?.voided) words += " Its level stays void: level again.";
    } else {
      const personId = subject.id;
      await tx.select({ id: people.id }).from(people).where(eq(people.id, personId)).for("update");
      const person = (await readCrew(tx, shopId)).find((card) => card.personId === personId);
      if (!person) throw new Refusal("conflict", "Not undone: the person is no longer on the crew.");
      const nowOn = (entry.after?.buildId as number | null) ?? null;
      const backTo = (entry.before?.buildId as number | null) ?? null;
      if ((person.on?.buildId ?? null) !== nowOn)
        throw new Refusal("conflict", `Not undone: ${person.name} is elsewhere by now.`);
      const at = new Date(
        Math.max(ctx.now().getTime(), person.on ? new Date(person.on.since).getTime() + 1 : 0),
      );
      touches = [{ kind: "crew" }];
      for (const buildId of [nowOn, backTo]) {
        if (buildId === null) continue;
        const [row] = await tx
          .select({ bayId: placements.bayId })
          .from(placements)
          .where(and(eq(placements.buildId, buildId), eq(placements.untilAt, OPEN_END)));
        if (row) touches.push(row.bayId === null ? { kind: "yard" } : { kind: "bay", id: row.bayId });
        if (buildId === backTo && (!row || row.bayId === null))
          throw new Refusal("conflict", "Not undone: the vehicle stands in no bay by now.");
      }
      if (nowOn !== null) await releaseCrew(tx, nowOn, at, personId);
      if (backTo !== null)
        await tx.insert(spells).values({ shopId, personId, buildId: backTo, fromAt: at, untilAt: OPEN_END });
    }
    note({
      verb: "undo",
      subject,
      words,
      before: entry.after,
      after: { ...entry.before, undoes: entry.id },
      touches,
    });
    return { words };
  });
}
