import { eq } from "drizzle-orm";
import { schema } from "../../db/client.server";
import { readBayOfBuild, readMarks } from "../../db/queries/layouts.server";
import {
  type GaugeReadings,
  levelFromAngles,
  levelFromHeights,
  levelVerdict,
} from "../../domain/layout/level";
import type { TypedLength } from "../../domain/layout/view";
import { type Degrees, degrees } from "../../domain/units/angle";
import { type Context, change } from "../change.server";
import { Refusal } from "../errors";
import { voidApprovals } from "../void-level.server";
import { advanceStages } from "./advance-stages.server";
import { layoutTouches, measurer, openStep } from "./step-guard.server";

const { layouts, levelChecks, levelReadings } = schema;

export type LevelEntry =
  | { method: "heights"; stands: { place: string; x: TypedLength; y: TypedLength; height: TypedLength }[] }
  | { method: "gauge"; readings: GaugeReadings };

export type LevelAnswer = {
  isTrue: boolean;
  headline: string;
  noseHighDeg: Degrees;
  rightHighDeg: Degrees;
  redropWanted: boolean;
  gaugeDoubt: boolean;
};

/**
 * Keeps one round of levelling with its readings as typed, and judges it by what the shop allows.
 * A true round that follows a level which still stands carries its drops; after a void, or a round that was not true,
 * one old point has to be dropped again first. Any standing approval goes when the level turns out not true.
 * @throws Refusal conflict when the step is shut or the vehicle stands in no bay fit for it; invalid when the readings make no level
 */
export async function checkLevel(ctx: Context, layoutId: number, entry: LevelEntry): Promise<LevelAnswer> {
  const actor = measurer(ctx);
  const result = judge(entry);
  return change(ctx, async (tx, note) => {
    const { head, shop, ground, rows } = await openStep(tx, ctx, layoutId, "level");
    const bay = await readBayOfBuild(tx, head.build.id);
    if (!bay)
      throw new Refusal(
        "conflict",
        `${head.vehicle.nickname} stands in the yard: put it in a bay before you level.`,
      );
    if (!bay.ratedForLayout)
      throw new Refusal("conflict", `The floor of Bay ${bay.number} is not rated for layout.`);
    if (bay.id !== head.layout.bayId) {
      const marks = await readMarks(tx, bay.id);
      if (!marks.some((mark) => mark.label === "A"))
        throw new Refusal("conflict", `Bay ${bay.number} has no control marks.`);
      // Another bay has another floor frame: its marks are checked anew, and no old drop is carried into it.
      await tx
        .update(layouts)
        .set({ bayId: bay.id, marksAt: null, marksBy: null, marksTapedMm: null, marksTapedTyped: null })
        .where(eq(layouts.id, layoutId));
    }
    const allowed = degrees(shop.allowedSlopeDeg);
    const { isTrue, headline } = levelVerdict(result, allowed);
    const carries =
      isTrue && ground.state === "true" && ground.newest?.bayId === bay.id && ground.waiting.size === 0;
    const [made] = await tx
      .insert(levelChecks)
      .values({
        shopId: actor.shopId,
        layoutId,
        bayId: bay.id,
        method: entry.method,
        noseHighDeg: result.noseHigh,
        rightHighDeg: result.rightHigh,
        twistMm: result.twist,
        twistDeg: result.twistDegrees,
        allowedDeg: allowed,
        isTrue,
        madeBy: actor.personId,
        madeAt: ctx.now(),
        carriesId: carries ? (ground.newest?.id ?? null) : null,
        carryOffMm: carries ? 0 : null,
      })
      .$returningId();
    if (!made) throw new Error("The level was not inserted");
    await tx
      .insert(levelReadings)
      .values(readingRows(entry).map((row) => ({ ...row, shopId: actor.shopId, levelCheckId: made.id })));
    if (!carries) await voidApprovals(tx, ctx, layoutId, isTrue ? "Levelled anew" : "Not level any more");
    if (isTrue) await advanceStages(tx, head.build.id, ctx.now(), { done: ["level"], begun: "layout" });
    note({
      verb: "check-level",
      subject: { kind: "layout", id: layoutId },
      words: `${headline} ${isTrue ? "Level true." : "Not true yet."}`,
      after: {
        levelCheckId: made.id,
        method: entry.method,
        noseHighDeg: result.noseHigh,
        rightHighDeg: result.rightHigh,
        isTrue,
      },
      touches: await layoutTouches(tx, layoutId, head.build.id),
    });
    const old = rows.some((row) => row.reading.supersededAt === null);
    return {
      isTrue,
      headline,
      noseHighDeg: result.noseHigh,
      rightHighDeg: result.rightHigh,
      redropWanted: isTrue && !carries && old,
      gaugeDoubt: result.gaugeDoubt,
    };
  });
}

function judge(entry: LevelEntry) {
  if (entry.method === "gauge") {
    const level = levelFromAngles(entry.readings);
    return {
      noseHigh: level.noseHigh,
      rightHigh: level.rightHigh,
      twist: null,
      twistDegrees: level.twistDegrees,
      gaugeDoubt: level.gaugeDoubt,
    };
  }
  const level = levelFromHeights(
    entry.stands.map((s) => ({ id: s.place, x: s.x.mm, y: s.y.mm, height: s.height.mm })),
  );
  if (!level.ok) throw new Refusal("invalid", level.problem, { form: level.problem });
  return {
    noseHigh: level.value.noseHigh,
    rightHigh: level.value.rightHigh,
    twist: level.value.twist,
    twistDegrees: null,
    gaugeDoubt: false,
  };
}

const readingRows = (entry: LevelEntry) =>
  entry.method === "heights"
    ? entry.stands.map((stand) => ({
        place: stand.place,
        xMm: stand.x.mm,
        xTyped: stand.x.typed,
        yMm: stand.y.mm,
        yTyped: stand.y.typed,
        heightMm: stand.height.mm,
        heightTyped: stand.height.typed,
      }))
    : Object.entries(entry.readings).map(([place, { first, turned }]) => ({
        place,
        firstDeg: first,
        turnedDeg: turned,
      }));
