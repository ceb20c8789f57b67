import { and, asc, eq, isNull, max } from "drizzle-orm";
import { type Reader, schema } from "../client.server";

const { hangerHoles, hangers, springs } = schema;

export type RackSpring = {
  id: number;
  rackNumber: number;
  lengthMm: number;
  lengthTyped: string;
  frontHalfMm: number;
  frontHalfTyped: string;
  leaves: number;
  leafWidthMm: number;
  leafWidthTyped: string;
  note: string;
  addedAt: string;
};

/** The springs that lie in the rack, in rack order. */
export async function readRack(tx: Reader, shopId: number): Promise<RackSpring[]> {
  const rows = await tx
    .select()
    .from(springs)
    .where(and(eq(springs.shopId, shopId), isNull(springs.takenOutAt)))
    .orderBy(asc(springs.rackNumber));
  return rows.map((row) => ({
    id: row.id,
    rackNumber: row.rackNumber,
    lengthMm: row.lengthMm,
    lengthTyped: row.lengthTyped,
    frontHalfMm: row.frontHalfMm,
    frontHalfTyped: row.frontHalfTyped,
    leaves: row.leaves,
    leafWidthMm: row.leafWidthMm,
    leafWidthTyped: row.leafWidthTyped,
    note: row.note,
    addedAt: row.addedAt.toISOString(),
  }));
}

/** The lowest rack number above every one given out, springs that have left included. */
export async function readNextRackNumber(tx: Reader, shopId: number): Promise<number> {
  const [row] = await tx
    .select({ highest: max(springs.rackNumber) })
    .from(springs)
    .where(eq(springs.shopId, shopId));
  return (row?.highest ?? 0) + 1;
}

export type HangerCard = {
  id: number;
  name: string;
  holes: { number: number; aheadMm: number; aheadTyped: string }[];
};

/** The hanger patterns of the shop with their holes, from hole 1 on. */
export async function readHangers(tx: Reader, shopId: number): Promise<HangerCard[]> {
  const rows = await tx
    .select({ hanger: hangers, hole: hangerHoles })
    .from(hangers)
    .leftJoin(hangerHoles, eq(hangerHoles.hangerId, hangers.id))
    .where(eq(hangers.shopId, shopId))
    .orderBy(asc(hangers.id), asc(hangerHoles.number));
  const cards = new Map<number, HangerCard>();
  for (const { hanger, hole } of rows) {
    const card = cards.get(hanger.id) ?? { id: hanger.id, name: hanger.name, holes: [] };
    if (hole) card.holes.push({ number: hole.number, aheadMm: hole.aheadMm, aheadTyped: hole.aheadTyped });
    cards.set(hanger.id, card);
  }
  return [...cards.values()];
}
