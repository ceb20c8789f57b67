import { and, asc, desc, eq, inArray } from "drizzle-orm";
import { type Reader, schema } from "../client.server";

const { devices, dropReadings, drops, journal, levelChecks, levelReadings, people, secondLooks, tackChecks } =
  schema;

export type HistoryLine = {
  id: number;
  at: string;
  verb: string;
  words: string;
  by: string | null;
  device: string | null;
};

/** Everything that was done to a layout, newest first, from the journal. */
export async function readLayoutHistory(
  tx: Reader,
  shopId: number,
  layoutId: number,
): Promise<HistoryLine[]> {
  const rows = await tx
    .select({
      id: journal.id,
      at: journal.at,
      verb: journal.verb,
      words: journal.words,
      by: people.name,
      device: devices.name,
    })
    .from(journal)
    .leftJoin(people, eq(people.id, journal.personId))
    .leftJoin(devices, eq(devices.id, journal.deviceId))
    .where(
      and(eq(journal.shopId, shopId), eq(journal.subjectKind, "layout"), eq(journal.subjectId, layoutId)),
    )
    .orderBy(desc(journal.at), desc(journal.id));
  return rows.map((row) => ({ ...row, at: row.at.toISOString() }));
}

export type ReadingLine = {
  at: string;
  what: string;
  point: string;
  side: string;
  typed: string;
  xMm: number | null;
  yMm: number | null;
  by: string;
  device: string | null;
  supersededAt: string | null;
  reason: string | null;
};

/** Every reading of a layout in the order in which it was taken: levels, drops, second looks, tack checks. */
export async function readLayoutReadings(tx: Reader, layoutId: number): Promise<ReadingLine[]> {
  const who = { by: people.name };
  const levels = await tx
    .select({ check: levelChecks, reading: levelReadings, ...who })
    .from(levelReadings)
    .innerJoin(levelChecks, eq(levelChecks.id, levelReadings.levelCheckId))
    .innerJoin(people, eq(people.id, levelChecks.madeBy))
    .where(eq(levelChecks.layoutId, layoutId))
    .orderBy(asc(levelReadings.id));
  const dropped = await tx
    .select({ drop: drops, reading: dropReadings, ...who, device: devices.name })
    .from(dropReadings)
    .innerJoin(drops, eq(drops.id, dropReadings.dropId))
    .innerJoin(people, eq(people.id, dropReadings.takenBy))
    .leftJoin(devices, eq(devices.id, dropReadings.deviceId))
    .where(eq(drops.layoutId, layoutId))
    .orderBy(asc(dropReadings.id));
  const ids = dropped.map((row) => row.reading.id);
  const ties = ids.length
    ? await tx.select().from(schema.tieReadings).where(inArray(schema.tieReadings.readingId, ids))
    : [];
  const looks = await tx
    .select({ look: secondLooks, drop: drops, ...who, device: devices.name })
    .from(secondLooks)
    .innerJoin(drops, eq(drops.id, secondLooks.dropId))
    .innerJoin(people, eq(people.id, secondLooks.takenBy))
    .leftJoin(devices, eq(devices.id, secondLooks.deviceId))
    .where(eq(secondLooks.layoutId, layoutId))
    .orderBy(asc(secondLooks.id));
  const tacks = await tx
    .select({ tack: tackChecks, ...who, device: devices.name })
    .from(tackChecks)
    .innerJoin(people, eq(people.id, tackChecks.madeBy))
    .leftJoin(devices, eq(devices.id, tackChecks.deviceId))
    .where(eq(tackChecks.layoutId, layoutId))
    .orderBy(asc(tackChecks.id));
  const lines: ReadingLine[] = [
    ...levels.map(({ check, reading, by }) => ({
      at: check.madeAt.toISOString(),
      what: "level",
      point: reading.place,
      side: "",
      typed: reading.heightTyped ?? `${reading.firstDeg ?? ""}°, turned ${reading.turnedDeg ?? ""}°`,
      xMm: reading.xMm,
      yMm: reading.yMm,
      by,
      device: null,
      supersededAt: check.voidedAt?.toISOString() ?? null,
      reason: check.voidReason,
    })),
    ...dropped.map(({ drop, reading, by, device }) => ({
      at: reading.takenAt.toISOString(),
      what: "drop",
      point: drop.point,
      side: drop.side,
      typed:
        reading.method === "offset"
          ? `${reading.stationTyped ?? ""}, ${reading.offsetTyped ?? ""}`
          : ties
              .filter((tie) => tie.readingId === reading.id)
              .map((tie) => `${tie.mark} ${tie.distanceTyped}`)
              .join(", "),
      xMm: reading.xMm,
      yMm: reading.yMm,
      by,
      device,
      supersededAt: reading.supersededAt?.toISOString() ?? null,
      reason: reading.reason,
    })),
    ...looks.map(({ look, drop, by, device }) => ({
      at: look.takenAt.toISOString(),
      what: look.agrees ? "second look, agrees" : "second look, apart",
      point: drop.point,
      side: drop.side,
      typed: `${look.stationTyped}, ${look.offsetTyped}`,
      xMm: look.xMm,
      yMm: look.yMm,
      by,
      device,
      supersededAt: look.supersededAt?.toISOString() ?? null,
      reason: look.supersededReason,
    })),
    ...tacks.flatMap(({ tack, by, device }) =>
      (["left", "right"] as const).map((side) => ({
        at: tack.madeAt.toISOString(),
        what: tack.passes ? "tacked, square" : "tacked, out",
        point: "axle-end",
        side,
        typed:
          side === "left"
            ? `${tack.leftStationTyped}, ${tack.leftOffsetTyped}`
            : `${tack.rightStationTyped}, ${tack.rightOffsetTyped}`,
        xMm: side === "left" ? tack.leftXMm : tack.rightXMm,
        yMm: side === "left" ? tack.leftYMm : tack.rightYMm,
        by,
        device,
        supersededAt: null,
        reason: null,
      })),
    ),
  ];
  return lines.sort((a, b) => a.at.localeCompare(b.at));
}
