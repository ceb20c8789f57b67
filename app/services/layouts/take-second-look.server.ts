import { and, eq, isNull } from "drizzle-orm";
import { schema, type Tx } from "../../db/client.server";
import type { SecondLookRow } from "../../db/queries/layouts.server";
import { distance, type FloorPoint, floorPoint } from "../../domain/geometry/point";
import { type DropPointId, type DropSide, pointFromOffset } from "../../domain/layout/drops";
import { lookLabel, thirdDecides } from "../../domain/layout/second-look";
import type { TypedLength } from "../../domain/layout/view";
import { formatLength, type LengthUnit, type Millimetres } from "../../domain/units/length";
import { type Context, change } from "../change.server";
import { Refusal } from "../errors";
import { voidApprovals } from "../void-level.server";
import type { LookItem } from "./second-look-state";
import { layoutTouches, measurer, openStep } from "./step-guard.server";

const { choices, dropReadings, secondLooks } = schema;

export type LookEntry = {
  point: DropPointId;
  side: DropSide;
  station: TypedLength;
  offset: TypedLength;
  clientKey: string;
};
/** `decided-first`, `decided-second`: a third reading set the other one aside. */
export type LookAnswer = {
  outcome: "agrees" | "apart" | "decided-first" | "decided-second";
  words: string;
};

/**
 * A second person's reading of a point that weighs in the result, held against the first without having seen it. Agreeing
 * within both uncertainties it passes. Apart, both are shown, and a third reading by either person decides: the odd one is
 * set aside with the reason. Where the second is borne out, it takes the first one's place, and the option has to be put
 * in hand anew on the new numbers.
 * @throws Refusal conflict when the step is shut, the point is not asked for, or the same person looks at their own
 *   reading; invalid with words beside the field
 */
export async function takeSecondLook(ctx: Context, layoutId: number, entry: LookEntry): Promise<LookAnswer> {
  const actor = measurer(ctx);
  const placed = pointFromOffset({ station: entry.station.mm, offset: entry.offset.mm, side: entry.side });
  if (!placed.ok) throw new Refusal("invalid", placed.problem, { offset: placed.problem });
  const at = placed.value;
  const known = await keptBefore(ctx, layoutId, entry.clientKey);
  if (known) return known;
  try {
    return await change(ctx, async (tx, note) => {
      const { head, choice, secondLook, ground, shop } = await openStep(tx, ctx, layoutId, "second-look");
      if (!choice || !ground.newest) throw new Refusal("conflict", "Put an option in hand first.");
      const item = secondLook.items.find((one) => one.point === entry.point && one.side === entry.side);
      if (!item) throw new Refusal("conflict", "This point does not have to be looked at again.");
      if (item.state === "agrees") throw new Refusal("conflict", `${lookLabel(item)} agrees already.`);
      if (item.state === "to-do" && item.row.reading.takenBy === actor.personId)
        throw new Refusal("conflict", `${item.row.name} took the first reading: somebody else looks again.`);
      const look: Look = {
        layoutId,
        choiceId: choice.choice.id,
        levelCheckId: ground.newest.id,
        entry,
        at,
        item,
        within: secondLook.within,
        unit: shop.unit,
      };
      const answer = await settle(tx, ctx, look);
      note({
        verb: "second-look",
        subject: { kind: "layout", id: layoutId },
        words: `${lookLabel(item)} looked at again: ${entry.station.typed} along, ${entry.offset.typed} off. ${answer.words}`,
        before: { readingId: item.row.reading.id },
        after: { outcome: answer.outcome, xMm: at.x, yMm: at.y },
        touches: await layoutTouches(tx, layoutId, head.build.id),
      });
      return answer;
    });
  } catch (error) {
    // The same reading arrived twice at once: the other one was kept, and this is its answer.
    const twin = await keptBefore(ctx, layoutId, entry.clientKey);
    if (twin) return twin;
    throw error;
  }
}

/** What a reading sent before under this key came to; null when there is none. */
async function keptBefore(ctx: Context, layoutId: number, clientKey: string): Promise<LookAnswer | null> {
  const [row] = await ctx.db
    .select({ agrees: secondLooks.agrees, layoutId: secondLooks.layoutId })
    .from(secondLooks)
    .where(and(eq(secondLooks.shopId, ctx.actor.shopId), eq(secondLooks.clientKey, clientKey)));
  if (!row) return null;
  if (row.layoutId !== layoutId)
    throw new Refusal("conflict", "This reading was kept in another layout already.");
  return { outcome: row.agrees ? "agrees" : "apart", words: "Kept already." };
}

type Look = {
  layoutId: number;
  choiceId: number;
  levelCheckId: number;
  entry: LookEntry;
  at: FloorPoint;
  item: LookItem;
  within: Millimetres;
  unit: LengthUnit;
};

async function settle(tx: Tx, ctx: Context, look: Look): Promise<LookAnswer> {
  const { at, item, within, unit } = look;
  const first = floorPoint(item.row.reading.xMm, item.row.reading.yMm);
  const fromFirst = distance(first, at);
  const words = (apart: Millimetres) => formatLength(apart, unit, { denominator: 32 });
  const [before] = item.looks.slice(-1);
  if (!before) {
    const agrees = fromFirst <= within;
    await keepLook(tx, ctx, look, { againstId: item.row.reading.id, apart: fromFirst, agrees });
    return agrees
      ? { outcome: "agrees", words: `Agrees: ${words(fromFirst)} apart.` }
      : {
          outcome: "apart",
          words: `Apart by ${words(fromFirst)}, more than the ${words(within)} that both may be unsure. Read it a third time.`,
        };
  }
  const second = floorPoint(before.look.xMm, before.look.yMm);
  const third = thirdDecides({ fromFirst, fromSecond: distance(second, at) }, within);
  if (third === "neither") {
    await keepLook(tx, ctx, look, { againstId: item.row.reading.id, apart: fromFirst, agrees: false });
    return {
      outcome: "apart",
      words: `Three readings, none near another: hang the bob again and read once more.`,
    };
  }
  if (third === "first-stands") {
    await setAside(tx, ctx, item, "A third reading agrees with the first.");
    await keepLook(tx, ctx, look, { againstId: item.row.reading.id, apart: fromFirst, agrees: true });
    return { outcome: "decided-first", words: "The first reading stands; the odd one is set aside." };
  }
  await replaceFirst(tx, ctx, look, before, distance(second, at));
  return {
    outcome: "decided-second",
    words: "The second reading is borne out and takes the first one's place. Put an option in hand again.",
  };
}

/** The reading of the second person becomes the drop's own: the first is superseded, never changed. */
async function replaceFirst(
  tx: Tx,
  ctx: Context,
  look: Look,
  second: SecondLookRow,
  apart: Millimetres,
): Promise<void> {
  const { item, layoutId } = look;
  const now = ctx.now();
  const { shopId, id: _, ...old } = item.row.reading;
  await setAside(tx, ctx, item, "Became the drop's reading.");
  await tx.update(dropReadings).set({ supersededAt: now }).where(eq(dropReadings.id, item.row.reading.id));
  const [made] = await tx
    .insert(dropReadings)
    .values({
      ...old,
      shopId,
      clientKey: crypto.randomUUID(),
      levelCheckId: look.levelCheckId,
      method: "offset",
      stationTyped: second.look.stationTyped,
      offsetTyped: second.look.offsetTyped,
      xMm: second.look.xMm,
      yMm: second.look.yMm,
      suspect: false,
      checked: true,
      reason: "Second look: a third reading agreed with the second.",
      takenBy: second.look.takenBy,
      deviceId: second.look.deviceId,
      takenAt: second.look.takenAt,
      supersededAt: null,
    })
    .$returningId();
  if (!made) throw new Error("The reading was not inserted");
  await keepLook(tx, ctx, look, { againstId: made.id, apart, agrees: true });
  await voidApprovals(tx, ctx, layoutId, `${lookLabel(item)} read again`);
  await tx
    .update(choices)
    .set({ droppedAt: now })
    .where(and(eq(choices.layoutId, layoutId), isNull(choices.droppedAt)));
}

const setAside = (tx: Tx, ctx: Context, item: LookItem, reason: string) =>
  tx
    .update(secondLooks)
    .set({ supersededAt: ctx.now(), supersededReason: reason })
    .where(and(eq(secondLooks.againstId, item.row.reading.id), isNull(secondLooks.supersededAt)));

async function keepLook(
  tx: Tx,
  ctx: Context,
  { layoutId, choiceId, levelCheckId, entry, at, item, within }: Look,
  came: { againstId: number; apart: Millimetres; agrees: boolean },
): Promise<void> {
  await tx.insert(secondLooks).values({
    shopId: ctx.actor.shopId,
    layoutId,
    choiceId,
    dropId: item.row.drop.id,
    againstId: came.againstId,
    levelCheckId,
    clientKey: entry.clientKey,
    stationTyped: entry.station.typed,
    offsetTyped: entry.offset.typed,
    xMm: at.x,
    yMm: at.y,
    apartMm: came.apart,
    withinMm: within,
    agrees: came.agrees,
    takenBy: ctx.actor.personId ?? 0,
    deviceId: ctx.actor.deviceId,
    takenAt: ctx.now(),
  });
}
