import { and, eq, isNull } from "drizzle-orm";
import { isDuplicate, schema, type Tx } from "../../db/client.server";
import { readMarks } from "../../db/queries/layouts.server";
import { distance, type FloorPoint, floorPoint } from "../../domain/geometry/point";
import {
  type DropPointId,
  type DropSide,
  dropPoint,
  pointFromOffset,
  pointFromTies,
  type Suggestion,
} from "../../domain/layout/drops";
import { carrierOf } from "../../domain/layout/level-chain";
import type { TypedLength } from "../../domain/layout/view";
import { type LengthUnit, mm } from "../../domain/units/length";
import { type Context, change } from "../change.server";
import { Refusal } from "../errors";
import { voidApprovals } from "../void-level.server";
import { currentReadings, type LoadedLayout, redropWanted } from "./layout-state.server";
import { layoutTouches, measurer, openStep } from "./step-guard.server";

const { choices, dropReadings, drops, levelChecks, tieReadings } = schema;

export type DropEntry = {
  point: DropPointId;
  side: DropSide;
  /** Made by the tablet for this reading; sent again it is the same reading. */
  clientKey: string;
  height: TypedLength | null;
  reason: string | null;
} & (
  | { method: "offset"; station: TypedLength; offset: TypedLength }
  | { method: "ties"; ties: { mark: string; distance: TypedLength }[] }
);

export type DropAnswer = {
  readingId: number;
  suspect: boolean;
  checked: boolean;
  suggestions: Suggestion[];
  advice: string | null;
  /** `stands`: this was the re-drop and the old drops stand. `void`: it was, and they do not. Null: it was none. */
  redrop: "stands" | "void" | null;
};

/** A place that moved by less is the same place. */
const SAME_MM = 0.1;

/**
 * Keeps a reading of a drop. The one before it is marked as superseded, never changed; an approval and a choice that
 * stood on the old number go. After a new level the first old point that is dropped again decides on the others.
 * @throws Refusal conflict when the step is shut; invalid with words beside the field
 */
export async function keepDrop(ctx: Context, layoutId: number, entry: DropEntry): Promise<DropAnswer> {
  const actor = measurer(ctx);
  const known = await answerOf(ctx, layoutId, entry.clientKey);
  if (known) return known;
  try {
    return await change(ctx, async (tx, note) => {
      const loaded = await openStep(tx, ctx, layoutId, "drops");
      const { head, rounds, ground, rows, shop } = loaded;
      const level = ground.newest;
      if (!level) throw new Refusal("conflict", "Level first: everything after depends on it.");
      const place = await placeOf(tx, loaded, entry, shop.unit);
      const point = dropPoint(entry.point);
      if (point?.withHeight && !entry.height)
        throw new Refusal("invalid", "Its height above the ground is needed as well.", {
          height: "Type its height above the ground.",
        });
      const old =
        currentReadings(rows).find((row) => row.drop.point === entry.point && row.drop.side === entry.side) ??
        null;

      const redrop =
        redropWanted(ground, rows) &&
        old !== null &&
        ground.waiting.has(old.reading.levelCheckId) &&
        !place.suspect
          ? redropOutcome(old.reading, place.at, shop.redropToleranceMm)
          : null;
      if (redrop)
        await tx
          .update(levelChecks)
          .set({
            carriesId:
              redrop.stands && old ? (carrierOf(rounds, level, old.reading.levelCheckId)?.id ?? null) : null,
            carryOffMm: redrop.off,
          })
          .where(eq(levelChecks.id, level.id));

      const dropId = old?.drop.id ?? (await dropIdFor(tx, actor.shopId, layoutId, entry));
      if (old)
        await tx
          .update(dropReadings)
          .set({ supersededAt: ctx.now() })
          .where(eq(dropReadings.id, old.reading.id));
      const readingId = await insertReading(tx, ctx, { entry, dropId, levelCheckId: level.id, place });
      if (!old || distance(floorPoint(old.reading.xMm, old.reading.yMm), place.at) > SAME_MM) {
        await voidApprovals(tx, ctx, layoutId, `${point?.label ?? entry.point} read again`);
        await tx
          .update(choices)
          .set({ droppedAt: ctx.now() })
          .where(and(eq(choices.layoutId, layoutId), isNull(choices.droppedAt)));
      }
      note({
        verb: "keep-drop",
        subject: { kind: "layout", id: layoutId },
        words: `${point?.label ?? entry.point}, ${entry.side}: ${entryWords(entry)}${place.suspect ? " (the tapes do not meet)" : ""}`,
        before: old ? { readingId: old.reading.id, xMm: old.reading.xMm, yMm: old.reading.yMm } : null,
        after: {
          readingId,
          xMm: place.at.x,
          yMm: place.at.y,
          reason: entry.reason,
          redrop: redrop ? { ...redrop } : null,
        },
        touches: await layoutTouches(tx, layoutId, head.build.id),
      });
      return {
        readingId,
        suspect: place.suspect,
        checked: place.checked,
        suggestions: place.suggestions,
        advice: place.advice,
        redrop: redrop ? (redrop.stands ? "stands" : "void") : null,
      };
    });
  } catch (error) {
    // The same reading arrived twice at once: the other one was kept, and this is its answer.
    const twin = isDuplicate(error) ? await answerOf(ctx, layoutId, entry.clientKey) : null;
    if (twin) return twin;
    throw error;
  }
}

const redropOutcome = (old: { xMm: number; yMm: number }, at: FloorPoint, tolerance: number) => {
  // At least a thousandth of a millimetre, so that it differs from "carried by itself".
  const off = Math.max(0.001, distance(floorPoint(old.xMm, old.yMm), at));
  return { off, stands: off <= tolerance };
};

const entryWords = (entry: DropEntry) =>
  entry.method === "offset"
    ? `${entry.station.typed} along, ${entry.offset.typed} off`
    : entry.ties.map((tie) => `${tie.mark} ${tie.distance.typed}`).join(", ");

type Place = {
  at: FloorPoint;
  suspect: boolean;
  checked: boolean;
  suggestions: Suggestion[];
  advice: string | null;
};

async function placeOf(
  tx: Tx,
  { head, shop }: LoadedLayout,
  entry: DropEntry,
  unit: LengthUnit,
): Promise<Place> {
  if (entry.method === "offset") {
    const at = pointFromOffset({ station: entry.station.mm, offset: entry.offset.mm, side: entry.side });
    if (!at.ok) throw new Refusal("invalid", at.problem, { offset: at.problem });
    return { at: at.value, suspect: false, checked: true, suggestions: [], advice: null };
  }
  if (entry.side === "centre")
    throw new Refusal("invalid", "A point on the centre is measured by offset.", {
      method: "Measure this one by offset.",
    });
  const marks = await readMarks(tx, head.layout.bayId);
  const ties = entry.ties.map((tie) => {
    const mark = marks.find((one) => one.label === tie.mark);
    if (!mark)
      throw new Refusal("invalid", `Bay ${head.bay.number} has no mark ${tie.mark}.`, {
        [`tape.${tie.mark}`]: `There is no mark ${tie.mark} here.`,
      });
    return { mark: tie.mark, at: floorPoint(mark.xMm, mark.yMm), distance: tie.distance.mm };
  });
  const fit = pointFromTies(ties, entry.side, mm(shop.tapeSigmaMm), unit);
  if (!fit.ok) throw new Refusal("invalid", fit.problem, { form: fit.problem });
  const { point, suspect, checked, suggestions, advice } = fit.value;
  return { at: point, suspect, checked, suggestions, advice };
}

async function dropIdFor(tx: Tx, shopId: number, layoutId: number, entry: DropEntry): Promise<number> {
  const where = and(eq(drops.layoutId, layoutId), eq(drops.point, entry.point), eq(drops.side, entry.side));
  const [known] = await tx.select({ id: drops.id }).from(drops).where(where);
  if (known) return known.id;
  const [made] = await tx
    .insert(drops)
    .values({ shopId, layoutId, point: entry.point, side: entry.side })
    .$returningId();
  if (!made) throw new Error("The drop was not inserted");
  return made.id;
}

async function insertReading(
  tx: Tx,
  ctx: Context,
  what: { entry: DropEntry; dropId: number; levelCheckId: number; place: Place },
): Promise<number> {
  const { entry, dropId, levelCheckId, place } = what;
  const { shopId, personId, deviceId } = ctx.actor;
  const [made] = await tx
    .insert(dropReadings)
    .values({
      shopId,
      dropId,
      levelCheckId,
      clientKey: entry.clientKey,
      method: entry.method,
      stationTyped: entry.method === "offset" ? entry.station.typed : null,
      offsetTyped: entry.method === "offset" ? entry.offset.typed : null,
      xMm: place.at.x,
      yMm: place.at.y,
      heightMm: entry.height?.mm ?? null,
      heightTyped: entry.height?.typed ?? null,
      suspect: place.suspect,
      checked: place.checked,
      reason: entry.reason,
      takenBy: personId ?? 0,
      deviceId,
      takenAt: ctx.now(),
    })
    .$returningId();
  if (!made) throw new Error("The reading was not inserted");
  if (entry.method === "ties")
    await tx.insert(tieReadings).values(
      entry.ties.map((tie) => ({
        shopId,
        readingId: made.id,
        mark: tie.mark,
        distanceMm: tie.distance.mm,
        distanceTyped: tie.distance.typed,
      })),
    );
  return made.id;
}

/** The answer of a reading that was kept before under this key; null when there is none. @throws Refusal conflict when the key is another layout's */
async function answerOf(ctx: Context, layoutId: number, clientKey: string): Promise<DropAnswer | null> {
  const [row] = await ctx.db
    .select({ reading: dropReadings, layoutId: drops.layoutId })
    .from(dropReadings)
    .innerJoin(drops, eq(drops.id, dropReadings.dropId))
    .where(and(eq(dropReadings.shopId, ctx.actor.shopId), eq(dropReadings.clientKey, clientKey)));
  if (!row) return null;
  if (row.layoutId !== layoutId)
    throw new Refusal("conflict", "This reading was kept in another layout already.");
  return {
    readingId: row.reading.id,
    suspect: row.reading.suspect,
    checked: row.reading.checked,
    suggestions: [],
    advice: null,
    redrop: null,
  };
}
