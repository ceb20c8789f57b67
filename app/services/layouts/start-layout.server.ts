import { and, asc, eq } from "drizzle-orm";
import { schema } from "../../db/client.server";
import { readBayOfBuild, readLayoutOfBuild, readMarks } from "../../db/queries/layouts.server";
import { type Context, change } from "../change.server";
import { Refusal } from "../errors";
import { advanceStages } from "./advance-stages.server";
import { layoutTouches, measurer } from "./step-guard.server";

const { builds, hangers, layouts } = schema;

/**
 * Starts the layout of a vehicle's front end, or answers the one that it has.
 * @throws Refusal not-found; conflict when it stands in no bay fit for layout, or the shop has no hanger
 */
export async function startLayout(
  ctx: Context,
  what: { buildId: number; fixedEye: "ahead" | "behind" },
): Promise<{ layoutId: number }> {
  const actor = measurer(ctx);
  const { shopId } = actor;
  return change(ctx, async (tx, note) => {
    const [build] = await tx
      .select({ id: builds.id })
      .from(builds)
      .where(and(eq(builds.id, what.buildId), eq(builds.shopId, shopId)))
      .for("update");
    if (!build) throw new Refusal("not-found", "There is no such build.");
    const known = await readLayoutOfBuild(tx, shopId, what.buildId);
    if (known) return { layoutId: known.id };
    const bay = await readBayOfBuild(tx, what.buildId);
    if (!bay)
      throw new Refusal(
        "conflict",
        "It stands in the yard: a layout needs a bay whose floor is rated for it.",
      );
    if (!bay.ratedForLayout)
      throw new Refusal("conflict", `The floor of Bay ${bay.number} is not rated for layout.`);
    const marks = await readMarks(tx, bay.id);
    if (!["A", "B"].every((label) => marks.some((mark) => mark.label === label)))
      throw new Refusal("conflict", `Bay ${bay.number} has no control marks A and B.`);
    const [hanger] = await tx
      .select()
      .from(hangers)
      .where(eq(hangers.shopId, shopId))
      .orderBy(asc(hangers.id))
      .limit(1);
    if (!hanger) throw new Refusal("conflict", "The spring rack holds no hanger yet: add one first.");
    const [made] = await tx
      .insert(layouts)
      .values({
        shopId,
        buildId: what.buildId,
        kind: "front-leaf",
        fixedEye: what.fixedEye,
        bayId: bay.id,
        hangerId: hanger.id,
        startedBy: actor.personId,
        startedAt: ctx.now(),
      })
      .$returningId();
    if (!made) throw new Error("The layout was not inserted");
    await advanceStages(tx, what.buildId, ctx.now(), { done: [], begun: "level" });
    note({
      verb: "start-layout",
      subject: { kind: "layout", id: made.id },
      words: `Layout of the front end begun in Bay ${bay.number}`,
      after: { buildId: what.buildId, bayId: bay.id, fixedEye: what.fixedEye },
      touches: await layoutTouches(tx, made.id, what.buildId),
    });
    return { layoutId: made.id };
  });
}
